import type { Celsius } from '#shared/lib/units.ts';
import type { CheckDue } from './pyrometer-check.ts';
import { toleranceAt, type ThermocoupleType } from './thermocouple.ts';

/** What is known of a thermometer when its readings are judged. */
export interface KnownThermometer {
  readonly thermocouple: ThermocoupleType | null;
  /** The last check's uncertainty, ± °C, and whether the next is overdue; null where there was none. */
  readonly check: { readonly uncertaintyC: number; readonly state: CheckDue['state'] } | null;
}

/** A pyrometer that was never checked may be off by so much, ± °C: common practice, no source. */
const uncheckedPyrometerC = 10;

/** How far a thermometer may be off at `celsius`, ± °C: by its check while that is in date, else by the class of its thermocouple. */
export const thermometerUncertainty = (known: KnownThermometer | null, celsius: Celsius): number => {
  if (known?.check && known.check.state !== 'overdue') return known.check.uncertaintyC;
  // Of a thermometer that nobody named, the least exact kind is assumed.
  if (!known) return toleranceAt('K', celsius);
  return known.thermocouple === null ? uncheckedPyrometerC : toleranceAt(known.thermocouple, celsius);
};
