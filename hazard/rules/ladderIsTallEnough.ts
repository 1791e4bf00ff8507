import { minimumStepladder } from '../surroundings';
import { ALL, flagHits, notAnswered, PLAN_AND_WORK } from '../engine/rule';
import type { Hit, Rule } from '../engine/rule';
import type { Facts } from '../engine/facts';

function reachHits({ answers, edition }: Facts): Hit[] {
  const { ceilingHeightFeet, ladder } = answers.surroundings;
  const { sizeFeet } = ladder;
  const path = '/surroundings/ladder/sizeFeet';
  const hits: Hit[] = [];
  if (sizeFeet === undefined) hits.push(notAnswered(path));
  if (ceilingHeightFeet === undefined) {
    return [...hits, notAnswered('/surroundings/ceilingHeightFeet')];
  }
  const smallest = minimumStepladder({ ceilingHeightFeet }, edition);
  // No stepladder is tall enough: a platform or a lift is needed.
  if (smallest === null) return [...hits, { path, params: { ceilingHeightFeet } }];
  if (sizeFeet !== undefined && sizeFeet < smallest.sizeFeet) {
    const params = { ceilingHeightFeet, sizeFeet, smallestFeet: smallest.sizeFeet };
    hits.push({ path, params });
  }
  return hits;
}

/**
 * `surroundings.ladder-short`: who must stretch from a stepladder falls. Also a
 * ladder that is not placed: locked open, level, out of the way of doors.
 */
export const ladderIsTallEnough: Rule = {
  code: 'surroundings.ladder-short',
  severity: 'stop',
  stages: PLAN_AND_WORK,
  appliesTo: ALL,
  citations: ['practice.stepladder', 'osha1926.1053(b)(6)'],
  find(facts) {
    const { access, ladder } = facts.answers.surroundings;
    if (access !== 'stepladder' && access !== 'extension ladder') return [];
    const placed = flagHits(ladder.placed, false, '/surroundings/ladder/placed').map(
      (hit): Hit => ({ ...hit, citation: 'osha1926.1053(b)(6)' }),
    );
    return access === 'stepladder' ? [...reachHits(facts), ...placed] : placed;
  },
};
