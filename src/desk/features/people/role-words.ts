import type { Role } from '#shared/domain/people/role.ts';

/** What each role lets a person do, for whoever gives it. */
export const roleWords: Readonly<Record<Role, string>> = {
  owner: 'Everything at the desk; approves alloys, people and terminals.',
  caster: 'Runs pour cards, ends them, adds remarks to melts.',
  apprentice: 'Runs pour cards at the terminal; ends none and confirms no doubtful reading.',
  jeweller: 'Reads the day, the melt book and the alloys.',
};
