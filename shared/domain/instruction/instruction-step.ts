import type { Celsius, Grams } from '#shared/lib/units.ts';
import type { AlloyFamily } from '../alloy/alloy-family.ts';
import type { CastingMethod } from '../casting/casting-method.ts';
import type { CardStep } from '../pour-card/card-step.ts';

/** Pictures that may stand beside a caution. */
export const safetySigns = [
  'face-shield',
  'heat-gloves',
  'apron',
  'closed-shoes',
  'dry-charge',
  'hot-surface',
  'ventilation',
  'shaded-glasses',
  'steam',
  'nickel',
] as const;
/** One picture of a caution. */
export type SafetySign = (typeof safetySigns)[number];

/** What an alloy holds that wants a caution of its own. */
export const hazards = ['nickel', 'palladium', 'zinc'] as const;
/** One hazard of an alloy. */
export type Hazard = (typeof hazards)[number];

/** As what a person stands at the furnace. */
export const workerRoles = ['caster', 'apprentice'] as const;
/** One of the two. */
export type WorkerRole = (typeof workerRoles)[number];

/** Where a step applies; an empty list does not narrow it. */
export interface StepConditions {
  readonly methods: readonly CastingMethod[];
  readonly families: readonly AlloyFamily[];
  readonly roles: readonly WorkerRole[];
  /** Applies when the alloy holds any of these. */
  readonly hazards: readonly Hazard[];
}

/** The kinds of steps an instruction is written in. */
export const stepKinds = [
  'say',
  'check',
  'weigh',
  'read',
  'wait',
  'photograph',
  'scan',
  'choose',
  'countersign',
  'hold-to-act',
] as const;
/** One kind of step. */
export type StepKind = (typeof stepKinds)[number];

interface StepBase {
  /** Names the step in the record, for ever. */
  readonly key: string;
  /** The part of the card that it comes before. */
  readonly before: CardStep;
  /** What to do, in one sentence. */
  readonly sentence: string;
  readonly when: StepConditions;
  /** Whether a caster may skip it with a reason; an apprentice never may. */
  readonly maySkip: boolean;
}

/** Limits of a number, either of them open. */
export interface Limits {
  readonly low: number | null;
  readonly high: number | null;
}

/** One step of a work instruction. */
export type InstructionStep = StepBase &
  (
    | { readonly kind: 'say' }
    | { readonly kind: 'check'; readonly sign: SafetySign | null }
    /** A mass to write down, g; outside its limits it is a variance. */
    | { readonly kind: 'weigh'; readonly limitsG: Limits }
    /** A temperature to write down, °C; outside its limits it is a variance. */
    | { readonly kind: 'read'; readonly limitsC: Limits }
    /** Time that must pass since the card came to this part, s. */
    | { readonly kind: 'wait'; readonly seconds: number }
    | { readonly kind: 'photograph' }
    /** The flask's own code again, so that the right one is in hand. */
    | { readonly kind: 'scan' }
    /** One of several answers; some of them are a variance. */
    | { readonly kind: 'choose'; readonly options: readonly ChooseOption[] }
    /** Another person looks and signs. */
    | { readonly kind: 'countersign' }
    | { readonly kind: 'hold-to-act'; readonly act: string }
  );

/** One answer that may be chosen. */
export interface ChooseOption {
  readonly words: string;
  readonly isVariance: boolean;
}

/** A step of one kind. */
export type StepOf<Kind extends StepKind> = Extract<InstructionStep, { readonly kind: Kind }>;

/** A second person who looked and signed. `onDevice` when the terminal alone could check the PIN. */
export interface Countersigned {
  /** Names this signature, for ever. */
  readonly id: string;
  readonly personId: string;
  readonly name: string;
  readonly onDevice: boolean;
}

/** What was done at a step. */
export type StepAnswer =
  | { readonly kind: 'say' | 'check' | 'wait' | 'hold-to-act' }
  | { readonly kind: 'weigh'; readonly massG: Grams }
  | { readonly kind: 'read'; readonly temperatureC: Celsius }
  | { readonly kind: 'photograph'; readonly photographId: string }
  | { readonly kind: 'scan'; readonly code: string }
  | { readonly kind: 'choose'; readonly option: string }
  | { readonly kind: 'countersign'; readonly by: Countersigned };
