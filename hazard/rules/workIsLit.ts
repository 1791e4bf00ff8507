import { ALL, flagHits, PLAN_AND_WORK } from '../engine/rule';
import type { Rule } from '../engine/rule';

/** `surroundings.dark`: judged with the circuit off, since the lights go out with it. */
export const workIsLit: Rule = {
  code: 'surroundings.dark',
  severity: 'stop',
  stages: PLAN_AND_WORK,
  appliesTo: ALL,
  citations: ['osha1910.333(c)(4)'],
  find: ({ answers }) =>
    flagHits(answers.surroundings.lightAdequate, false, '/surroundings/lightAdequate'),
};
