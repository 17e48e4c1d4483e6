import { notifyManager, type QueryClient } from '@tanstack/react-query';
import type { RecordEventRequest } from '#shared/contracts/card.ts';
import { cardQuery, recordEvent } from '#src/api/cards.ts';
import { sessionQuery } from '#src/api/session.ts';
import { indexedDbStore } from './indexed-db-store.ts';
import { Outbox } from './outbox.ts';

/** The outbox of this terminal: kept in IndexedDB, delivered to the melt book, shown through the query cache. */
export const deliverToServer = (client: QueryClient): Outbox => {
  const outbox = new Outbox({
    store: indexedDbStore(),
    // The contract's type differs only in that its list of prompts may be changed.
    send: ({ meltId, key, occurredAt, event }) =>
      recordEvent(meltId, { key, occurredAt, event: event as RecordEventRequest['event'] }),
    onDelivered: async ({ castingId }, recorded) => {
      const { queryKey } = cardQuery(castingId);
      // An answer asked for before this event was stored would take the card a step back.
      void client.cancelQueries({ queryKey });
      client.setQueryData(queryKey, (card) =>
        card && !card.events.some(({ key }) => key === recorded.key)
          ? { ...card, events: [...card.events, recorded] }
          : card,
      );
      void client.invalidateQueries({ queryKey: ['castings'] });
      return new Promise((resolve) => notifyManager.schedule(() => resolve()));
    },
    onRefused: ({ castingId }) => {
      void client.invalidateQueries({ queryKey: cardQuery(castingId).queryKey });
    },
    onSignedOut: () => {
      void client.invalidateQueries({ queryKey: sessionQuery.queryKey });
    },
  });
  window.addEventListener('online', () => outbox.tryNow());
  return outbox;
};
