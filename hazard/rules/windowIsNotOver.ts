import { ALL, notAnswered, PLAN_AND_WORK } from '../engine/rule';
import type { Rule } from '../engine/rule';

/** `window.over`: past its end a worksheet is valid no more. */
export const windowIsNotOver: Rule = {
  code: 'window.over',
  severity: 'stop',
  stages: PLAN_AND_WORK,
  appliesTo: ALL,
  citations: ['own.window'],
  find({ answers, on }) {
    const { endsAt } = answers.job;
    const path = '/job/endsAt';
    if (endsAt === undefined) return [notAnswered(path)];
    return endsAt.instant < on.instant ? [{ path, params: { endsAt: endsAt.text } }] : [];
  },
};
