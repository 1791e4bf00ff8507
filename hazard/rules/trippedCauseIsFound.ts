import { ALL, notAnswered } from '../engine/rule';
import type { Rule } from '../engine/rule';

/**
 * `supply.tripped`: a breaker that tripped on a fault is not closed again
 * before the cause is found. With the circuit open the fault may be sought.
 */
export const trippedCauseIsFound: Rule = {
  code: 'supply.tripped',
  severity: 'stop',
  stages: ['plan', 'work', 'close-out'],
  appliesTo: ALL,
  citations: ['osha1910.334(b)(2)'],
  find({ answers, closeOut, path: workPath, stage }) {
    const { tripped } = answers.supply;
    const path = '/supply/tripped';
    const isClosedAgain = closeOut.restored === true && closeOut.faultRepaired !== true;
    if (stage === 'close-out' && !isClosedAgain) return [];
    if (tripped === undefined) return [notAnswered(path)];
    if (tripped !== 'cause not found') return [];
    const isSought = stage !== 'close-out' && workPath !== 'energized';
    return [{ path, severity: isSought ? 'caution' : 'stop', params: { tripped } }];
  },
};
