import { scaleLinear } from 'd3-scale';
import { fromCelsius, toCelsius, type TemperatureUnit } from '#shared/lib/units.ts';
import type { CardState } from '#shared/domain/pour-card/card-state.ts';
import type { CardFigures } from '#shared/domain/pour-card/card-figures.ts';

/** The edges of the chart's plot in its picture. */
export interface PlotFrame {
  readonly left: number;
  readonly right: number;
  readonly top: number;
  readonly bottom: number;
}

/** What the chart of a melt's readings is drawn from. */
export interface ChartInput {
  readonly openedAt: string;
  readonly state: Pick<CardState, 'readings' | 'flaskOut' | 'pour' | 'quenchedAt'>;
  readonly figures: Pick<CardFigures, 'solidusC' | 'liquidusC' | 'pourC'>;
  /** The unit in which the temperature's ticks are round. */
  readonly unit: TemperatureUnit;
}

/** Scales of the chart: minutes since the card was opened across, °C upward, with round ticks of both. */
export interface ChartScales {
  readonly x: (minutes: number) => number;
  readonly y: (celsius: number) => number;
  readonly minuteTicks: readonly number[];
  /** In °C, round in the studio's unit. */
  readonly degreeTicks: readonly number[];
  /** Minutes from opening to a moment (ISO 8601). */
  readonly minutesOf: (iso: string) => number;
}

const marginC = 25;
const leastMinutes = 8;

const roundDegrees = (lowC: number, highC: number, unit: TemperatureUnit): readonly number[] =>
  scaleLinear()
    .domain([fromCelsius(lowC, unit), fromCelsius(highC, unit)])
    .ticks(6)
    .map((degrees) => toCelsius(degrees, unit));

/** Scales that hold every reading, the melting range and the pour window, and the time from opening to the pour. */
export const chartScales = (
  { openedAt, state, figures, unit }: ChartInput,
  frame: PlotFrame,
): ChartScales => {
  const opened = Date.parse(openedAt);
  const minutesOf = (iso: string): number => (Date.parse(iso) - opened) / 60_000;
  const moments = [...state.readings.map(({ at }) => at), state.flaskOut?.at, state.pour?.at];
  const last = Math.max(leastMinutes, ...moments.flatMap((at) => (at === undefined ? [] : [minutesOf(at)])));
  const degrees = [
    ...state.readings.map(({ temperatureC }) => temperatureC),
    figures.solidusC,
    figures.pourC.high,
  ];
  const [lowC, highC] = [Math.min(...degrees) - marginC, Math.max(...degrees) + marginC];
  const x = scaleLinear()
    .domain([0, last * 1.04])
    .range([frame.left, frame.right]);
  const y = scaleLinear().domain([lowC, highC]).range([frame.bottom, frame.top]);
  return {
    x: (minutes) => x(minutes),
    y: (celsius) => y(celsius),
    minuteTicks: x.ticks(6),
    degreeTicks: roundDegrees(lowC, highC, unit),
    minutesOf,
  };
};
