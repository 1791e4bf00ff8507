import { ALL, notAnswered, PLAN_AND_WORK } from '../engine/rule';
import type { Hit, Rule } from '../engine/rule';

/**
 * `surroundings.barricade`: people are kept outside the larger of the limited
 * and the arc flash boundary. A barricade nearer than that draws them in,
 * whether someone stands there or not.
 */
export const peopleAreKeptAway: Rule = {
  code: 'surroundings.barricade',
  severity: 'open',
  stages: PLAN_AND_WORK,
  appliesTo: ALL,
  appliesBelowFiftyVolts: false,
  citations: ['osha1910.335(b)(2)', 'osha1910.335(b)(3)', 'nfpa70e.barricade'],
  find({ answers, distances }): Hit[] {
    const { peopleMayApproach, barricadeInches, attendant } = answers.surroundings;
    const path = '/surroundings/barricadeInches';
    const { barricade, isBarricadeOpen } = distances;
    if (peopleMayApproach === false) return [];
    const required: NonNullable<Hit['params']> =
      barricade === null ? {} : { requiredInches: barricade.inches };
    if (barricadeInches === undefined) {
      return attendant === true ? [] : [notAnswered(path, required)];
    }
    const params = { inches: barricadeInches, ...required };
    if (barricade !== null && barricadeInches < barricade.inches) {
      return [{ path, severity: 'stop', params }];
    }
    return isBarricadeOpen ? [{ path, params }] : [];
  },
};
