import { ENERGIZED, flagHits, notAnswered, PLAN_AND_WORK } from '../engine/rule';
import type { Hit, Rule } from '../engine/rule';

/** `decision.below-fifty-not-so`: below 50 V to ground, and nothing higher within reach of a slip. */
export const belowFiftyVoltsIsSo: Rule = {
  code: 'decision.below-fifty-not-so',
  severity: 'stop',
  stages: PLAN_AND_WORK,
  appliesTo: ENERGIZED,
  citations: ['osha1910.333(a)(1)'],
  find({ answers }) {
    if (answers.decision.reason !== 'below 50 V') return [];
    const { workVolts, higherVoltsExposed } = answers.supply;
    const path = '/supply/workVolts';
    const hits: Hit[] = [];
    if (workVolts === undefined) hits.push(notAnswered(path));
    else if (workVolts >= 50) hits.push({ path, params: { volts: workVolts } });
    return [...hits, ...flagHits(higherVoltsExposed, true, '/supply/higherVoltsExposed')];
  },
};
