import { ENERGIZED, notAnswered, PLAN_AND_WORK } from '../engine/rule';
import type { Rule } from '../engine/rule';

/**
 * `decision.unjustified`: energized work has a reason that the regulation admits
 * for the task. Saving time is not one. Choosing to work energized is an answer
 * by itself, so that a missing reason stops.
 */
export const energizedWorkHasReason: Rule = {
  code: 'decision.unjustified',
  severity: 'stop',
  stages: PLAN_AND_WORK,
  appliesTo: ENERGIZED,
  citations: ['osha1910.333(a)(1)', 'nfpa70e.energizedWork'],
  find({ answers, task }) {
    const path = '/decision/reason';
    const { reason } = answers.decision;
    const { task: name } = answers.job;
    if (reason === undefined) return [{ path, params: { ...(name && { task: name }) } }];
    // Which reasons are admitted follows from the task.
    if (name === undefined) return [notAnswered('/job/task', { reason })];
    // A repair under the name of testing has a rule of its own.
    if (reason === 'testing') return [];
    return task.admittedReasons.includes(reason) ? [] : [{ path, params: { task: name, reason } }];
  },
};
