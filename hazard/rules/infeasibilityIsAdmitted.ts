import { ENERGIZED, notAnswered, PLAN_AND_WORK } from '../engine/rule';
import type { Rule } from '../engine/rule';

/**
 * `decision.infeasible-not-admitted`: convenience, tenants, lost sales and
 * overtime are not grounds. A continuous industrial process is one, but a
 * building's lighting is hardly ever part of it.
 */
export const infeasibilityIsAdmitted: Rule = {
  code: 'decision.infeasible-not-admitted',
  severity: 'stop',
  stages: PLAN_AND_WORK,
  appliesTo: ENERGIZED,
  citations: ['osha1910.333(a)(1).note2'],
  find({ answers }) {
    const { reason, infeasibleBecause } = answers.decision;
    if (reason !== 'infeasible') return [];
    const path = '/decision/infeasibleBecause';
    if (infeasibleBecause === undefined) return [notAnswered(path)];
    const params = { because: infeasibleBecause };
    if (infeasibleBecause === 'continuous industrial process') {
      return [{ path, params, severity: 'caution' }];
    }
    // On this path the task is a repair, unless it is not answered.
    const isUnsettled =
      infeasibleBecause === 'can only be tested energized' && answers.job.task === undefined;
    return isUnsettled ? [notAnswered('/job/task', params)] : [{ path, params }];
  },
};
