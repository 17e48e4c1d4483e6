import { describe, expect, it } from 'vitest';
import { buildChargeModel, costOfLines } from '#shared/domain/metal/charge-model.ts';
import { faultsOf, type ChargePlan } from '#shared/domain/metal/charge-plan.ts';
import type { ChargeRequest } from '#shared/domain/metal/charge-request.ts';
import { mixFineness, type LotOnHand } from '#shared/domain/metal/lot.ts';
import { planGreedily } from '#shared/domain/metal/plan-greedily.ts';
import { planCharge } from '#server/queries/plan-charge.ts';
import { randomCharge } from './support/random-charge.ts';
import { randomStream } from './support/random.ts';

const plannedCharges = async (): Promise<readonly (readonly [ChargeRequest, ChargePlan])[]> => {
  const random = randomStream(7);
  const planned: (readonly [ChargeRequest, ChargePlan])[] = [];
  for (let draw = 0; draw < 40; draw += 1) {
    const request = randomCharge(
      4 + Math.floor(random() * 20),
      random,
      20_000 + Math.round(random() * 10_000) * 10,
    );
    const outcome = await planCharge(request);
    if (outcome.kind === 'planned') planned.push([request, outcome.plan]);
  }
  return planned;
};

/** A composition within a lot's certificate; at its very edge every fourth time. */
const drawn = (lot: LotOnHand, random: () => number): LotOnHand => {
  const side = (): number => (random() < 0.25 ? -1 : 2 * random() - 1);
  const compositionWt = Object.fromEntries(
    Object.entries(lot.compositionWt).map(([element, wt]) => [
      element,
      wt + side() * (lot.toleranceWt[element] ?? 0),
    ]),
  );
  return { ...lot, compositionWt };
};

describe('charge plans of random lots', async () => {
  const planned = await plannedCharges();

  it('are found for most draws, so that what follows is about something', () => {
    expect(planned.length).toBeGreaterThan(25);
  });

  it('hold every limit by an exact check that knows nothing of the solver', () => {
    for (const [request, plan] of planned) expect(faultsOf(plan, request)).toEqual([]);
  });

  it('never fall below the mark for any composition within the certificates, drawn 10,000 times', () => {
    const random = randomStream(11);
    let lowest = Number.POSITIVE_INFINITY;
    for (let draw = 0; draw < 10_000; draw += 1) {
      const [request, plan] = planned[draw % planned.length] ?? [];
      if (!request || !plan) throw new Error('There is no plan.');
      const weighed = plan.lines.map(({ lot, massMg }) => ({ assay: drawn(lot, random), massMg }));
      lowest = Math.min(lowest, mixFineness(weighed, 'Au').expected - request.markPpt);
    }
    expect(lowest).toBeGreaterThanOrEqual(-1e-9);
  });

  it('are never worse than a plan made by hand', () => {
    let compared = 0;
    for (const [request, plan] of planned) {
      const greedy = planGreedily(request);
      if (!greedy) continue;
      compared += 1;
      const model = buildChargeModel(request);
      expect(costOfLines(model, plan.lines)).toBeLessThanOrEqual(costOfLines(model, greedy.lines) + 1e-9);
    }
    expect(compared).toBeGreaterThan(0);
  });

  it('come to the metal wanted in whole weighings of lots that hold so much', () => {
    for (const [request, { lines, totalMg }] of planned) {
      expect(Math.abs(totalMg - request.wantedMg)).toBeLessThanOrEqual(5);
      expect(lines.every(({ lot, massMg }) => massMg % 10 === 0 && massMg <= lot.balanceMg)).toBe(true);
    }
  });
});
