import { act, render, screen } from '@testing-library/react';
import { userEvent } from '@testing-library/user-event';
import { readFileSync } from 'node:fs';
import { beforeEach, describe, expect, it, vi } from 'vitest';
import { themeStorageKey } from './theme.ts';

const preferDark = (dark: boolean): void => {
  vi.spyOn(window, 'matchMedia').mockImplementation((media) =>
    Object.assign(new EventTarget(), {
      matches: dark,
      media,
      onchange: null,
      addListener: (): void => undefined,
      removeListener: (): void => undefined,
    }),
  );
};

const isMeltRoom = (): boolean => document.documentElement.classList.contains('melt-room');

// A fresh module for each test, as after a reload.
const showSwitch = async () => {
  vi.resetModules();
  const { useTheme } = await import('./theme.ts');
  const Switch = () => {
    const [theme, toggle] = useTheme();
    return <button onClick={toggle}>{theme}</button>;
  };
  return render(<Switch />);
};

beforeEach(() => {
  window.localStorage.clear();
  document.documentElement.className = '';
});

describe('useTheme', () => {
  it.each([
    [false, 'day'],
    [true, 'melt-room'],
  ])('follows the system at first (dark: %s)', async (dark, theme) => {
    preferDark(dark);
    await showSwitch();
    expect(screen.getByRole('button', { name: theme })).toBeInTheDocument();
    expect(isMeltRoom()).toBe(dark);
  });

  it('changes, dresses the root element and remembers the choice after a reload', async () => {
    preferDark(true);
    const first = await showSwitch();
    await userEvent.click(screen.getByRole('button', { name: 'melt-room' }));
    expect(isMeltRoom()).toBe(false);
    expect(window.localStorage.getItem(themeStorageKey)).toBe('day');
    first.unmount();
    await showSwitch();
    expect(screen.getByRole('button', { name: 'day' })).toBeInTheDocument();
  });

  it('still changes when storage is blocked', async () => {
    preferDark(false);
    const blocked = vi.spyOn(Storage.prototype, 'setItem').mockImplementation(() => {
      throw new DOMException('blocked', 'SecurityError');
    });
    await showSwitch();
    await userEvent.click(screen.getByRole('button', { name: 'day' }));
    expect(isMeltRoom()).toBe(true);
    blocked.mockRestore();
  });

  it('takes over a choice made in another tab', async () => {
    preferDark(false);
    await showSwitch();
    window.localStorage.setItem(themeStorageKey, 'melt-room');
    act(() => {
      window.dispatchEvent(new StorageEvent('storage', { key: themeStorageKey }));
    });
    expect(screen.getByRole('button', { name: 'melt-room' })).toBeInTheDocument();
  });
});

describe('theme-start.js', () => {
  const start = (): void => {
    // eslint-disable-next-line @typescript-eslint/no-implied-eval, @typescript-eslint/no-unsafe-call -- jsdom runs no scripts here, so the file's text is run as a page would run it.
    new Function(readFileSync('src/public/theme-start.js', 'utf8'))();
  };

  it.each([
    [null, false, false],
    [null, true, true],
    ['day', true, false],
    ['melt-room', false, true],
    ['something else', true, true],
  ])('with %s stored and a dark system %s paints the melt room: %s', (stored, dark, expected) => {
    preferDark(dark);
    if (stored !== null) window.localStorage.setItem(themeStorageKey, stored);
    start();
    expect(isMeltRoom()).toBe(expected);
  });
});
