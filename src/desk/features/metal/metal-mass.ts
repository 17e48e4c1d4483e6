import { fromMilligrams, toMilligrams } from '#shared/domain/metal/ledger.ts';
import { unitSlip } from '#shared/domain/metal/unit-slip.ts';
import { parseDecimal } from '#shared/lib/decimal.ts';
import { ok, refuse, type Result } from '#shared/lib/result.ts';
import { fromGrams, toGrams, typedMassUnits, type MassUnit, type TypedMassUnit } from '#shared/lib/units.ts';

/** Decimals in which two masses a milligram apart are written differently. */
const exactDecimals: Readonly<Record<MassUnit, number>> = { g: 3, dwt: 4, ozt: 5 };

/** Writes whole milligrams in the studio's unit without its name, to the milligram: `84.203`, `−0.050`. */
export const writeExactMass = (milligrams: number, unit: MassUnit): string => {
  const figure = fromGrams(fromMilligrams(Math.abs(milligrams)), unit).toFixed(exactDecimals[unit]);
  return milligrams < 0 ? `\u2212${figure}` : figure;
};

/** Writes grams in the studio's unit with its name, to the milligram: `84.203 g`. */
export const writeExactGrams = (grams: number, unit: MassUnit): string =>
  `${writeExactMass(toMilligrams(grams), unit)}\u00a0${unit}`;

/** Decimals in which a step of 0.01 g is written. */
const weighableDecimals: Readonly<Record<MassUnit, number>> = { g: 2, dwt: 3, ozt: 4 };

/** Writes grams that are to be weighed out, to the step of the balance: `12.40 g`. */
export const writeWeighable = (grams: number, unit: MassUnit): string =>
  `${fromGrams(grams, unit).toFixed(weighableDecimals[unit])}\u00a0${unit}`;

const withUnit = /^(.*?)\s*(kg|g|dwt|ozt)$/i;

/** The unit typed after a figure; null where there is none. */
const unitTyped = (text: string): readonly [figure: string, unit: TypedMassUnit] | null => {
  const [, figure = '', letters = ''] = withUnit.exec(text.trim()) ?? [];
  const unit = typedMassUnits.find((each) => each === letters.toLowerCase());
  return unit ? [figure, unit] : null;
};

/** The unit a mass is typed in: the one that stands after it, or else the studio's. */
export const unitOfTyped = (text: string, unit: MassUnit): TypedMassUnit => unitTyped(text)?.[1] ?? unit;

/** Reads a mass as typed, in grams to the milligram: in the studio's unit, or in the one that stands after it (`1,5 ozt`). */
export const readMass = (text: string, unit: MassUnit): Result<number> => {
  const [figure, typed] = unitTyped(text) ?? [text, unit];
  const number = parseDecimal(figure);
  if (!number.ok) return refuse(number.error);
  return ok(fromMilligrams(toMilligrams(toGrams(number.value, typed))));
};

/** What a typed mass comes to where that is not plain, or the unit that may have been meant; empty where there is nothing to say. */
export const massRemark = (text: string, unit: MassUnit, expectedG?: number): string => {
  const grams = readMass(text, unit);
  if (!grams.ok) return '';
  const typed = unitOfTyped(text, unit);
  const slip = expectedG === undefined ? null : unitSlip(grams.value, expectedG, typed);
  if (slip)
    return `In ${slip} it would be what the ledger says. Type the unit after the figure if it is ${slip}.`;
  return typed === unit ? '' : `That is ${writeExactGrams(grams.value, unit)}.`;
};
