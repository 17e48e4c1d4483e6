import { levenbergMarquardt } from 'ml-levenberg-marquardt';
import { describe, expect, it } from 'vitest';
import { equilibrium } from '#shared/metallurgy/index.ts';
import { plainEnergy, plainMoleFractions, type PlainPhase } from './support/plain-gibbs.ts';

const STEP = 1e-6;

/** Chemical potentials of a binary by numerical differentiation of the plain energies, J/mol. */
const potentials = (
  phase: PlainPhase,
  pair: readonly [string, string],
  x: number,
  t: number,
): readonly [number, number] => {
  const g = (place: number) => plainEnergy(phase, { [pair[0]]: 1 - place, [pair[1]]: place }, t);
  const slope = (g(x + STEP) - g(x - STEP)) / (2 * STEP);
  return [g(x) - x * slope, g(x) + (1 - x) * slope];
};

/** Solves a square set of equations with a general-purpose least-squares package from npm. */
const solve = (
  equations: (unknowns: readonly number[]) => readonly number[],
  start: readonly number[],
): readonly number[] => {
  // Unknowns keep within half of their start, so that no mole fraction leaves (0, 1).
  const count = equations(start).length;
  const { parameterValues } = levenbergMarquardt(
    { x: Array.from({ length: count }, (_, k) => k), y: new Array<number>(count).fill(0) },
    (values: number[]) => {
      const at = [...values];
      return (k: number) => equations(at)[k] ?? Number.NaN;
    },
    {
      initialValues: [...start],
      minValues: start.map((value) => 0.5 * value),
      maxValues: start.map((value) => Math.min(1.5 * value, value > 1 ? 2 * value : 0.995)),
      gradientDifference: 1e-5,
      centralDifference: true,
      damping: 1e-4,
      maxIterations: 300,
      errorTolerance: 1e-14,
    },
  );
  return parameterValues;
};

describe(
  'against a general-purpose least-squares package and numerical derivatives',
  { timeout: 30_000 },
  () => {
    it('finds the same Ag-Cu tie line at 850 °C', () => {
      const t = 850 + 273.15;
      const pair = ['Ag', 'Cu'] as const;
      const [xLiquid = 0, xSolid = 0] = solve(
        ([liquid = 0, solid = 0]) => {
          const a = potentials('liquid', pair, liquid, t);
          const b = potentials('fcc', pair, solid, t);
          return [(a[0] - b[0]) / 1000, (a[1] - b[1]) / 1000];
        },
        [0.2, 0.08],
      );
      const state = equilibrium({ Ag: 92.5, Cu: 7.5 }, 850);
      if (!state.withinModel) throw new Error(state.reason);
      const copper = (name: string) =>
        (state.phases.find((phase) => phase.name === name)?.at['Cu'] ?? 0) / 100;
      expect(copper('liquid')).toBeCloseTo(xLiquid, 5);
      expect(copper('fcc')).toBeCloseTo(xSolid, 5);
      const overall = plainMoleFractions({ Ag: 92.5, Cu: 7.5 })['Cu'] ?? 0;
      const fraction = (overall - xLiquid) / (xSolid - xLiquid);
      expect(state.phases.find((phase) => phase.name === 'fcc')?.moleFraction).toBeCloseTo(fraction, 5);
    });

    it('finds the same three-phase line of Ag-Cu', () => {
      const pair = ['Ag', 'Cu'] as const;
      const [hundredths = 0, liquid = 0, silver = 0, copper = 0] = solve(
        ([t = 0, l = 0, s = 0, c = 0]) => {
          const kelvin = 100 * t;
          const [a, b, d] = [
            potentials('liquid', pair, l, kelvin),
            potentials('fcc', pair, s, kelvin),
            potentials('fcc', pair, c, kelvin),
          ];
          return [a[0] - b[0], a[1] - b[1], a[0] - d[0], a[1] - d[1]].map((difference) => difference / 1000);
        },
        [10.5, 0.4, 0.13, 0.95],
      );
      const eutecticC = 100 * hundredths - 273.15;
      const below = equilibrium({ Ag: 60, Cu: 40 }, eutecticC - 0.001);
      const above = equilibrium({ Ag: 60, Cu: 40 }, eutecticC + 0.001);
      if (!below.withinModel || !above.withinModel) throw new Error('outside the model');
      expect(below.phases.map((phase) => phase.name).sort()).toEqual(['copper-rich fcc', 'silver-rich fcc']);
      expect(above.phases[0]?.name).toBe('liquid');
      expect((above.phases[0]?.at['Cu'] ?? 0) / 100).toBeCloseTo(liquid, 4);
      expect((below.phases.find((p) => p.name === 'silver-rich fcc')?.at['Cu'] ?? 0) / 100).toBeCloseTo(
        silver,
        4,
      );
      expect((below.phases.find((p) => p.name === 'copper-rich fcc')?.at['Cu'] ?? 0) / 100).toBeCloseTo(
        copper,
        4,
      );
    });
  },
);
