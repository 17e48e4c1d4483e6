import { useQuery } from '@tanstack/react-query';
import type { ColumnDef } from '@tanstack/react-table';
import type { InstructionList, InstructionSummary } from '#shared/contracts/instruction.ts';
import { instructionsQuery } from '#src/api/instructions.ts';
import { DataTable } from '#src/ui/data-table.tsx';
import { Notice } from '#src/ui/notice.tsx';
import { PageTitle } from '#src/ui/page-title.tsx';
import { Loaded } from '#src/desk/parts/loaded.tsx';
import type { StudioClock } from '#src/desk/parts/studio-clock.ts';
import { useSortingInAddress } from '#src/desk/parts/use-sorting-in-address.ts';
import { useStudio } from '#src/desk/parts/use-studio.ts';
import { DraftButton } from './draft-button.tsx';
import { InstructionStateMark } from './instruction-state-mark.tsx';

const none = <span className="text-soft">–</span>;

const ByAndWhen = ({
  by,
  at,
  clock,
}: {
  readonly by: string | null;
  readonly at: string;
  readonly clock: StudioClock;
}) => (
  <span className="grid">
    <span>{by ?? 'with the studio'}</span>
    <span className="text-[15px] whitespace-nowrap text-soft">{clock.dayAndTime(at)}</span>
  </span>
);

const columnsFor = (clock: StudioClock): readonly ColumnDef<InstructionSummary>[] => [
  {
    id: 'number',
    header: 'Revision',
    accessorFn: ({ number }) => number,
    cell: ({ row }) => `Revision ${row.original.number}`,
  },
  {
    id: 'state',
    header: 'State',
    accessorFn: ({ status, isInForce }) => (isInForce ? 'in force' : status),
    cell: ({ row }) => <InstructionStateMark revision={row.original} />,
  },
  { id: 'title', header: 'Title', accessorFn: ({ title }) => title },
  {
    id: 'drafted',
    header: 'Drafted',
    accessorFn: ({ draftedAt }) => Date.parse(draftedAt),
    cell: ({ row: { original } }) => (
      <ByAndWhen by={original.draftedBy} at={original.draftedAt} clock={clock} />
    ),
  },
  {
    id: 'approved',
    header: 'Approved',
    accessorFn: ({ approvedAt }) => (approvedAt === null ? undefined : Date.parse(approvedAt)),
    sortUndefined: 'last',
    cell: ({ row: { original } }) =>
      original.approvedAt === null ? (
        none
      ) : (
        <ByAndWhen by={original.approvedBy} at={original.approvedAt} clock={clock} />
      ),
  },
  {
    id: 'note',
    header: 'What is new',
    accessorFn: ({ note }) => note,
    cell: ({ row: { original } }) => (
      <span className="grid max-w-[44ch] gap-0.5">
        <span className="line-clamp-3">{original.note || none}</span>
        {original.exception ? (
          <span className="text-[15px] text-soft">Approved by its drafter: “{original.exception}”</span>
        ) : null}
      </span>
    ),
  },
];

const Revisions = ({ list }: { readonly list: InstructionList }) => {
  const { clock } = useStudio();
  const [sorting, setSorting] = useSortingInAddress();
  return (
    <div className="overflow-x-auto">
      <DataTable
        caption="Revisions of the work instruction, newest first"
        hideCaption
        columns={columnsFor(clock)}
        rows={list.revisions}
        rowKey={({ id }) => id}
        rowHref={({ id }) => `/instructions/${id}`}
        sorting={sorting}
        onSortingChange={setSorting}
        empty={<Notice kind="empty" title="The studio has no work instruction yet." />}
      />
    </div>
  );
};

/** Every revision of the work instruction; cards are opened by the one in force and keep it to their end. */
export const InstructionsPage = () => {
  const list = useQuery(instructionsQuery);
  const current = list.data?.revisions.find(({ isInForce }) => isInForce);
  return (
    <>
      <PageTitle
        title="Work instruction"
        summary="What the terminal asks for on a pour card, step by step. A running card keeps the revision it began with."
        actions={
          list.data?.abilities.draft && current ? (
            <DraftButton from={current.id}>Draft a new revision</DraftButton>
          ) : null
        }
      />
      <Loaded query={list} what="the work instruction">
        {(found) => <Revisions list={found} />}
      </Loaded>
    </>
  );
};
