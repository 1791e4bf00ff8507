import { createContext, useContext, useMemo, type ReactNode } from 'react';
import type { Locale, Units } from '@/shared/user';

interface Preferences {
  locale: Locale;
  units: Units;
}

const PreferencesContext = createContext<Preferences>({ locale: 'en-US', units: 'feet' });

export function PreferencesProvider({
  locale,
  units,
  children,
}: Preferences & { children: ReactNode }) {
  const value = useMemo(() => ({ locale, units }), [locale, units]);
  return <PreferencesContext value={value}>{children}</PreferencesContext>;
}

/** The language of the signed-in person; before sign-in, of the browser. */
export function useLocale(): Locale {
  return useContext(PreferencesContext).locale;
}

/** Whether feet and inches or the published metric values come first. */
export function useUnits(): Units {
  return useContext(PreferencesContext).units;
}
