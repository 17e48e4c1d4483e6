import type { InstrumentReading } from '#shared/contracts/instrument.ts';
import type { ThermometerFault } from '#shared/domain/instrument/read-thermometer-line.ts';
import { fromCelsius, fromCelsiusDifference, type TemperatureUnit } from '#shared/lib/units.ts';

const faults: Readonly<Record<ThermometerFault, string>> = {
  open: 'open thermocouple',
  'over-range': 'above its range',
  'under-range': 'below its range',
  other: 'a fault of its own',
};

const tenth = (value: number): string => value.toFixed(1);

/** An offset with its sign: `+4.3 °C`. */
export const offsetWords = (offsetC: number, unit: TemperatureUnit = 'C'): string => {
  const value = fromCelsiusDifference(offsetC, unit);
  return `${value < 0 ? '−' : '+'}${tenth(Math.abs(value))}\u00a0°${unit}`;
};

/** A reading as it counts and, where there is an offset, as it came: `896.7 °C (read 892.4, offset +4.3 °C)`. */
export const readingWords = (
  { rawC, temperatureC, offsetC, fault }: InstrumentReading,
  unit: TemperatureUnit,
): string => {
  if (rawC === null || temperatureC === null) return faults[fault ?? 'other'];
  const counted = `${tenth(fromCelsius(temperatureC, unit))}\u00a0°${unit}`;
  return offsetC === 0
    ? `${counted}, no offset`
    : `${counted} (read ${tenth(fromCelsius(rawC, unit))}, offset ${offsetWords(offsetC, unit)})`;
};
