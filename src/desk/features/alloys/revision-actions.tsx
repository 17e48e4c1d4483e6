import { useState } from 'react';
import { Link } from 'react-router-dom';
import { useApproveRevision, useCheckRevision } from '#src/api/alloys.ts';
import { sentenceOf } from '#src/lib/http.ts';
import type { Alloy, AlloyRevision } from '#shared/contracts/alloy.ts';
import { buttonClass } from '#src/ui/button-class.ts';
import { Button } from '#src/ui/button.tsx';
import { Dialog } from '#src/ui/dialog.tsx';
import { HoldButton } from '#src/ui/hold-button.tsx';
import { Notice } from '#src/ui/notice.tsx';
import type { StudioWriting } from '../../parts/use-studio.ts';
import { approvedRevision } from './choose-revision.ts';
import { writeComposition } from './element-names.ts';

/** Props of {@link RevisionActions}. */
export interface RevisionActionsProps {
  readonly alloy: Alloy;
  readonly revision: AlloyRevision;
  readonly studio: StudioWriting;
}

const Failure = ({ error }: { readonly error: Error | null }) =>
  error ? <Notice kind="error" title={sentenceOf(error)} /> : null;

const CheckDialog = ({
  revision,
  onClose,
}: {
  readonly revision: AlloyRevision;
  readonly onClose: () => void;
}) => {
  const check = useCheckRevision();
  return (
    <Dialog
      open
      onClose={onClose}
      title={`Check revision ${revision.number}`}
      actions={
        <>
          <Button
            kind="main"
            busy={check.isPending}
            onClick={() => check.mutate(revision.id, { onSuccess: onClose })}
          >
            I have checked it
          </Button>
          <Button onClick={onClose}>Not yet</Button>
        </>
      }
    >
      <div className="grid gap-3">
        <p>
          You say that you have looked at its composition, its figures and its quench rule against what you
          know and against the maker’s sheet. Your name stands beside it. The owner may then approve it.
        </p>
        <Failure error={check.error} />
      </div>
    </Dialog>
  );
};

const ApproveDialog = ({
  alloy,
  revision,
  studio,
  onClose,
}: RevisionActionsProps & { readonly onClose: () => void }) => {
  const approve = useApproveRevision();
  const before = approvedRevision(alloy);
  const { figures } = revision;
  return (
    <Dialog
      open
      onClose={onClose}
      title={`Approve revision ${revision.number} of ${alloy.name}`}
      actions={
        <>
          <HoldButton
            size="desk"
            disabled={approve.isPending}
            onHeld={() => approve.mutate(revision.id, { onSuccess: onClose })}
          >
            Hold to approve
          </HoldButton>
          <Button onClick={onClose}>Not yet</Button>
        </>
      }
    >
      <div className="grid gap-3">
        <p>
          Approving freezes this revision: {writeComposition(revision.compositionWt, revision.toleranceWt)},
          all liquid above {studio.temperature(figures.liquidusC)}, all solid below{' '}
          {studio.temperature(figures.solidusC)}
          {figures.engineVersion ? `, engine ${figures.engineVersion}` : ', a measured range'}. Nothing in it
          can be changed afterwards; a change is a new revision.
        </p>
        <p>
          {before
            ? `Revision ${before.number} is superseded at once, and pour cards take their figures from revision ${revision.number}.`
            : 'From then on the alloy may be cast, and pour cards take their figures from here.'}
        </p>
        <Failure error={approve.error} />
      </div>
    </Dialog>
  );
};

/** What may be done with a revision: draft the next one from it, check it, approve it. */
export const RevisionActions = ({ alloy, revision, studio }: RevisionActionsProps) => {
  const [open, setOpen] = useState<'check' | 'approve' | null>(null);
  const close = (): void => setOpen(null);
  return (
    <>
      {alloy.abilities.revise ? (
        <Link to={`/alloys/${alloy.id}?revision=${revision.number}&form=revision`} className={buttonClass()}>
          Draft a new revision
        </Link>
      ) : null}
      {revision.abilities.check ? (
        <Button kind="main" onClick={() => setOpen('check')}>
          Check
        </Button>
      ) : null}
      {revision.abilities.approve ? (
        <Button kind="main" onClick={() => setOpen('approve')}>
          Approve
        </Button>
      ) : null}
      {open === 'check' ? <CheckDialog revision={revision} onClose={close} /> : null}
      {open === 'approve' ? (
        <ApproveDialog alloy={alloy} revision={revision} studio={studio} onClose={close} />
      ) : null}
    </>
  );
};
