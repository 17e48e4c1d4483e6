import type { Interaction } from '#shared/metallurgy/model.ts';

/** A number to be fitted, in its own unit, scaled so that a step of one is neither small nor large. */
export interface Parameter {
  readonly key: string;
  readonly meaning: string;
  readonly unit: string;
  readonly start: number;
}

/** One fit: its parameters and the interactions they make. */
export interface Stage {
  readonly name: string;
  readonly title: string;
  readonly parameters: readonly Parameter[];
  /** What was held fixed and why. */
  readonly choices: string;
  readonly build: (values: readonly number[]) => readonly Interaction[];
}

const KILO = 1000;
/** The ternary line is fitted about this temperature, K, so that its value and its slope hardly correlate. */
const PIVOT_K = 1100;

const round = (value: number): number => Math.round(value);
const roundSlope = (value: number): number => Math.round(value * 100) / 100;
const SOURCE = 'assessed here by npm run assess; see docs/assessment/report.md';

const goldSilverCopper: Stage = {
  name: 'gold-silver-copper',
  title: 'Au-Cu and the ternary term of Ag-Au-Cu',
  parameters: [
    { key: 'fcc0', meaning: 'fcc Au-Cu, L0', unit: 'kJ/mol', start: -22.9 },
    { key: 'fcc1', meaning: 'fcc Au-Cu, L1', unit: 'kJ/mol', start: 7.2 },
    { key: 'ternary', meaning: `fcc Ag-Au-Cu at ${PIVOT_K} K`, unit: 'kJ/mol', start: 0 },
    { key: 'ternarySlope', meaning: 'fcc Ag-Au-Cu, slope with T', unit: 'J/(mol K)', start: 0 },
  ],
  choices:
    'Liquid Au-Cu is held at L = [-27900 - T, 4730] J/mol (first guess of the literature, from memory): freeing its ' +
    'L0 lowers the residuals by 0.3 °C and only trades against fcc L0. A third coefficient was tried and dropped: it ' +
    'improves the points used and worsens those held back. A ternary term in the liquid improves neither.',
  build: ([fcc0 = 0, fcc1 = 0, ternary = 0, slope = 0]) => [
    {
      elements: ['Au', 'Cu'],
      liquid: [
        [-27900, -1],
        [4730, 0],
      ],
      fcc: [
        [round(KILO * fcc0), 0],
        [round(KILO * fcc1), 0],
      ],
      basis: 'assessed',
      source: `fcc ${SOURCE}; liquid from memory of the literature`,
    },
    {
      elements: ['Ag', 'Au', 'Cu'],
      liquid: [[0, 0]],
      fcc: [[round(KILO * ternary - PIVOT_K * slope), roundSlope(slope)]],
      basis: 'assessed',
      source: SOURCE,
    },
  ],
};

const silverZinc: Stage = {
  name: 'silver-zinc',
  title: 'Ag-Zn',
  parameters: [
    { key: 'fcc0', meaning: 'fcc Ag-Zn, L0 less 5 T', unit: 'kJ/mol', start: -27 },
    { key: 'fcc1', meaning: 'fcc Ag-Zn, L1', unit: 'kJ/mol', start: 0 },
  ],
  choices:
    'Liquid Ag-Zn is held at an estimate, -24000 + 5T J/mol: only the difference between the phases shows in melting ' +
    'ranges. A ternary Ag-Cu-Zn term was tried and dropped: it lowers the residuals by less than 0.1 °C.',
  build: ([fcc0 = 0, fcc1 = 0]) => [
    {
      elements: ['Ag', 'Zn'],
      liquid: [[-24000, 5]],
      fcc: [
        [round(KILO * fcc0), 5],
        [round(KILO * fcc1), 0],
      ],
      basis: 'assessed',
      source: `fcc ${SOURCE}; liquid estimated`,
    },
  ],
};

const goldZinc: Stage = {
  name: 'gold-zinc',
  title: 'Au-Zn',
  parameters: [{ key: 'fcc0', meaning: 'fcc Au-Zn, L0 less 10 T', unit: 'kJ/mol', start: -66 }],
  choices:
    'Liquid Au-Zn is held at an estimate, -70000 + 10T J/mol. The few and uncertain points bear one parameter, so gold ' +
    'alloys are answered to about 10 wt% zinc only, and their solidus is the least certain figure of the model.',
  build: ([fcc0 = 0]) => [
    {
      elements: ['Au', 'Zn'],
      liquid: [[-70000, 10]],
      fcc: [[round(KILO * fcc0), 10]],
      basis: 'assessed',
      source: `fcc ${SOURCE}; liquid estimated`,
    },
  ],
};

/** The fits in the order they are made; each keeps what the ones before it found. */
export const STAGES: readonly Stage[] = [goldSilverCopper, silverZinc, goldZinc];
