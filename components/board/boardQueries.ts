import { queryOptions, useQuery } from '@tanstack/react-query';
import {
  listSchema,
  worksheetRowSchema,
  type WorksheetRecord,
  type WorksheetRow,
} from '@/shared/record';
import type { WorksheetContent } from '@/shared/worksheet';
import { request } from '../api/request';
import { worksheetQuery } from '../worksheet/worksheetQueries';

const rowsSchema = listSchema(worksheetRowSchema);
/** What is running at once on the sites of one person stays far below this. */
const MOST = 200;
/** A stop must reach the board while it still matters. */
const ASK_AGAIN_MS = 20_000;
const RUNNING = 'briefing,countersign,in-force,stopped,expired';

/** Everything that waits, is in force, over time or stopped. */
export function boardRowsQuery() {
  return queryOptions({
    queryKey: ['worksheets', 'board'] as const,
    queryFn: ({ signal }) =>
      request(rowsSchema, `/worksheets?state=${RUNNING}&sort=-updatedAt&limit=${MOST}`, { signal }),
    refetchInterval: ASK_AGAIN_MS,
  });
}

/** Signed worksheets of one site, to find the last one at the same place. */
function placeQuery(siteId: string | undefined) {
  const states = 'closed,in-force,expired';
  return queryOptions({
    queryKey: ['worksheets', 'place', siteId ?? ''] as const,
    queryFn: ({ signal }) =>
      request(rowsSchema, `/worksheets?state=${states}&siteId=${siteId ?? ''}&limit=${MOST}`, {
        signal,
      }),
    enabled: siteId !== undefined,
  });
}

const spoken = (text: string | undefined) => (text ?? '').trim().toLocaleLowerCase();

function lastAt(record: WorksheetRecord, rows: readonly WorksheetRow[]): WorksheetRow | undefined {
  const area = spoken(record.content.job?.area);
  const equipment = spoken(record.content.job?.equipment);
  return rows.find(
    (row) =>
      row.id !== record.id &&
      row.createdAt < record.createdAt &&
      area !== '' &&
      spoken(row.area) === area &&
      spoken(row.equipment) === equipment,
  );
}

/** The last signed worksheet for the same equipment in the same area, if there is one. */
export function useLastAtPlace(record: WorksheetRecord): WorksheetRecord | undefined {
  const rows = useQuery(placeQuery(record.content.job?.siteId));
  const last = rows.data === undefined ? undefined : lastAt(record, rows.data.items);
  const found = useQuery({ ...worksheetQuery(last?.id ?? ''), enabled: last !== undefined });
  return last === undefined ? undefined : found.data;
}

/** What belongs to the place and not to the day: supply, ways it can be live, arc flash figures. */
export function placeContent(content: WorksheetContent): WorksheetContent {
  const { supply, egressSupply, egressReaches, sources, arcFlash } = content;
  const kept = sources?.map(
    ({ lockNumber: _lock, lockedBy: _by, byCrewId: _who, ...source }) => source,
  );
  const { readings: _readings, ...wiring } = supply ?? {};
  return {
    ...(supply !== undefined && { supply: wiring }),
    ...(egressSupply !== undefined && { egressSupply }),
    ...(egressReaches !== undefined && { egressReaches }),
    ...(kept !== undefined && { sources: kept }),
    ...(arcFlash !== undefined && { arcFlash }),
  };
}
