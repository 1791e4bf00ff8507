import { notAnswered, OFF, PLAN_AND_WORK } from '../engine/rule';
import type { Hit, Rule } from '../engine/rule';

/**
 * `surroundings.egress-dark`: emergency lighting goes out with this circuit, in
 * an occupied building. Whoever runs it is told, and made good it is.
 */
export const egressStaysLit: Rule = {
  code: 'surroundings.egress-dark',
  severity: 'open',
  stages: PLAN_AND_WORK,
  appliesTo: OFF,
  citations: ['osha1910.37', 'nfpa101.7.9'],
  find({ answers, isEmergencyLighting }) {
    if (!isEmergencyLighting || answers.job.occupied === false) return [];
    const { toldTo, interim } = answers.egress;
    const hits: Hit[] = [];
    if (toldTo === undefined) hits.push(notAnswered('/egress/toldTo'));
    if (interim === undefined) hits.push(notAnswered('/egress/interim'));
    return hits.length > 0 ? hits : [{ path: '/egress', severity: 'caution' }];
  },
};
