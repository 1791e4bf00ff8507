import AsyncStorage from '@react-native-async-storage/async-storage';
import type { KeptCache } from './keptCacheTypes';

const keyOf = (userId: string) => `cache/${userId}`;

export const keptCache: KeptCache = {
  async read(userId) {
    const stored = await AsyncStorage.getItem(keyOf(userId));
    return stored === null ? undefined : (JSON.parse(stored) as unknown);
  },
  write: (userId, state) => AsyncStorage.setItem(keyOf(userId), JSON.stringify(state)),
  forget: (userId) => AsyncStorage.removeItem(keyOf(userId)),
};
