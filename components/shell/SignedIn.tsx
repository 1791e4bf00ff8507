import { Redirect, usePathname } from 'expo-router';
import { useMemo, type ReactNode } from 'react';
import type { Role, SessionUser } from '@/shared/user';
import { PersonQueryProvider } from '../api/PersonQueryProvider';
import { UserContext, useSession } from '../api/session';
import { useMessages } from '../i18n/useMessages';
import { useSendKeptStops } from '../stop/useSendKeptStops';
import { LoadingScreen, ProblemScreen, ShellContext, type Shell } from '../ui';
import { placesOf } from './places';

function SignedInAs({ user, children }: { user: SessionUser; children: ReactNode }) {
  const { home } = useMessages();
  useSendKeptStops(user.id);
  const shell = useMemo<Shell>(
    () => ({
      person: { name: user.name, role: home.role[user.role], href: '/account' },
      places: placesOf(user.role).map((place) => ({ ...place, label: home.places[place.key] })),
      homeHref: '/',
    }),
    [user.name, user.role, home],
  );
  return (
    <UserContext value={user}>
      <ShellContext value={shell}>
        <PersonQueryProvider key={user.id} userId={user.id}>
          {children}
        </PersonQueryProvider>
      </ShellContext>
    </UserContext>
  );
}

/** Lets only a signed-in person through; others sign in first and come back to where they wanted to go. */
export function SignedIn({ children }: { children: ReactNode }) {
  const session = useSession();
  const pathname = usePathname();
  if (session.data === undefined) {
    if (session.isError) {
      return <ProblemScreen error={session.error} onRetry={() => void session.refetch()} />;
    }
    return <LoadingScreen />;
  }
  if (session.data === null) {
    return (
      <Redirect
        href={pathname === '/' ? '/sign-in' : { pathname: '/sign-in', params: { to: pathname } }}
      />
    );
  }
  return <SignedInAs user={session.data.user}>{children}</SignedInAs>;
}

/** Lets only some roles through; the server decides anyway, this saves a useless request. */
export function OnlyFor({ roles, children }: { roles: readonly Role[]; children: ReactNode }) {
  const session = useSession();
  const role = session.data?.user.role;
  if (role !== undefined && !roles.includes(role)) return <Redirect href="/" />;
  return children;
}
