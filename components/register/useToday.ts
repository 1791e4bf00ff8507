import { calendarDate } from '@/shared/format';
import { deviceZone, useNow } from '../home/clock';

/** Today, `YYYY-MM-DD`: at a site by its own clock, in a list by that of the device. */
export function useToday(): (timeZone?: string) => string {
  const now = useNow();
  return (timeZone) => calendarDate(now, timeZone ?? deviceZone());
}
