import { render, screen } from '@testing-library/react';
import { userEvent } from '@testing-library/user-event';
import { MemoryRouter } from 'react-router-dom';
import { describe, expect, it, vi } from 'vitest';
import { DataTable, type DataTableProps } from './data-table.tsx';

interface Melt {
  readonly id: string;
  readonly metalG: number;
}

const columns: DataTableProps<Melt>['columns'] = [
  { accessorKey: 'id', header: 'Melt' },
  { accessorKey: 'metalG', header: 'Metal, g', meta: { align: 'right' } },
  { id: 'note', header: 'Note', cell: () => '', enableSorting: false },
];

const rows: readonly Melt[] = [
  { id: '2211', metalG: 84.2 },
  { id: '2214', metalG: 9.5 },
  { id: '2219', metalG: 118.4 },
];

const show = (props: Partial<DataTableProps<Melt>> = {}) =>
  render(
    <MemoryRouter>
      <DataTable
        caption="Melts today"
        columns={columns}
        rows={rows}
        rowKey={(row) => row.id}
        rowHref={(row) => `/melts/${row.id}`}
        empty={<p>No melt yet.</p>}
        {...props}
      />
    </MemoryRouter>,
  );

const order = (): readonly string[] => screen.getAllByRole('link').map((link) => link.textContent);

describe('DataTable', () => {
  it('is a named table whose rows lead somewhere', () => {
    show();
    expect(screen.getByRole('table', { name: 'Melts today' })).toBeInTheDocument();
    expect(screen.getByRole('link', { name: '2214' })).toHaveAttribute('href', '/melts/2214');
  });

  it('sorts numbers as numbers and says which way', async () => {
    show();
    await userEvent.click(screen.getByRole('button', { name: 'Metal, g' }));
    const head = screen.getByRole('columnheader', { name: 'Metal, g' });
    expect(head).toHaveAttribute('aria-sort', 'descending');
    expect(order()).toEqual(['2219', '2211', '2214']);
    await userEvent.click(screen.getByRole('button', { name: 'Metal, g' }));
    expect(head).toHaveAttribute('aria-sort', 'ascending');
    expect(order()).toEqual(['2214', '2211', '2219']);
  });

  it('hands the order to a parent that keeps it, and leaves rows sorted elsewhere as they are', async () => {
    const onSortingChange = vi.fn();
    show({ sorting: [{ id: 'metalG', desc: true }], onSortingChange, sortedElsewhere: true });
    expect(order()).toEqual(['2211', '2214', '2219']);
    await userEvent.click(screen.getByRole('button', { name: 'Metal, g' }));
    expect(onSortingChange).toHaveBeenCalledWith([{ id: 'metalG', desc: false }]);
  });

  it('offers no sorting on a column that cannot be sorted', () => {
    show();
    expect(screen.queryByRole('button', { name: 'Note' })).toBeNull();
  });

  it('says what is so when there is no row', () => {
    show({ rows: [] });
    expect(screen.queryByRole('table')).toBeNull();
    expect(screen.getByText('No melt yet.')).toBeInTheDocument();
  });
});
