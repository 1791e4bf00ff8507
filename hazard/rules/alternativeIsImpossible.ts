import { ENERGIZED, notAnswered, PLAN_AND_WORK } from '../engine/rule';
import type { Hit, Rule } from '../engine/rule';

/**
 * `decision.alternative-possible`: whoever runs the building was asked for an
 * outage, and where darkness is the hazard no temporary light can be brought.
 */
export const alternativeIsImpossible: Rule = {
  code: 'decision.alternative-possible',
  severity: 'stop',
  stages: PLAN_AND_WORK,
  appliesTo: ENERGIZED,
  citations: ['osha1910.333(a)(1).note1', 'own.outageAsked'],
  find({ answers }) {
    const { reason, outageRefusedBy, hazard, temporaryLight } = answers.decision;
    if (reason === 'below 50 V') return [];
    const hits: Hit[] = [];
    if (reason === 'additional hazard') {
      if (hazard === undefined) hits.push(notAnswered('/decision/hazard'));
      const path = '/decision/temporaryLight';
      if (hazard === 'illumination') {
        if (temporaryLight === undefined) hits.push(notAnswered(path));
        if (temporaryLight === 'possible') hits.push({ path });
      }
    }
    if (outageRefusedBy === undefined) {
      hits.unshift({ ...notAnswered('/decision/outageRefusedBy'), citation: 'own.outageAsked' });
    }
    return hits;
  },
};
