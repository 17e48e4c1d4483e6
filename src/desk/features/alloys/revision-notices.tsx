import { Link } from 'react-router-dom';
import type { Alloy, AlloyRevision } from '#shared/contracts/alloy.ts';
import { buttonClass } from '#src/ui/button-class.ts';
import { Notice } from '#src/ui/notice.tsx';
import { openRevision } from './choose-revision.ts';

const DriftNotice = ({ alloy, revision }: { readonly alloy: Alloy; readonly revision: AlloyRevision }) => (
  <Notice
    kind="caution"
    title={
      revision.status === 'approved'
        ? 'The engine has changed: these figures ask to be approved again'
        : 'The engine has changed since this revision was drafted'
    }
    action={
      alloy.abilities.revise ? (
        <Link to={`/alloys/${alloy.id}?revision=${revision.number}&form=revision`} className={buttonClass()}>
          Draft it again with today’s figures
        </Link>
      ) : undefined
    }
  >
    <ul className="grid gap-1">
      {revision.drift.map((sentence) => (
        <li key={sentence}>{sentence}</li>
      ))}
    </ul>
    <p className="pt-2">Until then pour cards keep the approved figures.</p>
  </Notice>
);

/** What is to be known about a revision before its figures: drift of the engine, a newer one under way, figures that are measured. */
export const RevisionNotices = ({
  alloy,
  revision,
}: {
  readonly alloy: Alloy;
  readonly revision: AlloyRevision;
}) => {
  const open = openRevision(alloy);
  const isOlder = open !== undefined && open.number !== revision.number;
  if (revision.drift.length === 0 && !isOlder) return null;
  return (
    <div className="grid gap-4 pb-6">
      {revision.drift.length > 0 ? <DriftNotice alloy={alloy} revision={revision} /> : null}
      {isOlder ? (
        <Notice
          kind="info"
          title={`Revision ${open.number} is ${open.status === 'draft' ? 'a draft, waiting to be checked' : 'checked, waiting to be approved'}.`}
          action={
            <Link to={`/alloys/${alloy.id}?revision=${open.number}`} className={buttonClass()}>
              See revision {open.number}
            </Link>
          }
        />
      ) : null}
    </div>
  );
};
