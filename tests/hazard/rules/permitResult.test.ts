import { describe, expect, it } from 'vitest';
import { JOB_TASKS } from '@/hazard';
import { BELOW_FIFTY, FAR } from '../../support/ruleEdits';
import type { Base, Edits } from '../../support/ruleTable';
import { assessBase, gone } from '../../support/ruleTable';

/** The same inspection for a reason that makes it a worksheet of the W path. */
const FAR_W: Edits = {
  ...FAR,
  'decision/reason': 'infeasible',
  'decision/infeasibleBecause': 'continuous industrial process',
};
const FIRST = '130.2(C)(1)';
const SECOND = '130.2(C)(2)';

type Row = [base: Base, title: string, edits: Edits, permit: object];
const ROWS: Row[] = [
  ['O', 'circuit off', {}, { required: false, exemption: FIRST, because: 'absence test' }],
  [
    'O',
    'mode not answered',
    { 'decision/mode': gone },
    { required: false, exemption: FIRST, because: 'absence test' },
  ],
  ['T', 'testing', {}, { required: false, exemption: FIRST }],
  ['T', 'tracing', { 'job/task': 'trace circuit' }, { required: false, exemption: FIRST }],
  ['T', 'inspecting from outside, covers on', FAR, { required: false, exemption: SECOND }],
  [
    'T',
    'tracing from outside, covers on',
    { ...FAR, 'job/task': 'trace circuit' },
    { required: false, exemption: FIRST, because: 'testing' },
  ],
  [
    'W',
    'nobody is named yet',
    { ...FAR_W, crew: [] },
    { required: true, exemption: null, because: 'inside restricted' },
  ],
  [
    'W',
    'the helper’s place is not answered',
    { ...FAR_W, 'crew/1/closest': gone },
    { required: true, exemption: null, because: 'inside restricted' },
  ],
  [
    'W',
    'one alone, outside',
    { ...FAR_W, 'crew/1': gone },
    { required: false, exemption: null, because: 'nobody inside' },
  ],
  [
    'T',
    'thermography from outside, covers on',
    { ...FAR, 'job/task': 'thermography' },
    { required: false, exemption: SECOND },
  ],
  [
    'T',
    'inspecting, someone restricted',
    { ...FAR, 'crew/0/closest': 'restricted' },
    { required: false, exemption: FIRST },
  ],
  [
    'T',
    'inspecting, the lead’s place not answered',
    { ...FAR, 'crew/0/closest': gone },
    { required: false, exemption: FIRST },
  ],
  [
    'T',
    'inspecting, a cover off',
    { ...FAR, 'arcFlash/normal/coversOn': false },
    { required: false, exemption: FIRST },
  ],
  [
    'T',
    'inspecting, covers not answered',
    { ...FAR, 'arcFlash/normal/coversOn': gone },
    { required: false, exemption: FIRST },
  ],
  ['W', 'repair', {}, { required: true, exemption: null, because: 'inside restricted' }],
  [
    'W',
    'repair, nobody said to be restricted',
    { 'crew/0/closest': 'limited' },
    { required: true, exemption: null, because: 'inside restricted' },
  ],
  ['W', 'below 50 V', BELOW_FIFTY, { required: false, exemption: null, because: 'below 50 V' }],
  [
    'W',
    'said below 50 V, but higher is exposed',
    { ...BELOW_FIFTY, 'supply/higherVoltsExposed': true },
    { required: true },
  ],
  [
    'W',
    'said below 50 V, not answered',
    { ...BELOW_FIFTY, 'supply/workVolts': gone },
    { required: true },
  ],
  ['W', 'nobody inside', FAR_W, { required: false, exemption: null, because: 'nobody inside' }],
  [
    'W',
    'nobody inside, but an arc flash is likely',
    { ...FAR_W, 'arcFlash/task': 'remove cover exposing parts' },
    { required: true, exemption: null, because: 'arc flash likely' },
  ],
  [
    'W',
    'someone may be inside',
    { ...FAR_W, 'crew/1/closest': gone },
    { required: true, exemption: null, because: 'inside restricted' },
  ],
  [
    'W',
    'an inspection with someone restricted',
    { ...FAR_W, 'crew/0/closest': 'restricted' },
    { required: true, exemption: null, because: 'inside restricted' },
  ],
];

describe('permit (70E-2024 130.2, 130.2(C))', () => {
  it.each(ROWS)('%s: %s', (base, _title, edits, permit) => {
    expect(assessBase(base, edits).permit).toMatchObject(permit);
  });

  it.each(JOB_TASKS)('with the circuit off %s needs none', (task) => {
    expect(assessBase('O', { 'job/task': task }).permit.required).toBe(false);
  });

  it('is exempt from the permit, never from the equipment', () => {
    const ids = assessBase('T').equipment.map((item) => item.id);
    expect(ids).toContain('rubber-insulating-gloves');
    expect(ids).toContain('arc-rated-shirt-and-trousers');
  });
});
