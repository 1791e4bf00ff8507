import { OFF, PLAN_AND_WORK } from '../engine/rule';
import type { Rule } from '../engine/rule';
import { isStandby, sourceParams } from '../engine/sources';

/**
 * `sources.transfer-starts`: opening the normal supply makes the standby source
 * start. Luminaires that stay lit are expected, and no proof of a wrong breaker.
 */
export const transferStartsOnOpening: Rule = {
  code: 'sources.transfer-starts',
  severity: 'caution',
  stages: PLAN_AND_WORK,
  appliesTo: OFF,
  citations: ['nec700.12'],
  find({ sources }) {
    return sources
      .filter(isStandby)
      .map((source) => ({ path: `/sources/${source.index}/kind`, params: sourceParams(source) }));
  },
};
