import { useQuery } from '@tanstack/react-query';
import type { CoolingCurve } from '#shared/contracts/cooling-curve.ts';
import type { Melt } from '#shared/contracts/melt.ts';
import { coolingCurvesQuery } from '#src/api/cooling-curves.ts';
import { StateMark, type State } from '#src/ui/state-mark.tsx';
import { Loaded } from '#src/desk/parts/loaded.tsx';
import { useStudio } from '#src/desk/parts/use-studio.ts';
import { CoolingCurvePlot } from './cooling-curve-plot.tsx';
import { CoolingCurveTable } from './cooling-curve-table.tsx';
import { CoolingCurveUpload } from './cooling-curve-upload.tsx';

const states: Readonly<Record<CoolingCurve['verdict']['kind'], State>> = {
  agrees: 'ready',
  differs: 'stop',
  'cannot-tell': 'caution',
};

const Curve = ({ melt, curve }: { readonly melt: Melt; readonly curve: CoolingCurve }) => {
  const { clock } = useStudio();
  const logged = curve.instrument ?? 'an instrument that was not named';
  return (
    <article aria-label={`Cooling curve of ${clock.dayAndTime(curve.at)}`} className="grid gap-4">
      <StateMark state={states[curve.verdict.kind]} text={curve.verdict.sentence} />
      <div className="grid items-start gap-x-14 gap-y-6 xl:grid-cols-[minmax(0,1fr)_400px]">
        <CoolingCurvePlot melt={melt} curve={curve} />
        <CoolingCurveTable curve={curve} />
      </div>
      <p className="text-[15px] text-soft">
        {curve.pointCount} points of {logged}, handed in by {curve.person}, {clock.dayAndTime(curve.at)}.
        {curve.note === '' ? '' : ` ${curve.note}`}
      </p>
    </article>
  );
};

/** A melt's cooling curves, each drawn over the computed one with what it says of the metal, and where one is handed in. */
export const CoolingCurveSection = ({ melt }: { readonly melt: Melt }) => {
  const query = useQuery(coolingCurvesQuery(melt.id));
  return (
    <Loaded query={query} what="the cooling curves">
      {({ curves, abilities }) => (
        <div className="grid gap-8">
          {curves.map((curve) => (
            <Curve key={curve.id} melt={melt} curve={curve} />
          ))}
          {curves.length === 0 ? (
            <p className="text-soft">
              No cooling curve of this melt. Logged while the metal cools, it tells whether what is in the
              crucible freezes where this alloy should.
            </p>
          ) : null}
          {abilities.record ? <CoolingCurveUpload meltId={melt.id} /> : null}
        </div>
      )}
    </Loaded>
  );
};
