import { notAnswered, OFF, PLAN_AND_WORK } from '../engine/rule';
import type { Rule } from '../engine/rule';

/** `window.shift-change`: who comes on takes over the locks and tests again. */
export const locksAreHandedOver: Rule = {
  code: 'window.shift-change',
  severity: 'open',
  stages: PLAN_AND_WORK,
  appliesTo: OFF,
  citations: ['osha1910.147(f)(4)', 'osha1910.333(b)(2)(iii)(E)(2)'],
  find({ answers }) {
    const { crossesShift, handover } = answers.job;
    if (crossesShift === undefined) return [notAnswered('/job/crossesShift')];
    return crossesShift && handover === undefined ? [notAnswered('/job/handover')] : [];
  },
};
