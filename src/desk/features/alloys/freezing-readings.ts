import type { PathPoint } from '#shared/metallurgy/index.ts';

/** Share of solid on a freezing path at a temperature in °C, straight between its points. */
export const solidShareAt = (points: readonly PathPoint[], celsius: number): number => {
  const after = points.findIndex(({ temperatureC }) => temperatureC <= celsius);
  if (after === 0) return points[0]?.solidMassFraction ?? 0;
  const [a, b] = [points[after < 0 ? points.length - 1 : after - 1], points[after]];
  if (!a) return 0;
  if (!b || a.temperatureC === b.temperatureC) return a.solidMassFraction;
  const part = (a.temperatureC - celsius) / (a.temperatureC - b.temperatureC);
  return a.solidMassFraction + part * (b.solidMassFraction - a.solidMassFraction);
};

const sameC = 1e-3;

/** Share of the whole that freezes at one temperature at the end of a path, 0 where it peters out. */
export const lastAtOnce = (points: readonly PathPoint[]): number => {
  const [before, last] = [points.at(-2), points.at(-1)];
  if (!before || !last || before.temperatureC - last.temperatureC > sameC) return 0;
  return last.solidMassFraction - before.solidMassFraction;
};

/** One row of the table beside the curve. */
export interface FreezingRow {
  readonly temperatureC: number;
  readonly lever: number;
  readonly scheil: number;
}

/** Both curves read at round temperatures from the liquidus down, about ten rows. */
export const freezingRows = (
  lever: readonly PathPoint[],
  scheil: readonly PathPoint[],
): readonly FreezingRow[] => {
  const start = lever[0]?.temperatureC ?? 0;
  const end = Math.min(lever.at(-1)?.temperatureC ?? start, scheil.at(-1)?.temperatureC ?? start);
  const step = [1, 2, 5, 10, 20, 50].find((size) => (start - end) / size <= 14) ?? 100;
  const first = Math.ceil(start / step) - 1;
  const last = Math.floor(end / step);
  const round = Array.from({ length: Math.max(0, first - last) }, (_, k) => (first - k) * step);
  return [start, ...round, end].map((temperatureC) => ({
    temperatureC,
    lever: solidShareAt(lever, temperatureC),
    scheil:
      temperatureC === end ? (scheil.at(-1)?.solidMassFraction ?? 1) : solidShareAt(scheil, temperatureC),
  }));
};
