import { useState } from 'react';
import type { IntakePreview } from '#shared/contracts/lot-intake.ts';
import { Button } from '#src/ui/button.tsx';
import { cx } from '#src/ui/cx.ts';
import { IntakeTable } from './intake-table.tsx';
import { chooseRows, type RowChoice } from './intake-words.ts';

/** Rows shown at once. */
const pageRows = 50;

const choicesOf = ({
  rows,
  good,
  questioned,
  faulty,
}: IntakePreview): readonly (readonly [RowChoice, string, number])[] =>
  (
    [
      ['faulty', 'With a fault', faulty],
      ['questioned', 'To look at again', questioned],
      ['good', 'Good', good],
      ['all', 'Every row', rows.length],
    ] as const
  ).filter(([choice, , count]) => count > 0 && (choice === 'all' || count < rows.length));

const Pages = ({
  page,
  count,
  onPage,
}: {
  readonly page: number;
  readonly count: number;
  readonly onPage: (page: number) => void;
}) => {
  if (count <= pageRows) return null;
  const last = Math.ceil(count / pageRows) - 1;
  return (
    <div className="flex flex-wrap items-center gap-4">
      <Button icon="back" aria-label="Rows before" disabled={page === 0} onClick={() => onPage(page - 1)} />
      <output>
        Rows {page * pageRows + 1} to {Math.min(count, (page + 1) * pageRows)} of {count}
      </output>
      <Button
        icon="forward"
        aria-label="Rows after"
        disabled={page === last}
        onClick={() => onPage(page + 1)}
      />
    </div>
  );
};

/** The rows of a sheet, those with faults first looked at, a page at a time. */
export const IntakeRows = ({ preview }: { readonly preview: IntakePreview }) => {
  const choices = choicesOf(preview);
  const [choice, setChoice] = useState<RowChoice>(choices[0]?.[0] ?? 'all');
  const [page, setPage] = useState(0);
  const rows = chooseRows(preview.rows, choice);
  return (
    <div className="grid grid-cols-1 gap-4">
      {choices.length > 1 ? (
        <div role="group" aria-label="Which rows" className="flex flex-wrap gap-1">
          {choices.map(([each, words, count]) => (
            <button
              key={each}
              type="button"
              aria-pressed={each === choice}
              onClick={() => {
                setChoice(each);
                setPage(0);
              }}
              className={cx(
                'min-h-11 rounded-full border-[2.5px] px-4 font-extrabold',
                each === choice ? 'border-ink bg-panel' : 'border-transparent text-soft hover:text-ink',
              )}
            >
              {words} <span className="font-black">{count}</span>
            </button>
          ))}
        </div>
      ) : null}
      <IntakeTable columns={preview.columns} rows={rows.slice(page * pageRows, (page + 1) * pageRows)} />
      <Pages page={page} count={rows.length} onPage={setPage} />
    </div>
  );
};
