import { ALL, notAnswered, PLAN_AND_WORK } from '../engine/rule';
import type { Hit, Rule } from '../engine/rule';

/** `window.reversed`: the work ends after it begins. */
export const windowRunsForward: Rule = {
  code: 'window.reversed',
  severity: 'stop',
  stages: PLAN_AND_WORK,
  appliesTo: ALL,
  citations: ['own.window'],
  find({ answers }) {
    const { startsAt, endsAt } = answers.job;
    if (startsAt === undefined || endsAt === undefined) {
      const hits: Hit[] = startsAt === undefined ? [notAnswered('/job/startsAt')] : [];
      return endsAt === undefined ? [...hits, notAnswered('/job/endsAt')] : hits;
    }
    if (endsAt.instant > startsAt.instant) return [];
    return [{ path: '/job/endsAt', params: { startsAt: startsAt.text, endsAt: endsAt.text } }];
  },
};
