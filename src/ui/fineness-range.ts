/** How far beyond mark and values the scale goes at least, parts per thousand. */
const leastMarginPpt = 10;

/** The part of the scale to draw for a mark and the values beside it, parts per thousand, with room for their words. */
export const finenessRange = (
  mark: number,
  ...values: readonly number[]
): { readonly low: number; readonly high: number } => {
  const [least, most] = [Math.min(mark, ...values), Math.max(mark, ...values)];
  const margin = Math.max(leastMarginPpt, most - least);
  return { low: least - margin, high: most + margin };
};
