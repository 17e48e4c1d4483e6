import type { Role } from '#shared/domain/people/role.ts';

/** One sign-in of the demo studio; invented people, published keys: for trying out only. */
export interface DemoPerson {
  readonly name: string;
  readonly login: string;
  readonly roles: readonly Role[];
  readonly password: string;
  readonly pin: string;
}

/** The people of the demo studio, one at least for each role. */
export const demoPeople: readonly [DemoPerson, ...DemoPerson[]] = [
  {
    name: 'Maren Holt',
    login: 'maren',
    roles: ['owner', 'caster'],
    password: 'plaster iron ember',
    pin: '246802',
  },
  { name: 'Ines Duarte', login: 'ines', roles: ['caster'], password: 'crucible at rest', pin: '135791' },
  { name: 'Tomas Reil', login: 'tomas', roles: ['caster'], password: 'ladle and tongs', pin: '864209' },
  { name: 'Yara Lind', login: 'yara', roles: ['apprentice'], password: 'sweep before noon', pin: '975312' },
  { name: 'Oskar Venn', login: 'oskar', roles: ['jeweller'], password: 'file saw and flame', pin: '531086' },
];

/** Enrols the first device of the demo studio as a terminal, once. */
export const demoEnrolmentCode = '4826 1937';
