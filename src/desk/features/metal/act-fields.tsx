import { get, useFormContext, type FieldError } from 'react-hook-form';
import { TextAreaField } from '#src/ui/text-area-field.tsx';
import { TextField } from '#src/ui/text-field.tsx';

const useField = (name: string) => {
  const { register, formState } = useFormContext();
  const fault: FieldError | undefined = get(formState.errors, name);
  return { ...register(name), error: fault?.message };
};

/** A field's name in its form, and its words. */
export interface FieldNames {
  readonly name: string;
  readonly label: string;
  readonly hint?: string;
}

/** A mass in the studio's unit, in a form of its context. */
export const MassField = ({ name, label, hint, unit }: FieldNames & { readonly unit: string }) => (
  <TextField
    label={label}
    hint={hint}
    unit={unit}
    inputMode="decimal"
    autoComplete="off"
    {...useField(name)}
  />
);

/** A line of words, in a form of its context. */
export const WordsField = ({ name, label, hint }: FieldNames) => (
  <TextField label={label} hint={hint} autoComplete="off" {...useField(name)} />
);

/** Why something is done, in a form of its context. */
export const ReasonField = ({ name, label, hint }: FieldNames) => (
  <TextAreaField label={label} hint={hint} rows={2} {...useField(name)} />
);

/** Where a second person signs with their name and password, in a form of its context. */
export const CountersignFields = ({ hint }: { readonly hint: string }) => {
  const login = useField('sign.login');
  const password = useField('sign.password');
  return (
    <fieldset className="grid gap-3 border-t-2 border-line pt-4">
      <legend className="sr-only">A second person signs</legend>
      <p className="text-[15px] text-soft">{hint}</p>
      <div className="grid items-start gap-4 sm:grid-cols-2">
        <TextField
          label="Second person’s sign-in name"
          autoComplete="off"
          autoCapitalize="none"
          spellCheck={false}
          {...login}
        />
        <TextField label="Their password" type="password" autoComplete="new-password" {...password} />
      </div>
    </fieldset>
  );
};
