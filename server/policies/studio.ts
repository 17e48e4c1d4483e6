import { isAny, type Actor } from './actor.ts';
import type { Policy } from './policy.ts';

const ownerAtDesk = (actor: Actor): boolean => actor.via === 'desk' && isAny(actor, 'owner');

/** Who may see and change the studio's settings. */
export const studioPolicy = {
  read: { who: ownerAtDesk },
  update: { who: ownerAtDesk },
} satisfies Record<string, Policy>;
