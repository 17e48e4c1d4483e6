import {
  elementsOf,
  massOfLines,
  toleranceOf,
  weighingStepMg,
  type ChargeLine,
  type ChargeRequest,
} from './charge-request.ts';
import { mixFineness, mixParts, type Parts } from './lot.ts';

/** A charge: what is (still) to be weighed, and what the whole comes to. */
export interface ChargePlan {
  readonly lines: readonly ChargeLine[];
  /** The whole charge, crucible included, mg. */
  readonly totalMg: number;
  readonly partsWt: Parts;
  readonly expectedPpt: number;
  readonly worstPpt: number;
  readonly returnsShare: number;
}

/** What some lines come to, together with what is in the crucible already. */
export const summarise = (
  lines: readonly ChargeLine[],
  metal: 'Ag' | 'Au',
  weighed: readonly ChargeLine[] = [],
): ChargePlan => {
  const all = [...weighed, ...lines];
  const mixed = all.map(({ lot, massMg }) => ({ assay: lot, massMg }));
  const totalMg = massOfLines(all);
  const returnsMg = massOfLines(all.filter(({ lot }) => lot.kind === 'returns'));
  const { expected, worst } = mixFineness(mixed, metal);
  return {
    lines,
    totalMg,
    partsWt: mixParts(mixed),
    expectedPpt: expected,
    worstPpt: worst,
    returnsShare: totalMg === 0 ? 0 : returnsMg / totalMg,
  };
};

const massFaults = (
  { totalMg }: ChargePlan,
  { wantedMg, overMg = 0, underMg = 0 }: ChargeRequest,
): readonly string[] => {
  const tooMuch = totalMg > wantedMg + overMg + weighingStepMg / 2;
  const tooLittle = totalMg < wantedMg - underMg - weighingStepMg / 2;
  return tooMuch || tooLittle ? ['The masses do not come to the metal wanted.'] : [];
};

const elementFaults = ({ partsWt }: ChargePlan, request: ChargeRequest): readonly string[] =>
  elementsOf(request).flatMap((element) => {
    const off = (partsWt[element] ?? 0) - (request.targetWt[element] ?? 0);
    if (Math.abs(off) <= toleranceOf(request, element) + 1e-9) return [];
    return [`${element} would be ${Math.abs(off).toFixed(2)} wt% ${off > 0 ? 'over' : 'under'} the alloy.`];
  });

const lotFaults = ({ lines }: ChargePlan): readonly string[] =>
  lines.flatMap(({ lot, massMg }) =>
    massMg > lot.balanceMg ? [`Lot ${lot.code} does not hold that much.`] : [],
  );

/** The faults of a plan against its request, one sentence each; an exact check, independent of the solver. */
export const faultsOf = (plan: ChargePlan, request: ChargeRequest): readonly string[] => [
  ...massFaults(plan, request),
  ...elementFaults(plan, request),
  ...(plan.worstPpt < request.markPpt - 1e-9 ? ['The fineness could fall below the mark.'] : []),
  ...(plan.returnsShare > request.returnsShare + 1e-9 ? ['There are too many returns.'] : []),
  ...lotFaults(plan),
];

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
