import { queryOptions, useMutation, useQueryClient } from '@tanstack/react-query';
import { v7 as uuid } from 'uuid';
import { z } from 'zod';
import { deviceSchema } from '@/shared/record';
import { ownSessionSchema } from '@/shared/user';
import { forgetDeviceKey, keepDeviceKey, keptDeviceId, makeDeviceKey } from '../api/deviceKey';
import { json, request } from '../api/request';
import { refreshSession } from '../api/session';

const sessionsKey = ['account', 'sessions'] as const;
const devicesKey = ['account', 'devices'] as const;
const nothing = z.undefined();

export function ownSessionsQuery() {
  return queryOptions({
    queryKey: sessionsKey,
    queryFn: ({ signal }) =>
      request(z.object({ items: z.array(ownSessionSchema) }), '/sessions', { signal }),
  });
}

export function devicesQuery() {
  return queryOptions({
    queryKey: devicesKey,
    queryFn: ({ signal }) =>
      request(z.object({ items: z.array(deviceSchema) }), '/devices', { signal }),
  });
}

/** The id of the key on this device, if the person added it. */
export function thisDeviceQuery(userId: string) {
  return queryOptions({
    queryKey: ['account', 'this-device', userId] as const,
    queryFn: async () => (await keptDeviceId(userId)) ?? null,
    networkMode: 'always',
  });
}

/** Ends one sign-in, or without an id all but this one. */
export function useEndSession() {
  const queryClient = useQueryClient();
  return useMutation({
    mutationFn: (sessionId: string | undefined) =>
      request(nothing, sessionId === undefined ? '/sessions' : `/sessions/${sessionId}`, {
        method: 'DELETE',
      }),
    onSuccess: () => queryClient.invalidateQueries({ queryKey: sessionsKey }),
  });
}

export function useChangePassword() {
  const queryClient = useQueryClient();
  return useMutation({
    mutationFn: (body: { current: string; password: string }) =>
      request(z.unknown(), '/session/password', json('POST', body)),
    onSuccess: () => queryClient.invalidateQueries({ queryKey: sessionsKey }),
  });
}

export function useChangePin() {
  const queryClient = useQueryClient();
  return useMutation({
    mutationFn: (body: { password: string; pin: string }) =>
      request(z.unknown(), '/session/pin', json('POST', body)),
    // A new PIN takes every device off the list.
    onSuccess: () =>
      Promise.all([queryClient.invalidateQueries({ queryKey: devicesKey }), refreshSession()]),
  });
}

export function useAddDevice(userId: string) {
  const queryClient = useQueryClient();
  return useMutation({
    mutationFn: async ({ label, pin }: { label: string; pin: string }) => {
      const { key, publicKey } = await makeDeviceKey();
      const id = uuid();
      const device = await request(
        deviceSchema,
        '/devices',
        json('POST', { id, publicKey, label, pin }),
      );
      await keepDeviceKey(userId, { deviceId: device.id, key });
      return device;
    },
    onSuccess: () => queryClient.invalidateQueries({ queryKey: ['account'] }),
  });
}

export function useTakeOffDevice(userId: string) {
  const queryClient = useQueryClient();
  return useMutation({
    mutationFn: async (deviceId: string) => {
      await request(nothing, `/devices/${deviceId}`, { method: 'DELETE' });
      if ((await keptDeviceId(userId)) === deviceId) await forgetDeviceKey(userId);
    },
    onSuccess: () => queryClient.invalidateQueries({ queryKey: ['account'] }),
  });
}
