import { isInsideArcFlashBoundary } from '../engine/facts';
import { ALL, notAnswered, PLAN_AND_WORK } from '../engine/rule';
import type { Hit, Rule } from '../engine/rule';
import { personParams } from '../engine/people';

/**
 * `arc.bystander-inside`: an arc flash burns whoever is inside its boundary, not
 * only the one who works.
 */
export const bystandersAreArcRated: Rule = {
  code: 'arc.bystander-inside',
  severity: 'stop',
  stages: PLAN_AND_WORK,
  appliesTo: ALL,
  appliesBelowFiftyVolts: false,
  citations: ['nfpa70e.arcFlashAssessment', 'nfpa70e.protectiveEquipment'],
  find({ arc, distances, people }) {
    if (arc.result.requiredArcRatingCalPerCm2 === null) return [];
    return people.crew.flatMap((person): Hit[] => {
      if (person.arcRated === true) return [];
      const path = `/crew/${person.index}`;
      const params = personParams(person);
      const isInside = isInsideArcFlashBoundary(person, arc, distances);
      if (isInside === undefined) return [notAnswered(`${path}/closest`, params)];
      return isInside ? [{ path: `${path}/arcRated`, params }] : [];
    });
  },
};
