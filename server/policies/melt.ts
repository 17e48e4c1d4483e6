import { furnaceRoles } from '#shared/domain/people/role.ts';
import type { Melt } from '../models/melt.ts';
import { isAny, isAtTerminal, isSignedIn, type Actor } from './actor.ts';
import type { Policy } from './policy.ts';

const worksAtFurnace = (actor: Actor): boolean => isAtTerminal(actor) && isAny(actor, ...furnaceRoles);

/** Who may write in the melt book, and read it. */
export const meltPolicy = {
  list: { who: isSignedIn },
  read: { who: isSignedIn },
  /** Whoever works at the furnace may deliver events; what becomes of them is the next sentence's. */
  deliver: { who: worksAtFurnace },
  /** Only the terminal that holds the card writes to it. */
  record: {
    who: worksAtFurnace,
    when: (actor: Actor, melt: Melt) => melt.terminalId === actor.terminal?.id,
  },
  /** A second person signs at the terminal that holds the card. */
  countersign: {
    who: worksAtFurnace,
    when: (actor: Actor, melt: Melt) => melt.terminalId === actor.terminal?.id,
  },
  addPhotograph: {
    who: worksAtFurnace,
    when: (actor: Actor, melt: Melt) => melt.terminalId === actor.terminal?.id,
  },
  readPhotograph: { who: isSignedIn },
  /** Who opened a card takes it to another terminal; the owner too, when that person or that terminal is gone. */
  takeAlong: {
    who: worksAtFurnace,
    when: (actor: Actor, melt: Melt) => melt.openedBy === actor.person?.id || isAny(actor, 'owner'),
  },
  /** An apprentice ends no card and stands by no doubtful reading. */
  decide: { who: (actor: Actor) => isAtTerminal(actor) && isAny(actor, 'owner', 'caster') },
  amend: { who: (actor: Actor) => actor.via === 'desk' && isAny(actor, 'owner', 'caster') },
} satisfies Record<string, Policy<Melt>>;
