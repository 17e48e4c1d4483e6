import { useQuery } from '@tanstack/react-query';
import { Link } from 'react-router-dom';
import type { Person } from '#shared/contracts/person.ts';
import type { SupervisedStep } from '#shared/contracts/supervised.ts';
import { workerRoleOf } from '#shared/domain/people/apprenticeship.ts';
import { supervisedCsvPath, supervisedQuery } from '#src/api/people.ts';
import { buttonClass } from '#src/ui/button-class.ts';
import { Loaded } from '#src/desk/parts/loaded.tsx';
import { Panel } from '#src/desk/parts/panel.tsx';
import { PlainTable } from '#src/desk/parts/plain-table.tsx';
import { useStudio } from '#src/desk/parts/use-studio.ts';

const Steps = ({ steps }: { readonly steps: readonly SupervisedStep[] }) => {
  const { clock } = useStudio();
  return (
    <PlainTable
      caption="What was done under supervision, newest first"
      align="left"
      heads={['When', 'Melt', 'What', 'Signed by']}
      rows={steps.map(({ at, meltId, meltCode, kind, sentence, words, signedBy, onDevice }) => ({
        key: `${meltId} ${at} ${sentence}`,
        cells: [
          <span key="when" className="whitespace-nowrap">
            {clock.dayAndTime(at)}
          </span>,
          <Link
            key="melt"
            to={`/melts/${meltId}`}
            className="rounded-md font-extrabold whitespace-nowrap underline decoration-2 underline-offset-4"
          >
            {meltCode}
          </Link>,
          <span key="what">
            {kind === 'variance' ? 'Departure: ' : ''}
            {sentence}
            {words ? <span className="block text-soft">“{words}”</span> : null}
          </span>,
          <span key="who">
            {signedBy}
            {onDevice ? <span className="block text-soft">PIN checked by the terminal alone</span> : null}
          </span>,
        ],
      }))}
    />
  );
};

/** What someone did under supervision as an apprentice, to be looked through and taken along as CSV. */
export const SupervisedPanel = ({ person }: { readonly person: Person }) => {
  const query = useQuery(supervisedQuery(person.id));
  const isApprentice = workerRoleOf(person.roles) === 'apprentice';
  if (!isApprentice && (query.data ?? []).length === 0) return null;
  return (
    <div className="mt-14 max-w-5xl">
      <Panel title="Done under supervision">
        <Loaded query={query} what="the record">
          {(steps) =>
            steps.length === 0 ? (
              <p className="text-soft">
                Nothing yet. What a second person signs for on this apprentice’s cards is listed here.
              </p>
            ) : (
              <>
                <p>
                  <a href={supervisedCsvPath(person.id)} download className={buttonClass()}>
                    Export as CSV
                  </a>
                </p>
                <Steps steps={steps} />
              </>
            )
          }
        </Loaded>
      </Panel>
    </div>
  );
};
