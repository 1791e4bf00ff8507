import { glovesOfEntrants, isAnyGloveAnswered } from '../engine/gloves';
import { ALL, notAnswered, PLAN_AND_WORK } from '../engine/rule';
import type { Hit, Rule } from '../engine/rule';

/** `shock.gloves-missing`: each person inside the restricted boundary has rubber gloves of their own. */
export const entrantHasGloves: Rule = {
  code: 'shock.gloves-missing',
  severity: 'stop',
  stages: PLAN_AND_WORK,
  appliesTo: ALL,
  appliesBelowFiftyVolts: false,
  citations: ['osha1910.137', 'osha1910.335(a)(1)'],
  find(facts) {
    return glovesOfEntrants(facts).flatMap(({ gloves, params, path }): Hit[] => {
      if (gloves !== undefined) return [];
      return [isAnyGloveAnswered(facts) ? { path, params } : notAnswered(path, params)];
    });
  },
};
