import { z } from 'zod';
import type { StepAnswer } from '#shared/domain/instruction/instruction-step.ts';
import type { WorkInstruction } from '#shared/domain/instruction/work-instruction.ts';
import {
  castLooks,
  chargeKinds,
  photographSubjects,
  stopReasons,
  type CardEvent,
} from '#shared/domain/pour-card/card-event.ts';
import type { CardContext } from '#shared/domain/pour-card/card-state.ts';
import { varianceReasons } from '#shared/domain/pour-card/variance.ts';
import type { Casting } from './casting.ts';
import { lotKinds } from '#shared/domain/metal/lot.ts';
import type { SavedChargePlan } from './charge.ts';
import { instant, massG, massOrNoneG, optionalWords, temperatureC, words, type Abilities } from './common.ts';
import { lotCompositionWt, lotToleranceWt } from './lot.ts';
import { pin } from './session.ts';

/** The lot metal is taken from, as the terminal knows it; the server writes down what its own records say. */
const chargeLot = z.object({
  id: z.uuid(),
  code: z.string().max(20),
  kind: z.enum(lotKinds),
  compositionWt: lotCompositionWt,
  toleranceWt: lotToleranceWt,
});

const stepKey = z.string().min(1).max(60);

/** A second person's sign as the terminal has it; the server looks it up in its own records. */
const countersigned = z.object({
  id: z.uuid(),
  personId: z.uuid(),
  name: z.string().min(1).max(80),
  onDevice: z.boolean(),
});

const stepAnswer = z.discriminatedUnion('kind', [
  z.object({ kind: z.enum(['say', 'check', 'wait', 'hold-to-act']) }),
  z.object({ kind: z.literal('weigh'), massG: massOrNoneG }),
  z.object({ kind: z.literal('read'), temperatureC }),
  z.object({ kind: z.literal('photograph'), photographId: z.uuid() }),
  z.object({ kind: z.literal('scan'), code: z.string().min(1).max(60) }),
  z.object({ kind: z.literal('choose'), option: z.string().min(1).max(120) }),
  z.object({ kind: z.literal('countersign'), by: countersigned }),
]) satisfies z.ZodType<StepAnswer>;

/** What may be sent from a terminal to the melt book. */
export const cardEvent = z.discriminatedUnion('type', [
  z.object({ type: z.literal('guard-confirmed'), prompts: z.array(stepKey).max(40) }),
  z.object({ type: z.literal('checked'), keys: z.array(stepKey).min(1).max(40) }),
  z.object({ type: z.literal('step-done'), key: stepKey, answer: stepAnswer }),
  z.object({ type: z.literal('step-skipped'), key: stepKey }),
  z.object({
    type: z.literal('variance-explained'),
    index: z.int().min(0).max(10_000),
    reason: z.enum(varianceReasons, { error: 'Choose the reason.' }),
    words: optionalWords(1000),
    hold: z.boolean(),
    by: countersigned.nullable(),
  }),
  z.object({ type: z.literal('photographed'), photographId: z.uuid(), of: z.enum(photographSubjects) }),
  z.object({
    type: z.literal('charge-weighed'),
    kind: z.enum(chargeKinds),
    massG,
    lot: chargeLot.optional(),
  }),
  z.object({
    type: z.literal('charge-taken-out'),
    kind: z.enum(chargeKinds),
    massG,
    lot: chargeLot.optional(),
  }),
  z.object({ type: z.literal('charge-closed'), offPlan: z.boolean().optional() }),
  z.object({ type: z.literal('reading-taken'), temperatureC, confirmed: z.boolean().default(false) }),
  z.object({ type: z.literal('melt-ready') }),
  z.object({ type: z.literal('flask-out'), furnaceC: temperatureC.nullable() }),
  z.object({ type: z.literal('poured') }),
  z.object({ type: z.literal('quenched') }),
  z.object({
    type: z.literal('closed'),
    buttonMassG: massOrNoneG,
    lossMassG: massOrNoneG,
    look: z.enum(castLooks),
    note: optionalWords(2000),
  }),
  z.object({ type: z.literal('stopped'), reason: z.enum(stopReasons) }),
  z.object({ type: z.literal('resumed') }),
  z.object({ type: z.literal('abandoned'), note: words(500, 'Say why the card ends here.') }),
]) satisfies z.ZodType<CardEvent>;

/** Records one event; `key` is made by the terminal once, so that sending it again records nothing new. */
export const recordEventRequest = z.object({ key: z.uuid(), occurredAt: instant, event: cardEvent });
/** Records one event. */
export type RecordEventRequest = z.input<typeof recordEventRequest>;

/** Looks up what a scanned or typed code means; the code is judged by the flask code's own rules. */
export const findCardQuery = z.object({ code: z.string().max(500, 'That is far longer than a flask code.') });

/** Opens a casting's card at this terminal; `carryOn` takes one's own card, or as the owner anyone's, along from another terminal. */
export const openCardRequest = z.object({
  key: z.uuid(),
  occurredAt: instant,
  carryOn: z.boolean().default(false),
});
/** Opens a casting's card. */
export type OpenCardRequest = z.input<typeof openCardRequest>;

/** Asks another person to sign at the terminal for something on a melt. */
export const countersignMeltRequest = z.object({ personId: z.uuid('Choose who signs.'), pin });
/** Asks another person to sign. */
export type CountersignMeltRequest = z.input<typeof countersignMeltRequest>;

/** A photograph is sent as the body; `id` is made once, so that sending it again keeps it once. */
export const addPhotographQuery = z.object({ id: z.uuid() });

/** A photograph of a melt. */
export interface Photograph {
  readonly id: string;
  readonly mediaType: string;
  readonly bytes: number;
  readonly person: string;
  readonly at: string;
}

/** One event of the melt book. */
export interface MeltEvent {
  readonly seq: number;
  readonly key: string;
  readonly event: CardEvent;
  readonly person: string;
  readonly terminal: string;
  readonly occurredAt: string;
  readonly recordedAt: string;
}

/** Everything a terminal shows for one flask. */
export interface PourCard {
  readonly casting: Casting;
  /** The alloy revision's composition in wt%, for the melt beam. */
  readonly compositionWt: Readonly<Record<string, number>>;
  readonly rangeBasis: 'computed' | 'measured';
  readonly context: CardContext;
  readonly instruction: WorkInstruction & { readonly revision: number };
  /** The melt this card is writing to, or null until it is opened. */
  readonly melt: {
    readonly id: string;
    readonly code: string;
    readonly openedBy: string;
    readonly terminal: string;
  } | null;
  readonly events: readonly MeltEvent[];
  /** What to weigh in, where the charge was planned from lots. */
  readonly chargePlan?: SavedChargePlan | null;
  readonly abilities: Abilities<'open' | 'record'>;
  readonly serverTime: string;
}
