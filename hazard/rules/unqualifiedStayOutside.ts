import { ALL, notAnswered, PLAN_AND_WORK } from '../engine/rule';
import type { Hit, Rule } from '../engine/rule';
import { personParams } from '../engine/people';
import type { Person } from '../engine/people';

/** The best that is known of anyone: who could escort somebody who is not known to be qualified. */
function bestOf(crew: readonly Person[]) {
  if (crew.some(({ qualification }) => qualification === 'yes')) return 'yes';
  return crew.some(({ qualification }) => qualification === 'unknown') ? 'unknown' : 'no';
}

/**
 * `shock.unqualified-inside`: only a qualified person crosses the limited
 * boundary, or someone whom a qualified one escorts all the while.
 */
export const unqualifiedStayOutside: Rule = {
  code: 'shock.unqualified-inside',
  severity: 'stop',
  stages: PLAN_AND_WORK,
  appliesTo: ALL,
  appliesBelowFiftyVolts: false,
  citations: ['nfpa70e.shockApproach'],
  find({ people: { crew } }) {
    return crew.flatMap((person): Hit[] => {
      const { index, nearest, qualification } = person;
      const path = `/crew/${index}/closest`;
      const params = { ...personParams(person), ...(nearest && { closest: nearest }) };
      if (qualification === 'yes') return [];
      if (nearest === 'limited with escort') {
        const escort = bestOf(crew);
        if (escort === 'yes') return [];
        return [{ path, params, severity: escort === 'no' ? 'stop' : 'open' }];
      }
      if (nearest === undefined) return [notAnswered(path, params)];
      if (nearest !== 'restricted' && nearest !== 'limited') return [];
      return [{ path, params, severity: qualification === 'no' ? 'stop' : 'open' }];
    });
  },
};
