import { useQuery } from '@tanstack/react-query';
import { Link, useSearchParams } from 'react-router-dom';
import { alloysQuery } from '#src/api/alloys.ts';
import { buttonClass } from '#src/ui/button-class.ts';
import { PageTitle } from '#src/ui/page-title.tsx';
import { Loaded } from '../../parts/loaded.tsx';
import { useDeskSession } from '../../parts/desk-session.ts';
import { AlloyTable } from './alloy-table.tsx';
import { NewAlloyForm } from './new-alloy-form.tsx';

/** Every alloy of the studio with the figures of its approved revision; `?form=alloy` adds one. */
export const AlloysPage = () => {
  const { abilities } = useDeskSession();
  const [search] = useSearchParams();
  const query = useQuery(alloysQuery);
  if (search.get('form') === 'alloy' && abilities.manageAlloys) return <NewAlloyForm />;
  return (
    <>
      <PageTitle
        title="Alloys"
        summary="Figures of the approved revision, or of the newest where none is approved yet; pour cards are worked by approved ones only."
        actions={
          abilities.manageAlloys ? (
            <Link to="/alloys?form=alloy" className={buttonClass({ kind: 'main' })}>
              Add an alloy
            </Link>
          ) : null
        }
      />
      <Loaded query={query} what="the alloys">
        {(alloys) => <AlloyTable alloys={alloys} />}
      </Loaded>
    </>
  );
};
