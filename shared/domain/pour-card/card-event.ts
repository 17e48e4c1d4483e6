import type { Celsius, Grams } from '#shared/lib/units.ts';
import type { Countersigned, StepAnswer, WorkerRole } from '../instruction/instruction-step.ts';
import type { Assay, LotKind } from '../metal/lot.ts';
import type { CardStep } from './card-step.ts';
import type { VarianceReason } from './variance.ts';

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

/** Who does a card, and as what, from the moment they opened it or took it over. */
export interface Worker {
  readonly personId: string;
  readonly role: WorkerRole;
  /** The parts of a card this person may do; null for all. */
  readonly parts: readonly CardStep[] | null;
}

/** What a photograph shows. */
export const photographSubjects = ['tree', 'defect', 'other'] as const;
/** One subject of a photograph. */
export type PhotographSubject = (typeof photographSubjects)[number];

/** What may happen on a pour card; each is written to the melt book as it happens. */
export type CardEvent =
  | { readonly type: 'card-opened'; readonly worker?: Worker | undefined }
  /** The same card goes on with another person or at another terminal. */
  | { readonly type: 'carried-on'; readonly worker?: Worker | undefined }
  | { readonly type: 'guard-confirmed'; readonly prompts: readonly string[] }
  /** Words that were read and checks that were touched, by their keys. */
  | { readonly type: 'checked'; readonly keys: readonly string[] }
  | { readonly type: 'step-done'; readonly key: string; readonly answer: StepAnswer }
  | { readonly type: 'step-skipped'; readonly key: string }
  /** Why a departure came about; `index` counts the card's departures from 0. */
  | {
      readonly type: 'variance-explained';
      readonly index: number;
      readonly reason: VarianceReason;
      readonly words: string;
      /** Whether the pieces are held until the owner has looked. */
      readonly hold: boolean;
      readonly by: Countersigned | null;
    }
  | { readonly type: 'photographed'; readonly photographId: string; readonly of: PhotographSubject }
  | ({ readonly type: 'charge-weighed' } & ChargeWeighing)
  | ({ readonly type: 'charge-taken-out' } & ChargeWeighing)
  /** `offPlan` when a caster goes on with more or less metal than the card plans. */
  | { readonly type: 'charge-closed'; readonly offPlan?: boolean | undefined }
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
