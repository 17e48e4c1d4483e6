import { useState } from 'react';
import { flaskTemperatureAt } from '#shared/domain/pour-card/flask-cooling.ts';
import { lastReading } from '#shared/domain/pour-card/card-state.ts';
import { Button } from '#src/ui/button.tsx';
import { CountdownRing } from '#src/ui/countdown-ring.tsx';
import { FlaskPicture } from '#src/ui/flask-picture.tsx';
import { HoldButton } from '#src/ui/hold-button.tsx';
import { StateMark } from '#src/ui/state-mark.tsx';
import { TemperatureColumn } from '#src/ui/temperature-column.tsx';
import { pedalKey } from '#kiosk/lib/pedal-key.ts';
import { clockFace, runningClockOf } from '#kiosk/lib/running-clock.ts';
import { useServerNow } from '#kiosk/lib/server-clock.ts';
import { CardFrame } from './card-frame.tsx';
import { meltColumn } from './melt-column.ts';
import { MeltReading } from './melt-reading.tsx';
import { meltWords } from './melt-words.ts';
import { pourWords } from './pour-words.ts';
import type { RunningCard } from './use-running-card.ts';

const useMould = ({ card, state }: RunningCard, nowMs: number): number => {
  const { figures } = card.context;
  const { flaskOut } = state;
  if (!flaskOut) return figures.flaskHoldC;
  const mould = { startC: flaskOut.startC, roomC: figures.roomC, perSecond: figures.coolingPerSecond };
  return flaskTemperatureAt(mould, (nowMs - Date.parse(flaskOut.at)) / 1000);
};

interface PourGaugeProps {
  readonly running: RunningCard;
  readonly flaskC: number;
  readonly left: number;
  readonly isUrgent: boolean;
  readonly label: string;
}

const PourGauge = ({ running, flaskC, left, isUrgent, label }: PourGaugeProps) => {
  const { card, state, write } = running;
  return (
    <div className="flex h-full items-center justify-end gap-2">
      <CountdownRing left={left} label={label} urgent={isUrgent} className="min-w-0 flex-1 max-w-[300px]">
        <FlaskPicture
          temperatureC={flaskC}
          text={write.degrees(flaskC)}
          note={`${write.degreeUnit}, falling`}
          size="gauge"
        />
      </CountdownRing>
      <TemperatureColumn
        {...meltColumn(card.context.figures)}
        readingC={lastReading(state)?.temperatureC ?? null}
        format={write.degrees}
        unit={write.degreeUnit}
      />
    </div>
  );
};

/** The flask is out: the time left, the flask as it cools, the melt beside it, and the pour. */
export const PourStep = ({ running }: { readonly running: RunningCard }) => {
  const { card, state, write, record } = running;
  const { figures } = card.context;
  const [isTyping, setIsTyping] = useState(false);
  const nowMs = useServerNow(200);
  const flaskC = useMould(running, nowMs);
  const time = runningClockOf({ card, state })?.time;
  if (isTyping) return <MeltReading running={running} onDone={() => setIsTyping(false)} />;
  if (!time) return null;
  const face = clockFace(time, nowMs);
  const isPast = face.state === 'caution';
  const readingC = lastReading(state)?.temperatureC ?? null;
  const melt = readingC === null ? null : meltWords(readingC, figures, null, write);
  const words = pourWords(
    { isPast, flaskC, lowC: figures.flaskPourLowC, sentence: card.instruction.sentences.pour },
    write,
  );
  return (
    <CardFrame
      running={running}
      sentence={words.sentence}
      number={face.clock}
      unit={face.unit}
      state={
        <span className="grid gap-3">
          {face.isUrgent && !isPast ? (
            <StateMark state="caution" text="The last 30 s of the window" size="terminal" />
          ) : null}
          {melt && !isPast ? (
            <StateMark state={melt.state} text={melt.stateWords} size="terminal" />
          ) : (
            <StateMark
              state="caution"
              text={isPast ? 'Too late to pour' : 'No melt reading'}
              size="terminal"
            />
          )}
        </span>
      }
      sub={words.sub}
      gauge={
        <PourGauge
          running={running}
          flaskC={flaskC}
          left={face.left}
          isUrgent={face.isUrgent}
          label={`${face.clock} ${face.words}`}
        />
      }
      actions={
        <>
          <Button size="terminal" icon="thermometer" onClick={() => setIsTyping(true)}>
            Type a reading
          </Button>
          <HoldButton
            className="grow-2"
            pedalKey={pedalKey}
            kind={isPast ? 'plain' : 'main'}
            onHeld={() => record({ type: 'poured' })}
          >
            Poured. Hold, or tap the pedal ({pedalKey})
          </HoldButton>
        </>
      }
    />
  );
};
