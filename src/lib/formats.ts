import { format, isToday, isYesterday } from 'date-fns';
import type { BasisInput } from '#shared/domain/pour-card/basis.ts';
import {
  formatMass,
  formatTemperature,
  formatTemperatureDifference,
  formatClock,
  type Units,
} from '#shared/lib/units.ts';

/** A moment as a time of day: `10:42`. */
export const timeOfDay = (iso: string): string => format(new Date(iso), 'HH:mm');

/** A moment as a day and time, today's without the day: `10:42`, `yesterday 10:42`, `24 Nov 10:42`. */
export const dayAndTime = (iso: string): string => {
  const moment = new Date(iso);
  if (isToday(moment)) return format(moment, 'HH:mm');
  if (isYesterday(moment)) return `yesterday ${format(moment, 'HH:mm')}`;
  return format(moment, 'd MMM HH:mm');
};

/** One input of a figure in the studio's units. */
export const formatInput = ({ value, unit }: BasisInput, units: Units): string => {
  if (typeof value === 'string') return value;
  switch (unit) {
    case 'C':
      return formatTemperature(value, units.temperature);
    case 'dC':
      return formatTemperatureDifference(value, units.temperature);
    case 'g':
      return formatMass(value, units.mass);
    case 'mm':
      return `${value} mm`;
    case 's':
      return formatClock(value);
    case 'perSecond':
      return `${(value * 60).toFixed(3)} per minute`;
    case 'gPerCm3':
      return `${value.toFixed(2)} g/cm³`;
    case 'share':
      return `${Math.round(value * 100)} %`;
    case 'text':
      return String(value);
  }
};
