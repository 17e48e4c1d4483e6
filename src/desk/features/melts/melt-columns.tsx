import type { ColumnDef } from '@tanstack/react-table';
import type { MeltSummary } from '#shared/contracts/melt.ts';
import { splitCode } from '#shared/lib/codes.ts';
import { AlloyChip } from '#src/ui/alloy-chip.tsx';
import { StateMark } from '#src/ui/state-mark.tsx';
import { FlaskCodeText } from '#src/desk/parts/flask-code-text.tsx';
import { metalOf } from '#src/desk/parts/metal-of.ts';
import type { StudioWriting } from '#src/desk/parts/use-studio.ts';
import { MeltStateMark } from './melt-state-mark.tsx';

type Column = ColumnDef<MeltSummary>;

const none = <span className="text-soft">–</span>;

const figure = (
  id: string,
  header: string,
  read: (melt: MeltSummary) => number | null,
  write: (value: number) => string,
): Column => ({
  id,
  header,
  // A figure that is not known yet sorts after those that are, whichever way.
  accessorFn: (melt) => read(melt) ?? undefined,
  sortUndefined: 'last',
  cell: ({ row }) => {
    const value = read(row.original);
    return value === null ? none : <span className="whitespace-nowrap">{write(value)}</span>;
  },
  meta: { align: 'right' },
});

const Departures = ({ melt }: { readonly melt: MeltSummary }) => {
  const { departures, openVariances, holdsPieces } = melt;
  if (departures === 0) return none;
  return (
    <span className="grid gap-0.5">
      <StateMark state="caution" text={String(departures)} size="row" />
      {openVariances > 0 ? <StateMark state="wait" text={`${openVariances} open`} size="row" /> : null}
      {holdsPieces ? <StateMark state="stop" text="pieces held" size="row" /> : null}
    </span>
  );
};

/** The columns of the melt book in the studio's units and time. */
export const meltColumns = ({ clock, mass, temperature }: StudioWriting): readonly Column[] => [
  {
    id: 'melt',
    header: 'Melt',
    accessorFn: ({ number }) => number,
    cell: ({ row }) => splitCode(row.original.code).main,
  },
  {
    id: 'when',
    header: 'When',
    accessorFn: ({ openedAt }) => Date.parse(openedAt),
    cell: ({ row }) => (
      <span className="whitespace-nowrap">
        {clock.dayAndTime(row.original.pouredAt ?? row.original.openedAt)}
      </span>
    ),
  },
  {
    id: 'flask',
    header: 'Flask',
    accessorFn: ({ flaskCode }) => flaskCode,
    cell: ({ row }) => <FlaskCodeText code={row.original.flaskCode} />,
  },
  {
    id: 'alloy',
    header: 'Alloy',
    accessorFn: ({ alloyName }) => alloyName,
    cell: ({ row: { original } }) => (
      <AlloyChip
        name={original.alloyName}
        fineness={String(original.fineness)}
        metal={metalOf(original.family)}
      />
    ),
  },
  { id: 'person', header: 'Person', accessorFn: ({ person }) => person },
  figure('metalIn', 'Metal in', ({ metalInG }) => metalInG, mass),
  figure('cast', 'Cast', ({ castMassG }) => castMassG, mass),
  figure('loss', 'Loss', ({ lossMassG }) => lossMassG, mass),
  figure('pouredAt', 'Melt at the pour', ({ pourMeltC }) => pourMeltC, temperature),
  {
    id: 'departures',
    header: 'Departures',
    accessorFn: (melt) => melt.departures,
    cell: ({ row }) => <Departures melt={row.original} />,
  },
  {
    id: 'state',
    header: 'State',
    accessorFn: ({ step }) => step,
    cell: ({ row }) => <MeltStateMark melt={row.original} />,
  },
];
