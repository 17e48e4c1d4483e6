import type { ColumnDef } from '@tanstack/react-table';
import type { Terminal } from '#shared/contracts/terminal.ts';
import { DataTable } from '#src/ui/data-table.tsx';
import { Notice } from '#src/ui/notice.tsx';
import { StateMark } from '#src/ui/state-mark.tsx';
import { useStudio, type StudioWriting } from '../../parts/use-studio.ts';
import { RevokeTerminal } from './revoke-terminal.tsx';

const columnsFor = ({ clock }: StudioWriting): readonly ColumnDef<Terminal>[] => [
  {
    id: 'name',
    header: 'Name',
    accessorFn: ({ name }) => name,
    cell: ({ row }) => <span className="font-extrabold">{row.original.name}</span>,
  },
  { id: 'bay', header: 'Where it stands', accessorFn: ({ bay }) => bay },
  {
    id: 'seen',
    header: 'Last seen',
    accessorFn: ({ lastSeenAt }) => lastSeenAt ?? '',
    cell: ({ row: { original } }) =>
      original.lastSeenAt ? (
        clock.dayAndTime(original.lastSeenAt)
      ) : (
        <span className="text-soft">not yet</span>
      ),
  },
  {
    id: 'enrolled',
    header: 'Enrolled',
    accessorFn: ({ enrolledAt }) => enrolledAt,
    cell: ({ row }) => clock.dayAndTime(row.original.enrolledAt),
  },
  {
    id: 'state',
    header: 'State',
    accessorFn: ({ revokedAt }) => (revokedAt ? 'ended' : 'in use'),
    cell: ({ row: { original } }) =>
      original.revokedAt ? (
        <span className="text-soft">ended {clock.dayAndTime(original.revokedAt)}</span>
      ) : (
        <StateMark state="ready" text="in use" size="row" />
      ),
  },
  {
    id: 'revoke',
    header: () => <span className="sr-only">End it</span>,
    enableSorting: false,
    cell: ({ row: { original } }) =>
      original.abilities.revoke ? <RevokeTerminal terminal={original} /> : null,
  },
];

/** Every terminal, those whose time has ended too. */
export const TerminalTable = ({ terminals }: { readonly terminals: readonly Terminal[] }) => {
  const writing = useStudio();
  return (
    <div className="min-w-0 overflow-x-auto">
      <DataTable
        caption="Terminals of the studio"
        hideCaption
        columns={columnsFor(writing)}
        rows={terminals}
        rowKey={({ id }) => id}
        empty={
          <Notice kind="empty" title="No device is a terminal yet.">
            Make a code, open the terminal’s address on the device, and type the code there.
          </Notice>
        }
      />
    </div>
  );
};
