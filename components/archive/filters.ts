import { MODES, SYSTEMS, type Mode, type SystemCode } from '@/hazard/enumerations';
import { STATES, type WorksheetState } from '@/shared/record';

export const VOLTS = ['120', '208', '240', '277', '480'] as const;
export const SORTS = [
  '-createdAt',
  'createdAt',
  '-startsAt',
  'startsAt',
  '-updatedAt',
  'number',
  '-number',
] as const;
export type Sort = (typeof SORTS)[number];
export const DEFAULT_SORT: Sort = '-createdAt';

/** What the address says: filters, order, and the record that is open. */
export interface ArchiveFilters {
  q: string;
  state: WorksheetState[];
  siteId: string[];
  system: SystemCode[];
  circuitVolts: string[];
  mode: Mode[];
  finding: string[];
  person: string | undefined;
  from: string | undefined;
  to: string | undefined;
  sort: Sort;
}

/** Filters of which several may be on at once. */
export type ManyKey = 'state' | 'siteId' | 'system' | 'circuitVolts' | 'mode' | 'finding';
export type OneKey = 'person' | 'from' | 'to';
export const MANY_KEYS: readonly ManyKey[] = [
  'state',
  'siteId',
  'system',
  'circuitVolts',
  'mode',
  'finding',
];

export type Params = Readonly<Record<string, string | string[] | undefined>>;

const DATE = /^\d{4}-\d{2}-\d{2}$/;

function several(params: Params, key: string): string[] {
  const value = params[key];
  const all = value === undefined ? [] : typeof value === 'string' ? value.split(',') : value;
  return [...new Set(all.filter((part) => part !== ''))];
}

function single(params: Params, key: string): string | undefined {
  const value = params[key];
  const text = typeof value === 'string' ? value : value?.[0];
  return text === undefined || text === '' ? undefined : text;
}

const among = <T extends string>(values: readonly string[], admitted: readonly T[]): T[] =>
  admitted.filter((each) => values.includes(each));

function day(params: Params, key: string): string | undefined {
  const value = single(params, key);
  return value !== undefined && DATE.test(value) ? value : undefined;
}

/** An address typed by hand may hold anything: what is no filter is left out. */
export function readFilters(params: Params): ArchiveFilters {
  return {
    q: single(params, 'q') ?? '',
    state: among(several(params, 'state'), STATES),
    siteId: several(params, 'siteId'),
    system: among(several(params, 'system'), SYSTEMS),
    circuitVolts: several(params, 'circuitVolts').filter((volts) => /^\d{1,4}$/.test(volts)),
    mode: among(several(params, 'mode'), MODES),
    finding: several(params, 'finding'),
    person: single(params, 'person'),
    from: day(params, 'from'),
    to: day(params, 'to'),
    sort: SORTS.find((sort) => sort === single(params, 'sort')) ?? DEFAULT_SORT,
  };
}

/** The query string of the list; of an export, which has no order, without `sort`. */
export function queryOf(filters: ArchiveFilters, { forExport = false } = {}): string {
  const query = new URLSearchParams();
  if (filters.q.trim() !== '') query.set('q', filters.q.trim());
  for (const key of MANY_KEYS) if (filters[key].length > 0) query.set(key, filters[key].join(','));
  for (const key of ['person', 'from', 'to'] as const) {
    const value = filters[key];
    if (value !== undefined) query.set(key, value);
  }
  if (!forExport && filters.sort !== DEFAULT_SORT) query.set('sort', filters.sort);
  return query.toString();
}

/** How many filters beside the search words are on. */
export function filterCount(filters: ArchiveFilters): number {
  const many = MANY_KEYS.reduce((sum, key) => sum + filters[key].length, 0);
  return many + [filters.person, filters.from, filters.to].filter(Boolean).length;
}

export type Span = 'month' | 'quarter' | 'year';

/** The first day of a span that ends today: of this month, three months, twelve months. */
export function spanStart(span: Span, today: string): string {
  const [year, month] = today.split('-').map(Number) as [number, number];
  const back = { month: 0, quarter: 2, year: 11 }[span];
  const first = new Date(Date.UTC(year, month - 1 - back, 1));
  return first.toISOString().slice(0, 10);
}
