import type { IntakeFault } from '#shared/domain/metal/judge-intake-row.ts';
import type { IntakePreview, IntakeRow } from '#shared/contracts/lot-intake.ts';
import { cx } from '#src/ui/cx.ts';
import { StateMark } from '#src/ui/state-mark.tsx';
import { rowState } from './intake-words.ts';

/** Columns of a sheet whose cells are figures. */
const figures = /^(mass|[A-Z][a-z]?(\s*(±|\+\/?-|tolerance))?)$/;

const states = {
  all: ['ready', 'good'],
  good: ['ready', 'good'],
  questioned: ['caution', 'look again'],
  faulty: ['stop', 'fault'],
} as const;

const Cell = ({
  text,
  isFigure,
  remarks,
  isFault,
}: {
  readonly text: string;
  readonly isFigure: boolean;
  readonly remarks: readonly IntakeFault[];
  readonly isFault: boolean;
}) => (
  <td
    className={cx(
      'border-b-2 border-line py-1.5 pr-4 align-top',
      isFigure && remarks.length === 0 && 'text-right',
      remarks.length === 0 && text.length <= 24 && 'whitespace-nowrap',
      remarks.length > 0 && 'min-w-48',
    )}
  >
    {remarks.length === 0 ? (
      text
    ) : (
      <span className="grid gap-0.5">
        <span
          className={cx(
            'w-fit min-w-8 rounded-md border-2 bg-panel px-1.5 font-extrabold',
            isFault ? 'border-ember' : 'border-dashed border-ink',
          )}
        >
          {text || '\u00a0'}
        </span>
        {remarks.map(({ message }) => (
          <span key={message} className={cx('font-extrabold', isFault && 'text-ember')}>
            {message}
          </span>
        ))}
      </span>
    )}
  </td>
);

const Row = ({ row, columns }: { readonly row: IntakeRow; readonly columns: readonly string[] }) => {
  const remarks = row.faults.length > 0 ? row.faults : row.questions;
  const isFault = row.faults.length > 0;
  const [state, words] = states[rowState(row)];
  return (
    <tr>
      <th scope="row" className="border-b-2 border-line py-1.5 pr-4 text-right align-top font-bold">
        {row.line}
      </th>
      <td className="border-b-2 border-line py-1.5 pr-4 align-top">
        <StateMark state={state} text={words} size="row" />
        {remarks
          .filter(({ column }) => column === null)
          .map(({ message }) => (
            <p key={message} className={cx('min-w-60 font-extrabold', isFault && 'text-ember')}>
              {message}
            </p>
          ))}
      </td>
      {columns.map((name, column) => (
        <Cell
          key={`${column}-${name}`}
          text={row.cells[column] ?? ''}
          isFigure={figures.test(name)}
          isFault={isFault}
          remarks={remarks.filter((remark) => remark.column === column)}
        />
      ))}
    </tr>
  );
};

/** Rows of a sheet as they stand in it, each fault and question at its cell. */
export const IntakeTable = ({
  columns,
  rows,
}: Pick<IntakePreview, 'columns'> & { readonly rows: readonly IntakeRow[] }) => (
  <div role="region" aria-label="Rows of the sheet" tabIndex={0} className="overflow-x-auto rounded-md">
    <table className="w-full text-[15px]">
      <caption className="sr-only">Rows of the sheet</caption>
      <thead>
        <tr>
          {['Line', 'State', ...columns].map((name, column) => (
            <th
              key={`${column}-${name}`}
              scope="col"
              className={cx(
                'border-b-[3px] border-ink py-1.5 pr-4 align-bottom font-extrabold whitespace-nowrap text-soft',
                column === 0 || figures.test(name) ? 'text-right' : 'text-left',
              )}
            >
              {name || '\u00a0'}
            </th>
          ))}
        </tr>
      </thead>
      <tbody>
        {rows.map((row) => (
          <Row key={row.line} row={row} columns={columns} />
        ))}
      </tbody>
    </table>
  </div>
);
