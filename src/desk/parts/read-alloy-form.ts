import type { FieldProblem } from '#shared/contracts/problem.ts';
import { parseDecimal } from '#shared/lib/decimal.ts';
import { toCelsius, type TemperatureUnit } from '#shared/lib/units.ts';
import type { AlloyFormValues } from './alloy-form-values.ts';
import type { ReadForm } from './form-schema.ts';
import { placeOfPart, readParts, type PartValues } from './read-parts.ts';

type Faults = FieldProblem[];

const readNumber = (text: string, path: string, faults: Faults): number | undefined => {
  const number = parseDecimal(text);
  if (number.ok) return number.value;
  faults.push({ path, message: number.error });
  return undefined;
};

const readOptional = (text: string, path: string, faults: Faults): number | null | undefined =>
  text.trim() === '' ? null : readNumber(text, path, faults);

const seconds = (minutes: number | null | undefined): number | null | undefined =>
  typeof minutes === 'number' ? Math.round(minutes * 60) : minutes;

const readMeasured = ({ isMeasured, measured }: AlloyFormValues, unit: TemperatureUnit, faults: Faults) => {
  if (!isMeasured) return null;
  const degrees = (text: string, path: string): number | undefined => {
    const value = readNumber(text, path, faults);
    return value === undefined ? undefined : Number(toCelsius(value, unit).toFixed(3));
  };
  return {
    solidusC: degrees(measured.solidus, 'measured.solidus'),
    liquidusC: degrees(measured.liquidus, 'measured.liquidus'),
    densityGPerCm3: readNumber(measured.density, 'measured.density', faults),
    source: measured.source,
  };
};

/** Reads a form as typed: decimal commas, minutes and the studio's degrees; nothing is guessed. */
export const readAlloyForm = (values: AlloyFormValues, unit: TemperatureUnit): ReadForm => {
  const { compositionWt, toleranceWt, faults: partFaults } = readParts(values.parts);
  const faults: Faults = [...partFaults];
  const { quench } = values;
  const request = {
    name: values.name,
    family: values.family,
    compositionWt,
    toleranceWt,
    fineness: readNumber(values.fineness, 'fineness', faults),
    quench: {
      earliestS: seconds(readNumber(quench.earliest, 'quench.earliest', faults)),
      latestS: seconds(readOptional(quench.latest, 'quench.latest', faults)),
      medium: quench.medium,
      why: quench.why,
      source: quench.source,
    },
    measured: readMeasured(values, unit, faults),
    note: values.note,
  };
  return { request, faults };
};

const renamed: Readonly<Record<string, string>> = {
  measured: 'isMeasured',
  'quench.earliestS': 'quench.earliest',
  'quench.latestS': 'quench.latest',
  'measured.solidusC': 'measured.solidus',
  'measured.liquidusC': 'measured.liquidus',
  'measured.densityGPerCm3': 'measured.density',
};

/** The alloy form's place for a request's path: `compositionWt.Ag` is the amount in the row of silver, `parts` the composition as a whole. */
export const formPathOf = (path: string, parts: readonly PartValues[]): string =>
  placeOfPart(path, parts) ?? renamed[path] ?? path;
