import { useQueryClient } from '@tanstack/react-query';
import { useMemo, useState } from 'react';
import { useForm, useWatch } from 'react-hook-form';
import type { Instruction } from '#shared/contracts/instruction.ts';
import { cardSteps } from '#shared/domain/pour-card/card-step.ts';
import { instructionQuery, useChangeInstruction } from '#src/api/instructions.ts';
import { isProblemError, sentenceOf } from '#src/lib/http.ts';
import { StateMark } from '#src/ui/state-mark.tsx';
import { TextAreaField } from '#src/ui/text-area-field.tsx';
import { TextField } from '#src/ui/text-field.tsx';
import { useStudio } from '#src/desk/parts/use-studio.ts';
import { DraftBar } from './draft-bar.tsx';
import { readInstruction, valuesOf, type InstructionValues } from './instruction-values.ts';
import { LeaveGuard } from './leave-guard.tsx';
import { PartSection } from './part-section.tsx';
import { PreviewFrame } from './preview-frame.tsx';
import { useArranging } from './use-arranging.ts';

/** What the server refused, and whether because someone else was there first. */
interface Refusal {
  readonly sentence: string;
  readonly isOverrun: boolean;
}

/** A draft as fields beside the terminal's preview; what was typed stays when others stored theirs first. */
export const InstructionEditor = ({ instruction }: { readonly instruction: Instruction }) => {
  const { units } = useStudio();
  const client = useQueryClient();
  const store = useChangeInstruction(instruction.id);
  // The version that these fields began from: a newer one that arrives meanwhile must not be overwritten.
  const [version, setVersion] = useState(instruction.version);
  const [refusal, setRefusal] = useState<Refusal | null>(null);
  const { register, control, handleSubmit, setValue, reset, formState } = useForm<InstructionValues>({
    defaultValues: valuesOf(instruction, units),
  });
  const { isDirty, isSubmitting } = formState;
  // Every field has its default, so nothing of what is watched is missing.
  const values = useWatch({ control }) as InstructionValues;
  const read = useMemo(() => readInstruction(values, units), [values, units]);
  const arranging = useArranging(values.steps, (steps) => setValue('steps', steps, { shouldDirty: true }));

  const begin = (from: Instruction): void => {
    reset(valuesOf(from, units));
    setVersion(from.version);
    setRefusal(null);
  };
  const submit = handleSubmit(async ({ note }) => {
    if (read.fieldFaults.size > 0) return;
    try {
      // The contract's arrays are mutable where the domain's are not.
      begin(await store.mutateAsync({ version, note, content: read.content as never }));
    } catch (error) {
      setRefusal({ sentence: sentenceOf(error), isOverrun: isProblemError(error, 'changed-meanwhile') });
    }
  });
  const loadAgain = async (): Promise<void> =>
    begin(await client.fetchQuery({ ...instructionQuery(instruction.id), staleTime: 0 }));

  const whole = [...(read.stepFaults.get('') ?? []), read.fieldFaults.get('steps')].filter(
    (sentence) => sentence !== undefined,
  );
  return (
    <div className="grid items-start gap-x-12 gap-y-10 xl:grid-cols-[minmax(0,1fr)_560px]">
      <form noValidate onSubmit={(event) => void submit(event)} className="grid min-w-0 gap-9">
        <div className="grid gap-4">
          <TextField
            label="Title"
            maxLength={80}
            error={read.fieldFaults.get('title')}
            {...register('title')}
          />
          <TextAreaField
            label="What is new"
            hint="For whoever approves it, and for the list of revisions."
            rows={2}
            maxLength={1000}
            {...register('note')}
          />
          {whole.map((sentence) => (
            <StateMark key={sentence} state="stop" text={sentence} size="row" />
          ))}
        </div>
        {cardSteps.map((part) => (
          <PartSection
            key={part}
            part={part}
            steps={values.steps}
            read={read}
            arranging={arranging}
            sentence={register(`sentences.${part}`)}
          />
        ))}
        <section aria-labelledby="edit-stop" className="grid gap-4">
          <h2 id="edit-stop" className="border-b-[3px] border-ink pb-1 text-[21px] font-black">
            When work is stopped
          </h2>
          <TextAreaField
            label="What the terminal shows, large"
            hint="The studio’s own words: who to call, where the burn first-aid point is."
            rows={4}
            maxLength={600}
            error={read.fieldFaults.get('emergencyText')}
            {...register('emergencyText')}
          />
          <TextAreaField
            label="Who comes before this instruction"
            hint="Shown under the cautions."
            rows={2}
            maxLength={300}
            error={read.fieldFaults.get('deference')}
            {...register('deference')}
          />
        </section>
        <DraftBar
          isChanged={isDirty}
          isBusy={isSubmitting}
          fieldFaults={read.fieldFaults.size}
          stepFaults={[...read.stepFaults.values()].flat().length}
          problem={refusal?.sentence ?? null}
          onLoadAgain={refusal?.isOverrun ? () => void loadAgain() : null}
          onUndoAll={() => reset()}
          arranging={arranging}
        />
      </form>
      <div className="xl:sticky xl:top-6">
        <PreviewFrame instruction={read.content} />
      </div>
      <LeaveGuard isChanged={isDirty && !isSubmitting} />
    </div>
  );
};
