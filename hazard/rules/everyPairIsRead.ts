import { notAnswered, OFF, PROOF } from '../engine/rule';
import type { Hit, Rule } from '../engine/rule';

/**
 * `absence.pairs-missing`: each conductor is tested to each other and to ground
 * at each point of work. The white wire has been the live one.
 */
export const everyPairIsRead: Rule = {
  code: 'absence.pairs-missing',
  severity: 'open',
  stages: PROOF,
  appliesTo: OFF,
  citations: ['nfpa70e.absenceTest', 'face86-35'],
  find({ answers, readings }) {
    const path = '/proof/readings';
    const { pointsOfWork } = answers.job;
    const hits: Hit[] = [];
    if (pointsOfWork === undefined) hits.push(notAnswered('/job/pointsOfWork'));
    for (const { point, missing } of readings.points) {
      if (missing.length === 0) continue;
      const pairs = missing.map((pair) => pair.join('-')).join(', ');
      hits.push({ path, params: { point, pairs } });
    }
    const unnamed = (pointsOfWork ?? 1) - readings.points.length;
    for (let index = 0; index < unnamed; index += 1) {
      const number = readings.points.length + index + 1;
      hits.push({ path, params: { point: '', number } });
    }
    return hits;
  },
};
