import { queryOptions, useQuery, useQueryClient, type QueryClient } from '@tanstack/react-query';
import { calendarDate, dateText } from '@/shared/format';
import { listSchema, worksheetRowSchema, type WorksheetRecord } from '@/shared/record';
import { request } from '../api/request';
import { useLocale } from '../i18n/preferences';
import { useMessages } from '../i18n/useMessages';
import { useWorksheetForm } from './form/WorksheetFormContext';
import { worksheetQuery } from './worksheetQueries';

const rowsSchema = listSchema(worksheetRowSchema);
/** Enough to pass over drafts of the same days. */
const LOOKED_AT = 20;
const STALE_MS = 10 * 60_000;

/** The last worksheet of a site that was signed at some time; null where there is none. */
async function readLast(
  client: QueryClient,
  { siteId, ownId, signal }: { siteId: string; ownId: string; signal: AbortSignal },
): Promise<WorksheetRecord | null> {
  const path = `/worksheets?siteId=${siteId}&limit=${LOOKED_AT}`;
  const { items } = await request(rowsSchema, path, { signal });
  const last = items.find(({ id, state }) => id !== ownId && state !== 'draft' && state !== 'void');
  return last === undefined ? null : client.ensureQueryData(worksheetQuery(last.id));
}

export interface LastHere {
  /** Where the suggestions come from, for a person to judge. */
  from: string;
  content: WorksheetRecord['content'];
}

/**
 * What was answered the last time at this site, to be offered and confirmed.
 * It never answers anything by itself: a building changes between two jobs.
 */
export function useLastHere(): LastHere | undefined {
  const { worksheet: words } = useMessages();
  const locale = useLocale();
  const client = useQueryClient();
  const { content, record, editable } = useWorksheetForm();
  const siteId = content.job?.siteId;
  const last = useQuery(
    queryOptions({
      queryKey: ['last-here', siteId ?? '', record.id] as const,
      queryFn: ({ signal }) => readLast(client, { siteId: siteId ?? '', ownId: record.id, signal }),
      enabled: editable && siteId !== undefined,
      staleTime: STALE_MS,
      retry: false,
    }),
  );
  if (!last.data) return undefined;
  const { number, createdAt, timeZone } = last.data;
  const day = dateText(locale, calendarDate(createdAt, timeZone));
  return { from: words.fromLast(number, day), content: last.data.content };
}
