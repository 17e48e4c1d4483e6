import type { Celsius } from '#shared/lib/units.ts';
import type { FlaskCooling } from '../studio/process-tables.ts';

/** A mould cooling towards the room: its furnace temperature, the room, and its rate per second. */
export interface CoolingFlask {
  readonly startC: Celsius;
  readonly roomC: Celsius;
  readonly perSecond: number;
}

/** Expected mould temperature in °C after `seconds` out of the furnace, by Newton's law of cooling. */
export const flaskTemperatureAt = ({ startC, roomC, perSecond }: CoolingFlask, seconds: number): Celsius =>
  roomC + (startC - roomC) * Math.exp(-perSecond * Math.max(0, seconds));

/** Seconds until the mould has cooled to `floorC`; 0 when it begins colder, infinite when the room is warmer. */
export const secondsUntil = ({ startC, roomC, perSecond }: CoolingFlask, floorC: Celsius): number => {
  if (startC <= floorC) return 0;
  if (floorC <= roomC) return Number.POSITIVE_INFINITY;
  return Math.log((startC - roomC) / (floorC - roomC)) / perSecond;
};

/** The studio's cooling rate for a flask diameter: that of the nearest diameter in its table. */
export const coolingRateFor = (diameterMm: number, table: readonly FlaskCooling[]): FlaskCooling => {
  const [first, ...rest] = table;
  if (!first) throw new RangeError('The studio has no cooling rate for any flask size.');
  return rest.reduce(
    (best, entry) =>
      Math.abs(entry.diameterMm - diameterMm) < Math.abs(best.diameterMm - diameterMm) ? entry : best,
    first,
  );
};
