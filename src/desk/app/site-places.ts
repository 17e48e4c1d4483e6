import type { Role } from '#shared/domain/people/role.ts';
import type { DeskSession } from '../parts/desk-session.ts';

/** One place of the desk. */
export interface SitePlace {
  readonly to: string;
  readonly name: string;
  /** The ability without which the place is not offered. */
  readonly needs?: keyof DeskSession['abilities'];
  /** The roles to which the place is offered; to all where none is named. */
  readonly roles?: readonly Role[];
}

/** Places that belong together; the first that is offered stands for the group. */
export interface SiteGroup {
  readonly name: string;
  readonly places: readonly SitePlace[];
}

const keepers: readonly Role[] = ['owner', 'caster'];

/** Every place of the desk; a new one takes its line in its group. */
export const siteGroups: readonly SiteGroup[] = [
  {
    name: 'Casting',
    places: [
      { to: '/', name: 'Today' },
      { to: '/melts', name: 'Melt book' },
      { to: '/flasks', name: 'Flasks' },
    ],
  },
  {
    name: 'Metal',
    places: [
      { to: '/metal', name: 'Lots', roles: keepers },
      { to: '/metal/plan', name: 'Plan a charge', roles: keepers },
      { to: '/metal/pot', name: 'Change a pot', roles: keepers },
      { to: '/metal/month', name: 'Month', roles: ['owner'] },
      { to: '/alloys', name: 'Alloys' },
    ],
  },
  {
    name: 'Studio',
    places: [
      { to: '/people', name: 'People', needs: 'managePeople' },
      { to: '/terminals', name: 'Terminals', needs: 'manageTerminals' },
      { to: '/instruments', name: 'Instruments', needs: 'manageTerminals' },
      { to: '/instructions', name: 'Instructions' },
      { to: '/studio', name: 'Settings', needs: 'editStudio' },
    ],
  },
];

const isOffered = ({ needs, roles }: SitePlace, { abilities, person }: DeskSession): boolean =>
  (needs === undefined || abilities[needs]) &&
  (roles === undefined || roles.some((role) => person.roles.includes(role)));

/** The groups with the places that this person may open; a group without any is left out. */
export const offeredGroups = (session: DeskSession): readonly SiteGroup[] =>
  siteGroups
    .map(({ name, places }) => ({ name, places: places.filter((place) => isOffered(place, session)) }))
    .filter(({ places }) => places.length > 0);

const isUnder = (path: string, to: string): boolean => path === to || path.startsWith(`${to}/`);

/** The place an address belongs to: the longest of those it lies under. */
export const placeAt = (path: string): SitePlace | undefined =>
  siteGroups
    .flatMap(({ places }) => places)
    .filter(({ to }) => isUnder(path, to))
    .toSorted((a, b) => b.to.length - a.to.length)[0];
