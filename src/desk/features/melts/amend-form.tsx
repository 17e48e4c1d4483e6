import { zodResolver } from '@hookform/resolvers/zod';
import { useForm } from 'react-hook-form';
import { amendMeltRequest, type AmendMeltRequest, type Melt } from '#shared/contracts/melt.ts';
import { useAmendMelt } from '#src/api/melts.ts';
import { Button } from '#src/ui/button.tsx';
import { SelectField } from '#src/ui/select-field.tsx';
import { TextAreaField } from '#src/ui/text-area-field.tsx';
import { applyProblem } from '../../parts/apply-problem.ts';
import { FormProblem } from '../../parts/form-problem.tsx';
import { useStudio } from '../../parts/use-studio.ts';
import { eventWords } from './event-words.ts';

const readSeq = (value: string | number | null): number | null =>
  value === '' || value === null ? null : Number(value);

/** Adds a remark to a melt or to one of its entries. */
export const AmendForm = ({ melt }: { readonly melt: Melt }) => {
  const amend = useAmendMelt(melt.id);
  const { units, clock } = useStudio();
  const { register, handleSubmit, setError, reset, formState } = useForm<AmendMeltRequest>({
    resolver: zodResolver(amendMeltRequest),
    defaultValues: { seq: null, note: '' },
  });
  const { errors } = formState;
  const submit = handleSubmit(async (request) => {
    try {
      await amend.mutateAsync(request);
      reset();
    } catch (error) {
      applyProblem(error, ['seq', 'note'], setError);
    }
  });
  const entries = melt.events.map(({ seq, event, occurredAt }) => ({
    value: String(seq),
    label: `${seq}, ${clock.time(occurredAt)}: ${eventWords(event, units)}`,
  }));
  return (
    <form noValidate onSubmit={(event) => void submit(event)} className="screen-only grid max-w-2xl gap-4">
      <h3 className="text-lg font-black">Add a remark</h3>
      <p className="text-soft">What was written stays; add what should be known.</p>
      <SelectField
        label="About"
        options={entries}
        placeholder="the melt as a whole"
        error={errors.seq?.message}
        {...register('seq', { setValueAs: readSeq })}
      />
      <TextAreaField label="Remark" error={errors.note?.message} {...register('note')} />
      <FormProblem sentence={errors.root?.server?.message} />
      <p>
        <Button type="submit" busy={amend.isPending}>
          Add the remark
        </Button>
      </p>
    </form>
  );
};
