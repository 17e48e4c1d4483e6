import { scaleLinear } from 'd3-scale';
import { fromCelsius, toCelsius, type TemperatureUnit } from '#shared/lib/units.ts';
import type { TemperatureSpan } from './temperature-span.ts';

/** A mark of an axis: its place in canonical units and what is written there. */
export interface AxisTick {
  readonly at: number;
  readonly words: string;
}

/** About `count` round temperatures of the studio's unit within a span; `at` in °C. */
export const temperatureTicks = (
  { lowC, highC }: TemperatureSpan,
  unit: TemperatureUnit,
  count = 6,
): readonly AxisTick[] =>
  scaleLinear([fromCelsius(lowC, unit), fromCelsius(highC, unit)], [0, 1])
    .ticks(count)
    .map((value) => ({ at: toCelsius(value, unit), words: String(value) }));

/** About `count` round shares of an axis of composition, wt%. */
export const wtTicks = (xMin: number, xMax: number, count = 6): readonly AxisTick[] =>
  scaleLinear([xMin, xMax], [0, 1])
    .ticks(count)
    .map((value) => ({ at: value, words: String(value) }));
