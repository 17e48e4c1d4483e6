import type { UseQueryResult } from '@tanstack/react-query';
import type { MeltingRange, Outcome, RangeBand } from '#shared/metallurgy/index.ts';
import { Notice } from '#src/ui/notice.tsx';
import { Progress } from '#src/ui/progress.tsx';
import type { StudioWriting } from '../../parts/use-studio.ts';
import type { FreezingStudy, SectionStudy } from './alloy-study.ts';
import { FreezingPicture } from './freezing-picture.tsx';
import { SectionTable } from './picture-tables.tsx';
import type { SectionChoice } from './section-choice.ts';
import { SectionPicture } from './section-picture.tsx';
import { useElementWidth } from './use-element-width.ts';
import type { TemperatureInAddress } from './use-temperature-in-address.ts';

/** What the page computes beside itself, each when it is ready. */
export interface AlloyStudyQueries {
  readonly section: UseQueryResult<Outcome<SectionStudy>>;
  readonly freezing: UseQueryResult<Outcome<FreezingStudy>>;
  readonly band: UseQueryResult<Outcome<RangeBand>>;
}

/** Props of {@link MainPicture}. */
export interface MainPictureProps {
  readonly choice: SectionChoice;
  readonly range: MeltingRange;
  readonly toleranceWt: Readonly<Record<string, number>>;
  readonly queries: AlloyStudyQueries;
  readonly temperature: TemperatureInAddress;
  readonly studio: StudioWriting;
  readonly spoken: string;
}

const firstWidth = 880;

const Computing = ({ queries }: Pick<MainPictureProps, 'queries'>) => {
  const all = [queries.freezing, queries.band, queries.section];
  const done = all.filter(({ data }) => data !== undefined).length;
  return (
    <div className="grid min-h-96 content-center rounded-[18px] border-2 border-line p-8">
      <Progress
        label="Computing the diagram"
        value={done}
        max={all.length}
        text={`${done} of ${all.length} steps`}
      />
    </div>
  );
};

const resultOf = <Answer extends object>({ data }: UseQueryResult<Outcome<Answer>>): Answer | null =>
  data?.withinModel ? data : null;

const NoSection = ({
  queries,
  range,
  temperature,
  studio,
  spoken,
  why,
  width,
}: Omit<MainPictureProps, 'choice' | 'toleranceWt'> & { readonly why: string; readonly width: number }) => {
  const freezing = resultOf(queries.freezing);
  if (!freezing) return <Computing queries={queries} />;
  return (
    <>
      <h2 className="pb-2 text-[19px] font-black">How it freezes</h2>
      <FreezingPicture
        study={freezing}
        range={range}
        width={width}
        height={Math.min(520, Math.max(320, width * 0.6))}
        studio={studio}
        drag={{ temperature, spoken }}
      />
      <p className="max-w-prose pt-3 text-soft">
        <strong className="text-ink">No section is drawn.</strong> {why}
      </p>
    </>
  );
};

/** The page's main picture: the section where one applies, else the freezing curve with the reason why there is none. */
export const MainPicture = (props: MainPictureProps) => {
  const { choice, range, toleranceWt, queries, temperature, studio, spoken } = props;
  const [measure, width] = useElementWidth(firstWidth);
  const study = resultOf(queries.section);
  const refusal = queries.section.data?.withinModel === false ? queries.section.data.reason : null;
  const why = choice.request === null ? choice.whyNone : refusal;
  return (
    <div ref={measure}>
      {queries.section.error ? (
        <Notice kind="error" title={queries.section.error.message} />
      ) : why !== null ? (
        <NoSection {...props} why={why} width={width} />
      ) : study && choice.request !== null ? (
        <>
          <SectionPicture
            study={study}
            width={width}
            x={choice.x}
            toleranceWt={toleranceWt[choice.xElement] ?? 0}
            solvusC={range.solvusC}
            band={resultOf(queries.band)}
            temperature={temperature}
            studio={studio}
            spoken={spoken}
          />
          <SectionTable section={study.section} studio={studio} />
        </>
      ) : (
        <Computing queries={queries} />
      )}
    </div>
  );
};
