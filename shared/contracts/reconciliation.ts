import { z } from 'zod';
import type { MonthOfMetal } from '#shared/domain/metal/reconcile.ts';

/** A local month, `year-month`. */
export const reconciliationQuery = z.object({
  month: z.string().regex(/^2\d{3}-(0[1-9]|1[0-2])$/, 'Write the month as year-month, such as 2026-12.'),
});

/** What melts closed in the month lost, grouped. */
export interface LossRate {
  readonly name: string;
  readonly melts: number;
  readonly metalInMg: number;
  readonly lostMg: number;
}

/** One lot as it was counted. */
export interface CountedLot {
  readonly id: string;
  readonly code: string;
  readonly name: string;
  readonly expectedMg: number;
  readonly countedMg: number;
  readonly explanation: string;
  readonly person: string;
  readonly at: string;
}

/** One lot that nobody counted. */
export interface UncountedLot {
  readonly id: string;
  readonly code: string;
  readonly name: string;
  /** What the ledger says it held at the month's end. */
  readonly expectedMg: number;
}

/** A month of metal: every element's balance to the milligram, what was counted, what melting lost. */
export interface Reconciliation {
  readonly month: string;
  readonly from: string;
  readonly to: string;
  readonly metals: readonly MonthOfMetal[];
  readonly total: MonthOfMetal;
  readonly counts: readonly CountedLot[];
  /** Lots with metal on hand at the month's end that nobody counted in it. */
  readonly uncounted: readonly UncountedLot[];
  readonly lossByAlloy: readonly LossRate[];
  readonly lossByCaster: readonly LossRate[];
  /** By the bay of the furnace, as its terminal names it. */
  readonly lossByFurnace: readonly LossRate[];
  readonly lossByTerminal: readonly LossRate[];
}
