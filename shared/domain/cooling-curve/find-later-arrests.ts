import type { Celsius } from '#shared/lib/units.ts';
import type { SmoothPoint } from './smooth-curve.ts';

/** A smoothed curve with the strength of its fall, rate over excess, and where steady freezing began. */
export interface FreezingCurve {
  readonly smooth: readonly SmoothPoint[];
  readonly strengths: readonly number[];
  readonly reach: number;
  readonly from: number;
  readonly liquidusC: Celsius;
}

/** A later halt must lie so far below the liquidus to be another one, °C. */
const leastBelowC = 8;
/** It slows the fall by this share of the liquid's own, and to less than half of what it is on either side. */
const haltDepth = 0.2;
const haltShare = 0.5;
/** The fall must come back to this share of the liquid's own before the metal counts as solid. */
const solidShare = 0.7;

/** The deepest later halt: the fall slows to it and speeds up after it; -1 where there is none. */
const haltIndex = (
  { smooth, reach, from, liquidusC }: FreezingCurve,
  calm: readonly number[],
  fastest: number,
): number => {
  const after = calm.map(() => 0);
  for (let k = calm.length - 2; k >= 0; k--) after[k] = Math.max(after[k + 1] ?? 0, calm[k + 1] ?? 0);
  let before = 0;
  let [best, deepest] = [-1, haltDepth * fastest];
  for (let k = from; k < calm.length - reach; k++) {
    const strength = calm[k] ?? 0;
    before = Math.max(before, strength);
    const beside = Math.min(before, after[k] ?? 0);
    const isBelow = (smooth[k]?.temperatureC ?? liquidusC) < liquidusC - leastBelowC;
    if (isBelow && strength < haltShare * beside && beside - strength > deepest)
      [best, deepest] = [k, beside - strength];
  }
  return best;
};

/** Where the last of it freezes: the fall comes back to nearly the liquid's own, and stays there; -1 where it never does. */
const endIndex = ({ reach, from }: FreezingCurve, calm: readonly number[], fastest: number): number => {
  const last = calm.findLastIndex((strength) => strength < solidShare * fastest);
  return last < from || calm.length - last < reach + 3 ? -1 : last;
};

/** The plateau below the liquidus, if there is one, and where freezing ended, if it did. */
export const findLaterArrests = (
  curve: FreezingCurve,
): { readonly plateauC: Celsius | null; readonly endC: Celsius | null } => {
  const calm = curve.strengths;
  const fastest = Math.max(...calm.slice(0, curve.from));
  const at = (k: number): Celsius | null => (k < 0 ? null : (curve.smooth[k]?.temperatureC ?? null));
  return { plateauC: at(haltIndex(curve, calm, fastest)), endC: at(endIndex(curve, calm, fastest)) };
};
