import { zodResolver } from '@hookform/resolvers/zod';
import { useMemo, type ReactNode } from 'react';
import { FormProvider, useForm, useFormContext } from 'react-hook-form';
import type { z } from 'zod';
import { Button } from '#src/ui/button.tsx';
import { TextAreaField } from '#src/ui/text-area-field.tsx';
import { TextField } from '#src/ui/text-field.tsx';
import { applyProblem } from '#src/desk/parts/apply-problem.ts';
import { FormProblem } from '#src/desk/parts/form-problem.tsx';
import { useStudio } from '#src/desk/parts/use-studio.ts';
import type { AlloyFormValues } from '#src/desk/parts/alloy-form-values.ts';
import { CompositionFields } from '#src/desk/parts/composition-fields.tsx';
import { atFormPlaces, rootOfParts } from '#src/desk/parts/form-schema.ts';
import { alloyFormSchema } from './alloy-form-schema.ts';
import { LiveFigures } from './live-figures.tsx';
import { MeasuredFields } from './measured-fields.tsx';
import { QuenchFields } from './quench-fields.tsx';
import { formPathOf } from '#src/desk/parts/read-alloy-form.ts';

/** Props of {@link AlloyForm}. */
export interface AlloyFormProps<Request> {
  readonly contract: z.ZodType<Request>;
  readonly defaults: AlloyFormValues;
  /** Fields before the composition, such as name and family. */
  readonly children?: ReactNode;
  readonly submitWords: string;
  /** Sends the request; a rejection is shown at its fields and nothing typed is lost. */
  readonly send: (request: Request) => Promise<unknown>;
  /** The way out without sending. */
  readonly cancel: ReactNode;
}

const places = ['name', 'family', 'parts', 'fineness', 'quench', 'isMeasured', 'measured', 'note'] as const;

const FinenessField = () => {
  const { register, formState } = useFormContext<AlloyFormValues>();
  return (
    <TextField
      label="Fineness"
      hint="Parts per thousand, as it is marked; never above what the composition holds."
      inputMode="numeric"
      autoComplete="off"
      error={formState.errors.fineness?.message}
      {...register('fineness')}
    />
  );
};

const NoteField = () => {
  const { register, formState } = useFormContext<AlloyFormValues>();
  return (
    <TextAreaField
      label="Note"
      hint="Why this revision is made; may stay empty."
      rows={2}
      error={formState.errors.note?.message}
      {...register('note')}
    />
  );
};

/** The form of a revision, with the figures of what is typed beside it. */
export const AlloyForm = <Request,>(props: AlloyFormProps<Request>) => {
  const { contract, defaults, children, submitWords, send, cancel } = props;
  const studio = useStudio();
  const unit = studio.units.temperature;
  const schema = useMemo(() => alloyFormSchema(contract, unit), [contract, unit]);
  const form = useForm<AlloyFormValues, unknown, Request>({
    resolver: zodResolver(schema),
    defaultValues: defaults,
    mode: 'onTouched',
  });
  const submit = form.handleSubmit(async (request) => {
    try {
      await send(request);
    } catch (error) {
      const placed = atFormPlaces(error, (path) => rootOfParts(formPathOf(path, form.getValues('parts'))));
      applyProblem<AlloyFormValues>(placed, places, form.setError);
    }
  });
  return (
    <FormProvider {...form}>
      <form
        noValidate
        onSubmit={(event) => void submit(event)}
        className="grid gap-x-14 gap-y-8 lg:grid-cols-[minmax(0,1fr)_400px]"
      >
        <div className="grid max-w-[720px] content-start gap-7">
          {children}
          <CompositionFields />
          <FinenessField />
          <QuenchFields />
          <MeasuredFields unit={unit} />
          <NoteField />
          <FormProblem sentence={form.formState.errors.root?.['server']?.message} />
          <div className="flex flex-wrap gap-4">
            <Button type="submit" kind="main" busy={form.formState.isSubmitting}>
              {submitWords}
            </Button>
            {cancel}
          </div>
        </div>
        <div>
          <LiveFigures studio={studio} />
        </div>
      </form>
    </FormProvider>
  );
};
