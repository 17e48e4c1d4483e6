/** The unit of one input of a figure: temperature, temperature difference, mass, length, time, rate, density, ratio or words. */
export type InputUnit = 'C' | 'dC' | 'g' | 'mm' | 's' | 'perSecond' | 'gPerCm3' | 'share' | 'text';

/** One thing a figure was computed from. */
export interface BasisInput {
  readonly label: string;
  readonly value: number | string;
  readonly unit: InputUnit;
}

/** How a figure came about: the rule, what went into it, and whose rule it is. */
export interface Basis {
  readonly rule: string;
  readonly inputs: readonly BasisInput[];
  readonly source: string;
}
