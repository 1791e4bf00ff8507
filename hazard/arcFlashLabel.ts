import type { ArcFlashQuestion } from './arcFlashEvaluation';
import { arcFinding, LABEL_PATH } from './arcFlashFindings';
import type { ArcFlashPart } from './arcFlashFindings';
import { isFiniteNumber } from './arguments';
import { citation } from './citations';
import type { EquipmentLabel } from './content';
import { addCalendarMonths, isCalendarDate } from './dates';
import type { Edition, PpeCategory } from './editions/types';
import type { Finding } from './types';

const METRES_PER_INCH = 0.0254;
/** Above this nobody works on this tool's word, whatever is worn: own policy, no table's. */
const OWN_LIMIT_CAL_PER_CM2 = 40;

/** A figure of a label is above 0, else it is not answered. */
const figure = (value: number | undefined): number | undefined =>
  isFiniteNumber(value) && value > 0 ? value : undefined;

const isCategory = (value: number | undefined): value is PpeCategory =>
  value === 1 || value === 2 || value === 3 || value === 4;

/** `arc.above-forty`: one for each rating of the label that is above 40 cal/cm². */
export function labelAboveForty(label: EquipmentLabel, edition: Edition): Finding[] {
  const printed = ['incidentEnergyCalPerCm2', 'minimumArcRatingCalPerCm2'] as const;
  return printed.flatMap((name): Finding[] => {
    const value = figure(label[name]);
    if (value === undefined || value <= OWN_LIMIT_CAL_PER_CM2) return [];
    return [
      {
        code: 'arc.above-forty',
        severity: 'stop',
        path: `${LABEL_PATH}/${name}`,
        params: { energy: value, allowed: OWN_LIMIT_CAL_PER_CM2 },
        citation: citation('own.aboveForty', edition),
      },
    ];
  });
}

function reviewFindings({ reviewedOn }: EquipmentLabel, day: string | undefined, edition: Edition) {
  const months = edition.labelReviewMonths;
  const isReviewed =
    isCalendarDate(reviewedOn) &&
    (day === undefined || (reviewedOn <= day && day <= addCalendarMonths(reviewedOn, months)));
  if (isReviewed) return [];
  const path = `${LABEL_PATH}/reviewedOn`;
  const params = { limit: 'label-review', years: months / 12 } as const;
  return [arcFinding('caution', path, params, edition, 'nfpa70e.labelReview')];
}

function voltageFindings(label: EquipmentLabel, volts: number | undefined, edition: Edition) {
  const path = `${LABEL_PATH}/systemVolts`;
  const value = figure(label.systemVolts);
  if (value === undefined) {
    return [
      arcFinding('open', path, { limit: 'not-answered', field: 'label.systemVolts' }, edition),
    ];
  }
  if (volts === undefined || value === volts) return [];
  return [
    arcFinding('stop', path, { limit: 'label-voltage-differs', value, allowed: volts }, edition),
  ];
}

function distanceFindings(label: EquipmentLabel, question: ArcFlashQuestion, edition: Edition) {
  const findings: Finding[] = [];
  const notAnswered = (path: string, field: string) =>
    findings.push(arcFinding('open', path, { limit: 'not-answered', field }, edition));
  const path = '/arcFlash/workingDistanceInches';
  const planned = question.workingDistanceInches;
  const printed = figure(label.workingDistanceInches);
  if (planned === undefined) notAnswered(path, 'workingDistanceInches');
  if (printed === undefined && figure(label.incidentEnergyCalPerCm2) !== undefined) {
    // An incident energy holds only at the distance that it was worked out for.
    notAnswered(`${LABEL_PATH}/workingDistanceInches`, 'label.workingDistanceInches');
  }
  if (planned !== undefined && printed !== undefined && planned < printed) {
    findings.push(
      arcFinding(
        'stop',
        path,
        { limit: 'label-working-distance', value: planned, allowed: printed },
        edition,
      ),
    );
  }
  return findings;
}

/**
 * What the label of the equipment says (70E 130.5(H)). A label ought to bear
 * one rating; where it bears several the largest is required, and a category
 * is reported only when it stands alone.
 */
export function evaluateLabel(
  label: EquipmentLabel,
  question: ArcFlashQuestion,
  edition: Edition,
): ArcFlashPart {
  const findings = voltageFindings(label, question.volts, edition);
  const energy = figure(label.incidentEnergyCalPerCm2);
  const rating = figure(label.minimumArcRatingCalPerCm2);
  const category = isCategory(label.ppeCategory) ? label.ppeCategory : undefined;
  const boundaryInches = figure(label.arcFlashBoundaryInches);
  const { minimumArcRatingCalPerCm2, minimumArcRatingCitation } = edition.ppeCategories;

  if (energy === undefined && rating === undefined && category === undefined) {
    const params = { limit: 'not-answered', field: 'label.incidentEnergyCalPerCm2' } as const;
    findings.push(arcFinding('open', LABEL_PATH, params, edition));
  }
  if (boundaryInches === undefined) {
    const params = { limit: 'not-answered', field: 'label.arcFlashBoundaryInches' } as const;
    findings.push(arcFinding('open', `${LABEL_PATH}/arcFlashBoundaryInches`, params, edition));
  }
  findings.push(
    ...distanceFindings(label, question, edition),
    ...reviewFindings(label, question.day, edition),
  );

  const isByCategory = energy === undefined && rating === undefined;
  const { fromCalPerCm2 } = edition.incidentEnergyBands;
  const required = Math.max(
    energy !== undefined && energy >= fromCalPerCm2 ? energy : 0,
    rating ?? 0,
    category === undefined ? 0 : minimumArcRatingCalPerCm2[category],
  );
  return {
    findings,
    figures: {
      answer: {
        method: isByCategory ? 'ppe category' : 'incident energy',
        ppeCategory: isByCategory ? (category ?? null) : null,
        requiredArcRatingCalPerCm2: required > 0 ? required : null,
        arcFlashBoundary:
          boundaryInches === undefined
            ? null
            : { inches: boundaryInches, metres: boundaryInches * METRES_PER_INCH },
      },
      citations: [
        citation('nfpa70e.label', edition),
        ...(isByCategory ? [citation(minimumArcRatingCitation, edition)] : []),
      ],
    },
  };
}
