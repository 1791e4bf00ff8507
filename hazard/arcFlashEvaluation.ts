import { arcFinding, LABEL_PATH, refusesFigures } from './arcFlashFindings';
import { evaluateLabel, labelAboveForty } from './arcFlashLabel';
import { evaluateTable } from './arcFlashTable';
import type { EquipmentLabel } from './content';
import { nfpa70e2024 } from './editions';
import type { Edition } from './editions/types';
import type { ArcFlashEquipment } from './enumerations';
import type { ArcFlashAssessment, Citation } from './types';

/** What is known about an arc flash. Anything may be missing: unknown is never inside a limit. */
export interface ArcFlashQuestion {
  likelihood: { likely: boolean; citation: Citation };
  equipment?: ArcFlashEquipment | undefined;
  /** Phase-to-phase. */
  volts?: number | undefined;
  workingDistanceInches?: number | undefined;
  label?: EquipmentLabel | undefined;
  noLabel?: boolean | undefined;
  limitsNotKnown?: boolean | undefined;
  availableFaultKiloamperes?: number | undefined;
  clearingSeconds?: number | undefined;
  /** The infinite bus estimate of a transformer, which counts when it is the larger. */
  transformerKiloamperes?: number | undefined;
  /** `YYYY-MM-DD`; without it the age of a label's review is not judged. */
  day?: string | undefined;
}

/**
 * The arc flash answer for what is known so far, with the findings that it
 * gives rise to. Likelihood comes first, then the label, then the table; a
 * label on the equipment is never replaced by the softer table.
 */
export function evaluateArcFlash(
  question: ArcFlashQuestion,
  edition: Edition = nfpa70e2024,
): ArcFlashAssessment {
  const { likely, citation } = question.likelihood;
  const label = question.label?.ofThisEquipment === false ? undefined : question.label;
  const aboveForty = label === undefined ? [] : labelAboveForty(label, edition);
  const nothing = { ppeCategory: null, requiredArcRatingCalPerCm2: null, arcFlashBoundary: null };
  if (!likely) {
    return {
      likely,
      method: 'not likely',
      ...nothing,
      findings: aboveForty,
      citations: [citation],
    };
  }

  const { findings, figures } =
    label !== undefined
      ? evaluateLabel(label, question, edition)
      : question.noLabel === true || question.label !== undefined
        ? evaluateTable(question, edition)
        : { findings: unanswered(question, edition), figures: null };
  const isKnown = figures !== null && !findings.some(refusesFigures);
  return {
    likely,
    method: 'study needed',
    ...nothing,
    ...(isKnown ? figures.answer : {}),
    findings: [...findings, ...aboveForty],
    citations: [citation, ...(isKnown ? figures.citations : [])],
  };
}

/** Whether there is a label has not been said. */
function unanswered({ workingDistanceInches }: ArcFlashQuestion, edition: Edition) {
  const findings = [arcFinding('open', LABEL_PATH, { limit: 'label-not-answered' }, edition)];
  if (workingDistanceInches === undefined) {
    findings.push(
      arcFinding(
        'open',
        '/arcFlash/workingDistanceInches',
        { limit: 'not-answered', field: 'workingDistanceInches' },
        edition,
      ),
    );
  }
  return findings;
}
