import { ENERGIZED, PLAN_AND_WORK } from '../engine/rule';
import type { Rule } from '../engine/rule';

/** `decision.testing-is-not-repair`: the exemption for testing ends where a repair begins. */
export const testingIsNotRepair: Rule = {
  code: 'decision.testing-is-not-repair',
  severity: 'stop',
  stages: PLAN_AND_WORK,
  appliesTo: ENERGIZED,
  citations: ['nfpa70e.permitExemptions'],
  find({ answers }) {
    const { task } = answers.job;
    // Testing for that reason is a path of its own: here every task is a repair.
    if (task === undefined || answers.decision.reason !== 'testing') return [];
    return [{ path: '/decision/reason', params: { task } }];
  },
};
