import {
  addMonths,
  eachMonthOfInterval,
  endOfMonth,
  format,
  parseISO,
  startOfMonth,
} from 'date-fns';
import type { Locale } from '@/shared/user';
import { daysBetween } from '@/shared/registerState';

/** Months that the ruler reaches before and after today's. */
const BEFORE = 7;
const AFTER = 7;

export interface Tick {
  /** px from the left. */
  at: number;
  /** The month's short name, at the start of a quarter only. */
  label: string | undefined;
}

export interface Timeline {
  width: number;
  today: number;
  ticks: readonly Tick[];
  /** The last day of the ruler. */
  last: string;
  /** Where a date lies, held inside the ruler. */
  at: (date: string) => number;
}

/** A ruler of months about today, drawn to one scale in every row. */
export function timeline(today: string, width: number, locale: Locale): Timeline {
  const day = parseISO(today);
  const from = startOfMonth(addMonths(day, -BEFORE));
  const to = endOfMonth(addMonths(day, AFTER));
  const first = format(from, 'yyyy-MM-dd');
  const last = format(to, 'yyyy-MM-dd');
  const days = daysBetween(first, last) + 1;
  const at = (date: string) =>
    Math.min(width, Math.max(0, (daysBetween(first, date) / days) * width));
  const month = new Intl.DateTimeFormat(locale, { month: 'short' });
  return {
    width,
    last,
    today: at(today),
    ticks: eachMonthOfInterval({ start: from, end: to }).map((start) => ({
      at: at(format(start, 'yyyy-MM-dd')),
      label: start.getMonth() % 3 === 0 ? month.format(start).replace('.', '') : undefined,
    })),
    at,
  };
}

/** Narrower than this, what is overdue would hardly be seen. */
const LEAST_OVERDUE = 7;

export interface BarParts {
  /** px: left and width of each part that there is. */
  elapsed?: [number, number];
  rest?: [number, number];
  overdue?: [number, number];
  waiting?: [number, number];
  /** It ends past the ruler: its end is not drawn. */
  runsOn?: boolean;
}

interface BarDates {
  /** When the interval began; left out where only its end is known. */
  from?: string;
  until: string;
  today: string;
  /** In store: it has not begun. */
  waits?: boolean;
}

/** The parts of one bar: time gone, time left, time over. */
export function barParts(line: Timeline, { from, until, today, waits }: BarDates): BarParts {
  const end = line.at(until);
  const start = from === undefined ? Math.min(line.today, end) : line.at(from);
  if (until < today) {
    const width = Math.max(LEAST_OVERDUE, line.today - end);
    const left = line.today - width;
    const gone = Math.max(0, left - start);
    return {
      ...(from !== undefined && gone > 0 && { elapsed: [start, gone] as [number, number] }),
      overdue: [left, width],
    };
  }
  const runsOn = until > line.last;
  if (waits === true) return { runsOn, waiting: [start, Math.max(2, end - start)] };
  const rest: [number, number] = [line.today, Math.max(0, end - line.today)];
  if (from === undefined) return { runsOn, rest };
  return { runsOn, elapsed: [start, Math.max(0, line.today - start)], rest };
}
