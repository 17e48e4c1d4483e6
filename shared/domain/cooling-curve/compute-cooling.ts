import type { Celsius } from '#shared/lib/units.ts';
import type { Composition, FreezingRule } from '#shared/metallurgy/index.ts';
import type { CurvePoint } from './curve-point.ts';
import { heatOfAlloy, type HeatOfAlloy } from './heat-of-alloy.ts';

/** How metal loses its heat: to surroundings at one temperature, at a rate told for the liquid at its liquidus. */
export interface CoolingConditions {
  readonly startC: Celsius;
  readonly untilC: Celsius;
  readonly surroundingsC: Celsius;
  /** °C per second just above the liquidus. */
  readonly ratePerSecond: number;
  /** Seconds between the points. */
  readonly everyS: number;
}

/** No curve is followed for longer than this, seconds. */
const longestS = 4 * 3600;
const stepsPerPoint = 8;

/** The heat left after `seconds` more, by the midpoint rule. */
const coolFor = (
  heat: number,
  seconds: number,
  alloy: HeatOfAlloy,
  { surroundingsC, ratePerSecond }: Pick<CoolingConditions, 'surroundingsC' | 'ratePerSecond'>,
): number => {
  const loss = (at: number): number =>
    (ratePerSecond * (alloy.temperatureOf(at) - surroundingsC)) / (alloy.liquidusC - surroundingsC);
  return heat - seconds * loss(heat - (seconds / 2) * loss(heat));
};

/**
 * The cooling curve of an alloy by heat balance: what it loses to its surroundings comes from its heat capacity and from
 * what freezes, along the engine's own path. Null where the model does not hold the alloy.
 */
export const computeCooling = (
  composition: Composition,
  rule: FreezingRule,
  conditions: CoolingConditions,
): readonly CurvePoint[] | null => {
  const alloy = heatOfAlloy(composition, rule);
  if (!alloy) return null;
  const { startC, untilC, everyS } = conditions;
  const points: CurvePoint[] = [];
  let heat = alloy.heatAt(startC);
  for (let seconds = 0; seconds <= longestS; seconds += everyS) {
    const temperatureC = alloy.temperatureOf(heat);
    points.push({ seconds, temperatureC });
    if (temperatureC <= untilC) break;
    for (let k = 0; k < stepsPerPoint; k++) heat = coolFor(heat, everyS / stepsPerPoint, alloy, conditions);
  }
  return points;
};
