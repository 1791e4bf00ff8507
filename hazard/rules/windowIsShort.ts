import { minutesBetween } from '../engine/moment';
import { ALL, PLAN_AND_WORK } from '../engine/rule';
import type { Rule } from '../engine/rule';
import { windowHits } from '../engine/window';

const LONGEST_MINUTES = 12 * 60;

/** `window.too-long`: a worksheet is for one day's work, 12 h on the clock that never changes. */
export const windowIsShort: Rule = {
  code: 'window.too-long',
  severity: 'stop',
  stages: PLAN_AND_WORK,
  appliesTo: ALL,
  citations: ['own.window'],
  find: ({ answers }) =>
    windowHits(answers.job, (startsAt, endsAt) => {
      const minutes = minutesBetween(startsAt, endsAt);
      if (minutes <= LONGEST_MINUTES) return [];
      return [{ path: '/job/endsAt', params: { minutes, limit: LONGEST_MINUTES } }];
    }),
};
