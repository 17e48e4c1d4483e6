import { readBalanceLine } from '#shared/domain/instrument/read-balance-line.ts';
import { parseDecimal } from '#shared/lib/decimal.ts';
import { faultOfMass } from '#shared/lib/plausible-mass.ts';
import { ok, refuse, type Result } from '#shared/lib/result.ts';
import { toGrams, type MassUnit } from '#shared/lib/units.ts';

const takeGrams = (grams: number, mayBeNone: boolean): Result<number> => {
  const fault = faultOfMass(grams, { mayBeNone });
  return fault === null ? ok(grams) : refuse(fault);
};

/** Reads a mass typed in the studio's unit as grams; a refusal is one sentence. `mayBeNone` lets nought through. */
export const readTypedMass = (text: string, unit: MassUnit, mayBeNone = false): Result<number> => {
  const typed = parseDecimal(text);
  return typed.ok ? takeGrams(toGrams(typed.value, unit), mayBeNone) : typed;
};

/** What a balance has not come to rest on is not a mass yet. */
export const stillMoving = 'The pan is still moving. Wait until it rests.';

/** Reads a line that a balance typed, or that was pasted, as grams; a bare figure is in the studio's unit. */
export const readWeighedLine = (line: string, unit: MassUnit): Result<number> => {
  const reading = readBalanceLine(line, unit);
  if (!reading.ok) return reading;
  return reading.value.isStable ? takeGrams(reading.value.massG, false) : refuse(stillMoving);
};
