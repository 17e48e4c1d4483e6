import { useState } from 'react';
import { castLooks, type CastLook } from '#shared/domain/pour-card/card-event.ts';
import { chargedG } from '#shared/domain/pour-card/card-state.ts';
import { ofClosing } from '#shared/domain/pour-card/departures.ts';
import { Button } from '#src/ui/button.tsx';
import { HoldButton } from '#src/ui/hold-button.tsx';
import { NumberPad } from '#src/ui/number-pad.tsx';
import { StateMark } from '#src/ui/state-mark.tsx';
import { Choice } from '#kiosk/lib/choice.tsx';
import { splitFigure } from '#kiosk/lib/unit-writer.ts';
import { useDraft } from '#kiosk/lib/use-draft.ts';
import { CardFrame } from './card-frame.tsx';
import { emptyClosing, judgeClosing, lookWords, type Closing, type ClosingDraft } from './closing-draft.ts';
import type { RunningCard } from './use-running-card.ts';
import { WordsDialog } from './words-dialog.tsx';

type MassField = 'button' | 'loss';

const massLabels: Readonly<Record<MassField, string>> = { button: 'Button', loss: 'Spill and loss' };

const Looks = ({
  look,
  onLook,
}: {
  readonly look: CastLook | null;
  readonly onLook: (look: CastLook) => void;
}) => (
  <div role="group" aria-label="Look of the casting" className="flex flex-wrap gap-4">
    {castLooks.map((choice) => (
      <Choice key={choice} isChosen={choice === look} onChoose={() => onLook(choice)}>
        {lookWords[choice]}
      </Choice>
    ))}
  </div>
);

/** What is doubtful about a loss, in one sentence; null when it is within the studio's limit. */
const doubtOf = (closing: Closing, metalInG: number, { card }: RunningCard): string | null => {
  if (!closing.ready) return null;
  // The moment does not matter to the sentence.
  const departures = ofClosing(closing.event, metalInG, card.context, '');
  return departures.find(({ kind }) => kind === 'loss-over-limit')?.sentence ?? null;
};

/** Out of the water: button, loss and look; metal in equals metal out before the card is closed. */
export const CloseStep = ({ running }: { readonly running: RunningCard }) => {
  const { card, state, write, record } = running;
  const [draft, setDraft] = useDraft<ClosingDraft>(`close.${card.melt.id}`, emptyClosing);
  const [field, setField] = useState<MassField>('button');
  const [isNoting, setIsNoting] = useState(false);
  const unit = write.units.mass;
  const metalIn = chargedG(state);
  const closing = judgeClosing(draft, metalIn, unit);
  const [isDoubted, setIsDoubted] = useState(false);
  const doubt = doubtOf(closing, metalIn, running);
  const cast = closing.castG === null ? null : splitFigure(write.mass(closing.castG));
  const change = (next: ClosingDraft): void => {
    setIsDoubted(false);
    setDraft(next);
  };
  const massWords = (which: MassField): string =>
    `${massLabels[which]} ${draft[which] === '' ? '–' : draft[which]} ${unit}`;
  return (
    <>
      <CardFrame
        running={running}
        sentence={card.instruction.sentences.close}
        number={cast?.figure ?? '–'}
        unit={unit}
        sub={
          isDoubted && doubt ? (
            <span role="alert" className="text-ink">
              <StateMark state="caution" text={doubt} size="desk" />
            </span>
          ) : (
            `${write.mass(metalIn)} in, less button and loss.`
          )
        }
        gauge={
          <NumberPad
            label={massLabels[field]}
            value={draft[field]}
            onChange={(text) => change({ ...draft, [field]: text })}
            onEnter={() => setField(field === 'button' ? 'loss' : 'button')}
            unit={unit}
            showValue={false}
          />
        }
        actions={
          <>
            {isDoubted && doubt ? (
              <Button
                size="terminal"
                icon="scale"
                onClick={() => {
                  setField('loss');
                  change({ ...draft, loss: '' });
                }}
              >
                Weigh it again
              </Button>
            ) : (
              <Button size="terminal" icon="note" onClick={() => setIsNoting(true)}>
                {draft.note.trim() === '' ? 'Add a note' : 'Change the note'}
              </Button>
            )}
            {closing.ready ? (
              <HoldButton
                key={String(isDoubted)}
                className="grow-2"
                onHeld={() => (doubt && !isDoubted ? setIsDoubted(true) : record(closing.event))}
              >
                {isDoubted && doubt ? 'Keep it. Hold, and give the reason' : 'Hold to close the card'}
              </HoldButton>
            ) : (
              <Button kind="blocked" size="terminal" className="grow-2">
                {closing.waitsFor}
              </Button>
            )}
          </>
        }
      >
        <div className="grid gap-4">
          <div role="group" aria-label="What the pad types" className="flex gap-4">
            {(['button', 'loss'] as const).map((which) => (
              <Choice key={which} isChosen={which === field} onChoose={() => setField(which)}>
                {massWords(which)}
              </Choice>
            ))}
          </div>
          <Looks look={draft.look} onLook={(look) => setDraft({ ...draft, look })} />
        </div>
      </CardFrame>
      {isNoting ? (
        <WordsDialog
          title="Note on this melt"
          label="What should be remembered?"
          action="Keep the note"
          words={draft.note}
          maxLength={2000}
          onWords={(note) => setDraft({ ...draft, note })}
          onClose={() => setIsNoting(false)}
        />
      ) : null}
    </>
  );
};
