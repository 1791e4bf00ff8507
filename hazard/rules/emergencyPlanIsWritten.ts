import { ALL, notAnswered, PLAN_AND_WORK } from '../engine/rule';
import type { Rule } from '../engine/rule';

/** `crew.emergency-plan`: whom to call, how to free someone, who helps, where the AED is. */
export const emergencyPlanIsWritten: Rule = {
  code: 'crew.emergency-plan',
  severity: 'open',
  stages: PLAN_AND_WORK,
  appliesTo: ALL,
  citations: ['nfpa70e.briefing'],
  find({ answers }) {
    const { emergency } = answers.briefing;
    return (['contact', 'rescue', 'firstAid', 'aedAt'] as const)
      .filter((name) => emergency[name] === undefined)
      .map((name) => notAnswered(`/briefing/emergency/${name}`));
  },
};
