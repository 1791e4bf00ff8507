import { QueryClientProvider } from '@tanstack/react-query';
import { StatusBar } from 'expo-status-bar';
import { useAtomValue } from 'jotai';
import type { ReactNode } from 'react';
import type { Units } from '@/shared/user';
import { deviceLocaleAtom, deviceThemeAtom } from '../api/deviceChoices';
import { deviceClient } from '../api/queryClient';
import { useSession } from '../api/session';
import { browserLocale } from '../i18n/browserLocale';
import { PreferencesProvider, useLocale } from '../i18n/preferences';
import { useFontsReady } from '../theme/fonts';
import { ThemeProvider, useTheme } from '../theme/useTheme';
import { usePageLook } from './usePageLook';
import { useServiceWorker } from './useServiceWorker';

function PageLook() {
  const { name, colors } = useTheme();
  usePageLook({ theme: name, locale: useLocale(), ground: colors.paper });
  return <StatusBar style={name === 'dark' ? 'light' : 'dark'} />;
}

/** What stands around every screen: the cache, the language, the units, the theme. */
export function AppRoot({ children }: { children: ReactNode }) {
  const fontsReady = useFontsReady();
  const session = useSession();
  const deviceLocale = useAtomValue(deviceLocaleAtom);
  const deviceTheme = useAtomValue(deviceThemeAtom);
  useServiceWorker();

  const user = session.data?.user;
  const locale = user?.locale ?? deviceLocale ?? browserLocale();
  const units: Units = user?.units ?? (locale === 'es-MX' ? 'metric' : 'feet');
  if (!fontsReady) return null;
  return (
    <QueryClientProvider client={deviceClient}>
      <PreferencesProvider locale={locale} units={units}>
        <ThemeProvider choice={deviceTheme ?? user?.theme ?? 'system'}>
          <PageLook />
          {children}
        </ThemeProvider>
      </PreferencesProvider>
    </QueryClientProvider>
  );
}
