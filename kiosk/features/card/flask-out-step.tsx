import { useState } from 'react';
import { lastReading } from '#shared/domain/pour-card/card-state.ts';
import { formatClock } from '#shared/lib/units.ts';
import { Button } from '#src/ui/button.tsx';
import { FlaskPicture } from '#src/ui/flask-picture.tsx';
import { HoldButton } from '#src/ui/hold-button.tsx';
import { StateMark } from '#src/ui/state-mark.tsx';
import { pourWindowS } from '#kiosk/lib/running-clock.ts';
import { useDraft } from '#kiosk/lib/use-draft.ts';
import { CardFrame } from './card-frame.tsx';
import { judgeFurnace } from './judge-furnace.ts';
import { MeltReading } from './melt-reading.tsx';
import { meltWords } from './melt-words.ts';
import { ReadingEntry } from './reading-entry.tsx';
import type { RunningCard } from './use-running-card.ts';

const MeltMark = ({ running }: { readonly running: RunningCard }) => {
  const readingC = lastReading(running.state)?.temperatureC;
  if (readingC === undefined) return null;
  const { state } = meltWords(readingC, running.card.context.figures, null, running.write);
  const words = state === 'ready' ? 'in the window' : 'out of the window';
  return (
    <StateMark state={state} text={`Melt ${running.write.temperature(readingC)}, ${words}`} size="terminal" />
  );
};

/** The flask leaves its furnace; from that moment a clock runs. */
export const FlaskOutStep = ({ running }: { readonly running: RunningCard }) => {
  const { card, write, record } = running;
  const { figures, limits, units } = card.context;
  const [typing, setTyping] = useState<'melt' | 'furnace' | null>(null);
  const [furnaceC, setFurnaceC] = useDraft<number | null>(`furnace.${card.melt.id}`, null);
  if (typing === 'melt') return <MeltReading running={running} onDone={() => setTyping(null)} />;
  if (typing === 'furnace') {
    return (
      <ReadingEntry
        running={running}
        sentence="What does the flask furnace show?"
        label="Furnace temperature"
        judge={(typed) => judgeFurnace(typed, units.temperature, figures.flaskHoldC, limits.furnaceMaxC)}
        onReading={(celsius) => {
          setFurnaceC(celsius);
          setTyping(null);
        }}
        onCancel={() => setTyping(null)}
      />
    );
  }
  const startC = furnaceC ?? figures.flaskHoldC;
  const clock = formatClock(pourWindowS(startC, card.context));
  return (
    <CardFrame
      running={running}
      sentence={card.instruction.sentences['flask-out']}
      number={write.degrees(figures.flaskHoldC)}
      unit={write.degreeUnit}
      state={<MeltMark running={running} />}
      sub={`A clock of ${clock} starts as the flask leaves its furnace. Hold the button at that moment.`}
      gauge={
        <FlaskPicture
          temperatureC={startC}
          text={write.degrees(startC)}
          note={write.degreeUnit}
          label={`Flask at ${write.temperature(startC)}`}
          size="gauge"
        />
      }
      actions={
        <>
          <Button size="terminal" onClick={() => setTyping('melt')}>
            Type a reading
          </Button>
          <Button size="terminal" onClick={() => setTyping('furnace')}>
            {furnaceC === null ? 'Furnace shows …' : `Furnace shows ${write.temperature(furnaceC)}`}
          </Button>
          <HoldButton className="grow-2" onHeld={() => record({ type: 'flask-out', furnaceC })}>
            Flask is out. Hold
          </HoldButton>
        </>
      }
    />
  );
};
