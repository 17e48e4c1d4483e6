import type { LotKind } from './lot.ts';

/** A line of a charge plan as it is kept: which lot, by its code at that time, and how much, whole milligrams. */
export interface PlannedLine {
  readonly lotId: string;
  readonly code: string;
  readonly name: string;
  readonly kind: LotKind;
  readonly massMg: number;
}
