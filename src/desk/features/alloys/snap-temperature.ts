import { fromCelsius, toCelsius, type TemperatureUnit } from '#shared/lib/units.ts';
import type { TemperatureSpan } from './temperature-span.ts';

/** Rounds °C to a whole degree of the studio's unit inside a span. */
export const snapTemperature = (
  celsius: number,
  { lowC, highC }: TemperatureSpan,
  unit: TemperatureUnit,
): number => {
  const inside = Math.min(highC, Math.max(lowC, celsius));
  const whole = toCelsius(Math.round(fromCelsius(inside, unit)), unit);
  return Number(Math.min(highC, Math.max(lowC, whole)).toFixed(3));
};

/** A chosen temperature in the studio's unit with the tenth it was typed with, if any: `850`, `850.5`. */
export const writeDegrees = (celsius: number, unit: TemperatureUnit): string =>
  String(Number(fromCelsius(celsius, unit).toFixed(1)));

const steps: Readonly<Record<string, number>> = {
  ArrowUp: 1,
  ArrowRight: 1,
  ArrowDown: -1,
  ArrowLeft: -1,
  PageUp: 10,
  PageDown: -10,
};

/** Where a key takes a temperature in °C: arrows one degree of the studio's unit, with shift or the page keys ten; null for others. */
export const temperatureAfterKey = (
  celsius: number,
  { key, shiftKey }: { readonly key: string; readonly shiftKey: boolean },
  span: TemperatureSpan,
  unit: TemperatureUnit,
): number | null => {
  if (key === 'Home') return snapTemperature(span.lowC, span, unit);
  if (key === 'End') return snapTemperature(span.highC, span, unit);
  const step = steps[key];
  if (step === undefined) return null;
  const degrees = shiftKey && key.startsWith('Arrow') ? step * 10 : step;
  return snapTemperature(toCelsius(fromCelsius(celsius, unit) + degrees, unit), span, unit);
};
