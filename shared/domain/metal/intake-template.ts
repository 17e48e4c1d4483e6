import { intakeColumns } from './judge-intake-row.ts';

const header = [...intakeColumns, 'Au', 'Ag', 'Cu', 'Zn', 'Au ±', 'Ag ±'];

const rows = [
  ['Sterling, casting grain', 'grain', '500', 'g', '', 'our supplier', 'R-100', 'cupboard', '2026-11-30'],
  ['Fine gold, granulated', 'fine', '2', 'ozt', '', 'our supplier', 'R-101', 'safe', '2026-11-30'],
] as const;

const parts = [
  ['', '92.65', '7.35', '', '', '0.08'],
  ['99.99', '', '', '', '0.005', ''],
] as const;

/** A sheet of lots to begin from, semicolons between its cells: the columns, and two rows that show how they are filled. */
export const intakeTemplate: string = [header, ...rows.map((row, index) => [...row, ...(parts[index] ?? [])])]
  .map((cells) => cells.join(';'))
  .join('\r\n');
