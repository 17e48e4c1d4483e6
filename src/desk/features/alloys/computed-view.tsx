import { useMemo } from 'react';
import type { AlloyRevision } from '#shared/contracts/alloy.ts';
import { equilibrium, tieLine, type MeltingRange } from '#shared/metallurgy/index.ts';
import { Spinner } from '#src/ui/spinner.tsx';
import type { StudioWriting } from '../../parts/use-studio.ts';
import { AtTemperature } from './at-temperature.tsx';
import { beamOfState } from './beam-of-state.ts';
import { writeWt } from './element-names.ts';
import { lastAtOnce } from './freezing-readings.ts';
import { FreezingPicture } from './freezing-picture.tsx';
import { MainPicture, type AlloyStudyQueries } from './main-picture.tsx';
import { MeltingRows } from './melting-rows.tsx';
import { Panel } from './panel.tsx';
import { phasesSentence } from './phase-words.ts';
import { FreezingTable } from './picture-tables.tsx';
import { sectionChoice } from './section-choice.ts';
import { TemperatureField } from './temperature-field.tsx';
import { useElementWidth } from './use-element-width.ts';
import { useStudy } from './use-study.ts';
import { useTemperatureInAddress } from './use-temperature-in-address.ts';

/** Props of {@link ComputedView}. */
export interface ComputedViewProps {
  readonly revision: AlloyRevision;
  readonly range: MeltingRange;
  readonly studio: StudioWriting;
  readonly queries: AlloyStudyQueries;
}

/** Asks for everything the page computes off its own thread. */
export const useAlloyStudies = (
  { compositionWt, toleranceWt }: Pick<AlloyRevision, 'compositionWt' | 'toleranceWt'>,
  isHeld: boolean,
): AlloyStudyQueries => {
  const { request } = sectionChoice(compositionWt);
  return {
    freezing: useStudy('freezing', isHeld ? { compositionWt } : null),
    band: useStudy('band', isHeld ? { compositionWt, toleranceWt } : null),
    section: useStudy('section', isHeld && request ? { request } : null),
  };
};

const toleranceWords = ({ toleranceWt, compositionWt }: AlloyRevision): string => {
  const given = Object.entries(toleranceWt).filter(([, wt]) => wt > 0);
  if (given.length === 0) return '';
  const widest = given.toSorted(([, a], [, b]) => b - a);
  const equal = widest.filter(([, wt]) => wt === widest[0]?.[1]);
  const [symbol, wt] = equal.toSorted(([a], [b]) => (compositionWt[a] ?? 0) - (compositionWt[b] ?? 0))[0] ?? [
    '',
    0,
  ];
  return given.length > 2 ? 'in tolerance' : `for ±${writeWt(wt)} ${symbol}`;
};

const FreezingAside = ({ queries, range, studio }: Omit<ComputedViewProps, 'revision'>) => {
  const [measure, width] = useElementWidth(430);
  const study = queries.freezing.data;
  return (
    <Panel title="How it freezes">
      <div ref={measure}>
        {study === undefined ? (
          <Spinner label="Computing the freezing curve" />
        ) : study.withinModel ? (
          <>
            <FreezingPicture study={study} range={range} width={width} height={212} studio={studio} />
            <FreezingTable study={study} studio={studio} />
          </>
        ) : (
          <p className="text-soft">Not computed: {study.reason}</p>
        )}
      </div>
    </Panel>
  );
};

const roundTo = (value: number, unit: number): number => Math.round(value / unit) * unit;

/** A revision the model holds: its picture with the temperature to drag, and beside it what stands there. */
export const ComputedView = (props: ComputedViewProps) => {
  const { revision, range, studio, queries } = props;
  const { compositionWt, toleranceWt } = revision;
  const choice = useMemo(() => sectionChoice(compositionWt), [compositionWt]);
  const temperature = useTemperatureInAddress(roundTo((range.liquidusC + range.solidusC) / 2, 1));
  const state = equilibrium(compositionWt, temperature.atC);
  const pair = state.withinModel ? beamOfState(state, compositionWt) : null;
  const shares = pair ? ` ${Math.round(pair.left.massFraction * 100)} % ${pair.left.words}.` : '';
  const spoken = state.withinModel ? `${phasesSentence(state)}${shares}` : state.reason;
  const section = queries.section.data;
  const tie =
    section?.withinModel && choice.request ? tieLine(section.section, choice.x, temperature.atC) : null;
  const freezing = queries.freezing.data;
  const hasSection = choice.request !== null && section?.withinModel !== false;
  return (
    <div className="grid grid-cols-1 gap-x-14 gap-y-8 xl:grid-cols-[minmax(0,1fr)_430px]">
      <div className="grid grid-cols-1 content-start gap-3">
        <MainPicture
          choice={choice}
          range={range}
          toleranceWt={toleranceWt}
          queries={queries}
          temperature={temperature}
          studio={studio}
          spoken={spoken}
        />
        <TemperatureField temperature={temperature} studio={studio} />
      </div>
      <div className="grid grid-cols-1 content-start gap-6">
        <AtTemperature
          atC={temperature.atC}
          state={state}
          compositionWt={compositionWt}
          studio={studio}
          inPlane={!tie?.withinModel || tie.inPlane}
        />
        <div>
          <MeltingRows
            figures={revision.figures}
            band={queries.band.data?.withinModel ? queries.band.data : null}
            toleranceWords={toleranceWords(revision)}
            lastAtOnce={freezing?.withinModel ? lastAtOnce(freezing.scheil.points) : null}
            studio={studio}
          />
          {range.note ? <p className="pt-2 text-[15px] text-soft">{range.note}</p> : null}
        </div>
        {hasSection ? <FreezingAside queries={queries} range={range} studio={studio} /> : null}
        {!hasSection && freezing?.withinModel ? <FreezingTable study={freezing} studio={studio} /> : null}
      </div>
    </div>
  );
};
