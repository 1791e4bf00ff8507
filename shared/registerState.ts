import { differenceInCalendarDays, parseISO } from 'date-fns';
import type { RubberGoods } from './register';
import type { Person } from './user';

/** How many days before it is due an item or a qualification is shown as due soon. */
export const DUE_SOON_DAYS = 30;

/** Whole days from one calendar date to another, negative where it lies before. */
export function daysBetween(from: string, to: string): number {
  return differenceInCalendarDays(parseISO(to), parseISO(from));
}

export const GOODS_STATES = ['overdue', 'out', 'dueSoon', 'inTest', 'inStore', 'retired'] as const;
export type GoodsState = (typeof GOODS_STATES)[number];

/**
 * How an item stands on a day, for a list. Whether it may be used and when it
 * is due are the server's words; what is not in test for any other reason than
 * its date is out of use.
 */
export function goodsState(item: RubberGoods, today: string): GoodsState {
  if (item.retired) return 'retired';
  // A failed test weighs more than a date: no new interval brings the item back.
  if (latestTest(item)?.passed === false) return 'out';
  if (item.dueOn !== '' && item.dueOn < today) return 'overdue';
  if (!item.inTest) return 'out';
  if (daysBetween(today, item.dueOn) <= DUE_SOON_DAYS) return 'dueSoon';
  return item.issuedOn === null ? 'inStore' : 'inTest';
}

/** The latest test, whatever its result; of two on one day the one written down later. */
export function latestTest({ tests }: Pick<RubberGoods, 'tests'>) {
  return tests.reduce<RubberGoods['tests'][number] | undefined>(
    (latest, test) => (latest === undefined || test.testedOn >= latest.testedOn ? test : latest),
    undefined,
  );
}

/** Until when it may be used; undefined for what may not be used whatever the date. */
export function dueDay(item: RubberGoods): string | undefined {
  if (item.retired || item.dueOn === '' || latestTest(item)?.passed === false) return undefined;
  return item.dueOn;
}

/** From when the present interval runs: the issue, or the test where that came later. */
export function intervalStart({ issuedOn, lastTestedOn }: RubberGoods): string {
  return issuedOn !== null && issuedOn > lastTestedOn ? issuedOn : lastTestedOn;
}

export const ACCOUNT_STATES = ['signedIn', 'invited', 'none', 'retired'] as const;
export type AccountState = (typeof ACCOUNT_STATES)[number];

/** How far a person has come with their account. */
export function accountState({ retired, hasPin, invitedAt }: Person): AccountState {
  if (retired === true) return 'retired';
  if (hasPin === true) return 'signedIn';
  return typeof invitedAt === 'string' ? 'invited' : 'none';
}
