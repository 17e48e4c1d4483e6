import { useFormContext } from 'react-hook-form';
import { SelectField } from '#src/ui/select-field.tsx';
import { TextAreaField } from '#src/ui/text-area-field.tsx';
import { TextField } from '#src/ui/text-field.tsx';
import type { AlloyFormValues } from './alloy-form-values.ts';

const media = [
  { value: 'water', label: 'Water' },
  { value: 'warm water', label: 'Warm water' },
  { value: 'air', label: 'Air: left to cool' },
] as const;

/** The quench rule of an alloy, with why and whose rule it is. */
export const QuenchFields = () => {
  const { register, formState } = useFormContext<AlloyFormValues>();
  const errors = formState.errors.quench;
  return (
    <fieldset className="grid gap-4">
      <legend className="pb-1 text-[19px] font-black">Quench</legend>
      <div className="grid items-start gap-4 sm:grid-cols-3">
        <TextField
          label="Earliest"
          unit="min"
          inputMode="decimal"
          autoComplete="off"
          error={errors?.earliest?.message}
          {...register('quench.earliest')}
        />
        <TextField
          label="Latest, or empty"
          unit="min"
          inputMode="decimal"
          autoComplete="off"
          error={errors?.latest?.message}
          {...register('quench.latest')}
        />
        <SelectField
          label="Quench in"
          options={media}
          error={errors?.medium?.message}
          {...register('quench.medium')}
        />
      </div>
      <TextAreaField
        label="Why then"
        hint="One sentence for the person with the tongs."
        rows={2}
        error={errors?.why?.message}
        {...register('quench.why')}
      />
      <TextField
        label="Source of the quench rule"
        hint="The maker’s sheet, a trial of your own, or common practice."
        error={errors?.source?.message}
        {...register('quench.source')}
      />
    </fieldset>
  );
};
