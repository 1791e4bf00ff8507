import { ALL, CLOSE_OUT, flagHits } from '../engine/rule';
import type { Rule } from '../engine/rule';

/**
 * `closeout.covers-off`: to energize with covers off, to aim, dim or prove, is
 * energized work and needs a worksheet of that mode.
 */
export const coversAreOn: Rule = {
  code: 'closeout.covers-off',
  severity: 'stop',
  stages: CLOSE_OUT,
  appliesTo: ALL,
  citations: ['osha1910.333(b)(2)(v)', 'osha1910.333(c)'],
  find({ closeOut, path: workPath }) {
    const isEnergized = workPath !== 'off' || closeOut.restored === true;
    return isEnergized ? flagHits(closeOut.coversOn, false, '/closeOut/coversOn') : [];
  },
};
