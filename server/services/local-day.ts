import { tz } from '@date-fns/tz';
import { addDays, parseISO, startOfDay } from 'date-fns';

/** The two instants between which a local day (`year-month-day`) lies in an IANA time zone, daylight saving included. */
export const boundsOfLocalDay = (
  day: string,
  timeZone: string,
): { readonly from: Date; readonly to: Date } => {
  const zone = tz(timeZone);
  const from = startOfDay(parseISO(day, { in: zone }), { in: zone });
  return { from: new Date(from.getTime()), to: new Date(addDays(from, 1, { in: zone }).getTime()) };
};
