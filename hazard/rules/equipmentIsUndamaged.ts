import { ALL, notAnswered, PLAN_AND_WORK } from '../engine/rule';
import type { Rule } from '../engine/rule';

/**
 * `equipment.damaged`: damaged equipment is not worked on energized. With the
 * circuit off, or tested, the next device upstream is the one to open.
 */
export const equipmentIsUndamaged: Rule = {
  code: 'equipment.damaged',
  severity: 'stop',
  stages: PLAN_AND_WORK,
  appliesTo: ALL,
  citations: ['nfpa70e.normalCondition', 'nfpa70e.likelihood'],
  find({ answers, path: workPath }) {
    const path = '/supply/damage';
    const { damage } = answers.supply;
    if (damage === undefined) return [notAnswered(path)];
    if (!damage) return [];
    return [{ path, severity: workPath === 'energized' ? 'stop' : 'caution' }];
  },
};
