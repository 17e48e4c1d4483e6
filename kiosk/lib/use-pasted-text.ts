import { useEffect, useEffectEvent } from 'react';

/** Takes text pasted anywhere on a screen that has no field to paste into; `onText` gets its first line. */
export const usePastedText = (onText: (text: string) => void): void => {
  const take = useEffectEvent(onText);
  useEffect(() => {
    const hear = (event: ClipboardEvent): void => {
      if (event.target instanceof Element && event.target.closest('input, textarea, dialog')) return;
      const text =
        event.clipboardData
          ?.getData('text/plain')
          .trim()
          .split(/[\r\n]/)[0] ?? '';
      if (text === '') return;
      event.preventDefault();
      take(text);
    };
    window.addEventListener('paste', hear);
    return () => window.removeEventListener('paste', hear);
  }, []);
};
