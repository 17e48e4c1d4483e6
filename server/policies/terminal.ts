import { isAny, type Actor } from './actor.ts';
import { anyone, type Policy } from './policy.ts';

const ownerAtDesk = (actor: Actor): boolean => actor.via === 'desk' && isAny(actor, 'owner');

/** Who may make a device a terminal, and end that. */
export const terminalPolicy = {
  list: { who: ownerAtDesk },
  makeCode: { who: ownerAtDesk },
  revoke: { who: ownerAtDesk },
  /** Whoever holds a fresh code from the desk may enrol the device in their hands. */
  enrol: anyone,
} satisfies Record<string, Policy>;
