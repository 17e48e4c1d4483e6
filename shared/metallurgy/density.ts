import type { Composition, Outcome } from './types.ts';
import { refuse } from './refusal.ts';

/** A computed density with its error and how it was got. */
export interface Density {
  readonly gPerCm3: number;
  readonly errorGPerCm3: number;
  readonly basis: string;
}

/** Densities of the pure metals at room temperature, g/cm³ (handbook values, as used in the trade's additive tables). */
const PURE: Readonly<Record<string, number>> = {
  Ag: 10.49,
  Au: 19.32,
  Cu: 8.96,
  Zn: 7.14,
  Ni: 8.91,
  Pd: 12.02,
};

/** Within this of published densities for Au-Ag-Cu alloys with little zinc, g/cm³. */
const ERROR = 0.15;
const ERROR_OTHER = 0.3;
const ZINC_LIMIT = 2;

/** Density by the additivity of volumes, 100 / Σ(wt%/ρ), with its error; refuses an element whose density it does not hold. */
export const density = (composition: Composition): Outcome<Density> => {
  const parts = Object.entries(composition).filter(([, wt]) => wt !== 0);
  let sum = 0;
  let volume = 0;
  for (const [element, wt] of parts) {
    const pure = PURE[element];
    if (!pure) return refuse('unknown-element', `No density is held for ${element}.`);
    if (!Number.isFinite(wt)) return refuse('not-a-number', `The amount of ${element} is not a number.`);
    if (wt < 0) return refuse('negative', `The amount of ${element} is below zero.`);
    sum += wt;
    volume += wt / pure;
  }
  if (Math.abs(sum - 100) > 0.5) {
    return refuse('composition-sum', `The composition adds up to ${Number(sum.toFixed(3))} wt%, not 100.`);
  }
  const plain =
    parts.every(([element, wt]) => element !== 'Zn' || wt <= ZINC_LIMIT) &&
    !composition['Ni'] &&
    !composition['Pd'];
  return {
    withinModel: true,
    gPerCm3: sum / volume,
    errorGPerCm3: parts.length === 1 ? 0.02 : plain ? ERROR : ERROR_OTHER,
    basis: 'Additive volumes of the pure metals, 100 / Σ(wt%/ρ); sound metal at room temperature.',
  };
};

/** Grams of metal that fill a wax's place: mass × ρ(metal) / ρ(wax), densities in g/cm³; add the button yourself. */
export const metalFromWax = (wax: {
  readonly waxMassG: number;
  readonly waxDensity: number;
  readonly metalDensity: number;
}): number => {
  const { waxMassG, waxDensity, metalDensity } = wax;
  if (!(waxMassG >= 0) || !(waxDensity > 0) || !(metalDensity > 0)) {
    throw new RangeError('Wax mass must not be negative, and both densities must be above zero.');
  }
  return (waxMassG * metalDensity) / waxDensity;
};
