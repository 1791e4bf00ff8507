import { BRIEFING_TOPICS } from '../enumerations';
import { answeredValues } from '../engine/read';
import { ALL, PLAN_AND_WORK } from '../engine/rule';
import type { Rule } from '../engine/rule';

/** `crew.briefing-open`: each topic is spoken about before the work, the permit only where one is required. */
export const briefingCoversTopics: Rule = {
  code: 'crew.briefing-open',
  severity: 'open',
  stages: PLAN_AND_WORK,
  appliesTo: ALL,
  citations: ['nfpa70e.briefing'],
  find({ answers, permit }) {
    const covered = answeredValues(answers.briefing.topics);
    return BRIEFING_TOPICS.filter(
      (topic) => !covered.includes(topic) && (topic !== 'permit' || permit.required),
    ).map((topic) => ({ path: '/briefing/topics', params: { topic } }));
  },
};
