import { notAnswered, OFF_AND_TESTING, PLAN_AND_WORK } from '../engine/rule';
import type { Rule } from '../engine/rule';
import { usesMeter } from '../engine/usesMeter';

/**
 * `absence.proximity-tester`: it never proves absence. It may trace a live
 * circuit, where it proves nothing.
 */
export const contactInstrumentIsUsed: Rule = {
  code: 'absence.proximity-tester',
  severity: 'stop',
  stages: PLAN_AND_WORK,
  appliesTo: OFF_AND_TESTING,
  citations: ['nfpa70e.absenceTest'],
  find(facts) {
    const { answers, path: workPath } = facts;
    if (!usesMeter(facts)) return [];
    const path = '/absenceTest/instrument';
    const { instrument } = answers.absenceTest;
    if (instrument === undefined) return [notAnswered(path)];
    const isTracing = workPath === 'testing' && answers.job.task === 'trace circuit';
    return instrument === 'contact' || isTracing ? [] : [{ path }];
  },
};
