import type { CitationId } from '../citations';
import { ALL, CLOSE_OUT, flagHits } from '../engine/rule';
import type { Hit, Rule } from '../engine/rule';

const STEPS: readonly [name: 'toolsClear' | 'peopleWarned' | 'peopleClear', CitationId][] = [
  ['toolsClear', 'osha1910.333(b)(2)(v)(A)'],
  ['peopleWarned', 'osha1910.333(b)(2)(v)(B)'],
  ['peopleClear', 'osha1910.333(b)(2)(v)(D)'],
];

/** `closeout.not-cleared`: in this order, before any energizing, even for a moment. */
export const placeIsCleared: Rule = {
  code: 'closeout.not-cleared',
  severity: 'stop',
  stages: CLOSE_OUT,
  appliesTo: ALL,
  citations: ['osha1910.333(b)(2)(v)(A)', 'osha1910.333(b)(2)(v)(B)', 'osha1910.333(b)(2)(v)(D)'],
  find({ closeOut }) {
    return STEPS.flatMap(([name, citation]) =>
      flagHits(closeOut[name], false, `/closeOut/${name}`).map((hit): Hit => ({
        ...hit,
        citation,
      })),
    );
  },
};
