import { notAnswered, OFF_AND_ENERGIZED, PLAN_AND_WORK } from '../engine/rule';
import type { Hit, Rule } from '../engine/rule';

/**
 * `sources.control-unlisted`: sensors, relays, dimming and emergency transfer
 * relays are often fed from another panel, and able to energize the circuit.
 */
export const controlsAreListed: Rule = {
  code: 'sources.control-unlisted',
  severity: 'open',
  stages: PLAN_AND_WORK,
  appliesTo: OFF_AND_ENERGIZED,
  citations: ['nec700.26', 'practice.controls'],
  find({ answers, sources }) {
    const { isAnswered, values } = answers.supply.switching;
    const hits: Hit[] = isAnswered ? [] : [notAnswered('/supply/switching')];
    const isControlled = values.includes('automatic') || values.includes('not known');
    if (isControlled && !sources.some(({ kind }) => kind === 'control')) {
      hits.push({ path: '/sources', params: { kind: 'control' } });
    }
    return hits;
  },
};
