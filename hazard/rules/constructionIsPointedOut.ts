import { ALL, PLAN_AND_WORK } from '../engine/rule';
import type { Rule } from '../engine/rule';

/**
 * `job.construction`: new and renovation work is construction, where circuits
 * are tagged at every point where they can be energized.
 */
export const constructionIsPointedOut: Rule = {
  code: 'job.construction',
  severity: 'caution',
  stages: PLAN_AND_WORK,
  appliesTo: ALL,
  citations: ['osha1926.417', 'osha1926.416(a)'],
  find: ({ answers }) => (answers.job.construction === true ? [{ path: '/job/construction' }] : []),
};
