import type { Celsius } from '#shared/lib/units.ts';
import type { CurvePoint } from './curve-point.ts';

/** A point of a smoothed curve with how fast it falls there. */
export interface SmoothPoint extends CurvePoint {
  /** °C lost per second; below zero where it warms. */
  readonly rate: number;
}

/** The middle value; the mean of the two middle ones where there are two. NaN of nothing. */
export const median = (values: readonly number[]): number => {
  const sorted = [...values].sort((a, b) => a - b);
  const middle = sorted.length >> 1;
  return sorted.length % 2 === 1
    ? (sorted[middle] ?? Number.NaN)
    : ((sorted[middle - 1] ?? Number.NaN) + (sorted[middle] ?? Number.NaN)) / 2;
};

/** 1.4826 makes the median deviation of normal noise its standard deviation. */
const normalScale = 1.4826;

/** Points in order of time, one for each moment, without what is no number. */
export const inOrder = (points: readonly CurvePoint[]): readonly CurvePoint[] =>
  points
    .filter(({ seconds, temperatureC }) => Number.isFinite(seconds) && Number.isFinite(temperatureC))
    .toSorted((a, b) => a.seconds - b.seconds)
    .filter((point, k, all) => k === 0 || point.seconds > (all[k - 1]?.seconds ?? 0));

/** Spikes no larger than this are left to the smoothing, °C. */
const leastSpikeC = 4;

/** How far each of some points lies from the line of the middle slope between any two of them (Theil and Sen). */
const offMiddleLine = (points: readonly CurvePoint[], { seconds, temperatureC }: CurvePoint) => {
  const slopes = points.flatMap((a, k) =>
    points.slice(k + 1).map((b) => (b.temperatureC - a.temperatureC) / (b.seconds - a.seconds)),
  );
  const slope = median(slopes);
  const levels = points.map((point) => point.temperatureC - slope * (point.seconds - seconds));
  const level = median(levels);
  return {
    off: Math.abs(temperatureC - level),
    spread: normalScale * median(levels.map((each) => Math.abs(each - level))),
  };
};

/** Takes out single points that stand far off the line of their six neighbours: loose plugs and bad lines. */
export const withoutSpikes = (points: readonly CurvePoint[]): readonly CurvePoint[] =>
  points.filter((point, k) => {
    const near = points.slice(Math.max(0, k - 3), k + 4).filter((other) => other !== point);
    if (near.length < 3) return true;
    const { off, spread } = offMiddleLine(near, point);
    return off <= Math.max(leastSpikeC, 5 * spread);
  });

/** Standard deviation of the noise, °C: how far points lie from the line between their neighbours. */
export const noiseOf = (points: readonly CurvePoint[]): Celsius => {
  const off = points.slice(1, -1).flatMap((point, k) => {
    const [before, after] = [points[k], points[k + 2]];
    if (!before || !after) return [];
    const share = (point.seconds - before.seconds) / (after.seconds - before.seconds);
    const line = before.temperatureC + share * (after.temperatureC - before.temperatureC);
    // Noise of three points: one, and two by their shares.
    return [Math.abs(point.temperatureC - line) / Math.sqrt(1 + share ** 2 + (1 - share) ** 2)];
  });
  return off.length === 0 ? 0 : normalScale * median(off);
};

/** Mean value and slope of the points about one, by least squares on a straight line. */
const lineThrough = (points: readonly CurvePoint[], at: number): { value: number; slope: number } => {
  const n = points.length;
  let [meanS, meanC] = [0, 0];
  for (const { seconds, temperatureC } of points) {
    meanS += seconds / n;
    meanC += temperatureC / n;
  }
  let [spread, cross] = [0, 0];
  for (const { seconds, temperatureC } of points) {
    spread += (seconds - meanS) ** 2;
    cross += (seconds - meanS) * (temperatureC - meanC);
  }
  const slope = spread > 0 ? cross / spread : 0;
  return { value: meanC + slope * (at - meanS), slope };
};

/** Smooths a curve: at each point a straight line through it and `reach` neighbours on either side gives value and rate. */
export const smoothCurve = (points: readonly CurvePoint[], reach: number): readonly SmoothPoint[] =>
  points.map(({ seconds }, k) => {
    const near = points.slice(Math.max(0, k - reach), k + reach + 1);
    const { value, slope } = lineThrough(near, seconds);
    return { seconds, temperatureC: value, rate: -slope };
  });

/** Standard deviation of a rate found by {@link smoothCurve}, °C/s, for points `everyS` apart. */
export const rateNoise = (noiseC: Celsius, everyS: number, reach: number): number =>
  (noiseC * Math.sqrt(3 / (reach * (reach + 1) * (2 * reach + 1)))) / everyS;

/** Each value with its `reach` neighbours on either side, on the average. */
export const movingMean = (values: readonly number[], reach: number): readonly number[] =>
  values.map((_, k) => {
    const near = values.slice(Math.max(0, k - reach), k + reach + 1);
    return near.reduce((total, value) => total + value, 0) / near.length;
  });
