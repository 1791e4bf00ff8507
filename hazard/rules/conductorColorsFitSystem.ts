import type { ConductorColor, SystemCode } from '../enumerations';
import { ALL, PLAN_AND_WORK } from '../engine/rule';
import type { Rule } from '../engine/rule';

/** Colours by custom: the electrical code mandates none of them (NEC 210.5(C)). */
const CUSTOM: Readonly<Record<SystemCode, readonly ConductorColor[]>> = {
  '208Y/120': ['black', 'red', 'blue', 'white'],
  '480Y/277': ['brown', 'orange', 'yellow', 'gray'],
  '120/240': ['black', 'red', 'white'],
  '240/120 high-leg': ['black', 'red', 'blue', 'orange', 'white'],
  '480 delta': ['brown', 'orange', 'yellow', 'gray'],
};
const OF_SOME_SYSTEM = new Set(Object.values(CUSTOM).flat());

/**
 * `supply.colors-do-not-fit`: a colour that elsewhere marks another system.
 * Colour is never proof, neither of this nor of the declared system.
 */
export const conductorColorsFitSystem: Rule = {
  code: 'supply.colors-do-not-fit',
  severity: 'caution',
  stages: PLAN_AND_WORK,
  appliesTo: ALL,
  citations: ['practice.conductorColors', 'nec210.5(C)'],
  find({ answers }) {
    const { system, conductorColors } = answers.supply;
    if (system === undefined) return [];
    return conductorColors.values
      .filter((color) => OF_SOME_SYSTEM.has(color) && !CUSTOM[system].includes(color))
      .map((color) => ({ path: '/supply/conductorColors', params: { color, system } }));
  },
};
