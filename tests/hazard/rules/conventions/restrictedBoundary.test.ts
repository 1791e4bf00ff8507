import { describe, expect, it } from 'vitest';
import { BELOW_FIFTY, FAR } from '../../../support/ruleEdits';
import type { Base, Edits } from '../../../support/ruleTable';
import { assessBase, found, gone, unsettled } from '../../../support/ruleTable';

describe('who enters the restricted boundary (convention 7)', () => {
  const glovesAsked = (base: Base, edits: Edits) =>
    found(
      assessBase(base, { ...edits, 'protectiveEquipment/gloves': gone }),
      'shock.gloves-missing',
    ).length > 0;
  it.each<[string, Base, Edits, boolean]>([
    ['O always', 'O', { 'crew/0/closest': 'outside all boundaries' }, true],
    [
      'T test or troubleshoot: who tests',
      'T',
      { 'crew/0/closest': 'outside all boundaries' },
      true,
    ],
    ['T another task: nobody', 'T', FAR, false],
    [
      'T another task: who tests does not count',
      'T',
      { ...FAR, 'job/task': 'trace circuit', 'arcFlash/task': 'operate device' },
      false,
    ],
    ['T: who says restricted', 'T', { ...FAR, 'crew/0/closest': 'restricted' }, true],
    ['T: the helper who says restricted', 'T', { ...FAR, 'crew/1/closest': 'restricted' }, true],
    ['T: the lead while not answered', 'T', { ...FAR, 'crew/0/closest': gone }, true],
    [
      'W repair: the lead while nobody is',
      'W',
      { 'crew/0/closest': 'outside all boundaries' },
      true,
    ],
    [
      'W testing task: nobody',
      'W',
      { ...FAR, 'decision/reason': 'infeasible', 'decision/infeasibleBecause': 'other' },
      false,
    ],
    [
      'W testing task: the lead while not answered',
      'W',
      {
        ...FAR,
        'decision/reason': 'infeasible',
        'decision/infeasibleBecause': 'other',
        'crew/0/closest': gone,
      },
      true,
    ],
    ['W below 50 V: nobody', 'W', { ...BELOW_FIFTY, 'crew/0/closest': 'restricted' }, false],
  ])('%s', (_title, base, edits, expected) => {
    expect(glovesAsked(base, edits)).toBe(expected);
  });

  it('W repair: not the lead where another is restricted', () => {
    const result = assessBase('W', {
      'crew/0/closest': 'outside all boundaries',
      'crew/0/arcRated': false,
      'crew/1/closest': 'restricted',
      'crew/1/qualified': true,
      'crew/1/qualifiedThrough': '2028-01-01',
      'crew/1/arcRated': true,
    });
    expect(unsettled(result)).toEqual([]);
  });
});
