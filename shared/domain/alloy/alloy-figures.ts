import type { Celsius } from '#shared/lib/units.ts';

/** The temperatures and density an alloy revision is worked by, and where they come from. */
export interface AlloyFigures {
  readonly liquidusC: Celsius;
  readonly solidusC: Celsius;
  /** The temperature at which the last, most fusible metal of an as-cast piece melts again; null when not known. */
  readonly asCastSolidusC: Celsius | null;
  /** The temperature below which a second solid separates; null when there is none or it is not known. */
  readonly solvusC: Celsius | null;
  readonly densityGPerCm3: number;
  /** Whether phase equilibrium was computed, or the supplier's measured range was entered. */
  readonly basis: 'computed' | 'measured';
  /** Where the figures come from, to be shown beside them. */
  readonly source: string;
  /** The engine that computed them; null for a measured range. */
  readonly engineVersion: string | null;
}
