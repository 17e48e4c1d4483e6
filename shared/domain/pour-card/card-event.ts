import type { Celsius, Grams } from '#shared/lib/units.ts';
import type { Assay, LotKind } from '../metal/lot.ts';

/** What is put into the crucible: casting grain of the alloy, or returns of it. */
export const chargeKinds = ['grain', 'returns'] as const;
/** One kind of charge. */
export type ChargeKind = (typeof chargeKinds)[number];

/** The lot a weighing is taken from, as its label and certificate say at that moment. */
export interface ChargeLot extends Assay {
  readonly id: string;
  readonly code: string;
  readonly kind: LotKind;
}

/** The kind of charge a lot of metal is: returns, or new metal. */
export const chargeKindOf = (kind: LotKind): ChargeKind => (kind === 'returns' ? 'returns' : 'grain');

/** Metal put into the crucible or taken out again; of a lot, where the studio keeps lots. */
export interface ChargeWeighing {
  readonly kind: ChargeKind;
  readonly massG: Grams;
  readonly lot?: ChargeLot | undefined;
}

/** Why work was stopped. */
export const stopReasons = ['spill', 'burn', 'equipment', 'other'] as const;
/** One reason to stop work. */
export type StopReason = (typeof stopReasons)[number];

/** How the casting looks when it comes out of the water. */
export const castLooks = ['full', 'misrun', 'porous', 'cracked', 'not-seen'] as const;
/** One look of a casting. */
export type CastLook = (typeof castLooks)[number];

/** What may happen on a pour card; each is written to the melt book as it happens. */
export type CardEvent =
  | { readonly type: 'card-opened' }
  /** The same card goes on with another person or at another terminal. */
  | { readonly type: 'carried-on' }
  | { readonly type: 'guard-confirmed'; readonly prompts: readonly string[] }
  | ({ readonly type: 'charge-weighed' } & ChargeWeighing)
  | ({ readonly type: 'charge-taken-out' } & ChargeWeighing)
  | { readonly type: 'charge-closed' }
  /** `confirmed` says that a person stood by a doubtful reading. */
  | { readonly type: 'reading-taken'; readonly temperatureC: Celsius; readonly confirmed: boolean }
  | { readonly type: 'melt-ready' }
  /** `furnaceC` is the furnace's own display when the flask came out, null when it was not read. */
  | { readonly type: 'flask-out'; readonly furnaceC: Celsius | null }
  | { readonly type: 'poured' }
  | { readonly type: 'quenched' }
  | {
      readonly type: 'closed';
      readonly buttonMassG: Grams;
      readonly lossMassG: Grams;
      readonly look: CastLook;
      readonly note: string;
    }
  | { readonly type: 'stopped'; readonly reason: StopReason }
  | { readonly type: 'resumed' }
  | { readonly type: 'abandoned'; readonly note: string };

/** The name of a kind of event. */
export type CardEventType = CardEvent['type'];

/** An event with the moment it happened at the furnace, an ISO 8601 instant. */
export interface TimedCardEvent {
  readonly event: CardEvent;
  readonly occurredAt: string;
}
