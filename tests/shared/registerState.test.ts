import { describe, expect, it } from 'vitest';
import type { RubberGoods } from '@/shared/register';
import {
  accountState,
  daysBetween,
  dueDay,
  goodsState,
  intervalStart,
  latestTest,
} from '@/shared/registerState';

const item = (fields: Partial<RubberGoods> = {}): RubberGoods => ({
  id: 'g',
  siteId: 's',
  kind: 'gloves',
  gloveClass: '0',
  serial: 'RG-1',
  size: '10',
  issuedOn: '2026-04-01',
  tests: [{ testedOn: '2026-03-31', passed: true }],
  lastTestedOn: '2026-03-31',
  dueOn: '2026-10-01',
  inTest: true,
  retired: false,
  retiredBecause: null,
  ...fields,
});

describe('how an item stands', () => {
  it.each([
    ['2026-08-31', {}, 'inTest'],
    ['2026-09-01', {}, 'dueSoon'],
    ['2026-10-01', {}, 'dueSoon'],
    ['2026-10-02', { inTest: false }, 'overdue'],
    // The date decides as well, should the server's answer be of yesterday.
    ['2026-10-02', { inTest: true }, 'overdue'],
    ['2026-05-01', { inTest: false }, 'out'],
    ['2026-05-01', { inTest: false, dueOn: '', lastTestedOn: '' }, 'out'],
    ['2026-10-02', { inTest: false, tests: [{ testedOn: '2026-09-01', passed: false }] }, 'out'],
    ['2026-05-01', { issuedOn: null }, 'inStore'],
    ['2026-10-02', { retired: true, inTest: false }, 'retired'],
  ] satisfies [string, Partial<RubberGoods>, string][])(
    'on %s with %j: %s',
    (today, fields, state) => {
      expect(goodsState(item(fields), today)).toBe(state);
    },
  );

  it('counts from the issue where it came after the test', () => {
    expect(intervalStart(item())).toBe('2026-04-01');
    expect(intervalStart(item({ issuedOn: '2025-04-01' }))).toBe('2026-03-31');
    expect(intervalStart(item({ issuedOn: null }))).toBe('2026-03-31');
  });

  it('knows the latest test, the later one of a day', () => {
    const tests = [
      { testedOn: '2026-05-01', passed: true },
      { testedOn: '2026-03-31', passed: true },
      { testedOn: '2026-05-01', passed: false },
    ];
    expect(latestTest({ tests })).toEqual(tests[2]);
    expect(latestTest({ tests: [] })).toBeUndefined();
  });

  it('names no day for what may not be used whatever the date', () => {
    expect(dueDay(item())).toBe('2026-10-01');
    expect(dueDay(item({ retired: true }))).toBeUndefined();
    expect(dueDay(item({ dueOn: '' }))).toBeUndefined();
    const failed = { testedOn: '2026-05-01', passed: false };
    expect(dueDay(item({ tests: [...item().tests, failed] }))).toBeUndefined();
  });

  it('counts days over a change of the clocks', () => {
    expect(daysBetween('2026-03-07', '2026-03-09')).toBe(2);
    expect(daysBetween('2026-11-02', '2026-10-31')).toBe(-2);
  });
});

describe('an account', () => {
  const person = {
    id: 'p',
    name: 'P',
    role: 'lead',
    qualified: true,
    qualifiedThrough: null,
  } as const;
  it.each([
    [{ hasPin: true, retired: true }, 'retired'],
    [{ hasPin: true }, 'signedIn'],
    [{ hasPin: false, invitedAt: '2026-01-01T00:00:00.000Z' }, 'invited'],
    [{ hasPin: false, invitedAt: null }, 'none'],
  ] as const)('%j: %s', (fields, state) => {
    expect(accountState({ ...person, ...fields })).toBe(state);
  });
});
