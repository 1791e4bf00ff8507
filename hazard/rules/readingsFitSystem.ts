import { identifySystem } from '../identifySystem';
import { ALL, notAnswered, PLAN_AND_WORK } from '../engine/rule';
import type { Rule } from '../engine/rule';

/**
 * `supply.readings-do-not-fit`: what was read on the live supply is not what
 * was declared. These are never the zeros of the absence test.
 */
export const readingsFitSystem: Rule = {
  code: 'supply.readings-do-not-fit',
  severity: 'stop',
  stages: PLAN_AND_WORK,
  appliesTo: ALL,
  citations: ['ansiC84'],
  find({ answers, edition }) {
    const { system, readings } = answers.supply;
    const phaseToPhase = readings.phaseToPhase.values;
    const phaseToNeutral = readings.phaseToNeutral.values;
    if (phaseToPhase.length + phaseToNeutral.length === 0) return [];
    if (system === undefined) return [notAnswered('/supply/system')];
    const fitting = identifySystem({ phaseToPhase, phaseToNeutral }, edition);
    if (fitting.includes(system)) return [];
    return [{ path: '/supply/readings', params: { system, fits: fitting.join(', ') } }];
  },
};
