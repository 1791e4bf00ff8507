import { queryOptions } from '@tanstack/react-query';
import { listSchema, worksheetRowSchema } from '@/shared/record';
import { request } from '../api/request';

const rowsSchema = listSchema(worksheetRowSchema);
/** What is open rarely exceeds a few dozen; closed ones are found in the archive. */
const MOST = 200;
/** A question or a stop should not wait for somebody to load the page again. */
const ASK_AGAIN_MS = 60_000;

/** The newest worksheets that this person may see. */
export function homeRowsQuery() {
  return queryOptions({
    queryKey: ['worksheets', 'home'] as const,
    queryFn: ({ signal }) => request(rowsSchema, `/worksheets?limit=${MOST}`, { signal }),
    refetchInterval: ASK_AGAIN_MS,
  });
}
