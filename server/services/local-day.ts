import { tz } from '@date-fns/tz';
import { addDays, parseISO, startOfDay } from 'date-fns';

/** The two instants between which a local day (`year-month-day`) lies in an IANA time zone, daylight saving included. */
export const boundsOfLocalDay = (
  day: string,
  timeZone: string,
): { readonly from: Date; readonly to: Date } => {
  const zone = tz(timeZone);
  const from = startOfDay(parseISO(day, { in: zone }), { in: zone });
  // The day may begin at one o'clock, where midnight is skipped; the next one need not.
  const to = startOfDay(addDays(from, 1, { in: zone }), { in: zone });
  return { from: new Date(from.getTime()), to: new Date(to.getTime()) };
};
