import { z } from 'zod';
import type { IntakeFault } from '#shared/domain/metal/judge-intake-row.ts';
import type { LotKind, Parts } from '#shared/domain/metal/lot.ts';

/** The longest sheet that is read at once, in characters. */
export const longestSheet = 240_000;

const text = z
  .string({ error: 'Choose a file.' })
  .min(1, 'The file is empty.')
  .max(longestSheet, 'That is more than a sheet of some thousand lots: divide it.');

/** Looks through a sheet of lots without taking any in. */
export const previewIntakeRequest = z.object({ text });

/** Takes in the good rows of a sheet; `confirmed` also those with questions. `key` is made once for a sheet. */
export const takeIntakeRequest = z.object({
  key: z.uuid(),
  text,
  /** Told to take the good rows although others have faults. */
  onlyGood: z.boolean().default(false),
  confirmed: z.boolean().default(false),
});
/** Takes in the good rows of a sheet. */
export type TakeIntakeRequest = z.input<typeof takeIntakeRequest>;

/** One row of a sheet as it was read; `line` counts from 1, the first line being the columns. */
export interface IntakeRow {
  readonly line: number;
  /** The cells as they stand in the sheet, in the order of its columns. */
  readonly cells: readonly string[];
  readonly name: string;
  readonly kind: LotKind | null;
  readonly massG: number | null;
  readonly compositionWt: Parts | null;
  /** Why it cannot be taken. */
  readonly faults: readonly IntakeFault[];
  /** What a person should look at twice. */
  readonly questions: readonly IntakeFault[];
}

/** A sheet as it was read. */
export interface IntakePreview {
  /** Why the whole sheet cannot be read; empty when it can. */
  readonly fault: string;
  /** The cells of its first line. */
  readonly columns: readonly string[];
  readonly rows: readonly IntakeRow[];
  readonly good: number;
  readonly questioned: number;
  readonly faulty: number;
}

/** What was taken in. */
export interface IntakeResult {
  readonly codes: readonly string[];
  readonly left: number;
}
