import type { Job } from './engine.ts';
import { floorC } from './limits.ts';
import { FCC, LIQUID, ZERO_CELSIUS_K } from './model.ts';
import { bracketedNewton, type Sample } from './root.ts';

const LOW_K = 300;
const HIGH_K = 2200;
const TOLERANCE_K = 1e-9;
const SOLVUS_TOLERANCE_K = 1e-7;

/** The temperature, K, at which the first solid forms on cooling a liquid of the job's composition. */
export const liquidusK = ({ minimiser, system, x }: Job): number => {
  const { search } = minimiser;
  const { n } = system;
  const plane = new Float64Array(n);
  const liquidSlopes = new Float64Array(n);
  const solidSlopes = new Float64Array(n);
  const sample = (t: number): Sample => {
    system.setTemperature(t);
    system.potentials(LIQUID, x, 0, plane, 0);
    const value = search.leastDistance(FCC, plane);
    const at = search.lowest() * n;
    system.potentialSlopes(LIQUID, x, 0, liquidSlopes, 0);
    let slope = system.potentialSlopes(FCC, search.foundX, at, solidSlopes, 0);
    for (let i = 0; i < n; i++) slope -= search.foundX[at + i]! * liquidSlopes[i]!;
    return { value, slope };
  };
  return bracketedNewton(sample, {
    low: LOW_K,
    high: HIGH_K,
    start: 1200,
    rising: true,
    tolerance: TOLERANCE_K,
  });
};

/** The temperature, K, at which the first liquid forms on heating the homogenised solid; `liquidus` in K bounds it. */
export const solidusK = ({ minimiser, system, x }: Job, liquidus: number): number => {
  if (system.n === 1) return liquidus;
  const { search, split } = minimiser;
  const { n } = system;
  const plane = new Float64Array(n);
  const slopes = new Float64Array(n);
  const liquidSlopes = new Float64Array(n);
  const sample = (t: number): Sample => {
    system.setTemperature(t);
    minimiser.minimise(x, 'solid');
    for (let i = 0; i < n; i++) plane[i] = split.mu[split.main * n + i]!;
    split.potentialSlopes(slopes);
    const value = search.leastDistance(LIQUID, plane);
    const at = search.lowest() * n;
    let slope = system.potentialSlopes(LIQUID, search.foundX, at, liquidSlopes, 0);
    for (let i = 0; i < n; i++) slope -= search.foundX[at + i]! * slopes[i]!;
    return { value, slope };
  };
  return bracketedNewton(sample, {
    low: LOW_K,
    high: liquidus,
    start: liquidus - 20,
    rising: false,
    tolerance: TOLERANCE_K,
  });
};

const solidPhases = ({ minimiser, system, x }: Job, t: number): number => {
  system.setTemperature(t);
  minimiser.minimise(x, 'solid');
  return minimiser.split.count;
};

/**
 * The temperature, K, below which homogenised solid splits in two; null where it never does above the model's floor,
 * or where it is never homogeneous below `solidus` (K).
 */
export const solvusK = (job: Job, solidus: number): number | null => {
  const { minimiser, system, x } = job;
  const { split, search } = minimiser;
  const { n } = system;
  let low = floorC(system, x) + ZERO_CELSIUS_K;
  let high = solidus - 1e-6;
  if (n === 1 || low >= high || solidPhases(job, low) === 1 || solidPhases(job, high) > 1) return null;
  const other = new Float64Array(n);
  const bisect = (): void => {
    const middle = (low + high) / 2;
    if (solidPhases(job, middle) === 1) high = middle;
    else low = middle;
  };
  for (let k = 0; k < 5; k++) bisect();
  solidPhases(job, low);
  const minor = split.main === 0 ? 1 : 0;
  other.set(split.x.subarray(minor * n, minor * n + n));
  const plane = new Float64Array(n);
  const slopes = new Float64Array(n);
  const otherSlopes = new Float64Array(n);
  const start = new Float64Array(other);
  const sample = (t: number): Sample => {
    system.setTemperature(t);
    system.potentials(FCC, x, 0, plane, 0);
    system.potentialSlopes(FCC, x, 0, slopes, 0);
    other.set(start);
    const value = search.refine(FCC, plane, other);
    let slope = system.potentialSlopes(FCC, other, 0, otherSlopes, 0);
    let apart = 0;
    for (let i = 0; i < n; i++) {
      slope -= other[i]! * slopes[i]!;
      apart += Math.abs(other[i]! - x[i]!);
    }
    // Fallen back onto the alloy itself: too hot for a second minimum.
    if (apart < 1e-5) return { value: 1, slope: 0 };
    return { value, slope };
  };
  return bracketedNewton(sample, { low, high, start: low, rising: true, tolerance: SOLVUS_TOLERANCE_K });
};
