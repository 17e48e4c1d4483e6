import { zodResolver } from '@hookform/resolvers/zod';
import { useId, type ReactNode } from 'react';
import { useForm, type Path, type UseFormReturn } from 'react-hook-form';
import { Link } from 'react-router-dom';
import type { z } from 'zod';
import { roles } from '#shared/domain/people/role.ts';
import { Button } from '#src/ui/button.tsx';
import { buttonClass } from '#src/ui/button-class.ts';
import { CheckField } from '#src/ui/check-field.tsx';
import { FieldError } from '#src/ui/field.tsx';
import { TextField } from '#src/ui/text-field.tsx';
import { ApprenticeFields } from './apprentice-fields.tsx';
import { applyProblem } from '#src/desk/parts/apply-problem.ts';
import { FormProblem } from '#src/desk/parts/form-problem.tsx';
import type { PersonValues } from './person-values.ts';
import { roleWords } from './role-words.ts';

const fields: readonly Path<PersonValues>[] = [
  'name',
  'login',
  'email',
  'roles',
  'active',
  'password',
  'pin',
];

/** Props of {@link PersonForm}. */
export interface PersonFormProps<Request> {
  readonly values: PersonValues;
  readonly schema: z.ZodType<Request, PersonValues>;
  readonly submitName: string;
  /** Sends what was typed; rejects with the server's problem. */
  readonly onSubmit: (request: Request) => Promise<void>;
  /** True for a person who exists: password and PIN may then be left empty. */
  readonly isChange: boolean;
  readonly hasPin: boolean;
}

type FormPart = Pick<UseFormReturn<PersonValues>, 'register'> & {
  readonly errors: UseFormReturn<PersonValues>['formState']['errors'];
};

const Group = ({ legend, children }: { readonly legend: string; readonly children: ReactNode }) => (
  <fieldset className="grid content-start gap-4">
    <legend className="pb-3 text-lg font-black">{legend}</legend>
    {children}
  </fieldset>
);

const Roles = ({ register, errors }: FormPart) => {
  const id = useId();
  return (
    <Group legend="Roles">
      {roles.map((role) => (
        <CheckField
          key={role}
          label={role.charAt(0).toUpperCase() + role.slice(1)}
          hint={roleWords[role]}
          value={role}
          {...register('roles')}
        />
      ))}
      <FieldError id={id} error={errors.roles?.message} />
    </Group>
  );
};

const Secrets = ({
  register,
  errors,
  isChange,
  hasPin,
}: FormPart & { isChange: boolean; hasPin: boolean }) => (
  <Group legend="Signing in">
    <TextField
      label={isChange ? 'New password' : 'Password'}
      hint={`For the desk; twelve characters or more.${isChange ? ' Leave it empty to keep the old one.' : ''}`}
      type="password"
      autoComplete="new-password"
      error={errors.password?.message}
      {...register('password')}
    />
    <TextField
      label={isChange ? 'New PIN' : 'PIN'}
      hint={`For the terminal; six to twelve digits. ${isChange ? 'Leave it empty to keep it as it is.' : 'Without one there is no sign-in at a terminal.'}`}
      type="password"
      inputMode="numeric"
      autoComplete="off"
      error={errors.pin?.message}
      {...register('pin')}
    />
    {hasPin ? <CheckField label="Take the PIN away" {...register('removePin')} /> : null}
  </Group>
);

/** A person's form; what was typed stays when the server refuses it, with the reason at its field. */
export const PersonForm = <Request,>(props: PersonFormProps<Request>) => {
  const { register, control, handleSubmit, setError, formState } = useForm<PersonValues, unknown, Request>({
    resolver: zodResolver(props.schema),
    defaultValues: props.values,
  });
  const { errors, isSubmitting } = formState;
  const submit = handleSubmit(async (request) => {
    try {
      await props.onSubmit(request);
    } catch (error) {
      applyProblem(error, fields, setError);
    }
  });
  return (
    <form noValidate onSubmit={(event) => void submit(event)} className="grid max-w-5xl gap-8">
      <div className="grid gap-x-14 gap-y-10 md:grid-cols-2 lg:grid-cols-3">
        <Group legend="Person">
          <TextField label="Name" autoComplete="off" error={errors.name?.message} {...register('name')} />
          <TextField
            label="Sign-in name"
            autoComplete="off"
            autoCapitalize="none"
            spellCheck={false}
            error={errors.login?.message}
            {...register('login')}
          />
          <TextField
            label="E-mail"
            hint="Where notices go; may stay empty."
            type="email"
            autoComplete="off"
            error={errors.email?.message}
            {...register('email')}
          />
          {props.isChange ? (
            <CheckField
              label="Works here"
              hint="Without it the person cannot sign in; their name stays in the melt book."
              {...register('active')}
            />
          ) : null}
        </Group>
        <Roles register={register} errors={errors} />
        <Secrets register={register} errors={errors} isChange={props.isChange} hasPin={props.hasPin} />
      </div>
      {props.isChange ? <ApprenticeFields control={control} /> : null}
      <FormProblem sentence={errors.root?.server?.message} />
      <p className="flex flex-wrap gap-3">
        <Button type="submit" kind="main" busy={isSubmitting}>
          {props.submitName}
        </Button>
        <Link to="/people" className={buttonClass()}>
          Back to everyone
        </Link>
      </p>
    </form>
  );
};
