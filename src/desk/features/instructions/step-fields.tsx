import { alloyFamilies, alloyFamilyNames } from '#shared/domain/alloy/alloy-family.ts';
import { castingMethodNames, castingMethods } from '#shared/domain/casting/casting-method.ts';
import { hazards, safetySigns, stepKinds, workerRoles } from '#shared/domain/instruction/instruction-step.ts';
import { cardStepNames, type CardStep } from '#shared/domain/pour-card/card-step.ts';
import { CheckField } from '#src/ui/check-field.tsx';
import { SelectField } from '#src/ui/select-field.tsx';
import { TextField } from '#src/ui/text-field.tsx';
import { useStudio } from '#src/desk/parts/use-studio.ts';
import { AnswerFields } from './answer-fields.tsx';
import { partsWithSteps } from './arrange-steps.ts';
import { ChipChoice } from '#src/desk/parts/chip-choice.tsx';
import type { StepValues } from './step-values.ts';
import { hazardNames, kindWords, roleNames } from './step-words.ts';

/** Props of {@link StepFields}. */
export interface StepFieldsProps {
  readonly step: StepValues;
  /** Sentences by field of the step. */
  readonly faults: ReadonlyMap<string, string>;
  readonly onChange: (change: Partial<StepValues>) => void;
  readonly onTakeToPart: (part: CardStep) => void;
}

type Part = Omit<StepFieldsProps, 'onTakeToPart'>;

const kindOptions = stepKinds.map((kind) => ({ value: kind, label: kindWords[kind].name }));
const partOptions = partsWithSteps.map((part) => ({ value: part, label: cardStepNames[part] }));
const signOptions = [
  { value: '', label: 'No sign' },
  ...safetySigns.map((sign) => ({ value: sign, label: sign.replaceAll('-', ' ') })),
];

const oneOf = <Value extends string>(values: readonly Value[], text: string): Value | undefined =>
  values.find((value) => value === text);

const LimitFields = ({ step, faults, onChange }: Part) => {
  const { units } = useStudio();
  const unit = step.kind === 'weigh' ? units.mass : `°${units.temperature}`;
  return (
    <div className="grid gap-4 sm:grid-cols-2">
      {(['low', 'high'] as const).map((end) => (
        <TextField
          key={end}
          label={end === 'low' ? 'At least' : 'At most'}
          hint="Empty: no limit."
          unit={unit}
          inputMode="decimal"
          autoComplete="off"
          value={step[end]}
          error={faults.get(end)}
          onChange={({ currentTarget }) => onChange({ [end]: currentTarget.value })}
        />
      ))}
    </div>
  );
};

const OwnFields = (props: Part) => {
  const { step, faults, onChange } = props;
  switch (step.kind) {
    case 'check':
      return (
        <SelectField
          label="Safety sign"
          options={signOptions}
          value={step.sign}
          onChange={({ currentTarget }) => onChange({ sign: oneOf(safetySigns, currentTarget.value) ?? '' })}
        />
      );
    case 'weigh':
    case 'read':
      return <LimitFields {...props} />;
    case 'wait':
      return (
        <TextField
          label="Wait at least"
          unit="s"
          inputMode="numeric"
          autoComplete="off"
          value={step.seconds}
          error={faults.get('seconds')}
          onChange={({ currentTarget }) => onChange({ seconds: currentTarget.value })}
        />
      );
    case 'choose':
      return (
        <AnswerFields options={step.options} faults={faults} onChange={(options) => onChange({ options })} />
      );
    case 'hold-to-act':
      return (
        <TextField
          label="Words on the button"
          hint="What is done, such as “Gas on”."
          maxLength={40}
          value={step.act}
          error={faults.get('act')}
          onChange={({ currentTarget }) => onChange({ act: currentTarget.value })}
        />
      );
    default:
      return null;
  }
};

const ConditionFields = ({ step, onChange }: Omit<Part, 'faults'>) => (
  <div className="grid gap-2 border-y-2 border-line py-3">
    <p className="text-[15px] text-soft">
      Where nothing is chosen, the step is asked everywhere and of everyone.
    </p>
    <ChipChoice
      legend="Only in casting by"
      values={castingMethods}
      names={castingMethodNames}
      chosen={step.methods}
      onChange={(methods) => onChange({ methods })}
    />
    <ChipChoice
      legend="Only for alloys of"
      values={alloyFamilies}
      names={alloyFamilyNames}
      chosen={step.families}
      onChange={(families) => onChange({ families })}
    />
    <ChipChoice
      legend="Only with"
      values={hazards}
      names={hazardNames}
      chosen={step.hazards}
      onChange={(chosen) => onChange({ hazards: chosen })}
    />
    <ChipChoice
      legend="Only asked of"
      values={workerRoles}
      names={roleNames}
      chosen={step.roles}
      onChange={(roles) => onChange({ roles })}
    />
  </div>
);

/** The fields of one step: its kind and part, its sentence, what its kind asks for, and where it is asked. */
export const StepFields = ({ step, faults, onChange, onTakeToPart }: StepFieldsProps) => (
  <div className="grid gap-4 border-t-2 border-line px-4 py-4">
    <TextField
      label="Sentence"
      autoFocus={step.sentence === ''}
      maxLength={200}
      value={step.sentence}
      error={faults.get('sentence')}
      onChange={({ currentTarget }) => onChange({ sentence: currentTarget.value })}
    />
    <div className="grid items-end gap-4 sm:grid-cols-2">
      <SelectField
        label="Kind"
        hint={kindWords[step.kind].about}
        options={kindOptions}
        value={step.kind}
        onChange={({ currentTarget }) =>
          onChange({ kind: oneOf(stepKinds, currentTarget.value) ?? step.kind })
        }
      />
      <SelectField
        label="Before"
        hint="The part of the card it is asked before."
        options={partOptions}
        value={step.before}
        onChange={({ currentTarget }) => {
          const part = oneOf(partsWithSteps, currentTarget.value);
          if (part) onTakeToPart(part);
        }}
      />
    </div>
    <OwnFields step={step} faults={faults} onChange={onChange} />
    <ConditionFields step={step} onChange={onChange} />
    {step.kind === 'say' ? null : (
      <CheckField
        label="A caster may skip it"
        hint="With a reason, as a variance. An apprentice never may."
        checked={step.maySkip}
        onChange={({ currentTarget }) => onChange({ maySkip: currentTarget.checked })}
      />
    )}
  </div>
);
