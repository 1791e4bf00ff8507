import { ALL, PLAN_AND_WORK } from '../engine/rule';
import type { Rule } from '../engine/rule';

/** `sources.none`: every possible source of electric energy is found before any is opened. */
export const sourcesAreListed: Rule = {
  code: 'sources.none',
  severity: 'open',
  stages: PLAN_AND_WORK,
  appliesTo: ALL,
  citations: ['nfpa70e.allSources', 'osha1910.333(b)(2)(ii)(B)'],
  find({ sources }) {
    return sources.length === 0 ? [{ path: '/sources' }] : [];
  },
};
