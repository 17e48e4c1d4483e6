import { openDB, type DBSchema, type IDBPDatabase } from 'idb';

/** A photograph on its way to the melt book; `id` names it for ever, however often it is sent. */
export interface WaitingPhotograph {
  readonly id: string;
  readonly meltId: string;
  /** Whoever took it: it is delivered only in this person's name. */
  readonly personId: string;
  readonly takenAt: string;
  readonly picture: Blob;
  /** Why the server would not take it; kept until someone has read that. */
  readonly refusal?: string;
}

/** Where photographs are kept until they are delivered. */
export interface PhotographStore {
  readonly all: () => Promise<readonly WaitingPhotograph[]>;
  /** Keeps a photograph; resolves once it would outlive the page. */
  readonly put: (photograph: WaitingPhotograph) => Promise<void>;
  readonly remove: (id: string) => Promise<void>;
}

interface PhotographSchema extends DBSchema {
  photographs: { key: string; value: WaitingPhotograph };
}

const open = (): Promise<IDBPDatabase<PhotographSchema>> =>
  openDB<PhotographSchema>('ladlemark-photographs', 1, {
    upgrade: (database) => {
      database.createObjectStore('photographs', { keyPath: 'id' });
    },
  });

/** Keeps photographs in the browser's IndexedDB, apart from the events: a full disk then costs a picture, never a record. */
export const indexedDbPhotographs = (): PhotographStore => {
  let database: Promise<IDBPDatabase<PhotographSchema>> | undefined;
  const ready = (): Promise<IDBPDatabase<PhotographSchema>> => (database ??= open());
  return {
    all: async () => (await ready()).getAll('photographs'),
    put: async (photograph) => {
      const transaction = (await ready()).transaction('photographs', 'readwrite', { durability: 'strict' });
      await Promise.all([transaction.store.put(photograph), transaction.done]);
    },
    remove: async (id) => (await ready()).delete('photographs', id),
  };
};
