import type { MetalMovement } from '../models/metal-movement.ts';
import { isAny, type Actor } from './actor.ts';
import type { Policy } from './policy.ts';

const keepsMetal = (actor: Actor): boolean => actor.via === 'desk' && isAny(actor, 'owner', 'caster');

/** Who may read the metal ledger, put it right and draw the month's balance. */
export const ledgerPolicy = {
  list: { who: keepsMetal },
  /** A correction is put right by correcting the first movement once more; castings are worked out, never weighed. */
  correct: {
    who: keepsMetal,
    when: (_actor: Actor, movement: MetalMovement) =>
      movement.kind !== 'corrected' && movement.kind !== 'cast',
  },
  reconcile: { who: (actor: Actor) => actor.via === 'desk' && isAny(actor, 'owner') },
} satisfies Record<string, Policy<MetalMovement>>;
