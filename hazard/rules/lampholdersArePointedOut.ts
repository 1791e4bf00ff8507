import type { JobTask } from '../enumerations';
import { isAmong } from '../engine/isAmong';
import { ALL, PLAN_AND_WORK } from '../engine/rule';
import type { Rule } from '../engine/rule';

const LAMPHOLDER_TASKS: readonly JobTask[] = [
  'replace lamp',
  'replace driver or ballast',
  'replace luminaire',
];

/**
 * `lamp.line-voltage-lampholder`: the lampholders of double-ended lamps may be
 * at line voltage or at several hundred volts, and a wrong tube may burst.
 */
export const lampholdersArePointedOut: Rule = {
  code: 'lamp.line-voltage-lampholder',
  severity: 'caution',
  stages: PLAN_AND_WORK,
  appliesTo: ALL,
  citations: ['ulLampholders', 'face87-55'],
  find({ answers }) {
    const { lamps, task } = answers.job;
    return lamps === 'double-ended' && isAmong(task, LAMPHOLDER_TASKS)
      ? [{ path: '/job/lamps' }]
      : [];
  },
};
