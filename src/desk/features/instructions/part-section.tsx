import { useState } from 'react';
import type { UseFormRegisterReturn } from 'react-hook-form';
import { stepKinds, type StepKind } from '#shared/domain/instruction/instruction-step.ts';
import { cardStepNames, type CardStep } from '#shared/domain/pour-card/card-step.ts';
import { Button } from '#src/ui/button.tsx';
import { controlClass } from '#src/ui/control-class.ts';
import { TextField } from '#src/ui/text-field.tsx';
import { partsWithSteps } from './arrange-steps.ts';
import { faultsOfFields, type ReadInstruction } from './instruction-values.ts';
import { StepCard } from './step-card.tsx';
import type { StepValues } from './step-values.ts';
import { kindWords } from './step-words.ts';
import type { Arranging } from './use-arranging.ts';

const kindsBefore = (part: CardStep): readonly StepKind[] =>
  part === 'quench'
    ? ['say', 'check']
    : part === 'guard'
      ? stepKinds.filter((kind) => kind !== 'wait')
      : stepKinds;

const AddStep = ({ part, arranging }: { readonly part: CardStep; readonly arranging: Arranging }) => {
  const [kind, setKind] = useState<StepKind>('check');
  const kinds = kindsBefore(part);
  return (
    <p className="flex flex-wrap items-center gap-3">
      <select
        aria-label={`Kind of the new step before ${cardStepNames[part]}`}
        value={kind}
        onChange={({ currentTarget }) =>
          setKind(kinds.find((each) => each === currentTarget.value) ?? 'check')
        }
        className={`${controlClass} w-44!`}
      >
        {kinds.map((each) => (
          <option key={each} value={each}>
            {kindWords[each].name}
          </option>
        ))}
      </select>
      <Button icon="plus" onClick={() => arranging.add(kind, part)}>
        Add a step<span className="sr-only"> before {cardStepNames[part]}</span>
      </Button>
    </p>
  );
};

/** Props of {@link PartSection}. */
export interface PartSectionProps {
  readonly part: CardStep;
  readonly steps: readonly StepValues[];
  readonly read: ReadInstruction;
  readonly arranging: Arranging;
  /** The field of the part's own sentence. */
  readonly sentence: UseFormRegisterReturn;
}

/** One part of the card: the steps that come before it, in order, and the sentence it shows itself. */
export const PartSection = ({ part, steps, read, arranging, sentence }: PartSectionProps) => {
  const name = cardStepNames[part];
  const own = steps.flatMap((step, index) => (step.before === part ? [{ step, index }] : []));
  return (
    <section aria-labelledby={`edit-${part}`} className="grid gap-3">
      <h2 id={`edit-${part}`} className="border-b-[3px] border-ink pb-1 text-[21px] font-black">
        {name}
      </h2>
      <ol className="grid gap-2.5">
        {own.map(({ step, index }) => (
          <StepCard
            key={step.key}
            step={step}
            index={index}
            fieldFaults={faultsOfFields(read, index)}
            faults={read.stepFaults.get(step.key) ?? []}
            arranging={arranging}
          />
        ))}
      </ol>
      {partsWithSteps.includes(part) ? (
        <AddStep part={part} arranging={arranging} />
      ) : (
        <p className="text-soft">
          Nothing stands between flask out and pour: the mould cools. What is to be checked comes before flask
          out.
        </p>
      )}
      <TextField
        label={`What the card says at “${name}”`}
        maxLength={120}
        error={read.fieldFaults.get(`sentences.${part}`)}
        {...sentence}
      />
    </section>
  );
};
