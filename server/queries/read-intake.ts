import type { IntakePreview, IntakeRow } from '#shared/contracts/lot-intake.ts';
import {
  judgeIntakeRow,
  readIntakeHeader,
  type IntakeFault,
  type IntakeHeader,
  type IntakeLot,
} from '#shared/domain/metal/judge-intake-row.ts';
import { faultOfAssay, questionsOfLot, type LotFault } from '#shared/domain/metal/judge-lot.ts';
import type { AlloyRevision } from '../models/alloy-revision.ts';
import { parseTable } from '../services/parse-table.ts';
import type { Services } from '../services/services.ts';
import { findTwins, type Twins } from './find-twins.ts';

/** A row with the lot it tells of; null where it has a fault. */
export interface ReadRow extends IntakeRow {
  readonly lot: (IntakeLot & { readonly alloyRevisionId: string | null }) | null;
}

/** A sheet as it was read: its first line, and every row judged. */
export interface ReadSheet {
  readonly columns: readonly string[];
  readonly rows: readonly ReadRow[];
}

const approvedAlloys = async ({ models }: Services): Promise<ReadonlyMap<string, AlloyRevision>> => {
  const revisions = await models.AlloyRevision.findAll({
    where: { status: 'approved' },
    include: [{ model: models.Alloy, as: 'alloy' }],
  });
  return new Map(revisions.map((revision) => [revision.alloy?.name.toLowerCase() ?? '', revision]));
};

const unread = { kind: null, massG: null, compositionWt: null, questions: [], lot: null };

/** A fault of a lot at the column it is read from; a composition stands in several. */
const atColumn = ({ columns }: IntakeHeader, { field, message }: LotFault): IntakeFault => ({
  column: field === 'massG' ? (columns.mass ?? null) : null,
  message,
});

const judgeLot = (
  row: Pick<ReadRow, 'line' | 'cells'>,
  lot: IntakeLot,
  header: IntakeHeader,
  alloys: ReadonlyMap<string, AlloyRevision>,
): ReadRow => {
  const { name, kind, massG, compositionWt } = lot;
  const revision = lot.alloy === '' ? null : (alloys.get(lot.alloy.toLowerCase()) ?? undefined);
  const fault = faultOfAssay(kind, lot);
  const faults: readonly IntakeFault[] = [
    ...(revision === undefined
      ? [{ column: header.columns.alloy ?? null, message: `There is no approved alloy “${lot.alloy}”.` }]
      : []),
    ...(fault ? [atColumn(header, fault)] : []),
  ];
  const isGood = faults.length === 0;
  const questions = isGood ? questionsOfLot(lot, revision ?? null) : [];
  return {
    ...row,
    name,
    kind,
    massG,
    compositionWt,
    faults,
    questions: questions.map((question) => atColumn(header, question)),
    lot: isGood ? { ...lot, alloyRevisionId: revision?.id ?? null } : null,
  };
};

const askAboutTwins = (rows: readonly ReadRow[], header: IntakeHeader, twins: Twins): readonly ReadRow[] =>
  rows.map((row) => {
    const message = row.lot === null ? null : twins(row.lot, row.line);
    if (message === null) return row;
    return { ...row, questions: [...row.questions, { column: header.columns.name ?? null, message }] };
  });

/** Reads a sheet of lots and judges every row; a sentence when the sheet as a whole cannot be read. */
export const readIntake = async (services: Services, text: string): Promise<ReadSheet | string> => {
  const table = parseTable(text);
  if (typeof table === 'string') return table;
  const [first = [], ...rows] = table;
  const header = readIntakeHeader(first);
  if (typeof header === 'string') return header;
  if (rows.length === 0) return 'The sheet has no rows below its first line.';
  const alloys = await approvedAlloys(services);
  const judged = rows.map((cells, index): ReadRow => {
    const row = { line: index + 2, cells };
    const read = judgeIntakeRow(cells, header, first.length);
    if ('lot' in read) return judgeLot(row, read.lot, header, alloys);
    return { ...row, ...unread, name: cells[header.columns.name ?? -1] ?? '', faults: read.faults };
  });
  const twins = await findTwins(services, judged);
  return { columns: first, rows: askAboutTwins(judged, header, twins) };
};

/** A sheet as it was read, for someone to look through. */
export const previewIntake = async (services: Services, text: string): Promise<IntakePreview> => {
  const read = await readIntake(services, text);
  if (typeof read === 'string')
    return { fault: read, columns: [], rows: [], good: 0, questioned: 0, faulty: 0 };
  const { columns, rows } = read;
  const faulty = rows.filter(({ faults }) => faults.length > 0).length;
  const questioned = rows.filter(({ questions }) => questions.length > 0).length;
  return {
    fault: '',
    columns,
    rows: rows.map(({ lot: _lot, ...row }) => row),
    good: rows.length - faulty - questioned,
    questioned,
    faulty,
  };
};
