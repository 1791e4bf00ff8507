import { queryOptions } from '@tanstack/react-query';
import { z } from 'zod';
import { eventSchema, revisionDetailSchema, revisionSchema } from '@/shared/record';
import { request } from '../api/request';

const eventsSchema = z.object({ items: z.array(eventSchema) });
const revisionsSchema = z.object({ items: z.array(revisionSchema) });

export type Revision = z.infer<typeof revisionSchema>;
export type RevisionDetail = z.infer<typeof revisionDetailSchema>;

// All under `worksheets`, so that an act on one marks them as old.
export function eventsQuery(worksheetId: string) {
  return queryOptions({
    queryKey: ['worksheets', 'events', worksheetId] as const,
    queryFn: ({ signal }) => request(eventsSchema, `/worksheets/${worksheetId}/events`, { signal }),
  });
}

export function revisionsQuery(worksheetId: string) {
  return queryOptions({
    queryKey: ['worksheets', 'revisions', worksheetId] as const,
    queryFn: ({ signal }) =>
      request(revisionsSchema, `/worksheets/${worksheetId}/revisions`, { signal }),
  });
}

export function revisionQuery(worksheetId: string, revision: number) {
  return queryOptions({
    queryKey: ['worksheets', 'revision', worksheetId, revision] as const,
    queryFn: ({ signal }) =>
      request(revisionDetailSchema, `/worksheets/${worksheetId}/revisions/${revision}`, { signal }),
  });
}
