import type { CitationId } from '../citations';
import type { Citation, Finding, Severity, Stage } from '../types';
import type { Facts } from './facts';
import type { Path } from './path';

/** What a rule found, before the engine adds its code and clause. */
export interface Hit {
  /** Where it is not that of the rule. */
  readonly severity?: Severity;
  readonly path: string;
  readonly params?: Finding['params'];
  /** Where it is not the first of the rule. */
  readonly citation?: CitationId | Citation;
}

/** A rule is data and one function: nothing about words, order or HTTP. */
export interface Rule {
  readonly code: string;
  /** Of an answer that breaks the rule; a field that is not answered is open. */
  readonly severity: Severity;
  readonly stages: readonly Stage[];
  readonly appliesTo: readonly Path[];
  /** Parts below 50 V with nothing higher exposed have no boundary to keep. */
  readonly appliesBelowFiftyVolts?: boolean;
  /** The first is the one that a finding names. */
  readonly citations: readonly [CitationId, ...CitationId[]];
  find(facts: Facts): readonly Hit[];
}

export const PLAN_AND_WORK: readonly Stage[] = ['plan', 'work'];
/** Only once a proof may have been recorded. */
export const PROOF: readonly Stage[] = ['work'];
export const CLOSE_OUT: readonly Stage[] = ['close-out'];

export const OFF: readonly Path[] = ['off'];
export const ENERGIZED: readonly Path[] = ['energized'];
export const OFF_AND_TESTING: readonly Path[] = ['off', 'testing'];
export const OFF_AND_ENERGIZED: readonly Path[] = ['off', 'energized'];
/** Both energized paths. */
export const LIVE: readonly Path[] = ['testing', 'energized'];
export const ALL: readonly Path[] = ['off', 'testing', 'energized'];

/** `/sources/0/openedAt` as `sources.openedAt`: the name of a field, whichever element it is of. */
export function fieldName(path: string): string {
  return path
    .split('/')
    .filter((key) => key !== '' && !/^\d+$/.test(key))
    .join('.');
}

/** A field that is not answered: open, and named so that the words can ask for it. */
export function notAnswered(path: string, params: Finding['params'] = {}): Hit {
  return { severity: 'open', path, params: { ...params, field: fieldName(path) } };
}

/** `broken` on `true` or `false` as the rule says, open while it is not answered, else nothing. */
export function flagHits(
  answer: boolean | undefined,
  broken: boolean,
  path: string,
  params: Finding['params'] = {},
): readonly Hit[] {
  if (answer === undefined) return [notAnswered(path, params)];
  return answer === broken ? [{ path, params }] : [];
}
