import type { IntakePreview, IntakeResult, IntakeRow } from '#shared/contracts/lot-intake.ts';

/** Which rows of a sheet are looked at. */
export type RowChoice = 'all' | 'faulty' | 'questioned' | 'good';

/** What a row is: it cannot be taken, it wants a second look, or it is good. */
export const rowState = ({ faults, questions }: Pick<IntakeRow, 'faults' | 'questions'>): RowChoice => {
  if (faults.length > 0) return 'faulty';
  return questions.length > 0 ? 'questioned' : 'good';
};

/** The rows of a choice. */
export const chooseRows = (rows: readonly IntakeRow[], choice: RowChoice): readonly IntakeRow[] =>
  choice === 'all' ? rows : rows.filter((row) => rowState(row) === choice);

const rowsIn = (count: number): string => (count === 1 ? '1 row' : `${count} rows`);

/** How many rows there are of each sort, in one sentence. */
export const previewSentence = ({ good, questioned, faulty }: IntakePreview): string => {
  const whole = good + questioned + faulty;
  if (good === whole) return `${rowsIn(whole)}, all of them good.`;
  const parts = [
    `${good} good`,
    ...(questioned > 0 ? [`${questioned} to be looked at again`] : []),
    ...(faulty > 0 ? [`${faulty} with a fault`] : []),
  ];
  return `${rowsIn(whole)}: ${parts.join(', ')}.`;
};

/** What was taken in, in one sentence. */
export const resultSentence = ({ codes, left }: IntakeResult): string => {
  const lots = codes.length === 1 ? `1 lot is taken in: ${codes[0]}` : `${codes.length} lots are taken in`;
  const span = codes.length > 1 ? `: ${codes[0]} to ${codes.at(-1)}` : '';
  return `${lots}${span}.${left > 0 ? ` ${rowsIn(left)} stayed out.` : ''}`;
};

const cellOf = (text: string): string => (/[";\n]/.test(text) ? `"${text.replaceAll('"', '""')}"` : text);

/** Rows as a sheet of their own, semicolons between the cells, to be put right and chosen again. */
export const sheetOf = (columns: readonly string[], rows: readonly Pick<IntakeRow, 'cells'>[]): string =>
  [columns, ...rows.map(({ cells }) => cells)].map((cells) => cells.map(cellOf).join(';')).join('\r\n');

/** Where a text is kept for a link that saves it as a file; the mark at its head tells spreadsheets that it is UTF-8. */
export const fileAddress = (text: string): string =>
  `data:text/csv;charset=utf-8,${encodeURIComponent(`\uFEFF${text}`)}`;
