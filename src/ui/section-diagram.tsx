import { memo, useId } from 'react';
import {
  diagramPath,
  isNarrow,
  type DiagramFrame,
  type DiagramPoint,
  type DiagramScales,
} from './section-diagram-frame.ts';
import { sectionFill, SectionFills, type FieldKind } from './section-diagram-fills.tsx';
import type { LabelPlace } from './section-diagram-labels.ts';

/** A field of a section, closed, later ones lying over earlier ones. */
export interface DiagramField {
  readonly kind: FieldKind;
  readonly words: string;
  /** What is written where the words have no room. */
  readonly shortWords?: string;
  readonly outline: readonly DiagramPoint[];
}

/** A boundary of a section. */
export interface DiagramLine {
  readonly name: string;
  readonly points: readonly DiagramPoint[];
}

/** A mark on an axis with what is written at it. */
export interface DiagramTick {
  readonly at: number;
  readonly words: string;
}

/** The invariant of a section and where its sentence stands, px. */
export interface DiagramNote {
  readonly words: string;
  readonly x: number;
  readonly y: number;
}

/** The alloy's own line, its composition tolerance, and how far its liquidus and solidus may lie for it. */
export interface DiagramAlloy {
  readonly x: number;
  readonly toleranceWt: number;
  readonly bands: readonly { readonly low: number; readonly high: number }[];
}

/** Props of {@link SectionDiagram}; fields and lines in wt% and °C. */
export interface SectionDiagramProps {
  readonly frame: DiagramFrame;
  readonly scales: DiagramScales;
  readonly fields: readonly DiagramField[];
  readonly lines: readonly DiagramLine[];
  readonly labels: readonly (LabelPlace | null)[];
  readonly notes: readonly DiagramNote[];
  readonly alloy: DiagramAlloy;
  readonly xTicks: readonly DiagramTick[];
  readonly yTicks: readonly DiagramTick[];
  /** Words under the left and right end of the axis of composition. */
  readonly ends: readonly [string, string];
  /** The whole picture in one or two sentences. */
  readonly label: string;
}

const halo = { paintOrder: 'stroke', strokeLinejoin: 'round' } as const;

const Fields = ({
  fields,
  scales,
  id,
}: Pick<SectionDiagramProps, 'fields' | 'scales'> & { readonly id: string }) =>
  fields.map(({ kind, words, outline }) => (
    <path
      key={words}
      d={`${diagramPath(outline, scales)}Z`}
      fill={sectionFill(id, kind)}
      data-field={words}
    />
  ));

const AlloyLine = ({ alloy, scales, frame }: Pick<SectionDiagramProps, 'alloy' | 'scales' | 'frame'>) => {
  const x = scales.x(alloy.x);
  const half = Math.abs(scales.x(alloy.x + alloy.toleranceWt) - x);
  return (
    <g data-part="alloy">
      {half > 0 ? (
        <rect
          x={x - half}
          y={frame.top}
          width={2 * half}
          height={frame.bottom - frame.top}
          className="fill-ember"
          opacity="0.2"
          data-part="tolerance"
        />
      ) : null}
      <path
        d={`M${x} ${frame.top} V${frame.bottom}`}
        className="stroke-ember"
        strokeWidth="3"
        strokeDasharray="9 7"
      />
      {alloy.bands.map(({ low, high }) => (
        <path
          key={low}
          d={`M${x - 7} ${scales.y(high)} h14 m-7 0 V${scales.y(low)} m-7 0 h14`}
          fill="none"
          className="stroke-ember"
          strokeWidth="3"
          data-part="band"
        />
      ))}
    </g>
  );
};

const Axes = ({
  frame,
  scales,
  xTicks,
  yTicks,
  ends,
}: Omit<SectionDiagramProps, 'fields' | 'lines' | 'label'>) => {
  const size = isNarrow(frame) ? 13 : 15;
  return (
    <>
      <g className="fill-soft font-extrabold" fontSize={size}>
        {yTicks.map(({ at, words }) => (
          <text key={at} x={frame.left - 9} y={scales.y(at)} dominantBaseline="central" textAnchor="end">
            {words}
          </text>
        ))}
        {xTicks.map(({ at, words }) => (
          <text
            key={at}
            x={scales.x(at)}
            y={frame.bottom + 22}
            textAnchor={at === scales.x.domain()[1] ? 'end' : 'middle'}
          >
            {words}
          </text>
        ))}
      </g>
      <g className="fill-ink font-extrabold" fontSize={size + 1}>
        <text x={frame.left} y={frame.bottom + 47}>
          {ends[0]}
        </text>
        <text x={frame.right} y={frame.bottom + 47} textAnchor="end">
          {ends[1]}
        </text>
      </g>
    </>
  );
};

const Leaders = ({ labels }: Pick<SectionDiagramProps, 'labels'>) =>
  labels.map((place) =>
    place?.leader ? (
      <g key={place.words} className="stroke-ink">
        <path
          d={`M${place.x} ${place.y + place.size * 0.7} L${place.leader.x} ${place.leader.y}`}
          strokeWidth="2"
          strokeLinecap="round"
        />
        <circle cx={place.leader.x} cy={place.leader.y} r="3.6" className="fill-ink" />
      </g>
    ) : null,
  );

const Labels = ({
  fields,
  labels,
  notes,
  frame,
}: Pick<SectionDiagramProps, 'fields' | 'labels' | 'notes' | 'frame'>) => (
  <g className="fill-ink stroke-ground font-black" textAnchor="middle" dominantBaseline="central">
    {fields.map(({ words }, index) => {
      const place = labels[index];
      return place ? (
        <text
          key={words}
          fontSize={place.size}
          strokeWidth="6"
          style={halo}
          transform={`translate(${place.x} ${place.y})${place.upright ? ' rotate(-90)' : ''}`}
        >
          {place.words}
        </text>
      ) : null;
    })}
    {notes.map(({ words, x, y }) => (
      <text key={words} x={x} y={y} fontSize={isNarrow(frame) ? 12 : 15} strokeWidth="6" style={halo}>
        {words}
      </text>
    ))}
  </g>
);

/**
 * A phase diagram at rest: fields told apart by hatching, dots and plain ground, their boundaries, the alloy's own line
 * with its tolerance. What moves lies over it in a picture of its own.
 */
export const SectionDiagram = memo((props: SectionDiagramProps) => {
  const { frame, scales, fields, lines, label } = props;
  const id = useId();
  const { left, top, right, bottom } = frame;
  return (
    <svg width={frame.width} height={frame.height} role="img" aria-label={label} className="block">
      <SectionFills id={id} />
      <clipPath id={`${id}-frame`}>
        <rect x={left} y={top} width={right - left} height={bottom - top} />
      </clipPath>
      <g clipPath={`url(#${id}-frame)`}>
        <Fields fields={fields} scales={scales} id={id} />
        {lines.map(({ name, points }, index) => (
          <path
            key={`${name}-${index}`}
            d={diagramPath(points, scales)}
            fill="none"
            className="stroke-ink"
            strokeWidth="3.2"
            strokeLinejoin="round"
            data-line={name}
          />
        ))}
        <AlloyLine {...props} />
      </g>
      <rect
        x={left}
        y={top}
        width={right - left}
        height={bottom - top}
        fill="none"
        className="stroke-ink"
        strokeWidth="3"
      />
      <Axes {...props} />
      <Leaders {...props} />
      <Labels {...props} />
    </svg>
  );
});
SectionDiagram.displayName = 'SectionDiagram';
