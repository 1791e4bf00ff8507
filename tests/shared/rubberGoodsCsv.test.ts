import { describe, expect, it } from 'vitest';
import { classCell, readRubberGoods, serialKey } from '@/shared/registerCsv';
import { CSV_SITES as sites, csvLines, faultPlaces } from '../support/csvLines';

describe('rubber goods of a spreadsheet', () => {
  const COLUMNS = [
    'site',
    'kind',
    'class',
    'serial',
    'size',
    'issuedOn',
    'testedOn',
    'result',
    'laboratory',
  ];
  const pair = {
    site: 'North Yard',
    kind: 'gloves',
    class: 'class 0',
    serial: 'RG-1',
    testedOn: '2026-05-01',
    result: 'passed',
  };
  const read = (...rows: Record<string, string>[]) =>
    readRubberGoods(csvLines(COLUMNS, rows), { sites, taken: new Set(['north kept-1']) });
  const one = (fields: Record<string, string>) => read({ ...pair, ...fields });
  const valueOf = (fields: Record<string, string>) => one(fields).rows[0]?.value;

  it('are read with what each cell says', () => {
    const all = {
      site: 'SOUTH yard',
      kind: 'Line Hose',
      size: '36"',
      issuedOn: '2026-05-20',
      result: 'PASSED',
      laboratory: 'Tallgrass',
    };
    expect(one(all)).toEqual({
      faults: [],
      rows: [
        {
          line: 2,
          value: {
            siteId: 'south',
            kind: 'line hose',
            gloveClass: '0',
            serial: 'RG-1',
            size: '36"',
            issuedOn: '2026-05-20',
            tests: [{ testedOn: '2026-05-01', passed: true, laboratory: 'Tallgrass' }],
          },
        },
      ],
    });
  });

  it('have no size, issue or laboratory where nothing is said', () => {
    const nothing = {
      size: '',
      issuedOn: null,
      tests: [{ testedOn: '2026-05-01', passed: true }],
    };
    expect(valueOf({})).toMatchObject(nothing);
    expect(valueOf({})?.tests[0]).not.toHaveProperty('laboratory');
    const lines = csvLines(Object.keys(pair), [pair]);
    expect(readRubberGoods(lines, { sites, taken: new Set() }).rows[0]?.value).toMatchObject(
      nothing,
    );
  });

  it.each([
    ['00', '00'],
    ['class 00', '00'],
    ['Class 0', '0'],
    ['CLASS0', '0'],
    ['1', '1'],
    ['class  4', '4'],
  ])('are of the class that %j says: %s', (written, gloveClass) => {
    expect(valueOf({ class: written })?.gloveClass).toBe(gloveClass);
  });

  it('are never of class 0 by a bare 0, which may have been 00 once', () => {
    const { rows, faults } = one({ class: '0' });
    expect(rows).toEqual([]);
    expect(faults).toEqual([{ line: 2, column: 'class', code: 'class-zero', value: '0' }]);
  });

  it.each(['5', '000', 'class', 'class five', '0.0', 'II'])(
    'are refused with a class that there is not: %j',
    (written) => {
      const { rows, faults } = one({ class: written });
      expect(rows).toEqual([]);
      expect(faultPlaces(faults)).toEqual([[2, 'class', 'class']]);
    },
  );

  it('come out as they went in, so that no spreadsheet makes 00 to 0', () => {
    expect(classCell('00')).toBe('class 00');
    for (const gloveClass of ['00', '0', '1', '2', '3', '4'] as const) {
      expect(valueOf({ class: classCell(gloveClass) })?.gloveClass).toBe(gloveClass);
    }
  });

  it('have passed a test that is not to come, by the day of their own site', () => {
    expect(valueOf({ testedOn: '2026-06-01' })?.tests[0]?.testedOn).toBe('2026-06-01');
    const late = one({ testedOn: '2026-06-02' });
    expect(late.rows).toEqual([]);
    expect(faultPlaces(late.faults)).toEqual([[2, 'testedOn', 'after-today']]);
    expect(one({ testedOn: '2026-06-02', site: 'South Yard' }).faults).toEqual([]);
    expect(faultPlaces(one({ result: 'failed' }).faults)).toEqual([[2, 'result', 'result']]);
    expect(faultPlaces(one({ result: '' }).faults)).toEqual([[2, 'result', 'required']]);
  });

  it('are refused with each cell that is missing or wrong', () => {
    expect(faultPlaces(read({ size: '10' }).faults)).toEqual([
      [2, 'site', 'required'],
      [2, 'kind', 'required'],
      [2, 'class', 'required'],
      [2, 'serial', 'required'],
      [2, 'testedOn', 'required'],
      [2, 'result', 'required'],
    ]);
    const wrong = {
      site: 'West Yard',
      kind: 'boots',
      size: 'x'.repeat(201),
      issuedOn: 'May',
      // Nobody knows what day it is at a site that there is not.
      testedOn: '2999-01-01',
      laboratory: 'a\u0000b',
    };
    const { rows, faults } = one(wrong);
    expect(rows).toEqual([]);
    expect(faultPlaces(faults)).toEqual([
      [2, 'site', 'no-such-site'],
      [2, 'kind', 'kind'],
      [2, 'size', 'too-long'],
      [2, 'issuedOn', 'date'],
      [2, 'laboratory', 'unstorable'],
    ]);
  });

  it('have a serial number of their own at their site, whatever its case', () => {
    const { faults } = read(
      { ...pair, serial: 'KEPT-1' },
      { ...pair, serial: 'KEPT-1', site: 'South Yard' },
      { ...pair, serial: 'A-1' },
      { ...pair, serial: 'a-1' },
      { ...pair, serial: '' },
      { ...pair, serial: 'A-1', site: 'West Yard' },
    );
    expect(faults).toEqual([
      { line: 2, column: 'serial', code: 'taken', value: 'KEPT-1' },
      { line: 5, column: 'serial', code: 'twice', value: 'a-1' },
      { line: 6, column: 'serial', code: 'required', value: '' },
      { line: 7, column: 'site', code: 'no-such-site', value: 'West Yard' },
    ]);
    expect(serialKey('north', ' KEPT-1 ')).toBe('north kept-1');
  });
});
