import { useId, useRef } from 'react';
import type { Melt } from '#shared/contracts/melt.ts';
import { PhasePatterns } from '#src/ui/phase-patterns.tsx';
import { spreadLabels } from '#src/ui/spread-labels.ts';
import { useStudio } from '../../parts/use-studio.ts';
import { useWidth } from '../../parts/use-width.ts';
import { chartScales, type ChartScales, type PlotFrame } from './chart-scales.ts';

const height = 520;

/** Props shared by the parts of the chart. */
interface PartProps {
  readonly melt: Melt;
  readonly scales: ChartScales;
  readonly frame: PlotFrame;
}

const Bands = ({ melt, scales, frame, patterns }: PartProps & { readonly patterns: string }) => {
  const { solidusC, liquidusC, pourC } = melt.context.figures;
  const { left, right, bottom } = frame;
  const band = (fromC: number, toC: number) => ({
    x: left,
    y: scales.y(toC),
    width: right - left,
    height: scales.y(fromC) - scales.y(toC),
  });
  return (
    <g>
      <rect
        x={left}
        y={scales.y(solidusC)}
        width={right - left}
        height={bottom - scales.y(solidusC)}
        fill={`url(#${patterns}-solid)`}
        opacity="0.4"
      />
      <rect {...band(solidusC, liquidusC)} fill={`url(#${patterns}-mushy)`} opacity="0.55" />
      <rect {...band(pourC.low, pourC.high)} className="fill-ember-soft" />
      {[pourC.low, pourC.high].map((celsius) => (
        <path
          key={celsius}
          d={`M${left} ${scales.y(celsius)} H${right}`}
          className="stroke-ember"
          strokeWidth="2"
        />
      ))}
      {[solidusC, liquidusC].map((celsius) => (
        <path
          key={celsius}
          d={`M${left} ${scales.y(celsius)} H${right}`}
          className="stroke-ink"
          strokeWidth="2.5"
        />
      ))}
    </g>
  );
};

const Axes = ({ scales, frame }: Omit<PartProps, 'melt'>) => {
  const { degrees } = useStudio();
  return (
    <g className="fill-soft text-[15px] font-extrabold">
      {scales.degreeTicks.map((celsius) => (
        <text
          key={celsius}
          x={frame.left - 12}
          y={scales.y(celsius)}
          textAnchor="end"
          dominantBaseline="central"
        >
          {degrees(celsius)}
        </text>
      ))}
      {scales.minuteTicks.map((minutes) => (
        <g key={minutes}>
          <path d={`M${scales.x(minutes)} ${frame.bottom} v7`} className="stroke-ink" strokeWidth="2.5" />
          <text x={scales.x(minutes)} y={frame.bottom + 25} textAnchor="middle">
            {minutes}
          </text>
        </g>
      ))}
      <text x={frame.left} y={frame.bottom + 48} className="fill-soft">
        minutes since the card was opened
      </text>
      <path
        d={`M${frame.left} ${frame.top} V${frame.bottom} H${frame.right}`}
        fill="none"
        className="stroke-ink"
        strokeWidth="3"
        strokeLinecap="round"
      />
    </g>
  );
};

const BandNames = ({ melt, scales, frame }: PartProps) => {
  const { degrees } = useStudio();
  const { solidusC, liquidusC, pourC } = melt.context.figures;
  const labels = [
    {
      text: `pour ${degrees(pourC.low)} to ${degrees(pourC.high)}`,
      at: (pourC.low + pourC.high) / 2,
      hot: true,
    },
    { text: `all liquid ${degrees(liquidusC)}`, at: liquidusC, hot: false },
    { text: `all solid ${degrees(solidusC)}`, at: solidusC, hot: false },
  ];
  const heights = spreadLabels(
    labels.map(({ at }) => scales.y(at)),
    22,
    frame.bottom - 8,
  );
  return (
    <g className="text-[15px] font-black">
      {labels.map(({ text, hot }, index) => (
        <text
          key={text}
          x={frame.right + 10}
          y={heights[index]}
          dominantBaseline="central"
          className={hot ? 'fill-ember' : 'fill-ink'}
        >
          {text}
        </text>
      ))}
    </g>
  );
};

const Readings = ({ melt, scales }: Omit<PartProps, 'frame'>) => {
  const { degrees } = useStudio();
  const points = melt.state.readings.map(({ temperatureC, at }) => ({
    at,
    temperatureC,
    x: scales.x(scales.minutesOf(at)),
    y: scales.y(temperatureC),
  }));
  return (
    <g>
      <path
        d={points.map(({ x, y }, index) => `${index === 0 ? 'M' : 'L'}${x} ${y}`).join(' ')}
        className="stroke-ink"
        strokeWidth="3.5"
        strokeLinejoin="round"
      />
      {points.map(({ at, x, y, temperatureC }) => (
        <g key={at}>
          <circle cx={x} cy={y} r="7" className="fill-ground stroke-ink" strokeWidth="3.5" />
          <text
            x={x - 12}
            y={y - 12}
            textAnchor="end"
            className="fill-ink stroke-ground text-[16px] font-black [paint-order:stroke]"
            strokeWidth="5"
            strokeLinejoin="round"
          >
            {degrees(temperatureC)}
          </text>
        </g>
      ))}
    </g>
  );
};

const Moments = ({ melt: { state }, scales, frame }: PartProps) => {
  const marks = [
    ...(state.flaskOut ? [{ text: 'flask out', at: state.flaskOut.at, anchor: 'end' as const, by: -8 }] : []),
    ...(state.pour ? [{ text: 'poured', at: state.pour.at, anchor: 'start' as const, by: 8 }] : []),
  ];
  return (
    <g>
      {marks.map(({ text, at, anchor, by }) => {
        const x = scales.x(scales.minutesOf(at));
        return (
          <g key={text}>
            <path
              d={`M${x} ${frame.top - 4} V${frame.bottom}`}
              className="stroke-ink"
              strokeWidth="2"
              strokeDasharray={text === 'poured' ? undefined : '5 5'}
            />
            <text
              x={x + by}
              y={frame.top - 10}
              textAnchor={anchor}
              className="fill-ink text-[15px] font-black"
            >
              {text}
            </text>
          </g>
        );
      })}
    </g>
  );
};

const chartWords = (
  melt: Melt,
  temperature: (celsius: number) => string,
  time: (iso: string) => string,
): string => {
  const { solidusC, liquidusC, pourC } = melt.context.figures;
  const read = melt.state.readings.map(
    ({ temperatureC, at }) => `${temperature(temperatureC)} at ${time(at)}`,
  );
  return [
    read.length === 0 ? 'No reading yet.' : `Readings: ${read.join(', ')}.`,
    `All solid below ${temperature(solidusC)}, all liquid above ${temperature(liquidusC)}.`,
    `Pour window ${temperature(pourC.low)} to ${temperature(pourC.high)}.`,
    melt.state.pour ? `Poured at ${time(melt.state.pour.at)}.` : '',
  ]
    .filter(Boolean)
    .join(' ');
};

/** A melt's readings against time, over its melting range and pour window. */
export const ReadingsChart = ({ melt }: { readonly melt: Melt }) => {
  const patterns = useId();
  const box = useRef<HTMLDivElement>(null);
  const width = useWidth(box);
  const { temperature, clock, units } = useStudio();
  const frame = { left: 52, right: Math.max(240, width - 148), top: 40, bottom: height - 62 };
  const scales = chartScales(
    {
      openedAt: melt.openedAt,
      state: melt.state,
      figures: melt.context.figures,
      unit: units.temperature,
    },
    frame,
  );
  const parts = { melt, scales, frame };
  return (
    <div ref={box} className="min-w-0">
      {width === 0 ? (
        <div style={{ height }} />
      ) : (
        <svg
          viewBox={`0 0 ${Math.max(width, 388)} ${height}`}
          className="w-full"
          fill="none"
          role="img"
          aria-label={chartWords(melt, temperature, clock.time)}
        >
          <PhasePatterns id={patterns} />
          <Bands {...parts} patterns={patterns} />
          <Axes scales={scales} frame={frame} />
          <BandNames {...parts} />
          <Moments {...parts} />
          <Readings melt={melt} scales={scales} />
        </svg>
      )}
    </div>
  );
};
