import { citation } from './citations';
import type { CitationId } from './citations';
import { nfpa70e2024 } from './editions';
import type { Edition } from './editions/types';
import { expectedOf, touchOf } from './engine/boundaries';
import { factsOf } from './engine/facts';
import type { Facts } from './engine/facts';
import { readMoment } from './engine/moment';
import type { Hit, Rule } from './engine/rule';
import { unansweredOf, UNANSWERED_CODES } from './engine/unanswered';
import { rules } from './rules';
import type { Assessment, Finding, Severity, Stage, Verdict } from './types';

const STAGES: readonly Stage[] = ['plan', 'work', 'close-out'];

/** Every code that a finding may have, in the order in which findings are given. */
export const RULE_CODES: readonly string[] = [
  ...rules.map(({ code }) => code),
  ...UNANSWERED_CODES,
];

export interface AssessOptions {
  /** The time of the assessment: an ISO date-time with its offset. */
  on: string;
  /** What is asked: may it be signed, may hands go on, may it be closed. */
  stage?: Stage;
  proof?: unknown;
  closeOut?: unknown;
  /** The edition that a worksheet keeps; the newest by default. */
  edition?: Edition;
}

function finding(code: string, severity: Severity, hit: Hit, basis: CitationId, edition: Edition) {
  const { citation: own = basis } = hit;
  return {
    code,
    severity: hit.severity ?? severity,
    path: hit.path,
    params: hit.params ?? {},
    citation: typeof own === 'string' ? citation(own, edition) : own,
  };
}

function applies(rule: Rule, { stage, path, isBelowFiftyVolts }: Facts): boolean {
  if (!rule.stages.includes(stage) || !rule.appliesTo.includes(path)) return false;
  return !isBelowFiftyVolts || rule.appliesBelowFiftyVolts !== false;
}

function findingsOf(facts: Facts): Finding[] {
  const { edition, stage } = facts;
  const findings = rules
    .filter((rule) => applies(rule, facts))
    .flatMap((rule) =>
      rule
        .find(facts)
        .map((hit) => finding(rule.code, rule.severity, hit, rule.citations[0], edition)),
    );
  if (stage === 'close-out') return findings;
  const basis = 'own.complete';
  return [
    ...findings,
    ...unansweredOf(facts).map(({ code, hit }) => finding(code, 'open', hit, basis, edition)),
  ];
}

function verdictOf(findings: readonly Finding[]): Verdict {
  if (findings.some(({ severity }) => severity === 'stop')) return 'stop';
  return findings.some(({ severity }) => severity === 'open') ? 'open' : 'ready';
}

/**
 * What the answers of a worksheet break, leave open or give reason to point
 * out, and the figures that follow from them.
 *
 * Nothing in the content, the proof or the close-out makes it throw, and the
 * same input gives the same output in the same order. It has no clock: `on`
 * is the caller's. It throws a `RangeError` on an `on` that is no date-time or
 * a stage that it does not know.
 */
export function assess(content: unknown, options: AssessOptions): Assessment {
  const { stage = 'plan', proof, closeOut, edition = nfpa70e2024 } = options;
  const on = readMoment(options.on);
  if (on === undefined) throw new RangeError('on must be an ISO date-time with its offset');
  if (!STAGES.includes(stage)) throw new RangeError(`stage must be one of ${STAGES.join(', ')}`);

  const facts = factsOf({ content, proof, closeOut, on, stage, edition });
  const findings = findingsOf(facts);
  return {
    edition: edition.id,
    verdict: verdictOf(findings),
    findings,
    boundaries: facts.distances.boundaries,
    barricade: facts.distances.barricade,
    arcFlash: {
      ...facts.arc.result,
      findings: findings.filter(({ code }) => code.startsWith('arc.')),
    },
    permit: facts.permit,
    equipment: [...facts.items],
    expected: expectedOf(facts.answers),
    touch: touchOf(facts.voltage, edition),
  };
}
