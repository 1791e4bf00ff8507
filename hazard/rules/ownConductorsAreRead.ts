import type { Facts } from '../engine/facts';
import { pointsReached } from '../engine/readings';
import { OFF, PROOF } from '../engine/rule';
import type { Rule } from '../engine/rule';
import { sourceParams } from '../engine/sources';
import type { Source } from '../engine/sources';

/** What a source's own conductor is still to be read to at a point, by name. */
function unread(source: Source, point: string, { readings }: Facts): readonly string[] {
  const read = readings.readTo(source, point);
  const phases = readings.points.find((one) => one.point === point)?.set.phases ?? ['A'];
  return ['G', ...phases].filter((conductor) => !read.has(conductor));
}

/**
 * `absence.source-not-tested`: the circuit's own readings say nothing of the
 * conductors that another source feeds at the same point.
 */
export const ownConductorsAreRead: Rule = {
  code: 'absence.source-not-tested',
  severity: 'open',
  stages: PROOF,
  appliesTo: OFF,
  citations: ['osha1910.333(b)(2)(iv)(B)', 'nfpa70e.absenceTest'],
  find(facts) {
    return facts.sources
      .filter(({ hasOwnConductors }) => hasOwnConductors)
      .flatMap((source) => {
        const reached = pointsReached(source, facts.readings.points);
        return (reached.length === 0 ? [''] : reached).flatMap((point) => {
          const missing = unread(source, point, facts);
          if (missing.length === 0) return [];
          const params = { ...sourceParams(source), point, to: missing.join(', ') };
          return [{ path: '/proof/readings', params }];
        });
      });
  },
};
