import AsyncStorage from '@react-native-async-storage/async-storage';

/** What was last shown to a person, kept on the device for a basement without signal. */
export interface KeptCache {
  read(userId: string): Promise<unknown>;
  write(userId: string, state: unknown): Promise<void>;
  forget(userId: string): Promise<void>;
}

const keyOf = (userId: string) => `cache/${userId}`;

export const keptCache: KeptCache = {
  async read(userId) {
    const stored = await AsyncStorage.getItem(keyOf(userId));
    return stored === null ? undefined : (JSON.parse(stored) as unknown);
  },
  write: (userId, state) => AsyncStorage.setItem(keyOf(userId), JSON.stringify(state)),
  forget: (userId) => AsyncStorage.removeItem(keyOf(userId)),
};
