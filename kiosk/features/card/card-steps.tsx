import { useEffect, type ComponentType } from 'react';
import type { CardStep } from '#shared/domain/pour-card/card-step.ts';
import { MessageScreen } from '#kiosk/lib/message-screen.tsx';
import { firstName } from '#kiosk/lib/presence.ts';
import { rememberClock } from '#kiosk/lib/remembered-clocks.ts';
import { runningClockOf } from '#kiosk/lib/running-clock.ts';
import { openSteps } from '#shared/domain/pour-card/apply-steps.ts';
import { ChargeStep } from './charge-step.tsx';
import { CheckRun } from './check-run.tsx';
import { CloseStep } from './close-step.tsx';
import { DoneStep } from './done-step.tsx';
import { FlaskOutStep } from './flask-out-step.tsx';
import { MeltStep } from './melt-step.tsx';
import { PourStep } from './pour-step.tsx';
import { QuenchStep } from './quench-step.tsx';
import { StoppedStep } from './stopped-step.tsx';
import { CardMenu } from './card-menu.tsx';
import { useCarryOn } from './use-carry-on.ts';
import { useRunningCard, type RunningCard } from './use-running-card.ts';

const steps: Readonly<Record<CardStep | 'done' | 'abandoned', ComponentType<{ running: RunningCard }>>> = {
  guard: CheckRun,
  charge: ChargeStep,
  melt: MeltStep,
  'flask-out': FlaskOutStep,
  pour: PourStep,
  quench: QuenchStep,
  close: CloseStep,
  done: DoneStep,
  abandoned: DoneStep,
};

const useRememberedHere = ({ card, state }: RunningCard): void => {
  const clock = JSON.stringify(runningClockOf({ card, state }));
  const castingId = card.casting.id;
  useEffect(
    () => rememberClock(castingId, JSON.parse(clock) as ReturnType<typeof runningClockOf>),
    [castingId, clock],
  );
};

/** A running card at the step where it stands. */
export const CardSteps = ({ card }: Pick<RunningCard, 'card'>) => {
  const running = useRunningCard(card);
  useRememberedHere(running);
  useCarryOn(running);
  if (running.waitsFor) {
    const name = firstName(running.waitsFor);
    return (
      <MessageScreen
        state="wait"
        mark="Records wait"
        sentence={`${name} has records on this card that are not written yet. ${name} signs in first.`}
        actions={<CardMenu card={card} write={running.write} />}
      />
    );
  }
  const open = openSteps(running.state, card.context).length;
  const Step = running.state.stopped ? StoppedStep : open > 0 ? CheckRun : steps[running.state.step];
  return <Step key={`${running.state.step} ${open}`} running={running} />;
};
