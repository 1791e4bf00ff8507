import { ALL, PLAN_AND_WORK } from '../engine/rule';
import type { Rule } from '../engine/rule';

/**
 * `supply.high-leg`: one phase of a high-leg delta reads 208 V to neutral. It
 * is never a lighting circuit, and whoever takes it for one burns the lamps.
 */
export const highLegIsPointedOut: Rule = {
  code: 'supply.high-leg',
  severity: 'caution',
  stages: PLAN_AND_WORK,
  appliesTo: ALL,
  citations: ['nec110.15'],
  find({ answers }) {
    const { system, readings } = answers.supply;
    if (system === '240/120 high-leg') return [{ path: '/supply/system', params: { system } }];
    const volts = readings.phaseToNeutral.values.find((read) => read >= 180 && read <= 220);
    if (volts === undefined) return [];
    return [{ path: '/supply/readings/phaseToNeutral', params: { volts } }];
  },
};
