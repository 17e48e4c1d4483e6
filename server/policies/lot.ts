import { furnaceRoles } from '#shared/domain/people/role.ts';
import type { Lot } from '../models/lot.ts';
import { isAny, isAtTerminal, type Actor } from './actor.ts';
import type { Policy } from './policy.ts';

const keepsMetal = (actor: Actor): boolean => actor.via === 'desk' && isAny(actor, 'owner', 'caster');
const worksAtFurnace = (actor: Actor): boolean => isAtTerminal(actor) && isAny(actor, ...furnaceRoles);

/** Who may see the lots of metal, take them in and change them. */
export const lotPolicy = {
  list: { who: (actor: Actor) => keepsMetal(actor) || worksAtFurnace(actor) },
  read: { who: (actor: Actor) => keepsMetal(actor) || worksAtFurnace(actor) },
  receive: { who: keepsMetal },
  amend: { who: keepsMetal },
  addDocument: { who: keepsMetal },
  readDocument: { who: keepsMetal },
  /** Whoever put it in quarantine, the owner lets it out. */
  release: {
    who: (actor: Actor) => actor.via === 'desk' && isAny(actor, 'owner'),
    when: (_actor: Actor, lot: Lot) => lot.quarantineReason !== null,
  },
  count: { who: keepsMetal },
  dispatch: { who: keepsMetal, when: (_actor: Actor, lot: Lot) => lot.balanceMg > 0 },
} satisfies Record<string, Policy<Lot>>;
