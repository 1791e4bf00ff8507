import { useCallback, useEffect, useState } from 'react';
import { v7 as newId } from 'uuid';
import { z } from 'zod';
import type { WorksheetRecord } from '@/shared/record';
import { ApiProblem } from '../api/ApiProblem';
import { useUser } from '../api/session';
import { keptForms } from '../drafts/keptForms';
import { useWorksheetAct } from '../worksheet/worksheetQueries';

const keptSchema = z.object({ id: z.uuid().default(() => newId()), reason: z.string() });
type Kept = z.infer<typeof keptSchema>;

/** Whether the server has said no; no answer, or a fault of its own, is none. */
const isRefused = (error: unknown) => error instanceof ApiProblem && error.status < 500;

/**
 * Stops the work. Without signal the stop is kept on the device and sent as
 * soon as there is signal: a stop that was pressed is never forgotten. It is
 * kept for its own revision, so that it never stops a later one.
 */
export function useStop({ id, revision }: Pick<WorksheetRecord, 'id' | 'revision'>) {
  const user = useUser();
  const { mutateAsync, isPending, error } = useWorksheetAct(id, 'stop');
  const [waiting, setWaiting] = useState<Kept>();
  const key = `stop/${id}/${revision}`;

  const send = useCallback(
    async (stop: Kept) => {
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
        const kept = keptSchema.safeParse(stored);
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
