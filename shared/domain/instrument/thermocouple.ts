import type { Celsius } from '#shared/lib/units.ts';

/** The letter designations of the thermocouples a casting studio meets. */
export const thermocoupleTypes = ['K', 'N', 'S'] as const;
/** One letter designation. */
export type ThermocoupleType = (typeof thermocoupleTypes)[number];

/** What is known of a thermocouple by its letter alone. */
export interface Thermocouple {
  readonly metals: string;
  /** The span of the reference function; outside it a voltage says nothing. */
  readonly lowestC: Celsius;
  readonly highestC: Celsius;
  /** Tolerance class 2 of a new thermocouple: the larger of so many °C and so large a share of the reading in °C. */
  readonly toleranceC: number;
  readonly toleranceShare: number;
}

/** Where the spans and tolerances come from, to be shown beside them. */
export const thermocoupleSource =
  'IEC 60584-1, reference functions and tolerance class 2; values from memory.';

/** The thermocouples by letter: spans of the reference functions and tolerances of IEC 60584-1, from memory. */
export const thermocouples: Readonly<Record<ThermocoupleType, Thermocouple>> = {
  K: {
    metals: 'nickel-chromium against nickel-aluminium',
    lowestC: -270,
    highestC: 1372,
    toleranceC: 2.5,
    toleranceShare: 0.0075,
  },
  N: {
    metals: 'nickel-chromium-silicon against nickel-silicon',
    lowestC: -270,
    highestC: 1300,
    toleranceC: 2.5,
    toleranceShare: 0.0075,
  },
  S: {
    metals: 'platinum-10 % rhodium against platinum',
    lowestC: -50,
    highestC: 1768,
    toleranceC: 1.5,
    toleranceShare: 0.0025,
  },
};

/** How far a new thermocouple of tolerance class 2 may be off at `celsius`, ± °C. */
export const toleranceAt = (type: ThermocoupleType, celsius: Celsius): number => {
  const { toleranceC, toleranceShare } = thermocouples[type];
  return Math.max(toleranceC, toleranceShare * Math.abs(celsius));
};
