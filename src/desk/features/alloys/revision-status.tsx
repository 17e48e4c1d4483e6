import type { AlloyRevision } from '#shared/contracts/alloy.ts';
import { StateMark, type State } from '#src/ui/state-mark.tsx';
import type { StudioClock } from '../../parts/studio-clock.ts';

const marks: Readonly<Record<AlloyRevision['status'], { readonly state: State; readonly words: string }>> = {
  draft: { state: 'wait', words: 'draft' },
  checked: { state: 'wait', words: 'checked, not approved' },
  approved: { state: 'ready', words: 'approved' },
  superseded: { state: 'wait', words: 'superseded' },
};

/** Whether an approved revision must be approved anew because today's engine no longer agrees with it. */
export const needsReapproval = ({ status, drift }: AlloyRevision): boolean =>
  status === 'approved' && drift.length > 0;

/** Where a revision stands, as a shape and in words. */
export const RevisionStatusMark = ({ revision }: { readonly revision: AlloyRevision }) =>
  needsReapproval(revision) ? (
    <StateMark state="caution" text="approved, re-approval asked" size="row" />
  ) : (
    <StateMark state={marks[revision.status].state} text={marks[revision.status].words} size="row" />
  );

/** Who drafted, checked and approved a revision, and when, in one sentence. */
export const revisionSentence = (revision: AlloyRevision, clock: StudioClock): string => {
  const { number, status, draftedBy, checkedBy, checkedAt, approvedBy, approvedAt } = revision;
  const start = `Revision ${number}, `;
  if (approvedAt) {
    const by = approvedBy ? ` by ${approvedBy}` : '';
    const end = status === 'superseded' ? '; superseded since' : '';
    return `${start}approved ${clock.dayAndTime(approvedAt)}${by}${end}.`;
  }
  if (checkedAt)
    return `${start}checked ${clock.dayAndTime(checkedAt)} by ${checkedBy ?? 'someone'}, not yet approved.`;
  return `${start}a draft by ${draftedBy}, not yet checked.`;
};
