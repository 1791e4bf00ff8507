import { CLOSE_OUT, notAnswered, OFF } from '../engine/rule';
import type { Rule } from '../engine/rule';

/**
 * `closeout.locks-left`: each lock is taken off by the person who applied it.
 * A circuit may stay locked; the notes then say who holds the locks.
 */
export const locksAreRemoved: Rule = {
  code: 'closeout.locks-left',
  severity: 'open',
  stages: CLOSE_OUT,
  appliesTo: OFF,
  citations: ['osha1910.333(b)(2)(v)(C)'],
  find({ closeOut }) {
    const { restored, locksRemoved } = closeOut;
    if (restored === undefined) return [notAnswered('/closeOut/restored')];
    if (!restored) return [{ path: '/closeOut/restored', severity: 'caution' }];
    const path = '/closeOut/locksRemoved';
    if (locksRemoved === undefined) return [notAnswered(path)];
    return locksRemoved ? [] : [{ path }];
  },
};
