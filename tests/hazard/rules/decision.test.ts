import { describe, expect, it } from 'vitest';
import { JOB_TASKS, REASONS } from '@/hazard';
import { BELOW_FIFTY } from '../../support/ruleEdits';
import type { Edits, RuleRow } from '../../support/ruleTable';
import { assessBase, describeRule, eachValue, found, gone, onEach } from '../../support/ruleTable';

const TESTING = ['trace circuit', 'test or troubleshoot', 'inspect', 'thermography'];
const REPAIR = JOB_TASKS.filter((task) => !TESTING.includes(task));

function admitted(task: string, reason: string): boolean {
  if (TESTING.includes(task)) return reason !== 'additional hazard';
  return task !== 'add or extend circuit' && reason !== 'testing';
}

const MATRIX = JOB_TASKS.flatMap((task) =>
  REASONS.map((reason): [string, string, boolean] => [task, reason, admitted(task, reason)]),
);

describe('decision.unjustified (1910.333(a)(1); 70E 110.2(B))', () => {
  it.each(MATRIX)('%s because of %s: admitted %s', (task, reason, isAdmitted) => {
    const result = assessBase('W', {
      'job/task': task,
      'decision/reason': reason,
      'decision/infeasibleBecause': 'continuous industrial process',
    });
    const isRepairByTesting = reason === 'testing' && REPAIR.includes(task as never);
    expect(found(result, 'decision.unjustified')).toEqual(
      isAdmitted || isRepairByTesting ? [] : ['stop /decision/reason'],
    );
    expect(found(result, 'decision.testing-is-not-repair')).toEqual(
      isRepairByTesting ? ['stop /decision/reason'] : [],
    );
  });

  it.each(JOB_TASKS)('%s without a reason', (task) => {
    const result = assessBase('W', { 'job/task': task, 'decision/reason': gone });
    expect(found(result, 'decision.unjustified')).toEqual(['stop /decision/reason']);
  });

  it.each(['', 'convenience', 4])('the reason %s is no answer', (reason) => {
    const result = assessBase('W', { 'decision/reason': reason });
    expect(found(result, 'decision.unjustified')).toEqual(['stop /decision/reason']);
  });

  it.each([undefined, '', 'maybe', true])(
    'mode %s: open, and the rules of the off path',
    (mode) => {
      const result = assessBase('W', {
        'decision/mode': mode,
        'sources/0/openedAt': 'wall switch',
      });
      expect(found(result, 'decision.unanswered')).toEqual(['open /decision/mode']);
      expect(found(result, 'decision.unjustified')).toEqual([]);
      expect(found(result, 'permit.missing')).toEqual([]);
      expect(found(result, 'sources.switch-only')).toEqual(['stop /sources/0/openedAt']);
      expect(result.permit).toMatchObject({ required: false, because: 'absence test' });
    },
  );

  it.each(REASONS)('a task that is not answered makes no stop of %s', (reason) => {
    const result = assessBase('W', {
      'job/task': gone,
      'decision/reason': reason,
      'decision/infeasibleBecause': 'can only be tested energized',
      'supply/workVolts': 24,
      'supply/higherVoltsExposed': false,
    });
    expect(result.findings.filter(({ severity }) => severity === 'stop')).toEqual([]);
    expect(result.verdict).toBe('open');
  });

  it('asks for no reason with the circuit off', () => {
    expect(found(assessBase('O'), 'decision.unjustified')).toEqual([]);
  });
});

describeRule('decision.explanation-missing', '70E 130.2', [
  ...eachValue(
    ['T', 'W'],
    'decision/explanation',
    [gone, '', ' \n\t ', 5],
    ['open /decision/explanation'],
  ),
  ...onEach(['T', 'W', 'O'], 'as it stands', {}, []),
]);

describeRule('decision.below-fifty-not-so', '1910.333(a)(1)', [
  ['W', 'below 50 V', BELOW_FIFTY, []],
  ['W', '49.9 V', { ...BELOW_FIFTY, 'supply/workVolts': 49.9 }, []],
  ...eachValue(['W'], 'supply/workVolts', [50, 120], ['stop /supply/workVolts'], ['*'], {
    ...BELOW_FIFTY,
    'supply/workVolts': 0,
  }),
  ...[gone, 'x', NaN, -24].map((workVolts): RuleRow => [
    'W',
    `workVolts ${String(workVolts)}`,
    { ...BELOW_FIFTY, 'supply/workVolts': workVolts },
    ['open /supply/workVolts'],
    ['*'],
  ]),
  [
    'W',
    'higher exposed',
    { ...BELOW_FIFTY, 'supply/higherVoltsExposed': true },
    ['stop /supply/higherVoltsExposed'],
    ['*'],
  ],
  [
    'W',
    'higher exposed not answered',
    { ...BELOW_FIFTY, 'supply/higherVoltsExposed': gone },
    ['open /supply/higherVoltsExposed'],
    ['*'],
  ],
  [
    'W',
    'both not answered',
    { ...BELOW_FIFTY, 'supply/workVolts': gone, 'supply/higherVoltsExposed': gone },
    ['open', 'open'],
    ['*'],
  ],
  ['W', 'another reason', { 'supply/workVolts': 120 }, []],
]);

describeRule('decision.testing-is-not-repair', '70E 130.2(C)', [
  ...REPAIR.map((task): RuleRow => [
    'W',
    task,
    { 'job/task': task, 'decision/reason': 'testing' },
    ['stop /decision/reason'],
    ['*'],
  ]),
  ...TESTING.map((task): RuleRow => [
    'T',
    task,
    { 'job/task': task },
    [],
    ['arc.task-does-not-fit'],
  ]),
]);

const INFEASIBLE: Edits = { 'decision/reason': 'infeasible' };
const BECAUSE = 'decision/infeasibleBecause';
describeRule('decision.infeasible-not-admitted', '1910.333(a)(1) Note 2', [
  ['W', 'other', { ...INFEASIBLE, [BECAUSE]: 'other' }, ['stop /decision/infeasibleBecause']],
  [
    'W',
    'can only be tested energized, but a repair',
    { ...INFEASIBLE, [BECAUSE]: 'can only be tested energized' },
    ['stop /decision/infeasibleBecause'],
  ],
  [
    'W',
    'continuous industrial process',
    { ...INFEASIBLE, [BECAUSE]: 'continuous industrial process' },
    ['caution /decision/infeasibleBecause'],
  ],
  ...[gone, '', 'tenants'].map((because): RuleRow => [
    'W',
    `because ${String(because)}`,
    { ...INFEASIBLE, [BECAUSE]: because },
    ['open /decision/infeasibleBecause'],
  ]),
  [
    'T',
    'can only be tested energized',
    { ...INFEASIBLE, [BECAUSE]: 'can only be tested energized' },
    [],
  ],
  ['W', 'another reason', { [BECAUSE]: 'other' }, []],
  [
    'T',
    'a testing task because of other takes the rules of W',
    { ...INFEASIBLE, [BECAUSE]: 'other' },
    ['stop /decision/infeasibleBecause'],
    ['*'],
  ],
]);

const HAZARD = 'decision/hazard';
const LIGHT = 'decision/temporaryLight';
describeRule('decision.alternative-possible', '1910.333(a)(1) Note 1; own policy', [
  ...['life support', 'alarm', 'ventilation'].map((hazard): RuleRow => [
    'W',
    hazard,
    { [HAZARD]: hazard, [LIGHT]: 'possible' },
    [],
  ]),
  [
    'W',
    'light can be brought',
    { [HAZARD]: 'illumination', [LIGHT]: 'possible' },
    ['stop /decision/temporaryLight'],
  ],
  ['W', 'light cannot be brought', { [HAZARD]: 'illumination', [LIGHT]: 'not possible' }, []],
  ...[gone, '', 'dunno'].map((light): RuleRow => [
    'W',
    `light ${String(light)}`,
    { [HAZARD]: 'illumination', [LIGHT]: light },
    ['open /decision/temporaryLight'],
  ]),
  ...eachValue(['W'], HAZARD, [gone, '', 'rent'], ['open /decision/hazard']),
  ...eachValue(
    ['W'],
    'decision/outageRefusedBy',
    [gone, '', 5],
    ['open /decision/outageRefusedBy'],
  ),
  [
    'W',
    'infeasible, nobody asked',
    { ...INFEASIBLE, [BECAUSE]: 'continuous industrial process', 'decision/outageRefusedBy': gone },
    ['open /decision/outageRefusedBy'],
  ],
  [
    'W',
    'infeasible has no hazard',
    { ...INFEASIBLE, [BECAUSE]: 'continuous industrial process', [HAZARD]: gone },
    [],
  ],
  ['W', 'below 50 V', { ...BELOW_FIFTY, 'decision/outageRefusedBy': gone, [HAZARD]: gone }, []],
  [
    'W',
    'nobody asked and light can be brought',
    { 'decision/outageRefusedBy': gone, [HAZARD]: 'illumination', [LIGHT]: 'possible' },
    ['open', 'stop'],
  ],
  ...onEach(['O', 'T'], 'other paths', { 'decision/outageRefusedBy': gone, [HAZARD]: gone }, []),
]);
