import { notAnswered, OFF, PLAN_AND_WORK } from '../engine/rule';
import type { Hit, Rule } from '../engine/rule';
import { isOpened, sourceParams } from '../engine/sources';
import type { Source } from '../engine/sources';

/** Whether the way in which a source is held open is admitted; undefined while that cannot be said. */
function isHeldWell(source: Source, asksTagToo: boolean): boolean | undefined {
  const { held, openedAt, extraMeasure } = source;
  if (held === 'tag') return extraMeasure !== undefined;
  if (held === 'lock') return !asksTagToo;
  if (held !== 'exclusive control') return held === 'lock and tag';
  return openedAt && (openedAt === 'plug' || openedAt === 'battery connector');
}

/**
 * `sources.not-locked`: each source is held open by lock and tag. A lock alone
 * is for one device and one shift, a tag alone needs a further measure, and
 * only a plug or a battery connector may stay in the hands of one person.
 */
export const sourceIsLocked: Rule = {
  code: 'sources.not-locked',
  severity: 'stop',
  stages: PLAN_AND_WORK,
  appliesTo: OFF,
  citations: ['osha1910.333(b)(2)(iii)', 'osha1910.147(a)(2)(iii)(A)', 'own.batteryConnector'],
  find({ answers, sources }) {
    const asksTagToo = sources.filter(isOpened).length > 1 || answers.job.crossesShift === true;
    return sources.flatMap((source): Hit[] => {
      const { index, held, lockNumber } = source;
      const path = `/sources/${index}/held`;
      const params = { ...sourceParams(source), ...(held === undefined ? {} : { held }) };
      if (held === undefined) return [notAnswered(path, params)];
      const hits: Hit[] = [];
      const isWell = isHeldWell(source, asksTagToo);
      if (isWell === undefined) hits.push(notAnswered(`/sources/${index}/openedAt`, params));
      if (isWell === false) hits.push({ path, params });
      const hasLock = held === 'lock' || held === 'lock and tag';
      if (hasLock && lockNumber === undefined) {
        hits.push(notAnswered(`/sources/${index}/lockNumber`, params));
      }
      return hits;
    });
  },
};
