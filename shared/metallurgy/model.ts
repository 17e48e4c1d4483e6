import parameters from './data/parameters.json' with { type: 'json' };
import type { ElementSymbol } from './types.ts';

/** Gas constant, J/(mol K), CODATA 2018 (exact). */
export const GAS_CONSTANT = 8.314462618;

/** 0 °C in kelvin. */
export const ZERO_CELSIUS_K = 273.15;

/** The elements of the model, in its own order. */
export const MODEL_ELEMENTS: readonly ElementSymbol[] = ['Ag', 'Au', 'Cu', 'Zn'];

/** Index of the liquid in every phase-wise array. */
export const LIQUID = 0;
/** Index of the fcc solid solution in every phase-wise array. */
export const FCC = 1;

/** One coefficient a + bT, J/mol. */
export type Linear = readonly [number, number];

/** Redlich-Kister coefficients of a pair, in the order of its name, or the one ternary coefficient. */
export interface Interaction {
  readonly elements: readonly ElementSymbol[];
  readonly liquid: readonly Linear[];
  readonly fcc: readonly Linear[];
  /** `published`, `from memory of the source`, or `assessed`. */
  readonly basis: string;
  readonly source: string;
}

/** A stretch of the liquid's Gibbs energy relative to fcc, J/mol, as coefficients of named functions of T. */
export interface StabilitySegment {
  readonly upToK: number;
  readonly terms: readonly (readonly [number, string])[];
}

/** Everything the Gibbs energies need. */
export interface ModelParameters {
  readonly atomicMass: Readonly<Record<ElementSymbol, number>>;
  readonly liquidOverFcc: Readonly<Record<ElementSymbol, readonly StabilitySegment[]>>;
  readonly liquidOverFccSource: string;
  readonly interactions: readonly Interaction[];
}

/** The committed parameters: published sets, and those assessed by `npm run assess`. */
export const COMMITTED = parameters as unknown as ModelParameters;
