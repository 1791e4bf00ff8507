import { ALL, notAnswered, PLAN_AND_WORK } from '../engine/rule';
import type { Rule } from '../engine/rule';

/**
 * `sources.egress-unknown`: emergency lighting has a supply of its own. Who
 * does not know it meets a luminaire that is live with every breaker off.
 */
export const egressSupplyIsKnown: Rule = {
  code: 'sources.egress-unknown',
  severity: 'stop',
  stages: PLAN_AND_WORK,
  appliesTo: ALL,
  citations: ['practice.egressSupply', 'nec700', 'face04WA080'],
  find({ answers }) {
    const { isAnswered, values } = answers.egressSupply;
    const path = '/egressSupply';
    const isContradiction =
      values.includes('none after checking') &&
      values.some((supply) => supply !== 'none after checking');
    return [
      ...(values.includes('unknown') ? [{ path, params: { supply: 'unknown' } }] : []),
      ...(isAnswered ? [] : [notAnswered(path)]),
      ...(isContradiction
        ? [{ path, severity: 'open' as const, params: { supply: 'none after checking' } }]
        : []),
    ];
  },
};
