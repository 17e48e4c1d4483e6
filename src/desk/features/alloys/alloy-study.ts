import {
  binarySection,
  freezingPath,
  rangeBand,
  type Composition,
  type FreezingPath,
  type Outcome,
  type RangeBand,
  type Section,
  type SectionPoint,
  type SectionRequest,
} from '#shared/metallurgy/index.ts';
import { refineSolidus } from './refine-solidus.ts';
import { threePhaseRoof } from './three-phase-roof.ts';

/** A section ready to draw, with the upper edge of its three-phase field. */
export interface SectionStudy {
  readonly section: Section;
  readonly roof: readonly SectionPoint[];
}

/** Both freezing paths of an alloy. */
export interface FreezingStudy {
  readonly lever: FreezingPath;
  readonly scheil: FreezingPath;
}

const pathStepC = 1;

const sectionStudy = ({ request }: { readonly request: SectionRequest }): Outcome<SectionStudy> => {
  const answer = binarySection(request);
  if (!answer.withinModel) return answer;
  const section = refineSolidus(answer);
  return { withinModel: true, section, roof: threePhaseRoof(section) };
};

const freezingStudy = ({
  compositionWt,
}: {
  readonly compositionWt: Composition;
}): Outcome<FreezingStudy> => {
  const lever = freezingPath(compositionWt, { rule: 'lever', stepC: pathStepC });
  if (!lever.withinModel) return lever;
  const scheil = freezingPath(compositionWt, { rule: 'scheil', stepC: pathStepC });
  return scheil.withinModel ? { withinModel: true, lever, scheil } : scheil;
};

const bandStudy = ({
  compositionWt,
  toleranceWt,
}: {
  readonly compositionWt: Composition;
  readonly toleranceWt: Readonly<Record<string, number>>;
}): Outcome<RangeBand> => rangeBand(compositionWt, toleranceWt);

/** The computations too long for the page's own thread; each takes plain data and gives plain data. */
export const alloyStudies = { section: sectionStudy, freezing: freezingStudy, band: bandStudy } as const;

/** The name of one study. */
export type StudyName = keyof typeof alloyStudies;
/** What a study is asked. */
export type StudyInput<Name extends StudyName> = Parameters<(typeof alloyStudies)[Name]>[0];
/** What a study answers. */
export type StudyAnswer<Name extends StudyName> = ReturnType<(typeof alloyStudies)[Name]>;

/** Runs one study by name. */
export const runStudy = <Name extends StudyName>(name: Name, input: StudyInput<Name>): StudyAnswer<Name> =>
  (alloyStudies[name] as (input: StudyInput<Name>) => StudyAnswer<Name>)(input);
