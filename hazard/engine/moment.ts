import { isCalendarDate } from '../dates';

/** A date-time as written: the instant it names, and the calendar date in its own offset. */
export interface Moment {
  readonly text: string;
  /** Milliseconds since 1970-01-01T00:00:00Z. */
  readonly instant: number;
  readonly date: string;
}

const DATE_TIME =
  /^(\d{4}-\d{2}-\d{2})T(\d{2}):(\d{2})(?::(\d{2})(?:\.(\d+))?)?(?:Z|([+-])(\d{2}):(\d{2}))$/;
const MINUTE = 60_000;

/** Midnight UTC of a calendar date. */
function midnight(date: string): number {
  const [year, month, day] = date.split('-').map(Number) as [number, number, number];
  // `setUTCFullYear` takes the years 0 to 99 as they are written; `Date.UTC` does not.
  return new Date(0).setUTCFullYear(year, month - 1, day);
}

/** A calendar date `YYYY-MM-DD` that exists, else undefined. */
export function readDate(value: unknown): string | undefined {
  return isCalendarDate(value) ? value : undefined;
}

/** An ISO 8601 date-time with its offset, else undefined. */
export function readMoment(value: unknown): Moment | undefined {
  if (typeof value !== 'string') return undefined;
  const match = DATE_TIME.exec(value);
  const date = match?.[1];
  if (!match || !isCalendarDate(date)) return undefined;
  const [hour, minute, second] = [Number(match[2]), Number(match[3]), Number(match[4] ?? 0)];
  const [offsetHour, offsetMinute] = [Number(match[7] ?? 0), Number(match[8] ?? 0)];
  const isOnTheClock = hour < 24 && minute < 60 && second < 60;
  if (!isOnTheClock || offsetHour > 23 || offsetMinute > 59) return undefined;
  const offset = (match[6] === '-' ? -1 : 1) * (offsetHour * 60 + offsetMinute);
  const milliseconds = Math.floor(Number(`0.${match[5] ?? 0}`) * 1000);
  const instant =
    midnight(date) + ((hour * 60 + minute - offset) * 60 + second) * 1000 + milliseconds;
  return { text: value, instant, date };
}

/** The later of two calendar dates; `YYYY-MM-DD` sorts as text. */
export function laterDate(one: string, other: string): string {
  return one > other ? one : other;
}

/** Whole minutes from one moment to another, as instants: a change of clocks does not count. */
export function minutesBetween(from: Moment, to: Moment): number {
  return (to.instant - from.instant) / MINUTE;
}
