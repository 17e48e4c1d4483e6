import type { ComponentType } from 'react';
import { openSteps } from '#shared/domain/pour-card/apply-steps.ts';
import type { CardStep } from '#shared/domain/pour-card/card-step.ts';
import { ChargeStep } from './charge-step.tsx';
import { CheckRun } from './check-run.tsx';
import { CloseStep } from './close-step.tsx';
import { DoneStep } from './done-step.tsx';
import { FlaskOutStep } from './flask-out-step.tsx';
import { MeltStep } from './melt-step.tsx';
import { isWithheld, PartWithheld } from './part-withheld.tsx';
import { PourStep } from './pour-step.tsx';
import { QuenchStep } from './quench-step.tsx';
import { StepScreen } from './step-screen.tsx';
import { StoppedStep } from './stopped-step.tsx';
import type { RunningCard } from './use-running-card.ts';
import { VarianceScreen } from './variance-screen.tsx';

const parts: Readonly<Record<CardStep | 'done' | 'abandoned', ComponentType<{ running: RunningCard }>>> = {
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

/** A card at the step where it stands: work that is stopped, what the instruction asks first, then the part itself. */
export const CardWalk = ({ running }: { readonly running: RunningCard }) => {
  const { state, card } = running;
  if (state.stopped) return <StoppedStep running={running} />;
  if (isWithheld(state)) return <PartWithheld key={state.step} running={running} />;
  const open = openSteps(state, card.context);
  const [step] = open;
  if (step) return <StepScreen key={step.key} running={running} step={step} />;
  if (state.step === 'close' && state.closing) return <VarianceScreen running={running} />;
  const Part = parts[state.step];
  return <Part key={state.step} running={running} />;
};
