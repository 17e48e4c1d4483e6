import { useEffect, useEffectEvent } from 'react';
import { looksScanned } from './scan-target.ts';
import { noBurst, pressWedgeKey } from './scanner-wedge.ts';

const isTyping = (target: EventTarget | null): boolean =>
  target instanceof Element && target.closest('input, textarea, select') !== null;

// Digits alone, typed fast while a pad lies over the screen, are meant for the pad.
const isPadOpen = (): boolean => document.querySelector('dialog[open]') !== null;

/** Takes codes from a scanner that types like a keyboard, anywhere on the screen; `onCode` returns false to leave one. */
export const useScanner = (onCode: (code: string) => boolean, active = true): void => {
  const take = useEffectEvent(onCode);
  useEffect(() => {
    if (!active) return;
    let burst = noBurst;
    const hear = (event: KeyboardEvent): void => {
      if (event.ctrlKey || event.altKey || event.metaKey || event.repeat || isTyping(event.target)) return;
      const pressed = pressWedgeKey(burst, event.key, event.timeStamp);
      burst = pressed.burst;
      if (pressed.code === null || (isPadOpen() && !looksScanned(pressed.code)) || !take(pressed.code))
        return;
      // The Enter that ends a scan must not also press the button that has the focus.
      event.preventDefault();
      event.stopPropagation();
    };
    window.addEventListener('keydown', hear, true);
    return () => window.removeEventListener('keydown', hear, true);
  }, [active]);
};
