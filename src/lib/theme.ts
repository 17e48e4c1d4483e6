import { useCallback, useEffect, useSyncExternalStore } from 'react';

/** The two themes: *day* on plaster ground, *melt room* with the lights down. */
export type Theme = 'day' | 'melt-room';

/** Where the choice is kept in the browser's local storage; `src/public/theme-start.js` reads the same key. */
export const themeStorageKey = 'ladlemark.theme';

const listeners = new Set<() => void>();

const prefersDark = (): MediaQueryList => window.matchMedia('(prefers-color-scheme: dark)');

const isTheme = (value: string | null): value is Theme => value === 'day' || value === 'melt-room';

const storedTheme = (): Theme | null => {
  try {
    const value = window.localStorage.getItem(themeStorageKey);
    return isTheme(value) ? value : null;
  } catch {
    return null;
  }
};

// Kept beside the store so that a choice still holds while storage is blocked.
let chosen: Theme | null = null;

const currentTheme = (): Theme => chosen ?? storedTheme() ?? (prefersDark().matches ? 'melt-room' : 'day');

const store = (theme: Theme): void => {
  try {
    window.localStorage.setItem(themeStorageKey, theme);
  } catch {
    // A blocked store only costs the memory of the choice.
  }
};

const choose = (theme: Theme): void => {
  chosen = theme;
  store(theme);
  for (const listener of listeners) listener();
};

const subscribe = (listener: () => void): (() => void) => {
  const fromOtherTab = (event: StorageEvent): void => {
    if (event.key !== themeStorageKey) return;
    chosen = null;
    listener();
  };
  const query = prefersDark();
  listeners.add(listener);
  query.addEventListener('change', listener);
  window.addEventListener('storage', fromOtherTab);
  return () => {
    listeners.delete(listener);
    query.removeEventListener('change', listener);
    window.removeEventListener('storage', fromOtherTab);
  };
};

const paint = (theme: Theme): void => {
  const root = document.documentElement;
  root.classList.toggle('melt-room', theme === 'melt-room');
  const ground = getComputedStyle(root).getPropertyValue('--ground').trim();
  if (ground) document.querySelector('meta[name="theme-color"]')?.setAttribute('content', ground);
};

/**
 * The theme in force and a function that changes to the other one. It follows the system's preference until someone
 * chooses, then keeps the choice; the root element carries the class `melt-room` in the dark theme.
 */
export const useTheme = (): readonly [Theme, () => void] => {
  const theme = useSyncExternalStore(subscribe, currentTheme);
  useEffect(() => paint(theme), [theme]);
  const toggle = useCallback(() => choose(currentTheme() === 'day' ? 'melt-room' : 'day'), []);
  return [theme, toggle];
};
