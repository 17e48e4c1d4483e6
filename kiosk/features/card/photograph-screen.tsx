import type { StepOf } from '#shared/domain/instruction/instruction-step.ts';
import { AskPhotograph } from './ask-photograph.tsx';
import { CardFrame } from './card-frame.tsx';
import { SkipStep, type StepProps } from './skip-step.tsx';

/** A photograph that the instruction asks for. */
export const PhotographScreen = ({ running, step }: StepProps<StepOf<'photograph'>>) => (
  <AskPhotograph
    back={<SkipStep running={running} step={step} />}
    onKept={async (picture) => {
      const photographId = await running.keepPhotograph(picture);
      running.record({ type: 'step-done', key: step.key, answer: { kind: 'photograph', photographId } });
    }}
  >
    {(parts) => <CardFrame running={running} sentence={step.sentence} {...parts} />}
  </AskPhotograph>
);
