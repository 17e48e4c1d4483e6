import type { Person, PersonAtTerminal } from '#shared/contracts/person.ts';
import { unlimited } from '#shared/domain/people/apprenticeship.ts';
import type { User } from '../models/user.ts';
import type { Actor } from '../policies/actor.ts';
import { personPolicy } from '../policies/person.ts';
import { can } from '../policies/policy.ts';

/** A person as the owner sees them. */
export const presentPerson = (user: User, actor: Actor): Person => ({
  id: user.id,
  name: user.name,
  login: user.login,
  email: user.email ?? null,
  roles: user.roles,
  active: user.active,
  hasPin: user.pinHash !== null,
  pinLocked: user.pinLockedAt !== null,
  apprenticeship: user.apprenticeship ?? unlimited,
  abilities: {
    update: can(personPolicy.update, actor, undefined),
    unlock: user.pinLockedAt !== null && can(personPolicy.unlock, actor, undefined),
  },
});

/** A person as a terminal's sign-in shows them. */
export const presentPersonAtTerminal = (user: User): PersonAtTerminal => ({
  id: user.id,
  name: user.name,
  roles: user.roles,
});
