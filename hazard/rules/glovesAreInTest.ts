import { gloveStatus } from '../gloves';
import { glovesInUse } from '../engine/gloves';
import { ALL, notAnswered, PLAN_AND_WORK } from '../engine/rule';
import type { Rule } from '../engine/rule';

/**
 * `shock.gloves-overdue`: in test on the worksheet's day. A test or an issue
 * that lies after the day of assessment has not happened.
 */
export const glovesAreInTest: Rule = {
  code: 'shock.gloves-overdue',
  severity: 'stop',
  stages: PLAN_AND_WORK,
  appliesTo: ALL,
  appliesBelowFiftyVolts: false,
  citations: ['osha1910.137.tableI-5'],
  find(facts) {
    const { day, edition, on } = facts;
    return glovesInUse(facts).flatMap(({ gloves, params, path }) => {
      const { lastTestedOn, issuedOn } = gloves;
      const at = `${path}/lastTestedOn`;
      if (lastTestedOn === undefined) return [notAnswered(at, params)];
      // The class is the business of another rule, and makes no difference to the dates.
      const question = { gloveClass: '0', lastTestedOn, issuedOn, on: day, volts: 0 } as const;
      const { inTest, dueOn } = gloveStatus(question, edition);
      const isToCome = lastTestedOn > on.date || (issuedOn !== undefined && issuedOn > on.date);
      return inTest && !isToCome ? [] : [{ path: at, params: { ...params, dueOn, day } }];
    });
  },
};
