import { keepPreviousData, queryOptions } from '@tanstack/react-query';
import { insightsSchema } from '@/shared/insights';
import { request } from '../api/request';

/** The counts of one span and site; `query` as it is sent. */
export function insightsQuery(query: string) {
  return queryOptions({
    queryKey: ['worksheets', 'insights', query] as const,
    queryFn: ({ signal }) => request(insightsSchema, `/insights?${query}`, { signal }),
    placeholderData: keepPreviousData,
    staleTime: 60_000,
  });
}
