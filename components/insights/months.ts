import type { Locale } from '@/shared/user';

/** More columns than this are no longer told apart: then only months that have something are drawn. */
const MOST_MONTHS = 24;

/** Every month from the first to the last, `YYYY-MM`, both included. */
export function monthsBetween(first: string, last: string): string[] {
  const months: string[] = [];
  const [year, month] = first.split('-').map(Number) as [number, number];
  for (let step = 0; step < MOST_MONTHS; step += 1) {
    const next = new Date(Date.UTC(year, month - 1 + step, 1)).toISOString().slice(0, 7);
    if (next > last) break;
    months.push(next);
  }
  return months;
}

/** The months of a chart: the whole span where it is short enough, else those that have something. */
export function chartMonths(
  from: string | undefined,
  to: string,
  present: readonly string[],
): string[] {
  const first = from?.slice(0, 7) ?? present[0];
  if (first === undefined) return [];
  const all = monthsBetween(first, to.slice(0, 7));
  return all.at(-1) === to.slice(0, 7) ? all : present.slice(-MOST_MONTHS);
}

const noon = (month: string) => new Date(`${month}-15T12:00:00Z`);

/** `Nov`; the year stands with the first month and with each January. */
export function monthLabel(locale: Locale, month: string, withYear: boolean): string {
  const name = new Intl.DateTimeFormat(locale, { month: 'short', timeZone: 'UTC' })
    .format(noon(month))
    .replace('.', '');
  return withYear ? `${name}\u00a0${month.slice(2, 4)}` : name;
}

/** `November 2026`. */
export function monthName(locale: Locale, month: string): string {
  return new Intl.DateTimeFormat(locale, {
    month: 'long',
    year: 'numeric',
    timeZone: 'UTC',
  }).format(noon(month));
}

/** The last day of a month, `YYYY-MM-DD`. */
export function lastDayOf(month: string): string {
  const [year, number] = month.split('-').map(Number) as [number, number];
  return new Date(Date.UTC(year, number, 0)).toISOString().slice(0, 10);
}
