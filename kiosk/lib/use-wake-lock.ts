import { useEffect } from 'react';

/** Keeps the screen awake while `isWanted`; a device that cannot, or will not on a low battery, goes on without. */
export const useWakeLock = (isWanted: boolean): void => {
  useEffect(() => {
    if (!isWanted || !('wakeLock' in navigator)) return;
    let isGone = false;
    let held: WakeLockSentinel | null = null;
    const hold = async (): Promise<void> => {
      if (document.visibilityState !== 'visible' || (held && !held.released)) return;
      try {
        held = await navigator.wakeLock.request('screen');
        if (isGone) await held.release();
      } catch {
        // The device refuses; the screen then dims as it always does, and a touch brings it back.
      }
    };
    const again = (): void => void hold();
    again();
    // The browser lets go whenever the page is hidden.
    document.addEventListener('visibilitychange', again);
    return () => {
      isGone = true;
      document.removeEventListener('visibilitychange', again);
      void held?.release();
    };
  }, [isWanted]);
};
