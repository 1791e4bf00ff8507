import { LIVE, PLAN_AND_WORK } from '../engine/rule';
import type { Rule } from '../engine/rule';

/**
 * `arc.task-does-not-fit`: a milder row of the likelihood table was chosen than
 * the job allows. What the job makes of it counts meanwhile.
 */
export const arcFlashTaskFits: Rule = {
  code: 'arc.task-does-not-fit',
  severity: 'open',
  stages: PLAN_AND_WORK,
  appliesTo: LIVE,
  appliesBelowFiftyVolts: false,
  citations: ['nfpa70e.likelihood'],
  find({ answers, arc }) {
    const { task: arcFlashTask } = answers.arcFlash;
    if (!arc.taskDoesNotFit || arcFlashTask === undefined) return [];
    const params = { task: arcFlashTask, ...(arc.floor && { floor: arc.floor }) };
    return [{ path: '/arcFlash/task', params }];
  },
};
