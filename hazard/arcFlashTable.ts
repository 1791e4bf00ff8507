import type { ArcFlashQuestion } from './arcFlashEvaluation';
import { arcFinding } from './arcFlashFindings';
import type { ArcFlashPart, ArcStudyLimit } from './arcFlashFindings';
import { citation } from './citations';
import type { Edition, PpeCategoryRow, PpeRowChoice } from './editions/types';
import type { Finding } from './types';

/** An estimate this near to a limit is pointed out: the impedance of a nameplate has a tolerance. */
const NEAR_LIMIT = 0.1;
/** So that an estimate on the very edge counts as near, whatever binary fractions make of it. */
const ROUNDING = 1e-9;

interface Limit {
  path: string;
  field: 'availableFaultKiloamperes' | 'clearingSeconds' | 'workingDistanceInches';
  code: ArcStudyLimit;
  value: number | undefined;
  limitOf: (row: PpeCategoryRow) => number;
  isInside: (value: number, limit: number) => boolean;
}

const isAtMost = (value: number, limit: number) => value <= limit;

/** The three limits of a row, beside what was planned. */
function limitsOf(question: ArcFlashQuestion): Limit[] {
  const { availableFaultKiloamperes: given, transformerKiloamperes: estimate } = question;
  const estimateCounts = estimate !== undefined && (given === undefined || estimate > given);
  return [
    {
      path: estimateCounts ? '/arcFlash/transformer' : '/arcFlash/availableFaultKiloamperes',
      field: 'availableFaultKiloamperes',
      code: 'fault-current-exceeded',
      value: estimateCounts ? estimate : given,
      limitOf: (row) => row.faultKiloamperes,
      isInside: isAtMost,
    },
    {
      path: '/arcFlash/clearingSeconds',
      field: 'clearingSeconds',
      code: 'clearing-time-exceeded',
      value: question.clearingSeconds,
      limitOf: (row) => row.clearingSeconds,
      isInside: isAtMost,
    },
    {
      path: '/arcFlash/workingDistanceInches',
      field: 'workingDistanceInches',
      code: 'working-distance-short',
      value: question.workingDistanceInches,
      limitOf: (row) => row.workingDistanceInches,
      isInside: (value, limit) => value >= limit,
    },
  ];
}

/** The choices of the lowest voltage band that holds the voltage; none past the last band. */
function choicesAt(choices: readonly PpeRowChoice[], volts: number): readonly PpeRowChoice[] {
  const top = Math.min(...choices.map(({ upToVolts }) => upToVolts).filter((up) => volts <= up));
  return choices.filter(({ upToVolts }) => upToVolts === top);
}

/** Of rows that all hold at once, each figure that binds the most. */
function strictest(rows: readonly PpeCategoryRow[]): PpeCategoryRow {
  return rows.reduce((one, other) => ({
    faultKiloamperes: Math.min(one.faultKiloamperes, other.faultKiloamperes),
    clearingSeconds: Math.min(one.clearingSeconds, other.clearingSeconds),
    workingDistanceInches: Math.max(one.workingDistanceInches, other.workingDistanceInches),
    category: one.category >= other.category ? one.category : other.category,
    arcFlashBoundary:
      one.arcFlashBoundary.inches >= other.arcFlashBoundary.inches
        ? one.arcFlashBoundary
        : other.arcFlashBoundary,
    citation: one.citation,
  }));
}

function unansweredFindings(
  limits: readonly Limit[],
  question: ArcFlashQuestion,
  edition: Edition,
) {
  return limits
    .filter(({ field, value }) => {
      // "Not known" was answered for these two; it is one finding of its own.
      const isSaid = question.limitsNotKnown === true && field !== 'workingDistanceInches';
      return value === undefined && !isSaid;
    })
    .map(({ path, field }) => arcFinding('open', path, { limit: 'not-answered', field }, edition));
}

function exceededFindings(limits: readonly Limit[], row: PpeCategoryRow, edition: Edition) {
  return limits.flatMap(({ path, code, value, limitOf, isInside }) => {
    const limit = limitOf(row);
    if (value === undefined || isInside(value, limit)) return [];
    return [arcFinding('stop', path, { limit: code, value, allowed: limit }, edition)];
  });
}

function nearLimitFindings(
  estimate: number | undefined,
  rows: readonly PpeCategoryRow[],
  edition: Edition,
): Finding[] {
  if (estimate === undefined) return [];
  const limits = [...new Set(rows.map(({ faultKiloamperes }) => faultKiloamperes))];
  return limits
    .filter((limit) => Math.abs(estimate - limit) <= NEAR_LIMIT * limit + ROUNDING)
    .map((limit) =>
      arcFinding(
        'caution',
        '/arcFlash/transformer',
        { limit: 'transformer-near-limit', estimate, limitKiloamperes: limit },
        edition,
      ),
    );
}

/** What the table of PPE categories says; figures only while all limits are known and kept. */
export function evaluateTable(question: ArcFlashQuestion, edition: Edition): ArcFlashPart {
  const { equipment, volts, limitsNotKnown, transformerKiloamperes } = question;
  const { rows, choices, minimumArcRatingCalPerCm2, minimumArcRatingCitation } =
    edition.ppeCategories;
  const limits = limitsOf(question);
  const unanswered = unansweredFindings(limits, question, edition);
  const notKnown =
    limitsNotKnown === true
      ? [arcFinding('stop', '/arcFlash/limitsNotKnown', { limit: 'limits-not-known' }, edition)]
      : [];
  if (equipment === undefined || volts === undefined) {
    return { findings: [...notKnown, ...unanswered], figures: null };
  }

  const candidates = choicesAt(choices[equipment], volts).map((choice) => {
    const chosen = choice.rows.map((number) => rows[number]);
    const row = strictest(chosen);
    return { chosen, row, exceeded: exceededFindings(limits, row, edition) };
  });
  // The first choice that nothing exceeds, else the one that the fewest limits refuse.
  const best = [...candidates].sort((a, b) => a.exceeded.length - b.exceeded.length)[0];
  if (best === undefined) {
    const limit = Math.max(...choices[equipment].map(({ upToVolts }) => upToVolts));
    const params = { limit: 'voltage-outside-table', value: volts, allowed: limit } as const;
    const outside = arcFinding('stop', '/supply/system', params, edition);
    return { findings: [outside, ...notKnown, ...unanswered], figures: null };
  }

  const { row, chosen, exceeded } = best;
  return {
    findings: [
      ...notKnown,
      ...exceeded,
      ...unanswered,
      ...nearLimitFindings(
        transformerKiloamperes,
        candidates.map((candidate) => candidate.row),
        edition,
      ),
    ],
    figures: {
      answer: {
        method: 'ppe category',
        ppeCategory: row.category,
        requiredArcRatingCalPerCm2: minimumArcRatingCalPerCm2[row.category],
        arcFlashBoundary: row.arcFlashBoundary,
      },
      citations: [
        ...chosen.map((one) => citation(one.citation, edition)),
        citation(minimumArcRatingCitation, edition),
      ],
    },
  };
}
