import type { LotOnHand, Parts } from './lot.ts';

/** What a charge is planned for; masses in whole milligrams. */
export interface ChargeRequest {
  readonly wantedMg: number;
  /** The alloy's parts, wt%. */
  readonly targetWt: Parts;
  /** How far each element may be off, ± wt%. */
  readonly toleranceWt: Parts;
  /** The metal the alloy is marked by, and the least it must hold at the certificates' lower bounds, parts per thousand. */
  readonly markedMetal: 'Ag' | 'Au';
  readonly markPpt: number;
  /** The largest share of returns. */
  readonly returnsShare: number;
  readonly lots: readonly LotOnHand[];
}

/** What the balance can tell apart in a charge, mg: every planned mass is a whole number of these. */
export const weighingStepMg = 10;

/** The least anyone weighs in of one lot, mg. */
export const leastWeighingMg = 50;

/** Tolerance of an element that the alloy gives none for, ± wt%. */
export const defaultToleranceWt = 0.1;

/** The tolerance of an element, ± wt%. */
export const toleranceOf = ({ toleranceWt }: Pick<ChargeRequest, 'toleranceWt'>, element: string): number =>
  toleranceWt[element] ?? defaultToleranceWt;

/** Every element that the target or a lot holds. */
export const elementsOf = ({
  targetWt,
  lots,
}: Pick<ChargeRequest, 'targetWt' | 'lots'>): readonly string[] => [
  ...new Set([...Object.keys(targetWt), ...lots.flatMap(({ compositionWt }) => Object.keys(compositionWt))]),
];
