import { notAnswered, OFF_AND_ENERGIZED, PLAN_AND_WORK } from '../engine/rule';
import type { Hit, Rule } from '../engine/rule';

/** `sources.traveler-unlisted`: of two travelers one is always live, whichever way the switch stands. */
export const travelersAreListed: Rule = {
  code: 'sources.traveler-unlisted',
  severity: 'open',
  stages: PLAN_AND_WORK,
  appliesTo: OFF_AND_ENERGIZED,
  citations: ['practice.travelers'],
  find({ answers, sources }) {
    const { isAnswered, values } = answers.supply.switching;
    const hits: Hit[] = isAnswered ? [] : [notAnswered('/supply/switching')];
    const isListed = sources.some(({ kind }) => kind === 'traveler');
    if (values.includes('two or more places') && !isListed) {
      hits.push({ path: '/sources', params: { kind: 'traveler' } });
    }
    return hits;
  },
};
