import { useFormContext, useWatch } from 'react-hook-form';
import type { TemperatureUnit } from '#shared/lib/units.ts';
import { CheckField } from '#src/ui/check-field.tsx';
import { TextField } from '#src/ui/text-field.tsx';
import type { AlloyFormValues } from './alloy-form-values.ts';

/** A measured range with its source, for an alloy that the phase model does not hold. */
export const MeasuredFields = ({ unit }: { readonly unit: TemperatureUnit }) => {
  const { register, control, formState } = useFormContext<AlloyFormValues>();
  const isMeasured = useWatch({ control, name: 'isMeasured' });
  const errors = formState.errors.measured;
  const number = { inputMode: 'decimal', autoComplete: 'off' } as const;
  return (
    <fieldset className="grid gap-4">
      <legend className="pb-1 text-[19px] font-black">Measured range</legend>
      <CheckField
        label="Enter a measured range"
        hint="For an alloy the model does not hold, such as a white gold. Where the model holds it, the computed figures are used."
        error={formState.errors.isMeasured?.message}
        {...register('isMeasured')}
      />
      {isMeasured ? (
        <>
          <div className="grid items-start gap-4 sm:grid-cols-3">
            <TextField
              label="Measured solidus"
              unit={`°${unit}`}
              {...number}
              error={errors?.solidus?.message}
              {...register('measured.solidus')}
            />
            <TextField
              label="Measured liquidus"
              unit={`°${unit}`}
              {...number}
              error={errors?.liquidus?.message}
              {...register('measured.liquidus')}
            />
            <TextField
              label="Measured density"
              unit="g/cm³"
              {...number}
              error={errors?.density?.message}
              {...register('measured.density')}
            />
          </div>
          <TextField
            label="Source of the measured range"
            hint="Whose measurement it is, and where it is printed."
            error={errors?.source?.message}
            {...register('measured.source')}
          />
        </>
      ) : null}
    </fieldset>
  );
};
