import { glovesInUse } from '../engine/gloves';
import { ALL, flagHits, PLAN_AND_WORK } from '../engine/rule';
import type { Rule } from '../engine/rule';

/** `shock.gloves-no-protectors`: leather over the rubber, waived by this tool for no class. */
export const glovesHaveProtectors: Rule = {
  code: 'shock.gloves-no-protectors',
  severity: 'stop',
  stages: PLAN_AND_WORK,
  appliesTo: ALL,
  appliesBelowFiftyVolts: false,
  citations: ['osha1910.137(c)(2)(vii)', 'own.leatherProtectors'],
  find(facts) {
    return glovesInUse(facts).flatMap(({ gloves, params, path }) =>
      flagHits(gloves.leatherProtectors, false, `${path}/leatherProtectors`, params),
    );
  },
};
