import { notAnswered, OFF, PROOF } from '../engine/rule';
import type { Rule } from '../engine/rule';

/** `sources.stored-energy`: capacitors, ballasts and batteries hold energy behind an open breaker. */
export const storedEnergyIsDischarged: Rule = {
  code: 'sources.stored-energy',
  severity: 'open',
  stages: PROOF,
  appliesTo: OFF,
  citations: ['osha1910.333(b)(2)(ii)(C)', 'face87-55'],
  find({ proof, sources, task }) {
    const isAsked =
      task.holdsStoredEnergy || sources.some(({ kind }) => kind === 'central inverter');
    if (!isAsked) return [];
    const path = '/proof/storedEnergy';
    if (proof.storedEnergy === undefined) return [notAnswered(path)];
    return proof.storedEnergy === 'not discharged' ? [{ path }] : [];
  },
};
