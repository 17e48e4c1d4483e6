import type { ColumnDef } from '@tanstack/react-table';
import type { MeltSummary } from '#shared/contracts/melt.ts';
import { splitCode } from '#shared/lib/codes.ts';
import { AlloyChip } from '#src/ui/alloy-chip.tsx';
import { StateMark } from '#src/ui/state-mark.tsx';
import { FlaskCodeText } from '../../parts/flask-code-text.tsx';
import { metalOf } from '../../parts/metal-of.ts';
import type { StudioWriting } from '../../parts/use-studio.ts';
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

const departures = (count: number) =>
  count === 0 ? none : <StateMark state="caution" text={String(count)} size="row" />;

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
    cell: ({ row }) => departures(row.original.departures),
  },
  {
    id: 'state',
    header: 'State',
    accessorFn: ({ step }) => step,
    cell: ({ row }) => <MeltStateMark melt={row.original} />,
  },
];
