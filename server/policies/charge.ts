import { furnaceRoles } from '#shared/domain/people/role.ts';
import { isAny, isAtTerminal, type Actor } from './actor.ts';
import type { Policy } from './policy.ts';

const keepsMetal = (actor: Actor): boolean => actor.via === 'desk' && isAny(actor, 'owner', 'caster');
const worksAtFurnace = (actor: Actor): boolean => isAtTerminal(actor) && isAny(actor, ...furnaceRoles);

/** Who may plan a charge, and see what is still to be weighed in. */
export const chargePolicy = {
  plan: { who: keepsMetal },
  save: { who: keepsMetal },
  read: { who: (actor: Actor) => keepsMetal(actor) || worksAtFurnace(actor) },
  /** Metal in a crucible, and what is left there when its card has ended. */
  closeOut: { who: keepsMetal },
} satisfies Record<string, Policy>;
