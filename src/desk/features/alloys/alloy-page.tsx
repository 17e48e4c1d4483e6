import { useQuery } from '@tanstack/react-query';
import { useParams, useSearchParams } from 'react-router-dom';
import type { Alloy } from '#shared/contracts/alloy.ts';
import { alloyQuery } from '#src/api/alloys.ts';
import { AlloyChip } from '#src/ui/alloy-chip.tsx';
import { Notice } from '#src/ui/notice.tsx';
import { PageTitle } from '#src/ui/page-title.tsx';
import { Loaded } from '../../parts/loaded.tsx';
import { metalOf } from '../../parts/metal-of.ts';
import { useStudio } from '../../parts/use-studio.ts';
import { chooseRevision } from './choose-revision.ts';
import { writeComposition } from './element-names.ts';
import { NewRevisionForm } from './new-revision-form.tsx';
import { RevisionActions } from './revision-actions.tsx';
import { RevisionNotices } from './revision-notices.tsx';
import { RevisionStatusMark, revisionSentence } from './revision-status.tsx';
import { RevisionView } from './revision-view.tsx';

const AlloyBody = ({ alloy }: { readonly alloy: Alloy }) => {
  const studio = useStudio();
  const [search] = useSearchParams();
  const revision = chooseRevision(alloy, search.get('revision'));
  if (!revision) return <Notice kind="empty" title={`${alloy.name} has no revision yet.`} />;
  if (search.get('form') === 'revision' && alloy.abilities.revise) {
    return <NewRevisionForm key={revision.id} alloy={alloy} from={revision} />;
  }
  const composition = writeComposition(revision.compositionWt, revision.toleranceWt);
  return (
    <>
      <PageTitle
        title={alloy.name}
        mark={
          <>
            <AlloyChip name={String(revision.fineness)} metal={metalOf(alloy.family)} />
            <RevisionStatusMark revision={revision} />
          </>
        }
        summary={`${revisionSentence(revision, studio.clock)} ${composition}.`}
        actions={<RevisionActions alloy={alloy} revision={revision} studio={studio} />}
      />
      <RevisionNotices alloy={alloy} revision={revision} />
      <RevisionView key={revision.id} alloy={alloy} revision={revision} studio={studio} />
    </>
  );
};

/** One alloy: its diagram with a temperature to drag, its figures with their basis, and its revisions. */
export const AlloyPage = () => {
  const { alloyId = '' } = useParams();
  const query = useQuery(alloyQuery(alloyId));
  return (
    <Loaded query={query} what="the alloy">
      {(alloy) => <AlloyBody alloy={alloy} />}
    </Loaded>
  );
};
