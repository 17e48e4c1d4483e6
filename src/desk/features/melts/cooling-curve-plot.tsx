import { scaleLinear } from 'd3-scale';
import { useMemo, useRef } from 'react';
import type { CoolingCurve } from '#shared/contracts/cooling-curve.ts';
import type { CurvePoint } from '#shared/domain/cooling-curve/curve-point.ts';
import type { Melt } from '#shared/contracts/melt.ts';
import { fromCelsius, toCelsius } from '#shared/lib/units.ts';
import { spreadLabels } from '#src/ui/spread-labels.ts';
import { useStudio } from '#src/desk/parts/use-studio.ts';
import { useWidth } from '#src/desk/parts/use-width.ts';
import { computedCurve } from './computed-curve.ts';

const height = 440;

type Scale = (value: number) => number;

const pathOf = (points: readonly CurvePoint[], x: Scale, y: Scale): string =>
  points
    .map(
      ({ seconds, temperatureC }, k) =>
        `${k === 0 ? 'M' : 'L'}${x(seconds / 60).toFixed(1)} ${y(temperatureC).toFixed(1)}`,
    )
    .join('');

/** The curve from where it was last heated past the lowest it cooled to: the heating says nothing of the alloy. */
const fromHolding = (points: readonly CurvePoint[]): readonly CurvePoint[] => {
  const highest = Math.max(...points.map(({ temperatureC }) => temperatureC));
  const top = points.findIndex(({ temperatureC }) => temperatureC === highest);
  const low = Math.min(...points.slice(top).map(({ temperatureC }) => temperatureC));
  const heated = points.findLastIndex(({ temperatureC }, k) => k < top && temperatureC < low);
  return points.slice(heated + 1);
};

interface Named {
  readonly text: string;
  readonly celsius: number;
  readonly hot: boolean;
}

const Names = ({
  labels,
  y,
  right,
  bottom,
}: {
  readonly labels: readonly Named[];
  readonly y: Scale;
  readonly right: number;
  readonly bottom: number;
}) => {
  const places = spreadLabels(
    labels.map(({ celsius }) => y(celsius)),
    22,
    bottom - 8,
  );
  return (
    <g className="text-[15px] font-black">
      {labels.map(({ text, hot }, k) => (
        <text
          key={text}
          x={right + 10}
          y={places[k]}
          dominantBaseline="central"
          className={hot ? 'fill-ember' : 'fill-ink'}
        >
          {text}
        </text>
      ))}
    </g>
  );
};

/** A logged cooling curve drawn over the computed one of the alloy it should be. */
export const CoolingCurvePlot = ({ melt, curve }: { readonly melt: Melt; readonly curve: CoolingCurve }) => {
  const box = useRef<HTMLDivElement>(null);
  const width = Math.max(360, useWidth(box, 720));
  const { degrees, temperature, units } = useStudio();
  const { verdict } = curve;
  const points = useMemo(() => fromHolding(curve.points), [curve.points]);
  const computed = useMemo(() => computedCurve(curve, melt.compositionWt), [curve, melt.compositionWt]);
  const temperatures = points.map(({ temperatureC }) => temperatureC);
  const [low, high] = [Math.min(...temperatures), Math.max(...temperatures)];
  const [begin, last] = [points[0]?.seconds ?? 0, points.at(-1)?.seconds ?? 0].map((each) => each / 60) as [
    number,
    number,
  ];
  const frame = { left: 52, right: width - 190, top: 16, bottom: height - 60 };
  const x = scaleLinear([begin, last], [frame.left, frame.right]);
  const y = scaleLinear([low - 10, high + 10], [frame.bottom, frame.top]);
  const ticks = scaleLinear(
    [low, high].map((celsius) => fromCelsius(celsius, units.temperature)),
    [0, 1],
  )
    .ticks(6)
    .map((value) => toCelsius(value, units.temperature));
  const { observed, computed: range } = verdict;
  const labels: readonly Named[] = [
    ...(range
      ? [{ text: `computed liquidus ${degrees(range.liquidusC)}`, celsius: range.liquidusC, hot: true }]
      : []),
    ...(observed
      ? [{ text: `found ${degrees(observed.liquidusC)}`, celsius: observed.liquidusC, hot: false }]
      : []),
    ...(observed?.plateauC
      ? [{ text: `plateau ${degrees(observed.plateauC)}`, celsius: observed.plateauC, hot: false }]
      : []),
  ].filter(({ celsius }) => celsius > low - 10 && celsius < high + 10);
  return (
    <div ref={box} className="min-w-0">
      <svg
        viewBox={`0 0 ${width} ${height}`}
        className="w-full"
        fill="none"
        role="img"
        aria-label={`Logged from ${temperature(high)} down to ${temperature(low)} over ${(last - begin).toFixed(0)} minutes${range ? `, over the computed curve with its liquidus at ${temperature(range.liquidusC)}` : ''}. ${verdict.sentence}`}
      >
        <g className="fill-soft text-[15px] font-extrabold">
          {ticks.map((celsius) => (
            <g key={celsius}>
              <path
                d={`M${frame.left} ${y(celsius)} H${frame.right}`}
                className="stroke-line"
                strokeWidth="1.5"
              />
              <text x={frame.left - 10} y={y(celsius)} textAnchor="end" dominantBaseline="central">
                {degrees(celsius)}
              </text>
            </g>
          ))}
          {x.ticks(7).map((minutes) => (
            <text key={minutes} x={x(minutes)} y={frame.bottom + 24} textAnchor="middle">
              {minutes}
            </text>
          ))}
          <text x={frame.left} y={frame.bottom + 48}>
            minutes; logged as a line, computed as dashes
          </text>
        </g>
        {range && range.liquidusC > low && range.liquidusC < high ? (
          <path
            d={`M${frame.left} ${y(range.liquidusC)} H${frame.right}`}
            className="stroke-ember"
            strokeWidth="2"
          />
        ) : null}
        <path
          d={pathOf(
            computed.filter(({ seconds }) => seconds >= begin * 60 && seconds <= last * 60),
            x,
            y,
          )}
          className="stroke-ember"
          strokeWidth="4"
          strokeDasharray="10 6"
        />
        <path d={pathOf(points, x, y)} className="stroke-ink" strokeWidth="2.5" strokeLinejoin="round" />
        {observed ? (
          <circle
            cx={x(observed.liquidusAtS / 60)}
            cy={y(observed.liquidusC)}
            r="7"
            className="fill-ground stroke-ink"
            strokeWidth="3.5"
          />
        ) : null}
        <path
          d={`M${frame.left} ${frame.top} V${frame.bottom} H${frame.right}`}
          className="stroke-ink"
          strokeWidth="3"
        />
        <Names labels={labels} y={y} right={frame.right} bottom={frame.bottom} />
      </svg>
    </div>
  );
};
