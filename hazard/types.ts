/**
 * The shapes that `hazard/index.ts` answers with. A contract: names may be
 * added, not renamed.
 */

/** The published pair: inches and metres as printed, neither worked out from the other. */
export interface Distance {
  readonly inches: number;
  readonly metres: number;
}

/** How a figure was checked; shown beside it on the screen and in print. */
export type Confidence =
  'regulation' | 'agreeing' | 'single' | 'memory' | 'common practice' | 'own policy';

export interface Citation {
  readonly standard: string;
  readonly edition: string;
  readonly table: string;
  readonly confidence: Confidence;
}

export type Restricted = Distance | 'avoid contact' | null;

export type ShockBoundaries =
  | {
      inTable: true;
      row: string;
      limitedMovable: Distance | null;
      limitedFixed: Distance | null;
      restricted: Restricted;
      citation: Citation;
    }
  | { inTable: false; citation: Citation };

export type Severity = 'stop' | 'open' | 'caution';

export interface Finding {
  code: string;
  severity: Severity;
  /** A JSON Pointer into `{ ...content, proof, closeOut }`, never empty. */
  path: string;
  params: Record<string, string | number>;
  citation: Citation;
}

export interface RequiredItem {
  id: string;
  params: Record<string, string | number>;
  citation: Citation;
}

export type ArcFlashMethod = 'not likely' | 'incident energy' | 'ppe category' | 'study needed';

export interface ArcFlashAssessment {
  likely: boolean;
  method: ArcFlashMethod;
  ppeCategory: 1 | 2 | 3 | 4 | null;
  requiredArcRatingCalPerCm2: number | null;
  arcFlashBoundary: Distance | null;
  findings: Finding[];
  /** What the figures above rest on: the likelihood row, and the table row or label. */
  citations: Citation[];
}

export interface TouchCurrent {
  p5: number;
  p50: number;
  p95: number;
  citation: Citation;
}

export interface Permit {
  required: boolean;
  exemption: string | null;
  because: string;
  citation: Citation;
}

export type Verdict = 'stop' | 'open' | 'ready';
export type Stage = 'plan' | 'work' | 'close-out';

export interface Assessment {
  edition: string;
  verdict: Verdict;
  findings: Finding[];
  /** Null while the voltage is not known. */
  boundaries: (ShockBoundaries & { volts: number; because: string; movable: boolean }) | null;
  barricade: (Distance & { citation: Citation }) | null;
  arcFlash: ArcFlashAssessment;
  permit: Permit;
  equipment: RequiredItem[];
  expected: { loadAmperes: number | null };
  /** Also null below 100 V. */
  touch: (TouchCurrent & { volts: number }) | null;
}
