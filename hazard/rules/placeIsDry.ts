import { ALL, notAnswered, PLAN_AND_WORK } from '../engine/rule';
import type { Rule } from '../engine/rule';

/**
 * `surroundings.wet`: water takes the resistance out of skin, gloves and wood.
 * With the circuit off it may be made good before the test.
 */
export const placeIsDry: Rule = {
  code: 'surroundings.wet',
  severity: 'stop',
  stages: PLAN_AND_WORK,
  appliesTo: ALL,
  citations: ['osha1910.333(a)(2)', 'osha1910.334(a)(4)'],
  find({ answers, path: workPath }) {
    const { wet, wetMeasures } = answers.surroundings;
    const path = '/surroundings/wet';
    if (wet === undefined) return [notAnswered(path)];
    if (!wet) return [];
    const isMadeGood = workPath === 'off' && wetMeasures !== undefined;
    return [{ path, severity: isMadeGood ? 'caution' : 'stop' }];
  },
};
