import { fromWallClock, isoInZone, toWallClock } from '@/shared/siteTime';
import type { Cast } from './cast';
import type { DemoSetting } from './contents';

export const MINUTE = 60_000;
export const HOUR = 60 * MINUTE;

/** The hours of one demo day: when it is planned for, and when each step was taken. */
export interface Hours {
  start: Date;
  end: Date;
  created: Date;
  prepared: Date;
  acknowledged: Date;
  countersigned: Date;
  proved: Date;
  closed: Date;
}

/** The hours of a job that starts then. */
export function hoursFrom(start: Date): Hours {
  const at = (minutes: number) => new Date(start.getTime() + minutes * MINUTE);
  return {
    start,
    end: at(7 * 60),
    created: at(-25),
    prepared: at(2),
    acknowledged: at(5),
    countersigned: at(14),
    proved: at(24),
    closed: at(210),
  };
}

/** Today's work began half an hour ago; earlier days began at eight, site time. */
export function hoursOf(daysAgo: number, timeZone: string, now: Date): Hours {
  if (daysAgo === 0) return hoursFrom(new Date(now.getTime() - 30 * MINUTE));
  const day = toWallClock(new Date(now.getTime() - daysAgo * 24 * HOUR), timeZone);
  return hoursFrom(new Date(fromWallClock({ ...day, hour: 8, minute: 0 }, timeZone)));
}

/** Who and where, with hours, for the content of a demo worksheet. */
export function settingOf(cast: Cast, hours: Hours): DemoSetting {
  const { site, lead, helpers, glovesId } = cast;
  const zoned = (instant: Date) => isoInZone(instant, site.timeZone);
  return {
    siteId: site.id,
    lead,
    helpers,
    glovesId,
    emergency: site.emergency,
    desk: site.deskToTell,
    startsAt: zoned(hours.start),
    endsAt: zoned(hours.end),
    on: zoned(hours.prepared),
  };
}
