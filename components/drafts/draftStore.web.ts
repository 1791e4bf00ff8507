import { openDB, type DBSchema, type IDBPDatabase } from 'idb';
import type { DraftStore, KeptDraft } from './draftTypes';

interface Schema extends DBSchema {
  drafts: { key: [string, string]; value: KeptDraft & { userId: string } };
}

let opened: Promise<IDBPDatabase<Schema>> | undefined;

/** The browser may close the database at any time; the next call opens it again. */
function database(): Promise<IDBPDatabase<Schema>> {
  opened ??= openDB<Schema>('wideberth', 1, {
    upgrade(db) {
      db.createObjectStore('drafts', { keyPath: ['userId', 'worksheetId'] });
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

export const draftStore: DraftStore = {
  async read(userId, worksheetId) {
    return (await database()).get('drafts', [userId, worksheetId]);
  },
  async list(userId) {
    // An array key sorts after every string, so this range is all of one person's drafts.
    const ofPerson = IDBKeyRange.bound([userId], [userId, []]);
    return (await database()).getAll('drafts', ofPerson);
  },
  async keep(userId, draft) {
    await (await database()).put('drafts', { ...draft, userId });
  },
  async forget(userId, worksheetId) {
    await (await database()).delete('drafts', [userId, worksheetId]);
  },
};
