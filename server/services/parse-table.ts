import { parse } from 'csv-parse/sync';

const separators = [';', ',', '\t'] as const;

/** The separator that the first line holds most of, outside quotation marks. */
const separatorOf = (text: string): string => {
  const first = (text.split(/\r?\n/, 1)[0] ?? '').replace(/"[^"]*"/g, '');
  const count = (separator: string): number => first.split(separator).length;
  return separators.reduce<string>((best, each) => (count(each) > count(best) ? each : best), ',');
};

/** Reads a table of text with semicolons, commas or tabs between its cells; a sentence when it cannot be read. */
export const parseTable = (text: string): readonly (readonly string[])[] | string => {
  try {
    return parse(text, {
      delimiter: separatorOf(text.replace(/^\uFEFF/, '')),
      bom: true,
      relax_column_count: true,
      skip_empty_lines: true,
      trim: true,
    });
  } catch (error) {
    const { lines } = error as { lines?: number };
    const where = lines === undefined ? '' : ` near line ${lines}`;
    return `The table cannot be read${where}: a quotation mark is not closed, or stands inside a cell.`;
  }
};
