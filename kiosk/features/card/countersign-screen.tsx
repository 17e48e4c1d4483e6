import type { StepOf } from '#shared/domain/instruction/instruction-step.ts';
import { StateMark } from '#src/ui/state-mark.tsx';
import { AskSign } from './ask-sign.tsx';
import { SkipStep, type StepProps } from './skip-step.tsx';

/** A second person looks and signs before the card goes on. */
export const CountersignScreen = ({ running, step }: StepProps<StepOf<'countersign'>>) => (
  <AskSign
    running={running}
    sentence={step.sentence}
    state={<StateMark state="wait" text="Waits for a sign" size="terminal" />}
    back={<SkipStep running={running} step={step} />}
    onSigned={(by) =>
      void running.record({ type: 'step-done', key: step.key, answer: { kind: 'countersign', by } })
    }
  />
);
