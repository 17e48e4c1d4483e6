import { buildChargeModel, costOfLines } from '#shared/domain/metal/charge-model.ts';
import type { ChargeRequest } from '#shared/domain/metal/charge-request.ts';
import { planCharge } from '#server/queries/plan-charge.ts';
import { randomCharge } from '#tests/checks/support/random-charge.ts';
import { randomStream } from '#tests/checks/support/random.ts';

const seeds = [1, 2, 3, 4, 5];
const growth = [10, 25, 50, 100, 200, 400];

const median = (values: readonly number[]): number =>
  [...values].sort((a, b) => a - b)[Math.floor(values.length / 2)] ?? Number.NaN;

const timed = async <Value>(work: () => Promise<Value>): Promise<readonly [Value, number]> => {
  const from = performance.now();
  const value = await work();
  return [value, performance.now() - from];
};

/** Milliseconds to plan one charge from `count` lots, the median over several studios. */
const planMs = async (count: number): Promise<number> => {
  const taken: number[] = [];
  for (const seed of seeds) {
    const request = randomCharge(count, randomStream(seed));
    taken.push((await timed(() => planCharge(request)))[1]);
  }
  return median(taken);
};

/** Forty charges of one day, each from what the ones before have left of 200 lots. */
const planDayMs = async (): Promise<number> => {
  const random = randomStream(9);
  const day = randomCharge(200, random);
  let { lots } = day;
  const [, ms] = await timed(async () => {
    for (let flask = 0; flask < 40; flask += 1) {
      const outcome = await planCharge({ ...day, wantedMg: 40_000 + Math.round(random() * 6000) * 10, lots });
      if (outcome.kind === 'short') continue;
      const taken = new Map(outcome.plan.lines.map(({ lot, massMg }) => [lot.id, massMg]));
      lots = lots.map((lot) => ({ ...lot, balanceMg: lot.balanceMg - (taken.get(lot.id) ?? 0) }));
    }
  });
  return ms;
};

const costOf = async (request: ChargeRequest, isWhole: boolean) => {
  const outcome = await planCharge(request, { isWhole, timeLimitS: isWhole ? 30 : 2 });
  if (outcome.kind === 'short') throw new Error('A charge of the bench could not be planned.');
  return { cost: costOfLines(buildChargeModel(request), outcome.plan.lines), gap: outcome.gap };
};

/** How far plans are from the bound they are known by, and from what the whole programme finds in up to 30 s; the worst of several. */
const gaps = async (): Promise<{ readonly gap: number; readonly gapToWhole: number }> => {
  const found: { gap: number; gapToWhole: number }[] = [];
  for (const seed of seeds.slice(0, 3)) {
    const request = randomCharge(200, randomStream(seed));
    const quick = await costOf(request, false);
    const whole = await costOf(request, true);
    found.push({ gap: quick.gap, gapToWhole: (quick.cost - whole.cost) / whole.cost });
  }
  return {
    gap: Math.max(...found.map(({ gap }) => gap)),
    gapToWhole: Math.max(...found.map(({ gapToWhole }) => gapToWhole)),
  };
};

/** Time to plan charges, how it grows with the lots, and how far a plan is from the best. */
export const benchCharge = async (): Promise<Record<string, number>> => {
  await planMs(20);
  const figures: Record<string, number> = {
    plan200LotsMs: await planMs(200),
    plan40FlasksMs: await planDayMs(),
    ...(await gaps()),
  };
  for (const count of growth) figures[`plan${count}Ms`] = await planMs(count);
  return figures;
};
