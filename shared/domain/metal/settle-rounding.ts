import { faultsOf, summarise, type ChargePlan } from './charge-plan.ts';
import { leastWeighingMg, weighingStepMg, type ChargeLine, type ChargeRequest } from './charge-request.ts';

/** A change of one weighing step: more of one line, less of another, or only one of the two. */
interface Shift {
  readonly more: number | null;
  readonly less: number | null;
}

const shiftsOf = (count: number, { overMg = 0, underMg = 0 }: ChargeRequest): readonly Shift[] => {
  const every = Array.from({ length: count }, (_, index) => index);
  return [
    ...every.flatMap((more) => every.filter((less) => less !== more).map((less) => ({ more, less }))),
    ...(overMg > 0 || underMg > 0
      ? every.flatMap((index) => [
          { more: index, less: null },
          { more: null, less: index },
        ])
      : []),
  ];
};

const shifted = (lines: readonly ChargeLine[], { more, less }: Shift): readonly ChargeLine[] =>
  lines.map(({ lot, massMg }, index) => {
    const steps = index === more ? 1 : index === less ? -1 : 0;
    return { lot, massMg: massMg + steps * weighingStepMg };
  });

const isWeighable = (lines: readonly ChargeLine[]): boolean =>
  lines.every(({ lot, massMg }) => massMg >= leastWeighingMg && massMg <= lot.balanceMg);

/** More lines than this have too many neighbours to look at. */
const mostLines = 8;

/**
 * A plan from lines rounded to weighable masses; where the rounding broke a limit, the nearest lines, one or two weighing
 * steps away, that hold them all. Null when there are none.
 */
export const settleRounding = (lines: readonly ChargeLine[], request: ChargeRequest): ChargePlan | null => {
  const holding = (candidate: readonly ChargeLine[]): ChargePlan | null => {
    const plan = summarise(candidate, request.markedMetal, request.weighed);
    return faultsOf(plan, request).length === 0 ? plan : null;
  };
  const asItIs = holding(lines);
  if (asItIs || lines.length > mostLines) return asItIs;
  const shifts = shiftsOf(lines.length, request);
  const near = shifts.map((shift) => shifted(lines, shift)).filter(isWeighable);
  for (const candidate of near) {
    const plan = holding(candidate);
    if (plan) return plan;
  }
  for (const candidate of near) {
    for (const shift of shifts) {
      const further = shifted(candidate, shift);
      const plan = isWeighable(further) ? holding(further) : null;
      if (plan) return plan;
    }
  }
  return null;
};
