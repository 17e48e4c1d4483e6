import type { Celsius } from '#shared/lib/units.ts';

/** The freezing points a pyrometer can be checked at in a studio. */
export const fixedPoints = ['silver', 'silver-copper', 'gold'] as const;
/** One freezing point. */
export type FixedPointName = (typeof fixedPoints)[number];

/** A temperature that nature keeps: by the condensed phase rule F = C − P + 1 leaves nothing to choose. */
export interface FixedPoint {
  readonly name: string;
  readonly temperatureC: Celsius;
  /** Elements, and phases side by side while it freezes. */
  readonly components: number;
  readonly phases: number;
  /** How far the point itself may be off in a studio's crucible, one standard deviation, °C. */
  readonly uncertaintyC: number;
  readonly caution: string;
  readonly source: string;
}

/**
 * The freezing points with their sources. The uncertainties are for fine metal in a clean crucible and are the studio's
 * own allowance, no source; how far oxygen lowers the silver point is from memory of the literature on that point.
 */
export const fixedPointData: Readonly<Record<FixedPointName, FixedPoint>> = {
  silver: {
    name: 'freezing point of silver',
    temperatureC: 961.78,
    components: 1,
    phases: 2,
    uncertaintyC: 0.5,
    caution:
      'Fine silver under a cover of graphite or charcoal: molten silver open to the air takes up oxygen and freezes lower, by some 10 °C at most.',
    source: 'Defining fixed point of the International Temperature Scale of 1990.',
  },
  'silver-copper': {
    name: 'silver-copper eutectic',
    temperatureC: 779.1,
    components: 2,
    phases: 3,
    uncertaintyC: 0.7,
    caution:
      'Silver with about 28 wt% copper, both fine; a melt a little off that still ends its freezing on this plateau.',
    source: 'NIST solder systems, Ag-Cu (Hayes et al. 1986, Kattner 1999): 779.1 °C.',
  },
  gold: {
    name: 'freezing point of gold',
    temperatureC: 1064.18,
    components: 1,
    phases: 2,
    uncertaintyC: 0.3,
    caution: 'Fine gold in a clean crucible; a little of anything else lowers it.',
    source: 'Defining fixed point of the International Temperature Scale of 1990.',
  },
};

/** Degrees of freedom by the condensed phase rule, F = C − P + 1; nil at a fixed point. */
export const degreesOfFreedom = ({ components, phases }: FixedPoint): number => components - phases + 1;
