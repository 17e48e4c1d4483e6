import { Link, useLocation } from 'react-router-dom';
import { cx } from '#src/ui/cx.ts';
import { useDeskSession } from '../parts/desk-session.ts';
import { offeredGroups, placeAt, type SiteGroup, type SitePlace } from './site-places.ts';

/** Where the person is, and what is offered to them. */
const useSite = () => {
  const { pathname } = useLocation();
  const groups = offeredGroups(useDeskSession());
  const place = placeAt(pathname);
  return { groups, place, group: groups.find(({ places }) => places.some(({ to }) => to === place?.to)) };
};

const GroupLink = ({ group, isHere }: { readonly group: SiteGroup; readonly isHere: boolean }) => (
  <Link
    to={group.places[0]?.to ?? '/'}
    aria-current={isHere ? 'true' : undefined}
    className={cx(
      'inline-flex min-h-11 items-center rounded-full border-[2.5px] px-4 text-[17px] font-extrabold',
      isHere ? 'border-ink bg-panel text-ink' : 'border-transparent text-soft hover:text-ink',
    )}
  >
    {group.name}
  </Link>
);

/** The desk's groups of places; each leads to its first. */
export const SiteGroups = () => {
  const { groups, group } = useSite();
  return (
    <nav aria-label="Desk">
      <ul className="flex flex-wrap gap-1">
        {groups.map((each) => (
          <li key={each.name}>
            <GroupLink group={each} isHere={each === group} />
          </li>
        ))}
      </ul>
    </nav>
  );
};

/** A place as it hangs from the line: the one that is open with a drop of metal. */
const PlaceLink = ({ to, name, isHere }: SitePlace & { readonly isHere: boolean }) => (
  <Link
    to={to}
    aria-current={isHere ? 'page' : undefined}
    className={cx(
      'relative inline-flex min-h-10 items-center rounded-sm text-[16px]',
      isHere ? 'font-extrabold text-ink' : 'font-bold text-soft hover:text-ink',
    )}
  >
    {name}
    {isHere ? (
      <svg
        viewBox="0 0 20 26"
        className="absolute -bottom-[21px] left-1/2 h-[22px] w-[17px] -translate-x-1/2"
        aria-hidden="true"
      >
        <path d="M10 0c4 7 8 10 8 16a8 8 0 0 1-16 0c0-6 4-9 8-16z" className="fill-ember-fill" />
      </svg>
    ) : null}
  </Link>
);

/** The places of the group that is open, hanging from one line; nothing where the address is in none. */
export const SitePlaces = () => {
  const { group, place } = useSite();
  if (!group) return null;
  return (
    <nav aria-label={group.name} className="border-b-[3px] border-ink">
      <ul className="flex flex-wrap gap-x-7">
        {group.places.map((each) => (
          <li key={each.to}>
            <PlaceLink {...each} isHere={each.to === place?.to} />
          </li>
        ))}
      </ul>
    </nav>
  );
};
