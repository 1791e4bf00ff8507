import { describe, expect, it } from 'vitest';
import { importSchema, readPeople } from '@/shared/registerCsv';
import { CSV_SITES as sites, csvLines, faultPlaces } from '../support/csvLines';

const nobody = { sites, taken: new Set<string>() };

describe('people of a spreadsheet', () => {
  const COLUMNS = ['name', 'email', 'role', 'sites', 'qualifiedThrough', 'language', 'units'];
  const ada = {
    name: 'Ada Lindqvist',
    email: 'ada@company.example',
    role: 'lead',
    sites: 'North Yard',
  };
  const read = (...rows: Record<string, string>[]) =>
    readPeople(csvLines(COLUMNS, rows), { sites, taken: new Set(['office@company.example']) });
  const one = (fields: Record<string, string>) => read({ ...ada, ...fields });
  const valueOf = (fields: Record<string, string>) => one(fields).rows[0]?.value;

  it('are read with what each cell says', () => {
    const all = {
      role: 'Supervisor',
      sites: 'north yard; SOUTH YARD',
      qualifiedThrough: '2027-03-01',
      language: 'es',
      units: 'Metric',
    };
    expect(one(all)).toEqual({
      faults: [],
      rows: [
        {
          line: 2,
          value: {
            name: 'Ada Lindqvist',
            email: 'ada@company.example',
            role: 'supervisor',
            siteIds: ['north', 'south'],
            qualifiedThrough: '2027-03-01',
            locale: 'es-MX',
            units: 'metric',
          },
        },
      ],
    });
  });

  it('read English, have feet and are not qualified where nothing is said', () => {
    const nothing = { locale: 'en-US', units: 'feet', qualifiedThrough: null };
    expect(valueOf({})).toMatchObject(nothing);
    const lines = csvLines(['name', 'email', 'role', 'sites'], [ada]);
    expect(readPeople(lines, nobody).rows[0]?.value).toMatchObject(nothing);
  });

  it.each([
    ['en', 'en-US'],
    ['EN', 'en-US'],
    ['en-us', 'en-US'],
    ['Es', 'es-MX'],
    ['ES-mx', 'es-MX'],
  ])('have the language %s: %s', (language, locale) => {
    expect(valueOf({ language })?.locale).toBe(locale);
  });

  it.each(['french', 'e', 'en-GB', 'constructor', '__proto__'])(
    'are refused with a language that there is not: %j',
    (language) => {
      const { rows, faults } = one({ language });
      expect(rows).toEqual([]);
      expect(faults).toEqual([{ line: 2, column: 'language', code: 'language', value: language }]);
    },
  );

  it('have each site that the cell names, between ; or |', () => {
    expect(valueOf({ sites: ' South Yard |North Yard;; ' })?.siteIds).toEqual(['south', 'north']);
    const { rows, faults } = one({ sites: 'North Yard; West Yard' });
    expect(rows).toEqual([]);
    expect(faults).toEqual([
      { line: 2, column: 'sites', code: 'no-such-site', value: 'North Yard; West Yard' },
    ]);
  });

  it('need a site, unless they are of the safety office, who see all', () => {
    expect(valueOf({ role: 'safety', sites: '' })).toMatchObject({ role: 'safety', siteIds: [] });
    for (const role of ['lead', 'helper', 'supervisor']) {
      expect(faultPlaces(one({ role, sites: '' }).faults)).toEqual([[2, 'sites', 'required']]);
      expect(faultPlaces(one({ role, sites: ' ; | ' }).faults)).toEqual([[2, 'sites', 'required']]);
    }
    expect(faultPlaces(one({ role: 'safety', sites: 'West Yard' }).faults)).toEqual([
      [2, 'sites', 'no-such-site'],
    ]);
  });

  it('are refused with each cell that is missing or wrong', () => {
    expect(faultPlaces(read({ units: 'feet' }).faults)).toEqual([
      [2, 'name', 'required'],
      [2, 'email', 'required'],
      [2, 'role', 'required'],
      [2, 'sites', 'required'],
    ]);
    const wrong = {
      email: 'ada at company',
      role: 'foreman',
      qualifiedThrough: '3/1/2027',
      units: 'yards',
    };
    const { rows, faults } = one(wrong);
    expect(rows).toEqual([]);
    expect(faults).toEqual(
      [
        { column: 'email', code: 'email', value: 'ada at company' },
        { column: 'role', code: 'role', value: 'foreman' },
        { column: 'qualifiedThrough', code: 'date', value: '3/1/2027' },
        { column: 'units', code: 'units', value: 'yards' },
      ].map((fault) => ({ line: 2, ...fault })),
    );
  });

  it('are named by an address of their own, whatever its case', () => {
    const { rows, faults } = read(
      ada,
      { ...ada, name: 'Another Ada', email: 'ADA@company.example' },
      { ...ada, name: 'Olin Marsh', email: 'Office@Company.example' },
      { ...ada, name: 'Nobody', email: '' },
      { ...ada, name: 'Nobody Either', email: '' },
    );
    expect(faults).toEqual([
      { line: 3, column: 'email', code: 'twice', value: 'ADA@company.example' },
      { line: 4, column: 'email', code: 'taken', value: 'Office@Company.example' },
      { line: 5, column: 'email', code: 'required', value: '' },
      { line: 6, column: 'email', code: 'required', value: '' },
    ]);
    expect(rows[0]?.value.name).toBe('Ada Lindqvist');
  });

  it('are read on from the line after a wrong one, faults in the order of the file', () => {
    const { rows, faults } = read(
      { ...ada, email: 'office@company.example' },
      { ...ada, email: 'bo@company.example', role: '' },
      { ...ada, email: 'cy@company.example' },
    );
    expect(faultPlaces(faults)).toEqual([
      [2, 'email', 'taken'],
      [3, 'role', 'required'],
    ]);
    expect(rows.map(({ line, value }) => [line, value.email])).toContainEqual([
      4,
      'cy@company.example',
    ]);
  });

  it('can be read again from an exported file', () => {
    const columns = [...COLUMNS, 'account', 'retired'];
    const lines = csvLines(columns, [{ ...ada, name: "'=Ada", account: 'in use', retired: 'no' }]);
    const { rows, faults } = readPeople(lines, nobody);
    expect(faults).toEqual([]);
    expect(rows[0]?.value.name).toBe('=Ada');
  });
});

describe('an imported file', () => {
  it('is of 500,000 characters at most', () => {
    expect(importSchema.safeParse({ csv: 'x'.repeat(500_000) }).success).toBe(true);
    expect(importSchema.safeParse({ csv: 'x'.repeat(500_001) }).success).toBe(false);
  });
});
