import { ALL, PLAN_AND_WORK } from '../engine/rule';
import type { Rule } from '../engine/rule';

/** `crew.alone`: nobody is there to open the circuit, call and begin CPR. */
export const nobodyWorksAlone: Rule = {
  code: 'crew.alone',
  severity: 'stop',
  stages: PLAN_AND_WORK,
  appliesTo: ALL,
  appliesBelowFiftyVolts: false,
  citations: ['own.alone', 'face94MD022'],
  find({ path: workPath, people }) {
    if (people.crew.length !== 1) return [];
    return [{ path: '/crew', severity: workPath === 'off' ? 'caution' : 'stop' }];
  },
};
