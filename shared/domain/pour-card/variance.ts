import type { Countersigned } from '../instruction/instruction-step.ts';

/** The short list of reasons for a departure. */
export const varianceReasons = ['equipment', 'material', 'time', 'judgement', 'mistake', 'other'] as const;
/** One reason for a departure. */
export type VarianceReason = (typeof varianceReasons)[number];

/** A reason in a few words. */
export const varianceReasonNames: Readonly<Record<VarianceReason, string>> = {
  equipment: 'Equipment failed',
  material: 'Metal or mould',
  time: 'Ran out of time',
  judgement: 'Judged better so',
  mistake: 'A slip',
  other: 'Something else',
};

/** Why a departure came about, and who stood by. */
export interface Explanation {
  readonly at: string;
  readonly reason: VarianceReason;
  readonly words: string;
  readonly hold: boolean;
  readonly by: Countersigned | null;
}

/** Something that went otherwise than the card says; with its reason it is a variance of the melt and its pieces. */
export interface Departure {
  readonly kind:
    | 'reading-confirmed'
    | 'flask-off-temperature'
    | 'melt-off-window'
    | 'poured-late'
    | 'quenched-early'
    | 'quenched-late'
    | 'loss-over-limit'
    | 'composition-off'
    | 'charge-off-plan'
    | 'cast-fault'
    | 'work-stopped'
    | 'step-skipped'
    | 'step-answer'
    | 'instrument-missing';
  readonly sentence: string;
  readonly at: string;
  /** So far off that a second person has to sign. */
  readonly isMajor?: boolean;
  readonly explained?: Explanation;
}
