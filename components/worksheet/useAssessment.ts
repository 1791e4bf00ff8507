import { useEffect, useMemo, useState } from 'react';
import { assess, type Assessment } from '@/hazard';
import { isoInZone } from '@/shared/siteTime';
import type { WorksheetContent } from '@/shared/worksheet';

const TICK_MS = 30_000;

/** The present moment, renewed twice a minute: a window that ends while one types is seen to end. */
export function useNow(): Date {
  const [now, setNow] = useState(() => new Date());
  useEffect(() => {
    const timer = setInterval(() => setNow(new Date()), TICK_MS);
    return () => clearInterval(timer);
  }, []);
  return now;
}

/**
 * What the rules say of a content now, on this device. The server runs the
 * same code and its answer is the one that counts.
 */
export function useAssessment(content: WorksheetContent, timeZone: string): Assessment {
  const now = useNow();
  return useMemo(() => assess(content, { on: isoInZone(now, timeZone) }), [content, now, timeZone]);
}
