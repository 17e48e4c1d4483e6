import { useSearchParams } from 'react-router-dom';
import type { Casting } from '#shared/contracts/casting.ts';
import { CastingPanel } from './casting-panel.tsx';
import { nextCasting } from './day-sentence.ts';
import { DayTable } from './day-table.tsx';
import { DayTimeline } from './day-timeline.tsx';
import type { Day } from './use-day.ts';

/** Props of {@link DayBoard}. */
export interface DayBoardProps {
  readonly day: Day;
  readonly on: string;
  readonly nowMs: number | null;
}

const shownCasting = ({ castings, runningIds }: Day, chosenId: string | null): Casting | undefined =>
  castings.find(({ id }) => id === chosenId) ?? nextCasting(castings, runningIds) ?? castings[0];

/** A day's picture and table, with the chosen casting beside them; until one is chosen, the one that pours next. */
export const DayBoard = ({ day, on, nowMs }: DayBoardProps) => {
  const [search, setSearch] = useSearchParams();
  const chosenId = search.get('casting');
  const shown = shownCasting(day, chosenId);
  const addressOf = (id: string): Record<string, string> => ({
    ...(nowMs === null ? { on } : {}),
    casting: id,
  });
  return (
    <div className="grid items-start gap-x-12 gap-y-8 xl:grid-cols-[minmax(0,1fr)_320px]">
      <div className="grid min-w-0 gap-8">
        <DayTimeline
          day={day}
          on={on}
          nowMs={nowMs}
          selectedId={shown?.id ?? null}
          onSelect={(id) => setSearch(addressOf(id), { replace: true })}
        />
        <div className="hidden xl:block">
          <DayTable day={day} hrefOf={({ id }) => `?${new URLSearchParams(addressOf(id)).toString()}`} />
        </div>
      </div>
      {shown ? (
        <CastingPanel
          casting={shown}
          isRunning={day.runningIds.has(shown.id)}
          isNext={shown.id !== chosenId && nowMs !== null}
        />
      ) : null}
      <div className="min-w-0 xl:hidden">
        <DayTable day={day} hrefOf={({ id }) => `?${new URLSearchParams(addressOf(id)).toString()}`} />
      </div>
    </div>
  );
};
