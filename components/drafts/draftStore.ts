import AsyncStorage from '@react-native-async-storage/async-storage';
import type { DraftStore, KeptDraft } from './draftTypes';

const prefixOf = (userId: string) => `drafts/${userId}/`;

async function readKey(key: string): Promise<KeptDraft | undefined> {
  const stored = await AsyncStorage.getItem(key);
  return stored === null ? undefined : (JSON.parse(stored) as KeptDraft);
}

export const draftStore: DraftStore = {
  read: (userId, worksheetId) => readKey(prefixOf(userId) + worksheetId),
  async list(userId) {
    const keys = await AsyncStorage.getAllKeys();
    const drafts = await Promise.all(
      keys.filter((key) => key.startsWith(prefixOf(userId))).map(readKey),
    );
    return drafts.filter((draft) => draft !== undefined);
  },
  async keep(userId, draft) {
    await AsyncStorage.setItem(prefixOf(userId) + draft.worksheetId, JSON.stringify(draft));
  },
  async forget(userId, worksheetId) {
    await AsyncStorage.removeItem(prefixOf(userId) + worksheetId);
  },
};
