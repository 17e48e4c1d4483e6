import { isSignedIn } from './actor.ts';
import type { Policy } from './policy.ts';

/** Who may see the flasks and print their plates. */
export const flaskPolicy = {
  list: { who: isSignedIn },
} satisfies Record<string, Policy>;
