import { z } from 'zod';
import { GLOVE_CLASSES, type GloveClass } from '@/hazard/enumerations';
import {
  byLine,
  markRepeats,
  reader,
  readTable,
  type CsvLine,
  type CsvReading,
  type CsvRow,
} from './csvTable';
import { RUBBER_GOODS_KINDS, type RubberGoodsKind } from './register';
import { LOCALES, ROLES, UNITS, type Locale, type Role, type Units } from './user';

/**
 * People and rubber goods as rows of a spreadsheet: what the cells mean, and
 * every line that is not right.
 */

export type { CsvFault, CsvLine, CsvReading } from './csvTable';

export const PEOPLE_COLUMNS = [
  'name',
  'email',
  'role',
  'sites',
  'qualifiedThrough',
  'language',
  'units',
] as const;
export const RUBBER_GOODS_COLUMNS = [
  'site',
  'kind',
  'class',
  'serial',
  'size',
  'issuedOn',
  'testedOn',
  'result',
  'laboratory',
] as const;
type PeopleColumn = (typeof PEOPLE_COLUMNS)[number];
type RubberGoodsColumn = (typeof RUBBER_GOODS_COLUMNS)[number];

/** Columns that an export adds; an import passes them over, so that an exported file can be read again. */
export const EXPORT_ONLY_COLUMNS = ['account', 'dueOn', 'inTest', 'retired', 'retiredBecause'];

export interface CsvSite {
  id: string;
  /** Today there, `YYYY-MM-DD`. */
  today: string;
}

/** What the register holds already: sites by their name in lower case, and what must not come twice. */
export interface CsvRegister {
  sites: ReadonlyMap<string, CsvSite>;
  /** E-mail addresses in lower case, or serial numbers as `serialKey` makes them. */
  taken: ReadonlySet<string>;
}

export interface CsvPerson {
  name: string;
  email: string;
  role: Role;
  siteIds: string[];
  qualifiedThrough: string | null;
  locale: Locale;
  units: Units;
}

const LANGUAGE_NAMES: ReadonlyMap<string, Locale> = new Map([
  ['en', 'en-US'],
  ['es', 'es-MX'],
]);

function localeOf(value: string): Locale | undefined {
  const name = value.toLowerCase();
  return LOCALES.find((locale) => locale.toLowerCase() === name) ?? LANGUAGE_NAMES.get(name);
}

/** Names of several sites stand in one cell, between `;` or `|`. */
const siteNames = (cell: string) =>
  cell
    .split(/[;|]/)
    .map((name) => name.trim())
    .filter((name) => name !== '');

/** People from the lines of a file: every line that is right, and every fault of the others. */
export function readPeople(
  lines: readonly CsvLine[],
  { sites, taken }: CsvRegister,
): CsvReading<CsvPerson> {
  const { table, faults } = readTable<PeopleColumn>(lines, {
    all: PEOPLE_COLUMNS,
    needed: ['name', 'email', 'role', 'sites'],
    passedOver: EXPORT_ONLY_COLUMNS,
  });
  const rows = table.flatMap((cells): CsvRow<CsvPerson>[] => {
    const before = faults.length;
    const read = reader(cells, faults);
    const name = read.text('name', true);
    const written = read.text('email', true);
    const email = z.email().max(320).safeParse(written).success ? written : undefined;
    if (written !== undefined && email === undefined) read.fault('email', 'email');
    const role = read.need('role', read.oneOf('role', ROLES, 'role'));
    const named = siteNames(cells.cell('sites'));
    const known = named.map((each) => sites.get(each.toLowerCase()));
    const siteIds = known.flatMap((site) => site?.id ?? []);
    // Safety sees every site; everyone else sees nothing without one.
    if (named.length === 0 && role !== 'safety') read.fault('sites', 'required');
    if (known.includes(undefined)) read.fault('sites', 'no-such-site');
    const qualifiedThrough = read.date('qualifiedThrough') ?? null;
    const language = cells.cell('language');
    const locale = language === '' ? 'en-US' : localeOf(language);
    if (locale === undefined) read.fault('language', 'language');
    const units = read.oneOf('units', UNITS, 'units') ?? 'feet';
    if (faults.length > before || !name || !email || !role || !locale) return [];
    const value = { name, email, role, siteIds, qualifiedThrough, locale, units };
    return [{ line: cells.line, value }];
  });
  const keys = table.map(({ line, cell }) => {
    const value = cell('email');
    return { line, column: 'email' as const, key: value.toLowerCase(), value };
  });
  const repeats = markRepeats(
    keys.filter(({ key }) => key !== ''),
    taken,
  );
  return { rows, faults: [...faults, ...repeats].sort(byLine) };
}

export interface CsvRubberGoods {
  siteId: string;
  kind: RubberGoodsKind;
  gloveClass: GloveClass;
  serial: string;
  size: string;
  issuedOn: string | null;
  tests: { testedOn: string; passed: boolean; laboratory?: string }[];
}

/** By what two items are the same one: the site and the serial number, whatever its case. */
export const serialKey = (siteId: string, serial: string) =>
  `${siteId} ${serial.trim().toLowerCase()}`;

/** How an export writes a class: a spreadsheet cuts a bare `00` to `0`, which is another class. */
export const classCell = (gloveClass: GloveClass) => `class ${gloveClass}`;

/** A bare `0` may have been `00`, and that one protects to 500 V only: it is never guessed. */
function classOf(cell: string): GloveClass | 'zero' | undefined {
  const named = /^class\s*(.+)$/i.exec(cell)?.[1];
  if (named === undefined && cell === '0') return 'zero';
  return GLOVE_CLASSES.find((gloveClass) => gloveClass === (named ?? cell));
}

/** Rubber goods from the lines of a file. An item without a test that it passed is not taken in. */
export function readRubberGoods(
  lines: readonly CsvLine[],
  { sites, taken }: CsvRegister,
): CsvReading<CsvRubberGoods> {
  const { table, faults } = readTable<RubberGoodsColumn>(lines, {
    all: RUBBER_GOODS_COLUMNS,
    needed: ['site', 'kind', 'class', 'serial', 'testedOn', 'result'],
    passedOver: EXPORT_ONLY_COLUMNS,
  });
  const rows = table.flatMap((cells): CsvRow<CsvRubberGoods>[] => {
    const before = faults.length;
    const read = reader(cells, faults);
    const named = read.text('site', true);
    const site = named === undefined ? undefined : sites.get(named.toLowerCase());
    if (named !== undefined && site === undefined) read.fault('site', 'no-such-site');
    const kind = read.need('kind', read.oneOf('kind', RUBBER_GOODS_KINDS, 'kind'));
    const written = read.text('class', true);
    const gloveClass = written === undefined ? undefined : classOf(written);
    if (gloveClass === 'zero') read.fault('class', 'class-zero');
    else if (written !== undefined && gloveClass === undefined) read.fault('class', 'class');
    const serial = read.text('serial', true);
    const size = read.text('size') ?? '';
    const issuedOn = read.date('issuedOn') ?? null;
    const testedOn = read.need('testedOn', read.date('testedOn'));
    if (testedOn && site && testedOn > site.today) read.fault('testedOn', 'after-today');
    read.need('result', read.oneOf('result', ['passed'], 'result'));
    const laboratory = read.text('laboratory') ?? '';
    const whole = site && kind && gloveClass && gloveClass !== 'zero' && serial && testedOn;
    if (faults.length > before || !whole) return [];
    const test = { testedOn, passed: true, ...(laboratory === '' ? {} : { laboratory }) };
    const value = { siteId: site.id, kind, gloveClass, serial, size, issuedOn, tests: [test] };
    return [{ line: cells.line, value }];
  });
  const keys = table.flatMap(({ line, cell }) => {
    const site = sites.get(cell('site').toLowerCase());
    const value = cell('serial');
    if (site === undefined || value === '') return [];
    return [{ line, column: 'serial' as const, key: serialKey(site.id, value), value }];
  });
  return { rows, faults: [...faults, ...markRepeats(keys, taken)].sort(byLine) };
}

export const importSchema = z.strictObject({
  csv: z.string().max(500_000),
  confirm: z.boolean().optional(),
});

/** What an import would do, or the lines that keep it from doing anything. */
export const importAnswerSchema = z.object({
  /** How many lines were read under the heading and are right. */
  count: z.number(),
  /** The cells of each line that is right, by column, as it will be taken in. */
  rows: z.array(z.object({ line: z.number(), cells: z.record(z.string(), z.string()) })),
  errors: z.array(
    z.object({
      line: z.number(),
      column: z.string().nullable(),
      code: z.string(),
      value: z.string(),
    }),
  ),
  created: z.number(),
});
export type ImportAnswer = z.infer<typeof importAnswerSchema>;
