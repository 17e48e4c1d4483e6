import { castingStatesByHand } from '#shared/domain/casting/casting-state.ts';
import { furnaceRoles } from '#shared/domain/people/role.ts';
import type { Casting } from '../models/casting.ts';
import { isAny, isAtTerminal, isSignedIn, type Actor } from './actor.ts';
import type { Policy } from './policy.ts';

/** Who may see castings and move them through their life. */
export const castingPolicy = {
  list: { who: isSignedIn },
  move: {
    who: (actor: Actor) => isAny(actor, 'owner', 'caster'),
    when: (_actor: Actor, casting: Casting) => castingStatesByHand(casting.state).length > 0,
  },
  /** Its card is opened by someone who works at the furnace, at a terminal. */
  openCard: { who: (actor: Actor) => isAtTerminal(actor) && isAny(actor, ...furnaceRoles) },
} satisfies Record<string, Policy<Casting>>;

/** Who may look a card up by its flask's code. */
export const cardPolicy = {
  find: { who: (actor: Actor) => isAtTerminal(actor) && isAny(actor, ...furnaceRoles) },
} satisfies Record<string, Policy>;
