import type { ChargeRequest } from './charge-request.ts';
import { elementsOf, toleranceOf, weighingStepMg } from './charge-request.ts';
import { mixFineness, mixParts, type LotOnHand, type Parts } from './lot.ts';

/** One line of a charge plan: how much of which lot, in whole milligrams. */
export interface ChargeLine {
  readonly lot: LotOnHand;
  readonly massMg: number;
}

/** A charge plan that holds every limit, with what it comes to. */
export interface ChargePlan {
  readonly lines: readonly ChargeLine[];
  readonly partsWt: Parts;
  readonly expectedPpt: number;
  readonly worstPpt: number;
  readonly returnsShare: number;
}

/** What a set of lines comes to. */
export const summarise = (lines: readonly ChargeLine[], metal: 'Ag' | 'Au'): ChargePlan => {
  const weighed = lines.map(({ lot, massMg }) => ({ assay: lot, massMg }));
  const totalMg = lines.reduce((sum, { massMg }) => sum + massMg, 0);
  const returnsMg = lines.reduce((sum, { lot, massMg }) => sum + (lot.kind === 'returns' ? massMg : 0), 0);
  const { expected, worst } = mixFineness(weighed, metal);
  return {
    lines,
    partsWt: mixParts(weighed),
    expectedPpt: expected,
    worstPpt: worst,
    returnsShare: totalMg === 0 ? 0 : returnsMg / totalMg,
  };
};

/** The faults of a plan against its request, one sentence each; an exact check, independent of the solver. */
export const faultsOf = (plan: ChargePlan, request: ChargeRequest): readonly string[] => {
  const totalMg = plan.lines.reduce((sum, { massMg }) => sum + massMg, 0);
  const faults: string[] = [];
  if (Math.abs(totalMg - request.wantedMg) > weighingStepMg / 2)
    faults.push('The masses do not come to the metal wanted.');
  for (const element of elementsOf(request)) {
    const off = (plan.partsWt[element] ?? 0) - (request.targetWt[element] ?? 0);
    if (Math.abs(off) > toleranceOf(request, element) + 1e-9) {
      faults.push(
        `${element} would be ${Math.abs(off).toFixed(2)} wt% ${off > 0 ? 'over' : 'under'} the alloy.`,
      );
    }
  }
  if (plan.worstPpt < request.markPpt - 1e-9) faults.push('The fineness could fall below the mark.');
  if (plan.returnsShare > request.returnsShare + 1e-9) faults.push('There are too many returns.');
  for (const { lot, massMg } of plan.lines) {
    if (massMg > lot.balanceMg) faults.push(`Lot ${lot.code} does not hold that much.`);
  }
  return faults;
};

/** Rounds grams to weighable masses that still come to the same total: the largest remainders are rounded up. */
export const roundToWeighable = (grams: readonly number[], mostMg: readonly number[]): readonly number[] => {
  const steps = grams.map((gram) => (gram * 1000) / weighingStepMg);
  const floors = steps.map((step) => Math.floor(step + 1e-7));
  let missing =
    Math.round(steps.reduce((sum, step) => sum + step, 0)) - floors.reduce((sum, step) => sum + step, 0);
  const byRemainder = steps
    .map((step, index) => ({ index, remainder: step - (floors[index] ?? 0) }))
    .sort((a, b) => b.remainder - a.remainder);
  for (const { index } of byRemainder) {
    const floor = floors[index] ?? 0;
    if (missing <= 0) break;
    if (floor === 0 || (floor + 1) * weighingStepMg > (mostMg[index] ?? 0)) continue;
    floors[index] = floor + 1;
    missing -= 1;
  }
  return floors.map((step) => step * weighingStepMg);
};
