import { notAnswered, OFF, PLAN_AND_WORK } from '../engine/rule';
import { sourceParams } from '../engine/sources';
import type { Rule } from '../engine/rule';

/** `sources.not-opened`: every source is opened. A battery unit has a rule of its own. */
export const sourceIsOpened: Rule = {
  code: 'sources.not-opened',
  severity: 'stop',
  stages: PLAN_AND_WORK,
  appliesTo: OFF,
  citations: ['osha1910.333(b)(2)(ii)(B)'],
  find({ sources }) {
    return sources.flatMap((source) => {
      const path = `/sources/${source.index}/openedAt`;
      const params = sourceParams(source);
      if (source.kind === 'battery unit') return [];
      if (source.openedAt === undefined) return [notAnswered(path, params)];
      return source.openedAt === 'none' ? [{ path, params }] : [];
    });
  },
};
