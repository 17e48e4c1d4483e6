import type { Parts } from './lot.ts';

/** What some metal holds of each element, whole milligrams; together they are the mass. */
export type Contents = Readonly<Record<string, number>>;

/** The mass of some contents, mg. */
export const massOfContents = (contents: Contents): number =>
  Object.values(contents).reduce((sum, mg) => sum + mg, 0);

/** What a certificate leaves unnamed, as the 0.01 wt% of four nines, is kept as `other`; less is its rounding. */
const leastRestWt = 0.0005;

const withRest = (compositionWt: Parts): readonly (readonly [string, number])[] => {
  const parts = Object.entries(compositionWt).filter(([, wt]) => wt > 0);
  const rest = 100 - parts.reduce((total, [, wt]) => total + wt, 0);
  return parts.length > 0 && rest > leastRestWt ? [...parts, ['other', rest]] : parts;
};

/**
 * What `massMg` of metal holds of each element in whole milligrams that add up to the mass, by Webster's method of
 * apportionment: a larger mass never holds less of an element, which rounding by the largest remainder does not keep.
 */
export const contentsOf = (massMg: number, compositionWt: Parts): Contents => {
  const parts = withRest(compositionWt);
  const sum = parts.reduce((total, [, wt]) => total + wt, 0);
  if (massMg === 0 || sum === 0) return {};
  const rows = parts.map(([element, wt]) => ({ element, wt, mg: Math.round((massMg * wt) / sum) }));
  let off = massMg - rows.reduce((total, { mg }) => total + mg, 0);
  while (off !== 0) {
    const step = Math.sign(off);
    // The next milligram belongs where it is most wanted, the one too many where it is wanted least.
    const claim = ({ wt, mg }: { wt: number; mg: number }): number =>
      step > 0 ? wt / (mg + 0.5) : mg === 0 ? Number.NEGATIVE_INFINITY : -wt / (mg - 0.5);
    const next = rows.reduce((best, row) => (claim(row) > claim(best) ? row : best));
    next.mg += step;
    off -= step;
  }
  return Object.fromEntries(rows.flatMap(({ element, mg }) => (mg === 0 ? [] : [[element, mg] as const])));
};

/** One set of contents and another, or `sign` −1: one less another; what comes to nought is left out. */
export const addContents = (one: Contents, other: Contents, sign: 1 | -1 = 1): Contents => {
  const elements = new Set([...Object.keys(one), ...Object.keys(other)]);
  return Object.fromEntries(
    [...elements].flatMap((element) => {
      const mg = (one[element] ?? 0) + sign * (other[element] ?? 0);
      return mg === 0 ? [] : [[element, mg] as const];
    }),
  );
};

/** The parts of some contents, wt%; empty for no metal. */
export const partsOfContents = (contents: Contents): Parts => {
  const massMg = massOfContents(contents);
  if (massMg === 0) return {};
  return Object.fromEntries(Object.entries(contents).map(([element, mg]) => [element, (mg / massMg) * 100]));
};
