import { scaleLinear } from 'd3-scale';
import type { Casting } from '#shared/contracts/casting.ts';
import type { StudioClock } from '../../parts/studio-clock.ts';
import { hoursOfDay } from './hours-of-day.ts';
import { placeDrops, type BayOfDrops } from './place-drops.ts';
import type { Day } from './use-day.ts';

/** Sizes of the day's picture in CSS pixels. */
export const sizes = {
  top: 44,
  gutter: 118,
  right: 22,
  above: 88,
  level: 80,
  below: 26,
  least: 700,
  dropWidth: 56,
} as const;

/** A bay with the height of its line and of the ground it takes. */
export interface PlacedBay extends BayOfDrops<Casting> {
  readonly lineY: number;
}

/** Where everything in the picture of a day stands, in CSS pixels. */
export interface DayLayout {
  readonly width: number;
  readonly height: number;
  readonly x: (ms: number) => number;
  readonly hours: readonly { readonly ms: number; readonly x: number; readonly isNamed: boolean }[];
  readonly bays: readonly PlacedBay[];
}

const stackBays = (bays: readonly BayOfDrops<Casting>[]): { bays: readonly PlacedBay[]; height: number } => {
  let y: number = sizes.top;
  const placed = bays.map((bay) => {
    const lineY = y + sizes.above;
    y = lineY + bay.levels * sizes.level + sizes.below;
    return { ...bay, lineY };
  });
  return { bays: placed, height: y };
};

/** Lays a day out for a picture `available` pixels wide; `nowMs` is given on the running day only. */
export const layOutDay = (
  { castings, melts }: Day,
  day: string,
  clock: StudioClock,
  nowMs: number | null,
  available: number,
): DayLayout => {
  const width = Math.max(available, sizes.least);
  const moments = [
    ...castings.map(({ plannedPourAt }) => Date.parse(plannedPourAt)),
    ...[...melts.values()].map(({ openedAt }) => Date.parse(openedAt)),
    ...(nowMs === null ? [] : [nowMs]),
  ];
  const { from, to } = hoursOfDay(moments, clock.hourOf(day, 0));
  const scale = scaleLinear()
    .domain([clock.hourOf(day, from), clock.hourOf(day, to)])
    .range([sizes.gutter, width - sizes.right]);
  const x = (ms: number): number => scale(ms);
  const everyHours = (width - sizes.gutter) / (to - from) < 56 ? 2 : 1;
  const hours = Array.from({ length: to - from + 1 }, (_, index) => {
    const ms = clock.hourOf(day, from + index);
    return { ms, x: x(ms), isNamed: (from + index) % everyHours === 0 };
  });
  return { width, x, hours, ...stackBays(placeDrops(castings, x, sizes.dropWidth)) };
};
