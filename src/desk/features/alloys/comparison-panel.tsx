import type { AlloyRevision } from '#shared/contracts/alloy.ts';
import type { StudioWriting } from '../../parts/use-studio.ts';
import { compareRevisions } from './compare-revisions.ts';
import { Panel } from './panel.tsx';
import { PlainTable } from './plain-table.tsx';

/** A revision beside the one before it; what differs says so in words and with its sign. */
export const ComparisonPanel = ({
  before,
  now,
  studio,
}: {
  readonly before: AlloyRevision | undefined;
  readonly now: AlloyRevision;
  readonly studio: StudioWriting;
}) => {
  if (!before) {
    return (
      <Panel title="Compared with the revision before">
        <p className="text-soft">This is the first revision: there is none before it.</p>
      </Panel>
    );
  }
  const rows = compareRevisions(before, now, {
    temperature: studio.temperature,
    unit: studio.units.temperature,
  });
  const changes = rows.filter(({ isChanged }) => isChanged).length;
  return (
    <Panel title={`Compared with revision ${before.number}`}>
      <p className="text-soft">
        {changes === 0
          ? 'Nothing differs.'
          : `${changes} of ${rows.length} lines differ; they are marked by a sign or a word.`}
      </p>
      <div>
        <PlainTable
          caption={`Revision ${now.number} compared with revision ${before.number}`}
          heads={['Compared', `Revision ${before.number}`, `Revision ${now.number}`, 'Change']}
          rows={rows.map(({ what, before: was, now: is, change, isChanged }) => ({
            key: what,
            cells: [
              what,
              was,
              isChanged ? <strong className="font-black">{is}</strong> : is,
              isChanged ? (
                <strong className="font-black">{change}</strong>
              ) : (
                <span className="text-soft">{change}</span>
              ),
            ],
          }))}
        />
      </div>
    </Panel>
  );
};
