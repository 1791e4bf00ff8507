import { v7 as newId } from 'uuid';
import { z } from 'zod';
import { worksheetSchema } from '@/shared/record';
import { ApiProblem } from '../api/ApiProblem';
import { json, request } from '../api/request';
import { keptForms } from '../drafts/keptForms';

const KEY = /^stop\/([0-9a-f-]+)\/(\d+)$/;
export const keptStopSchema = z.object({
  id: z.uuid().default(() => newId()),
  reason: z.string(),
});
export type KeptStop = z.infer<typeof keptStopSchema>;
export const stopKey = (worksheetId: string, revision: number) => `stop/${worksheetId}/${revision}`;

/** The server has said no for good. No answer, a fault of its own, a session that ended or a wait is none. */
export function isRefused(error: unknown): boolean {
  return (
    error instanceof ApiProblem && error.status < 500 && ![401, 408, 429].includes(error.status)
  );
}

/** Sends one stop, unless the worksheet has gone on to a later revision since. */
async function send(worksheetId: string, revision: number, stop: KeptStop): Promise<void> {
  const path = `/worksheets/${worksheetId}`;
  const record = await request(worksheetSchema, path);
  if (record.revision !== revision || !record.actions.includes('stop')) return;
  await request(worksheetSchema, `${path}/stop`, json('POST', stop));
}

/** Sends every stop that this person pressed without signal; what the server has answered is no longer kept. */
export async function sendKeptStops(userId: string): Promise<void> {
  for (const key of await keptForms.list(userId)) {
    const [, worksheetId, revision] = KEY.exec(key) ?? [];
    if (worksheetId === undefined) continue;
    const kept = keptStopSchema.safeParse(await keptForms.read(userId, key));
    try {
      if (kept.success) await send(worksheetId, Number(revision), kept.data);
    } catch (error) {
      if (!isRefused(error)) continue;
    }
    await keptForms.forget(userId, key);
  }
}
