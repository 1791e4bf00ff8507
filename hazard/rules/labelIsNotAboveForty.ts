import { ALL, PLAN_AND_WORK } from '../engine/rule';
import type { Rule } from '../engine/rule';

/**
 * `arc.above-forty`: nobody works on this tool's word where the label says more
 * than 40 cal/cm², whatever is worn and however unlikely an arc flash is.
 */
export const labelIsNotAboveForty: Rule = {
  code: 'arc.above-forty',
  severity: 'stop',
  stages: PLAN_AND_WORK,
  appliesTo: ALL,
  appliesBelowFiftyVolts: false,
  citations: ['own.aboveForty'],
  find({ arc }) {
    return arc.result.findings.filter(({ code }) => code === 'arc.above-forty');
  },
};
