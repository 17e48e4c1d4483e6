/** A repeatable stream of numbers in [0, 1) (the mulberry32 generator). */
export const randomStream = (start: number): (() => number) => {
  let state = start >>> 0;
  return () => {
    state = (state + 0x6d2b79f5) >>> 0;
    let t = state;
    t = Math.imul(t ^ (t >>> 15), t | 1);
    t ^= t + Math.imul(t ^ (t >>> 7), t | 61);
    return ((t ^ (t >>> 14)) >>> 0) / 4294967296;
  };
};

/** A random composition of one to four of the model's elements, in wt%, adding up to 100. */
export const randomComposition = (random: () => number): Record<string, number> => {
  const elements = ['Ag', 'Au', 'Cu', 'Zn'].filter(() => random() < 0.75);
  if (elements.length === 0) elements.push('Ag');
  // A power spreads the draws from near-equal shares to traces.
  const power = 1 + 5 * random();
  const parts = elements.map((element) => (element === 'Zn' ? 0.25 : 1) * (random() + 1e-9) ** power);
  const sum = parts.reduce((a, b) => a + b, 0);
  return Object.fromEntries(elements.map((element, k) => [element, (100 * (parts[k] ?? 0)) / sum]));
};
