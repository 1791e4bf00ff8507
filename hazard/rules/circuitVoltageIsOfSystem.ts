import { ALL, notAnswered, PLAN_AND_WORK } from '../engine/rule';
import type { Rule } from '../engine/rule';

/**
 * `supply.voltage-not-of-system`: 120 V in a 480Y/277 building comes from a
 * transformer, which is another system.
 */
export const circuitVoltageIsOfSystem: Rule = {
  code: 'supply.voltage-not-of-system',
  severity: 'stop',
  stages: PLAN_AND_WORK,
  appliesTo: ALL,
  citations: ['practice.systemVolts'],
  find({ answers, voltage }) {
    const { system, circuitVolts } = answers.supply;
    if (system === undefined || circuitVolts === undefined) {
      return [
        ...(system === undefined ? [notAnswered('/supply/system')] : []),
        ...(circuitVolts === undefined ? [notAnswered('/supply/circuitVolts')] : []),
      ];
    }
    if (voltage.isOfSystem) return [];
    return [{ path: '/supply/circuitVolts', params: { volts: circuitVolts, system } }];
  },
};
