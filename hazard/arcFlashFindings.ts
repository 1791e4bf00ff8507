import { citation } from './citations';
import type { CitationId } from './citations';
import type { Edition } from './editions/types';
import type { ArcFlashAssessment, Citation, Finding, Severity } from './types';

/** What an `arc.study-needed` finding is about; the words are in `shared/messages`. */
export const ARC_STUDY_LIMITS = [
  'label-not-answered',
  'not-answered',
  'limits-not-known',
  'voltage-outside-table',
  'fault-current-exceeded',
  'clearing-time-exceeded',
  'working-distance-short',
  'label-voltage-differs',
  'label-working-distance',
  'label-review',
  'transformer-near-limit',
] as const;
export type ArcStudyLimit = (typeof ARC_STUDY_LIMITS)[number];

export const LABEL_PATH = '/arcFlash/label';

export interface ArcStudyParams extends Record<string, string | number> {
  /** Which limit or field it is about. */
  limit: ArcStudyLimit;
}

export interface ArcFlashFigures {
  answer: Omit<ArcFlashAssessment, 'likely' | 'findings' | 'citations'>;
  citations: Citation[];
}

/** What the label or the table gives: figures count only while no finding refuses them. */
export interface ArcFlashPart {
  findings: Finding[];
  figures: ArcFlashFigures | null;
}

export function arcFinding(
  severity: Severity,
  path: string,
  params: ArcStudyParams,
  edition: Edition,
  basis: CitationId = 'nfpa70e.arcFlashAssessment',
): Finding {
  return { code: 'arc.study-needed', severity, path, params, citation: citation(basis, edition) };
}

/** A caution leaves the figures as they are. */
export const refusesFigures = ({ severity }: Finding) => severity !== 'caution';
