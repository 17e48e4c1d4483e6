import { useSyncExternalStore } from 'react';
import type { RunningClock } from './running-clock.ts';

const storageKey = 'ladlemark.clocks';
const none: readonly RunningClock[] = [];

const read = (): readonly RunningClock[] => {
  try {
    return JSON.parse(window.localStorage.getItem(storageKey) ?? '[]') as RunningClock[];
  } catch {
    return none;
  }
};

let clocks: readonly RunningClock[] | null = null;
const listeners = new Set<() => void>();
const current = (): readonly RunningClock[] => (clocks ??= read());

const keep = (next: readonly RunningClock[]): void => {
  if (JSON.stringify(next) === JSON.stringify(current())) return;
  clocks = next;
  try {
    window.localStorage.setItem(storageKey, JSON.stringify(next));
  } catch {
    // Blocked storage only costs the clocks on the lock screen after a reload.
  }
  for (const listener of listeners) listener();
};

/** Remembers how one casting's card runs, or forgets it when it does not. */
export const rememberClock = (castingId: string, clock: RunningClock | null): void => {
  const others = current().filter((known) => known.castingId !== castingId);
  keep(clock ? [...others, clock] : others);
};

/** Remembers the running cards of this terminal, all of them. */
export const rememberClocks = (running: readonly RunningClock[]): void => keep(running);

const subscribe = (listener: () => void): (() => void) => {
  listeners.add(listener);
  return () => listeners.delete(listener);
};

/** The running cards of this terminal as last seen, also while nobody is signed in. */
export const useRememberedClocks = (): readonly RunningClock[] => useSyncExternalStore(subscribe, current);
