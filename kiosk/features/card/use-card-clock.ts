import { clockFace, runningClockOf, type ClockFace } from '#kiosk/lib/running-clock.ts';
import { useServerNow } from '#kiosk/lib/server-clock.ts';
import type { RunningCard } from './use-running-card.ts';

/** The clock that runs on a card, for screens that lie over its step; null when none does. */
export const useCardClock = ({ card, state }: Pick<RunningCard, 'card' | 'state'>): ClockFace | null => {
  const nowMs = useServerNow(500);
  const time = runningClockOf({ card, state })?.time ?? null;
  return time && clockFace(time, nowMs);
};
