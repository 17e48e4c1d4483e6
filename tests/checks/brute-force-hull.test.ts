import { describe, expect, it } from 'vitest';
import { equilibrium } from '#shared/metallurgy/index.ts';
import { plainEnergy, plainMoleFractions, type PlainPhase } from './support/plain-gibbs.ts';
import { randomComposition, randomStream } from './support/random.ts';

const PHASES: readonly PlainPhase[] = ['liquid', 'fcc'];

interface HullPoint {
  readonly x: number;
  readonly g: number;
}

/** The lower convex hull of points in order of x (Andrew's monotone chain). */
const lowerHull = (points: readonly HullPoint[]): readonly HullPoint[] => {
  const hull: HullPoint[] = [];
  for (const p of points) {
    for (;;) {
      const b = hull.at(-1);
      const a = hull.at(-2);
      if (!a || !b || (b.x - a.x) * (p.g - a.g) - (b.g - a.g) * (p.x - a.x) > 0) break;
      hull.pop();
    }
    hull.push(p);
  }
  return hull;
};

const hullEnergy = (elements: readonly [string, string], t: number, x: number): number => {
  const [first, second] = elements;
  const steps = 4000;
  const points = Array.from({ length: steps + 1 }, (_, k) => {
    const place = k / steps;
    const energies = PHASES.map((phase) => plainEnergy(phase, { [first]: 1 - place, [second]: place }, t));
    return { x: place, g: Math.min(...energies) };
  });
  const hull = lowerHull(points);
  const k = Math.max(
    1,
    hull.findIndex((p) => p.x >= x),
  );
  const a = hull[k - 1] ?? { x: 0, g: 0 };
  const b = hull[k] ?? a;
  return a.g + ((b.g - a.g) * (x - a.x)) / (b.x - a.x);
};

const simplex = (n: number, steps: number): number[][] =>
  n === 1
    ? [[steps]]
    : Array.from({ length: steps + 1 }, (_, k) => simplex(n - 1, steps - k).map((r) => [k, ...r])).flat();

describe('against a brute-force convex hull of energies computed by other code', { timeout: 30_000 }, () => {
  it('finds the hull of Ag-Cu, Au-Cu and Ag-Zn at every temperature', () => {
    const random = randomStream(7);
    let split = 0;
    for (let draw = 0; draw < 120; draw++) {
      const pairs = [
        ['Ag', 'Cu'],
        ['Au', 'Cu'],
        ['Ag', 'Cu'],
        ['Ag', 'Zn'],
        ['Ag', 'Cu'],
        ['Ag', 'Au'],
      ] as const;
      const pair = pairs[draw % pairs.length] ?? pairs[0];
      const first = 100 * (pair[1] === 'Zn' ? 0.85 + 0.15 * random() : random());
      const temperatureC = 420 + 750 * random();
      const wt = { [pair[0]]: first, [pair[1]]: 100 - first };
      const state = equilibrium(wt, temperatureC);
      if (!state.withinModel) continue;
      if (state.phases.length > 1) split++;
      const x = plainMoleFractions(wt);
      const energy = Object.entries(x).reduce(
        (sum, [e, n]) => sum + n * (state.chemicalPotentials[e] ?? 0),
        0,
      );
      const hull = hullEnergy(pair, temperatureC + 273.15, x[pair[1]] ?? 0);
      // The hull stands on a grid, so it may lie a little above the true minimum and never below it.
      expect(hull - energy).toBeGreaterThan(-0.01);
      expect(hull - energy).toBeLessThan(1);
    }
    expect(split).toBeGreaterThan(20);
  });

  // A plane that touches the phases present and lies below every energy anywhere is the face of the hull itself.
  it('leaves no energy below its plane in alloys of three and four elements', () => {
    const random = randomStream(11);
    let tested = 0;
    let split = 0;
    while (tested < 80) {
      const wt = randomComposition(random);
      const elements = Object.keys(wt);
      if (elements.length < 3) continue;
      const temperatureC = 420 + 600 * random();
      const state = equilibrium(wt, temperatureC);
      if (!state.withinModel) continue;
      tested++;
      if (state.phases.length > 1) split++;
      const t = temperatureC + 273.15;
      let lowest = Number.POSITIVE_INFINITY;
      for (const point of simplex(elements.length, elements.length === 3 ? 60 : 24)) {
        const sum = point.reduce((a, b) => a + b, 0);
        const x = Object.fromEntries(elements.map((e, k) => [e, (point[k] ?? 0) / sum]));
        const plane = elements.reduce(
          (total, e) => total + (x[e] ?? 0) * (state.chemicalPotentials[e] ?? 0),
          0,
        );
        for (const phase of PHASES) lowest = Math.min(lowest, plainEnergy(phase, x, t) - plane);
      }
      expect(lowest).toBeGreaterThan(-0.05);
      for (const phase of state.phases) {
        const x = plainMoleFractions(phase.wt);
        const energy = plainEnergy(phase.name === 'liquid' ? 'liquid' : 'fcc', x, t);
        const plane = elements.reduce(
          (total, e) => total + (x[e] ?? 0) * (state.chemicalPotentials[e] ?? 0),
          0,
        );
        expect(Math.abs(energy - plane)).toBeLessThan(0.01);
      }
    }
    expect(split).toBeGreaterThan(10);
  });
});
