import { useEffect, useEffectEvent, useRef } from 'react';
import type { Casting } from '#shared/contracts/casting.ts';
import { describeCastingState } from '#shared/domain/casting/casting-state.ts';
import { splitCode } from '#shared/lib/codes.ts';
import { cx } from '#src/ui/cx.ts';
import { metalOf } from '#src/desk/parts/metal-of.ts';
import { useStudio } from '#src/desk/parts/use-studio.ts';
import { DayGround } from './day-ground.tsx';
import { layOutDay, sizes } from './day-layout.ts';
import { isPoured, isToPour } from './day-sentence.ts';
import { DropShape, type DropLook } from './drop-shape.tsx';
import type { Day } from './use-day.ts';
import { useWidth } from '#src/desk/parts/use-width.ts';

/** Props of {@link DayTimeline}. */
export interface DayTimelineProps {
  readonly day: Day;
  /** The local day, `2026-12-01`. */
  readonly on: string;
  /** Now, on the running day only. */
  readonly nowMs: number | null;
  readonly selectedId: string | null;
  readonly onSelect: (id: string) => void;
}

const lookOf = (casting: Casting, isRunning: boolean): DropLook => {
  if (casting.state === 'held' || casting.state === 'scrapped') return casting.state;
  if (isRunning) return 'running';
  return isPoured(casting) ? 'poured' : 'planned';
};

const isLate = (casting: Casting, nowMs: number | null): boolean =>
  nowMs !== null && isToPour(casting) && Date.parse(casting.plannedPourAt) < nowMs - 60_000;

/** The day as a picture: hours across, furnace bays as lines, castings as drops that hang at their planned time. */
export const DayTimeline = ({ day, on, nowMs, selectedId, onSelect }: DayTimelineProps) => {
  const frame = useRef<HTMLDivElement>(null);
  const available = useWidth(frame);
  const { clock } = useStudio();
  const layout = layOutDay(day, on, clock, nowMs, available);
  const isKnown = available > 0;
  // On a narrow screen the picture opens around now, not at dawn.
  const openAroundNow = useEffectEvent(() => {
    const { current } = frame;
    if (current && nowMs !== null) current.scrollLeft = layout.x(nowMs) - current.clientWidth / 2;
  });
  // Once for each day: later it stays where it was scrolled to.
  useEffect(() => {
    if (isKnown) openAroundNow();
  }, [isKnown, on]);
  const words = (casting: Casting): string =>
    [
      `${splitCode(casting.flask.code).main} at ${clock.time(casting.plannedPourAt)}`,
      casting.alloy.name,
      day.runningIds.has(casting.id) ? 'at the furnace' : describeCastingState(casting.state),
      isLate(casting, nowMs) ? 'late' : '',
    ]
      .filter(Boolean)
      .join(', ');
  return (
    <div
      ref={frame}
      className="overflow-x-auto overflow-y-hidden pb-1"
      role="group"
      aria-label="The day’s pours by furnace bay"
    >
      {available === 0 ? null : (
        <div className="relative" style={{ width: layout.width, height: layout.height }}>
          <DayGround layout={layout} day={day} clock={clock} nowMs={nowMs} />
          {layout.bays.flatMap((bay) =>
            bay.drops.map(({ item, x, level }) => {
              const late = isLate(item, nowMs) && !day.runningIds.has(item.id);
              return (
                <button
                  key={item.id}
                  type="button"
                  aria-label={words(item)}
                  aria-pressed={item.id === selectedId}
                  onClick={() => onSelect(item.id)}
                  style={{ left: x - 31, top: bay.lineY + 6 + level * sizes.level }}
                  className={cx(
                    'absolute grid w-[62px] justify-items-center rounded-2xl border-[3px] pb-0.5 text-[14px] leading-tight font-extrabold',
                    item.id === selectedId ? 'border-ink bg-ground' : 'border-transparent',
                    isToPour(item) ? 'text-ink' : 'text-soft',
                  )}
                >
                  <DropShape
                    look={lookOf(item, day.runningIds.has(item.id))}
                    metal={metalOf(item.alloy.family)}
                  />
                  <span className="rounded bg-ground px-0.5">{splitCode(item.flask.code).main}</span>
                  {late ? (
                    <span className="absolute -top-1 -left-1 rounded-full bg-ink px-1.5 text-[12px] text-ground">
                      late
                    </span>
                  ) : null}
                </button>
              );
            }),
          )}
        </div>
      )}
    </div>
  );
};
