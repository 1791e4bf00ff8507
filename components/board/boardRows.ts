import { calendarDate, durationText, timeText } from '@/shared/format';
import type { Messages } from '@/shared/messages';
import type { WorksheetRow } from '@/shared/record';
import type { SessionUser } from '@/shared/user';
import type { MarkState } from '../ui';

export type BarKind = 'energized' | 'over' | 'stopped' | 'not-proved' | 'proved' | 'waits';

/** Energized first, then what has gone wrong, then treat as live, then proved, then what waits. */
const ORDER: readonly BarKind[] = ['energized', 'over', 'stopped', 'not-proved', 'proved', 'waits'];

const MARKS: Readonly<Record<BarKind, MarkState>> = {
  energized: 'energized',
  over: 'stop',
  stopped: 'stop',
  'not-proved': 'not-proved',
  proved: 'proved',
  waits: 'waits',
};

export interface BoardRow {
  row: WorksheetRow;
  kind: BarKind;
  mark: MarkState;
  /** How it stands, in words: never by the bar alone. */
  words: string;
}

function kindOf(row: WorksheetRow, now: string): BarKind {
  if (row.state === 'stopped') return 'stopped';
  if (row.state === 'expired') return 'over';
  if (row.state !== 'in-force') return 'waits';
  // The clock may not have moved it on yet.
  if (row.endsAt !== null && Date.parse(row.endsAt) < Date.parse(now)) return 'over';
  if (row.mode === 'energized') return 'energized';
  return row.proved ? 'proved' : 'not-proved';
}

export function isOnCrew(row: WorksheetRow, user: SessionUser): boolean {
  return row.leadId === user.id || row.crew.some(({ userId }) => userId === user.id);
}

/** Whether this person is asked to countersign it. */
export function waitsForPerson(row: WorksheetRow, user: SessionUser): boolean {
  return row.state === 'countersign' && user.role === 'supervisor' && !isOnCrew(row, user);
}

function wordsOf(row: WorksheetRow, kind: BarKind, words: Messages['board'], seen: Seen): string {
  const { bar } = words;
  switch (kind) {
    case 'energized':
      return bar.energized;
    case 'over': {
      const late = row.endsAt === null ? 0 : Date.parse(seen.now) - Date.parse(row.endsAt);
      const over = bar.over(durationText(late));
      return row.mode === 'energized' ? `${bar.energized}. ${over}` : over;
    }
    case 'stopped':
      return bar.stopped(timeText(row.updatedAt, row.timeZone), row.reasonBy ?? '');
    case 'not-proved':
      return bar.notProved;
    case 'proved':
      return bar.proved;
    case 'waits':
      if (row.state === 'briefing') return bar.waitsForCrew(Math.max(1, row.awaiting.length));
      return waitsForPerson(row, seen.user) ? bar.waitsForYou : bar.waitsForSupervisor;
  }
}

interface Seen {
  user: SessionUser;
  now: string;
}

/** A stop is on the board on its own day; what nobody has closed stays until it is. */
function isOfToday(row: WorksheetRow, kind: BarKind, now: string): boolean {
  const dayOf = (at: string | null) => at !== null && calendarDate(at, row.timeZone);
  const today = calendarDate(now, row.timeZone);
  if (kind === 'stopped') return dayOf(row.updatedAt) === today || dayOf(row.startsAt) === today;
  if (kind === 'waits') return dayOf(row.startsAt) === today || row.state === 'countersign';
  return true;
}

const endOf = ({ row }: BoardRow) =>
  row.endsAt === null ? Number.MAX_SAFE_INTEGER : Date.parse(row.endsAt);

/** Energized work that is over time stays with the energized. */
function rank({ row, kind }: BoardRow): number {
  return kind === 'over' && row.mode === 'energized' ? -1 : ORDER.indexOf(kind);
}

/** The rows of the board in the order in which they are looked at. */
export function boardRows(
  rows: readonly WorksheetRow[],
  words: Messages['board'],
  seen: Seen,
): BoardRow[] {
  return rows
    .map((row) => ({ row, kind: kindOf(row, seen.now) }))
    .filter(({ row, kind }) => isOfToday(row, kind, seen.now))
    .map(({ row, kind }) => ({
      row,
      kind,
      mark: MARKS[kind],
      words: wordsOf(row, kind, words, seen),
    }))
    .sort((a, b) => rank(a) - rank(b) || endOf(a) - endOf(b));
}
