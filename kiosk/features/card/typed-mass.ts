import { parseDecimal } from '#shared/lib/decimal.ts';
import { faultOfMass } from '#shared/lib/plausible-mass.ts';
import { ok, refuse, type Result } from '#shared/lib/result.ts';
import { toGrams, type MassUnit } from '#shared/lib/units.ts';

/** Reads a mass typed in the studio's unit as grams; a refusal is one sentence. `mayBeNone` lets nought through. */
export const readTypedMass = (text: string, unit: MassUnit, mayBeNone = false): Result<number> => {
  const typed = parseDecimal(text);
  if (!typed.ok) return typed;
  const grams = toGrams(typed.value, unit);
  const fault = faultOfMass(grams, { mayBeNone });
  return fault === null ? ok(grams) : refuse(fault);
};
