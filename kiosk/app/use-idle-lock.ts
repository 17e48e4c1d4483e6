import { useEffect, useEffectEvent } from 'react';
import { isIdle } from './idle.ts';

const touches = ['pointerdown', 'pointermove', 'keydown', 'wheel'] as const;
const lookEveryMs = 1_000;

/** Runs `onIdle` once nobody has touched the screen or a key for `idleLockS`, and again each such while after. */
export const useIdleLock = (idleLockS: number, onIdle: () => void): void => {
  const lock = useEffectEvent(onIdle);
  useEffect(() => {
    let lastTouchMs = performance.now();
    const touch = (): void => {
      lastTouchMs = performance.now();
    };
    const look = (): void => {
      if (isIdle(lastTouchMs, performance.now(), idleLockS)) lock();
    };
    for (const kind of touches) window.addEventListener(kind, touch, { capture: true, passive: true });
    const timer = window.setInterval(look, lookEveryMs);
    return () => {
      for (const kind of touches) window.removeEventListener(kind, touch, { capture: true });
      window.clearInterval(timer);
    };
  }, [idleLockS]);
};
