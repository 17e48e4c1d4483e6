import type { CardEvent, TimedCardEvent } from '#shared/domain/pour-card/card-event.ts';

/** What a person does on a card; opening it and going on with it are asked of the server instead. */
export type DoneEvent = Exclude<CardEvent, { readonly type: 'card-opened' | 'carried-on' }>;

/** One event of a card on its way to the melt book; `key` names it for ever, however often it is sent. */
export interface OutboxEntry extends TimedCardEvent {
  readonly event: DoneEvent;
  readonly key: string;
  /** Place in the queue, rising. */
  readonly order: number;
  readonly castingId: string;
  readonly meltId: string;
  /** Whoever did it: it is delivered only in this person's name. */
  readonly personId: string;
  readonly personName: string;
}

/** An event as a screen hands it in. */
export type NewOutboxEntry = Omit<OutboxEntry, 'order'>;

/** Where entries are kept until they are delivered. */
export interface OutboxStore {
  /** Every entry kept, in any order. */
  readonly all: () => Promise<readonly OutboxEntry[]>;
  /** Keeps an entry; resolves once it would outlive the page. */
  readonly put: (entry: OutboxEntry) => Promise<void>;
  readonly remove: (key: string) => Promise<void>;
}
