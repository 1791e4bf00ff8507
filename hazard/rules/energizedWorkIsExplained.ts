import { LIVE, notAnswered, PLAN_AND_WORK } from '../engine/rule';
import type { Rule } from '../engine/rule';

/** `decision.explanation-missing`: whoever signs reads in words why the circuit stays live. */
export const energizedWorkIsExplained: Rule = {
  code: 'decision.explanation-missing',
  severity: 'open',
  stages: PLAN_AND_WORK,
  appliesTo: LIVE,
  citations: ['nfpa70e.permit'],
  find({ answers }) {
    return answers.decision.explanation === undefined ? [notAnswered('/decision/explanation')] : [];
  },
};
