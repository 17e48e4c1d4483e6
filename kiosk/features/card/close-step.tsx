import { useState } from 'react';
import { castLooks, type CastLook } from '#shared/domain/pour-card/card-event.ts';
import { chargedG } from '#shared/domain/pour-card/card-state.ts';
import { Button } from '#src/ui/button.tsx';
import { Dialog } from '#src/ui/dialog.tsx';
import { HoldButton } from '#src/ui/hold-button.tsx';
import { NumberPad } from '#src/ui/number-pad.tsx';
import { TextAreaField } from '#src/ui/text-area-field.tsx';
import { splitFigure } from '#kiosk/lib/unit-writer.ts';
import { useDraft } from '#kiosk/lib/use-draft.ts';
import { CardFrame } from './card-frame.tsx';
import { emptyClosing, judgeClosing, lookWords, type ClosingDraft } from './closing-draft.ts';
import type { RunningCard } from './use-running-card.ts';

type MassField = 'button' | 'loss';

const massLabels: Readonly<Record<MassField, string>> = { button: 'Button', loss: 'Spill and loss' };

interface ChoiceProps {
  readonly isChosen: boolean;
  readonly onChoose: () => void;
  readonly children: React.ReactNode;
}

const Choice = ({ isChosen, onChoose, children }: ChoiceProps) => (
  <button
    type="button"
    aria-pressed={isChosen}
    onClick={onChoose}
    className={`min-h-18 flex-1 touch-manipulation rounded-2xl border-[3px] border-ink px-2 text-xl font-black whitespace-nowrap select-none ${isChosen ? 'bg-ink text-ground' : 'bg-panel'}`}
  >
    {children}
  </button>
);

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

const NoteDialog = ({
  note,
  onNote,
  onClose,
}: {
  note: string;
  onNote: (note: string) => void;
  onClose: () => void;
}) => (
  <Dialog
    open
    onClose={onClose}
    title="Note on this melt"
    size="terminal"
    actions={
      <Button kind="main" size="terminal" className="flex-1" onClick={onClose}>
        Keep the note
      </Button>
    }
  >
    <TextAreaField
      label="What should be remembered?"
      value={note}
      rows={5}
      maxLength={2000}
      onChange={(event) => onNote(event.target.value)}
    />
  </Dialog>
);

/** Out of the water: button, loss and look; metal in equals metal out before the card is closed. */
export const CloseStep = ({ running }: { readonly running: RunningCard }) => {
  const { card, state, write, record } = running;
  const [draft, setDraft] = useDraft<ClosingDraft>(`close.${card.melt.id}`, emptyClosing);
  const [field, setField] = useState<MassField>('button');
  const [isNoting, setIsNoting] = useState(false);
  const unit = write.units.mass;
  const metalIn = chargedG(state);
  const closing = judgeClosing(draft, metalIn, unit);
  const cast = closing.castG === null ? null : splitFigure(write.mass(closing.castG));
  const massWords = (which: MassField): string =>
    `${massLabels[which]} ${draft[which] === '' ? '–' : draft[which]} ${unit}`;
  return (
    <>
      <CardFrame
        running={running}
        sentence={card.instruction.sentences.close}
        number={cast?.figure ?? '–'}
        unit={unit}
        sub={`${write.mass(metalIn)} in, less button and loss.`}
        gauge={
          <NumberPad
            label={massLabels[field]}
            value={draft[field]}
            onChange={(text) => setDraft({ ...draft, [field]: text })}
            onEnter={() => setField(field === 'button' ? 'loss' : 'button')}
            unit={unit}
            showValue={false}
          />
        }
        actions={
          <>
            <Button size="terminal" icon="note" onClick={() => setIsNoting(true)}>
              {draft.note.trim() === '' ? 'Add a note' : 'Change the note'}
            </Button>
            {closing.ready ? (
              <HoldButton className="grow-2" onHeld={() => record(closing.event)}>
                Hold to close the card
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
        <NoteDialog
          note={draft.note}
          onNote={(note) => setDraft({ ...draft, note })}
          onClose={() => setIsNoting(false)}
        />
      ) : null}
    </>
  );
};
