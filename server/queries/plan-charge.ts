import { buildChargeModel, writeChargeModel, type ChargeModel } from '#shared/domain/metal/charge-model.ts';
import {
  faultsOf,
  roundToWeighable,
  summarise,
  type ChargeLine,
  type ChargePlan,
} from '#shared/domain/metal/charge-plan.ts';
import type { ChargeRequest } from '#shared/domain/metal/charge-request.ts';
import { explainLimit, isBought, withBoughtMetal } from '#shared/domain/metal/explain-shortfall.ts';
import { solveLinear } from '../services/solver/solve-linear.ts';

/** A plan that holds every limit, or what stands in the way and what to add. */
export type ChargeOutcome =
  | { readonly kind: 'planned'; readonly plan: ChargePlan }
  | {
      readonly kind: 'short';
      /** Sentences that say which limits stand in the way. */
      readonly obstacles: readonly string[];
      /** Metal that would do, if it were bought; empty when even that would not help. */
      readonly wouldDo: readonly { readonly name: string; readonly massMg: number }[];
    };

/** How much of the rounding to keep in hand: nothing at first, all of it when the rounded plan breaks a limit. */
const margins = [0, 0.25, 1];

const solveWithin = async (request: ChargeRequest, margin: number): Promise<ChargePlan | null> => {
  const model = buildChargeModel(request, { margin });
  if (model.lots.length === 0) return null;
  const solution = await solveLinear(writeChargeModel(model));
  if (!solution) return null;
  const grams = model.lots.map((_, lot) => solution.values[`g${lot}`] ?? 0);
  const masses = roundToWeighable(
    grams,
    model.lots.map(({ balanceMg }) => balanceMg),
  );
  const lines = model.lots.flatMap((lot, index): ChargeLine[] => {
    const massMg = masses[index] ?? 0;
    return massMg > 0 ? [{ lot, massMg }] : [];
  });
  return summarise(lines, request.markedMetal);
};

const solve = async (request: ChargeRequest): Promise<ChargePlan | null> => {
  for (const margin of margins) {
    const plan = await solveWithin(request, margin);
    if (plan === null) return null;
    if (faultsOf(plan, request).length === 0) return plan;
  }
  return null;
};

/** What gives way when every limit may: those with slack in the cheapest such charge. */
const obstaclesOf = async (model: ChargeModel, request: ChargeRequest): Promise<readonly string[]> => {
  const onHandG = model.mostG.reduce((sum, most) => sum + most, 0);
  if (onHandG < model.wantedG) return ['There is not enough metal on hand that may be charged.'];
  const elastic = await solveLinear(writeChargeModel(model, { isElastic: true }));
  if (!elastic) return ['No mixture of the lots on hand could be computed.'];
  const broken = model.rows.filter(({ name }) => (elastic.values[`slack_${name}`] ?? 0) > 1e-6);
  if (broken.length === 0) return ['No weighable mixture of the lots on hand holds every limit at once.'];
  return broken.map(({ limit }) => explainLimit(limit, request));
};

/** Plans a charge from the lots on hand; deterministic for the same request. */
export const planCharge = async (request: ChargeRequest): Promise<ChargeOutcome> => {
  const plan = await solve(request);
  if (plan) return { kind: 'planned', plan };
  const obstacles = await obstaclesOf(buildChargeModel(request), request);
  const helped = await solve(withBoughtMetal(request));
  const bought = helped?.lines.filter(({ lot }) => isBought(lot)) ?? [];
  return { kind: 'short', obstacles, wouldDo: bought.map(({ lot, massMg }) => ({ name: lot.name, massMg })) };
};
