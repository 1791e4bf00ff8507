import { ALL, notAnswered, PLAN_AND_WORK } from '../engine/rule';
import type { Hit, Rule } from '../engine/rule';

/** `surroundings.ladder-top`: neither the top of a stepladder nor the step below it is stood on. */
export const ladderTopIsNotStoodOn: Rule = {
  code: 'surroundings.ladder-top',
  severity: 'stop',
  stages: PLAN_AND_WORK,
  appliesTo: ALL,
  citations: ['osha1926.1053(b)(13)', 'osha1910.23(c)', 'practice.stepladder'],
  find({ answers, edition }) {
    const { access, ladder } = answers.surroundings;
    const { sizeFeet, standingLevelFeet } = ladder;
    if (access !== 'stepladder') return [];
    const path = '/surroundings/ladder';
    const at = `${path}/standingLevelFeet`;
    if (sizeFeet === undefined || standingLevelFeet === undefined) {
      const hits: Hit[] = sizeFeet === undefined ? [notAnswered(`${path}/sizeFeet`)] : [];
      return standingLevelFeet === undefined ? [...hits, notAnswered(at)] : hits;
    }
    const limit = sizeFeet - edition.stepladders.standingBelowTopFeet;
    return standingLevelFeet > limit
      ? [{ path: at, params: { standingLevelFeet, limit: Math.max(limit, 0) } }]
      : [];
  },
};
