import { useEffect, useSyncExternalStore } from 'react';

/** How loud signals are at this device. */
export const soundLevels = ['off', 'quiet', 'loud'] as const;
/** One of the levels. */
export type SoundLevel = (typeof soundLevels)[number];

/** What suits whoever works at this device: the hand that touches, the size of the letters, the loudness of signals. */
export interface Comfort {
  readonly hand: 'right' | 'left';
  readonly text: 'normal' | 'large';
  readonly sound: SoundLevel;
}

const storageKey = 'ladlemark.comfort';
const initial: Comfort = { hand: 'right', text: 'normal', sound: 'loud' };

const known = <Value extends string>(value: unknown, values: readonly Value[], otherwise: Value): Value =>
  values.find((each) => each === value) ?? otherwise;

const read = (): Comfort => {
  try {
    const kept = JSON.parse(window.localStorage.getItem(storageKey) ?? '{}') as Record<
      string,
      unknown
    > | null;
    return {
      hand: known(kept?.['hand'], ['right', 'left'], initial.hand),
      text: known(kept?.['text'], ['normal', 'large'], initial.text),
      sound: known(kept?.['sound'], soundLevels, initial.sound),
    };
  } catch {
    return initial;
  }
};

let current: Comfort | null = null;
const listeners = new Set<() => void>();

/** The settings in force at this device. */
export const comfort = (): Comfort => (current ??= read());

/** Changes some of the settings, at once and for the next time too. */
export const changeComfort = (part: Partial<Comfort>): void => {
  current = { ...comfort(), ...part };
  try {
    window.localStorage.setItem(storageKey, JSON.stringify(current));
  } catch {
    // Blocked storage only costs the memory of the choice.
  }
  for (const listener of listeners) listener();
};

const subscribe = (listener: () => void): (() => void) => {
  listeners.add(listener);
  return () => listeners.delete(listener);
};

/** The settings in force, kept fresh. */
export const useComfort = (): Comfort => useSyncExternalStore(subscribe, comfort);

/** Draws the page for the hand and the size of letters in force. */
export const usePaintedComfort = (): void => {
  const { hand, text } = useComfort();
  useEffect(() => {
    const { classList } = document.documentElement;
    classList.toggle('left-hand', hand === 'left');
    classList.toggle('large-text', text === 'large');
  }, [hand, text]);
};
