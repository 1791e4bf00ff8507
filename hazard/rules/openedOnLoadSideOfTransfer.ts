import { notAnswered, OFF, PLAN_AND_WORK } from '../engine/rule';
import type { Hit, Rule } from '../engine/rule';
import { isBehindTransfer, sourceParams } from '../engine/sources';

/**
 * `sources.opened-before-transfer`: opened on the supply side of transfer
 * equipment the circuit comes alive again within seconds. The branch breaker
 * on the load side is the one to open.
 */
export const openedOnLoadSideOfTransfer: Rule = {
  code: 'sources.opened-before-transfer',
  severity: 'stop',
  stages: PLAN_AND_WORK,
  appliesTo: OFF,
  citations: ['nec700.12', 'nec700.5'],
  find({ sources }) {
    const hasStandby = sources.some(isBehindTransfer);
    return sources.flatMap((source): Hit[] => {
      const path = `/sources/${source.index}/upstreamOfTransfer`;
      const params = sourceParams(source);
      if (source.upstreamOfTransfer === true) return [{ path, params }];
      const isAsked = hasStandby && source.kind === 'normal';
      return isAsked && source.upstreamOfTransfer === undefined ? [notAnswered(path, params)] : [];
    });
  },
};
