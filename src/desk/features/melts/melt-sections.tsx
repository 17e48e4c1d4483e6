import type { ReactNode } from 'react';
import type { Melt } from '#shared/contracts/melt.ts';
import { CardFiguresList } from '#src/desk/parts/card-figures-list.tsx';
import { AmendForm } from './amend-form.tsx';
import { CoolingCurveSection } from './cooling-curve-section.tsx';
import { HandOvers } from './hand-overs.tsx';
import { MeltBeamView } from './melt-beam-view.tsx';
import { AmendmentNote, MeltEvents } from './melt-events.tsx';
import { MetalAccount } from './metal-account.tsx';
import { Photographs } from './photographs.tsx';
import { PourSummary } from './pour-summary.tsx';
import { ReadingsChart } from './readings-chart.tsx';
import { StepsDone } from './steps-done.tsx';
import { Variances } from './variances.tsx';

interface SectionProps {
  readonly id: string;
  readonly title: string;
  readonly children: ReactNode;
}

const Section = ({ id, title, children }: SectionProps) => (
  <section aria-labelledby={id} className="grid min-w-0 content-start gap-4 break-inside-avoid">
    <h2 id={id} className="text-[21px] font-black">
      {title}
    </h2>
    {children}
  </section>
);

const Remarks = ({ melt }: { readonly melt: Melt }) => {
  const whole = melt.amendments.filter(({ seq }) => seq === null);
  return (
    <div className="grid gap-6">
      {whole.map((amendment) => (
        <AmendmentNote key={amendment.at} amendment={amendment} />
      ))}
      {whole.length === 0 ? <p className="text-soft">No remark on the melt as a whole.</p> : null}
      {melt.abilities.amend ? <AmendForm melt={melt} /> : null}
    </div>
  );
};

/** The body of a melt's page. */
export const MeltSections = ({ melt }: { readonly melt: Melt }) => {
  const { rangeBasis, casting, instructionRevision } = melt;
  return (
    <>
      <Variances melt={melt} />
      <div className="grid gap-x-14 gap-y-12 xl:grid-cols-[minmax(0,1fr)_400px]">
        <Section id="readings" title="Readings">
          <ReadingsChart melt={melt} />
        </Section>
        <Section id="beam" title="On the melt beam">
          <MeltBeamView melt={melt} />
        </Section>
        <div className="grid gap-x-14 gap-y-12 md:grid-cols-2 xl:col-span-2">
          <Section id="metal" title="Metal">
            <MetalAccount melt={melt} />
          </Section>
          <Section id="pour" title="Pour and quench">
            <PourSummary melt={melt} />
          </Section>
        </div>
        <div className="xl:col-span-2">
          <Section id="figures" title="The card’s figures">
            <CardFiguresList
              figures={melt.context.figures}
              className="grid grid-cols-[repeat(auto-fill,minmax(190px,1fr))] gap-x-4 gap-y-2 border-y-2 border-line py-3"
            />
            <p className="text-soft">
              Fixed when the card was opened: alloy revision {casting.alloy.revision}, work instruction
              revision {instructionRevision}, melting range{' '}
              {rangeBasis === 'computed' ? 'computed' : 'measured, not computed'}. Press a figure to see where
              it comes from.
            </p>
          </Section>
        </div>
        <div className="xl:col-span-2">
          <Section id="cooling-curve" title="Cooling curve">
            <CoolingCurveSection melt={melt} />
          </Section>
        </div>
        <Section id="steps" title="Steps of the instruction">
          <StepsDone melt={melt} />
        </Section>
        <div className="grid content-start gap-12">
          <Section id="people" title="Who had the card">
            <HandOvers melt={melt} />
          </Section>
          <Section id="photographs" title="Photographs">
            <Photographs melt={melt} />
          </Section>
        </div>
        <Section id="entries" title="What happened">
          <MeltEvents melt={melt} />
        </Section>
        <Section id="remarks" title="Remarks">
          <Remarks melt={melt} />
        </Section>
      </div>
    </>
  );
};
