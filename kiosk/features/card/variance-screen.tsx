import { useState } from 'react';
import type { Countersigned } from '#shared/domain/instruction/instruction-step.ts';
import { openVariances, type OpenVariance } from '#shared/domain/pour-card/apply-variance.ts';
import { varianceReasonNames, varianceReasons } from '#shared/domain/pour-card/variance.ts';
import { Button } from '#src/ui/button.tsx';
import { StateMark } from '#src/ui/state-mark.tsx';
import { Choice } from '#kiosk/lib/choice.tsx';
import { useDraft } from '#kiosk/lib/use-draft.ts';
import { AskSign } from './ask-sign.tsx';
import { CardFrame } from './card-frame.tsx';
import { useCardClock } from './use-card-clock.ts';
import type { RunningCard } from './use-running-card.ts';
import { emptyVariance, judgeVariance, type VarianceDraft } from './variance-draft.ts';
import { WordsDialog } from './words-dialog.tsx';

/** Props of {@link VarianceScreen}. */
export interface VarianceScreenProps {
  readonly running: RunningCard;
  /** Leaves it for later; absent when the card cannot end without. */
  readonly onLater?: () => void;
}

interface OneProps extends VarianceScreenProps {
  readonly variance: OpenVariance;
  readonly left: number;
}

const Reasons = ({ draft, onDraft }: { draft: VarianceDraft; onDraft: (draft: VarianceDraft) => void }) => (
  <div
    role="group"
    aria-label="Reason"
    className="grid h-full grid-cols-2 auto-rows-[minmax(88px,1fr)] gap-4"
  >
    {varianceReasons.map((reason) => (
      <Choice
        key={reason}
        isChosen={reason === draft.reason}
        onChoose={() => onDraft({ ...draft, reason })}
        className="text-[28px] leading-tight"
      >
        {varianceReasonNames[reason]}
      </Choice>
    ))}
  </div>
);

const Hold = ({ draft, onDraft }: { draft: VarianceDraft; onDraft: (draft: VarianceDraft) => void }) => (
  <div role="group" aria-label="The pieces" className="flex gap-4">
    <Choice isChosen={!draft.hold} onChoose={() => onDraft({ ...draft, hold: false })} className="text-2xl">
      Pieces go on
    </Choice>
    <Choice isChosen={draft.hold} onChoose={() => onDraft({ ...draft, hold: true })} className="text-2xl">
      Hold the pieces
    </Choice>
  </div>
);

const One = ({ running, variance: { index, departure }, left, onLater }: OneProps) => {
  const { card, state, record } = running;
  const [draft, setDraft] = useDraft(`variance.${card.melt.id}.${index}`, emptyVariance);
  const [open, setOpen] = useState<'words' | 'sign' | null>(null);
  const face = useCardClock(running);
  const judged = judgeVariance(draft, departure, state);
  const keep = (by: Countersigned | null): void => {
    if (!judged.ready) return;
    const { words, hold } = draft;
    record({ type: 'variance-explained', index, reason: judged.reason, words: words.trim(), hold, by });
  };
  if (open === 'sign') {
    return (
      <AskSign
        running={running}
        sentence={departure.sentence}
        back={
          <Button size="terminal" icon="back" onClick={() => setOpen(null)}>
            Back to the reason
          </Button>
        }
        onSigned={keep}
      />
    );
  }
  return (
    <>
      <CardFrame
        running={running}
        sentence={departure.sentence}
        state={
          <StateMark
            state="caution"
            text={left === 1 ? 'Why? The last one' : `Why? ${left} are left`}
            size="terminal"
          />
        }
        sub={face ? `${face.clock} ${face.words}. The clock runs on.` : 'It marks this melt and its pieces.'}
        gauge={<Reasons draft={draft} onDraft={setDraft} />}
        actions={
          <>
            {onLater ? (
              <Button size="terminal" icon="back" onClick={onLater}>
                Later
              </Button>
            ) : null}
            {judged.ready ? (
              <Button
                kind="main"
                size="terminal"
                className="grow-2"
                onClick={() => (judged.wantsSign ? setOpen('sign') : keep(null))}
              >
                {judged.wantsSign ? 'Next: a second person signs' : 'Keep this reason'}
              </Button>
            ) : judged.waitsFor === 'words' ? (
              <Button
                kind="main"
                size="terminal"
                icon="note"
                className="grow-2"
                onClick={() => setOpen('words')}
              >
                {judged.sentence}
              </Button>
            ) : (
              <Button kind="blocked" size="terminal" className="grow-2">
                {judged.sentence}
              </Button>
            )}
          </>
        }
      >
        <div className="grid gap-4">
          <Hold draft={draft} onDraft={setDraft} />
          <Button size="terminal" icon="note" className="min-w-0" onClick={() => setOpen('words')}>
            <span className="truncate">{draft.words.trim() === '' ? 'Add words' : draft.words.trim()}</span>
          </Button>
        </div>
      </CardFrame>
      {open === 'words' ? (
        <WordsDialog
          title="What happened?"
          label="In a few words"
          action="Keep the words"
          words={draft.words}
          maxLength={1000}
          onWords={(words) => setDraft({ ...draft, words })}
          onClose={() => setOpen(null)}
        />
      ) : null}
    </>
  );
};

/** The departures that want their reason, one after the other: why, in words where wanted, hold or not, and who signed. */
export const VarianceScreen = ({ running, onLater }: VarianceScreenProps) => {
  const open = openVariances(running.state, running.card.context);
  const [first] = open;
  if (!first) return null;
  return <One key={first.index} running={running} variance={first} left={open.length} onLater={onLater} />;
};
