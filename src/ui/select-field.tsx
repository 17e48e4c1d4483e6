import type { ComponentProps } from 'react';
import { controlClass } from './control-class.ts';
import { Field, type FieldFrame } from './field.tsx';

/** One choice of a {@link SelectField}. */
export interface SelectOption {
  readonly value: string;
  readonly label: string;
}

/** Props of {@link SelectField}; the rest goes to the select element. */
export interface SelectFieldProps
  extends Omit<ComponentProps<'select'>, 'id' | 'className' | 'children'>, FieldFrame {
  readonly options: readonly SelectOption[];
  /** First, empty choice, such as "Choose an alloy". */
  readonly placeholder?: string;
}

/** A choice of one among a few, with the browser's own list. */
export const SelectField = ({ label, hint, error, options, placeholder, ...select }: SelectFieldProps) => (
  <Field label={label} hint={hint} error={error}>
    {(wiring) => (
      <select {...select} {...wiring} className={controlClass}>
        {placeholder === undefined ? null : <option value="">{placeholder}</option>}
        {options.map((option) => (
          <option key={option.value} value={option.value}>
            {option.label}
          </option>
        ))}
      </select>
    )}
  </Field>
);
