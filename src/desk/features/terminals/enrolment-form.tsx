import { zodResolver } from '@hookform/resolvers/zod';
import { useForm } from 'react-hook-form';
import { createEnrolmentRequest, type CreateEnrolmentRequest } from '#shared/contracts/terminal.ts';
import { useCreateEnrolment } from '#src/api/terminals.ts';
import { Button } from '#src/ui/button.tsx';
import { TextField } from '#src/ui/text-field.tsx';
import { applyProblem } from '../../parts/apply-problem.ts';
import { FormProblem } from '../../parts/form-problem.tsx';
import { EnrolmentCode } from './enrolment-code.tsx';

/** Makes a one-time code with which a device becomes a terminal, and shows it large. */
export const EnrolmentForm = () => {
  const create = useCreateEnrolment();
  const { register, handleSubmit, setError, reset, formState } = useForm<CreateEnrolmentRequest>({
    resolver: zodResolver(createEnrolmentRequest),
    defaultValues: { name: '', bay: '' },
  });
  const { errors } = formState;
  const submit = handleSubmit(async (request) => {
    try {
      await create.mutateAsync(request);
      reset();
    } catch (error) {
      applyProblem(error, ['name', 'bay'], setError);
    }
  });
  if (create.data) return <EnrolmentCode enrolment={create.data} onAnother={() => create.reset()} />;
  return (
    <section aria-labelledby="enrol" className="grid gap-5">
      <h2 id="enrol" className="text-[21px] font-black">
        Make a device a terminal
      </h2>
      <form noValidate onSubmit={(event) => void submit(event)} className="grid gap-5">
        <TextField
          label="Name of the terminal"
          hint="As it will stand in the melt book, such as “Furnace tablet”."
          autoComplete="off"
          error={errors.name?.message}
          {...register('name')}
        />
        <TextField
          label="Where it stands"
          hint="Such as “furnace bay 1”."
          autoComplete="off"
          error={errors.bay?.message}
          {...register('bay')}
        />
        <FormProblem sentence={errors.root?.server?.message} />
        <p>
          <Button type="submit" kind="main" busy={create.isPending}>
            Make a code
          </Button>
        </p>
      </form>
    </section>
  );
};
