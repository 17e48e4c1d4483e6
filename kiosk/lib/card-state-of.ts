import type { PourCard } from '#shared/contracts/card.ts';
import { applyEvent, foldCard } from '#shared/domain/pour-card/apply-event.ts';
import type { CardState } from '#shared/domain/pour-card/card-state.ts';
import type { OutboxEntry } from '#kiosk/outbox/outbox-entry.ts';

/** Entries of one card that the server's answer does not hold yet, in their order. */
export const pendingOf = (card: PourCard, entries: readonly OutboxEntry[]): readonly OutboxEntry[] => {
  const recorded = new Set(card.events.map(({ key }) => key));
  return entries.filter(({ meltId, key }) => meltId === card.melt?.id && !recorded.has(key));
};

/** Where a card stands: what the server has recorded, then what is still on its way; an entry that no longer fits is left out. */
export const cardStateOf = (card: PourCard, entries: readonly OutboxEntry[]): CardState =>
  pendingOf(card, entries).reduce(
    (state, entry) => {
      const applied = applyEvent(state, entry, card.context);
      return applied.ok ? applied.value : state;
    },
    foldCard(card.events, card.context),
  );
