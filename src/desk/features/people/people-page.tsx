import { useQuery } from '@tanstack/react-query';
import type { ColumnDef } from '@tanstack/react-table';
import { Link } from 'react-router-dom';
import type { Person } from '#shared/contracts/person.ts';
import { peopleQuery } from '#src/api/people.ts';
import { buttonClass } from '#src/ui/button-class.ts';
import { DataTable } from '#src/ui/data-table.tsx';
import { Icon } from '#src/ui/icon.tsx';
import { Notice } from '#src/ui/notice.tsx';
import { PageTitle } from '#src/ui/page-title.tsx';
import { StateMark } from '#src/ui/state-mark.tsx';
import { Loaded } from '../../parts/loaded.tsx';
import { useSortingInAddress } from '../../parts/use-sorting-in-address.ts';
import { UnlockButton } from './unlock-button.tsx';

const pinWords = ({ hasPin, pinLocked }: Person): string => (pinLocked ? 'locked' : hasPin ? 'set' : 'none');

const columns: readonly ColumnDef<Person>[] = [
  { id: 'name', header: 'Name', accessorFn: ({ name }) => name },
  { id: 'login', header: 'Sign-in name', accessorFn: ({ login }) => login },
  { id: 'roles', header: 'Roles', accessorFn: ({ roles }) => roles.join(', ') },
  { id: 'email', header: 'E-mail', accessorFn: ({ email }) => email ?? '' },
  {
    id: 'pin',
    header: 'PIN',
    accessorFn: pinWords,
    cell: ({ row: { original } }) =>
      original.pinLocked ? (
        <span className="flex flex-wrap items-center gap-4">
          <StateMark state="stop" text="locked" size="row" />
          {original.abilities.unlock ? <UnlockButton person={original} /> : null}
        </span>
      ) : (
        pinWords(original)
      ),
  },
  {
    id: 'active',
    header: 'Works here',
    accessorFn: ({ active }) => (active ? 'yes' : 'no'),
  },
];

/** Everyone in the studio, and what they may do. */
export const PeoplePage = () => {
  const people = useQuery(peopleQuery);
  const [sorting, setSorting] = useSortingInAddress();
  return (
    <>
      <PageTitle
        title="People"
        summary="Who works here, what they may do, and how they sign in."
        actions={
          <Link to="/people/new" className={buttonClass()}>
            <Icon name="plus" />
            Add a person
          </Link>
        }
      />
      <Loaded query={people} what="the people">
        {(list) => (
          <div className="overflow-x-auto">
            <DataTable
              caption="People"
              hideCaption
              columns={columns}
              rows={list}
              rowKey={({ id }) => id}
              rowHref={({ id }) => `/people/${id}`}
              sorting={sorting}
              onSortingChange={setSorting}
              empty={<Notice kind="empty" title="Nobody is entered yet." />}
            />
          </div>
        )}
      </Loaded>
    </>
  );
};
