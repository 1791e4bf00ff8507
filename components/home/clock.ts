import { useEffect, useState } from 'react';
import type { Locale } from '@/shared/user';

const MINUTE_MS = 60_000;

/** The present minute, as an instant. */
export function useNow(): string {
  const [now, setNow] = useState(() => new Date().toISOString());
  useEffect(() => {
    const timer = setInterval(() => setNow(new Date().toISOString()), MINUTE_MS);
    return () => clearInterval(timer);
  }, []);
  return now;
}

/** The zone that this device is set to. */
export function deviceZone(): string {
  return new Intl.DateTimeFormat().resolvedOptions().timeZone;
}

/** `Wednesday 14 October`, in the order of each language. */
export function todayTitle(
  now: string,
  timeZone: string,
  locale: Locale,
  order: (weekday: string, day: string, month: string) => string,
): string {
  const part = (options: Intl.DateTimeFormatOptions) =>
    new Intl.DateTimeFormat(locale, { timeZone, ...options }).format(new Date(now));
  const weekday = part({ weekday: 'long' });
  return order(
    weekday.charAt(0).toLocaleUpperCase(locale) + weekday.slice(1),
    part({ day: 'numeric' }),
    part({ month: 'long' }),
  );
}
