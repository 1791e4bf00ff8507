import { describe, expect, it } from 'vitest';
import {
  byLine,
  markRepeats,
  reader,
  readTable,
  type CsvFault,
  type CsvLine,
} from '@/shared/csvTable';

const columns = {
  all: ['name', 'dueOn', 'size'],
  needed: ['name'],
  passedOver: ['inTest'],
} as const;
type Column = (typeof columns.all)[number];

/** The lines of a file, from line 1, without empty ones. */
const file = (...rows: string[][]): CsvLine[] => rows.map((cells, n) => ({ line: n + 1, cells }));
const faultsOf = (...rows: string[][]) => readTable<Column>(file(...rows), columns).faults;
const namesOf = (lines: CsvLine[]) =>
  readTable<Column>(lines, columns).table.map(({ line, cell }) => [line, cell('name')]);

describe('the heading of a table', () => {
  it.each(['DUE ON', 'due-on', 'due_on', ' Due  on ', 'dueon'])(
    'is known whatever its case, spaces and dashes: %j',
    (written) => {
      const { table, faults } = readTable<Column>(file(['Name', written], ['A', 'x']), columns);
      expect(faults).toEqual([]);
      expect(table[0]?.cell('dueOn')).toBe('x');
    },
  );

  it('may come in any order, with empty columns and with what an export adds', () => {
    const lines = file(['', 'In test', 'size', '  ', 'name'], ['a', 'yes', '10', 'b', 'Ada']);
    const { table, faults } = readTable<Column>(lines, columns);
    expect(faults).toEqual([]);
    expect(table.map(({ cell }) => [cell('name'), cell('size')])).toEqual([['Ada', '10']]);
  });

  it('is faulted for each column that is unknown, there twice or missing', () => {
    expect(faultsOf(['Size', 'weight', 'SIZE'], ['10', '2', '10'])).toEqual([
      { line: 1, column: null, code: 'unknown-column', value: 'weight' },
      { line: 1, column: 'size', code: 'column-twice', value: 'SIZE' },
      { line: 1, column: 'name', code: 'missing-column', value: '' },
    ]);
  });

  it('stands on the line of the file where it is', () => {
    const { faults } = readTable<Column>([{ line: 4, cells: ['size'] }], columns);
    expect(faults).toEqual([{ line: 4, column: 'name', code: 'missing-column', value: '' }]);
  });

  it('hides every other line while it is wrong', () => {
    const { table } = readTable<Column>(file(['name', 'weight'], ['Ada', '2']), columns);
    expect(table).toEqual([]);
  });

  it('is missed in an empty file', () => {
    expect(faultsOf()).toEqual([{ line: 1, column: 'name', code: 'missing-column', value: '' }]);
  });
});

describe('the lines of a table', () => {
  it('are refused where there is none, or none with anything in it', () => {
    const none = [{ line: 1, column: null, code: 'no-rows', value: '' }];
    expect(faultsOf(['name'])).toEqual(none);
    expect(faultsOf(['name', 'size'], ['', ' '])).toEqual(none);
    const later = readTable<Column>([{ line: 3, cells: ['name'] }], columns);
    expect(later.faults).toEqual([{ line: 3, column: null, code: 'no-rows', value: '' }]);
  });

  it('are a thousand at most, empty ones not counted', () => {
    const thousand = Array.from({ length: 1000 }, (_, n) => [`Person ${n}`]);
    expect(namesOf(file(['name'], [''], ...thousand))).toHaveLength(1000);
    const { table, faults } = readTable<Column>(
      file(['name'], [''], ...thousand, ['One more'], ['And one']),
      columns,
    );
    expect(table).toEqual([]);
    expect(faults).toEqual([{ line: 1003, column: null, code: 'too-many-rows', value: '1002' }]);
  });

  it('keep their place in the file', () => {
    expect(namesOf(file(['name'], ['Ada'], [''], ['Bo']))).toEqual([
      [2, 'Ada'],
      [4, 'Bo'],
    ]);
  });

  it('may be shorter than the heading; longer only by empty cells', () => {
    const { table, faults } = readTable<Column>(
      file(['name', 'size'], ['Ada'], ['Bo', '10', '', ' '], ['Cy', '11', '', 'over']),
      columns,
    );
    expect(table.map(({ cell }) => cell('size'))).toEqual(['', '10', '11']);
    expect(table.map(({ cell }) => cell('dueOn'))).toEqual(['', '', '']);
    expect(faults).toEqual([{ line: 4, column: null, code: 'too-many-cells', value: 'over' }]);
  });

  it.each([
    ["'=SUM(1)", '=SUM(1)'],
    ["'+1", '+1'],
    ["'-1", '-1'],
    ["'@x", '@x'],
    ["'＝x", '＝x'],
    ["'＋x", '＋x'],
    ["'－x", '－x'],
    ["'＠x", '＠x'],
    [" '=x ", '=x'],
    ["'s Hall", "'s Hall"],
    ["x'=y", "x'=y"],
    ["''=x", "''=x"],
    ["'", "'"],
  ])('lose the mark that an export writes before a formula, and no other: %j', (cell, name) => {
    expect(namesOf(file(['name'], [cell]))).toEqual([[2, name]]);
  });
});

/** The reader of one line, with the faults that it found. */
function lineOf(cells: Partial<Record<Column, string>>) {
  const faults: CsvFault[] = [];
  const read = reader<Column>({ line: 7, cell: (column) => cells[column] ?? '' }, faults);
  const codes = () => faults.map(({ line, column, code }) => [line, column, code]);
  return { read, faults, codes };
}

describe('a cell', () => {
  it('is text of 200 characters at most', () => {
    const { read, faults } = lineOf({ name: 'a'.repeat(200), size: 'b'.repeat(201) });
    expect(read.text('name')).toBe('a'.repeat(200));
    expect(read.text('size')).toBeUndefined();
    expect(faults).toEqual([{ line: 7, column: 'size', code: 'too-long', value: 'b'.repeat(201) }]);
  });

  it('may be empty only where nothing is needed', () => {
    const { read, codes } = lineOf({});
    expect(read.text('size')).toBe('');
    expect(read.text('name', true)).toBeUndefined();
    expect(codes()).toEqual([[7, 'name', 'required']]);
  });

  it('holds no character that cannot be stored', () => {
    const { read, codes } = lineOf({ name: 'a\u0000b', size: '\ud83d' });
    expect(read.text('name', true)).toBeUndefined();
    expect(read.text('size')).toBeUndefined();
    expect(codes()).toEqual([
      [7, 'name', 'unstorable'],
      [7, 'size', 'unstorable'],
    ]);
    expect(lineOf({ name: '😀' }).read.text('name', true)).toBe('😀');
  });

  it('is one of a closed list, whatever its case, spaces and dashes', () => {
    const { read, codes } = lineOf({ name: 'LINE-Hose', size: 'hose' });
    const kinds = ['gloves', 'line hose'] as const;
    expect(read.oneOf('name', kinds, 'kind')).toBe('line hose');
    expect(read.oneOf('dueOn', kinds, 'kind')).toBeUndefined();
    expect(codes()).toEqual([]);
    expect(read.oneOf('size', kinds, 'kind')).toBeUndefined();
    expect(codes()).toEqual([[7, 'size', 'kind']]);
  });

  it.each(['1 May 2027', '05/01/2027', '2027-5-1', '2027-02-30', '2027-02-28T08:00:00Z'])(
    'is never guessed to be a date: %j',
    (dueOn) => {
      const { read, faults } = lineOf({ dueOn });
      expect(read.date('dueOn')).toBeUndefined();
      expect(faults).toEqual([{ line: 7, column: 'dueOn', code: 'date', value: dueOn }]);
    },
  );

  it('is a date as the calendar has it, or nothing', () => {
    const { read, codes } = lineOf({ dueOn: '2028-02-29' });
    expect(read.date('dueOn')).toBe('2028-02-29');
    expect(read.date('name')).toBeUndefined();
    expect(codes()).toEqual([]);
  });

  it('is asked for where it is empty, and named once where it is wrong', () => {
    const { read, codes } = lineOf({ dueOn: 'soon' });
    expect(read.need('dueOn', read.date('dueOn'))).toBeUndefined();
    expect(read.need('size', read.date('size'))).toBeUndefined();
    expect(read.need('name', 'Ada')).toBe('Ada');
    expect(codes()).toEqual([
      [7, 'dueOn', 'date'],
      [7, 'size', 'required'],
    ]);
  });
});

describe('lines that say the same', () => {
  const key = (line: number, value: string) => ({
    line,
    column: 'name' as const,
    key: value.toLowerCase(),
    value,
  });

  it('are marked from the second on, as they are written', () => {
    expect(markRepeats([key(2, 'A'), key(3, 'b'), key(4, 'a'), key(5, 'A')], new Set())).toEqual([
      { line: 4, column: 'name', code: 'twice', value: 'a' },
      { line: 5, column: 'name', code: 'twice', value: 'A' },
    ]);
  });

  it('are marked from the first on where the register holds it already', () => {
    expect(markRepeats([key(2, 'A'), key(3, 'a'), key(4, 'b')], new Set(['a']))).toEqual([
      { line: 2, column: 'name', code: 'taken', value: 'A' },
      { line: 3, column: 'name', code: 'taken', value: 'a' },
    ]);
  });
});

describe('faults', () => {
  it('come in the order of the file, those of one line as they were found', () => {
    const at = (line: number, code: CsvFault['code']): CsvFault => ({
      line,
      column: null,
      code,
      value: '',
    });
    const found = [at(12, 'date'), at(3, 'role'), at(12, 'email'), at(2, 'units')];
    expect(found.sort(byLine).map(({ line, code }) => [line, code])).toEqual([
      [2, 'units'],
      [3, 'role'],
      [12, 'date'],
      [12, 'email'],
    ]);
  });
});
