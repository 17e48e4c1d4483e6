/** Between which sums of its parts a composition counts as whole, wt%. */
export interface WholeRange {
  readonly least: number;
  readonly most: number;
}

/** A composition that is set, not measured, comes to 100 but for the rounding of its third decimal. */
export const exactWhole: WholeRange = { least: 99.995, most: 100.005 };

/** The sum of parts, wt%, without what binary fractions add to it. */
export const sumOfWt = (parts: readonly number[]): number =>
  Number(parts.reduce((sum, wt) => sum + wt, 0).toFixed(6));

/** Whether parts that sum to so much are a whole. */
export const isWhole = (sumWt: number, { least, most }: WholeRange): boolean =>
  sumWt >= least && sumWt <= most;
