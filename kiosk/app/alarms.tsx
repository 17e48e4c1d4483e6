import { useEffect, useRef, useState } from 'react';
import { StateMark } from '#src/ui/state-mark.tsx';
import { warningsBetween, type ClockWarning } from '#kiosk/lib/clock-warning.ts';
import { useRememberedClocks } from '#kiosk/lib/remembered-clocks.ts';
import { useServerNow } from '#kiosk/lib/server-clock.ts';
import { playSignal, wakeSignalsByTouch } from '#kiosk/lib/signals.ts';
import { useWakeLock } from '#kiosk/lib/use-wake-lock.ts';

/** How long a warning stands over the screen, ms. */
const standsMs = 10_000;

/**
 * Warns of what falls due on the cards that run at this terminal, whatever screen is open and whoever is signed in: by
 * a signal, by a shape and by words that are read out. It lies at the top edge, takes no touch and hides no action.
 */
export const Alarms = () => {
  const clocks = useRememberedClocks();
  const nowMs = useServerNow(250);
  const lookedMs = useRef(nowMs);
  const [warning, setWarning] = useState<{ readonly due: ClockWarning; readonly seenMs: number } | null>(
    null,
  );
  useWakeLock(clocks.length > 0);
  useEffect(() => wakeSignalsByTouch(), []);
  useEffect(() => {
    const due = warningsBetween(clocks, lookedMs.current, nowMs).at(-1);
    lookedMs.current = nowMs;
    if (!due) return;
    playSignal(due.signal);
    setWarning({ due, seenMs: nowMs });
  }, [clocks, nowMs]);
  const shown = warning && nowMs - warning.seenMs < standsMs ? warning.due : null;
  return (
    <div
      role="alert"
      className="pointer-events-none fixed inset-x-0 top-2 z-10 flex justify-center"
      data-signal={shown?.signal}
    >
      {shown ? (
        <span className="rounded-full border-[4px] border-ink bg-ground px-8 py-3 text-ink">
          <StateMark
            state={shown.signal === 'open' ? 'ready' : 'caution'}
            text={shown.words}
            size="terminal"
          />
        </span>
      ) : null}
    </div>
  );
};
