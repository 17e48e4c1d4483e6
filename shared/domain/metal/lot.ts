/** What a lot of metal is to the studio. */
export const lotKinds = ['fine', 'grain', 'master', 'returns', 'scrap'] as const;
/** One kind of lot. */
export type LotKind = (typeof lotKinds)[number];

/** A kind in the words of the trade. */
export const lotKindNames: Readonly<Record<LotKind, string>> = {
  fine: 'fine metal',
  grain: 'casting grain',
  master: 'master alloy',
  returns: 'returns',
  scrap: 'scrap for refining',
};

/** Parts by element symbol, wt%. */
export type Parts = Readonly<Record<string, number>>;

/** What the certificate of a lot says: parts in wt% and how far each may be off, ± wt%. */
export interface Assay {
  readonly compositionWt: Parts;
  readonly toleranceWt: Parts;
}

/** A lot as the charge plan sees it; `masses` in whole milligrams. */
export interface LotOnHand extends Assay {
  readonly id: string;
  readonly code: string;
  readonly name: string;
  readonly kind: LotKind;
  readonly balanceMg: number;
  /** When it came, ISO 8601: the oldest returns are used first. */
  readonly receivedAt: string;
  /** Metal that is not on hand but could be bought. */
  readonly isBought?: true;
}

/** Least part of an element by the certificate's lower bound, wt%. */
export const lowestPart = ({ compositionWt, toleranceWt }: Assay, element: string): number =>
  Math.max(0, (compositionWt[element] ?? 0) - (toleranceWt[element] ?? 0));

/** Whether metal of this kind may go into a pot at all. */
export const mayBeCharged = (kind: LotKind): boolean => kind !== 'scrap';

/** Metal as weighed: which assay, how much, in whole milligrams. */
export interface Weighed {
  readonly assay: Assay;
  readonly massMg: number;
}

/** Parts of a mixture in wt%, expected by the certificates; empty for no metal. */
export const mixParts = (weighed: readonly Weighed[]): Parts => {
  const totalMg = weighed.reduce((sum, { massMg }) => sum + massMg, 0);
  const parts: Record<string, number> = {};
  if (totalMg === 0) return parts;
  for (const { assay, massMg } of weighed) {
    for (const [element, wt] of Object.entries(assay.compositionWt)) {
      parts[element] = (parts[element] ?? 0) + (wt * massMg) / totalMg;
    }
  }
  return parts;
};

/** Decimals of a computed assay's wt%. */
const assayStepWt = 1e-4;

/**
 * The assay of metal melted together: the parts by mass, and a tolerance that covers every composition within the
 * certificates, widened by what rounding to four decimals could hide.
 */
export const mixAssay = (weighed: readonly Weighed[]): Assay => {
  const parts = mixParts(weighed);
  const tolerances = mixParts(
    weighed.map(({ assay, massMg }) => ({
      assay: { compositionWt: assay.toleranceWt, toleranceWt: {} },
      massMg,
    })),
  );
  const each = (of: (element: string) => number): Parts =>
    Object.fromEntries(Object.keys(parts).map((element) => [element, Number(of(element).toFixed(4))]));
  return {
    compositionWt: each((element) => parts[element] ?? 0),
    toleranceWt: each(
      (element) => Math.ceil(((tolerances[element] ?? 0) + assayStepWt / 2) / assayStepWt) * assayStepWt,
    ),
  };
};

/** Fineness of a mixture in parts per thousand: expected, and at the certificates' lower bounds. */
export const mixFineness = (
  weighed: readonly Weighed[],
  metal: 'Ag' | 'Au',
): { readonly expected: number; readonly worst: number } => {
  const totalMg = weighed.reduce((sum, { massMg }) => sum + massMg, 0);
  if (totalMg === 0) return { expected: 0, worst: 0 };
  const share = (part: (assay: Assay) => number): number =>
    (weighed.reduce((sum, { assay, massMg }) => sum + part(assay) * massMg, 0) / totalMg) * 10;
  return {
    expected: share(({ compositionWt }) => compositionWt[metal] ?? 0),
    worst: share((assay) => lowestPart(assay, metal)),
  };
};

/** Writes a fineness in parts per thousand with one decimal, never rounded up: 749.96 is 749.9. */
export const formatFineness = (ppt: number): string => (Math.floor(ppt * 10 + 1e-6) / 10).toFixed(1);

/** What may be found out or decided about a lot after it came. */
export const amendmentKinds = ['assay', 'quarantined', 'released', 'moved'] as const;
/** One kind of amendment. */
export type AmendmentKind = (typeof amendmentKinds)[number];
