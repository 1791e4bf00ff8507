import { pointsReached } from '../engine/readings';
import { OFF, PROOF } from '../engine/rule';
import type { Rule } from '../engine/rule';
import { hasBattery, sourceParams } from '../engine/sources';

/** `absence.dc-not-tested`: an AC range does not see a battery or a driver's output. */
export const directCurrentIsRead: Rule = {
  code: 'absence.dc-not-tested',
  severity: 'open',
  stages: PROOF,
  appliesTo: OFF,
  citations: ['practice.directCurrent', 'osha1910.333(b)(2)(iv)(B)'],
  find({ readings, sources }) {
    return sources.filter(hasBattery).flatMap((source) => {
      const reached = pointsReached(source, readings.points);
      return (reached.length === 0 ? [''] : reached)
        .filter((point) => !readings.hasDirectCurrent(source, point))
        .map((point) => ({
          path: '/proof/readings',
          params: { ...sourceParams(source), point },
        }));
    });
  },
};
