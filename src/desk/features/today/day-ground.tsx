import type { StudioClock } from '../../parts/studio-clock.ts';
import { sizes, type DayLayout, type PlacedBay } from './day-layout.ts';
import { isToPour } from './day-sentence.ts';
import { SmallFlask } from './small-flask.tsx';
import type { Day } from './use-day.ts';

/** Props of {@link DayGround}. */
export interface DayGroundProps {
  readonly layout: DayLayout;
  readonly day: Day;
  readonly clock: StudioClock;
  readonly nowMs: number | null;
}

// An hour's name makes way for that of now.
const isHidden = (x: number, nowX: number | null): boolean => nowX !== null && Math.abs(x - nowX) < 54;

const Hours = ({ layout, clock, nowMs }: Omit<DayGroundProps, 'day'>) => (
  <g>
    {layout.hours.map(({ ms, x, isNamed }) => (
      <g key={ms}>
        <path
          d={`M${x} 30 V${layout.height - 8}`}
          className="stroke-line"
          strokeWidth="1.5"
          strokeDasharray={isNamed ? undefined : '2 7'}
        />
        {isNamed && !isHidden(x, nowMs === null ? null : layout.x(nowMs)) ? (
          <text x={x} y="18" textAnchor="middle" className="fill-soft text-[15px] font-extrabold">
            {clock.time(ms)}
          </text>
        ) : null}
      </g>
    ))}
  </g>
);

const NowLine = ({
  layout,
  clock,
  nowMs,
}: Omit<DayGroundProps, 'day' | 'nowMs'> & { readonly nowMs: number }) => {
  const x = layout.x(nowMs);
  return (
    <g>
      <path d={`M${x} 24 V${layout.height - 4}`} className="stroke-ink" strokeWidth="3" />
      <rect x={x - 31} y="0" width="62" height="26" rx="13" className="fill-ink" />
      <path d={`M${x - 9} 24 h18 l-9 11z`} className="fill-ink" />
      <text x={x} y="18.5" textAnchor="middle" className="fill-ground text-[15px] font-black">
        {clock.time(nowMs)}
      </text>
    </g>
  );
};

/** What stands on a bay's line: it glows from card to pour where a melt ran, and flasks that still wait stand at their time. */
const OnLine = ({ bay, layout, day, nowMs }: { readonly bay: PlacedBay } & Omit<DayGroundProps, 'clock'>) => (
  <g>
    {bay.drops.map(({ item, x }) => {
      const melt = day.melts.get(item.id);
      if (!melt) return null;
      const [from, to] = [layout.x(Date.parse(melt.openedAt)), melt.pouredAt ?? nowMs ?? x];
      const end = typeof to === 'string' ? layout.x(Date.parse(to)) : layout.x(to);
      return (
        <rect
          key={item.id}
          x={from}
          y={bay.lineY - 7}
          width={Math.max(10, end - from)}
          height="14"
          rx="7"
          className="fill-ember-fill stroke-ground"
          strokeWidth="2"
        />
      );
    })}
    {bay.drops
      .filter(({ item }) => isToPour(item))
      .map(({ item, x }) => (
        <SmallFlask key={item.id} x={x} y={bay.lineY - 3} state={item.state} />
      ))}
  </g>
);

const BayLine = ({ bay, layout }: { readonly bay: PlacedBay; readonly layout: DayLayout }) => {
  const waiting = bay.drops.filter(({ item }) => isToPour(item)).length;
  return (
    <g>
      <path
        d={`M${sizes.gutter - 8} ${bay.lineY} H${layout.width - 6}`}
        className="stroke-ink"
        strokeWidth="3"
        strokeLinecap="round"
      />
      <text x="0" y={bay.lineY - 28} className="fill-ink text-[17px] font-black">
        {bay.bay.charAt(0).toUpperCase() + bay.bay.slice(1)}
      </text>
      <text x="0" y={bay.lineY - 8} className="fill-soft text-[15px] font-bold">
        {waiting === 0 ? 'none to pour' : `${waiting} to pour`}
      </text>
      {bay.drops.map(({ item, x, level }) => (
        <path
          key={item.id}
          d={`M${x} ${bay.lineY} v${level * sizes.level + 10}`}
          className="stroke-soft"
          strokeWidth="1.5"
        />
      ))}
    </g>
  );
};

/** The ground of a day's picture: hours, the line of each furnace bay with its flasks and melts, and now. Decoration beside the drops and the table. */
export const DayGround = ({ layout, day, clock, nowMs }: DayGroundProps) => (
  <svg
    width={layout.width}
    height={layout.height}
    className="absolute inset-0"
    fill="none"
    aria-hidden="true"
  >
    <Hours layout={layout} clock={clock} nowMs={nowMs} />
    {layout.bays.map((bay) => (
      <g key={bay.bay}>
        <BayLine bay={bay} layout={layout} />
        <OnLine bay={bay} layout={layout} day={day} nowMs={nowMs} />
      </g>
    ))}
    {nowMs === null ? null : <NowLine layout={layout} clock={clock} nowMs={nowMs} />}
  </svg>
);
