import type { ComponentProps } from 'react';
import { controlClass } from './control-class.ts';
import { Field, type FieldFrame } from './field.tsx';

/** Props of {@link TextAreaField}; the rest goes to the text area. */
export interface TextAreaFieldProps
  extends Omit<ComponentProps<'textarea'>, 'id' | 'className'>, FieldFrame {}

/** A field for a note or a reason of several lines. */
export const TextAreaField = ({ label, hint, error, rows = 3, ...area }: TextAreaFieldProps) => (
  <Field label={label} hint={hint} error={error}>
    {(wiring) => <textarea {...area} {...wiring} rows={rows} className={controlClass} />}
  </Field>
);
