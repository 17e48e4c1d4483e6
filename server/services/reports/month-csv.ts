import type { Reconciliation } from '#shared/contracts/reconciliation.ts';
import { countRows, lossRows, monthRows } from './month-rows.ts';
import { writeCsv, type Cell } from './write-csv.ts';

/** Figures go out as numbers, so that a spreadsheet reckons with them. */
const asCells = (rows: readonly (readonly string[])[]): readonly (readonly Cell[])[] =>
  rows.map((row) => row.map((cell) => (/^-?\d+(\.\d+)?$/.test(cell) ? Number(cell) : cell)));

/** A month of metal as one CSV file: the balance, the counts, the loss rates. */
export const monthCsv = (month: Reconciliation): string =>
  writeCsv([
    [month.month],
    // The signs before the labels are words here, not formulas.
    ...asCells(monthRows(month)).map(([label, ...cells]) => [String(label).replace(/^[-+=] /, ''), ...cells]),
    [],
    ...asCells(countRows(month)),
    ['Not counted', month.uncounted.map(({ code }) => code).join(' ')],
    [],
    ...asCells(lossRows('alloy', month.lossByAlloy)),
    ...asCells(lossRows('caster', month.lossByCaster)),
    ...asCells(lossRows('furnace', month.lossByFurnace)),
    ...asCells(lossRows('terminal', month.lossByTerminal)),
  ]);
