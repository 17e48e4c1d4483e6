import { createContext, use, useSyncExternalStore } from 'react';
import { addPhotograph } from '#src/api/photographs.ts';
import { useOutboxView } from './outbox-context.ts';
import { PhotographBox, type PhotographView } from './photograph-box.ts';
import { indexedDbPhotographs } from './photograph-store.ts';

/** Carries the terminal's box of photographs to its screens. */
export const PhotographContext = createContext<PhotographBox | null>(null);

/** The box of this terminal: kept in IndexedDB, delivered to the melt book. */
export const deliverPhotographs = (): PhotographBox => {
  const box = new PhotographBox({
    store: indexedDbPhotographs(),
    send: ({ meltId, id, picture }) => addPhotograph(meltId, id, picture),
  });
  window.addEventListener('online', () => box.tryNow());
  return box;
};

/** The terminal's box of photographs. */
export const usePhotographBox = (): PhotographBox => {
  const box = use(PhotographContext);
  if (!box) throw new Error('There is no box of photographs around this screen.');
  return box;
};

/** What the box holds, kept fresh. */
export const usePhotographView = (): PhotographView => {
  const box = usePhotographBox();
  return useSyncExternalStore(box.subscribe, box.view);
};

/** How many records and photographs the server does not have yet; whoever made them stays signed in until it has. */
export const useUndelivered = (): number => {
  const { entries } = useOutboxView();
  const { waiting } = usePhotographView();
  return entries.length + waiting.filter(({ refusal }) => refusal === undefined).length;
};
