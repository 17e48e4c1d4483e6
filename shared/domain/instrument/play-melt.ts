import type { Celsius } from '#shared/lib/units.ts';
import type { Composition } from '#shared/metallurgy/index.ts';
import { computeCooling } from '../cooling-curve/compute-cooling.ts';
import type { CurvePoint } from '../cooling-curve/curve-point.ts';

/** A melt to be played: heated, held, and left to cool. */
export interface MeltPlay {
  readonly composition: Composition;
  /** How far above its liquidus it is held, °C, and for how long, s. */
  readonly superheatC: number;
  readonly holdS: number;
  /** How fast it is heated, and how fast the liquid then cools, °C/s. */
  readonly heatingRate: number;
  readonly coolingRate: number;
  readonly noiseC: number;
  /** The same number plays the same noise. */
  readonly seed: number;
}

const roomC = 22;
/** It cools so far below where the last of it freezes, °C. */
const beyondC = 60;

/** Repeatable, nearly normal numbers: the sum of twelve even ones of the mulberry32 generator, less six. */
const noiseFrom = (seed: number): (() => number) => {
  let state = seed >>> 0;
  const even = (): number => {
    state = (state + 0x6d2b79f5) >>> 0;
    let t = state;
    t = Math.imul(t ^ (t >>> 15), t | 1);
    t ^= t + Math.imul(t ^ (t >>> 7), t | 61);
    return ((t ^ (t >>> 14)) >>> 0) / 4294967296;
  };
  return () => Array.from({ length: 12 }, even).reduce((sum, value) => sum + value, -6);
};

/** A melt's temperature second by second, as a thermometer would tell it; null where the model does not hold the alloy. */
export const playMelt = (
  play: MeltPlay,
  range: { readonly liquidusC: Celsius; readonly endC: Celsius },
): readonly CurvePoint[] | null => {
  const holdC = range.liquidusC + play.superheatC;
  const cooling = computeCooling(play.composition, 'scheil', {
    startC: holdC,
    untilC: range.endC - beyondC,
    surroundingsC: roomC,
    ratePerSecond: play.coolingRate,
    everyS: 1,
  });
  if (!cooling) return null;
  const noise = noiseFrom(play.seed);
  const heatingS = Math.ceil((holdC - roomC) / play.heatingRate);
  const before = Array.from({ length: heatingS + play.holdS }, (_, second) =>
    Math.min(holdC, roomC + second * play.heatingRate),
  );
  return [...before, ...cooling.map(({ temperatureC }) => temperatureC)].map((temperatureC, seconds) => ({
    seconds,
    temperatureC: Math.round(10 * (temperatureC + play.noiseC * noise())) / 10,
  }));
};
