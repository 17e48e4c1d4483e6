import { get, useFormContext, useWatch, type FieldError } from 'react-hook-form';
import { TextAreaField } from '#src/ui/text-area-field.tsx';
import { TextField } from '#src/ui/text-field.tsx';
import { useStudio } from '#src/desk/parts/use-studio.ts';
import { massRemark } from './metal-mass.ts';

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

/** Props of {@link MassField}. */
export interface MassFieldProps extends FieldNames {
  /** What the ledger says, g: a figure that would come to it in another unit is asked about. */
  readonly expectedG?: number;
}

/** A mass in the studio's unit or the one typed after it, in a form of its context. */
export const MassField = ({ name, label, hint, expectedG }: MassFieldProps) => {
  const { units } = useStudio();
  const typed: unknown = useWatch({ name });
  const remark = massRemark(typeof typed === 'string' ? typed : '', units.mass, expectedG);
  return (
    <div className="grid gap-1.5">
      <TextField label={label} hint={hint} unit={units.mass} autoComplete="off" {...useField(name)} />
      <output className="font-extrabold empty:hidden">{remark}</output>
    </div>
  );
};

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
