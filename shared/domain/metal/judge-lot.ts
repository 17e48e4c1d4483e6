import { isWhole, sumOfWt, type WholeRange } from '#shared/lib/whole-range.ts';
import type { Assay, LotKind } from './lot.ts';
import { metalName } from './metal-name.ts';

/** A fault of what was typed about a lot, at its field. */
export interface LotFault {
  readonly field: 'compositionWt' | 'toleranceWt' | 'massG';
  readonly message: string;
}

const fault = (field: LotFault['field'], message: string): LotFault => ({ field, message });

/** How far the parts of a certificate may be off 100 wt%, by their own rounding. */
const sumSlackWt = 0.05;

/** Fine metal is certified by its purity alone: the rest, at most this much, stands for nothing. */
const finestRestWt = 1;

/** Between which sums the parts of a lot's certificate count as whole. */
export const wholeOfLot = (kind: LotKind | ''): WholeRange => ({
  least: 100 - (kind === 'fine' ? finestRestWt : sumSlackWt),
  most: 100 + sumSlackWt,
});

const compositionFault = (kind: LotKind, { compositionWt }: Assay): LotFault | null => {
  const sum = sumOfWt(Object.values(compositionWt));
  if (isWhole(sum, wholeOfLot(kind))) return null;
  const wanted = kind === 'fine' ? 'between 99 and 100 wt%' : 'to 100 wt%';
  return fault('compositionWt', `The parts come to ${sum.toFixed(2)} wt%; they must come ${wanted}.`);
};

/** The metals that are marked: without a tolerance for them no fineness could be defended. */
const marked = ['Au', 'Ag'] as const;

const toleranceFault = ({ compositionWt, toleranceWt }: Assay): LotFault | null => {
  const stray = Object.keys(toleranceWt).find((element) => !((compositionWt[element] ?? 0) > 0));
  if (stray)
    return fault('toleranceWt', `There is a tolerance for ${metalName(stray)}, which the lot does not hold.`);
  const missing = marked.find((metal) => (compositionWt[metal] ?? 0) > 0 && toleranceWt[metal] === undefined);
  if (missing) {
    return fault(
      'toleranceWt',
      `Give the certificate's tolerance for ${metalName(missing)}; 0 where it gives none.`,
    );
  }
  return null;
};

/** What is wrong with the assay of a lot, or null. */
export const faultOfAssay = (kind: LotKind, assay: Assay): LotFault | null =>
  compositionFault(kind, assay) ?? toleranceFault(assay);

/** Lots a small studio hardly ever receives, g: outside this the unit is asked about (the studio's own choice, no source). */
const usualMassG = { least: 1, most: 5000 };

/** A question about a mass that looks as if it were typed in another unit, or null. */
const questionMass = (massG: number): LotFault | null => {
  if (massG > usualMassG.most)
    return fault('massG', `${massG} g is a great deal for one lot: is it in grams?`);
  if (massG < usualMassG.least)
    return fault('massG', `${massG} g is very little for a lot: is it in grams, not ounces?`);
  return null;
};

/** A question about a certificate whose tolerance is wider than the alloy's own, or null. */
const questionTolerance = (assay: Assay, alloy: Assay | null): LotFault | null => {
  const wide = Object.entries(assay.toleranceWt).find(([element, tolerance]) => {
    const allowed = alloy?.toleranceWt[element];
    return allowed !== undefined && tolerance > allowed + 1e-9;
  });
  if (!wide || !alloy) return null;
  const [element, tolerance] = wide;
  return fault(
    'toleranceWt',
    `The certificate allows ${metalName(element)} ± ${tolerance} wt%, the alloy ± ${alloy.toleranceWt[element]}: is that right?`,
  );
};

/** A question about a lot of an alloy whose parts are not the alloy's, or null. */
const questionParts = (assay: Assay, alloy: Assay | null): LotFault | null => {
  if (!alloy) return null;
  const elements = [...new Set([...Object.keys(assay.compositionWt), ...Object.keys(alloy.compositionWt)])];
  const off = elements.find((element) => {
    const difference = Math.abs((assay.compositionWt[element] ?? 0) - (alloy.compositionWt[element] ?? 0));
    return difference > (alloy.toleranceWt[element] ?? 0.1) + 1e-9;
  });
  return off === undefined
    ? null
    : fault('compositionWt', `Its ${metalName(off)} is outside what the alloy allows: is it of that alloy?`);
};

/** What a person should look at twice before a lot is taken in; it is taken when they stand by it. */
export const questionsOfLot = (
  lot: Assay & { readonly massG: number },
  alloy: Assay | null,
): readonly LotFault[] =>
  [questionMass(lot.massG), questionTolerance(lot, alloy), questionParts(lot, alloy)].flatMap(
    (each) => each ?? [],
  );
