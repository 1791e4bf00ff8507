import { contentFacts } from '@/shared/contentFacts';

type Options = Parameters<typeof contentFacts>[1];

export const FACT_OPTIONS = {
  locale: 'en-US',
  units: 'feet',
  timeZone: 'America/Chicago',
} as const satisfies Options;

/**
 * Label and value of every answered field, groups run together. A no-break
 * space is shown as `_` so that a test says where it stands.
 */
export function said(content: unknown, more: Partial<Options> = {}): [string, string][] {
  return contentFacts(content, { ...FACT_OPTIONS, ...more }).flatMap(({ facts }) =>
    facts.map(({ label, value }): [string, string] => [label, value.replaceAll('\u00a0', '_')]),
  );
}

export const saidValues = (content: unknown, more: Partial<Options> = {}) =>
  said(content, more).map(([, value]) => value);
