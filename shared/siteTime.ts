import { TZDate } from '@date-fns/tz';

/**
 * An instant as the clock on a site's wall shows it, with its offset:
 * `2026-12-01T09:00:00-06:00`. This is the form in which `assess` takes `on`
 * and in which a planned start and end are stored.
 */
export function isoInZone(instant: Date, timeZone: string): string {
  return new TZDate(instant, timeZone).toISOString().replace(/\.\d{3}/, '');
}

/**
 * The instant of a wall-clock time at a site. Of an hour that the clocks skip
 * it is the time after the change; of one that comes twice, the first.
 */
export function fromWallClock(
  wall: { year: number; month: number; day: number; hour: number; minute: number },
  timeZone: string,
): string {
  const { year, month, day, hour, minute } = wall;
  return isoInZone(new TZDate(year, month - 1, day, hour, minute, timeZone), timeZone);
}

/** The wall-clock parts of an instant at a site; `month` counts from 1. */
export function toWallClock(
  at: string | Date,
  timeZone: string,
): { year: number; month: number; day: number; hour: number; minute: number } {
  const zoned = new TZDate(new Date(at), timeZone);
  return {
    year: zoned.getFullYear(),
    month: zoned.getMonth() + 1,
    day: zoned.getDate(),
    hour: zoned.getHours(),
    minute: zoned.getMinutes(),
  };
}
