import type { Path } from 'react-hook-form';
import { TextField } from '#src/ui/text-field.tsx';
import { faultAt, type FormPart } from './form-parts.ts';
import type { StudioValues } from './studio-values.ts';

/** Props of {@link NumberField}. */
export interface NumberFieldProps extends FormPart {
  readonly path: Path<StudioValues>;
  readonly label: string;
  readonly unit: string;
  readonly hint?: string;
}

/** One number of the settings with its unit. */
export const NumberField = ({ path, label, unit, hint, register, errors }: NumberFieldProps) => (
  <TextField
    label={label}
    unit={unit}
    hint={hint}
    inputMode="decimal"
    autoComplete="off"
    error={faultAt(errors, path)}
    {...register(path)}
  />
);
