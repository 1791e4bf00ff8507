import { z } from 'zod';
import { GLOVE_CLASSES, type GloveClass } from '@/hazard/enumerations';
import { RUBBER_GOODS_KINDS, type RubberGoodsKind } from './register';
import { date, requiredText, text } from './text';
import { LOCALES, ROLES, UNITS, type Locale, type Role, type Units } from './user';

/**
 * People and rubber goods as rows of a spreadsheet. The text itself is cut
 * into cells by the server; what the cells mean, and every line that is not
 * right, is decided here.
 */

/** One record of the file: the line on which it begins, from 1, and its cells. */
export interface CsvLine {
  line: number;
  cells: readonly string[];
}

export interface CsvFault {
  line: number;
  /** The heading of the column, or null where the line as a whole is meant. */
  column: string | null;
  code: CsvFaultCode;
  /** What stands there. */
  value: string;
}

export const CSV_FAULTS = [
  'unreadable',
  'no-rows',
  'too-many-rows',
  'unknown-column',
  'column-twice',
  'missing-column',
  'too-many-cells',
  'required',
  'too-long',
  'unstorable',
  'email',
  'role',
  'date',
  'after-today',
  'no-such-site',
  'language',
  'units',
  'kind',
  'class',
  'class-zero',
  'result',
  'twice',
  'taken',
] as const;
export type CsvFaultCode = (typeof CSV_FAULTS)[number];

export interface CsvRow<T> {
  line: number;
  value: T;
}

export interface CsvReading<T> {
  rows: CsvRow<T>[];
  faults: CsvFault[];
}

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

export const MOST_CSV_ROWS = 1000;

/** A heading and a value count whatever their case, spaces and dashes. */
const plain = (value: string) => value.toLowerCase().replace(/[\s_-]+/g, '');

/** An export writes `'` before a cell that a spreadsheet would take for a formula; it is no part of the value. */
const withoutGuard = (cell: string) => (/^'[=+\-@\t\r]/.test(cell) ? cell.slice(1) : cell);

interface Columns<C extends string> {
  all: readonly C[];
  needed: readonly C[];
}

interface Cells<C extends string> {
  line: number;
  cell: (column: C) => string;
}

/** The heading line as positions; every fault of it is named. */
function readHeading<C extends string>(
  heading: CsvLine | undefined,
  { all, needed }: Columns<C>,
): { positions: Map<C, number>; faults: CsvFault[] } {
  const positions = new Map<C, number>();
  const faults: CsvFault[] = [];
  const line = heading?.line ?? 1;
  const passedOver = new Set(EXPORT_ONLY_COLUMNS.map(plain));
  heading?.cells.forEach((cell, position) => {
    const column = all.find((each) => plain(each) === plain(cell));
    if (column === undefined) {
      if (cell.trim() === '' || passedOver.has(plain(cell))) return;
      faults.push({ line, column: null, code: 'unknown-column', value: cell });
    } else if (positions.has(column)) {
      faults.push({ line, column, code: 'column-twice', value: cell });
    } else positions.set(column, position);
  });
  for (const column of needed) {
    if (!positions.has(column)) faults.push({ line, column, code: 'missing-column', value: '' });
  }
  return { positions, faults };
}

/** The lines under the heading, each with its cells by column. */
function readTable<C extends string>(
  lines: readonly CsvLine[],
  columns: Columns<C>,
): { table: Cells<C>[]; faults: CsvFault[] } {
  const [heading, ...body] = lines;
  const { positions, faults } = readHeading(heading, columns);
  // Without its columns no cell means anything: naming a thousand lines would hide the one that is wrong.
  if (faults.length > 0) return { table: [], faults };
  const filled = body.filter(({ cells }) => cells.some((cell) => cell.trim() !== ''));
  if (filled.length === 0) {
    const line = heading?.line ?? 1;
    return { table: [], faults: [{ line, column: null, code: 'no-rows', value: '' }] };
  }
  if (filled.length > MOST_CSV_ROWS) {
    const line = filled[MOST_CSV_ROWS]?.line ?? 1;
    const value = String(filled.length);
    return { table: [], faults: [{ line, column: null, code: 'too-many-rows', value }] };
  }
  const width = heading?.cells.length ?? 0;
  const table = filled.map(({ line, cells }) => {
    const extra = cells.slice(width).find((cell) => cell.trim() !== '');
    if (extra !== undefined) {
      faults.push({ line, column: null, code: 'too-many-cells', value: extra });
    }
    const cell = (column: C) => withoutGuard((cells[positions.get(column) ?? -1] ?? '').trim());
    return { line, cell };
  });
  return { table, faults };
}

/** Reads the cells of one line and gathers what is wrong with them. */
function reader<C extends string>({ line, cell }: Cells<C>, faults: CsvFault[]) {
  const fault = (column: C, code: CsvFaultCode) => {
    faults.push({ line, column, code, value: cell(column) });
    return undefined;
  };
  return {
    fault,
    /** Text of the register; undefined after a fault. */
    text(column: C, needed = false): string | undefined {
      const value = cell(column);
      if (needed && value === '') return fault(column, 'required');
      const parsed = (needed ? requiredText() : text()).safeParse(value);
      if (parsed.success) return parsed.data;
      const tooLong = parsed.error.issues.some((issue) => issue.code === 'too_big');
      return fault(column, tooLong ? 'too-long' : 'unstorable');
    },
    /** One of a closed list; undefined after a fault or where nothing stands. */
    oneOf<T extends string>(column: C, values: readonly T[], code: CsvFaultCode): T | undefined {
      const value = cell(column);
      if (value === '') return undefined;
      return values.find((each) => plain(each) === plain(value)) ?? fault(column, code);
    },
    date(column: C): string | undefined {
      const value = cell(column);
      if (value === '') return undefined;
      return date.safeParse(value).success ? value : fault(column, 'date');
    },
    need<T>(column: C, value: T | undefined): T | undefined {
      return value === undefined && cell(column) === '' ? fault(column, 'required') : value;
    },
  };
}

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

const LANGUAGE_NAMES: Readonly<Record<string, Locale>> = { en: 'en-US', es: 'es-MX' };

function localeOf(value: string): Locale | undefined {
  const name = value.toLowerCase();
  return LOCALES.find((locale) => locale.toLowerCase() === name) ?? LANGUAGE_NAMES[name];
}

/** Names of several sites stand in one cell, between `;` or `|`. */
const siteNames = (cell: string) =>
  cell
    .split(/[;|]/)
    .map((name) => name.trim())
    .filter((name) => name !== '');

/** Marks the second and every later line that says the same as one before. */
function markRepeats<C extends string>(
  keys: readonly { line: number; column: C; key: string; value: string }[],
  taken: ReadonlySet<string>,
): CsvFault[] {
  const seen = new Set<string>();
  return keys.flatMap(({ line, column, key, value }): CsvFault[] => {
    if (taken.has(key)) return [{ line, column, code: 'taken', value }];
    if (seen.has(key)) return [{ line, column, code: 'twice', value }];
    seen.add(key);
    return [];
  });
}

const byLine = (one: CsvFault, other: CsvFault) => one.line - other.line;

/** People from the lines of a file: every line that is right, and every fault of the others. */
export function readPeople(
  lines: readonly CsvLine[],
  { sites, taken }: CsvRegister,
): CsvReading<CsvPerson> {
  const { table, faults } = readTable<PeopleColumn>(lines, {
    all: PEOPLE_COLUMNS,
    needed: ['name', 'email', 'role', 'sites'],
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
    if (faults.length > before) return [];
    if (!name || !email || !role || !locale) return [];
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
export const serialKey = (siteId: string, serial: string) => `${siteId} ${serial.toLowerCase()}`;

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
    if (faults.length > before) return [];
    if (!site || !kind || !gloveClass || gloveClass === 'zero' || !serial || !testedOn) return [];
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
