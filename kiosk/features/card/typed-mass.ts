import { massG, massOrNoneG } from '#shared/contracts/common.ts';
import { parseDecimal } from '#shared/lib/decimal.ts';
import { ok, refuse, type Result } from '#shared/lib/result.ts';
import { toGrams, type MassUnit } from '#shared/lib/units.ts';

/** Reads a mass typed in the studio's unit as grams; a refusal is one sentence. `mayBeNone` lets nought through. */
export const readTypedMass = (text: string, unit: MassUnit, mayBeNone = false): Result<number> => {
  const typed = parseDecimal(text);
  if (!typed.ok) return typed;
  const judged = (mayBeNone ? massOrNoneG : massG).safeParse(toGrams(typed.value, unit));
  return judged.success ? ok(judged.data) : refuse(judged.error.issues[0]?.message ?? 'Type a mass.');
};
