/**
 * Calendar dates without a clock or a time zone. `Date` is not used: a device
 * in another zone, or one that skips a day, must come to the same date.
 */

const MONTHS_IN_YEAR = 12;

interface CalendarDate {
  year: number;
  month: number;
  day: number;
}

function daysInMonth(year: number, month: number): number {
  if (month === 2) {
    const isLeapYear = (year % 4 === 0 && year % 100 !== 0) || year % 400 === 0;
    return isLeapYear ? 29 : 28;
  }
  return [4, 6, 9, 11].includes(month) ? 30 : 31;
}

function parse(text: unknown): CalendarDate | null {
  const match = typeof text === 'string' ? /^(\d{4})-(\d{2})-(\d{2})$/.exec(text) : null;
  if (match === null) return null;
  const [year, month, day] = match.slice(1).map(Number) as [number, number, number];
  const isReal = month >= 1 && month <= 12 && day >= 1 && day <= daysInMonth(year, month);
  return isReal ? { year, month, day } : null;
}

/** Whether a value is a date of the calendar, written `YYYY-MM-DD`. */
export const isCalendarDate = (value: unknown): value is string => parse(value) !== null;

/** The date itself, or a `RangeError` that names the argument. */
export function requireCalendarDate(name: string, value: unknown): string {
  if (!isCalendarDate(value)) {
    throw new RangeError(`${name} must be a date written YYYY-MM-DD, not ${String(value)}`);
  }
  return value;
}

/**
 * The same day so many calendar months later, or the last day of that month
 * where it has no such day. Dates past the year 9999 cannot be written; the
 * last one that can is given, so that text still compares as dates do.
 */
export function addCalendarMonths(date: string, months: number): string {
  const start = parse(requireCalendarDate('date', date)) as CalendarDate;
  const total = start.year * MONTHS_IN_YEAR + (start.month - 1) + months;
  const year = Math.floor(total / MONTHS_IN_YEAR);
  const month = (total % MONTHS_IN_YEAR) + 1;
  if (year > 9999) return '9999-12-31';
  const day = Math.min(start.day, daysInMonth(year, month));
  const padded = (value: number, width: number) => String(value).padStart(width, '0');
  return `${padded(year, 4)}-${padded(month, 2)}-${padded(day, 2)}`;
}
