import { queryOptions, useMutation, useQueryClient, type QueryClient } from '@tanstack/react-query';
import { useState } from 'react';
import { v7 as newId } from 'uuid';
import { worksheetSchema, type WorksheetRecord } from '@/shared/record';
import type { WorksheetContent } from '@/shared/worksheet';
import { ApiProblem, isProblem } from '../api/ApiProblem';
import { json, request } from '../api/request';
import type { SendOutcome } from '../drafts/useDraft';

/** States in which somebody else's act is waited for, or may stop the work. */
const OTHERS_ACT: ReadonlySet<string> = new Set(['briefing', 'countersign', 'in-force']);
const OTHERS_ACT_MS = 15_000;

export const worksheetKeys = {
  all: ['worksheets'] as const,
  detail: (worksheetId: string) => ['worksheets', 'detail', worksheetId] as const,
};

export function worksheetQuery(worksheetId: string) {
  return queryOptions({
    queryKey: worksheetKeys.detail(worksheetId),
    queryFn: ({ signal }) => request(worksheetSchema, `/worksheets/${worksheetId}`, { signal }),
    // Others sign and stop on their own devices: an opened record is always asked for again.
    refetchOnMount: 'always',
    refetchInterval: ({ state }) =>
      OTHERS_ACT.has(state.data?.state ?? 'draft') ? OTHERS_ACT_MS : false,
  });
}

/** Puts a record where every screen reads it, and marks the lists as old. */
export async function storeWorksheet(client: QueryClient, record: WorksheetRecord): Promise<void> {
  client.setQueryData(worksheetQuery(record.id).queryKey, record);
  await client.invalidateQueries({
    queryKey: worksheetKeys.all,
    predicate: ({ queryKey }) => queryKey[1] !== 'detail',
  });
}

export function useCreateWorksheet() {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (body: { id: string; content: WorksheetContent }) =>
      request(worksheetSchema, '/worksheets', json('POST', body)),
    onSuccess: (record) => storeWorksheet(client, record),
  });
}

/**
 * A POST that answers with a worksheet: return, stop, void, revise, close, copy.
 * It keeps its id until it is answered, so that a second press after a lost
 * answer is the same act.
 */
export function useWorksheetAct(worksheetId: string, act: string) {
  const client = useQueryClient();
  const [id, setId] = useState(() => newId());
  return useMutation({
    mutationFn: (body: object) =>
      request(worksheetSchema, `/worksheets/${worksheetId}/${act}`, json('POST', { id, ...body })),
    onSuccess: (record) => {
      setId(newId());
      return storeWorksheet(client, record);
    },
    onError: (error) => {
      if (isProblem(error, 'id-taken')) setId(newId());
    },
  });
}

function outcomeOf(error: unknown): SendOutcome {
  if (isProblem(error, 'stale-version')) return { kind: 'conflict' };
  if (
    error instanceof ApiProblem &&
    error.status < 500 &&
    error.status !== 408 &&
    error.status !== 429
  ) {
    return { kind: 'refused', error };
  }
  return { kind: 'unreachable' };
}

/** Saves a content over the version that it was typed over, and says how that ended. */
export async function saveContent(
  client: QueryClient,
  worksheetId: string,
  content: WorksheetContent,
  baseVersion: number,
): Promise<SendOutcome> {
  try {
    const record = await request(
      worksheetSchema,
      `/worksheets/${worksheetId}`,
      json('PUT', { content }, { 'If-Match': `"${baseVersion}"` }),
    );
    await storeWorksheet(client, record);
    return { kind: 'accepted', version: record.version, at: record.updatedAt };
  } catch (error) {
    return outcomeOf(error);
  }
}
