import type { InstructionStep } from '#shared/domain/instruction/instruction-step.ts';
import type { WorkInstruction } from '#shared/domain/instruction/work-instruction.ts';
import { cardStepNames, cardSteps, type CardStep } from '#shared/domain/pour-card/card-step.ts';
import type { Units } from '#shared/lib/units.ts';
import { SafetySign } from '#src/ui/safety-sign.tsx';
import { useStudio } from '#src/desk/parts/use-studio.ts';
import { askWords, conditionWords, kindWords } from './step-words.ts';

/** What a step is beside its sentence, in one line: its kind, what it asks, where it is asked, and whether it may be skipped. */
export const stepLine = (step: InstructionStep, units: Units): string =>
  [
    kindWords[step.kind].name,
    askWords(step, units),
    conditionWords(step.when),
    step.maySkip && step.kind !== 'say' ? 'a caster may skip it' : '',
  ]
    .filter(Boolean)
    .join(' · ');

const Step = ({ step, number }: { readonly step: InstructionStep; readonly number: number }) => {
  const { units } = useStudio();
  return (
    <li className="grid grid-cols-[2rem_minmax(0,1fr)_auto] items-center gap-3 border-t-2 border-line py-2">
      <span className="self-start text-right font-extrabold text-soft">{number}</span>
      <div className="min-w-0">
        <p className="font-extrabold">{step.sentence}</p>
        <p className="text-[15px] text-soft">{stepLine(step, units)}</p>
      </div>
      {step.kind === 'check' && step.sign ? (
        <SafetySign sign={step.sign} className="size-11 print:size-9" />
      ) : null}
    </li>
  );
};

const Part = ({ part, instruction }: { readonly part: CardStep; readonly instruction: WorkInstruction }) => {
  const { steps, sentences } = instruction;
  return (
    <section aria-labelledby={`part-${part}`} className="break-inside-avoid">
      <h3 id={`part-${part}`} className="text-[19px] font-black">
        {cardStepNames[part]}
      </h3>
      <ol className="mt-1">
        {steps.map((step, index) =>
          step.before === part ? <Step key={step.key} step={step} number={index + 1} /> : null,
        )}
      </ol>
      <p className="border-t-2 border-line py-2 pl-11 text-lg font-black">“{sentences[part]}”</p>
    </section>
  );
};

/** A work instruction to be read, on the screen and on paper: each part of the card with the steps before it. */
export const InstructionSheet = ({ instruction }: { readonly instruction: WorkInstruction }) => (
  <div className="grid gap-7">
    {cardSteps.map((part) => (
      <Part key={part} part={part} instruction={instruction} />
    ))}
    <section aria-labelledby="part-stop" className="break-inside-avoid">
      <h3 id="part-stop" className="text-[19px] font-black">
        When work is stopped
      </h3>
      <p className="mt-1 border-y-[3px] border-ember py-3 text-lg font-black whitespace-pre-line">
        {instruction.emergencyText}
      </p>
    </section>
    <p className="text-soft">{instruction.deference}</p>
  </div>
);
