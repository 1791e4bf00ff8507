import { atom } from 'jotai';
import { LOCALES, THEMES, type Locale, type ThemeChoice } from '@/shared/user';
import { deviceStorage } from './deviceStorage';

function kept<T extends string>(key: string, admitted: readonly T[]): T | null {
  const value = deviceStorage.get(key);
  return admitted.find((each) => each === value) ?? null;
}

function choiceAtom<T extends string>(key: string, admitted: readonly T[]) {
  const held = atom<T | null>(kept(key, admitted));
  return atom(
    (get) => get(held),
    (_get, set, value: T | null) => {
      deviceStorage.set(key, value);
      set(held, value);
    },
  );
}

/** The language chosen on this device before anybody signed in. */
export const deviceLocaleAtom = choiceAtom<Locale>('locale', LOCALES);

/** A theme turned on for this device only: sunlight on the phone in hand, not on the desk at home. */
export const deviceThemeAtom = choiceAtom<ThemeChoice>('theme', THEMES);
