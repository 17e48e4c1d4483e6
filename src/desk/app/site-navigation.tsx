import { NavLink } from 'react-router-dom';
import type { Role } from '#shared/domain/people/role.ts';
import { cx } from '#src/ui/cx.ts';
import { useDeskSession, type DeskSession } from '../parts/desk-session.ts';

interface Place {
  readonly to: string;
  readonly name: string;
  /** The ability without which the place is not offered. */
  readonly needs?: keyof DeskSession['abilities'];
  /** The roles to which the place is offered; to all where none is named. */
  readonly roles?: readonly Role[];
}

const places: readonly Place[] = [
  { to: '/', name: 'Today' },
  { to: '/melts', name: 'Melt book' },
  { to: '/alloys', name: 'Alloys' },
  { to: '/metal', name: 'Metal', roles: ['owner', 'caster'] },
  { to: '/flasks', name: 'Flasks' },
  { to: '/instructions', name: 'Instruction' },
  { to: '/people', name: 'People', needs: 'managePeople' },
  { to: '/terminals', name: 'Terminals', needs: 'manageTerminals' },
  { to: '/studio', name: 'Studio', needs: 'editStudio' },
];

const isOffered = ({ needs, roles }: Place, { abilities, person }: DeskSession): boolean =>
  (needs === undefined || abilities[needs]) &&
  (roles === undefined || roles.some((role) => person.roles.includes(role)));

/** The places of the desk that this person may open. */
export const SiteNavigation = () => {
  const session = useDeskSession();
  return (
    <nav aria-label="Desk">
      <ul className="flex flex-wrap gap-x-[22px] gap-y-1">
        {places
          .filter((place) => isOffered(place, session))
          .map(({ to, name }) => (
            <li key={to}>
              <NavLink
                to={to}
                end={to === '/'}
                className={({ isActive }) =>
                  cx(
                    'inline-block rounded-sm border-b-4 py-1 text-[17px] font-bold',
                    isActive
                      ? 'border-ember font-extrabold text-ink'
                      : 'border-transparent text-soft hover:text-ink',
                  )
                }
              >
                {name}
              </NavLink>
            </li>
          ))}
      </ul>
    </nav>
  );
};
