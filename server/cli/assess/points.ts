import data from '#shared/metallurgy/data/assessment-points.json' with { type: 'json' };

/** What was measured of an alloy. */
export type Quantity = 'liquidus' | 'solidus' | 'solvus';

/** What a published value is used for. */
export type Use = 'fit' | 'held-back' | 'doubtful' | 'not-fitted';

/** One published value, °C, with the uncertainty that sets its weight. */
export interface PublishedValue {
  readonly quantity: Quantity;
  readonly valueC: number;
  readonly use: Use;
  readonly sigmaC: number;
  readonly why?: string;
}

/** One alloy with its published values. */
export interface AssessmentPoint {
  readonly id: string;
  readonly name: string;
  readonly stage: string;
  readonly wt: Readonly<Record<string, number>>;
  readonly basis: string;
  readonly source: string;
  readonly values: readonly PublishedValue[];
}

/** Every published point of the assessment. */
export const POINTS = data.points as unknown as readonly AssessmentPoint[];
