import { describe, expect, it } from 'vitest';
import { FAR } from '../../support/ruleEdits';
import { assessBase, gone } from '../../support/ruleTable';

const TASK = 'arcFlash/task';
const COVERS = 'arcFlash/normal/coversOn';
/** Nothing above 24 V is exposed, and that was not given as the reason for working live. */
const LOW = {
  'decision/reason': 'infeasible',
  'supply/workVolts': 24,
  'supply/higherVoltsExposed': false,
};

describe('the floor counts while the chosen task does not fit (task table)', () => {
  it.each([
    ['T', { [TASK]: 'read panel meter' }],
    ['W', { [TASK]: 'read panel meter' }],
    ['O', { [TASK]: 'read panel meter' }],
    ['O', {}],
    // Switched off, the absence test is what is done, whatever the job.
    ['O', FAR],
    ['T', { [TASK]: undefined }],
    ['W', { [TASK]: undefined }],
    ['T', { ...FAR, 'crew/0/closest': 'restricted' }],
    ['T', { ...FAR, [TASK]: 'control circuit up to 125 V' }],
  ] as const)('%s %o: likely, category 1', (base, edits) => {
    const { likely, ppeCategory } = assessBase(base, edits).arcFlash;
    expect({ likely, ppeCategory }).toEqual({ likely: true, ppeCategory: 1 });
  });

  it('nothing is likely in an inspection from outside with covers on', () => {
    expect(assessBase('T', FAR).arcFlash).toMatchObject({
      likely: false,
      method: 'not likely',
      ppeCategory: null,
      requiredArcRatingCalPerCm2: null,
      arcFlashBoundary: null,
    });
  });

  it.each([
    'installed',
    'maintained',
    'ratedForFault',
    'usedAsListed',
    'doorsClosed',
    'coversOn',
    'noSignOfFailure',
  ])('the condition is abnormal without %s', (part) => {
    const edits = { ...FAR, [TASK]: 'operate device' };
    expect(assessBase('T', edits).arcFlash.likely).toBe(false);
    expect(assessBase('T', { ...edits, [`arcFlash/normal/${part}`]: false }).arcFlash.likely).toBe(
      true,
    );
    expect(assessBase('T', { ...edits, [`arcFlash/normal/${part}`]: gone }).arcFlash.likely).toBe(
      true,
    );
  });

  it('damage makes the condition abnormal', () => {
    expect(
      assessBase('T', { ...FAR, [TASK]: 'operate device', 'supply/damage': true }).arcFlash.likely,
    ).toBe(true);
  });
});

// The tasks of the table are likely or not whatever is done beside them: the job asks for the worst.
describe('what the job counts as, whatever task was chosen (70E Table 130.5(C))', () => {
  it.each([
    [
      'off: the absence test, though the job is an inspection with the covers on',
      'O',
      {
        'job/task': 'inspect',
        [TASK]: 'read panel meter',
      },
      true,
    ],
    [
      'off: the absence test, though the lighting control is at 24 V',
      'O',
      {
        ...LOW,
        'job/task': 'work on lighting control',
        [TASK]: 'control circuit up to 125 V',
      },
      true,
    ],
    [
      'live work on a lamp at 24 V',
      'W',
      {
        ...LOW,
        'job/task': 'replace lamp',
        [TASK]: 'control circuit up to 125 V',
      },
      true,
    ],
    [
      'live work on lighting control at 24 V',
      'W',
      {
        ...LOW,
        'job/task': 'work on lighting control',
        [TASK]: 'control circuit up to 125 V',
      },
      false,
    ],
    [
      'an inspection with a cover off',
      'T',
      { ...FAR, [TASK]: 'read panel meter', [COVERS]: false },
      true,
    ],
    ['an inspection with the covers on', 'T', { ...FAR, [TASK]: 'read panel meter' }, false],
    [
      'tracing, as an inspection from outside, with a cover off',
      'T',
      {
        ...FAR,
        'job/task': 'trace circuit',
        [COVERS]: false,
      },
      true,
    ],
    [
      'tracing from outside with the covers on',
      'T',
      { ...FAR, 'job/task': 'trace circuit' },
      false,
    ],
  ] as const)('%s', (_, base, edits, likely) => {
    expect(assessBase(base, edits).arcFlash.likely).toBe(likely);
  });
});
