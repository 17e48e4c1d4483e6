import type { StepOf } from '#shared/domain/instruction/instruction-step.ts';
import { formatClock } from '#shared/lib/units.ts';
import { Button } from '#src/ui/button.tsx';
import { CountdownRing } from '#src/ui/countdown-ring.tsx';
import { HoldButton } from '#src/ui/hold-button.tsx';
import { StateMark } from '#src/ui/state-mark.tsx';
import { CardFrame } from './card-frame.tsx';
import { PassTime } from './pass-time.tsx';
import { SkipStep, type StepProps } from './skip-step.tsx';
import { useCardClock } from './use-card-clock.ts';

/** Time that must pass since the card came to this part; it runs by the server's clock, whatever happens to this page. */
export const WaitScreen = ({ running, step }: StepProps<StepOf<'wait'>>) => {
  const face = useCardClock(running);
  if (!face) return null;
  const isOver = face.state === 'ready';
  return (
    <CardFrame
      running={running}
      sentence={step.sentence}
      number={face.clock}
      unit={face.unit}
      state={<StateMark state={face.state} text={isOver ? 'The wait is over' : 'Wait'} size="terminal" />}
      sub={`${formatClock(step.seconds)} in all. It runs on while the terminal is locked.`}
      gauge={
        <div className="grid h-full place-items-center">
          <CountdownRing left={face.left} label={`${face.clock} ${face.words}`}>
            <span className="text-[84px] font-black">{face.clock}</span>
          </CountdownRing>
        </div>
      }
      actions={
        <>
          <SkipStep running={running} step={step} />
          {isOver ? null : <PassTime running={running} seconds={step.seconds} />}
          {isOver ? (
            <HoldButton
              className="grow-2"
              onHeld={() => running.record({ type: 'step-done', key: step.key, answer: { kind: 'wait' } })}
            >
              Hold to go on
            </HoldButton>
          ) : (
            <Button kind="blocked" size="terminal" className="grow-2">
              It goes on in {face.clock}
            </Button>
          )}
        </>
      }
    />
  );
};
