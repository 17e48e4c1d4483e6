import { tz } from '@date-fns/tz';
import { addDays, addHours, format, parseISO, startOfDay } from 'date-fns';

/** Times of day and days as the studio's own clock shows them, wherever the browser stands. */
export interface StudioClock {
  /** The local day of a moment in ms since the epoch: `2026-12-01`. */
  readonly dayOf: (ms: number) => string;
  /** The local day so many days after another. */
  readonly dayAfter: (day: string, days: number) => string;
  /** The instant, in ms since the epoch, so many hours after local midnight. */
  readonly hourOf: (day: string, hour: number) => number;
  /** `10:42`. */
  readonly time: (iso: string | number) => string;
  /** `10:42:07`. */
  readonly exactTime: (iso: string) => string;
  /** `1 Dec 10:42`. */
  readonly dayAndTime: (iso: string) => string;
  /** `Tuesday 1 December`, with the year when it is not `year`. */
  readonly longDay: (day: string, year?: number) => string;
}

/** Makes the clock of an IANA time zone; `longDay` leaves out the year only where it is the one given. */
export const studioClock = (timeZone: string): StudioClock => {
  const zone = { in: tz(timeZone) };
  const write = (iso: string | number, pattern: string): string => format(new Date(iso), pattern, zone);
  const midnight = (day: string): Date => startOfDay(parseISO(day, zone), zone);
  return {
    dayOf: (ms) => write(ms, 'yyyy-MM-dd'),
    dayAfter: (day, days) => format(addDays(midnight(day), days, zone), 'yyyy-MM-dd', zone),
    hourOf: (day, hour) => addHours(midnight(day), hour, zone).getTime(),
    time: (iso) => write(iso, 'HH:mm'),
    exactTime: (iso) => write(iso, 'HH:mm:ss'),
    dayAndTime: (iso) => write(iso, 'd MMM HH:mm'),
    longDay: (day, year) => {
      const date = midnight(day);
      const isThatYear = year !== undefined && format(date, 'yyyy', zone) === String(year);
      return format(date, isThatYear ? 'EEEE d MMMM' : 'EEEE d MMMM yyyy', zone);
    },
  };
};
