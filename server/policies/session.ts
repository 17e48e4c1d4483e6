import { isAny, type Actor } from './actor.ts';
import type { Policy } from './policy.ts';
import { anyone } from './policy.ts';

/** Who may sign in, and what the two applications show to whom. */
export const sessionPolicy = {
  /** Anyone may ask who they are, and sign in or out. */
  use: anyone,
  /** Only an enrolled terminal takes PINs. */
  usePin: { who: ({ terminal }: Actor) => terminal !== null, refusal: 'terminal-not-enrolled' },
  seeDesk: { who: (actor: Actor) => actor.via === 'desk' && isAny(actor, 'owner', 'caster', 'jeweller') },
} satisfies Record<string, Policy>;
