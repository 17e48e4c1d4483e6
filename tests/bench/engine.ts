import { equilibrium, freezingPath, meltingRange, type Composition } from '#shared/metallurgy/index.ts';
import { randomStream } from '#tests/checks/support/random.ts';

/** One alloy of each number of elements, as a studio pours them. */
const ALLOYS: Readonly<Record<number, Composition>> = {
  1: { Ag: 100 },
  2: { Ag: 92.5, Cu: 7.5 },
  3: { Au: 75, Ag: 12.5, Cu: 12.5 },
  4: { Au: 58.5, Ag: 20, Cu: 18, Zn: 3.5 },
};

const DRAWS = 4000;
const REPEATS = 5;

/** The least of several timings of one call, in milliseconds: what the code costs when nothing else runs. */
const leastMs = (calls: number, call: (k: number) => unknown): number => {
  for (let k = 0; k < calls; k++) call(k);
  let least = Number.POSITIVE_INFINITY;
  for (let repeat = 0; repeat < REPEATS; repeat++) {
    const start = performance.now();
    for (let k = 0; k < calls; k++) call(k);
    least = Math.min(least, (performance.now() - start) / calls);
  }
  return least;
};

/** Compositions scattered about an alloy and temperatures from solid to liquid, so that no answer is remembered. */
const draws = (alloy: Composition): readonly (readonly [Composition, number])[] => {
  const random = randomStream(1);
  return Array.from({ length: DRAWS }, () => {
    const parts = Object.entries(alloy).map(
      ([element, wt]) => [element, wt * (0.7 + 0.6 * random())] as const,
    );
    const sum = parts.reduce((total, [, part]) => total + part, 0);
    return [
      Object.fromEntries(parts.map(([element, part]) => [element, (100 * part) / sum])),
      550 + 500 * random(),
    ];
  });
};

const equilibriumUs = (alloy: Composition): number => {
  const asked = draws(alloy);
  return 1000 * leastMs(DRAWS, (k) => equilibrium(...(asked[k] ?? [alloy, 800])));
};

const pathsMs = (alloy: Composition, stepC: number): number =>
  leastMs(20, () => [
    freezingPath(alloy, { rule: 'lever', stepC }),
    freezingPath(alloy, { rule: 'scheil', stepC }),
  ]);

const rounded = (figures: Readonly<Record<string, number>>): Record<string, number> =>
  Object.fromEntries(Object.entries(figures).map(([key, value]) => [key, Number(value.toPrecision(3))]));

/**
 * What the metallurgy costs on one core: one equilibrium of four elements (µs), a melting range and both freezing paths
 * at 1 °C (ms), then the same by number of elements and by step.
 */
export const benchEngine = async (): Promise<Record<string, number>> => {
  const four = ALLOYS[4] ?? {};
  const figures: Record<string, number> = {
    equilibriumUs: equilibriumUs(four),
    rangeMs: leastMs(60, () => meltingRange(four)),
    pathsMs: pathsMs(four, 1),
  };
  for (const [count, alloy] of Object.entries(ALLOYS)) {
    figures[`equilibriumUs${count}Elements`] = equilibriumUs(alloy);
    figures[`rangeMs${count}Elements`] = leastMs(60, () => meltingRange(alloy));
    figures[`pathsMs${count}Elements`] = pathsMs(alloy, 1);
  }
  for (const step of [0.5, 1, 2, 5, 10]) figures[`pathsMsStep${step}C`] = pathsMs(four, step);
  return Promise.resolve(rounded(figures));
};
