import { toWallClock } from '@/shared/siteTime';
import type { BoardRow } from './boardRows';

/** The ruler of a working day, unless something lies outside it. */
const FROM_HOUR = 6;
const TO_HOUR = 18;
const HOUR = 60;
const DAY = 24 * HOUR;

export interface Ruler {
  /** Minutes of the site's day at both ends. */
  from: number;
  to: number;
  now: number;
}

const dayNumber = ({ year, month, day }: { year: number; month: number; day: number }) =>
  Date.UTC(year, month - 1, day) / 86_400_000;

/** Minutes of the wall clock since the site's midnight of today; negative for yesterday. */
export function minuteOf(at: string, today: string, timeZone: string): number {
  const wall = toWallClock(at, timeZone);
  const days = dayNumber(wall) - dayNumber(toWallClock(today, timeZone));
  return days * DAY + wall.hour * HOUR + wall.minute;
}

const clamp = (minute: number, from: number, to: number) => Math.min(to, Math.max(from, minute));

/** 06:00 to 18:00, longer where the present or a planned hour lies outside; never past midnight. */
export function rulerOf(rows: readonly BoardRow[], now: string, timeZone: string): Ruler {
  const minutes = rows.flatMap(({ row }) =>
    [row.startsAt, row.endsAt].flatMap((at) => (at === null ? [] : [minuteOf(at, now, timeZone)])),
  );
  const present = minuteOf(now, now, timeZone);
  const inDay = [present, ...minutes.map((minute) => clamp(minute, 0, DAY))];
  // What began yesterday is drawn from the left edge; it does not stretch the ruler to midnight.
  const starts = inDay.filter((minute) => minute > 0);
  const ends = inDay.filter((minute) => minute < DAY);
  return {
    from: Math.floor(Math.min(FROM_HOUR * HOUR, ...starts) / HOUR) * HOUR,
    to: Math.ceil(Math.max(TO_HOUR * HOUR, ...ends) / HOUR) * HOUR,
    now: present,
  };
}

/** px from the left edge of a track so wide. */
export function xOf(minute: number, { from, to }: Ruler, width: number): number {
  return (clamp(minute, from, to) - from) * (width / (to - from));
}

export interface Tick {
  minute: number;
  height: number;
}

/** A tick every quarter hour, every half or whole hour where a quarter would be under 4 px. */
export function ticksOf(ruler: Ruler, width: number): Tick[] {
  const pxPerHour = width / ((ruler.to - ruler.from) / HOUR);
  const step = pxPerHour >= 16 ? 15 : pxPerHour >= 8 ? 30 : HOUR;
  const ticks: Tick[] = [];
  for (let minute = ruler.from; minute <= ruler.to; minute += step) {
    ticks.push({ minute, height: minute % HOUR === 0 ? 14 : minute % 30 === 0 ? 8 : 5 });
  }
  return ticks;
}

/** The hours that are written, as far apart as their figures need. */
export function hoursOf(ruler: Ruler, width: number): number[] {
  const pxPerHour = width / ((ruler.to - ruler.from) / HOUR);
  const step = [1, 2, 3, 4, 6, 12].find((hours) => hours * pxPerHour >= 66) ?? 12;
  const hours: number[] = [];
  for (let minute = ruler.from; minute <= ruler.to; minute += HOUR) {
    if ((minute / HOUR) % step === 0) hours.push(minute);
  }
  return hours;
}

/** `08:00`. */
export function clockText(minute: number): string {
  return `${String(minute / HOUR).padStart(2, '0')}:00`;
}
