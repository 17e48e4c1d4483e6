import { formatMass, type Grams } from '#shared/lib/units.ts';
import { defaultToleranceWt } from '../metal/charge-request.ts';
import { formatFineness, mixFineness, mixParts, type Parts } from '../metal/lot.ts';
import { metalName } from '../metal/metal-name.ts';
import { chargedG, type CardContext, type CardState, type ChargeAlloy } from './card-state.ts';

/** What a charge by lots comes to, at any moment of weighing in. */
export interface MetalVerdict {
  /** Metal in the crucible that is of no lot: of it nothing is known. */
  readonly unlottedG: Grams;
  readonly partsWt: Parts;
  /** Fineness of the marked metal, parts per thousand: by the certificates, and at their lower bounds. */
  readonly expectedPpt: number;
  readonly worstPpt: number;
  /** Elements outside what the alloy allows, with how far they are off the alloy, wt%. */
  readonly offWt: readonly { readonly element: string; readonly wt: number }[];
}

const offOf = (partsWt: Parts, { compositionWt, toleranceWt }: ChargeAlloy): MetalVerdict['offWt'] =>
  [...new Set([...Object.keys(compositionWt), ...Object.keys(partsWt)])].flatMap((element) => {
    const wt = (partsWt[element] ?? 0) - (compositionWt[element] ?? 0);
    return Math.abs(wt) > (toleranceWt[element] ?? defaultToleranceWt) + 1e-9 ? [{ element, wt }] : [];
  });

/** What the lots in the crucible come to; null where none was weighed in, or the card knows no alloy to judge by. */
export const judgeMetal = (
  state: Pick<CardState, 'charge' | 'lots'>,
  { alloy }: Pick<CardContext, 'alloy'>,
): MetalVerdict | null => {
  const { lots = [] } = state;
  if (!alloy || lots.length === 0) return null;
  const weighed = lots.map(({ massG, ...assay }) => ({ assay, massMg: Math.round(massG * 1000) }));
  const lottedMg = weighed.reduce((sum, { massMg }) => sum + massMg, 0);
  const partsWt = mixParts(weighed);
  const { expected, worst } = mixFineness(weighed, alloy.markedMetal);
  return {
    unlottedG: Math.round(chargedG(state) * 1000 - lottedMg) / 1000,
    partsWt,
    expectedPpt: expected,
    worstPpt: worst,
    offWt: offOf(partsWt, alloy),
  };
};

/** Why a charge by lots may not be closed, in one sentence; null when it may. */
export const sentenceOfMetal = (
  { unlottedG, worstPpt }: MetalVerdict,
  { alloy, units }: Pick<CardContext, 'alloy' | 'units'>,
): string | null => {
  if (unlottedG > 0) {
    return `${formatMass(unlottedG, units.mass)} in the crucible is of no lot, so its fineness is not known: take it out, or weigh it in by its lot.`;
  }
  if (!alloy || worstPpt >= alloy.markPpt - 1e-9) return null;
  return `At the certificates' lower bounds the charge holds ${formatFineness(worstPpt)} parts per thousand of ${metalName(alloy.markedMetal)}; the mark wants ${alloy.markPpt}. Take a poorer lot out, or add a finer one.`;
};
