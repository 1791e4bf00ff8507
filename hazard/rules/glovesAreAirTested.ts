import { glovesInUse } from '../engine/gloves';
import { ALL, notAnswered, PLAN_AND_WORK } from '../engine/rule';
import type { Hit, Rule } from '../engine/rule';

/** `shock.gloves-not-air-tested`: an air test and a look before each day's use. */
export const glovesAreAirTested: Rule = {
  code: 'shock.gloves-not-air-tested',
  severity: 'open',
  stages: PLAN_AND_WORK,
  appliesTo: ALL,
  appliesBelowFiftyVolts: false,
  citations: ['osha1910.137(c)(2)(ii)'],
  find(facts) {
    return glovesInUse(facts).flatMap(({ gloves, params, path }): Hit[] => {
      const at = `${path}/airTested`;
      if (gloves.airTested === true) return [];
      return [gloves.airTested === undefined ? notAnswered(at, params) : { path: at, params }];
    });
  },
};
