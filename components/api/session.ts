import { queryOptions, useMutation, useQuery } from '@tanstack/react-query';
import { createContext, useContext } from 'react';
import { z } from 'zod';
import { sessionSchema, sessionUserSchema, type SessionUser } from '@/shared/user';
import { isProblem } from './ApiProblem';
import { deviceStorage } from './deviceStorage';
import { keptCache } from './keptCache';
import { deviceClient } from './queryClient';
import { json, request } from './request';

export const sessionKey = ['session'] as const;
const KEPT_USER = 'user';

export interface Session {
  user: SessionUser;
  /** True while the server cannot be asked and the person is known from this device. */
  fromDevice?: boolean;
}

/** What the browser kept may be cut off or of an older release: then nobody is known. */
const keptUserSchema = z
  .string()
  .transform((kept, context) => {
    try {
      return JSON.parse(kept) as unknown;
    } catch {
      context.addIssue({ code: 'custom', message: 'no JSON' });
      return z.NEVER;
    }
  })
  .pipe(sessionUserSchema);

function keptUser(): SessionUser | undefined {
  return keptUserSchema.safeParse(deviceStorage.get(KEPT_USER)).data;
}

function remember(user: SessionUser | null) {
  deviceStorage.set(KEPT_USER, user === null ? null : JSON.stringify(user));
}

/**
 * Who is signed in; null when nobody is. Without signal it is the person that
 * this device last knew, so that a kept worksheet opens in a basement.
 */
async function readSession(signal: AbortSignal): Promise<Session | null> {
  try {
    const session = await request(sessionSchema, '/session', { signal });
    remember(session.user);
    return session;
  } catch (error) {
    if (isProblem(error, 'not-signed-in')) {
      remember(null);
      return null;
    }
    const user = keptUser();
    if (user !== undefined) return { user, fromDevice: true };
    throw error;
  }
}

export function sessionQuery() {
  return queryOptions({
    queryKey: sessionKey,
    queryFn: ({ signal }) => readSession(signal),
    networkMode: 'always',
    retry: false,
    staleTime: 5 * 60_000,
  });
}

/** The session as the server or this device knows it. */
export function useSession() {
  return useQuery(sessionQuery(), deviceClient);
}

function store(session: Session | null) {
  remember(session?.user ?? null);
  deviceClient.setQueryData(sessionQuery().queryKey, session);
}

export function useSignIn() {
  return useMutation(
    {
      mutationFn: (credentials: { email: string; password: string }) =>
        request(sessionSchema, '/session', json('POST', credentials)),
      onSuccess: (session) => store(session),
    },
    deviceClient,
  );
}

const nothing = z.undefined();

/** Ends the session and takes what this person was shown off the device. Drafts stay, under their name. */
export function useSignOut() {
  return useMutation(
    {
      mutationFn: async (user: SessionUser) => {
        await request(nothing, '/session', { method: 'DELETE' });
        await keptCache.forget(user.id).catch(() => undefined);
      },
      onSuccess: () => store(null),
    },
    deviceClient,
  );
}

export type SessionPatch = Partial<Pick<SessionUser, 'locale' | 'units' | 'theme'>>;

/** Changes language, units or theme: shown at once, taken back when the server refuses. */
export function usePatchSession() {
  return useMutation(
    {
      mutationFn: (patch: SessionPatch) => request(sessionSchema, '/session', json('PATCH', patch)),
      onMutate: (patch) => {
        const before = deviceClient.getQueryData(sessionQuery().queryKey);
        if (before) {
          const next: Session = { ...before, user: { ...before.user, ...patch } };
          deviceClient.setQueryData(sessionQuery().queryKey, next);
        }
        return before;
      },
      onError: (error, _patch, before) => {
        // Without signal the choice holds on this device until the session is read again.
        if (before && !(error instanceof TypeError))
          deviceClient.setQueryData(sessionQuery().queryKey, before);
      },
      onSuccess: (session) => store(session),
    },
    deviceClient,
  );
}

/** Asks the server again who is signed in: after a new PIN, a new role. */
export function refreshSession(): Promise<void> {
  return deviceClient.invalidateQueries({ queryKey: sessionKey });
}

export const UserContext = createContext<SessionUser | undefined>(undefined);

/** The signed-in person. Only inside the signed-in part of the app. */
export function useUser(): SessionUser {
  const user = useContext(UserContext);
  if (user === undefined) throw new Error('useUser() stands outside the signed-in part');
  return user;
}
