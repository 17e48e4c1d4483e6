import { scaleLinear } from 'd3-scale';
import { memo } from 'react';

/** One point of a freezing path: °C and the share of the mass that is solid, 0 to 1. */
export interface FreezingPoint {
  readonly temperatureC: number;
  readonly solidMassFraction: number;
}

/** Where a freezing curve stands in its picture and what its axes span, px and °C. */
export interface FreezingFrame {
  readonly width: number;
  readonly height: number;
  readonly left: number;
  readonly right: number;
  readonly top: number;
  readonly bottom: number;
  readonly lowC: number;
  readonly highC: number;
}

/** Props of {@link FreezingCurve}. */
export interface FreezingCurveProps {
  readonly frame: FreezingFrame;
  readonly lever: readonly FreezingPoint[];
  readonly scheil: readonly FreezingPoint[];
  readonly ticks: readonly { readonly at: number; readonly words: string }[];
  /** The whole picture in one or two sentences. */
  readonly label: string;
}

/** The frame of a freezing curve of this size between two temperatures; `room` px are kept free at the right. */
export const freezingFrame = (
  width: number,
  height: number,
  { lowC, highC }: { readonly lowC: number; readonly highC: number },
  room = 10,
): FreezingFrame => ({
  width,
  height,
  left: 50,
  right: width - room,
  top: 10,
  bottom: height - 34,
  lowC,
  highC,
});

/** From share of solid and °C to px. */
export const freezingScales = ({ left, right, top, bottom, lowC, highC }: FreezingFrame) => ({
  x: scaleLinear([0, 1], [left, right]),
  y: scaleLinear([lowC, highC], [bottom, top]),
});

type Scales = ReturnType<typeof freezingScales>;

const pathOf = (points: readonly FreezingPoint[], { x, y }: Scales): string =>
  points
    .map(
      (p, k) => `${k === 0 ? 'M' : 'L'}${x(p.solidMassFraction).toFixed(1)} ${y(p.temperatureC).toFixed(1)}`,
    )
    .join('');

/** The temperature at which a path reaches a share of solid. */
const heightAt = (points: readonly FreezingPoint[], share: number): number =>
  (points.find(({ solidMassFraction }) => solidMassFraction >= share) ?? points.at(-1))?.temperatureC ?? 0;

const halo = { paintOrder: 'stroke', strokeLinejoin: 'round' } as const;

/** How an alloy freezes from its liquidus down: slowly by the lever rule, and as cast by Scheil-Gulliver. */
export const FreezingCurve = memo(({ frame, lever, scheil, ticks, label }: FreezingCurveProps) => {
  const scales = freezingScales(frame);
  const { left, right, bottom, width, height } = frame;
  const { x, y } = scales;
  const leverLabelY = Math.max(frame.top + 12, y(heightAt(lever, 0.66)) - 16);
  const scheilLabelY = Math.min(bottom - 8, y(heightAt(scheil, 0.5)) + 30);
  return (
    <svg width={width} height={height} role="img" aria-label={label} className="block">
      {ticks.map(({ at, words }) => (
        <g key={at}>
          <path d={`M${left} ${y(at)} H${right}`} className="stroke-line" strokeWidth="1.5" />
          <text
            x={left - 8}
            y={y(at)}
            textAnchor="end"
            dominantBaseline="central"
            className="fill-soft text-[14px] font-extrabold"
          >
            {words}
          </text>
        </g>
      ))}
      <path
        d={pathOf(scheil, scales)}
        fill="none"
        className="stroke-ember"
        strokeWidth="4"
        strokeLinejoin="round"
        data-curve="scheil"
      />
      <path
        d={pathOf(lever, scales)}
        fill="none"
        className="stroke-iron"
        strokeWidth="4"
        strokeDasharray="10 6"
        data-curve="lever"
      />
      <g className="stroke-ground text-[15px] font-black" strokeWidth="5" style={halo}>
        <text x={right} y={leverLabelY} textAnchor="end" className="fill-iron">
          slowly (lever)
        </text>
        <text x={x(0.46)} y={scheilLabelY} textAnchor="end" className="fill-ember">
          as cast (Scheil)
        </text>
      </g>
      <g className="fill-soft text-[14px] font-extrabold">
        <text x={left} y={height - 8}>
          0 % solid
        </text>
        <text x={right} y={height - 8} textAnchor="end">
          100 %
        </text>
      </g>
    </svg>
  );
});
FreezingCurve.displayName = 'FreezingCurve';
