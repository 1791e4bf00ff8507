import { notAnswered, OFF, PROOF } from '../engine/rule';
import type { Rule } from '../engine/rule';
import { sourceParams } from '../engine/sources';

/**
 * `absence.source-not-opened`: before the test the lead confirms each source
 * opened, held as planned and tried.
 */
export const everySourceIsConfirmedOpen: Rule = {
  code: 'absence.source-not-opened',
  severity: 'stop',
  stages: PROOF,
  appliesTo: OFF,
  citations: ['osha1910.333(b)(2)(ii)', 'osha1910.333(b)(2)(iii)', 'osha1910.333(b)(2)(iv)(A)'],
  find({ proof, sources }) {
    const path = '/proof/openedSources';
    const { isAnswered, values } = proof.openedSources;
    if (!isAnswered) return [notAnswered(path)];
    return sources.flatMap((source) => {
      if (source.id === undefined) return [notAnswered(path, sourceParams(source))];
      return values.includes(source.id) ? [] : [{ path, params: sourceParams(source) }];
    });
  },
};
