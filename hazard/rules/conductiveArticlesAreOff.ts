import { ALL, flagHits, PLAN_AND_WORK } from '../engine/rule';
import type { Rule } from '../engine/rule';

/** `shock.conductive-articles`: rings, watches, chains and metal frames are taken off. */
export const conductiveArticlesAreOff: Rule = {
  code: 'shock.conductive-articles',
  severity: 'stop',
  stages: PLAN_AND_WORK,
  appliesTo: ALL,
  appliesBelowFiftyVolts: false,
  citations: ['osha1910.333(c)(8)'],
  find({ answers }) {
    const { conductiveArticlesRemoved } = answers.surroundings;
    return flagHits(conductiveArticlesRemoved, false, '/surroundings/conductiveArticlesRemoved');
  },
};
