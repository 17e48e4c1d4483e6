import { useEffect, useEffectEvent, type RefObject } from 'react';

const typingPlaces = 'input, textarea, select, [contenteditable="true"]';

const isTyping = (target: EventTarget | null): boolean =>
  target instanceof Element && target.closest(typingPlaces) !== null;

const isCovered = (element: Element | null): boolean => {
  const dialog = [...document.querySelectorAll('dialog[open]')].at(-1);
  return dialog !== undefined && !dialog.contains(element);
};

/**
 * Hears key presses anywhere in the window while `active`, on behalf of the control in `owner`: not while someone
 * types in a field, holds a modifier key, or while a dialog covers the control. `onKey` returns true when it used the
 * key, which then does nothing else.
 */
export const useWindowKey = (
  owner: RefObject<Element | null>,
  onKey: (event: KeyboardEvent) => boolean,
  active = true,
): void => {
  const handle = useEffectEvent((event: KeyboardEvent) => {
    if (event.defaultPrevented || event.ctrlKey || event.altKey || event.metaKey) return;
    if (isTyping(event.target) || isCovered(owner.current)) return;
    if (onKey(event)) event.preventDefault();
  });
  useEffect(() => {
    if (!active) return;
    const listener = (event: KeyboardEvent): void => handle(event);
    window.addEventListener('keydown', listener);
    return () => window.removeEventListener('keydown', listener);
  }, [active]);
};
