import { router, useLocalSearchParams, type Href } from 'expo-router';
import { calendarDate } from '@/shared/format';
import { spanStart } from '../archive/filters';
import { deviceZone } from '../home/clock';

export const SPANS = ['year', 'quarter', 'month', 'all'] as const;
export type InsightsSpan = (typeof SPANS)[number];

const DATE = /^\d{4}-\d{2}-\d{2}$/;
const UUID = /^[0-9a-f-]{36}$/i;

type Changes = Partial<Record<'span' | 'from' | 'to' | 'siteId', string | undefined>>;

export interface InsightsAddress {
  /** Undefined where own dates are chosen. */
  span: InsightsSpan | undefined;
  from: string | undefined;
  to: string | undefined;
  siteId: string | undefined;
  today: string;
  query: string;
  set: (changes: Changes) => void;
  /** The archive with the same span and site, and what is asked for. */
  archive: (more: Readonly<Record<string, string>>) => Href;
}

/** Span and site stand in the address; twelve months unless it says otherwise. */
export function useInsightsAddress(): InsightsAddress {
  const params = useLocalSearchParams();
  const text = (key: string, pattern: RegExp) => {
    const value = params[key];
    return typeof value === 'string' && pattern.test(value) ? value : undefined;
  };
  const today = calendarDate(new Date().toISOString(), deviceZone());
  const ownFrom = text('from', DATE);
  const to = text('to', DATE);
  const siteId = text('siteId', UUID);
  const own = ownFrom !== undefined || to !== undefined;
  const span = own ? undefined : (SPANS.find((each) => each === params['span']) ?? 'year');
  const from = span === undefined ? ownFrom : span === 'all' ? undefined : spanStart(span, today);
  const scope = {
    ...(from !== undefined && { from }),
    ...(to !== undefined && { to }),
    ...(siteId !== undefined && { siteId }),
  };
  return {
    span,
    from,
    to,
    siteId,
    today,
    query: new URLSearchParams(scope).toString(),
    set: (changes) => router.setParams(changes),
    archive: (more) => ({ pathname: '/archive', params: { ...scope, ...more } }),
  };
}
