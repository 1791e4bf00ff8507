import { describe, expect, it } from 'vitest';
import { gloveStatus, selectGloveClass } from '@/hazard';
import type { GloveClass } from '@/hazard';

describe('rubber gloves, 29 CFR 1910.137 Table I-4', () => {
  it.each<[number, GloveClass, number]>([
    [0, '00', 500],
    [480, '00', 500],
    [500, '00', 500],
    [500.1, '0', 1000],
    [1000, '0', 1000],
    [1000.1, '1', 7500],
    [7500, '1', 7500],
    [7500.1, '2', 17_000],
    [17_000, '2', 17_000],
    [17_000.1, '3', 26_500],
    [26_500, '3', 26_500],
    [26_500.1, '4', 36_000],
    [36_000, '4', 36_000],
  ])('at %d V class %s, to %d V', (volts, gloveClass, maxUseVolts) => {
    expect(selectGloveClass(volts)).toEqual({
      gloveClass,
      maxUseVolts,
      citation: {
        standard: 'OSHA 29 CFR 1910',
        edition: 'in force',
        table: '1910.137 Table I-4',
        confidence: 'regulation',
      },
    });
  });

  it.each([36_000.1, 1e9, NaN, Infinity, -1])('refuses %d V', (volts) => {
    expect(() => selectGloveClass(volts)).toThrow(RangeError);
    expect(() => selectGloveClass(volts)).toThrow(/^volts/);
  });
});

interface Dates {
  tested: string;
  issued?: string;
  on: string;
}
const status = ({ tested, issued, on }: Dates) =>
  gloveStatus({ gloveClass: '0', lastTestedOn: tested, issuedOn: issued, on, volts: 480 });

describe('the test of rubber gloves, 29 CFR 1910.137 Table I-5', () => {
  it.each([
    { tested: '2026-01-15', on: '2026-07-15', dueOn: '2026-07-15', inTest: true },
    { tested: '2026-01-15', on: '2026-07-16', dueOn: '2026-07-15', inTest: false },
    { tested: '2026-01-15', on: '2026-01-15', dueOn: '2026-07-15', inTest: true },
    // A test after the day is no test yet.
    { tested: '2026-01-15', on: '2026-01-14', dueOn: '2026-07-15', inTest: false },
    // The month's end, in a common year and in leap years.
    { tested: '2026-08-31', on: '2027-02-28', dueOn: '2027-02-28', inTest: true },
    { tested: '2026-08-31', on: '2027-03-01', dueOn: '2027-02-28', inTest: false },
    { tested: '2027-08-31', on: '2028-02-29', dueOn: '2028-02-29', inTest: true },
    { tested: '2027-08-29', on: '2028-02-29', dueOn: '2028-02-29', inTest: true },
    { tested: '2099-08-31', on: '2100-02-28', dueOn: '2100-02-28', inTest: true },
    { tested: '1999-08-31', on: '2000-02-29', dueOn: '2000-02-29', inTest: true },
    { tested: '2026-03-31', on: '2026-09-30', dueOn: '2026-09-30', inTest: true },
    { tested: '2026-12-31', on: '2027-06-30', dueOn: '2027-06-30', inTest: true },
    { tested: '2028-02-29', on: '2028-08-29', dueOn: '2028-08-29', inTest: true },
    { tested: '2026-06-30', on: '2026-12-31', dueOn: '2026-12-30', inTest: false },
    { tested: '9999-12-31', on: '9999-12-31', dueOn: '9999-12-31', inTest: true },
  ])('tested $tested, no issue known, on $on: due $dueOn', ({ tested, on, dueOn, inTest }) => {
    expect(status({ tested, on })).toEqual({ adequate: true, inTest, dueOn });
  });

  it.each([
    // Tested on or after the issue: six months from the test.
    {
      tested: '2026-05-10',
      issued: '2026-05-10',
      on: '2026-11-10',
      dueOn: '2026-11-10',
      inTest: true,
    },
    {
      tested: '2026-05-10',
      issued: '2025-01-01',
      on: '2026-11-11',
      dueOn: '2026-11-10',
      inTest: false,
    },
    // Issued after the test: six months from the issue.
    {
      tested: '2026-01-10',
      issued: '2026-03-31',
      on: '2026-09-30',
      dueOn: '2026-09-30',
      inTest: true,
    },
    {
      tested: '2026-01-10',
      issued: '2026-03-31',
      on: '2026-10-01',
      dueOn: '2026-09-30',
      inTest: false,
    },
    // But never past twelve months from the test.
    {
      tested: '2026-01-10',
      issued: '2026-09-01',
      on: '2027-01-10',
      dueOn: '2027-01-10',
      inTest: true,
    },
    {
      tested: '2026-01-10',
      issued: '2026-09-01',
      on: '2027-01-11',
      dueOn: '2027-01-10',
      inTest: false,
    },
    // Issued on the last day of the twelve months, and one day later.
    {
      tested: '2026-01-10',
      issued: '2027-01-10',
      on: '2027-01-10',
      dueOn: '2027-01-10',
      inTest: true,
    },
    {
      tested: '2026-01-10',
      issued: '2027-01-11',
      on: '2027-01-11',
      dueOn: '2027-01-10',
      inTest: false,
    },
    // Not issued yet on the day.
    {
      tested: '2026-01-10',
      issued: '2026-03-31',
      on: '2026-03-30',
      dueOn: '2026-09-30',
      inTest: false,
    },
    {
      tested: '2026-01-10',
      issued: '2026-03-31',
      on: '2026-03-31',
      dueOn: '2026-09-30',
      inTest: true,
    },
    // A leap day plus twelve months.
    {
      tested: '2028-02-29',
      issued: '2029-02-28',
      on: '2029-02-28',
      dueOn: '2029-02-28',
      inTest: true,
    },
    {
      tested: '2028-02-29',
      issued: '2029-03-01',
      on: '2029-03-01',
      dueOn: '2029-02-28',
      inTest: false,
    },
  ])('tested $tested, issued $issued, on $on: due $dueOn, $inTest', (row) => {
    const { dueOn, inTest, ...dates } = row;
    expect(status(dates)).toEqual({ adequate: true, inTest, dueOn });
  });

  it('is judged apart from the class', () => {
    const given = {
      gloveClass: '00',
      lastTestedOn: '2026-01-01',
      on: '2026-12-01',
      volts: 500,
    } as const;
    expect(gloveStatus(given)).toMatchObject({ adequate: true, inTest: false });
    expect(gloveStatus({ ...given, volts: 501 })).toMatchObject({ adequate: false });
  });

  it.each(['2026-02-30', '2026-02-29', '2026-13-01', '2026-00-10', '2026-01-00', '2026-04-31'])(
    'refuses the date %s',
    (date) => {
      const sound = { tested: '2026-01-01', on: '2026-12-01' };
      expect(() => status({ ...sound, tested: date })).toThrow(/^lastTestedOn/);
      expect(() => status({ ...sound, issued: date })).toThrow(/^issuedOn/);
      expect(() => status({ ...sound, on: date })).toThrow(/^on /);
      expect(() => status({ ...sound, on: date })).toThrow(RangeError);
    },
  );

  it.each(['', 'today', '2026-1-1', '01/02/2026', '2026-01-01T00:00:00Z', ' 2026-01-01'])(
    'refuses %j, which is not written as a date',
    (date) => {
      expect(() => status({ tested: date, on: '2026-12-01' })).toThrow(RangeError);
    },
  );

  it('refuses dates that are not text, unknown classes and bad voltages', () => {
    const sound = {
      gloveClass: '0',
      lastTestedOn: '2026-01-01',
      on: '2026-02-01',
      volts: 480,
    } as const;
    const missing = undefined as unknown as string;
    expect(() => gloveStatus({ ...sound, lastTestedOn: missing })).toThrow(/^lastTestedOn/);
    expect(() => gloveStatus({ ...sound, gloveClass: '5' as GloveClass })).toThrow(/^gloveClass/);
    expect(() => gloveStatus({ ...sound, volts: -1 })).toThrow(/^volts/);
  });
});
