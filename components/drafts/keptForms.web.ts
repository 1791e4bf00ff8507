import { openDB, type DBSchema, type IDBPDatabase } from 'idb';
import type { KeptForms } from './keptFormTypes';

interface Schema extends DBSchema {
  forms: { key: [string, string]; value: unknown };
}

let opened: Promise<IDBPDatabase<Schema>> | undefined;

/** The browser may close the database at any time; the next call opens it again. */
function database(): Promise<IDBPDatabase<Schema>> {
  opened ??= openDB<Schema>('wideberth-forms', 1, {
    upgrade(db) {
      db.createObjectStore('forms');
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

export const keptForms: KeptForms = {
  async read(userId, key) {
    return (await database()).get('forms', [userId, key]);
  },
  async list(userId) {
    const range = IDBKeyRange.bound([userId], [userId, '\uffff']);
    return (await (await database()).getAllKeys('forms', range)).map(([, key]) => key);
  },
  async keep(userId, key, form) {
    await (await database()).put('forms', form, [userId, key]);
  },
  async forget(userId, key) {
    await (await database()).delete('forms', [userId, key]);
  },
};
