import { faultOfMass } from '#shared/lib/plausible-mass.ts';
import { formatMass, fromGrams, toGrams, type Grams, type MassUnit } from '#shared/lib/units.ts';
import { lineToleranceG } from './charge-lines.ts';

/** A mass about to go into the crucible, and what it is judged against. */
export interface Weighing {
  readonly massG: Grams;
  readonly code: string;
  /** Still to go of this lot by the plan; null where it has no line, and anything up to `roomG` may be meant. */
  readonly toGoG: Grams | null;
  /** What the whole charge can still take. */
  readonly roomG: Grams;
  /** What the ledger has of the lot. */
  readonly onHandG: Grams;
  /** How far a mass may be off, as a share of it. */
  readonly tolerance: number;
  /** The studio's unit, in which the mass was shown. */
  readonly unit: MassUnit;
}

/** Whether a mass may go in: at once, when a person stands by it, or not at all, with what was probably meant. */
export type WeighingVerdict =
  | { readonly kind: 'accept' }
  | { readonly kind: 'question'; readonly sentence: string; readonly overG: Grams }
  | { readonly kind: 'refuse'; readonly sentence: string; readonly meantG: Grams | null };

const accept: WeighingVerdict = { kind: 'accept' };
const refuse = (sentence: string, meantG: Grams | null = null): WeighingVerdict => ({
  kind: 'refuse',
  sentence,
  meantG,
});

const unitNames: Readonly<Record<MassUnit, string>> = { g: 'grams', dwt: 'pennyweights', ozt: 'troy ounces' };
const otherUnits = (unit: MassUnit): readonly MassUnit[] =>
  (['g', 'dwt', 'ozt'] as const).filter((other) => other !== unit);

/** The unit in which the same figure would be just what is wanted, or null. */
const slipOf = ({ massG, toGoG, roomG, unit, tolerance }: Weighing): MassUnit | null => {
  const figure = fromGrams(massG, unit);
  const wantedG = toGoG ?? roomG;
  const isMeant = (other: MassUnit): boolean =>
    Math.abs(toGrams(figure, other) - wantedG) <= lineToleranceG(wantedG, tolerance);
  return wantedG > 0 ? (otherUnits(unit).find(isMeant) ?? null) : null;
};

const slipSentence = ({ massG, unit, toGoG, roomG }: Weighing, meant: MassUnit): string =>
  `${formatMass(massG, unit)} is far from the ${formatMass(toGoG ?? roomG, unit)} wanted: was it weighed in ${unitNames[meant]}? Set the balance to ${unitNames[unit]}, or type it so.`;

const overOf = ({ massG, toGoG, roomG, tolerance }: Weighing): Grams => {
  const overG = massG - (toGoG ?? roomG);
  const slackG = toGoG === null ? 0 : lineToleranceG(toGoG, tolerance);
  return overG > slackG + 1e-9 ? Math.round(overG * 1000) / 1000 : 0;
};

/** More than this many times what is wanted is no overweight but a slip. */
const slipTimes = 10;

/**
 * Judges a mass before it is recorded: a figure that fits in another unit is a slip of the unit, more than the ledger has
 * cannot be, and what is over its line by more than the tolerance is questioned.
 */
export const judgeWeighing = (weighing: Weighing): WeighingVerdict => {
  const { massG, code, onHandG, unit, toGoG, roomG } = weighing;
  const fault = faultOfMass(massG);
  if (fault !== null) return refuse(fault);
  const overG = overOf(weighing);
  const isOff = overG > 0 || (toGoG !== null && massG < toGoG / slipTimes);
  const slip = isOff ? slipOf(weighing) : null;
  if (slip !== null) {
    return refuse(
      slipSentence(weighing, slip),
      Math.round(toGrams(fromGrams(massG, unit), slip) * 1000) / 1000,
    );
  }
  if (massG > onHandG + 1e-9) {
    return refuse(
      `Lot ${code} has ${formatMass(onHandG, unit)} by the ledger. Weigh again, or have it counted at the desk.`,
    );
  }
  const wantedG = toGoG ?? roomG;
  if (overG > 0 && wantedG > 0 && massG > slipTimes * wantedG) {
    return refuse(
      `${formatMass(massG, unit)} is more than ${slipTimes} times what is wanted: check the unit.`,
    );
  }
  if (overG <= 0) return accept;
  const of = toGoG === null ? 'than the charge can take' : `than is wanted of lot ${code}`;
  return {
    kind: 'question',
    overG,
    sentence: `${formatMass(overG, unit)} more ${of}. Take some off the pan?`,
  };
};
