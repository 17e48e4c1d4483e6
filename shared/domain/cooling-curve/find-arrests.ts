import type { Celsius } from '#shared/lib/units.ts';
import type { CurvePoint } from './curve-point.ts';
import { fitParabola } from './fit-parabola.ts';
import { findLaterArrests } from './find-later-arrests.ts';
import {
  inOrder,
  median,
  movingMean,
  noiseOf,
  rateNoise,
  smoothCurve,
  withoutSpikes,
  type SmoothPoint,
} from './smooth-curve.ts';

/** What a curve shows of the freezing, and how well it was logged. */
export interface Arrests {
  readonly liquidusC: Celsius;
  /** Standard deviation of the liquidus by noise and extrapolation, °C. */
  readonly liquidusErrorC: number;
  readonly liquidusAtS: number;
  /** How far the liquid fell below its liquidus before it began to freeze, °C. */
  readonly undercoolingC: number;
  /** °C per second in the liquid just before. */
  readonly liquidRate: number;
  /** A later halt: the eutectic, where there is one. */
  readonly plateauC: Celsius | null;
  /** Where the last of it froze; null where the curve stops before that. */
  readonly endC: Celsius | null;
}

/** How a curve was logged. */
export interface CurveQuality {
  readonly points: number;
  readonly noiseC: number;
  readonly everyS: number;
  readonly highestC: Celsius;
  readonly lowestC: Celsius;
}

/** Why no arrest can be told from a curve. */
export type CurveFault =
  'too-few-points' | 'too-slow-sampling' | 'too-much-noise' | 'no-arrest' | 'begins-too-late';

/** The arrests of a curve, or why there are none. */
export type FoundArrests = { readonly quality: CurveQuality } & (
  { readonly found: Arrests; readonly fault: null } | { readonly found: null; readonly fault: CurveFault }
);

const leastPoints = 24;
/** The liquid may fall so far between two points, °C, before an arrest could slip through. */
const widestGapC = 6;
/** A rate may be smeared over so much of the liquid's fall, °C. */
const widestSmearC = 18;
/** A rate must be known this well, as a share of the liquid's own. */
const rateShare = 0.1;
/** Losses follow the excess over a room of this temperature, near enough, °C. */
const roomC = 25;
/** The fall slows to less than this share of what it was: something freezes. */
const onsetShare = 0.6;
/** The liquid must have fallen at this share of the usual rate before a slowing counts. */
const leastCoolingShare = 0.6;
/** How much of the liquid's and of the freezing curve is fitted, °C and points. */
const fitted = { liquidC: 25, freezingC: 6, leastPoints: 10, leastLiquidC: 3 };
/** Carrying the freezing back over an undercooling is this far off, as a share of it. */
const undercoolingShare = 0.25;
/** A liquidus known no better tells nothing, °C. */
const largestErrorC = 4;
/** A reheating by more ends the curve, °C; recalescence stays below it. */
const reheatedC = 40;

/** From the end of holding to where someone heats again. */
const coolingPart = (points: readonly CurvePoint[], noiseC: number): readonly CurvePoint[] => {
  const highest = Math.max(...points.map(({ temperatureC }) => temperatureC));
  const start = points.findLastIndex(({ temperatureC }) => temperatureC >= highest - Math.max(1, 3 * noiseC));
  let lowest = Number.POSITIVE_INFINITY;
  const end = points.findIndex(({ temperatureC }, k) => {
    if (k < start) return false;
    lowest = Math.min(lowest, temperatureC);
    return temperatureC > lowest + reheatedC;
  });
  return points.slice(start, end < 0 ? undefined : end);
};

/** The rate at which most of the fall happens, °C/s: that of liquid or solid, not of freezing, which takes its time. */
const typicalRate = (points: readonly CurvePoint[]): number => {
  const falls = smoothCurve(points, 4)
    .filter(({ rate }) => rate > 0)
    .toSorted((a, b) => a.rate - b.rate);
  const whole = falls.reduce((total, { rate }) => total + rate, 0);
  let passed = 0;
  return falls.find(({ rate }) => (passed += rate) > 0.7 * whole)?.rate ?? 0;
};

/** The least reach over which rates are known well enough, or why there is none. */
const chooseReach = (points: readonly CurvePoint[], noiseC: number, everyS: number): number | CurveFault => {
  const rate = typicalRate(points);
  if (rate * everyS > widestGapC) return 'too-slow-sampling';
  let reach = 2;
  while (rateNoise(noiseC, everyS, reach) > rateShare * rate && reach < 200) reach++;
  return 2 * reach * everyS * rate > widestSmearC && reach > 2 ? 'too-much-noise' : reach;
};

/** Where the fall slows down for good, by its share of the fastest before it; -1 where it never does. */
const onsetOf = (points: readonly CurvePoint[], strengths: readonly number[], reach: number): number => {
  const middle = median(points.map(({ temperatureC }) => temperatureC));
  // While the metal is held, noise alone makes it fall and rise: that is no cooling that could slow down.
  const least = (leastCoolingShare * typicalRate(points)) / (middle - roomC);
  let fastest = 0;
  return strengths.findIndex((strength, k) => {
    fastest = Math.max(fastest, strength);
    if (fastest < least || strength > onsetShare * fastest) return false;
    const next = strengths.slice(k, k + 2 * reach + 2);
    return k >= reach && next.every((each) => each < 0.8 * fastest);
  });
};

interface Cooling {
  readonly points: readonly CurvePoint[];
  readonly smooth: readonly SmoothPoint[];
  readonly strengths: readonly number[];
  readonly reach: number;
  readonly noiseC: number;
}

/** Where the metal freezes steadily, and the bottom of the dip before it; null where it never warmed up again. */
interface Steady {
  readonly index: number;
  readonly dipC: Celsius | null;
}

/** The first point after the onset from which the metal freezes steadily: past any recalescence. */
const steadyFrom = ({ smooth, reach, noiseC }: Cooling, onset: number): Steady => {
  const temperatures = smooth.map(({ temperatureC }) => temperatureC);
  const sure = Math.max(0.3, (2.5 * noiseC) / Math.sqrt(2 * reach + 1));
  const around = temperatures.slice(onset - reach, onset + 3 * reach + 1);
  const dip = onset - reach + around.indexOf(Math.min(...around));
  const dipC = temperatures[dip] ?? 0;
  const fallen = temperatures.findIndex((temperatureC, k) => k > dip && temperatureC < dipC - sure);
  const part = temperatures.slice(dip, fallen < 0 ? undefined : fallen);
  const top = Math.max(...part);
  if (top - dipC < sure) return { index: onset + reach + 1, dipC: null };
  // A plateau's highest point may be anywhere on it by noise alone: the first as good as highest is meant.
  const rose = part.findIndex((temperatureC) => temperatureC >= top - sure);
  // As long again as it took to warm up: the last of the recalescence is still in the first of it.
  return { index: dip + rose + Math.max(reach + 1, rose), dipC };
};

/** The liquid's own cooling, carried on: its excess over the room falls as an exponential. */
const liquidLine = (
  { points, strengths, reach }: Cooling,
  onset: number,
): ((seconds: number) => number) | null => {
  const end = Math.max(0, onset - 2 * reach);
  const last = points[end]?.temperatureC ?? 0;
  const fastest = Math.max(...strengths.slice(0, end + 1));
  const part = points.filter(
    ({ temperatureC }, k) =>
      k <= end && temperatureC <= last + fitted.liquidC && (strengths[k] ?? 0) > 0.75 * fastest,
  );
  const [first] = part;
  if (part.length < 5 || !first || first.temperatureC - last < fitted.leastLiquidC) return null;
  const logs = part.map(({ seconds, temperatureC }) => ({
    seconds,
    temperatureC: Math.log(temperatureC - roomC),
  }));
  const [line] = smoothCurve(logs, logs.length);
  if (!line) return null;
  return (seconds) => roomC + Math.exp(line.temperatureC - line.rate * (seconds - line.seconds));
};

/** The steady part of the freezing, near its beginning. */
const freezingPart = ({ points, smooth, strengths }: Cooling, steady: number): readonly CurvePoint[] => {
  const from = smooth[steady]?.temperatureC ?? 0;
  const fastest = Math.max(...strengths.slice(0, steady));
  const end = smooth.findIndex(
    ({ temperatureC }, k) =>
      k > steady &&
      ((strengths[k] ?? 0) > 0.7 * fastest ||
        (temperatureC < from - fitted.freezingC && k - steady >= fitted.leastPoints)),
  );
  return points.slice(steady, end < 0 ? undefined : end);
};

/** Where the liquid's line and the freezing curve, carried back over any undercooling, meet. */
const meetingPlace = (
  liquid: (seconds: number) => number,
  freezing: (seconds: number) => number,
  { fromS, toS }: { readonly fromS: number; readonly toS: number },
): number | null => {
  const above = (seconds: number): number => liquid(seconds) - freezing(seconds);
  if (above(toS) > 0) return null;
  const step = (toS - fromS) / 400;
  let seconds = toS;
  while (seconds > fromS && above(seconds) < 0) seconds -= step;
  if (above(seconds) < 0) return null;
  let [low, high] = [seconds, seconds + step];
  for (let k = 0; k < 40; k++) {
    const middle = (low + high) / 2;
    if (above(middle) > 0) low = middle;
    else high = middle;
  }
  return (low + high) / 2;
};

const readArrests = (cooling: Cooling): Arrests | CurveFault => {
  const { points, smooth, strengths, reach, noiseC } = cooling;
  const onset = onsetOf(points, strengths, reach);
  if (onset < 0) return 'no-arrest';
  const liquid = liquidLine(cooling, onset);
  if (!liquid) return 'begins-too-late';
  const { index: steady, dipC } = steadyFrom(cooling, onset);
  const part = freezingPart(cooling, steady);
  const freezing = fitParabola(part.map(({ seconds, temperatureC }) => [seconds, temperatureC]));
  const [first, begun] = [points[0], part[0]];
  if (!freezing || !first || !begun) return 'no-arrest';
  const atS = meetingPlace(liquid, freezing.at, { fromS: first.seconds, toS: begun.seconds });
  if (atS === null) return 'no-arrest';
  const liquidusC = freezing.at(atS);
  const undercoolingC = dipC === null ? 0 : Math.max(0, liquidusC - dipC);
  const liquidusErrorC = Math.hypot(freezing.errorAt(atS, noiseC), undercoolingShare * undercoolingC);
  if (!(liquidusErrorC < largestErrorC)) return 'too-much-noise';
  return {
    liquidusC,
    liquidusErrorC,
    liquidusAtS: atS,
    undercoolingC,
    liquidRate: (liquid(atS - 1) - liquid(atS + 1)) / 2,
    ...findLaterArrests({ smooth, strengths, reach, from: steady, liquidusC }),
  };
};

/**
 * Finds the arrests of a logged cooling curve. Spikes are taken out; straight lines through neighbouring points give the
 * rate of fall, over just so many points that its noise is 10 % of the liquid's rate; where the rate, over the excess above
 * the room, drops below 60 % of the fastest before, something freezes. The liquidus is where the liquid's own cooling,
 * carried on, meets the steady freezing, carried back, so that undercooling and recalescence between them do not count.
 */
export const findArrests = (logged: readonly CurvePoint[]): FoundArrests => {
  const all = withoutSpikes(inOrder(logged));
  const noiseC = noiseOf(all);
  const points = all.length === 0 ? all : coolingPart(all, noiseC);
  const gaps = points.slice(1).map(({ seconds }, k) => seconds - (points[k]?.seconds ?? 0));
  const everyS = median(gaps);
  const temperatures = all.map(({ temperatureC }) => temperatureC);
  const quality: CurveQuality = {
    points: all.length,
    noiseC,
    everyS: Number.isNaN(everyS) ? 0 : everyS,
    highestC: Math.max(...temperatures),
    lowestC: Math.min(...temperatures),
  };
  if (points.length < leastPoints) {
    const slow = points.length >= 4 && typicalRate(points) * everyS > widestGapC;
    return { quality, found: null, fault: slow ? 'too-slow-sampling' : 'too-few-points' };
  }
  const reach = chooseReach(points, noiseC, everyS);
  if (typeof reach === 'string') return { quality, found: null, fault: reach };
  const smooth = smoothCurve(points, reach);
  const strengths = movingMean(
    smooth.map(({ rate, temperatureC }) => rate / Math.max(50, temperatureC - roomC)),
    reach,
  );
  const found = readArrests({ points, smooth, strengths, reach, noiseC });
  return typeof found === 'string' ? { quality, found: null, fault: found } : { quality, found, fault: null };
};
