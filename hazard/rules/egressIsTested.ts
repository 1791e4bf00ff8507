import { CLOSE_OUT, notAnswered, OFF } from '../engine/rule';
import type { Hit, Rule } from '../engine/rule';
import { hasBattery } from '../engine/sources';

/** A battery carries its lamps for at least this long at the monthly test of NFPA 101. */
const SHORTEST_TEST_SECONDS = 30;

/**
 * `closeout.egress-untested`: emergency lighting was out of service, and is
 * seen to work again on its own supply before the sheet is closed.
 */
export const egressIsTested: Rule = {
  code: 'closeout.egress-untested',
  severity: 'open',
  stages: CLOSE_OUT,
  appliesTo: OFF,
  citations: ['nfpa101.7.9.3', 'own.egressTest'],
  find({ answers, closeOut, isEmergencyLighting, sources }) {
    if (closeOut.restored !== true) return [];
    const hits: Hit[] = [];
    const { egressLit, egressTestedSeconds: seconds } = closeOut;
    const isBattery = sources.some(hasBattery);
    if (isBattery) {
      const path = '/closeOut/egressTestedSeconds';
      if (seconds === undefined) hits.push(notAnswered(path));
      else if (seconds < SHORTEST_TEST_SECONDS) {
        hits.push({ path, params: { seconds, limit: SHORTEST_TEST_SECONDS } });
      }
    }
    const isOtherKind =
      isEmergencyLighting && (!isBattery || answers.egressSupply.values.includes('generator'));
    if (isOtherKind && egressLit !== true) {
      const path = '/closeOut/egressLit';
      const hit = egressLit === undefined ? notAnswered(path) : { path };
      hits.push({ ...hit, citation: 'own.egressTest' });
    }
    return hits;
  },
};
