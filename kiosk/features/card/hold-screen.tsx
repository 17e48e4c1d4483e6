import type { StepOf } from '#shared/domain/instruction/instruction-step.ts';
import { HoldButton } from '#src/ui/hold-button.tsx';
import { CardFrame } from './card-frame.tsx';
import { SkipStep, type StepProps } from './skip-step.tsx';

/** Something to do, told by holding the button once it is done. */
export const HoldScreen = ({ running, step }: StepProps<StepOf<'hold-to-act'>>) => (
  <CardFrame
    running={running}
    sentence={step.sentence}
    gauge={
      <p className="h-full content-center rounded-[26px] border-[3px] border-ink bg-panel p-8 text-[44px] leading-tight font-black text-pretty">
        {step.act}
      </p>
    }
    actions={
      <>
        <SkipStep running={running} step={step} />
        <HoldButton
          className="grow-2"
          onHeld={() => running.record({ type: 'step-done', key: step.key, answer: { kind: 'hold-to-act' } })}
        >
          Done. Hold
        </HoldButton>
      </>
    }
  />
);
