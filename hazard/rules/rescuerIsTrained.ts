import { ALL, PLAN_AND_WORK } from '../engine/rule';
import type { Rule } from '../engine/rule';

/**
 * `crew.rescue-untrained`: someone can free a person from contact and knows CPR
 * and the AED. The only one inside the restricted boundary cannot free himself.
 */
export const rescuerIsTrained: Rule = {
  code: 'crew.rescue-untrained',
  severity: 'open',
  stages: PLAN_AND_WORK,
  appliesTo: ALL,
  citations: ['nfpa70e.training', 'osha1910.151(b)'],
  find({ path: workPath, people }) {
    const { crew, entrants } = people;
    const victim = workPath !== 'off' && entrants.length === 1 ? entrants[0] : undefined;
    const isCovered = crew.some((person) => person.rescueTrained === true && person !== victim);
    return isCovered ? [] : [{ path: '/crew' }];
  },
};
