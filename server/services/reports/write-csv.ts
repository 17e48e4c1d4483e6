/** A cell of a table. */
export type Cell = string | number;

/** A spreadsheet runs a text that begins like a formula; a leading apostrophe keeps it a text. */
const harmless = (text: string): string => (/^[=+\-@\t\r]/.test(text) ? `'${text}` : text);

const cellOf = (cell: Cell): string => {
  const text = typeof cell === 'number' ? String(cell) : harmless(cell);
  return /[",\n\r]/.test(text) ? `"${text.replaceAll('"', '""')}"` : text;
};

/** Writes rows as CSV by RFC 4180, with a byte order mark so that spreadsheets read it as UTF-8. */
export const writeCsv = (rows: readonly (readonly Cell[])[]): string =>
  `\uFEFF${rows.map((row) => `${row.map(cellOf).join(',')}\r\n`).join('')}`;
