import { flagHits, OFF, PROOF } from '../engine/rule';
import type { Rule } from '../engine/rule';

/**
 * `absence.controls-not-operated`: 0 V behind an open switch proves nothing; it
 * is how the wrong breaker passes.
 */
export const controlsAreOperated: Rule = {
  code: 'absence.controls-not-operated',
  severity: 'stop',
  stages: PROOF,
  appliesTo: OFF,
  citations: ['osha1910.333(b)(2)(iv)(A)', 'face04WA080'],
  find: ({ proof }) => flagHits(proof.controlsOperated, false, '/proof/controlsOperated'),
};
