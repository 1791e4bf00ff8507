import { notAnswered, OFF, PROOF } from '../engine/rule';
import type { Rule } from '../engine/rule';

/**
 * `absence.not-proved`: a meter that died during the test reads zero too. OSHA
 * asks for the proof above 600 V only, NFPA 70E at every voltage.
 */
export const instrumentIsProved: Rule = {
  code: 'absence.not-proved',
  severity: 'open',
  stages: PROOF,
  appliesTo: OFF,
  citations: ['nfpa70e.absenceTest'],
  find({ proof }) {
    return (['provedBefore', 'provedAfter'] as const).flatMap((when) => {
      const path = `/proof/${when}`;
      if (proof[when] === undefined) return [notAnswered(path)];
      return proof[when] ? [] : [{ path }];
    });
  },
};
