import { useMemo } from 'react';
import { formatTemperatureDifference } from '#shared/lib/units.ts';
import {
  benchFigures,
  type BenchFigures,
  type BenchLimit,
  type BenchWindow,
} from '#shared/metallurgy/index.ts';
import { FigureBasis } from '#src/ui/figure-basis.tsx';
import type { StudioWriting } from '../../parts/use-studio.ts';
import { Panel } from './panel.tsx';

const pages = {
  ceiling:
    'Limit from the phase diagram; margin after Corti, Carat gold solders for jewellery making. Maker’s sheets come first.',
  window:
    'Phase diagram and trade sheets; the furnace margin is common practice, no source. Maker’s sheets come first.',
} as const;

const Ceiling = ({
  label,
  limit,
  studio,
}: {
  readonly label: string;
  readonly limit: BenchLimit;
  readonly studio: StudioWriting;
}) => {
  const write = (celsius: number | null): string =>
    celsius === null ? 'not computed' : studio.temperature(celsius);
  const margin = formatTemperatureDifference(limit.marginC, studio.units.temperature);
  return (
    <FigureBasis
      label={label}
      value={limit.stayBelowC === null ? 'not computed' : `below ${write(limit.stayBelowC)}`}
      basis={{
        rule: `${limit.basis} The torch stays a margin below it.`,
        inputs: [
          { label: 'Melting begins', value: write(limit.temperatureC) },
          { label: 'Margin', value: margin },
        ],
        source: pages.ceiling,
      }}
    />
  );
};

const Span = ({
  label,
  span,
  studio,
}: {
  readonly label: string;
  readonly span: BenchWindow;
  readonly studio: StudioWriting;
}) => {
  const { fromC, toC } = span;
  const value =
    fromC === null || toC === null ? 'none' : `${studio.degrees(fromC)} to ${studio.temperature(toC)}`;
  return (
    <FigureBasis
      label={label}
      value={value}
      basis={{
        rule: span.basis,
        inputs: [
          {
            label: 'Margin below melting',
            value: formatTemperatureDifference(span.marginC, studio.units.temperature),
          },
        ],
        source: pages.window,
      }}
    />
  );
};

const Figures = ({ figures, studio }: { readonly figures: BenchFigures; readonly studio: StudioWriting }) => (
  <>
    <div className="grid gap-x-6 gap-y-3 sm:grid-cols-2">
      <Ceiling label="Torch ceiling, as cast" limit={figures.torchCeilingAsCastC} studio={studio} />
      <Ceiling label="Torch ceiling, homogenised" limit={figures.torchCeilingHomogenisedC} studio={studio} />
      <Span label="Solution window" span={figures.solutionWindowC} studio={studio} />
      <Span label="Anneal window" span={figures.annealWindowC} studio={studio} />
    </div>
    <p className="text-[15px] text-soft">
      Press a figure for its margin and source. The maker’s own sheet and your own competent person come
      first.
    </p>
  </>
);

/** What the diagram means at the bench: torch ceilings, solution and anneal windows, with their margins. */
export const BenchPanel = ({
  compositionWt,
  studio,
}: {
  readonly compositionWt: Readonly<Record<string, number>>;
  readonly studio: StudioWriting;
}) => {
  const figures = useMemo(() => benchFigures(compositionWt), [compositionWt]);
  return (
    <Panel title="At the bench">
      {figures.withinModel ? (
        <Figures figures={figures} studio={studio} />
      ) : (
        <p className="text-soft">Not computed: {figures.reason}</p>
      )}
    </Panel>
  );
};
