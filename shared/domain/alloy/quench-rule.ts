/** When to quench after the pour, and why; belongs to the alloy revision, never to the family. */
export interface QuenchRule {
  /** Seconds after the pour before which the casting must not be quenched. */
  readonly earliestS: number;
  /** Seconds after the pour by which it must be quenched, or null when only strength is lost by waiting. */
  readonly latestS: number | null;
  readonly medium: 'water' | 'warm water' | 'air';
  /** One sentence for the person with the tongs. */
  readonly why: string;
  readonly source: string;
}
