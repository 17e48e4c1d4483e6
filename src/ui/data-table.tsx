import {
  flexRender,
  getCoreRowModel,
  getSortedRowModel,
  useReactTable,
  type ColumnDef,
  type Header,
  type SortingState,
} from '@tanstack/react-table';
import { useState, type ReactNode } from 'react';
import { Link } from 'react-router-dom';
import { Icon } from './icon.tsx';

/** Props of {@link DataTable}. */
export interface DataTableProps<Row> {
  /** What the table lists, in words; read by screen readers and shown unless `hideCaption`. */
  readonly caption: string;
  readonly hideCaption?: boolean;
  /** Columns of @tanstack/react-table; `meta: { align: 'right' }` sets figures to the right. */
  // eslint-disable-next-line @typescript-eslint/no-explicit-any -- the value type differs from column to column
  readonly columns: readonly ColumnDef<Row, any>[];
  readonly rows: readonly Row[];
  /** A key that names the row for good. */
  readonly rowKey: (row: Row) => string;
  /** Where a row leads; the first cell becomes the link and the whole row is its target. */
  readonly rowHref?: (row: Row) => string;
  /** What to show when there is no row: usually a `Notice` of kind `empty`. */
  readonly empty: ReactNode;
  /** Order at first, and the order in force when the parent keeps it (in the address, say). */
  readonly sorting?: SortingState;
  readonly onSortingChange?: (sorting: SortingState) => void;
  /** True when `rows` arrive already in the order of `sorting`. */
  readonly sortedElsewhere?: boolean;
}

declare module '@tanstack/react-table' {
  // eslint-disable-next-line @typescript-eslint/no-unused-vars -- the parameters are the library's own; an augmentation must repeat them.
  interface ColumnMeta<TData, TValue> {
    readonly align?: 'left' | 'right';
  }
}

const alignment = (align: 'left' | 'right' | undefined): string =>
  align === 'right' ? 'text-right' : 'text-left';

const ariaSort = { asc: 'ascending', desc: 'descending' } as const;
const sortIcon = { asc: 'up', desc: 'down' } as const;

const HeadCell = <Row,>({ header }: { readonly header: Header<Row, unknown> }) => {
  const { column } = header;
  const order = column.getIsSorted();
  const label = flexRender(column.columnDef.header, header.getContext());
  return (
    <th
      scope="col"
      aria-sort={order ? ariaSort[order] : undefined}
      className={`border-b-[3px] border-ink py-1 pr-5 text-[15px] font-extrabold whitespace-nowrap text-soft ${alignment(column.columnDef.meta?.align)}`}
    >
      {column.getCanSort() ? (
        <button
          type="button"
          onClick={column.getToggleSortingHandler()}
          className="inline-flex min-h-9 items-center gap-1.5 rounded-md font-extrabold"
        >
          {label}
          <Icon name={order ? sortIcon[order] : 'up-down'} className="size-4" />
        </button>
      ) : (
        label
      )}
    </th>
  );
};

/** A table of records: sortable heads that stay in view, rows that lead somewhere, and words when it is empty. */
export const DataTable = <Row,>(props: DataTableProps<Row>) => {
  const [ownSorting, setOwnSorting] = useState<SortingState>(props.sorting ?? []);
  const sorting = props.onSortingChange ? (props.sorting ?? []) : ownSorting;
  // eslint-disable-next-line react-hooks/incompatible-library -- nothing here is memoised by hand or by a compiler
  const table = useReactTable<Row>({
    data: props.rows as Row[],
    columns: props.columns as ColumnDef<Row>[],
    state: { sorting },
    onSortingChange: (update) => {
      const next = typeof update === 'function' ? update(sorting) : update;
      (props.onSortingChange ?? setOwnSorting)(next);
    },
    manualSorting: props.sortedElsewhere ?? false,
    getRowId: props.rowKey,
    getCoreRowModel: getCoreRowModel(),
    getSortedRowModel: getSortedRowModel(),
  });
  if (props.rows.length === 0) return <>{props.empty}</>;
  return (
    <table className="w-full border-separate border-spacing-0">
      <caption className={props.hideCaption ? 'sr-only' : 'pb-2 text-left text-[19px] font-black'}>
        {props.caption}
      </caption>
      <thead className="sticky top-0 z-10 bg-ground">
        {table.getHeaderGroups().map((group) => (
          <tr key={group.id}>
            {group.headers.map((header) => (
              <HeadCell key={header.id} header={header} />
            ))}
          </tr>
        ))}
      </thead>
      <tbody>
        {table.getRowModel().rows.map((row) => (
          <tr key={row.id} className={props.rowHref ? 'relative hover:bg-panel' : undefined}>
            {row.getVisibleCells().map((cell, index) => {
              const content = flexRender(cell.column.columnDef.cell, cell.getContext());
              return (
                <td
                  key={cell.id}
                  className={`border-b-2 border-line py-2.5 pr-5 ${alignment(cell.column.columnDef.meta?.align)}`}
                >
                  {props.rowHref && index === 0 ? (
                    <Link
                      to={props.rowHref(row.original)}
                      className="rounded-md font-extrabold underline decoration-2 underline-offset-4 after:absolute after:inset-0"
                    >
                      {content}
                    </Link>
                  ) : (
                    content
                  )}
                </td>
              );
            })}
          </tr>
        ))}
      </tbody>
    </table>
  );
};
