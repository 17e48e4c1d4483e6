import { ok, refuse, type Result } from '#shared/lib/result.ts';
import type { Celsius } from '#shared/lib/units.ts';
import { fixedPointData, type FixedPointName } from './fixed-point.ts';

/** An instrument further off than this wants repair, not an offset, °C. The studio's own allowance, no source. */
export const largestOffsetC = 30;

/** A plateau that wanders more than this is none, ± °C. The studio's own allowance, no source. */
export const widestPlateauC = 5;

/** How near the end of its interval a check is called due. */
const dueSoonDays = 5;
const dayMs = 24 * 60 * 60 * 1000;

/** What was read while the metal froze. */
export interface PlateauReading {
  readonly point: FixedPointName;
  /** The middle of what the instrument showed on the plateau, uncorrected. */
  readonly readC: Celsius;
  /** How far it wandered to either side, ± °C. */
  readonly wanderC: number;
}

/** What a check found; to be added to every reading until the next check. */
export interface CheckFinding {
  readonly offsetC: number;
  /** Expanded uncertainty of the offset, coverage factor 2, ± °C. */
  readonly uncertaintyC: number;
  readonly sentence: string;
}

const tenth = (value: number): number => Math.round(value * 10) / 10;

const signed = (value: number): string =>
  value === 0 ? '0.0' : `${value > 0 ? '+' : '−'}${Math.abs(value).toFixed(1)}`;

/**
 * The offset from a plateau: what the phase rule says less what was read, to a tenth of a degree. Its uncertainty takes
 * the wandering as evenly spread, the display as good to half a degree, and the point's own allowance; times two.
 */
export const judgePlateau = ({ point, readC, wanderC }: PlateauReading): Result<CheckFinding> => {
  const { name, temperatureC, uncertaintyC: ownC } = fixedPointData[point];
  if (!Number.isFinite(readC) || !Number.isFinite(wanderC) || wanderC < 0)
    return refuse('A check needs the reading of the plateau, and how far it wandered.');
  if (wanderC > widestPlateauC)
    return refuse(
      `It wandered by ± ${wanderC.toFixed(1)} °C: that is no plateau. Let more metal freeze, more slowly.`,
    );
  const offsetC = tenth(temperatureC - readC);
  if (Math.abs(offsetC) > largestOffsetC)
    return refuse(
      `That is ${Math.abs(offsetC).toFixed(1)} °C from the ${name}: an instrument so far off wants repair, not an offset. Or it was not ${name === 'silver-copper eutectic' ? 'that alloy' : 'fine metal'}.`,
    );
  const uncertaintyC = tenth(2 * Math.hypot(wanderC / Math.sqrt(3), 0.5 / Math.sqrt(3), ownC));
  return ok({
    offsetC,
    uncertaintyC,
    sentence: `Reads ${offsetC === 0 ? 'true' : `${Math.abs(offsetC).toFixed(1)} °C ${offsetC > 0 ? 'low' : 'high'}`} at ${temperatureC} °C, known to about ± ${uncertaintyC.toFixed(1)} °C: offset ${signed(offsetC)} °C. The further a reading lies from there, the less the check says of it.`,
  });
};

/** A reading as the instrument gave it, and with its offset; both are kept and shown. */
export interface CorrectedReading {
  readonly rawC: Celsius;
  readonly offsetC: number;
  readonly temperatureC: Celsius;
}

/** A reading with the offset of the last check added; none is 0. */
export const correctReading = (rawC: Celsius, offsetC: number | null): CorrectedReading => ({
  rawC,
  offsetC: offsetC ?? 0,
  temperatureC: tenth(rawC + (offsetC ?? 0)),
});

/** Where an instrument stands between its checks. */
export interface CheckDue {
  readonly state: 'never' | 'in-date' | 'due' | 'overdue';
  /** An ISO 8601 instant; null where it was never checked. */
  readonly dueAt: string | null;
  readonly sentence: string;
}

const daysWords = (days: number): string => (days === 1 ? '1 day' : `${days} days`);

/** Whether a check is due, `intervalDays` after the last one. */
export const checkDue = (lastCheckedAt: string | null, intervalDays: number, now: Date): CheckDue => {
  if (lastCheckedAt === null)
    return { state: 'never', dueAt: null, sentence: 'Never checked: its readings are shown as they come.' };
  const due = Date.parse(lastCheckedAt) + intervalDays * dayMs;
  const dueAt = new Date(due).toISOString();
  const leftDays = (due - now.getTime()) / dayMs;
  if (leftDays < 0)
    return {
      state: 'overdue',
      dueAt,
      sentence: `Check overdue by ${daysWords(Math.max(1, Math.floor(-leftDays)))}.`,
    };
  const words = daysWords(Math.ceil(leftDays));
  return leftDays <= dueSoonDays
    ? { state: 'due', dueAt, sentence: `Check due within ${words}.` }
    : { state: 'in-date', dueAt, sentence: `Next check in ${words}.` };
};
