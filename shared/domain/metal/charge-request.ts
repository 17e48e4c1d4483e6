import type { LotOnHand, Parts } from './lot.ts';

/** One line of a charge: how much of which lot, in whole milligrams. */
export interface ChargeLine {
  readonly lot: LotOnHand;
  readonly massMg: number;
}

/** What a charge is planned for; masses in whole milligrams. */
export interface ChargeRequest {
  /** The mass the whole charge should come to. */
  readonly wantedMg: number;
  /** How far the whole may be above and below that where nothing else fits; none unless given. */
  readonly overMg?: number;
  readonly underMg?: number;
  /** What is in the crucible already and stays there. */
  readonly weighed?: readonly ChargeLine[];
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

/** Every element that the target, a lot or the crucible holds. */
export const elementsOf = ({
  targetWt,
  lots,
  weighed = [],
}: Pick<ChargeRequest, 'targetWt' | 'lots' | 'weighed'>): readonly string[] => [
  ...new Set(
    [
      targetWt,
      ...[...lots, ...weighed.map(({ lot }) => lot)].map(({ compositionWt }) => compositionWt),
    ].flatMap(Object.keys),
  ),
];

/** The mass of some lines, mg. */
export const massOfLines = (lines: readonly ChargeLine[]): number =>
  lines.reduce((sum, { massMg }) => sum + massMg, 0);
