import { ALL, flagHits, PLAN_AND_WORK } from '../engine/rule';
import type { Rule } from '../engine/rule';

/** `surroundings.lift-unsafe`: fall protection is worn, and a trained person operates the lift. */
export const liftProtects: Rule = {
  code: 'surroundings.lift-unsafe',
  severity: 'stop',
  stages: PLAN_AND_WORK,
  appliesTo: ALL,
  citations: ['osha1910.67(c)(2)'],
  find({ answers }) {
    const { access, lift } = answers.surroundings;
    if (access !== 'lift') return [];
    return (['fallProtection', 'operatorTrained'] as const).flatMap((name) =>
      flagHits(lift[name], false, `/surroundings/lift/${name}`),
    );
  },
};
