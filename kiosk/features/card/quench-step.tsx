import { useState } from 'react';
import { openVariances } from '#shared/domain/pour-card/apply-variance.ts';
import type { QuenchRule } from '#shared/domain/alloy/quench-rule.ts';
import { Button } from '#src/ui/button.tsx';
import { CountdownRing } from '#src/ui/countdown-ring.tsx';
import { FigureBasis } from '#src/ui/figure-basis.tsx';
import { FlaskPicture } from '#src/ui/flask-picture.tsx';
import { HoldButton } from '#src/ui/hold-button.tsx';
import { StateMark } from '#src/ui/state-mark.tsx';
import { timeOfDay } from '#src/lib/formats.ts';
import { clockFace, runningClockOf, type ClockFace } from '#kiosk/lib/running-clock.ts';
import { useServerNow } from '#kiosk/lib/server-clock.ts';
import { CardFrame } from './card-frame.tsx';
import { quenchWords, writtenBasis } from './card-figures-grid.tsx';
import { PassTime } from './pass-time.tsx';
import { quenchSentence } from './quench-sentence.ts';
import type { RunningCard } from './use-running-card.ts';
import { VarianceScreen } from './variance-screen.tsx';

const markWords = (face: ClockFace, { latestS }: QuenchRule, opensAt: string): string => {
  if (face.state === 'wait') return `Wait until ${opensAt}`;
  if (face.state === 'caution') return 'Past the latest quench';
  return latestS === null ? 'Ready for the quench' : 'Ready, and pressing';
};

interface ActionsProps {
  readonly running: RunningCard;
  readonly onReasons: () => void;
  readonly isEarly: boolean;
  readonly opensAt: string;
  readonly onQuenched: () => void;
}

/** While the flask stands there is time to say why something went otherwise; once it may go under there is none. */
const QuenchActions = ({ running, isEarly, opensAt, onReasons, onQuenched }: ActionsProps) => {
  const reasons = openVariances(running.state, running.card.context).length;
  return isEarly ? (
    <>
      {reasons > 0 ? (
        <Button size="terminal" icon="note" onClick={onReasons}>
          {reasons === 1 ? 'Give the reason' : `Give ${reasons} reasons`}
        </Button>
      ) : null}
      <PassTime running={running} seconds={running.card.context.figures.quench.earliestS} />
      <HoldButton kind="plain" onHeld={onQuenched}>
        Quenched already
      </HoldButton>
      <Button kind="blocked" size="terminal" className="grow-2">
        The quench opens at {opensAt}
      </Button>
    </>
  ) : (
    <HoldButton onHeld={onQuenched}>Quenched. Hold</HoldButton>
  );
};

/** The flask stands until its alloy's rule lets it into the water, and where the rule has an end, not beyond. */
export const QuenchStep = ({ running }: { readonly running: RunningCard }) => {
  const { card, state, write, record } = running;
  const { quench, basis } = card.context.figures;
  const nowMs = useServerNow(500);
  const [givesReasons, setGivesReasons] = useState(false);
  const time = runningClockOf({ card, state })?.time;
  if (time?.kind !== 'quench') return null;
  const face = clockFace(time, nowMs);
  const opensAt = timeOfDay(new Date(time.earliestMs).toISOString());
  const isEarly = face.state === 'wait';
  if (givesReasons && isEarly && openVariances(state, card.context).length > 0)
    return <VarianceScreen running={running} onLater={() => setGivesReasons(false)} />;
  return (
    <CardFrame
      running={running}
      sentence={quenchSentence(face, quench, card.instruction.sentences.quench)}
      number={face.clock}
      unit={face.unit}
      state={<StateMark state={face.state} text={markWords(face, quench, opensAt)} size="terminal" />}
      sub={quench.why}
      gauge={
        <div className="grid h-full grid-rows-[minmax(0,1fr)_auto] justify-items-center gap-3">
          <CountdownRing
            left={face.left}
            label={`${face.clock} ${face.words}`}
            urgent={face.isUrgent}
            className="h-full max-w-full"
          >
            <FlaskPicture temperatureC={null} note="poured" size="gauge" />
          </CountdownRing>
          <FigureBasis
            label="Quench"
            value={quenchWords(quench)}
            basis={writtenBasis(basis.quench, write.units)}
            size="terminal"
          />
        </div>
      }
      actions={
        <QuenchActions
          running={running}
          isEarly={isEarly}
          opensAt={opensAt}
          onReasons={() => setGivesReasons(true)}
          onQuenched={() => record({ type: 'quenched' })}
        />
      }
    />
  );
};
