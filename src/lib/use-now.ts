import { useEffect, useState } from 'react';

/**
 * The present moment in milliseconds since the epoch, renewed every `everyMs` and at once when the page comes back
 * into view; with `running` false it stands still.
 */
export const useNow = (everyMs = 1000, running = true): number => {
  const [now, setNow] = useState(() => Date.now());
  useEffect(() => {
    if (!running) return;
    const tick = (): void => setNow(Date.now());
    tick();
    const timer = window.setInterval(tick, everyMs);
    document.addEventListener('visibilitychange', tick);
    return () => {
      window.clearInterval(timer);
      document.removeEventListener('visibilitychange', tick);
    };
  }, [everyMs, running]);
  return now;
};
