/** The most a studio could melt, g; a larger figure is a slip of the unit. */
const heaviestG = 100_000;

/** What is wrong with a mass in grams, in one sentence; null when a studio could weigh it. */
export const faultOfMass = (grams: number, { mayBeNone = false } = {}): string | null => {
  if (grams < 0 && mayBeNone) return 'A mass cannot be below zero.';
  if (grams <= 0 && !mayBeNone) return 'A mass must be above zero.';
  return grams > heaviestG ? 'That is more than a studio could melt: check the unit.' : null;
};
