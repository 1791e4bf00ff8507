import { infiniteQueryOptions, keepPreviousData } from '@tanstack/react-query';
import { listSchema, worksheetRowSchema } from '@/shared/record';
import { request } from '../api/request';

const rowsSchema = listSchema(worksheetRowSchema);
const PAGE = 50;
/** Words that were searched on the way are not kept on the device. */
const KEPT_MS = 10 * 60_000;

/** The archive, page after page; `query` holds the filters and the order. */
export function archiveQuery(query: string) {
  return infiniteQueryOptions({
    queryKey: ['worksheets', 'archive', query] as const,
    queryFn: ({ signal, pageParam }) => {
      const page = new URLSearchParams(query);
      page.set('limit', String(PAGE));
      if (pageParam !== '') page.set('cursor', pageParam);
      return request(rowsSchema, `/worksheets?${page.toString()}`, { signal });
    },
    initialPageParam: '',
    getNextPageParam: ({ nextCursor }) => nextCursor ?? undefined,
    placeholderData: keepPreviousData,
    gcTime: KEPT_MS,
  });
}
