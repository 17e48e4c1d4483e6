import { setTimeout as delay } from 'node:timers/promises';

const POLL_MS = 50;

/** Waits until `look` gives something other than null, false or undefined; fails with `what` after `withinMs`. */
export const waitFor = async <T>(
  what: string,
  look: () => T | Promise<T>,
  withinMs = 20_000,
): Promise<NonNullable<Exclude<T, false>>> => {
  const deadline = Date.now() + withinMs;
  for (;;) {
    const found = await look();
    if (found !== null && found !== undefined && found !== false) {
      return found as NonNullable<Exclude<T, false>>;
    }
    if (Date.now() > deadline) throw new Error(`Waited ${withinMs} ms in vain for ${what}.`);
    await delay(POLL_MS);
  }
};
