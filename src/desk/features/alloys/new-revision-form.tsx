import { useMemo } from 'react';
import { Link, useNavigate } from 'react-router-dom';
import { createRevisionRequest, type Alloy, type AlloyRevision } from '#shared/contracts/alloy.ts';
import { useCreateRevision } from '#src/api/alloys.ts';
import { buttonClass } from '#src/ui/button-class.ts';
import { PageTitle } from '#src/ui/page-title.tsx';
import { useStudio } from '../../parts/use-studio.ts';
import { AlloyForm } from './alloy-form.tsx';
import { formOfRevision } from './alloy-form-values.ts';

/** Drafts the next revision of an alloy, filled in from the one shown. */
export const NewRevisionForm = ({ alloy, from }: { readonly alloy: Alloy; readonly from: AlloyRevision }) => {
  const create = useCreateRevision(alloy.id);
  const navigate = useNavigate();
  const { units } = useStudio();
  const defaults = useMemo(
    () => formOfRevision(alloy, from, units.temperature),
    [alloy, from, units.temperature],
  );
  return (
    <>
      <PageTitle
        title={`New revision of ${alloy.name}`}
        summary={`Filled in from revision ${from.number}. Nothing changes for the furnace until it is approved.`}
      />
      <AlloyForm
        contract={createRevisionRequest}
        defaults={defaults}
        submitWords="Draft the revision"
        send={async (request) => {
          const { revisions } = await create.mutateAsync(request);
          await navigate(`/alloys/${alloy.id}?revision=${revisions[0]?.number ?? from.number}`);
        }}
        cancel={
          <Link to={`/alloys/${alloy.id}?revision=${from.number}`} className={buttonClass({ kind: 'quiet' })}>
            Leave without drafting
          </Link>
        }
      />
    </>
  );
};
