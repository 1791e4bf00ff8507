import { OFF, PLAN_AND_WORK } from '../engine/rule';
import { sourceParams } from '../engine/sources';
import type { Rule } from '../engine/rule';

/**
 * `sources.switch-only`: a wall switch, taped or not, and a control device are
 * never the sole means of opening a source. They leave conductors live, and
 * anyone or anything may close them.
 */
export const switchIsNoIsolation: Rule = {
  code: 'sources.switch-only',
  severity: 'stop',
  stages: PLAN_AND_WORK,
  appliesTo: OFF,
  citations: ['own.switchIsNoIsolation', 'osha1910.333(b)(2)(ii)(B)'],
  find({ sources }) {
    return sources.flatMap((source) => {
      const { index, openedAt } = source;
      if (openedAt !== 'wall switch' && openedAt !== 'control device') return [];
      return [
        { path: `/sources/${index}/openedAt`, params: { ...sourceParams(source), openedAt } },
      ];
    });
  },
};
