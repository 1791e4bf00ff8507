import { JOB_TASKS } from '@/hazard';
import type { RuleRow } from '../../support/ruleTable';
import { describeRule, eachValue, gone, onEach } from '../../support/ruleTable';

const TASKS = ['replace lamp', 'replace driver or ballast', 'replace luminaire'];

describeRule('lamp.line-voltage-lampholder', 'UL notices 2010, 2018; FACE 87-55', [
  ...JOB_TASKS.map((task): RuleRow => [
    'O',
    task,
    { 'job/task': task, 'job/lamps': 'double-ended' },
    TASKS.includes(task) ? ['caution'] : [],
    ['*'],
  ]),
  ...onEach(['W'], 'energized', { 'job/lamps': 'double-ended' }, ['caution']),
  ...eachValue(['O', 'W'], 'job/lamps', ['other', gone, ''], []),
  ['O close', 'not at close-out', { 'job/lamps': 'double-ended' }, []],
]);
