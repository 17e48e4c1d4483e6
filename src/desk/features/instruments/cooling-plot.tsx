import { scaleLinear } from 'd3-scale';
import type { FlaskSizeCooling } from '#shared/contracts/flask-cooling.ts';

const frame = { width: 520, height: 300, left: 56, right: 400, top: 16, bottom: 246 };

interface Mark {
  readonly minutes: number;
  readonly share: number;
  readonly leftOut: boolean;
}

/** Every reading as the share left of its flask's excess at the start, so that flasks of any temperature lie on one curve. */
const marksOf = ({ outings, fit }: FlaskSizeCooling): readonly Mark[] =>
  outings.flatMap(({ id, roomC, readings }) => {
    const startC = fit?.startsC[id];
    if (startC === undefined) return [];
    return readings.map(({ secondsOut, temperatureC }) => ({
      minutes: secondsOut / 60,
      share: (temperatureC - roomC) / (startC - roomC),
      leftOut: fit?.leftOut.some((left) => left.outingId === id && left.secondsOut === secondsOut) ?? false,
    }));
  });

const curve = (
  perSecond: number,
  x: (minutes: number) => number,
  y: (share: number) => number,
  minutes: number,
): string =>
  Array.from({ length: 41 }, (_, k) => (k / 40) * minutes)
    .map(
      (at, k) => `${k === 0 ? 'M' : 'L'}${x(at).toFixed(1)} ${y(Math.exp(-perSecond * 60 * at)).toFixed(1)}`,
    )
    .join('');

const Point = ({ x, y, leftOut }: { readonly x: number; readonly y: number; readonly leftOut: boolean }) =>
  leftOut ? (
    <path d={`M${x - 6} ${y - 6} l12 12 m0 -12 l-12 12`} className="stroke-ink" strokeWidth="3" />
  ) : (
    <circle cx={x} cy={y} r="5.5" className="fill-ground stroke-ink" strokeWidth="3" />
  );

/** Logged flask temperatures as the share of the excess left, with the fitted curve and the default's. */
export const CoolingPlot = ({ size }: { readonly size: FlaskSizeCooling }) => {
  const { fit, defaultPerSecond, diameterMm } = size;
  const marks = marksOf(size);
  if (!fit || marks.length === 0) return null;
  const { width, height, left, right, top, bottom } = frame;
  const minutes = Math.max(1, ...marks.map((mark) => mark.minutes)) * 1.08;
  const floor = Math.min(
    ...marks.map(({ share }) => share),
    Math.exp(-60 * minutes * Math.max(fit.perSecond, defaultPerSecond)),
  );
  const x = scaleLinear([0, minutes], [left, right]);
  const y = scaleLinear([Math.floor(floor * 20) / 20, 1.02], [bottom, top]);
  const [fitted, standard] = [fit.perSecond, defaultPerSecond].map((perSecond) =>
    y(Math.exp(-perSecond * 60 * minutes)),
  ) as [number, number];
  const apart = Math.abs(fitted - standard) < 20 ? (fitted > standard ? 10 : -10) : 0;
  return (
    <svg
      viewBox={`0 0 ${width} ${height}`}
      className="h-auto w-full max-w-[560px]"
      fill="none"
      role="img"
      aria-label={`Flasks of ${diameterMm} mm: ${fit.readings} readings of ${fit.outings} flasks; after ${minutes.toFixed(1)} minutes ${Math.round(100 * Math.exp(-fit.perSecond * 60 * minutes))} % of the excess over the room is left by the fit, ${Math.round(100 * Math.exp(-defaultPerSecond * 60 * minutes))} % by the default.`}
    >
      <g className="fill-soft text-[15px] font-extrabold">
        {y.ticks(5).map((share) => (
          <g key={share}>
            <path d={`M${left} ${y(share)} H${right}`} className="stroke-line" strokeWidth="1.5" />
            <text x={left - 8} y={y(share)} textAnchor="end" dominantBaseline="central">
              {Math.round(100 * share)}
              {'\u00a0'}%
            </text>
          </g>
        ))}
        {x.ticks(6).map((at) => (
          <text key={at} x={x(at)} y={bottom + 22} textAnchor="middle">
            {at}
          </text>
        ))}
        <text x={left} y={bottom + 46}>
          minutes out of the furnace; share of the excess left
        </text>
      </g>
      <path d={`M${left} ${top} V${bottom} H${right}`} className="stroke-ink" strokeWidth="2.5" />
      <path
        d={curve(defaultPerSecond, x, y, minutes)}
        className="stroke-iron"
        strokeWidth="4"
        strokeDasharray="10 6"
      />
      <path d={curve(fit.perSecond, x, y, minutes)} className="stroke-ember" strokeWidth="4" />
      {marks.map((mark, k) => (
        <Point key={k} x={x(mark.minutes)} y={y(mark.share)} leftOut={mark.leftOut} />
      ))}
      <g className="text-[15px] font-black">
        <text x={right + 8} y={fitted + apart} dominantBaseline="central" className="fill-ember">
          fitted
        </text>
        <text x={right + 8} y={standard - apart} dominantBaseline="central" className="fill-iron">
          default
        </text>
      </g>
    </svg>
  );
};
