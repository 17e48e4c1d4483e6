import parameters from '#shared/metallurgy/data/parameters.json' with { type: 'json' };

/** A phase of the plain model. */
export type PlainPhase = 'liquid' | 'fcc';

const R = 8.314462618;

const FUNCTIONS: Readonly<Record<string, (t: number) => number>> = {
  '1': () => 1,
  T: (t) => t,
  'T^7': (t) => t ** 7,
  'T^-9': (t) => t ** -9,
};

/** G(liquid) − G(fcc) of an element straight from the committed coefficients, J/mol. */
export const plainStability = (element: string, t: number): number => {
  const segments = parameters.liquidOverFcc[element as 'Ag'];
  const segment = segments.find(({ upToK }) => t <= upToK) ?? segments[segments.length - 1];
  let sum = 0;
  for (const [coefficient, term] of (segment?.terms ?? []) as [number, string][]) {
    sum += coefficient * (FUNCTIONS[term]?.(t) ?? Number.NaN);
  }
  return sum;
};

/**
 * Molar Gibbs energy written out term by term, with none of the engine's code: the slow second opinion of the checks.
 * `x` holds mole fractions by element.
 */
export const plainEnergy = (phase: PlainPhase, x: Readonly<Record<string, number>>, t: number): number => {
  let g = 0;
  for (const [element, fraction] of Object.entries(x)) {
    if (fraction <= 0) continue;
    g +=
      fraction * (phase === 'liquid' ? plainStability(element, t) : 0) +
      R * t * fraction * Math.log(fraction);
  }
  for (const interaction of parameters.interactions) {
    const [a = 0, b = 0, c = 1] = interaction.elements.map((element) => x[element] ?? 0);
    const lines = interaction[phase];
    const ternary = interaction.elements.length === 3;
    lines.forEach(([fixed = 0, slope = 0], order) => {
      g += a * b * (ternary ? c : (a - b) ** order) * (fixed + slope * t);
    });
  }
  return g;
};

/** Mole fractions of a composition in wt%. */
export const plainMoleFractions = (wt: Readonly<Record<string, number>>): Record<string, number> => {
  const moles = Object.entries(wt).map(
    ([element, amount]) => [element, amount / parameters.atomicMass[element as 'Ag']] as const,
  );
  const sum = moles.reduce((total, [, n]) => total + n, 0);
  return Object.fromEntries(moles.map(([element, n]) => [element, n / sum]));
};
