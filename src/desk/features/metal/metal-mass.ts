import { fromMilligrams, toMilligrams } from '#shared/domain/metal/ledger.ts';
import { parseDecimal } from '#shared/lib/decimal.ts';
import { ok, refuse, type Result } from '#shared/lib/result.ts';
import { fromGrams, toGrams, type MassUnit } from '#shared/lib/units.ts';

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

/** Reads a mass as typed in the studio's unit, in grams to the milligram. */
export const readMass = (text: string, unit: MassUnit): Result<number> => {
  const number = parseDecimal(text);
  if (!number.ok) return refuse(number.error);
  return ok(fromMilligrams(toMilligrams(toGrams(number.value, unit))));
};
