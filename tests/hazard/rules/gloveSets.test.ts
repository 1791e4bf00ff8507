import { describe, expect, it } from 'vitest';
import { FAR, GLOVE_SET, SECOND_QUALIFIED } from '../../support/ruleEdits';
import type { Base, Edits } from '../../support/ruleTable';
import { assessBase, found, gone } from '../../support/ruleTable';

const GLOVES = 'protectiveEquipment/gloves';
const TWO_INSIDE: Edits = { ...SECOND_QUALIFIED, 'crew/1/closest': 'restricted' };

const rows: [title: string, base: Base, edits: Edits, code: string, expected: string[]][] = [
  [
    'the only one inside has none',
    'T',
    { [GLOVES]: gone },
    'shock.gloves-missing',
    ['open /protectiveEquipment/gloves'],
  ],
  [
    'two are inside, one set for both',
    'T',
    TWO_INSIDE,
    'shock.gloves-missing',
    ['stop /crew/1/gloves'],
  ],
  [
    'two are inside, one set, out of test: it is the worksheet’s',
    'T',
    { ...TWO_INSIDE, [`${GLOVES}/lastTestedOn`]: '2025-01-01' },
    'shock.gloves-overdue',
    ['stop /protectiveEquipment/gloves/lastTestedOn'],
  ],
  [
    'two are inside, no set',
    'T',
    { ...TWO_INSIDE, [GLOVES]: gone },
    'shock.gloves-missing',
    ['open /crew/0/gloves', 'open /crew/1/gloves'],
  ],
  [
    'two are inside, the first with a set of their own',
    'T',
    { ...TWO_INSIDE, 'crew/0/gloves': GLOVE_SET },
    'shock.gloves-missing',
    [],
  ],
  [
    'the set of the second is out of test',
    'T',
    {
      ...TWO_INSIDE,
      'crew/1/gloves': { ...GLOVE_SET, lastTestedOn: '2025-01-01', issuedOn: gone },
    },
    'shock.gloves-overdue',
    ['stop /crew/1/gloves/lastTestedOn'],
  ],
  [
    'nobody is named yet, and someone goes in: the set is out of test',
    'T',
    { crew: [], [`${GLOVES}/lastTestedOn`]: '2025-01-01' },
    'shock.gloves-overdue',
    ['stop /protectiveEquipment/gloves/lastTestedOn'],
  ],
  [
    'nobody is named yet, and someone goes in without a set',
    'T',
    { crew: [], [GLOVES]: gone },
    'shock.gloves-missing',
    ['open /protectiveEquipment/gloves'],
  ],
  [
    'nobody is named, and nobody goes in',
    'T',
    { ...FAR, crew: [], [GLOVES]: gone },
    'shock.gloves-missing',
    [],
  ],
];

describe('whose gloves are judged (29 CFR 1910.137: each worker wears a set)', () => {
  it.each(rows)('%s', (_, base, edits, code, expected) => {
    expect(found(assessBase(base, edits), code)).toEqual(expected);
  });

  it.each([
    ['a circuit alone', {}, 120],
    ['whole equipment', { 'supply/exposure': 'whole equipment' }, 208],
  ] as const)('counts the highest voltage of %s', (_, edits, volts) => {
    const gloves = assessBase('T', edits).equipment.find(
      ({ id }) => id === 'rubber-insulating-gloves',
    );
    expect(gloves?.params['volts']).toBe(volts);
  });

  it('names the class for the highest voltage of the glove table (Table I-4: class 4, 36 000 V)', () => {
    const at = (volts: number) =>
      assessBase('T', { 'supply/circuitVolts': volts }).equipment.find(
        ({ id }) => id === 'rubber-insulating-gloves',
      )?.params;
    expect(at(36_000)).toEqual({ class: '4', volts: 36_000 });
    expect(at(36_001)).toEqual({});
  });
});
