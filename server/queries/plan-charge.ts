import {
  buildChargeModel,
  costOfLines,
  restrictModel,
  type ChargeModel,
} from '#shared/domain/metal/charge-model.ts';
import { faultsOf, roundToWeighable, summarise, type ChargePlan } from '#shared/domain/metal/charge-plan.ts';
import { massOfLines, type ChargeLine, type ChargeRequest } from '#shared/domain/metal/charge-request.ts';
import { explainLimit, withBoughtMetal } from '#shared/domain/metal/explain-shortfall.ts';
import { planGreedily } from '#shared/domain/metal/plan-greedily.ts';
import { settleRounding } from '#shared/domain/metal/settle-rounding.ts';
import { writeChargeModel } from '#shared/domain/metal/write-charge-model.ts';
import { solveLinear, type LinearSolution } from '../services/solver/solve-linear.ts';

/** A plan that holds every limit, or what stands in the way and what to add. */
export type ChargeOutcome =
  | {
      readonly kind: 'planned';
      readonly plan: ChargePlan;
      /** How far the plan's cost can be from the best there is, as a share of it: nought when it is known to be the best. */
      readonly gap: number;
    }
  | {
      readonly kind: 'short';
      /** Sentences that say which limits stand in the way. */
      readonly obstacles: readonly string[];
      /** Metal that would do, if it were bought; empty when even that would not help. */
      readonly wouldDo: readonly { readonly name: string; readonly massMg: number }[];
    };

/** How hard to look: every lot in one programme when `isWhole`, otherwise the promising ones first. */
export interface PlanOptions {
  readonly isWhole?: boolean;
  readonly timeLimitS?: number;
}

/** How much of the rounding to keep in hand: nothing at first, all of it when the rounded plan breaks a limit. */
const margins = [0, 0.25, 1];

/** Lots that a programme of whole lots is given at first: with more it takes seconds and finds hardly better. */
const promisingLots = 12;
const oldestReturns = 4;

const linesOf = (model: ChargeModel, { values }: LinearSolution): readonly ChargeLine[] => {
  const masses = roundToWeighable(
    model.lots.map((_, lot) => values[`g${lot}`] ?? 0),
    model.lots.map(({ balanceMg }) => balanceMg),
  );
  return model.lots.flatMap((lot, index): ChargeLine[] => {
    const massMg = masses[index] ?? 0;
    return massMg > 0 ? [{ lot, massMg }] : [];
  });
};

/** The lots whose use costs least at the relaxed optimum, and the oldest returns. */
const promising = ({ lots }: ChargeModel, { values, reducedCosts }: LinearSolution): readonly number[] => {
  const every = lots.map((_, lot) => lot);
  const worth = (lot: number): number =>
    (values[`g${lot}`] ?? 0) > 1e-9 ? Number.NEGATIVE_INFINITY : (reducedCosts[`g${lot}`] ?? 0);
  const cheapest = [...every].sort((a, b) => worth(a) - worth(b)).slice(0, promisingLots);
  const oldest = every
    .filter((lot) => lots[lot]?.kind === 'returns')
    .sort((a, b) => (lots[a]?.receivedAt ?? '').localeCompare(lots[b]?.receivedAt ?? ''))
    .slice(0, oldestReturns);
  return [...new Set([...cheapest, ...oldest])].sort((a, b) => a - b);
};

interface Candidate {
  readonly plan: ChargePlan;
  readonly cost: number;
}

const solveModel = async (
  request: ChargeRequest,
  model: ChargeModel,
  { timeLimitS = 2 }: PlanOptions,
): Promise<Candidate | null> => {
  const solution = await solveLinear(writeChargeModel(model, 'whole'), { timeLimitS, gap: 5e-3 });
  if (!solution) return null;
  const plan = settleRounding(linesOf(model, solution), request);
  return plan && { plan, cost: costOfLines(model, plan.lines) };
};

/** The best plan within a margin, with a bound under every plan's cost; null where not even the relaxed programme fits. */
const solveWithin = async (
  request: ChargeRequest,
  margin: number,
  options: PlanOptions,
): Promise<{ readonly bound: number; readonly found: Candidate | null } | null> => {
  const model = buildChargeModel(request, { margin });
  if (model.lots.length === 0) return null;
  const relaxed = await solveLinear(writeChargeModel(model, 'relaxed'));
  if (!relaxed) return null;
  const kept = promising(model, relaxed);
  const isFew = options.isWhole === true || kept.length === model.lots.length;
  const first = isFew ? null : await solveModel(request, restrictModel(model, kept), options);
  return { bound: relaxed.cost, found: first ?? (await solveModel(request, model, options)) };
};

const greedyCandidate = (request: ChargeRequest): Candidate | null => {
  const plan = planGreedily(request);
  return plan && { plan, cost: costOfLines(buildChargeModel(request), plan.lines) };
};

const cheaper = (one: Candidate | null, other: Candidate | null): Candidate | null =>
  one && other ? (one.cost <= other.cost ? one : other) : (one ?? other);

const solve = async (
  request: ChargeRequest,
  options: PlanOptions = {},
): Promise<{ readonly plan: ChargePlan; readonly gap: number } | null> => {
  const asItIs = summarise([], request.markedMetal, request.weighed);
  if (massOfLines(request.weighed ?? []) > 0 && faultsOf(asItIs, request).length === 0) {
    if (asItIs.totalMg >= request.wantedMg) return { plan: asItIs, gap: 0 };
  }
  let best = greedyCandidate(request);
  let bound = 0;
  for (const margin of margins) {
    const solved = await solveWithin(request, margin, options);
    if (solved === null) break;
    if (margin === 0) bound = solved.bound;
    best = cheaper(best, solved.found);
    if (solved.found) break;
  }
  if (!best) return null;
  return { plan: best.plan, gap: best.cost > 0 ? Math.max(0, (best.cost - bound) / best.cost) : 0 };
};

/** What gives way when every limit may: those with slack in the cheapest such charge. */
const obstaclesOf = async (request: ChargeRequest): Promise<readonly string[]> => {
  const model = buildChargeModel(request);
  const onHandG = model.mostG.reduce((sum, most) => sum + most, 0);
  if (onHandG < model.wantedG - model.underG)
    return ['There is not enough metal on hand that may be charged.'];
  const elastic = await solveLinear(writeChargeModel(model, 'elastic'));
  if (!elastic) return ['No mixture of the lots on hand could be computed.'];
  const broken = model.rows.filter(({ name }) => (elastic.values[`slack_${name}`] ?? 0) > 1e-6);
  if (broken.length === 0) return ['No weighable mixture of the lots on hand holds every limit at once.'];
  return broken.map(({ limit }) => explainLimit(limit, request));
};

/**
 * Plans a charge from the lots on hand; deterministic for the same request. A relaxed programme bounds the cost, a
 * programme of the promising lots finds the plan, and a plan made by hand is taken where it is the better one.
 */
export const planCharge = async (
  request: ChargeRequest,
  options: PlanOptions = {},
): Promise<ChargeOutcome> => {
  const solved = await solve(request, options);
  if (solved) return { kind: 'planned', ...solved };
  const obstacles = await obstaclesOf(request);
  const helped = await solve(withBoughtMetal(request), options);
  const bought = helped?.plan.lines.filter(({ lot }) => lot.isBought) ?? [];
  return { kind: 'short', obstacles, wouldDo: bought.map(({ lot, massMg }) => ({ name: lot.name, massMg })) };
};
