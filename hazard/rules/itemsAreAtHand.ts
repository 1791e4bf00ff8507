import { answeredValues } from '../engine/read';
import { ALL, PLAN_AND_WORK } from '../engine/rule';
import type { Rule } from '../engine/rule';

/** `equipment.not-at-hand`: what is not there when the work begins is done without. */
export const itemsAreAtHand: Rule = {
  code: 'equipment.not-at-hand',
  severity: 'open',
  stages: PLAN_AND_WORK,
  appliesTo: ALL,
  citations: ['osha1910.335(a)(1)', 'osha1910.335(a)(2)', 'nfpa70e.protectiveEquipment'],
  find({ answers, items }) {
    const ready = answeredValues(answers.protectiveEquipment.ready);
    return items
      .filter(({ id }) => !ready.includes(id))
      .map(({ id, params }) => ({
        path: '/protectiveEquipment/ready',
        params: { ...params, item: id },
      }));
  },
};
