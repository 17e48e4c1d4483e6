import type { FieldProblem } from '#shared/contracts/problem.ts';
import type { Assay } from '#shared/domain/metal/lot.ts';
import { parseDecimal } from '#shared/lib/decimal.ts';
import type { PartValues } from '#src/desk/parts/alloy-form-values.ts';
import { tidySymbol } from '#src/desk/parts/read-alloy-form.ts';

/** What typed parts say, and what in them cannot be read, at `parts.<row>.<column>`. */
export interface ReadParts extends Assay {
  readonly faults: readonly FieldProblem[];
}

const isEmpty = (part: PartValues): boolean =>
  [part.symbol, part.wt, part.tolerance].every((text) => !text.trim());

const symbolFault = (symbol: string, taken: Assay['compositionWt']): string | null => {
  if (!/^[A-Z][a-z]?$/.test(symbol)) return 'Use an element symbol, such as Ag.';
  return symbol in taken ? `${symbol} already stands in another row.` : null;
};

/** Reads the parts of a certificate as typed, with decimal commas; empty rows are passed over, nothing is guessed. */
export const readParts = (parts: readonly PartValues[]): ReadParts => {
  const compositionWt: Record<string, number> = {};
  const toleranceWt: Record<string, number> = {};
  const faults: FieldProblem[] = [];
  parts.forEach((part, row) => {
    if (isEmpty(part)) return;
    const symbol = tidySymbol(part.symbol);
    const fault = symbolFault(symbol, compositionWt);
    if (fault) faults.push({ path: `parts.${row}.symbol`, message: fault });
    const read = (column: 'wt' | 'tolerance', into: Record<string, number>): void => {
      const number = parseDecimal(part[column]);
      if (number.ok) into[symbol] = number.value;
      else faults.push({ path: `parts.${row}.${column}`, message: number.error });
    };
    read('wt', compositionWt);
    if (part.tolerance.trim() !== '') read('tolerance', toleranceWt);
  });
  return { compositionWt, toleranceWt, faults };
};

/** The parts of an assay as they are typed. */
export const partsOfAssay = ({ compositionWt, toleranceWt }: Assay): PartValues[] =>
  Object.entries(compositionWt)
    .toSorted(([, a], [, b]) => b - a)
    .map(([symbol, wt]) => ({
      symbol,
      wt: String(wt),
      tolerance: toleranceWt[symbol] === undefined ? '' : String(toleranceWt[symbol]),
    }));
