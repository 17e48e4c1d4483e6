import { useState } from 'react';
import type { StepOf } from '#shared/domain/instruction/instruction-step.ts';
import { Button } from '#src/ui/button.tsx';
import { StateMark } from '#src/ui/state-mark.tsx';
import { Choice } from '#kiosk/lib/choice.tsx';
import { CardFrame } from './card-frame.tsx';
import { SkipStep, type StepProps } from './skip-step.tsx';

/** One of several answers; some of them are a variance, which is said before it is taken. */
export const ChooseScreen = ({ running, step }: StepProps<StepOf<'choose'>>) => {
  const [chosen, setChosen] = useState<string | null>(null);
  const isVariance = step.options.some(({ words, isVariance: is }) => is && words === chosen);
  const take = (): void => {
    if (chosen !== null)
      running.record({ type: 'step-done', key: step.key, answer: { kind: 'choose', option: chosen } });
  };
  return (
    <CardFrame
      running={running}
      sentence={step.sentence}
      state={
        isVariance ? (
          <StateMark state="caution" text="A departure: a reason is asked later" size="terminal" />
        ) : undefined
      }
      gauge={
        <div role="group" aria-label="Answers" className="grid auto-rows-[minmax(88px,1fr)] gap-4">
          {step.options.map(({ words }) => (
            <Choice
              key={words}
              isChosen={words === chosen}
              onChoose={() => setChosen(words)}
              className="px-6 text-left text-[28px] leading-tight"
            >
              {words}
            </Choice>
          ))}
        </div>
      }
      actions={
        <>
          <SkipStep running={running} step={step} />
          <Button
            kind={chosen === null ? 'blocked' : 'main'}
            size="terminal"
            className="grow-2"
            onClick={take}
          >
            {chosen === null ? 'Choose an answer' : `Take “${chosen}”`}
          </Button>
        </>
      }
    />
  );
};
