import { calendarDate } from '@/shared/format';
import type { WorksheetRow } from '@/shared/record';

const ENDED = new Set<WorksheetRow['state']>(['closed', 'void']);

/** In force first, what is over last: the order in which a crew looks at its day. */
const ORDER: readonly WorksheetRow['state'][] = [
  'in-force',
  'expired',
  'countersign',
  'briefing',
  'draft',
  'returned',
  'stopped',
  'closed',
  'void',
];

function rank(row: WorksheetRow): number {
  if (row.state === 'in-force' && row.mode === 'energized') return -1;
  return ORDER.indexOf(row.state);
}

export interface HomeGroups {
  today: WorksheetRow[];
  earlier: WorksheetRow[];
  later: WorksheetRow[];
}

/** The day of a row on the wall of its own site: when it is planned, else when it was last touched. */
function dayOf(row: WorksheetRow): string {
  return calendarDate(row.startsAt ?? row.updatedAt, row.timeZone);
}

/** Today's worksheets, those still open from before, those planned for later. */
export function homeGroups(rows: readonly WorksheetRow[], now: string): HomeGroups {
  const groups: HomeGroups = { today: [], earlier: [], later: [] };
  for (const row of rows) {
    const today = calendarDate(now, row.timeZone);
    const ended = ENDED.has(row.state);
    const touchedToday = calendarDate(row.updatedAt, row.timeZone) === today;
    const day = dayOf(row);
    // What is in force is today's, whatever day it was planned for.
    if (day === today || row.state === 'in-force' || (ended && touchedToday))
      groups.today.push(row);
    else if (!ended && day < today) groups.earlier.push(row);
    else if (!ended && day > today) groups.later.push(row);
  }
  for (const group of Object.values(groups) as WorksheetRow[][])
    group.sort((a, b) => rank(a) - rank(b));
  return groups;
}
