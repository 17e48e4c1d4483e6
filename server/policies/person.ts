import { isAny, type Actor } from './actor.ts';
import type { Policy } from './policy.ts';

const ownerAtDesk = (actor: Actor): boolean => actor.via === 'desk' && isAny(actor, 'owner');

/** Who may see and change the people of the studio. */
export const personPolicy = {
  list: { who: ownerAtDesk },
  create: { who: ownerAtDesk },
  update: { who: ownerAtDesk },
  unlock: { who: ownerAtDesk },
  /** What an apprentice did under supervision. */
  readSupervised: { who: ownerAtDesk },
  /** A terminal shows the names of those who may sign in at it. */
  listAtTerminal: { who: ({ terminal }: Actor) => terminal !== null, refusal: 'terminal-not-enrolled' },
} satisfies Record<string, Policy>;
