import type { MeltEvent as MeltEventContract, PourCard } from '#shared/contracts/card.ts';
import type { Actor } from '../policies/actor.ts';
import { castingPolicy } from '../policies/casting.ts';
import { meltPolicy } from '../policies/melt.ts';
import { can } from '../policies/policy.ts';
import type { LoadedCard } from '../queries/load-card.ts';
import type { LoadedEvent } from '../queries/load-melt.ts';
import { presentChargePlan } from './charge.ts';
import { presentCasting } from './casting.ts';

/** An event of the melt book. */
export const presentMeltEvent = (event: LoadedEvent): MeltEventContract => ({
  seq: event.seq,
  key: event.key,
  event: event.event,
  person: event.user.name,
  terminal: event.terminal?.name ?? '',
  occurredAt: event.occurredAt.toISOString(),
  recordedAt: event.recordedAt.toISOString(),
});

/** Everything a terminal shows for one flask. */
export const presentCard = (card: LoadedCard, actor: Actor, now: Date): PourCard => {
  const { casting, context, instruction, melt, events, chargePlan } = card;
  return {
    casting: presentCasting(casting, actor),
    compositionWt: casting.alloyRevision.compositionWt,
    rangeBasis: casting.alloyRevision.figures.basis,
    context,
    instruction: { ...instruction.content, revision: instruction.number },
    melt: melt
      ? { id: melt.id, code: melt.code, openedBy: melt.opener.name, terminal: melt.terminal.name }
      : null,
    events: events.map(presentMeltEvent),
    chargePlan: chargePlan && presentChargePlan(chargePlan, actor),
    abilities: {
      open: can(castingPolicy.openCard, actor, casting),
      record: melt !== null && can(meltPolicy.record, actor, melt),
    },
    serverTime: now.toISOString(),
  };
};
