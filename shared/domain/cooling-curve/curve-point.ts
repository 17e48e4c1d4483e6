import type { Celsius } from '#shared/lib/units.ts';

/** One point of a logged curve. */
export interface CurvePoint {
  readonly seconds: number;
  readonly temperatureC: Celsius;
}
