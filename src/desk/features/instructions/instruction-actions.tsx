import { useState } from 'react';
import { Link } from 'react-router-dom';
import type { Instruction } from '#shared/contracts/instruction.ts';
import { useApproveInstruction, useDropInstruction } from '#src/api/instructions.ts';
import { ProblemError, sentenceOf } from '#src/lib/http.ts';
import { Button } from '#src/ui/button.tsx';
import { buttonClass } from '#src/ui/button-class.ts';
import { Dialog } from '#src/ui/dialog.tsx';
import { HoldButton } from '#src/ui/hold-button.tsx';
import { Icon } from '#src/ui/icon.tsx';
import { Notice } from '#src/ui/notice.tsx';
import { TextAreaField } from '#src/ui/text-area-field.tsx';
import { DraftButton } from './draft-button.tsx';

interface DialogProps {
  readonly instruction: Instruction;
  readonly onClose: () => void;
}

const Failure = ({ error }: { readonly error: Error | null }) =>
  error ? <Notice kind="error" title={sentenceOf(error)} /> : null;

const exceptionFault = (error: Error | null): string | undefined =>
  error instanceof ProblemError
    ? error.problem.fields?.find(({ path }) => path === 'exception')?.message
    : undefined;

const ApproveDialog = ({ instruction, onClose }: DialogProps) => {
  const { id, number, version, approval } = instruction;
  const approve = useApproveInstruction(id);
  const [exception, setException] = useState('');
  const fault = exceptionFault(approve.error);
  return (
    <Dialog
      open
      onClose={onClose}
      title={`Approve revision ${number}`}
      actions={
        <>
          <HoldButton
            size="desk"
            disabled={approve.isPending}
            onHeld={() => approve.mutate({ version, exception }, { onSuccess: onClose })}
          >
            Hold to approve
          </HoldButton>
          <Button onClick={onClose}>Not yet</Button>
        </>
      }
    >
      <div className="grid gap-4">
        <p>
          You say that you have read every step and that the studio can work by them. Cards that are opened
          from then on ask for them; running cards keep what they began with. Nothing in it can be changed
          afterwards: a change is a new revision.
        </p>
        {approval === 'exception' ? (
          <TextAreaField
            label="Why nobody else looks at it"
            hint="You drafted it, and nobody else here could approve it. Your words stay beside it."
            value={exception}
            maxLength={500}
            error={fault}
            onChange={({ currentTarget }) => setException(currentTarget.value)}
          />
        ) : null}
        <Failure error={fault ? null : approve.error} />
      </div>
    </Dialog>
  );
};

const DropDialog = ({ instruction: { id, number, version }, onClose }: DialogProps) => {
  const drop = useDropInstruction(id);
  return (
    <Dialog
      open
      onClose={onClose}
      title={`Drop revision ${number}`}
      actions={
        <>
          <Button
            kind="main"
            busy={drop.isPending}
            onClick={() => drop.mutate({ version }, { onSuccess: onClose })}
          >
            Drop the draft
          </Button>
          <Button onClick={onClose}>Keep it</Button>
        </>
      }
    >
      <div className="grid gap-3">
        <p>It stays in the list as dropped, and can be drafted again from there.</p>
        <Failure error={drop.error} />
      </div>
    </Dialog>
  );
};

/** What may be done with a revision: print it, draft another from it, drop it, approve it. */
export const InstructionActions = ({ instruction }: { readonly instruction: Instruction }) => {
  const [open, setOpen] = useState<'approve' | 'drop' | null>(null);
  const close = (): void => setOpen(null);
  const { id, status, abilities, faults } = instruction;
  return (
    <>
      <Link to={`/print/instructions/${id}`} className={buttonClass()}>
        <Icon name="print" />
        Print
      </Link>
      {abilities.draft && status !== 'draft' ? <DraftButton from={id}>Draft from here</DraftButton> : null}
      {abilities.drop ? <Button onClick={() => setOpen('drop')}>Drop</Button> : null}
      {abilities.approve && faults.length === 0 ? (
        <Button kind="main" onClick={() => setOpen('approve')}>
          Approve
        </Button>
      ) : null}
      {open === 'approve' ? <ApproveDialog instruction={instruction} onClose={close} /> : null}
      {open === 'drop' ? <DropDialog instruction={instruction} onClose={close} /> : null}
    </>
  );
};
