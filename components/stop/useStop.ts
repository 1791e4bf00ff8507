import { useCallback, useEffect, useState } from 'react';
import { v7 as newId } from 'uuid';
import type { WorksheetRecord } from '@/shared/record';
import { useUser } from '../api/session';
import { keptForms } from '../drafts/keptForms';
import { useWorksheetAct } from '../worksheet/worksheetQueries';
import { isRefused, keptStopSchema, stopKey, type KeptStop } from './keptStops';

/**
 * Stops the work. Without signal the stop is kept on the device and sent as
 * soon as there is signal: a stop that was pressed is never forgotten. It is
 * kept for its own revision, so that it never stops a later one.
 */
export function useStop({ id, revision }: Pick<WorksheetRecord, 'id' | 'revision'>) {
  const user = useUser();
  const { mutateAsync, isPending, error } = useWorksheetAct(id, 'stop');
  const [waiting, setWaiting] = useState<KeptStop>();
  const key = stopKey(id, revision);

  const send = useCallback(
    async (stop: KeptStop) => {
      setWaiting(stop);
      await keptForms.keep(user.id, key, stop).catch(() => undefined);
      try {
        await mutateAsync(stop);
      } catch (fault) {
        if (!isRefused(fault)) return;
      }
      setWaiting(undefined);
      await keptForms.forget(user.id, key).catch(() => undefined);
    },
    [user.id, key, mutateAsync],
  );

  useEffect(() => {
    let current = true;
    keptForms
      .read(user.id, key)
      .then((stored) => {
        const kept = keptStopSchema.safeParse(stored);
        if (current && kept.success) return send(kept.data);
        return undefined;
      })
      .catch(() => undefined);
    return () => {
      current = false;
    };
  }, [user.id, key, send]);

  useEffect(() => {
    if (waiting === undefined) return undefined;
    const again = () => void send(waiting);
    globalThis.addEventListener?.('online', again);
    return () => globalThis.removeEventListener?.('online', again);
  }, [waiting, send]);

  return {
    send: (reason: string) => void send({ id: waiting?.id ?? newId(), reason }),
    waiting: waiting?.reason,
    isPending,
    error,
  };
}
