import { useQuery } from '@tanstack/react-query';
import { Link, useParams } from 'react-router-dom';
import type { Instruction, InstructionSummary } from '#shared/contracts/instruction.ts';
import { instructionQuery, instructionsQuery } from '#src/api/instructions.ts';
import { isProblemError } from '#src/lib/http.ts';
import { buttonClass } from '#src/ui/button-class.ts';
import { Notice } from '#src/ui/notice.tsx';
import { PageTitle } from '#src/ui/page-title.tsx';
import { Loaded } from '#src/desk/parts/loaded.tsx';
import type { StudioClock } from '#src/desk/parts/studio-clock.ts';
import { useStudio } from '#src/desk/parts/use-studio.ts';
import { DifferencesPanel } from './differences-panel.tsx';
import { InstructionActions } from './instruction-actions.tsx';
import { InstructionEditor } from './instruction-editor.tsx';
import { InstructionSheet } from './instruction-sheet.tsx';
import { InstructionStateMark } from './instruction-state-mark.tsx';
import { PreviewFrame } from './preview-frame.tsx';

/** Who drafted and approved a revision, and when, in a sentence. */
const storyOf = (instruction: Instruction, clock: StudioClock): string => {
  const { draftedBy, draftedAt, approvedBy, approvedAt, exception, note } = instruction;
  const drafted = draftedBy
    ? `Drafted by ${draftedBy}, ${clock.dayAndTime(draftedAt)}`
    : 'The studio began with it';
  const approved =
    approvedAt && approvedBy ? `; approved by ${approvedBy}, ${clock.dayAndTime(approvedAt)}` : '';
  const alone = exception ? ` by exception: “${exception}”` : '';
  return `${drafted}${approved}${alone}.${note ? ` ${note}` : ''}`;
};

/** The revision that this one is to be read against: the one approved before it. */
const approvedBefore = (
  revisions: readonly InstructionSummary[],
  { number }: Instruction,
): InstructionSummary | undefined =>
  revisions.find((revision) => revision.status === 'approved' && revision.number < number);

const ApprovalNotice = ({ instruction }: { readonly instruction: Instruction }) => {
  const { status, approval, faults, abilities } = instruction;
  if (status !== 'draft') return null;
  if (faults.length > 0 && !abilities.change)
    return (
      <Notice kind="caution" title="This draft cannot be approved as it stands.">
        <ul>
          {faults.map(({ stepKey, sentence }) => (
            <li key={`${stepKey ?? ''}${sentence}`}>{sentence}</li>
          ))}
        </ul>
      </Notice>
    );
  if (approval === 'own-draft')
    return (
      <p className="text-soft">
        You changed it last, so an owner or a caster other than you has to approve it.
      </p>
    );
  return null;
};

const Differences = ({ instruction }: { readonly instruction: Instruction }) => {
  const list = useQuery(instructionsQuery);
  const before = approvedBefore(list.data?.revisions ?? [], instruction);
  const other = useQuery({ ...instructionQuery(before?.id ?? ''), enabled: before !== undefined });
  if (!before || !other.data) return null;
  return <DifferencesPanel before={other.data} now={instruction.content} />;
};

const OneInstruction = ({ instruction }: { readonly instruction: Instruction }) => {
  const { clock } = useStudio();
  const { content, number, abilities } = instruction;
  return (
    <>
      <PageTitle
        title={`Work instruction, revision ${number}`}
        mark={<InstructionStateMark revision={instruction} />}
        summary={storyOf(instruction, clock)}
        actions={<InstructionActions instruction={instruction} />}
      />
      <div className="grid gap-8">
        <ApprovalNotice instruction={instruction} />
        {abilities.change ? (
          <>
            <Differences instruction={instruction} />
            <InstructionEditor key={instruction.id} instruction={instruction} />
          </>
        ) : (
          <div className="grid items-start gap-x-12 gap-y-10 xl:grid-cols-[minmax(0,1fr)_560px]">
            <div className="min-w-0">
              <h2 className="pb-4 text-[26px] font-black">{content.title}</h2>
              <InstructionSheet instruction={content} />
            </div>
            <div className="grid gap-10">
              <PreviewFrame instruction={content} />
              <Differences instruction={instruction} />
            </div>
          </div>
        )}
      </div>
    </>
  );
};

const noSuchInstruction = (
  <>
    <PageTitle title="No such revision" />
    <Notice
      kind="empty"
      title="The work instruction has no revision at this address."
      action={
        <Link to="/instructions" className={buttonClass()}>
          See all revisions
        </Link>
      }
    />
  </>
);

/** One revision of the work instruction: a draft is edited here, every other one is read. */
export const InstructionPage = () => {
  const { instructionId = '' } = useParams();
  // Read once: a refetch must not take away what the fields began from.
  const query = useQuery({ ...instructionQuery(instructionId), refetchOnWindowFocus: false });
  if (isProblemError(query.error, 'not-found') || isProblemError(query.error, 'invalid-request'))
    return noSuchInstruction;
  return (
    <Loaded query={query} what="the work instruction">
      {(instruction) => <OneInstruction instruction={instruction} />}
    </Loaded>
  );
};
