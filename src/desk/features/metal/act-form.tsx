import { zodResolver } from '@hookform/resolvers/zod';
import type { ReactNode } from 'react';
import { FormProvider, useForm, type DefaultValues, type FieldValues, type Path } from 'react-hook-form';
import type { z } from 'zod';
import { Button } from '#src/ui/button.tsx';
import { Dialog } from '#src/ui/dialog.tsx';
import { applyProblem } from '#src/desk/parts/apply-problem.ts';
import { FormProblem } from '#src/desk/parts/form-problem.tsx';
import { atFormPlaces, formSchema, type FormReading } from '#src/desk/parts/form-schema.ts';

/** Props of {@link ActForm}. */
export interface ActFormProps<Values extends FieldValues, Request> {
  readonly title: string;
  /** What the act does, before it is done. */
  readonly words: ReactNode;
  readonly contract: z.ZodType<Request>;
  readonly reading: FormReading<Values>;
  readonly defaults: DefaultValues<Values>;
  /** The form's own fields, at which faults are shown. */
  readonly fields: readonly Path<Values>[];
  readonly submitWords: string;
  /** Sends the act; a rejection is shown at its fields and nothing typed is lost. */
  readonly send: (request: Request) => Promise<unknown>;
  readonly onClose: () => void;
  readonly children: ReactNode;
}

/** An act on a lot in a dialog of its own: what it does, what it needs to know, and the way back. */
export const ActForm = <Values extends FieldValues, Request>(props: ActFormProps<Values, Request>) => {
  const { contract, reading, defaults, fields, send, onClose } = props;
  const form = useForm<Values, unknown, Request>({
    resolver: zodResolver(formSchema(contract, reading)),
    defaultValues: defaults,
  });
  const submit = form.handleSubmit(async (request) => {
    try {
      await send(request);
      onClose();
    } catch (error) {
      const placed = atFormPlaces(error, (path) => reading.placeOf(path, form.getValues()));
      applyProblem<Values>(placed, fields, form.setError);
    }
  });
  return (
    <Dialog open onClose={onClose} title={props.title}>
      <FormProvider {...form}>
        <form noValidate onSubmit={(event) => void submit(event)} className="grid gap-5">
          <p className="text-soft">{props.words}</p>
          {props.children}
          <FormProblem sentence={form.formState.errors.root?.['server']?.message} />
          <p className="flex flex-wrap gap-3">
            <Button type="submit" kind="main" busy={form.formState.isSubmitting}>
              {props.submitWords}
            </Button>
            <Button onClick={onClose}>Leave it as it is</Button>
          </p>
        </form>
      </FormProvider>
    </Dialog>
  );
};
