import { NavLink } from 'react-router-dom';
import { cx } from '#src/ui/cx.ts';
import { useDeskSession, type DeskSession } from '../parts/desk-session.ts';

interface Place {
  readonly to: string;
  readonly name: string;
  /** The ability without which the place is not offered. */
  readonly needs?: keyof DeskSession['abilities'];
}

const places: readonly Place[] = [
  { to: '/', name: 'Today' },
  { to: '/melts', name: 'Melt book' },
  { to: '/alloys', name: 'Alloys' },
  { to: '/flasks', name: 'Flasks' },
  { to: '/people', name: 'People', needs: 'managePeople' },
  { to: '/terminals', name: 'Terminals', needs: 'manageTerminals' },
  { to: '/studio', name: 'Studio', needs: 'editStudio' },
];

/** The places of the desk that this person may open. */
export const SiteNavigation = () => {
  const { abilities } = useDeskSession();
  return (
    <nav aria-label="Desk">
      <ul className="flex flex-wrap gap-x-[22px] gap-y-1">
        {places
          .filter(({ needs }) => needs === undefined || abilities[needs])
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
