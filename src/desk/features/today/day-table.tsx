import type { ColumnDef } from '@tanstack/react-table';
import { Link } from 'react-router-dom';
import type { Casting } from '#shared/contracts/casting.ts';
import { castingMethodNames } from '#shared/domain/casting/casting-method.ts';
import { splitCode } from '#shared/lib/codes.ts';
import { AlloyChip } from '#src/ui/alloy-chip.tsx';
import { DataTable } from '#src/ui/data-table.tsx';
import { StateMark } from '#src/ui/state-mark.tsx';
import { CastingStateMark } from '../../parts/casting-state-mark.tsx';
import { FlaskCodeText } from '../../parts/flask-code-text.tsx';
import { metalOf } from '../../parts/metal-of.ts';
import { useStudio, type StudioWriting } from '../../parts/use-studio.ts';
import type { Day } from './use-day.ts';

const columnsFor = ({ runningIds }: Day, { clock, mass }: StudioWriting): readonly ColumnDef<Casting>[] => [
  {
    id: 'time',
    header: 'Time',
    accessorFn: ({ plannedPourAt }) => Date.parse(plannedPourAt),
    cell: ({ row }) => (
      <>
        {clock.time(row.original.plannedPourAt)}
        <span className="sr-only">, {splitCode(row.original.flask.code).main}</span>
      </>
    ),
  },
  {
    id: 'flask',
    header: 'Flask',
    accessorFn: ({ flask }) => flask.code,
    cell: ({ row }) => (
      <span className="font-extrabold">
        <FlaskCodeText code={row.original.flask.code} />
      </span>
    ),
  },
  {
    id: 'alloy',
    header: 'Alloy',
    accessorFn: ({ alloy }) => alloy.name,
    cell: ({ row: { original } }) => (
      <AlloyChip
        name={original.alloy.name}
        fineness={String(original.alloy.fineness)}
        metal={metalOf(original.alloy.family)}
      />
    ),
  },
  {
    id: 'metal',
    header: 'Metal',
    accessorFn: ({ plannedMetalG }) => plannedMetalG,
    cell: ({ row }) => <span className="whitespace-nowrap">{mass(row.original.plannedMetalG)}</span>,
    meta: { align: 'right' },
  },
  {
    id: 'method',
    header: 'Method',
    accessorFn: ({ method }) => castingMethodNames[method],
    cell: ({ getValue }) => <span className="whitespace-nowrap">{getValue<string>()}</span>,
  },
  {
    id: 'state',
    header: 'State',
    accessorFn: ({ state }) => state,
    cell: ({ row: { original } }) =>
      runningIds.has(original.id) ? (
        <StateMark state="wait" text="at the furnace" size="row" />
      ) : (
        <CastingStateMark state={original.state} />
      ),
  },
  {
    id: 'caster',
    header: 'Caster',
    accessorFn: ({ caster }) => caster?.name ?? '',
    cell: ({ row }) =>
      row.original.caster ? (
        <span className="whitespace-nowrap">{row.original.caster.name}</span>
      ) : (
        <span className="text-soft">not set</span>
      ),
  },
  {
    id: 'melt',
    header: 'Melt',
    accessorFn: ({ melt }) => melt?.code ?? '',
    cell: ({ row: { original } }) =>
      original.melt ? (
        <Link
          to={`/melts/${original.melt.id}`}
          className="relative z-10 rounded-md font-extrabold underline decoration-2 underline-offset-4"
        >
          <FlaskCodeText code={original.melt.code} />
        </Link>
      ) : (
        <span className="text-soft">none yet</span>
      ),
  },
];

/** Props of {@link DayTable}. */
export interface DayTableProps {
  readonly day: Day;
  readonly hrefOf: (casting: Casting) => string;
}

/** The day's castings as a table; a row selects its casting. */
export const DayTable = ({ day, hrefOf }: DayTableProps) => {
  const writing = useStudio();
  return (
    <div className="overflow-x-auto">
      <DataTable
        caption="Castings of the day"
        columns={columnsFor(day, writing)}
        rows={day.castings}
        rowKey={({ id }) => id}
        rowHref={hrefOf}
        empty={null}
      />
    </div>
  );
};
