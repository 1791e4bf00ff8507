import { ALL, notAnswered, PLAN_AND_WORK } from '../engine/rule';
import type { Rule } from '../engine/rule';

/** `surroundings.ladder-conductive`: a ladder of metal stands the body on ground. */
export const ladderDoesNotConduct: Rule = {
  code: 'surroundings.ladder-conductive',
  severity: 'stop',
  stages: PLAN_AND_WORK,
  appliesTo: ALL,
  citations: ['osha1910.333(c)(7)', 'osha1926.1053(b)(12)'],
  find({ answers }) {
    const { access, ladder } = answers.surroundings;
    if (access !== 'stepladder' && access !== 'extension ladder') return [];
    const path = '/surroundings/ladder/material';
    const { material } = ladder;
    if (material === undefined) return [notAnswered(path)];
    const conducts = material === 'aluminum' || material === 'other conductive';
    return conducts ? [{ path, params: { material } }] : [];
  },
};
