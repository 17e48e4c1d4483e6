import { openDB, type DBSchema, type IDBPDatabase } from 'idb';
import type { OutboxEntry, OutboxStore } from './outbox-entry.ts';

interface OutboxSchema extends DBSchema {
  entries: { key: string; value: OutboxEntry };
}

const open = (): Promise<IDBPDatabase<OutboxSchema>> =>
  openDB<OutboxSchema>('ladlemark-outbox', 1, {
    upgrade: (database) => {
      database.createObjectStore('entries', { keyPath: 'key' });
    },
  });

/** Keeps entries in the browser's IndexedDB; a write has reached the disk when it resolves. */
export const indexedDbStore = (): OutboxStore => {
  let database: Promise<IDBPDatabase<OutboxSchema>> | undefined;
  const ready = (): Promise<IDBPDatabase<OutboxSchema>> => (database ??= open());
  const write = async (
    act: (entries: {
      put: (entry: OutboxEntry) => Promise<unknown>;
      delete: (key: string) => Promise<void>;
    }) => Promise<unknown>,
  ): Promise<void> => {
    const transaction = (await ready()).transaction('entries', 'readwrite', { durability: 'strict' });
    await Promise.all([act(transaction.store), transaction.done]);
  };
  return {
    all: async () => (await ready()).getAll('entries'),
    put: (entry) => write((entries) => entries.put(entry)),
    remove: (key) => write((entries) => entries.delete(key)),
  };
};
