import { zodResolver } from '@hookform/resolvers/zod';
import { useQueryClient } from '@tanstack/react-query';
import { useState } from 'react';
import { useForm, type Path } from 'react-hook-form';
import type { Studio, UpdateStudioRequest } from '#shared/contracts/studio.ts';
import { studioQuery, useUpdateStudio } from '#src/api/studio.ts';
import { isProblemError } from '#src/lib/http.ts';
import { applyProblem } from '#src/desk/parts/apply-problem.ts';
import { countFaults } from './count-faults.ts';
import { SaveBar } from './save-bar.tsx';
import { StudioFields } from './studio-fields.tsx';
import { studioForm, valuesOf, type StudioValues } from './studio-values.ts';

const fields: readonly Path<StudioValues>[] = [
  'name',
  'temperatureUnit',
  'massUnit',
  'timeZone',
  'marksPlace',
  'idleLockS',
  'pyrometerCheckDays',
  'limits',
  'processTables',
];

const notANumber = (issue: { readonly code?: string | undefined }): string | undefined =>
  issue.code === 'invalid_type' ? 'Type a number.' : undefined;

/** The settings' form; it keeps what was typed when others stored theirs first, and says so. */
export const StudioForm = ({ studio }: { readonly studio: Studio }) => {
  const update = useUpdateStudio();
  const client = useQueryClient();
  const [isOverrun, setIsOverrun] = useState(false);
  const { register, control, handleSubmit, setError, reset, formState } = useForm<
    StudioValues,
    unknown,
    UpdateStudioRequest
  >({ resolver: zodResolver(studioForm, { error: notANumber }), defaultValues: valuesOf(studio) });
  const { errors, isDirty, isSubmitting } = formState;
  const submit = handleSubmit(async (request) => {
    try {
      reset(valuesOf(await update.mutateAsync(request)));
      setIsOverrun(false);
    } catch (error) {
      setIsOverrun(isProblemError(error, 'changed-meanwhile'));
      applyProblem(error, fields, setError);
    }
  });
  const loadAgain = async (): Promise<void> => {
    const stored = await client.fetchQuery({ ...studioQuery, staleTime: 0 });
    reset(valuesOf(stored));
    setIsOverrun(false);
  };
  return (
    <form noValidate onSubmit={(event) => void submit(event)}>
      <StudioFields register={register} control={control} errors={errors} />
      <SaveBar
        isChanged={isDirty}
        isBusy={isSubmitting}
        wasStored={update.isSuccess}
        faults={countFaults(errors)}
        problem={errors.root?.server?.message}
        onLoadAgain={isOverrun ? () => void loadAgain() : null}
        onUndo={() => reset()}
      />
    </form>
  );
};
