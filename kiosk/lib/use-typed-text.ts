import { useEffect, useEffectEvent, useState } from 'react';

const longest = 12;

const isForeign = (key: string, text: string): boolean =>
  key.length === 1 && (!/[0-9.,\s]/.test(key) || (/[.,]/.test(key) && text.includes('.')));

/**
 * The text of a number pad. A character that no number holds (a minus, a letter, a second separator) from a keyboard
 * or a scale is kept and shown as well, so that "1e9" is refused as typed instead of being read as 19.
 */
export const useTypedText = (initial = ''): readonly [string, (text: string) => void] => {
  const [text, setText] = useState(initial);
  const hear = useEffectEvent((event: KeyboardEvent) => {
    if (event.ctrlKey || event.altKey || event.metaKey || event.defaultPrevented) return;
    if (event.target instanceof Element && event.target.closest('input, textarea, dialog')) return;
    if (!isForeign(event.key, text) || text.length >= longest) return;
    event.preventDefault();
    setText(text + event.key);
  });
  useEffect(() => {
    const listener = (event: KeyboardEvent): void => hear(event);
    window.addEventListener('keydown', listener, true);
    return () => window.removeEventListener('keydown', listener, true);
  }, []);
  return [text, setText];
};
