import type { IntakePreview, IntakeRow } from '#shared/contracts/lot-intake.ts';
import { judgeIntakeRow, readIntakeHeader, type IntakeLot } from '#shared/domain/metal/judge-intake-row.ts';
import { faultOfAssay, questionsOfLot } from '#shared/domain/metal/judge-lot.ts';
import type { AlloyRevision } from '../models/alloy-revision.ts';
import { parseTable } from '../services/parse-table.ts';
import type { Services } from '../services/services.ts';

/** A row with the lot it tells of; null where it has a fault. */
export interface ReadRow extends IntakeRow {
  readonly lot: (IntakeLot & { readonly alloyRevisionId: string | null }) | null;
}

const approvedAlloys = async ({ models }: Services): Promise<ReadonlyMap<string, AlloyRevision>> => {
  const revisions = await models.AlloyRevision.findAll({
    where: { status: 'approved' },
    include: [{ model: models.Alloy, as: 'alloy' }],
  });
  return new Map(revisions.map((revision) => [revision.alloy?.name.toLowerCase() ?? '', revision]));
};

const empty = { name: '', kind: null, massG: null, compositionWt: null, questions: [], lot: null };

const judgeLot = (line: number, lot: IntakeLot, alloys: ReadonlyMap<string, AlloyRevision>): ReadRow => {
  const { name, kind, massG, compositionWt } = lot;
  const revision = lot.alloy === '' ? null : (alloys.get(lot.alloy.toLowerCase()) ?? undefined);
  const fault = faultOfAssay(kind, lot);
  const faults = [
    ...(revision === undefined ? [`alloy: there is no approved alloy “${lot.alloy}”.`] : []),
    ...(fault ? [fault.message] : []),
  ];
  return {
    line,
    name,
    kind,
    massG,
    compositionWt,
    faults,
    questions: faults.length > 0 ? [] : questionsOfLot(lot, revision ?? null).map(({ message }) => message),
    lot: faults.length > 0 ? null : { ...lot, alloyRevisionId: revision?.id ?? null },
  };
};

/** Reads a sheet of lots and judges every row; a sentence when the sheet as a whole cannot be read. */
export const readIntake = async (services: Services, text: string): Promise<readonly ReadRow[] | string> => {
  const table = parseTable(text);
  if (typeof table === 'string') return table;
  const [first = [], ...rows] = table;
  const header = readIntakeHeader(first);
  if (typeof header === 'string') return header;
  if (rows.length === 0) return 'The sheet has no rows below its first line.';
  const alloys = await approvedAlloys(services);
  return rows.map((cells, index) => {
    const line = index + 2;
    const judged = judgeIntakeRow(cells, header, first.length);
    if ('faults' in judged) {
      const name = cells[header.columns.name ?? -1] ?? '';
      return { ...empty, line, name, faults: judged.faults };
    }
    return judgeLot(line, judged.lot, alloys);
  });
};

/** A sheet as it was read, for someone to look through. */
export const previewIntake = async (services: Services, text: string): Promise<IntakePreview> => {
  const read = await readIntake(services, text);
  if (typeof read === 'string') return { fault: read, rows: [], good: 0, questioned: 0, faulty: 0 };
  const faulty = read.filter(({ faults }) => faults.length > 0).length;
  const questioned = read.filter(({ questions }) => questions.length > 0).length;
  return {
    fault: '',
    rows: read.map(({ lot: _lot, ...row }) => row),
    good: read.length - faulty - questioned,
    questioned,
    faulty,
  };
};
