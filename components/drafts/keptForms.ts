import AsyncStorage from '@react-native-async-storage/async-storage';
import type { KeptForms } from './keptFormTypes';

const keyOf = (userId: string, key: string) => `forms/${userId}/${key}`;

export const keptForms: KeptForms = {
  async read(userId, key) {
    const stored = await AsyncStorage.getItem(keyOf(userId, key));
    return stored === null ? undefined : (JSON.parse(stored) as unknown);
  },
  async list(userId) {
    const start = keyOf(userId, '');
    const keys = await AsyncStorage.getAllKeys();
    return keys.filter((key) => key.startsWith(start)).map((key) => key.slice(start.length));
  },
  keep: (userId, key, form) => AsyncStorage.setItem(keyOf(userId, key), JSON.stringify(form)),
  forget: (userId, key) => AsyncStorage.removeItem(keyOf(userId, key)),
};
