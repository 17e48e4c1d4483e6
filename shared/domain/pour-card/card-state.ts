import type { Celsius, Grams, Units } from '#shared/lib/units.ts';
import type { InstructionStep } from '../instruction/instruction-step.ts';
import type { StudioLimits } from '../studio/studio-limits.ts';
import type { Assay } from '../metal/lot.ts';
import type { CardEvent, CastLook, ChargeKind, ChargeLot, StopReason, Worker } from './card-event.ts';
import type { CardFigures } from './card-figures.ts';
import type { CardStep } from './card-step.ts';
import type { Departure } from './variance.ts';

/** What the metal of a charge must come to: the alloy's parts, and the least of the marked metal, parts per thousand. */
export interface ChargeAlloy extends Assay {
  readonly markedMetal: 'Ag' | 'Au';
  readonly markPpt: number;
}

/** What a card asks of whoever does it, beside the metal's own figures. */
export interface CardRules {
  /** The instruction's steps that belong to this work, in order; which of them are asked depends on who does the card. */
  readonly steps: readonly InstructionStep[];
  readonly flaskCode: string;
  /** How many times over its limit a departure wants a second person's sign. */
  readonly countersignFactor: number;
}

/** What a running card is judged against; fixed when the card is opened. */
export interface CardContext {
  readonly figures: CardFigures;
  readonly limits: StudioLimits;
  readonly plannedMetalG: Grams;
  /** Cards opened before lots were kept have none. */
  readonly alloy?: ChargeAlloy;
  /** Cards opened before instructions had steps have none, and ask for no reasons. */
  readonly rules?: CardRules;
  /** The units in which sentences are written. */
  readonly units: Units;
}

/** A melt temperature with the moment it was read. */
export interface Reading {
  readonly temperatureC: Celsius;
  readonly at: string;
}

/** The pour as it happened: time, last melt reading, mould temperature expected by the cooling law. */
export interface Pour {
  readonly at: string;
  readonly meltC: Celsius | null;
  readonly flaskC: Celsius;
  readonly secondsOut: number;
}

/** Metal out at the end of the card. */
export interface Closing {
  readonly at: string;
  readonly buttonMassG: Grams;
  readonly lossMassG: Grams;
  /** Metal in less button and loss. */
  readonly castMassG: Grams;
  readonly look: CastLook;
  readonly note: string;
}

/** What of one lot is in the crucible. */
export interface ChargedLot extends ChargeLot {
  readonly massG: Grams;
}

/** How a step of the instruction was settled. */
export interface SettledStep {
  readonly at: string;
  readonly how: 'done' | 'skipped';
}

/** Where a pour card stands: the fold of its events. */
export interface CardState {
  readonly step: CardStep | 'done' | 'abandoned';
  /** Since when the card is at this part; absent on records older than instructions with steps. */
  readonly since?: string;
  /** Who does the card; absent on records older than that question. */
  readonly worker?: Worker;
  /** The instruction's steps that are behind, by their keys. */
  readonly settled?: Readonly<Record<string, SettledStep>>;
  readonly stopped: StopReason | null;
  readonly charge: Readonly<Record<ChargeKind, Grams>>;
  /** The part of the charge that was weighed in by lot; absent where none was. */
  readonly lots?: readonly ChargedLot[];
  readonly readings: readonly Reading[];
  readonly flaskOut: { readonly at: string; readonly startC: Celsius } | null;
  readonly pour: Pour | null;
  readonly quenchedAt: string | null;
  readonly closing: Closing | null;
  readonly departures: readonly Departure[];
  readonly lastEvent: CardEvent['type'] | null;
}

/** A card before anything has happened on it. */
export const freshCard: CardState = {
  step: 'guard',
  stopped: null,
  charge: { grain: 0, returns: 0 },
  readings: [],
  flaskOut: null,
  pour: null,
  quenchedAt: null,
  closing: null,
  departures: [],
  lastEvent: null,
};

/** Metal in the crucible, g; rounded to the milligram so that sums of weighings compare exactly. */
export const chargedG = ({ charge }: Pick<CardState, 'charge'>): Grams =>
  Math.round((charge.grain + charge.returns) * 1000) / 1000;

/** The last melt reading, or null before the first. */
export const lastReading = ({ readings }: Pick<CardState, 'readings'>): Reading | null =>
  readings.at(-1) ?? null;

/** Whether nothing more can happen on the card. */
export const isOver = ({ step }: Pick<CardState, 'step'>): boolean => step === 'done' || step === 'abandoned';
