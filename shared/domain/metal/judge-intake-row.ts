import { parseDecimal } from '#shared/lib/decimal.ts';
import { toGrams, typedMassUnits } from '#shared/lib/units.ts';
import { lotKindNames, lotKinds, type LotKind, type Parts } from './lot.ts';

/** The columns of an intake sheet beside one for each element (`Au`) and its tolerance (`Au ±`). */
export const intakeColumns = [
  'name',
  'kind',
  'mass',
  'unit',
  'alloy',
  'supplier',
  'reference',
  'place',
  'received',
] as const;
type IntakeColumn = (typeof intakeColumns)[number];

/** Which cell of a row holds what. */
export interface IntakeHeader {
  readonly columns: Readonly<Partial<Record<IntakeColumn, number>>>;
  readonly parts: readonly (readonly [element: string, index: number])[];
  readonly tolerances: readonly (readonly [element: string, index: number])[];
}

/** A lot as a row of the sheet tells it. */
export interface IntakeLot {
  readonly name: string;
  readonly kind: LotKind;
  readonly massG: number;
  /** The alloy's name; empty for none. */
  readonly alloy: string;
  readonly supplier: string;
  readonly supplierReference: string;
  readonly place: string;
  /** `year-month-day`, or empty for today. */
  readonly received: string;
  readonly compositionWt: Parts;
  readonly toleranceWt: Parts;
}

const elementShape = /^([A-Z][a-z]?)$/;
const toleranceShape = /^([A-Z][a-z]?)\s*(?:±|\+\/?-|tolerance)$/;
const wanted: readonly IntakeColumn[] = ['name', 'kind', 'mass', 'unit'];

/** Reads the first line of a sheet; a sentence when it lacks what a lot cannot do without. */
export const readIntakeHeader = (cells: readonly string[]): IntakeHeader | string => {
  const matching = (shape: RegExp) =>
    cells.flatMap((cell, index) => {
      const [, element] = shape.exec(cell.trim()) ?? [];
      return element === undefined ? [] : [[element, index] as const];
    });
  const columns = Object.fromEntries(
    intakeColumns.flatMap((name) => {
      const index = cells.findIndex((cell) => cell.trim().toLowerCase() === name);
      return index < 0 ? [] : [[name, index]];
    }),
  );
  const parts = matching(elementShape);
  const missing = wanted.filter((name) => !(name in columns));
  if (missing.length > 0 || parts.length === 0) {
    const lacks = [...missing, ...(parts.length === 0 ? ['one for each element, such as Au'] : [])];
    return `The first line must name the columns; it lacks ${lacks.join(', ')}. Check the separator too.`;
  }
  return { columns, parts, tolerances: matching(toleranceShape) };
};

const kindOf = (text: string): LotKind | null =>
  lotKinds.find((kind) => kind === text.toLowerCase() || lotKindNames[kind] === text.toLowerCase()) ?? null;

const isDay = (text: string): boolean =>
  /^2\d{3}-\d\d-\d\d$/.test(text) && new Date(`${text}T00:00:00Z`).toISOString().startsWith(text);

/** What is wrong with a cell, or with the row as a whole. */
export interface IntakeFault {
  /** Which of the sheet's columns, counted from nought; null for the row as a whole. */
  readonly column: number | null;
  readonly message: string;
}

/** Collects the faults of one row while its cells are read. */
class Row {
  readonly faults: IntakeFault[] = [];
  private readonly cells: readonly string[];
  private readonly header: IntakeHeader;

  constructor(cells: readonly string[], header: IntakeHeader) {
    this.cells = cells;
    this.header = header;
  }

  text(column: IntakeColumn, most = 120): string {
    const index = this.header.columns[column];
    const text = index === undefined ? '' : (this.cells[index] ?? '').trim();
    if (text.length > most) this.refuse(index, `Keep it under ${most} characters.`);
    return text;
  }

  refuse(column: IntakeColumn | number | undefined, message: string): void {
    const index = typeof column === 'string' ? this.header.columns[column] : column;
    this.faults.push({ column: index ?? null, message });
  }

  number(column: number | undefined, text: string): number {
    const parsed = parseDecimal(text);
    if (parsed.ok) return parsed.value;
    this.refuse(column, text === '' ? 'It is missing.' : `“${text}” is not a number.`);
    return Number.NaN;
  }

  numbers(columns: IntakeHeader['parts'], most: number): Parts {
    return Object.fromEntries(
      columns.flatMap(([element, index]) => {
        const text = (this.cells[index] ?? '').trim();
        if (text === '') return [];
        const value = this.number(index, text);
        if (value < 0 || value > most) this.refuse(index, `${value} is not between 0 and ${most}.`);
        return [[element, value] as const];
      }),
    );
  }

  massG(): number {
    const mass = this.number(this.header.columns.mass, this.text('mass'));
    const text = this.text('unit').toLowerCase().replaceAll(' ', '');
    const unit = typedMassUnits.find((each) => each === text);
    if (!unit) {
      this.refuse(
        'unit',
        text === '' ? 'It is missing.' : `“${text}” is none of ${typedMassUnits.join(', ')}.`,
      );
      return Number.NaN;
    }
    const massG = Math.round(toGrams(mass, unit) * 1000) / 1000;
    if (massG <= 0 || massG > 100_000) this.refuse('mass', `${massG} g is not a mass a studio could have.`);
    return massG;
  }
}

const withoutNought = (parts: Parts): Parts =>
  Object.fromEntries(Object.entries(parts).filter(([, wt]) => wt !== 0));

/** Reads one row of an intake sheet: the lot it tells of, or every fault it has at its cell, one sentence each. */
export const judgeIntakeRow = (
  cells: readonly string[],
  header: IntakeHeader,
  width: number,
): { readonly lot: IntakeLot } | { readonly faults: readonly IntakeFault[] } => {
  if (cells.length !== width) {
    const message = `The row has ${cells.length} cells, the first line ${width}: a decimal comma may have been read as a separator.`;
    return { faults: [{ column: null, message }] };
  }
  const row = new Row(cells, header);
  const name = row.text('name', 80);
  if (name === '') row.refuse('name', 'It is missing.');
  const kindText = row.text('kind');
  const kind = kindOf(kindText);
  if (!kind) row.refuse('kind', `“${kindText}” is none of ${lotKinds.join(', ')}.`);
  const received = row.text('received');
  if (received !== '' && !isDay(received)) row.refuse('received', 'Write the day as year-month-day.');
  const lot = {
    name,
    kind: kind ?? 'scrap',
    massG: row.massG(),
    alloy: row.text('alloy'),
    supplier: row.text('supplier'),
    supplierReference: row.text('reference'),
    place: row.text('place', 80),
    received,
    compositionWt: withoutNought(row.numbers(header.parts, 100)),
    toleranceWt: row.numbers(header.tolerances, 5),
  };
  return row.faults.length > 0 ? { faults: row.faults } : { lot };
};
