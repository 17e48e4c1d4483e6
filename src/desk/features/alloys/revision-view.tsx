import { useMemo } from 'react';
import type { Alloy, AlloyRevision } from '#shared/contracts/alloy.ts';
import { meltingRange } from '#shared/metallurgy/index.ts';
import { Notice } from '#src/ui/notice.tsx';
import type { StudioWriting } from '../../parts/use-studio.ts';
import { BenchPanel } from './bench-panel.tsx';
import { revisionBefore } from './choose-revision.ts';
import { ComparisonPanel } from './comparison-panel.tsx';
import { ComputedView, useAlloyStudies } from './computed-view.tsx';
import { DensityPanel } from './density-panel.tsx';
import { MeasuredView } from './measured-view.tsx';
import { ProvenancePanel } from './provenance-panel.tsx';
import { QuenchPanel } from './quench-panel.tsx';
import { RevisionsPanel } from './revisions-panel.tsx';
import { TolerancePanel } from './tolerance-panel.tsx';

/** Props of {@link RevisionView}. */
export interface RevisionViewProps {
  readonly alloy: Alloy;
  readonly revision: AlloyRevision;
  readonly studio: StudioWriting;
}

/** Everything about one revision: picture, figures, bench, quench, density, provenance, and the revisions beside it. */
export const RevisionView = ({ alloy, revision, studio }: RevisionViewProps) => {
  const { compositionWt, toleranceWt, figures, quench } = revision;
  const range = useMemo(() => meltingRange(compositionWt), [compositionWt]);
  const isHeld = figures.basis === 'computed' && range.withinModel;
  const queries = useAlloyStudies(revision, isHeld);
  return (
    <>
      {figures.basis === 'measured' ? (
        <MeasuredView revision={revision} studio={studio} />
      ) : range.withinModel ? (
        <ComputedView revision={revision} range={range} studio={studio} queries={queries} />
      ) : (
        <Notice kind="caution" title="Today’s engine does not compute this revision">
          {range.reason}
        </Notice>
      )}
      <div className="mt-14 grid gap-x-14 gap-y-12 lg:grid-cols-2">
        {isHeld ? (
          <>
            <TolerancePanel query={queries.band} toleranceWt={toleranceWt} studio={studio} />
            <BenchPanel compositionWt={compositionWt} studio={studio} />
          </>
        ) : null}
        <QuenchPanel quench={quench} compositionWt={compositionWt} />
        <DensityPanel figures={figures} compositionWt={compositionWt} />
        <ComparisonPanel before={revisionBefore(alloy, revision)} now={revision} studio={studio} />
        <ProvenancePanel revision={revision} />
        <div className="min-w-0 lg:col-span-2">
          <RevisionsPanel alloy={alloy} shown={revision} studio={studio} />
        </div>
      </div>
    </>
  );
};
