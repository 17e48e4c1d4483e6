import PDFDocument from 'pdfkit';
import type { Reconciliation } from '#shared/contracts/reconciliation.ts';
import { countRows, lossRows, monthRows } from './month-rows.ts';

type Page = InstanceType<typeof PDFDocument>;

const margin = 48;
const body = { font: 'Helvetica', size: 8.5 };

/** Letters that no decomposition takes the bar off. */
const barred: Readonly<Record<string, string>> = { Ł: 'L', ł: 'l', Đ: 'D', đ: 'd', Ħ: 'H', ħ: 'h', ı: 'i' };

/** The standard fonts know Western European letters; others are written without their marks, or as a question mark. */
const writable = (text: string): string =>
  [...text]
    .map((letter) => {
      if (letter.charCodeAt(0) < 256) return letter;
      const plain = barred[letter] ?? letter.normalize('NFD').charAt(0);
      return plain.charCodeAt(0) < 256 ? plain : '?';
    })
    .join('');

const isFigure = (text: string | undefined): boolean => /^-?\d+(\.\d+)?$/.test(text ?? '');

/** A column of figures stands flush right, its heading too. */
const alignOf = (rows: readonly (readonly string[])[], column: number) => ({
  x:
    rows.length > 1 && column > 0 && rows.slice(1).every((row) => isFigure(row[column]))
      ? ('right' as const)
      : ('left' as const),
  y: 'top' as const,
});

const table = (page: Page, rows: readonly (readonly string[])[], widths: readonly number[]): void => {
  page.font(body.font).fontSize(body.size);
  page.table({
    columnStyles: widths.map((width) => ({ width })),
    defaultStyle: { border: [0, 0, 0.4, 0], borderColor: '#999999', padding: [3, 4, 3, 0] },
    data: rows.map((row, index) =>
      row.map((text, column) => ({
        text: writable(text),
        align: alignOf(rows, column),
        ...(index === 0 ? { font: { src: 'Helvetica-Bold' } } : {}),
      })),
    ),
  });
  page.moveDown(1.2);
};

const evenly = (first: number, count: number, whole: number): readonly number[] => [
  first,
  ...Array.from({ length: count }, () => (whole - first) / count),
];

const signatures = (page: Page): void => {
  page.moveDown(2).font(body.font).fontSize(body.size);
  page.text(
    'Drawn up by ______________________________      Checked by ______________________________',
    margin,
  );
};

/** A month of metal as a printed page: the balance, the counts, the loss rates, and where two people sign. */
export const monthPdf = (
  month: Reconciliation,
  { studio, printedAt }: { readonly studio: string; readonly printedAt: Date },
): Promise<Buffer> =>
  new Promise((resolve, reject) => {
    const page = new PDFDocument({
      size: 'A4',
      layout: 'landscape',
      margin,
      info: { Title: `Metal, ${month.month}`, Author: studio, CreationDate: printedAt },
    });
    const chunks: Buffer[] = [];
    page.on('data', (chunk: Buffer) => chunks.push(chunk));
    page.on('end', () => resolve(Buffer.concat(chunks)));
    page.on('error', reject);
    const width = page.page.width - 2 * margin;
    page
      .font('Helvetica-Bold')
      .fontSize(16)
      .text(writable(`Metal in ${month.month}`));
    page
      .font(body.font)
      .fontSize(body.size)
      .text(writable(`${studio}, printed ${printedAt.toISOString().slice(0, 16)} UTC`));
    page.moveDown(1);
    table(page, monthRows(month), evenly(150, month.metals.length + 1, width));
    table(page, countRows(month), [70, 190, 75, 75, 75, width - 575, 90]);
    page
      .text(writable(`Not counted: ${month.uncounted.map(({ code }) => code).join(', ') || 'none'}.`))
      .moveDown(1);
    const rateWidths = evenly(200, 4, width);
    table(page, lossRows('alloy', month.lossByAlloy), rateWidths);
    table(page, lossRows('caster', month.lossByCaster), rateWidths);
    table(page, lossRows('furnace', month.lossByFurnace), rateWidths);
    table(page, lossRows('terminal', month.lossByTerminal), rateWidths);
    signatures(page);
    page.end();
  });
