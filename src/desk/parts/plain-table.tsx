import type { ReactNode } from 'react';

/** Props of {@link PlainTable}; the first cell of a row names it, the rest are figures. */
export interface PlainTableProps {
  readonly caption: string;
  readonly heads: readonly string[];
  readonly rows: readonly { readonly key: string; readonly cells: readonly ReactNode[] }[];
  /** Columns of words are set to the left, of figures to the right. */
  readonly align?: 'left' | 'right';
  /** Columns of figures in a table of words, counted from nought. */
  readonly figures?: readonly number[];
}

/** A small table of figures; on a narrow screen it scrolls sideways by itself, by the keys too. */
export const PlainTable = ({ caption, heads, rows, align = 'right', figures = [] }: PlainTableProps) => {
  const side = (column: number): string =>
    (column > 0 && align === 'right') || figures.includes(column) ? 'text-right' : 'text-left';
  return (
    <div role="region" aria-label={caption} tabIndex={0} className="overflow-x-auto rounded-md">
      <table className="w-full text-[15px]">
        <caption className="sr-only">{caption}</caption>
        <thead>
          <tr>
            {heads.map((head, column) => (
              <th
                key={head}
                scope="col"
                className={`border-b-2 border-ink py-1.5 pr-4 align-bottom font-extrabold text-soft ${side(column)}`}
              >
                {head}
              </th>
            ))}
          </tr>
        </thead>
        <tbody>
          {rows.map(({ key, cells }) => (
            <tr key={key}>
              {cells.map((cell, column) =>
                column === 0 ? (
                  <th
                    key={heads[column]}
                    scope="row"
                    className="border-b-2 border-line py-1.5 pr-4 text-left align-top font-bold"
                  >
                    {cell}
                  </th>
                ) : (
                  <td
                    key={heads[column]}
                    className={`border-b-2 border-line py-1.5 pr-4 align-top ${side(column)}`}
                  >
                    {cell}
                  </td>
                ),
              )}
            </tr>
          ))}
        </tbody>
      </table>
    </div>
  );
};
