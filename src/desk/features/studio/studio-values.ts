import { z } from 'zod';
import { updateStudioRequest, type Studio, type UpdateStudioRequest } from '#shared/contracts/studio.ts';
import { parseDecimal } from '#shared/lib/decimal.ts';

/** A part of the settings as it is typed: every number a text, the rest as it is. */
export type Typed<Part> = Part extends number
  ? string
  : Part extends string
    ? Part
    : { -readonly [Key in keyof Part]: Typed<Part[Key]> };

/** The settings' form as it is typed; `version` is the one that was read. */
export type StudioValues = Typed<Omit<UpdateStudioRequest, 'version'>> & { readonly version: number };

/** How many of the form's units make one of the record's, for numbers that people read in another unit. */
const perRecordUnit = { share: 100, rate: 60 } as const;

type FormUnit = keyof typeof perRecordUnit;

const unitOf = (key: string): FormUnit | null => {
  if (key === 'perSecond') return 'rate';
  return key.endsWith('Share') || key === 'chargeTolerance' ? 'share' : null;
};

// Twelve digits hide what binary fractions add to a product such as 0.00126 × 60.
const tidy = (value: number): number => Number(value.toPrecision(12));

const factorOf = (key: string): number => {
  const unit = unitOf(key);
  return unit ? perRecordUnit[unit] : 1;
};

const writePart = (part: unknown, key: string): unknown => {
  if (typeof part === 'number') return String(tidy(part * factorOf(key)));
  if (Array.isArray(part)) return part.map((item) => writePart(item, key));
  if (part !== null && typeof part === 'object') {
    return Object.fromEntries(Object.entries(part).map(([name, value]) => [name, writePart(value, name)]));
  }
  return part;
};

const textKeys = ['name', 'temperatureUnit', 'massUnit', 'timeZone', 'marksPlace'];

const readNumber = (text: string, key: string): number => {
  const parsed = parseDecimal(text);
  return parsed.ok ? tidy(parsed.value / factorOf(key)) : Number.NaN;
};

const readPart = (part: unknown, key: string): unknown => {
  if (typeof part === 'string') return textKeys.includes(key) ? part : readNumber(part, key);
  if (Array.isArray(part)) return part.map((item) => readPart(item, key));
  if (part !== null && typeof part === 'object') {
    return Object.fromEntries(
      Object.entries(part).map(([name, value]) => [name, name === 'sources' ? value : readPart(value, name)]),
    );
  }
  return part;
};

/** The form of the settings as they are: shares in per cent, cooling rates per minute, temperatures in °C. */
export const valuesOf = ({ version, abilities: _, ...settings }: Studio): StudioValues => ({
  ...(writePart(settings, '') as Omit<StudioValues, 'version'>),
  version,
});

/** What the form would send, before it is judged; a number that cannot be read becomes NaN. */
export const requestOf = (values: StudioValues): UpdateStudioRequest =>
  readPart(values, '') as UpdateStudioRequest;

/** Reads the settings' form; `12,5` is a number too. */
export const studioForm = z.custom<StudioValues>().transform(requestOf).pipe(updateStudioRequest);
