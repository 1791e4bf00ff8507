import { openDB, type DBSchema, type IDBPDatabase } from 'idb';
import type { KeptCache } from './keptCacheTypes';

interface Schema extends DBSchema {
  caches: { key: string; value: unknown };
}

let opened: Promise<IDBPDatabase<Schema>> | undefined;

/** The browser may close the database at any time; the next call opens it again. */
function database(): Promise<IDBPDatabase<Schema>> {
  opened ??= openDB<Schema>('wideberth-cache', 1, {
    upgrade(db) {
      db.createObjectStore('caches');
    },
    terminated() {
      opened = undefined;
    },
  }).catch((error: unknown) => {
    opened = undefined;
    throw error;
  });
  return opened;
}

export const keptCache: KeptCache = {
  async read(userId) {
    return (await database()).get('caches', userId);
  },
  async write(userId, state) {
    await (await database()).put('caches', state, userId);
  },
  async forget(userId) {
    await (await database()).delete('caches', userId);
  },
};
