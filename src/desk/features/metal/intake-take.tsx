import { useState } from 'react';
import { Link } from 'react-router-dom';
import type { IntakePreview, IntakeResult } from '#shared/contracts/lot-intake.ts';
import { useTakeIntake } from '#src/api/lot-intake.ts';
import { sentenceOf } from '#src/lib/http.ts';
import { buttonClass } from '#src/ui/button-class.ts';
import { Button } from '#src/ui/button.tsx';
import { CheckField } from '#src/ui/check-field.tsx';
import { Notice } from '#src/ui/notice.tsx';
import { Spinner } from '#src/ui/spinner.tsx';
import { fileAddress, resultSentence, rowState, sheetOf } from './intake-words.ts';

/** A sheet that was looked through: its text, what was found, and the key under which it is taken in at most once. */
export interface SheetInHand {
  readonly key: string;
  readonly text: string;
  readonly preview: IntakePreview;
}

const lots = (count: number): string => (count === 1 ? '1 lot' : `${count} lots`);
const rows = (count: number): string => (count === 1 ? '1 row' : `${count} rows`);

/** Takes the good rows in, and others only when told to; a second press after a lost answer takes in nothing twice. */
export const IntakeTake = ({
  sheet,
  onTaken,
}: {
  readonly sheet: SheetInHand;
  readonly onTaken: (result: IntakeResult, isStoodBy: boolean) => void;
}) => {
  const { good, questioned, rows: all } = sheet.preview;
  const [isStoodBy, setStoodBy] = useState(false);
  const [onlyGood, setOnlyGood] = useState(false);
  const take = useTakeIntake();
  const count = good + (isStoodBy ? questioned : 0);
  const left = all.length - count;
  const isBlocked = count === 0 || (left > 0 && !onlyGood);
  const send = (): void =>
    take.mutate(
      { key: sheet.key, text: sheet.text, onlyGood, confirmed: isStoodBy },
      { onSuccess: (result) => onTaken(result, isStoodBy) },
    );
  if (good + questioned === 0)
    return (
      <Notice kind="caution" title="No row can be taken in as it is.">
        Put the sheet right where it says, and choose it again.
      </Notice>
    );
  return (
    <div className="grid max-w-3xl gap-4">
      {questioned > 0 ? (
        <CheckField
          label={`I have looked again at ${rows(questioned)}: what is asked there is right`}
          checked={isStoodBy}
          onChange={({ target }) => setStoodBy(target.checked)}
        />
      ) : null}
      {left > 0 && count > 0 ? (
        <CheckField
          label={`Take the ${count === 1 ? 'one good row' : `${count} good rows`} only; ${rows(left)} stay${left === 1 ? 's' : ''} out`}
          hint="They come back as a sheet of their own, to be put right."
          checked={onlyGood}
          onChange={({ target }) => setOnlyGood(target.checked)}
        />
      ) : null}
      {take.error ? <Notice kind="error" title={sentenceOf(take.error)} /> : null}
      <p className="flex flex-wrap items-center gap-4">
        <Button
          kind={isBlocked ? 'blocked' : 'main'}
          disabled={isBlocked}
          busy={take.isPending}
          onClick={send}
        >
          {isBlocked ? 'Say first what is to be taken' : `Take ${lots(count)} in`}
        </Button>
        {take.isPending ? <Spinner label={`Taking ${lots(count)} in, all of them or none`} /> : null}
      </p>
    </div>
  );
};

/** What came of it: the lots that are in, and the rows that stayed out as a sheet of their own. */
export const IntakeDone = ({
  sheet: { preview },
  result,
  isStoodBy,
  onAnother,
}: {
  readonly sheet: SheetInHand;
  readonly result: IntakeResult;
  readonly isStoodBy: boolean;
  readonly onAnother: () => void;
}) => {
  const out = preview.rows.filter(
    (row) => rowState(row) === 'faulty' || (!isStoodBy && rowState(row) === 'questioned'),
  );
  return (
    <div className="max-w-3xl">
      <Notice
        kind="info"
        title={resultSentence(result)}
        action={
          <>
            <Link to="/metal" className={buttonClass({ kind: 'main' })}>
              See the lots
            </Link>
            {out.length > 0 ? (
              <a
                href={fileAddress(sheetOf(preview.columns, out))}
                download="lots-left-out.csv"
                className={buttonClass()}
              >
                Save the {rows(out.length)} left out
              </a>
            ) : null}
            <Button onClick={onAnother}>Another sheet</Button>
          </>
        }
      >
        Each has its code; its label prints from its page.
      </Notice>
    </div>
  );
};
