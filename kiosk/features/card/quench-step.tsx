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
import { quenchSentence } from './quench-sentence.ts';
import type { RunningCard } from './use-running-card.ts';

const markWords = (face: ClockFace, { latestS }: QuenchRule, opensAt: string): string => {
  if (face.state === 'wait') return `Wait until ${opensAt}`;
  if (face.state === 'caution') return 'Past the latest quench';
  return latestS === null ? 'Ready for the quench' : 'Ready, and pressing';
};

interface ActionsProps {
  readonly isEarly: boolean;
  readonly opensAt: string;
  readonly onQuenched: () => void;
}

const QuenchActions = ({ isEarly, opensAt, onQuenched }: ActionsProps) =>
  isEarly ? (
    <>
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

/** The flask stands until its alloy's rule lets it into the water, and where the rule has an end, not beyond. */
export const QuenchStep = ({ running }: { readonly running: RunningCard }) => {
  const { card, state, write, record } = running;
  const { quench, basis } = card.context.figures;
  const nowMs = useServerNow(500);
  const time = runningClockOf({ card, state })?.time;
  if (time?.kind !== 'quench') return null;
  const face = clockFace(time, nowMs);
  const opensAt = timeOfDay(new Date(time.earliestMs).toISOString());
  const isEarly = face.state === 'wait';
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
        <QuenchActions isEarly={isEarly} opensAt={opensAt} onQuenched={() => record({ type: 'quenched' })} />
      }
    />
  );
};
