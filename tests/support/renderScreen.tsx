import { QueryClient, QueryClientProvider } from '@tanstack/react-query';
import { render } from '@testing-library/react';
import type { ReactElement, ReactNode } from 'react';
import { UserContext } from '@/components/api/session';
import { PreferencesProvider } from '@/components/i18n/preferences';
import type { Locale, SessionUser } from '@/shared/user';

export function buildUser(changes: Partial<SessionUser> = {}): SessionUser {
  return {
    id: '0190b5a4-0000-7000-8000-000000000001',
    name: 'Ruth Ansbach',
    email: 'lead@wideberth.example',
    role: 'lead',
    qualifiedThrough: '2027-05-01',
    siteIds: ['0190b5a4-0000-7000-8000-0000000000a1'],
    locale: 'en-US',
    units: 'feet',
    theme: 'system',
    hasPin: true,
    ...changes,
  };
}

interface Options {
  user?: SessionUser;
  locale?: Locale;
}

/** Renders as a signed-in person sees it: own cache, own language, no network unless the test gives one. */
export function renderScreen(element: ReactElement, options: Options = {}) {
  const user = options.user ?? buildUser();
  const client = new QueryClient({
    defaultOptions: { queries: { retry: false }, mutations: { retry: false } },
  });
  const wrapper = ({ children }: { children: ReactNode }) => (
    <QueryClientProvider client={client}>
      <PreferencesProvider locale={options.locale ?? user.locale} units={user.units}>
        <UserContext value={user}>{children}</UserContext>
      </PreferencesProvider>
    </QueryClientProvider>
  );
  return { client, ...render(element, { wrapper }) };
}
