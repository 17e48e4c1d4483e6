import { useState } from 'react';
import type { IntakeResult } from '#shared/contracts/lot-intake.ts';
import { intakeTemplate } from '#shared/domain/metal/intake-template.ts';
import { usePreviewIntake } from '#src/api/lot-intake.ts';
import { ProblemError, sentenceOf } from '#src/lib/http.ts';
import { buttonClass } from '#src/ui/button-class.ts';
import { Notice } from '#src/ui/notice.tsx';
import { PageTitle } from '#src/ui/page-title.tsx';
import { Spinner } from '#src/ui/spinner.tsx';
import { IntakeRows } from './intake-rows.tsx';
import { IntakeDone, IntakeTake, type SheetInHand } from './intake-take.tsx';
import { fileAddress, previewSentence } from './intake-words.ts';
import { SheetSource } from './sheet-source.tsx';

const faultOf = (error: Error): string =>
  (error instanceof ProblemError ? error.problem.fields?.[0]?.message : undefined) ?? sentenceOf(error);

interface Done {
  readonly result: IntakeResult;
  readonly isStoodBy: boolean;
}

/** Takes many lots in from a sheet: chosen, looked through row by row, and taken in only when told to. */
export const IntakePage = () => {
  const look = usePreviewIntake();
  const [sheet, setSheet] = useState<{
    readonly key: string;
    readonly text: string;
    readonly remark: string;
  }>();
  const [done, setDone] = useState<Done | null>(null);
  const read = (text: string, remark: string): void => {
    setDone(null);
    setSheet({ key: crypto.randomUUID(), text, remark });
    look.mutate(text);
  };
  const again = (): void => {
    setDone(null);
    setSheet(undefined);
    look.reset();
  };
  const preview = look.data;
  const inHand: SheetInHand | null = sheet && preview ? { ...sheet, preview } : null;
  return (
    <>
      <PageTitle
        title="Take lots in from a sheet"
        summary="Every row is looked at first; nothing is taken in until you say so."
        actions={
          <a href={fileAddress(intakeTemplate)} download="lots.csv" className={buttonClass()}>
            A sheet to begin from
          </a>
        }
      />
      {inHand && done ? (
        <IntakeDone sheet={inHand} {...done} onAnother={again} />
      ) : (
        <div className="grid grid-cols-1 gap-8">
          <SheetSource text={sheet?.text ?? ''} isBusy={look.isPending} onSheet={read} />
          {look.isPending ? <Spinner label="Looking the sheet through" /> : null}
          {look.error ? <Notice kind="error" title={faultOf(look.error)} /> : null}
          {preview?.fault ? <Notice kind="error" title={preview.fault} /> : null}
          {sheet?.remark && preview ? <Notice kind="caution" title={sheet.remark} /> : null}
          {inHand && inHand.preview.fault === '' ? (
            <>
              <p className="text-[24px] leading-snug font-extrabold">{previewSentence(inHand.preview)}</p>
              <IntakeTake
                key={`take-${inHand.key}`}
                sheet={inHand}
                onTaken={(result, isStoodBy) => setDone({ result, isStoodBy })}
              />
              <IntakeRows key={`rows-${inHand.key}`} preview={inHand.preview} />
            </>
          ) : null}
        </div>
      )}
    </>
  );
};
