import { createContext, use, useSyncExternalStore } from 'react';
import type { Outbox, OutboxView } from './outbox.ts';

/** Carries the terminal's outbox to its screens. */
export const OutboxContext = createContext<Outbox | null>(null);

/** The terminal's outbox. */
export const useOutbox = (): Outbox => {
  const outbox = use(OutboxContext);
  if (!outbox) throw new Error('There is no outbox around this screen.');
  return outbox;
};

/** What the outbox holds and how delivery goes, kept fresh. */
export const useOutboxView = (): OutboxView => {
  const outbox = useOutbox();
  return useSyncExternalStore(outbox.subscribe, outbox.view);
};
