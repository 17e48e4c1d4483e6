import { zodResolver } from '@hookform/resolvers/zod';
import { useForm } from 'react-hook-form';
import type { z } from 'zod';
import { moveCastingRequest, type Casting } from '#shared/contracts/casting.ts';
import type { CastingState } from '#shared/domain/casting/casting-state.ts';
import { splitCode } from '#shared/lib/codes.ts';
import { useMoveCasting } from '#src/api/castings.ts';
import { Button } from '#src/ui/button.tsx';
import { Dialog } from '#src/ui/dialog.tsx';
import { TextAreaField } from '#src/ui/text-area-field.tsx';
import { applyProblem } from '../../parts/apply-problem.ts';
import { FormProblem } from '../../parts/form-problem.tsx';

/** Props of {@link ReasonDialog}. */
export interface ReasonDialogProps {
  readonly casting: Casting;
  readonly to: CastingState;
  readonly onClose: () => void;
}

/** Asks why a casting is held or scrapped, and then does it. */
export const ReasonDialog = ({ casting, to, onClose }: ReasonDialogProps) => {
  const move = useMoveCasting();
  type Values = z.input<typeof moveCastingRequest>;
  const { register, handleSubmit, setError, formState } = useForm<
    Values,
    unknown,
    z.output<typeof moveCastingRequest>
  >({ resolver: zodResolver(moveCastingRequest), defaultValues: { to, reason: '' } });
  const { errors } = formState;
  const isScrap = to === 'scrapped';
  const code = splitCode(casting.flask.code).main;
  const submit = handleSubmit(async (request) => {
    try {
      await move.mutateAsync({ id: casting.id, ...request });
      onClose();
    } catch (error) {
      applyProblem(error, ['reason'], setError);
    }
  });
  return (
    <Dialog
      open
      onClose={onClose}
      title={isScrap ? `Scrap the casting in ${code}` : `Hold the casting in ${code}`}
    >
      <form noValidate onSubmit={(event) => void submit(event)} className="grid gap-5">
        <p className="text-soft">
          {isScrap
            ? 'A scrapped casting does not come back; its flask is free again.'
            : 'Nobody can pour it while it is held; it can be taken back later.'}
        </p>
        <TextAreaField
          label="Why"
          hint="Those at the terminal read this."
          error={errors.reason?.message}
          {...register('reason')}
        />
        <FormProblem sentence={errors.root?.server?.message} />
        <p className="flex flex-wrap gap-3">
          <Button type="submit" kind="main" busy={move.isPending}>
            {isScrap ? 'Scrap it' : 'Hold it'}
          </Button>
          <Button onClick={onClose}>Leave it as it is</Button>
        </p>
      </form>
    </Dialog>
  );
};
