import { useMemo } from 'react';
import { tieLine, type RangeBand } from '#shared/metallurgy/index.ts';
import {
  diagramFrame,
  diagramScales,
  isNarrow,
  type DiagramFrame,
  type DiagramScales,
} from '#src/ui/section-diagram-frame.ts';
import { labelPlaces } from '#src/ui/section-diagram-labels.ts';
import { SectionTieLine } from '#src/ui/section-diagram-tie-line.tsx';
import { SectionDiagram, type DiagramNote } from '#src/ui/section-diagram.tsx';
import type { StudioWriting } from '../../parts/use-studio.ts';
import type { SectionStudy } from './alloy-study.ts';
import { temperatureTicks, wtTicks } from './axis-ticks.ts';
import { capitalised, elementName, writeWt } from './element-names.ts';
import { sectionDrawing } from './section-drawing.ts';
import { sectionSentence } from './section-sentence.ts';
import { sectionSpan } from './temperature-span.ts';
import { TemperatureHandle } from './temperature-handle.tsx';
import type { TemperatureInAddress } from './use-temperature-in-address.ts';

/** Props of {@link SectionPicture}. */
export interface SectionPictureProps {
  readonly study: SectionStudy;
  readonly width: number;
  /** The alloy's place on the axis and its tolerance there, wt%. */
  readonly x: number;
  readonly toleranceWt: number;
  readonly solvusC: number | null;
  readonly band: RangeBand | null;
  readonly temperature: TemperatureInAddress;
  readonly studio: StudioWriting;
  readonly spoken: string;
}

const endsOf = ({ section }: SectionStudy): readonly [string, string] => {
  const { request } = section;
  if (request.kind === 'carat') {
    const gold = writeWt(request.goldWt);
    return [`Gold ${gold}, silver ${writeWt(100 - request.goldWt)}`, `Copper, wt%; gold ${gold}`];
  }
  const [first, second] = request.elements.map((symbol) => capitalised(elementName(symbol)));
  return [first ?? '', `${second ?? ''}, wt%`];
};

const notesOf = (
  { section }: SectionStudy,
  scales: DiagramScales,
  frame: DiagramFrame,
  studio: StudioWriting,
): readonly DiagramNote[] =>
  section.invariants.map(({ name, temperatureC, fromX, liquidX, toX }) => {
    const degrees = studio.temperature(temperatureC);
    if (name === 'eutectic') {
      const words = isNarrow(frame) ? `${degrees}, nothing free` : `${degrees}, three phases, nothing free`;
      return { words, x: scales.x((fromX + toX) / 2), y: scales.y(temperatureC) + 20 };
    }
    const words = `${degrees}, solid and liquid alike`;
    const half = words.length * 4.4;
    const x = Math.min(frame.right - half, Math.max(frame.left + half, scales.x(liquidX)));
    return { words, x, y: scales.y(temperatureC) + 26 };
  });

/** What stays while the temperature moves: computed once for an alloy and a width. */
const useStillPicture = ({ study, width, x, toleranceWt, solvusC, band, studio }: SectionPictureProps) =>
  useMemo(() => {
    const { section } = study;
    const span = sectionSpan(section, solvusC);
    const frame = diagramFrame(width);
    const scales = diagramScales(frame, { xMin: section.xMin, xMax: section.xMax, ...span });
    const drawing = sectionDrawing(study, span.lowC, span.highC);
    const alloyX = scales.x(x);
    const clear = [{ left: alloyX - 14, right: alloyX + 14 }];
    const sizes = isNarrow(frame) ? [14, 13, 12, 11] : [18, 16, 14, 13];
    return {
      span,
      frame,
      scales,
      ...drawing,
      labels: labelPlaces(drawing.fields, scales, frame, clear, sizes),
      notes: notesOf(study, scales, frame, studio),
      alloy: { x, toleranceWt, bands: band ? [band.liquidusC, band.solidusC] : [] },
      xTicks: wtTicks(section.xMin, section.xMax, isNarrow(frame) ? 4 : 6),
      yTicks: temperatureTicks(span, studio.units.temperature),
      ends: endsOf(study),
      label: sectionSentence(study, x, studio.temperature),
    };
  }, [study, width, x, toleranceWt, solvusC, band, studio]);

/** The section of an alloy with its own line, and over it the tie line at a temperature that can be dragged. */
export const SectionPicture = (props: SectionPictureProps) => {
  const { study, x, temperature, studio, spoken } = props;
  const { span, ...still } = useStillPicture(props);
  const { frame, scales } = still;
  const tie = tieLine(study.section, x, temperature.atC);
  const y = scales.y(Math.min(span.highC, Math.max(span.lowC, temperature.atC)));
  return (
    <div className="relative">
      <SectionDiagram {...still} />
      <TemperatureHandle
        frame={frame}
        scale={scales.y}
        span={span}
        temperature={temperature}
        studio={studio}
        spoken={spoken}
      >
        <SectionTieLine
          y={y}
          left={frame.left}
          right={frame.right}
          alloyX={scales.x(x)}
          inPlane={!tie.withinModel || tie.inPlane}
          ends={
            tie.withinModel
              ? tie.ends.map((end) => ({
                  x: scales.x(end.x),
                  massFraction: end.massFraction,
                  isLiquid: end.name === 'liquid',
                }))
              : []
          }
        />
      </TemperatureHandle>
    </div>
  );
};
