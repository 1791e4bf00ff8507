import { notAnswered, OFF_AND_TESTING, PLAN_AND_WORK } from '../engine/rule';
import type { Rule } from '../engine/rule';
import { usesMeter } from '../engine/usesMeter';

/** `absence.leads-not-inspected`: instrument, leads and probes are looked at before use. */
export const leadsAreInspected: Rule = {
  code: 'absence.leads-not-inspected',
  severity: 'open',
  stages: PLAN_AND_WORK,
  appliesTo: OFF_AND_TESTING,
  citations: ['osha1910.334(c)(2)', 'osha1910.334(c)(3)'],
  find(facts) {
    const { leadsInspected } = facts.answers.absenceTest;
    const path = '/absenceTest/leadsInspected';
    if (!usesMeter(facts) || leadsInspected === true) return [];
    return leadsInspected === undefined ? [notAnswered(path)] : [{ path }];
  },
};
