import { createColumnHelper } from '@tanstack/react-table';
import { useMemo } from 'react';
import type { Alloy, AlloyRevision } from '#shared/contracts/alloy.ts';
import { alloyFamilyNames } from '#shared/domain/alloy/alloy-family.ts';
import { AlloyChip } from '#src/ui/alloy-chip.tsx';
import { DataTable } from '#src/ui/data-table.tsx';
import { Notice } from '#src/ui/notice.tsx';
import { StateMark } from '#src/ui/state-mark.tsx';
import { metalOf } from '../../parts/metal-of.ts';
import { useSortingInAddress } from '../../parts/use-sorting-in-address.ts';
import { useStudio, type StudioWriting } from '../../parts/use-studio.ts';
import { approvedRevision, openRevision } from './choose-revision.ts';
import { RevisionStatusMark } from './revision-status.tsx';

interface AlloyRow {
  readonly alloy: Alloy;
  /** The approved revision, or the newest where none is approved yet. */
  readonly revision: AlloyRevision | undefined;
  readonly open: AlloyRevision | undefined;
}

const rowOf = (alloy: Alloy): AlloyRow => ({
  alloy,
  revision: approvedRevision(alloy) ?? alloy.revisions[0],
  open: openRevision(alloy),
});

const column = createColumnHelper<AlloyRow>();

const StateCell = ({ revision, open }: AlloyRow) => (
  <span className="inline-grid gap-1">
    {revision ? <RevisionStatusMark revision={revision} /> : 'no revision'}
    {open && open.id !== revision?.id ? (
      <StateMark state="wait" text={`revision ${open.number} ${open.status}`} size="row" />
    ) : null}
  </span>
);

const figure = (
  id: string,
  header: string,
  read: (revision: AlloyRevision) => number | null,
  write: (value: number) => string,
) =>
  column.accessor(({ revision }) => (revision ? (read(revision) ?? -1) : -1), {
    id,
    header,
    cell: ({ row: { original } }) => {
      const value = original.revision ? read(original.revision) : null;
      return value === null ? <span className="text-soft">not given</span> : write(value);
    },
    meta: { align: 'right' },
  });

const columnsFor = ({ temperature }: StudioWriting) => [
  column.accessor(({ alloy }) => alloy.name, {
    id: 'name',
    header: 'Alloy',
    cell: ({ row: { original } }) => (
      <AlloyChip
        name={original.alloy.name}
        fineness={original.revision ? String(original.revision.fineness) : undefined}
        metal={metalOf(original.alloy.family)}
      />
    ),
  }),
  column.accessor(({ alloy }) => alloyFamilyNames[alloy.family], { id: 'family', header: 'Family' }),
  column.display({
    id: 'state',
    header: 'State',
    cell: ({ row: { original } }) => <StateCell {...original} />,
  }),
  figure('liquidus', 'Liquidus', ({ figures }) => figures.liquidusC, temperature),
  figure('solidus', 'Solidus', ({ figures }) => figures.solidusC, temperature),
  figure('ascast', 'As-cast limit', ({ figures }) => figures.asCastSolidusC, temperature),
  figure(
    'density',
    'Density',
    ({ figures }) => figures.densityGPerCm3,
    (value) => `${value.toFixed(2)} g/cm³`,
  ),
  column.accessor(({ revision }) => revision?.figures.basis ?? '', {
    id: 'basis',
    header: 'Basis',
    cell: ({ getValue }) => (getValue() === 'measured' ? 'measured, not computed' : 'computed'),
  }),
];

/** The alloys of the studio, each with its approved figures and where its revisions stand. */
export const AlloyTable = ({ alloys }: { readonly alloys: readonly Alloy[] }) => {
  const studio = useStudio();
  const [sorting, setSorting] = useSortingInAddress();
  const columns = useMemo(() => columnsFor(studio), [studio]);
  const rows = useMemo(() => alloys.map(rowOf), [alloys]);
  return (
    <div className="overflow-x-auto">
      <DataTable
        caption="Alloys of the studio"
        hideCaption
        columns={columns}
        rows={rows}
        rowKey={({ alloy }) => alloy.id}
        rowHref={({ alloy }) => `/alloys/${alloy.id}`}
        sorting={sorting}
        onSortingChange={setSorting}
        empty={
          <Notice kind="empty" title="No alloy yet">
            Add the first one: its figures are computed while you type.
          </Notice>
        }
      />
    </div>
  );
};
