import { fromGrams, toGrams, typedMassUnits, type TypedMassUnit } from '#shared/lib/units.ts';

/** How near a slip must come to what was expected, as a share of it; a guess of our own, no source. */
const nearness = 0.003;

/** The unit in which a figure would have been right: it was typed as `unit`, and `expectedG` was to be found; null where none fits. */
export const unitSlip = (typedG: number, expectedG: number, unit: TypedMassUnit): TypedMassUnit | null => {
  if (expectedG <= 0 || typedG <= 0) return null;
  const isNear = (grams: number): boolean => Math.abs(grams - expectedG) <= expectedG * nearness;
  if (isNear(typedG)) return null;
  const figure = fromGrams(typedG, unit);
  return typedMassUnits.find((other) => other !== unit && isNear(toGrams(figure, other))) ?? null;
};
