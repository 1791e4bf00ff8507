import { notAnswered, OFF, PLAN_AND_WORK } from '../engine/rule';
import type { Hit, Rule } from '../engine/rule';
import { sourceParams } from '../engine/sources';

/**
 * `sources.battery-connected`: a battery unit is opened at its connector only.
 * Its output may be at lamp or line voltage while every breaker is off; one
 * whose connector cannot be parted cannot be isolated on this worksheet.
 */
export const batteryIsParted: Rule = {
  code: 'sources.battery-connected',
  severity: 'stop',
  stages: PLAN_AND_WORK,
  appliesTo: OFF,
  citations: ['practice.batteryUnit', 'osha1910.333(b)(2)(ii)(B)'],
  find({ answers, sources }) {
    const batteries = sources.filter(({ kind }) => kind === 'battery unit');
    if (batteries.length === 0 && answers.job.task === 'replace battery unit') {
      return [{ path: '/sources', severity: 'open', params: { kind: 'battery unit' } }];
    }
    return batteries.flatMap((source): Hit[] => {
      const path = `/sources/${source.index}/openedAt`;
      const params = sourceParams(source);
      if (source.openedAt === undefined) return [notAnswered(path, params)];
      return source.openedAt === 'battery connector' ? [] : [{ path, params }];
    });
  },
};
