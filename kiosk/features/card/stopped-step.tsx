import { useState } from 'react';
import { timeOfDay } from '#src/lib/formats.ts';
import { Button } from '#src/ui/button.tsx';
import { Dialog } from '#src/ui/dialog.tsx';
import { HoldButton } from '#src/ui/hold-button.tsx';
import { StateMark } from '#src/ui/state-mark.tsx';
import { TextAreaField } from '#src/ui/text-area-field.tsx';
import { mayDecide } from '#kiosk/lib/presence.ts';
import { clockFace, runningClockOf } from '#kiosk/lib/running-clock.ts';
import { useServerNow } from '#kiosk/lib/server-clock.ts';
import { CardFrame } from './card-frame.tsx';
import { stopReasonWords } from './stop-question.tsx';
import type { RunningCard } from './use-running-card.ts';

const EndCard = ({
  onEnd,
  onClose,
}: {
  readonly onEnd: (note: string) => void;
  readonly onClose: () => void;
}) => {
  const [note, setNote] = useState('');
  const isWritten = note.trim() !== '';
  return (
    <Dialog
      open
      onClose={onClose}
      title="End this card here?"
      size="terminal"
      actions={
        <div className="terminal-actions w-full">
          <Button size="terminal" onClick={onClose}>
            Keep the card
          </Button>
          <HoldButton disabled={!isWritten} onHeld={() => onEnd(note.trim())}>
            {isWritten ? 'Hold to end the card' : 'Say why first'}
          </HoldButton>
        </div>
      }
    >
      <p className="mb-5 leading-snug">The casting goes on hold. What was recorded stays in the melt book.</p>
      <TextAreaField
        label="Why does the card end here?"
        value={note}
        maxLength={500}
        onChange={(event) => setNote(event.target.value)}
      />
    </Dialog>
  );
};

/** Work is stopped: what to do, the clocks that run on meanwhile, and the two ways from here. */
export const StoppedStep = ({ running }: { readonly running: RunningCard }) => {
  const { card, state, person, record } = running;
  const [isEnding, setIsEnding] = useState(false);
  const nowMs = useServerNow();
  const time = runningClockOf({ card, state })?.time ?? null;
  const face = time && clockFace(time, nowMs);
  const stoppedAt = state.departures.findLast(({ kind }) => kind === 'work-stopped')?.at;
  const mayEnd = mayDecide(person);
  return (
    <>
      <CardFrame
        running={running}
        sentence="Work is stopped."
        state={
          <StateMark
            state="stop"
            text={`${state.stopped ? stopReasonWords[state.stopped] : ''}${stoppedAt ? ` at ${timeOfDay(stoppedAt)}` : ''}`}
            size="terminal"
          />
        }
        {...(face ? { number: face.clock, unit: face.unit } : {})}
        gauge={
          <p className="h-full content-center rounded-[26px] border-[3px] border-ink bg-panel p-8 text-[40px] leading-tight font-black text-pretty">
            {card.instruction.emergencyText}
          </p>
        }
        sub={mayEnd ? undefined : 'A caster or the owner can end the card.'}
        actions={
          <>
            {mayEnd ? (
              <Button size="terminal" onClick={() => setIsEnding(true)}>
                End this card
              </Button>
            ) : null}
            <HoldButton className="grow-2" onHeld={() => record({ type: 'resumed' })}>
              All clear. Hold to resume
            </HoldButton>
          </>
        }
      />
      {isEnding ? (
        <EndCard onClose={() => setIsEnding(false)} onEnd={(note) => record({ type: 'abandoned', note })} />
      ) : null}
    </>
  );
};
