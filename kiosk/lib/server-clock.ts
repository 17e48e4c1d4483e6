import { useSyncExternalStore } from 'react';
import { useNow } from '#src/lib/use-now.ts';

let offsetMs = 0;
const listeners = new Set<() => void>();

const subscribe = (listener: () => void): (() => void) => {
  listeners.add(listener);
  return () => listeners.delete(listener);
};

/** Takes the server's clock (ISO 8601) as it stood when an answer came in, `receivedAtMs` by this device's clock. */
export const noteServerTime = (serverTime: string, receivedAtMs: number): void => {
  offsetMs = Date.parse(serverTime) - receivedAtMs;
  for (const listener of listeners) listener();
};

/** The present moment by the server's clock, an ISO 8601 instant. */
export const serverNow = (): string => new Date(Date.now() + offsetMs).toISOString();

/** The present moment by the server's clock in milliseconds since the epoch, renewed every `everyMs`. */
export const useServerNow = (everyMs = 1000): number =>
  useNow(everyMs) + useSyncExternalStore(subscribe, () => offsetMs);
