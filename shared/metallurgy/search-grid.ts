import { FCC, GAS_CONSTANT, LIQUID } from './model.ts';
import type { System } from './system.ts';
import type { ElementSymbol } from './types.ts';

/** Steps along an edge of the composition simplex, by number of elements. */
const STEPS: Readonly<Record<number, number>> = { 1: 1, 2: 24, 3: 12, 4: 8 };

/** Compositions spread over a system, with the parts of their energies that no temperature changes. */
export interface SearchGrid {
  readonly count: number;
  /** n mole fractions to a point. */
  readonly x: Float64Array;
  /** The neighbourhood of each point: silver or copper side of the fcc gap, and gold and zinc above or below half. */
  readonly region: Int32Array;
  /** Excess energy at 0 K by phase, J/mol. */
  readonly fixed: readonly [Float64Array, Float64Array];
  /** Slope of the excess and ideal energies with temperature by phase, J/(mol K). */
  readonly slope: readonly [Float64Array, Float64Array];
}

const simplexPoints = (n: number, steps: number): number[][] => {
  if (n === 1) return [[steps]];
  const points: number[][] = [];
  for (let first = 0; first <= steps; first++) {
    for (const rest of simplexPoints(n - 1, steps - first)) points.push([first, ...rest]);
  }
  return points;
};

const idealSum = (point: readonly number[]): number =>
  point.reduce((sum, x) => (x > 0 ? sum + x * Math.log(x) : sum), 0);

/** How many neighbourhoods a search looks into one by one. */
export const REGIONS = 4;

const regionOf = (system: System, point: readonly number[]): number => {
  const of = (element: ElementSymbol) => point[system.elements.indexOf(element)] ?? 0;
  return (of('Cu') > of('Ag') ? 1 : 0) + (of('Au') + of('Zn') > 0.5 ? 2 : 0);
};

/** Builds the grid of `system`. */
export const createSearchGrid = (system: System): SearchGrid => {
  const steps = STEPS[system.n] ?? 8;
  const points = simplexPoints(system.n, steps).map((p) => p.map((k) => k / steps));
  const x = Float64Array.from(points.flat());
  const count = points.length;
  const each = (value: (at: number, point: number) => number) =>
    Float64Array.from({ length: count }, (_, k) => value(k * system.n, k));
  const ideal = points.map((p) => GAS_CONSTANT * idealSum(p));
  const fixed = (phase: 0 | 1) =>
    each((at) => {
      const { pairs, triples } = system.excessAtZero(phase);
      return system.excess(x, at, pairs, triples);
    });
  const slope = (phase: 0 | 1) =>
    each(
      (at, k) => system.excess(x, at, system.pairSlopes[phase], system.tripleSlopes[phase]) + (ideal[k] ?? 0),
    );
  return {
    count,
    x,
    region: Int32Array.from(points, (point) => regionOf(system, point)),
    fixed: [fixed(LIQUID), fixed(FCC)],
    slope: [slope(LIQUID), slope(FCC)],
  };
};
