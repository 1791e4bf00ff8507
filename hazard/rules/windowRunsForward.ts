import { ALL, PLAN_AND_WORK } from '../engine/rule';
import type { Rule } from '../engine/rule';
import { windowHits } from '../engine/window';

/** `window.reversed`: the work ends after it begins. */
export const windowRunsForward: Rule = {
  code: 'window.reversed',
  severity: 'stop',
  stages: PLAN_AND_WORK,
  appliesTo: ALL,
  citations: ['own.window'],
  find: ({ answers }) =>
    windowHits(answers.job, (startsAt, endsAt) =>
      endsAt.instant > startsAt.instant
        ? []
        : [{ path: '/job/endsAt', params: { startsAt: startsAt.text, endsAt: endsAt.text } }],
    ),
};
