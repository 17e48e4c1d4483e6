import { createColumnHelper } from '@tanstack/react-table';
import { useMemo, type ReactNode } from 'react';
import type { Lot } from '#shared/contracts/lot.ts';
import { formatFineness, lotKindNames } from '#shared/domain/metal/lot.ts';
import { metalName } from '#shared/domain/metal/metal-name.ts';
import { useNow } from '#src/lib/use-now.ts';
import { DataTable } from '#src/ui/data-table.tsx';
import { StateMark } from '#src/ui/state-mark.tsx';
import { FlaskCodeText } from '#src/desk/parts/flask-code-text.tsx';
import { useSortingInAddress } from '#src/desk/parts/use-sorting-in-address.ts';
import { useStudio, type StudioWriting } from '#src/desk/parts/use-studio.ts';
import { writeComposition } from '#src/desk/parts/element-names.ts';
import { ageWords, finenessOf } from './lot-words.ts';

const column = createColumnHelper<Lot>();

const NameCell = ({ lot }: { readonly lot: Lot }) => (
  <span className="inline-grid gap-0.5">
    <span className="font-extrabold">{lot.name}</span>
    {lot.quarantineReason === null ? null : <StateMark state="stop" text="in quarantine" size="row" />}
  </span>
);

const columnsFor = ({ mass }: StudioWriting, nowMs: number) => [
  column.accessor('code', {
    header: 'Lot',
    cell: ({ getValue }) => <FlaskCodeText code={getValue()} />,
  }),
  column.accessor('name', { header: 'Name', cell: ({ row }) => <NameCell lot={row.original} /> }),
  column.accessor(({ kind }) => lotKindNames[kind], {
    id: 'kind',
    header: 'Kind',
    cell: ({ getValue }) => <span className="whitespace-nowrap">{getValue()}</span>,
  }),
  column.display({
    id: 'composition',
    header: 'Composition, wt%',
    // A symbol and its figure stay on one line.
    cell: ({ row }) => writeComposition(row.original.compositionWt).replaceAll(/([a-z]) /g, '$1\u00a0'),
  }),
  column.accessor((lot) => finenessOf(lot)?.expected ?? -1, {
    id: 'fineness',
    header: 'Fineness',
    cell: ({ row }) => {
      const fineness = finenessOf(row.original);
      if (!fineness) return <span className="text-soft">not precious</span>;
      return (
        <span className="whitespace-nowrap">
          <span className="text-soft">{metalName(fineness.metal)}</span> {formatFineness(fineness.expected)}
        </span>
      );
    },
    meta: { align: 'right' },
  }),
  column.accessor((lot) => finenessOf(lot)?.worst ?? -1, {
    id: 'worst',
    header: 'At worst',
    cell: ({ row }) => {
      const fineness = finenessOf(row.original);
      return fineness ? formatFineness(fineness.worst) : '';
    },
    meta: { align: 'right' },
  }),
  column.accessor('balanceG', {
    id: 'balance',
    header: 'On hand',
    cell: ({ getValue }) => <span className="font-extrabold whitespace-nowrap">{mass(getValue())}</span>,
    meta: { align: 'right' },
  }),
  column.accessor('place', {
    header: 'Place',
    cell: ({ getValue }) => getValue() || <span className="text-soft">not said</span>,
  }),
  column.accessor(({ receivedAt }) => -Date.parse(receivedAt), {
    id: 'age',
    header: 'Age',
    cell: ({ row }) => <span className="whitespace-nowrap">{ageWords(row.original.receivedAt, nowMs)}</span>,
    meta: { align: 'right' },
  }),
];

/** Props of {@link LotTable}. */
export interface LotTableProps {
  readonly lots: readonly Lot[];
  readonly empty: ReactNode;
}

/** Lots of metal, a row each, the oldest first unless sorted otherwise. */
export const LotTable = ({ lots, empty }: LotTableProps) => {
  const studio = useStudio();
  const nowMs = useNow(60_000);
  const [sorting, setSorting] = useSortingInAddress();
  const columns = useMemo(() => columnsFor(studio, nowMs), [studio, nowMs]);
  return (
    <div className="overflow-x-auto text-[15px]">
      <DataTable
        caption="Lots of metal"
        hideCaption
        columns={columns}
        rows={lots}
        rowKey={({ id }) => id}
        rowHref={({ id }) => `/metal/lots/${id}`}
        sorting={sorting}
        onSortingChange={setSorting}
        empty={empty}
      />
    </div>
  );
};
