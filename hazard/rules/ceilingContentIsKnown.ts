import { ALL, notAnswered, PLAN_AND_WORK } from '../engine/rule';
import type { Rule } from '../engine/rule';

/**
 * `surroundings.ceiling-content`: sprayed coating or pipe insulation of 1980 or
 * earlier may hold asbestos, a magnetic ballast without a mark PCBs.
 */
export const ceilingContentIsKnown: Rule = {
  code: 'surroundings.ceiling-content',
  severity: 'open',
  stages: PLAN_AND_WORK,
  appliesTo: ALL,
  citations: ['osha1910.1001(j)', 'epa40cfr761'],
  find({ answers, task }) {
    if (!task.opensCeilingOrLuminaire) return [];
    const path = '/surroundings/ceiling';
    const { ceiling } = answers.surroundings;
    if (ceiling === undefined) return [notAnswered(path)];
    return ceiling === 'suspected' ? [{ path, severity: 'stop' }] : [];
  },
};
