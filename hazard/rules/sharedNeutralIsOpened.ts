import { flagHits, OFF, PLAN_AND_WORK } from '../engine/rule';
import type { Rule } from '../engine/rule';
import { sourceParams } from '../engine/sources';

/** `sources.shared-neutral`: the neutral carries the current of every circuit that shares it. */
export const sharedNeutralIsOpened: Rule = {
  code: 'sources.shared-neutral',
  severity: 'stop',
  stages: PLAN_AND_WORK,
  appliesTo: OFF,
  citations: ['osha1910.333(b)(2)(ii)(B)', 'nec210.4(B)'],
  find({ answers, sources }) {
    const listed = sources.filter(({ kind }) => kind === 'shared neutral');
    if (listed.length === 0 && answers.supply.neutralShared === 'yes') {
      return [{ path: '/sources', severity: 'open', params: { kind: 'shared neutral' } }];
    }
    return listed.flatMap((source) =>
      flagHits(
        source.allPhasesOpened,
        false,
        `/sources/${source.index}/allPhasesOpened`,
        sourceParams(source),
      ),
    );
  },
};
