import { gloveStatus } from '../gloves';
import { glovesInUse } from '../engine/gloves';
import { ALL, notAnswered, PLAN_AND_WORK } from '../engine/rule';
import type { Rule } from '../engine/rule';

/** `shock.gloves-class`: the class is enough phase-to-phase; phase-to-ground is never used. */
export const glovesAreOfClass: Rule = {
  code: 'shock.gloves-class',
  severity: 'stop',
  stages: PLAN_AND_WORK,
  appliesTo: ALL,
  appliesBelowFiftyVolts: false,
  citations: ['osha1910.137.tableI-4'],
  find(facts) {
    const { day, edition, voltage } = facts;
    return glovesInUse(facts).flatMap(({ gloves, params, path }) => {
      const { gloveClass } = gloves;
      const at = `${path}/gloveClass`;
      if (gloveClass === undefined) return [notAnswered(at, params)];
      // While no voltage is answered the supply is what is open.
      const volts = voltage.gloveVolts ?? 0;
      const status = gloveStatus({ gloveClass, lastTestedOn: day, on: day, volts }, edition);
      return status.adequate ? [] : [{ path: at, params: { ...params, class: gloveClass, volts } }];
    });
  },
};
