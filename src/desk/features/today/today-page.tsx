import { Link, useSearchParams } from 'react-router-dom';
import { z } from 'zod';
import { useNow } from '#src/lib/use-now.ts';
import { buttonClass } from '#src/ui/button-class.ts';
import { Notice } from '#src/ui/notice.tsx';
import { PageTitle } from '#src/ui/page-title.tsx';
import { Loaded } from '#src/desk/parts/loaded.tsx';
import { useStudio } from '#src/desk/parts/use-studio.ts';
import { DayBoard } from './day-board.tsx';
import { DayPicker } from './day-picker.tsx';
import { daySentence } from './day-sentence.ts';
import { StoppedNotice } from './stopped-notice.tsx';
import { useDay } from './use-day.ts';

const localDay = z.iso.date();

const NoCastings = ({ isToday }: { readonly isToday: boolean }) => (
  <Notice
    kind="empty"
    title={isToday ? 'Nothing is planned to pour today.' : 'Nothing was planned to pour on this day.'}
    action={
      <Link to="/flasks" className={buttonClass()}>
        Look at the flasks
      </Link>
    }
  >
    A casting shows here on the day of its planned pour. Choose another day above, or see which flasks are in
    use.
  </Notice>
);

/** A day of the studio: one sentence, the day as a picture, its castings as a table, one casting beside them. */
export const TodayPage = () => {
  const { clock } = useStudio();
  const now = useNow(15_000);
  const [search, setSearch] = useSearchParams();
  const today = clock.dayOf(now);
  const asked = localDay.safeParse(search.get('on'));
  const on = asked.success ? asked.data : today;
  const nowMs = on === today ? now : null;
  const day = useDay(on);
  const pick = (next: string): void => setSearch(next === today ? {} : { on: next });
  return (
    <>
      <PageTitle
        title={clock.longDay(on, Number(today.slice(0, 4)))}
        summary={
          day.data && day.data.castings.length > 0
            ? daySentence(day.data.castings, day.data.runningIds, nowMs)
            : undefined
        }
        actions={
          <DayPicker
            day={on}
            before={clock.dayAfter(on, -1)}
            after={clock.dayAfter(on, 1)}
            today={today}
            onPick={pick}
          />
        }
      />
      <Loaded query={day} what="the day’s castings">
        {(data) => (
          <>
            {on === today ? <StoppedNotice melts={data.stopped} /> : null}
            {data.castings.length === 0 ? (
              <NoCastings isToday={on === today} />
            ) : (
              <DayBoard day={data} on={on} nowMs={nowMs} />
            )}
          </>
        )}
      </Loaded>
    </>
  );
};
