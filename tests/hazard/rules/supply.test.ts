import { describe, expect, it } from 'vitest';
import { CONDUCTOR_COLORS, SYSTEMS, circuitVoltsOf } from '@/hazard';
import {
  ALL,
  assessBase,
  describeRule,
  eachValue,
  found,
  gone,
  onEach,
} from '../../support/ruleTable';

const SPECIAL = [
  'above 480 V',
  'inverter or battery string',
  'solar or storage',
  'utility side',
  'classified location',
  'manhole or vault',
];

describeRule('job.outside-scope', 'own policy; 1910.307, 1910.334(d)', [
  ...onEach(ALL, 'none of these', { 'job/special': ['none of these'] }, []),
  ...SPECIAL.flatMap((special) =>
    onEach(ALL, special, { 'job/special': [special] }, ['stop /job/special*']),
  ),
  [
    'O',
    'beside none of these',
    { 'job/special': ['none of these', 'utility side'] },
    ['stop /job/special*'],
  ],
  [
    'O',
    'two of them, one finding each',
    { 'job/special': ['above 480 V', 'utility side'] },
    ['stop /job/special*', 'stop /job/special*'],
  ],
  ...eachValue(
    ALL,
    'job/special',
    [gone, [], '', 7, {}, ['moon'], ['none of these', 'moon']],
    ['open /job/special*'],
  ),
  [
    'W',
    'a foreign member does not hide the unfavourable one',
    { 'job/special': ['moon', 'manhole or vault'] },
    ['?open /job/special*', 'stop /job/special*', '?open /job/special*'],
  ],
  ['O work', 'at work too', { 'job/special': ['utility side'] }, ['stop /job/special*']],
  ['O close', 'not at close-out', { 'job/special': ['utility side'] }, []],
]);

/** Nothing but the system and the voltage differs from a sound worksheet. */
function supplied(system: string, circuitVolts: unknown) {
  return {
    'supply/system': system,
    'supply/circuitVolts': circuitVolts,
    'supply/readings': gone,
    'supply/conductorColors': gone,
    'arcFlash/clothingRatingCalPerCm2': 40,
  };
}

describeRule('supply.voltage-not-of-system', 'common practice', [
  ...SYSTEMS.flatMap((system) =>
    circuitVoltsOf(system).flatMap((volts) =>
      onEach(ALL, `${system}, ${volts} V`, supplied(system, volts), []),
    ),
  ),
  ...(
    [
      ['480Y/277', 120],
      ['480 delta', 277],
      ['208Y/120', 277],
      ['208Y/120', 240],
      ['120/240', 208],
      ['240/120 high-leg', 208],
      ['208Y/120', 0],
    ] as const
  ).flatMap(([system, volts]) =>
    onEach(
      ALL,
      `${system}, ${volts} V`,
      supplied(system, volts),
      ['stop /supply/circuitVolts'],
      ['arc.*', 'shock.gloves-class', 'absence.meter-category'],
    ),
  ),
  ...eachValue(
    ALL,
    'supply/circuitVolts',
    [gone, 'x', NaN, -120, Infinity],
    ['open /supply/circuitVolts'],
    ['shock.*', 'arc.*', 'absence.*', 'sources.*'],
  ),
  ...eachValue(
    ALL,
    'supply/system',
    [gone, '', '600Y/347', 208],
    ['open /supply/system'],
    ['shock.*', 'arc.*', 'absence.*', 'supply.readings-do-not-fit'],
  ),
]);

describeRule('supply.readings-do-not-fit', 'ANSI C84.1', [
  ...onEach(ALL, 'none given', { 'supply/readings': gone }, []),
  ...onEach(
    ALL,
    'both lists empty',
    { 'supply/readings': { phaseToPhase: [], phaseToNeutral: [] } },
    [],
  ),
  ...onEach(ALL, 'only phase to neutral', { 'supply/readings': { phaseToNeutral: [119] } }, []),
  ...onEach(
    ALL,
    'another system',
    { 'supply/readings': { phaseToPhase: [480], phaseToNeutral: [277] } },
    ['stop /supply/readings*'],
  ),
  ...onEach(
    ALL,
    'one of them does not fit',
    { 'supply/readings': { phaseToPhase: [208, 240, 208] } },
    ['stop /supply/readings*'],
  ),
  ...onEach(ALL, 'zeros', { 'supply/readings': { phaseToPhase: [0], phaseToNeutral: [0] } }, [
    'stop /supply/readings*',
  ]),
  ...onEach(
    ALL,
    'a foreign member does not hide what does not fit',
    { 'supply/readings': { phaseToPhase: [480, 'x'] } },
    ['stop /supply/readings*'],
  ),
  ['O', 'the system is not answered', { 'supply/system': gone }, ['open /supply*'], ['*']],
  [
    'O',
    'the quotient is that of 120/240',
    { 'supply/readings': { phaseToPhase: [208], phaseToNeutral: [105] } },
    ['stop /supply/readings*'],
  ],
]);

describeRule('supply.high-leg', 'NEC 110.15', [
  ...onEach(ALL, 'the declared system', supplied('240/120 high-leg', 120), ['caution /supply*']),
  ...onEach(ALL, 'another system', {}, []),
  ...(
    [
      [180, 1],
      [208, 1],
      [220, 1],
      [179.9, 0],
      [220.1, 0],
    ] as const
  ).map(([volts, count]): Parameters<typeof describeRule>[2][number] => [
    'O',
    `${volts} V to neutral`,
    { 'supply/readings': { phaseToNeutral: [volts] } },
    count ? ['caution /supply/readings*'] : [],
    ['supply.readings-do-not-fit'],
  ]),
]);

const CUSTOM: Record<string, string[]> = {
  '208Y/120': ['black', 'red', 'blue', 'white'],
  '120/240': ['black', 'red', 'white'],
  '240/120 high-leg': ['black', 'red', 'blue', 'orange', 'white'],
  '480Y/277': ['brown', 'orange', 'yellow', 'gray'],
  '480 delta': ['brown', 'orange', 'yellow', 'gray'],
};
const OF_NO_SYSTEM = ['green', 'bare', 'other'];

describeRule('supply.colors-do-not-fit', 'common practice; NEC 210.5(C)', [
  ...SYSTEMS.flatMap((system) =>
    CONDUCTOR_COLORS.map((color): Parameters<typeof describeRule>[2][number] => [
      'O',
      `${color} in ${system}`,
      { ...supplied(system, circuitVoltsOf(system)[0]), 'supply/conductorColors': [color] },
      CUSTOM[system]?.includes(color) || OF_NO_SYSTEM.includes(color)
        ? []
        : ['caution /supply/conductorColors*'],
    ]),
  ),
  ...onEach(
    ALL,
    'one finding for each color',
    { 'supply/conductorColors': ['black', 'brown', 'green', 'yellow'] },
    ['caution /supply/conductorColors*', 'caution /supply/conductorColors*'],
  ),
  ...onEach(ALL, 'beside a foreign member', { 'supply/conductorColors': ['moon', 'brown'] }, [
    'caution /supply/conductorColors*',
  ]),
  ...onEach(ALL, 'no colors', { 'supply/conductorColors': gone }, []),
]);

describeRule('supply.tripped', '1910.334(b)(2)', [
  ...eachValue(ALL, 'supply/tripped', ['no', 'cause found and repaired'], []),
  ...eachValue(['W', 'W work'], 'supply/tripped', ['cause not found'], ['stop /supply/tripped']),
  ...eachValue(
    ['O', 'T', 'O work'],
    'supply/tripped',
    ['cause not found'],
    ['caution /supply/tripped'],
  ),
  ...eachValue(ALL, 'supply/tripped', [gone, '', 'yes', true], ['open /supply/tripped']),
  ['O close', 'restored, not repaired', { 'supply/tripped': 'cause not found' }, ['stop']],
  [
    'O close',
    'restored, said not to be repaired',
    { 'supply/tripped': 'cause not found', 'closeOut/faultRepaired': false },
    ['stop'],
  ],
  [
    'O close',
    'restored and repaired',
    { 'supply/tripped': 'cause not found', 'closeOut/faultRepaired': true },
    [],
  ],
  ['O close', 'left open', { 'supply/tripped': 'cause not found', 'closeOut/restored': false }, []],
  ['O close', 'restored, not answered', { 'supply/tripped': gone }, ['open /supply/tripped']],
  ['O close', 'no trip', {}, []],
  ['W close', 'restored, not repaired', { 'supply/tripped': 'cause not found' }, ['stop']],
]);

describe('expected load (single phase, power factor 1)', () => {
  it('is the watts over the circuit voltage', () => {
    expect(assessBase('O').expected.loadAmperes).toBeCloseTo(5, 6);
    expect(assessBase('O', { 'supply/watts': gone }).expected.loadAmperes).toBeNull();
  });

  it('never asks for the watts', () => {
    expect(found(assessBase('O', { 'supply/watts': gone }), 'supply.unanswered')).toEqual([]);
  });
});
