import { ALL, notAnswered, PLAN_AND_WORK } from '../engine/rule';
import type { Rule } from '../engine/rule';
import { personParams } from '../engine/people';

/** `crew.training-lapsed`: training is repeated after 36 months; the day it holds through is on record. */
export const trainingIsCurrent: Rule = {
  code: 'crew.training-lapsed',
  severity: 'stop',
  stages: PLAN_AND_WORK,
  appliesTo: ALL,
  citations: ['nfpa70e.training'],
  find({ day, people }) {
    return people.crew.flatMap((person) => {
      if (person.qualified !== true) return [];
      const path = `/crew/${person.index}/qualifiedThrough`;
      const params = personParams(person);
      const { qualifiedThrough } = person;
      if (qualifiedThrough === undefined) return [notAnswered(path, params)];
      if (qualifiedThrough >= day) return [];
      return [{ path, params: { ...params, qualifiedThrough, day } }];
    });
  },
};
