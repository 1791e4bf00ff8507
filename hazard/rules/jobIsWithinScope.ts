import { ALL, notAnswered, PLAN_AND_WORK } from '../engine/rule';
import type { Rule } from '../engine/rule';

/**
 * `job.outside-scope`: the tool knows lighting circuits from 120 to 480 V and
 * nothing of what is listed here; such work is planned in another way.
 */
export const jobIsWithinScope: Rule = {
  code: 'job.outside-scope',
  severity: 'stop',
  stages: PLAN_AND_WORK,
  appliesTo: ALL,
  citations: ['own.scope', 'osha1910.334(d)', 'osha1910.307', 'nfpa70e.article320'],
  find({ answers }) {
    const { special } = answers.job;
    const path = '/job/special';
    return [
      ...special.values
        .filter((condition) => condition !== 'none of these')
        .map((special) => ({ path, params: { special } })),
      ...(special.isAnswered ? [] : [notAnswered(path)]),
    ];
  },
};
