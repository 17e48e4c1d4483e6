import type { FieldProblem } from '#shared/contracts/problem.ts';
import type { Assay } from '#shared/domain/metal/lot.ts';
import { parseDecimal } from '#shared/lib/decimal.ts';

/** One metal of a composition as it is typed. */
export interface PartValues {
  readonly symbol: string;
  readonly wt: string;
  readonly tolerance: string;
}

/** A metal not yet named. */
export const emptyPart: PartValues = { symbol: '', wt: '', tolerance: '' };

/** What typed parts say, and what in them cannot be read, at `parts.<row>.<column>`. */
export interface ReadParts extends Assay {
  readonly faults: readonly FieldProblem[];
}

/** A symbol as it is meant: `ag` and ` AG ` are Ag. */
export const tidySymbol = (text: string): string => {
  const letters = text.trim();
  return letters.charAt(0).toUpperCase() + letters.slice(1).toLowerCase();
};

const isEmpty = (part: PartValues): boolean =>
  [part.symbol, part.wt, part.tolerance].every((text) => !text.trim());

const symbolFault = (symbol: string, taken: Assay['compositionWt']): string | null => {
  if (!/^[A-Z][a-z]?$/.test(symbol)) return 'Use an element symbol, such as Ag.';
  return symbol in taken ? `${symbol} already stands in another row.` : null;
};

/** Reads the parts of a composition as typed, with decimal commas; empty rows are passed over, nothing is guessed. */
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

// A computed assay has four decimals.
const writePart = (wt: number): string => String(Number(wt.toFixed(4)));

/** The parts of an assay as they are typed, the largest first. */
export const partsOfAssay = ({ compositionWt, toleranceWt }: Assay): PartValues[] =>
  Object.entries(compositionWt)
    .toSorted(([, a], [, b]) => b - a)
    .map(([symbol, wt]) => ({
      symbol,
      wt: writePart(wt),
      tolerance: toleranceWt[symbol] === undefined ? '' : writePart(toleranceWt[symbol]),
    }));

/** The form's place for a path of a composition: `compositionWt.Ag` is the amount in silver's row, `parts` the whole; null for another path. */
export const placeOfPart = (path: string, parts: readonly PartValues[]): string | null => {
  const [head = '', symbol] = path.split('.');
  const column = head === 'compositionWt' ? 'wt' : head === 'toleranceWt' ? 'tolerance' : null;
  if (column === null) return null;
  const row = symbol === undefined ? -1 : parts.findIndex((part) => tidySymbol(part.symbol) === symbol);
  return row < 0 ? 'parts' : `parts.${row}.${column}`;
};
