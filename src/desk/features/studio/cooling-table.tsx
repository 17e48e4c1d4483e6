import { useFieldArray, type Control } from 'react-hook-form';
import type { UpdateStudioRequest } from '#shared/contracts/studio.ts';
import { Button } from '#src/ui/button.tsx';
import { FieldError } from '#src/ui/field.tsx';
import { faultAt, type FormPart } from './form-parts.ts';
import { NumberField } from './number-field.tsx';
import type { StudioValues } from './studio-values.ts';

/** Props of {@link CoolingTable}. */
export interface CoolingTableProps extends FormPart {
  readonly control: Control<StudioValues, unknown, UpdateStudioRequest>;
}

/** How fast the mould of each flask size cools; sizes may be added and taken away. */
export const CoolingTable = ({ control, register, errors }: CoolingTableProps) => {
  const { fields, append, remove } = useFieldArray({ control, name: 'processTables.flaskCooling' });
  return (
    <div className="grid gap-4">
      <ul className="grid gap-4">
        {fields.map(({ id }, index) => (
          <li key={id} className="grid items-start gap-4 sm:grid-cols-[1fr_1fr_auto]">
            <NumberField
              path={`processTables.flaskCooling.${index}.diameterMm`}
              label="Flask diameter"
              unit="mm"
              register={register}
              errors={errors}
            />
            <NumberField
              path={`processTables.flaskCooling.${index}.perSecond`}
              label="Cooling rate"
              unit="per minute"
              register={register}
              errors={errors}
            />
            <Button kind="quiet" className="sm:mt-[30px]" onClick={() => remove(index)}>
              Take away<span className="sr-only"> flask size {index + 1}</span>
            </Button>
          </li>
        ))}
      </ul>
      <FieldError id="flask-cooling-fault" error={faultAt(errors, 'processTables.flaskCooling')} />
      <p>
        <Button icon="plus" onClick={() => append({ diameterMm: '', perSecond: '' })}>
          Add a flask size
        </Button>
      </p>
    </div>
  );
};
