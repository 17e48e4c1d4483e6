import { Link } from 'react-router-dom';
import type { Alloy, AlloyRevision } from '#shared/contracts/alloy.ts';
import type { StudioWriting } from '../../parts/use-studio.ts';
import { writeComposition } from './element-names.ts';
import { Panel } from './panel.tsx';
import { PlainTable } from './plain-table.tsx';
import { RevisionStatusMark } from './revision-status.tsx';

/** Props of {@link RevisionsPanel}. */
export interface RevisionsPanelProps {
  readonly alloy: Alloy;
  readonly shown: AlloyRevision;
  readonly studio: StudioWriting;
}

const people = ({ draftedBy, checkedBy, approvedBy }: AlloyRevision): string =>
  [
    `drafted by ${draftedBy}`,
    checkedBy ? `checked by ${checkedBy}` : '',
    approvedBy ? `approved by ${approvedBy}` : '',
  ]
    .filter(Boolean)
    .join(', ');

/** Every revision of an alloy, newest first, each leading to its own page. */
export const RevisionsPanel = ({ alloy, shown, studio }: RevisionsPanelProps) => (
  <Panel title="Revisions">
    <div>
      <PlainTable
        caption="Revisions of this alloy"
        heads={['Revision', 'State', 'Composition, wt%', 'Liquidus', 'Solidus', 'People', 'Note']}
        align="left"
        rows={alloy.revisions.map((revision) => ({
          key: revision.id,
          cells: [
            <Link
              key="link"
              to={`/alloys/${alloy.id}?revision=${revision.number}`}
              aria-current={revision.id === shown.id ? 'page' : undefined}
              className="rounded-md font-extrabold whitespace-nowrap underline decoration-2 underline-offset-4"
            >
              Revision {revision.number}
              {revision.id === shown.id ? ', shown' : ''}
            </Link>,
            <RevisionStatusMark key="mark" revision={revision} />,
            writeComposition(revision.compositionWt, revision.toleranceWt),
            studio.temperature(revision.figures.liquidusC),
            studio.temperature(revision.figures.solidusC),
            people(revision),
            revision.note || 'none',
          ],
        }))}
      />
    </div>
  </Panel>
);
