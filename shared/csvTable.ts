import { date, requiredText, text } from './text';

/**
 * The lines of a spreadsheet as cells by column, and what is wrong with them.
 * The text itself is cut into cells by the server.
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

export const MOST_CSV_ROWS = 1000;

/** A heading and a value count whatever their case, spaces and dashes. */
const plain = (value: string) => value.toLowerCase().replace(/[\s_-]+/g, '');

/**
 * An export writes `'` before a cell that a spreadsheet would take for a formula, wide signs
 * included; it is no part of the value.
 */
const withoutGuard = (cell: string) =>
  /^'[=+\-@\t\r\uFF1D\uFF0B\uFF0D\uFF20]/.test(cell) ? cell.slice(1) : cell;

export interface Columns<C extends string> {
  all: readonly C[];
  needed: readonly C[];
  /** Headings that may stand there and are not read. */
  passedOver: readonly string[];
}

export interface Cells<C extends string> {
  line: number;
  cell: (column: C) => string;
}

/** The heading line as positions; every fault of it is named. */
function readHeading<C extends string>(
  heading: CsvLine,
  { all, needed, passedOver }: Columns<C>,
): { positions: Map<C, number>; faults: CsvFault[] } {
  const positions = new Map<C, number>();
  const faults: CsvFault[] = [];
  const { line } = heading;
  const ignored = new Set(passedOver.map(plain));
  heading.cells.forEach((cell, position) => {
    const column = all.find((each) => plain(each) === plain(cell));
    if (column === undefined) {
      if (cell.trim() === '' || ignored.has(plain(cell))) return;
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
export function readTable<C extends string>(
  lines: readonly CsvLine[],
  columns: Columns<C>,
): { table: Cells<C>[]; faults: CsvFault[] } {
  const [heading = { line: 1, cells: [] }, ...body] = lines;
  const { positions, faults } = readHeading(heading, columns);
  // Without its columns no cell means anything: naming a thousand lines would hide the one that is wrong.
  if (faults.length > 0) return { table: [], faults };
  const filled = body.filter(({ cells }) => cells.some((cell) => cell.trim() !== ''));
  if (filled.length === 0) {
    const { line } = heading;
    return { table: [], faults: [{ line, column: null, code: 'no-rows', value: '' }] };
  }
  const firstTooMany = filled[MOST_CSV_ROWS];
  if (firstTooMany !== undefined) {
    const { line } = firstTooMany;
    const value = String(filled.length);
    return { table: [], faults: [{ line, column: null, code: 'too-many-rows', value }] };
  }
  const width = heading.cells.length;
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
export function reader<C extends string>({ line, cell }: Cells<C>, faults: CsvFault[]) {
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

/** Marks the second and every later line that says the same as one before. */
export function markRepeats<C extends string>(
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

/** Faults in the order of the file. */
export const byLine = (one: CsvFault, other: CsvFault) => one.line - other.line;
