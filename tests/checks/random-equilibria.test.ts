import { expect, it } from 'vitest';
import { equilibrium, type EquilibriumState } from '#shared/metallurgy/index.ts';
import { ENGINE } from '#shared/metallurgy/engine.ts';
import { randomComposition, randomStream } from './support/random.ts';

const DRAWS = 200_000;

/** The worst disagreement of any element's potential between phases, J/mol, of the answer that stands in the solver. */
const disagreement = (composition: Record<string, number>): number => {
  const job = ENGINE.prepare(composition);
  if (!job.withinModel) return 0;
  const { split } = job.minimiser;
  const { n } = job.system;
  let worst = 0;
  for (let p = 0; p < split.count; p++) {
    for (let i = 0; i < n; i++) {
      worst = Math.max(worst, Math.abs((split.mu[p * n + i] ?? 0) - (split.mu[split.main * n + i] ?? 0)));
    }
  }
  return worst;
};

const imbalance = (composition: Record<string, number>, state: EquilibriumState): number =>
  Object.entries(composition).reduce((worst, [element, wt]) => {
    const held = state.phases.reduce((sum, phase) => sum + phase.massFraction * (phase.wt[element] ?? 0), 0);
    return Math.max(worst, Math.abs(held - wt) / 100);
  }, 0);

// Requirement: 200,000 random compositions and temperatures give an answer or a typed refusal; potentials agree to
// 1e-6 J/mol and masses balance to 1e-12.
it('answers or refuses any composition and temperature', { timeout: 60_000 }, () => {
  const random = randomStream(20261201);
  const seen = { answered: 0, refused: 0, multiphase: 0 };
  let worstPotential = 0;
  let worstBalance = 0;
  for (let k = 0; k < DRAWS; k++) {
    const composition = randomComposition(random);
    const state = equilibrium(composition, 150 + 1400 * random());
    if (!state.withinModel) {
      seen.refused++;
      if (state.reason.length < 10 || state.code === 'outside-model')
        throw new Error(JSON.stringify({ composition, state }));
      continue;
    }
    seen.answered++;
    if (state.phases.length > 1) seen.multiphase++;
    const potential = disagreement(composition);
    const balance = imbalance(composition, state);
    if (!(potential < 1e-6) || !(balance < 1e-12)) {
      throw new Error(
        JSON.stringify({ composition, potential, balance, temperatureC: state.temperatureC, state }),
      );
    }
    worstPotential = Math.max(worstPotential, potential);
    worstBalance = Math.max(worstBalance, balance);
  }
  expect(seen.answered + seen.refused).toBe(DRAWS);
  expect(seen.answered).toBeGreaterThan(DRAWS / 2);
  expect(seen.multiphase).toBeGreaterThan(DRAWS / 10);
  expect(worstPotential).toBeLessThan(1e-6);
  expect(worstBalance).toBeLessThan(1e-12);
});
