import { notAnswered, OFF, PROOF } from '../engine/rule';
import type { Rule } from '../engine/rule';

/**
 * `sources.live-neighbor`: the same box, wireway or panel may keep live parts.
 * With a panel's own main opened its line lugs are live, so "none" is no answer.
 */
export const neighborsAreGuarded: Rule = {
  code: 'sources.live-neighbor',
  severity: 'stop',
  stages: PROOF,
  appliesTo: OFF,
  citations: ['osha1910.333(a)(1)', 'osha1910.333(b)(1)', 'osha1910.335(a)(2)(ii)'],
  find({ answers, proof, sources, task }) {
    const path = '/proof/otherLiveParts';
    const { otherLiveParts } = proof;
    const isMainOpened =
      task.alwaysWholeEquipment &&
      answers.arcFlash.equipment === 'panelboard' &&
      sources.some(({ isCircuits, openedAt }) => isCircuits && openedAt === 'breaker');
    if (otherLiveParts === undefined) return [notAnswered(path)];
    if (otherLiveParts === 'none' && isMainOpened) return [notAnswered(path, { lugs: 'live' })];
    return otherLiveParts === 'not guarded' ? [{ path }] : [];
  },
};
