import type { Celsius } from '#shared/lib/units.ts';

/** One flask out of the furnace: its size, the room, and its mould's temperature by the seconds since. */
export interface FlaskOuting {
  readonly id: string;
  readonly roomC: Celsius;
  readonly readings: readonly FlaskReading[];
}

/** A mould's temperature so many seconds out of the furnace. */
export interface FlaskReading {
  readonly secondsOut: number;
  readonly temperatureC: Celsius;
}

/** A reading left out of a fit, with the reason. */
export interface LeftOutReading extends FlaskReading {
  readonly outingId: string;
  readonly why: string;
}

/** A cooling constant fitted to logged temperatures, and what stands behind it. */
export interface CoolingFit {
  readonly perSecond: number;
  /** Standard error of the constant, per second; null where too few readings tell it. */
  readonly standardError: number | null;
  /** Readings and outings that were used. */
  readonly readings: number;
  readonly outings: number;
  /** Root of the mean square of what is left, °C. */
  readonly scatterC: number;
  /** The temperature at 0 s by the fit, for each outing. */
  readonly startsC: Readonly<Record<string, Celsius>>;
  readonly leftOut: readonly LeftOutReading[];
}

/** When a fit is good enough to take the place of the default; the studio's own rule, no source. */
export const fitRule = { leastReadings: 12, leastOutings: 3, largestRelativeError: 0.1 } as const;

/** A flask must stand so far above the room for its logarithm to mean anything, °C. */
const leastExcessC = 40;
/** How many times the usual scatter a reading may lie off; and what scatter is the least, °C. */
const outlierTimes = 4;
const leastScatterC = 1.5;
/** The constants a flask can have; what the settings take too. */
const plausible = { low: 0.00005, high: 0.02 };

interface Point extends FlaskReading {
  readonly outingId: string;
  readonly excessC: number;
}

interface Line {
  readonly perSecond: number;
  readonly logStarts: ReadonlyMap<string, number>;
  /** Σ w (t − t̄)² over all outings, and for each alone with its own slope. */
  readonly spread: number;
  readonly ownSlopes: readonly number[];
}

const sum = (values: readonly number[]): number => values.reduce((total, value) => total + value, 0);

const median = (values: readonly number[]): number => {
  const sorted = [...values].sort((a, b) => a - b);
  const middle = sorted.length >> 1;
  return sorted.length % 2 === 1
    ? (sorted[middle] ?? 0)
    : ((sorted[middle - 1] ?? 0) + (sorted[middle] ?? 0)) / 2;
};

const byOuting = (points: readonly Point[]): ReadonlyMap<string, readonly Point[]> => {
  const groups = new Map<string, Point[]>();
  for (const point of points) {
    const group = groups.get(point.outingId);
    if (group) group.push(point);
    else groups.set(point.outingId, [point]);
  }
  return groups;
};

/**
 * The moments of one outing. A thermometer errs by degrees, so a logarithm errs by degrees over the excess: each is
 * weighted by the square of its excess.
 */
const momentsOf = (points: readonly Point[]) => {
  const weight = (point: Point): number => point.excessC ** 2;
  const whole = sum(points.map(weight));
  const meanS = sum(points.map((point) => weight(point) * point.secondsOut)) / whole;
  const meanLog = sum(points.map((point) => weight(point) * Math.log(point.excessC))) / whole;
  const spread = sum(points.map((point) => weight(point) * (point.secondsOut - meanS) ** 2));
  const cross = sum(
    points.map((point) => weight(point) * (point.secondsOut - meanS) * (Math.log(point.excessC) - meanLog)),
  );
  return { meanS, meanLog, spread, cross };
};

/** Least squares with one slope for all outings and a start of its own for each; null where nothing tells a slope. */
const fitLine = (points: readonly Point[]): Line | null => {
  const moments = [...byOuting(points)].map(([id, group]) => ({ id, ...momentsOf(group) }));
  const spread = sum(moments.map((each) => each.spread));
  if (!(spread > 0)) return null;
  const slope = sum(moments.map((each) => each.cross)) / spread;
  return {
    perSecond: -slope,
    logStarts: new Map(moments.map(({ id, meanLog, meanS }) => [id, meanLog - slope * meanS])),
    spread,
    ownSlopes: moments.filter((each) => each.spread > 0).map((each) => -each.cross / each.spread),
  };
};

/** How far a reading lies above the line, °C. */
const offBy = (line: Line, { outingId, secondsOut, excessC }: Point): number =>
  excessC - Math.exp((line.logStarts.get(outingId) ?? 0) - line.perSecond * secondsOut);

/** The one reading furthest off the line, when it is further off than readings of this scatter come to lie. */
const worstOutlier = (points: readonly Point[], line: Line): Point | null => {
  const residuals = points.map((point) => Math.abs(offBy(line, point)));
  // 1.4826 makes the median deviation of a normal scatter its standard deviation.
  const limit = outlierTimes * Math.max(leastScatterC, 1.4826 * median(residuals));
  const worst = residuals.indexOf(Math.max(...residuals));
  return (residuals[worst] ?? 0) > limit ? (points[worst] ?? null) : null;
};

/**
 * The larger of two standard errors: from the scatter of readings about their lines, and from how the outings' own slopes
 * differ, for the readings of one outing share whatever was odd about it.
 */
const standardErrorOf = (points: readonly Point[], line: Line): number | null => {
  const freedom = points.length - line.logStarts.size - 1;
  if (freedom < 1) return null;
  const within = Math.sqrt(sum(points.map((point) => offBy(line, point) ** 2)) / freedom / line.spread);
  const { ownSlopes } = line;
  if (ownSlopes.length < 2) return within;
  const variance = sum(ownSlopes.map((slope) => (slope - line.perSecond) ** 2)) / (ownSlopes.length - 1);
  return Math.max(within, Math.sqrt(variance / ownSlopes.length));
};

const sortOut = (outings: readonly FlaskOuting[]) => {
  const points: Point[] = [];
  const leftOut: LeftOutReading[] = [];
  for (const { id: outingId, roomC, readings } of outings) {
    const warm = readings.filter(({ temperatureC }) => temperatureC - roomC >= leastExcessC);
    const why =
      warm.length < 2
        ? 'The only reading of its outing: one tells no rate.'
        : `Within ${leastExcessC} °C of the room: too cold to tell a rate.`;
    for (const reading of readings) {
      if (warm.length >= 2 && warm.includes(reading))
        points.push({ ...reading, outingId, excessC: reading.temperatureC - roomC });
      else leftOut.push({ ...reading, outingId, why });
    }
  }
  return { points, leftOut };
};

const withoutOutliers = (all: readonly Point[]) => {
  let points = all;
  let line = fitLine(points);
  const outliers: LeftOutReading[] = [];
  // At most a fifth may go: a cloud of which more lies off is no line.
  while (line && outliers.length < all.length / 5) {
    const worst = worstOutlier(points, line);
    if (!worst) break;
    const { outingId, secondsOut, temperatureC } = worst;
    const off = offBy(line, worst);
    outliers.push({
      outingId,
      secondsOut,
      temperatureC,
      why: `${Math.abs(off).toFixed(0)} °C ${off > 0 ? 'above' : 'below'} what the others say.`,
    });
    points = points.filter((point) => point !== worst);
    line = fitLine(points);
  }
  return { points, line, outliers };
};

/**
 * Newton's cooling constant of one flask size, per second, by weighted least squares on the logarithm of the excess over
 * the room: one constant for all outings, each with a start of its own, so that the furnace's display need not be right.
 * Readings far off are taken out one by one and named. Null where no outing has two readings.
 */
export const fitFlaskCooling = (outings: readonly FlaskOuting[]): CoolingFit | null => {
  const sorted = sortOut(outings);
  const { points, line, outliers } = withoutOutliers(sorted.points);
  if (!line) return null;
  const roomOf = new Map(outings.map(({ id, roomC }) => [id, roomC]));
  const squares = sum(points.map((point) => offBy(line, point) ** 2));
  return {
    perSecond: line.perSecond,
    standardError: standardErrorOf(points, line),
    readings: points.length,
    outings: line.logStarts.size,
    scatterC: Math.sqrt(squares / points.length),
    startsC: Object.fromEntries(
      [...line.logStarts].map(([id, start]) => [id, Math.exp(start) + (roomOf.get(id) ?? 0)]),
    ),
    leftOut: [...sorted.leftOut, ...outliers],
  };
};

/** Why a fit does not yet take the place of the default, in one sentence; null when it does. */
export const faultOfFit = (fit: CoolingFit | null): string | null => {
  const { leastReadings, leastOutings, largestRelativeError } = fitRule;
  if (!fit || fit.readings < leastReadings || fit.outings < leastOutings)
    return `A fit wants ${leastReadings} readings from ${leastOutings} flasks out of the furnace; there are ${fit?.readings ?? 0} from ${fit?.outings ?? 0}.`;
  if (fit.perSecond < plausible.low || fit.perSecond > plausible.high)
    return 'The readings tell of no cooling that a flask could have. Look at what was logged.';
  const relative = (fit.standardError ?? Number.POSITIVE_INFINITY) / fit.perSecond;
  if (relative > largestRelativeError)
    return `The readings scatter too much: the constant is known to ${Math.round(100 * relative)} % only, and ${100 * largestRelativeError} % is wanted.`;
  return null;
};
