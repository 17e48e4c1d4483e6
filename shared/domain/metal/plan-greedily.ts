import { faultsOf, summarise, type ChargePlan } from './charge-plan.ts';
import {
  leastWeighingMg,
  massOfLines,
  weighingStepMg,
  type ChargeLine,
  type ChargeRequest,
} from './charge-request.ts';
import type { LotKind, LotOnHand } from './lot.ts';

const wholeSteps = (mg: number): number => Math.floor(mg / weighingStepMg) * weighingStepMg;

/** Takes from lots in turn until `wantedMg` is reached. */
const takeInTurn = (lots: readonly LotOnHand[], wantedMg: number): readonly ChargeLine[] => {
  let missing = wantedMg;
  return lots.flatMap((lot): ChargeLine[] => {
    const massMg = wholeSteps(Math.min(missing, lot.balanceMg));
    if (massMg < leastWeighingMg) return [];
    missing -= massMg;
    return [{ lot, massMg }];
  });
};

const ofKind = (lots: readonly LotOnHand[], kind: LotKind): readonly LotOnHand[] =>
  lots.filter((lot) => lot.kind === kind);

const shares = [1, 0.8, 0.6, 0.4, 0.2, 0];

/**
 * Plans a charge as one does by hand: the oldest returns up to the limit, the rest from the fullest lots of grain; with
 * fewer returns when that breaks a limit; null when none of these holds. What a computed plan is measured against.
 */
export const planGreedily = (request: ChargeRequest): ChargePlan | null => {
  const { weighed = [] } = request;
  const missing = Math.round((request.wantedMg - massOfLines(weighed)) / weighingStepMg) * weighingStepMg;
  const returns = [...ofKind(request.lots, 'returns')].sort((a, b) =>
    a.receivedAt.localeCompare(b.receivedAt),
  );
  const grain = [...ofKind(request.lots, 'grain')].sort((a, b) => b.balanceMg - a.balanceMg);
  const roomForReturns =
    request.returnsShare * request.wantedMg -
    massOfLines(weighed.filter(({ lot }) => lot.kind === 'returns'));
  for (const share of shares) {
    const first = takeInTurn(returns, Math.min(missing, share * Math.max(0, roomForReturns)));
    const lines = [...first, ...takeInTurn(grain, missing - massOfLines(first))];
    const plan = summarise(lines, request.markedMetal, weighed);
    if (faultsOf(plan, request).length === 0) return plan;
  }
  return null;
};
