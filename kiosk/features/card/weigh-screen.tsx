import type { StepOf } from '#shared/domain/instruction/instruction-step.ts';
import { limitWords } from './limit-words.ts';
import { MassEntry } from './mass-entry.tsx';
import { SkipStep, type StepProps } from './skip-step.tsx';
import { judgeHere } from './judge-here.ts';

/** A mass to write down; out of its limits it is questioned once, then taken and marked. */
export const WeighScreen = ({ running, step }: StepProps<StepOf<'weigh'>>) => (
  <MassEntry
    running={running}
    sentence={step.sentence}
    label="Mass"
    sub={limitWords(step.limitsG, running.write.mass)}
    mayBeNone
    actionWords={(mass) => `Take ${mass}`}
    remark={(massG) => {
      const verdict = judgeHere(running, step, { kind: 'weigh', massG });
      return verdict.kind === 'good' ? null : verdict.sentence;
    }}
    onMass={(massG) =>
      void running.record({ type: 'step-done', key: step.key, answer: { kind: 'weigh', massG } })
    }
    other={<SkipStep running={running} step={step} />}
  />
);
