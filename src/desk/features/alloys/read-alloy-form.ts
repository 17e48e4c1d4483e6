import type { FieldProblem } from '#shared/contracts/problem.ts';
import { parseDecimal } from '#shared/lib/decimal.ts';
import { toCelsius, type TemperatureUnit } from '#shared/lib/units.ts';
import type { AlloyFormValues, PartValues } from './alloy-form-values.ts';

/** What a form says as a request, unchecked, and what in it cannot be read, by the form's own paths. */
export interface ReadForm {
  readonly request: unknown;
  readonly faults: readonly FieldProblem[];
}

type Faults = FieldProblem[];

const readNumber = (text: string, path: string, faults: Faults): number | undefined => {
  const number = parseDecimal(text);
  if (number.ok) return number.value;
  faults.push({ path, message: number.error });
  return undefined;
};

const readOptional = (text: string, path: string, faults: Faults): number | null | undefined =>
  text.trim() === '' ? null : readNumber(text, path, faults);

/** A symbol as it is meant: `ag` and ` AG ` are Ag. */
export const tidySymbol = (text: string): string => {
  const letters = text.trim();
  return letters.charAt(0).toUpperCase() + letters.slice(1).toLowerCase();
};

const readParts = (parts: readonly PartValues[], faults: Faults) => {
  const compositionWt: Record<string, number> = {};
  const toleranceWt: Record<string, number> = {};
  parts.forEach((part, index) => {
    const symbol = tidySymbol(part.symbol);
    const isEmpty = symbol === '' && part.wt.trim() === '' && part.tolerance.trim() === '';
    if (isEmpty) return;
    if (!/^[A-Z][a-z]?$/.test(symbol)) {
      faults.push({ path: `parts.${index}.symbol`, message: 'Use an element symbol, such as Ag.' });
    } else if (symbol in compositionWt) {
      faults.push({ path: `parts.${index}.symbol`, message: `${symbol} already stands in another row.` });
    }
    const wt = readNumber(part.wt, `parts.${index}.wt`, faults);
    const tolerance = readOptional(part.tolerance, `parts.${index}.tolerance`, faults);
    if (wt !== undefined) compositionWt[symbol] = wt;
    if (tolerance !== undefined && tolerance !== null) toleranceWt[symbol] = tolerance;
  });
  return { compositionWt, toleranceWt };
};

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
  const faults: Faults = [];
  const { quench } = values;
  const request = {
    name: values.name,
    family: values.family,
    ...readParts(values.parts, faults),
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
  compositionWt: 'parts',
  toleranceWt: 'parts',
  measured: 'isMeasured',
  'quench.earliestS': 'quench.earliest',
  'quench.latestS': 'quench.latest',
  'measured.solidusC': 'measured.solidus',
  'measured.liquidusC': 'measured.liquidus',
  'measured.densityGPerCm3': 'measured.density',
};

/** The form's place for a request's path: `compositionWt.Ag` is the amount in the row of silver, `parts` the composition as a whole. */
export const formPathOf = (path: string, parts: readonly PartValues[]): string => {
  const [head = '', symbol] = path.split('.');
  const column = head === 'compositionWt' ? 'wt' : head === 'toleranceWt' ? 'tolerance' : null;
  if (column && symbol) {
    const row = parts.findIndex((part) => tidySymbol(part.symbol) === symbol);
    return row < 0 ? 'parts' : `parts.${row}.${column}`;
  }
  return renamed[path] ?? path;
};
