import { randomUUID } from 'node:crypto';
import { openCard } from '#server/commands/open-card.ts';
import { recordEvent } from '#server/commands/record-event.ts';
import type { Melt } from '#server/models/melt.ts';
import type { Terminal } from '#server/models/terminal.ts';
import type { User } from '#server/models/user.ts';
import type { AtTerminal } from '#server/policies/actor.ts';
import type { Services } from '#server/services/services.ts';
import { buildCasting } from './build-casting.ts';
import { buildTerminal } from './build-terminal.ts';
import { buildUser } from './build-user.ts';
import { eventsTo, type ReachableStep } from './card-events.ts';

interface Overrides {
  readonly castingId?: string;
  readonly user?: User;
  readonly terminal?: Terminal;
  /** How far the card has come; just opened unless told otherwise. */
  readonly step?: ReachableStep;
}

/** Builds a melt by the commands a terminal uses: a card opened and led to `step`. */
export const buildMelt = async (services: Services, overrides: Overrides = {}): Promise<Melt> => {
  const person = overrides.user ?? (await buildUser(services));
  const terminal = overrides.terminal ?? (await buildTerminal(services)).terminal;
  const actor: AtTerminal = { person, terminal, via: 'terminal' };
  const castingId = overrides.castingId ?? (await buildCasting(services)).id;
  const stamp = () => ({ key: randomUUID(), occurredAt: services.now().toISOString() });
  const melt = await openCard(services, actor, castingId, { ...stamp(), carryOn: false });
  for (const event of eventsTo(overrides.step ?? 'guard', melt.context)) {
    // The contract's arrays are mutable where the domain's are not.
    await recordEvent(services, actor, melt.id, { ...stamp(), event: event as never });
  }
  return melt.reload();
};
