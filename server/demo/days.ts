/** A day, counted from today. */
export interface DemoDay {
  months: number;
  days?: number;
}

const DAY = 86_400_000;

/** The day that lies some months and days from another; at noon, so that every zone agrees on it. */
export function dayFrom(now: Date, { months, days = 0 }: DemoDay): Date {
  const day = new Date(now);
  day.setUTCHours(12, 0, 0, 0);
  day.setUTCDate(1);
  day.setUTCMonth(day.getUTCMonth() + months);
  day.setUTCDate(Math.min(now.getUTCDate(), 28));
  return new Date(day.getTime() + days * DAY);
}

/** The date of such a day. */
export const dateOf = (day: Date) => day.toISOString().slice(0, 10);

/** When the company began to write: before the oldest worksheet of the demo. */
export const FOUNDED: DemoDay = { months: -26 };
