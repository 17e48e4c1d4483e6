/** A function's value and slope at a place. */
export interface Sample {
  readonly value: number;
  readonly slope: number;
}

/**
 * Newton's method kept inside a bracket: finds where a function that is negative at `low` and positive at `high`
 * (or the other way about, when `rising` is false) crosses zero, to `tolerance` in its argument.
 */
export const bracketedNewton = (
  sample: (at: number) => Sample,
  bracket: { low: number; high: number; start: number; rising: boolean; tolerance: number },
): number => {
  let { low, high } = bracket;
  let at = bracket.start;
  for (let iteration = 0; iteration < 100; iteration++) {
    const { value, slope } = sample(at);
    if (value === 0) return at;
    if (value > 0 === bracket.rising) high = at;
    else low = at;
    const newton = at - value / slope;
    const next = newton >= low && newton <= high ? newton : (low + high) / 2;
    if (Math.abs(next - at) < bracket.tolerance) return next;
    at = next;
  }
  return at;
};
