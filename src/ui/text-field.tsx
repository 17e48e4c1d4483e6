import type { ComponentProps } from 'react';
import { controlClass } from './control-class.ts';
import { Field, type FieldFrame } from './field.tsx';

/** Props of {@link TextField}; the rest, such as react-hook-form's `register(...)`, goes to the input. */
export interface TextFieldProps extends Omit<ComponentProps<'input'>, 'id' | 'className'>, FieldFrame {
  /** Unit written after the input. */
  readonly unit?: string;
}

/** A one-line text field of a desk form. */
export const TextField = ({ label, hint, error, unit, ...input }: TextFieldProps) => (
  <Field label={label} hint={hint} error={error}>
    {(wiring) => (
      <span className="flex items-center gap-3">
        <input type="text" {...input} {...wiring} className={controlClass} />
        {unit ? <span className="shrink-0 font-extrabold text-soft">{unit}</span> : null}
      </span>
    )}
  </Field>
);
