import type {
  ArcFlashEquipment,
  ArcFlashTask,
  EquipmentCondition,
  GloveClass,
  MeterCategory,
  MeterLocation,
  SystemCode,
} from '../enumerations';
import type { CitationId } from '../citations';
import type { Citation, Distance, Restricted } from '../types';

/** The clauses of NFPA 70E that rules and tables rest on, by subject: their numbers move. */
export type EditionCitationId =
  | 'nfpa70e.article320'
  | 'nfpa70e.briefing'
  | 'nfpa70e.training'
  | 'nfpa70e.energizedWork'
  | 'nfpa70e.normalCondition'
  | 'nfpa70e.electricallySafeWorkCondition'
  | 'nfpa70e.allSources'
  | 'nfpa70e.absenceTest'
  | 'nfpa70e.permit'
  | 'nfpa70e.permitExemptions'
  | 'nfpa70e.permitExemptTesting'
  | 'nfpa70e.permitExemptInspection'
  | 'nfpa70e.shockApproach'
  | 'nfpa70e.shockAc'
  | 'nfpa70e.shockAcAbove750'
  | 'nfpa70e.shockDc'
  | 'nfpa70e.arcFlashAssessment'
  | 'nfpa70e.labelReview'
  | 'nfpa70e.likelihood'
  | 'nfpa70e.likelihoodOperateDevice'
  | 'nfpa70e.likelihoodBreaker'
  | 'nfpa70e.incidentEnergyBands'
  | 'nfpa70e.label'
  | 'nfpa70e.protectiveEquipment'
  | 'nfpa70e.nonmeltingClothing'
  | 'nfpa70e.ppeCategoryRow1'
  | 'nfpa70e.ppeCategoryRow2'
  | 'nfpa70e.ppeCategoryRow3'
  | 'nfpa70e.ppeCategoryRow4'
  | 'nfpa70e.ppeCategoryRow5'
  | 'nfpa70e.ppeCategoryRow6'
  | 'nfpa70e.minimumArcRating'
  | 'nfpa70e.barricade';

export interface ShockRow {
  readonly row: string;
  /** A row holds only the top of its band, so two bands can neither overlap nor leave a gap. */
  readonly upToVolts: number;
  readonly limitedMovable: Distance;
  readonly limitedFixed: Distance;
  readonly restricted: NonNullable<Restricted>;
  readonly citation: CitationId;
}

export interface ShockTable {
  readonly citation: CitationId;
  /** Below this voltage nothing is specified; the voltage itself belongs to the first row. */
  readonly notSpecifiedBelow: { readonly volts: number; readonly row: string };
  readonly rows: readonly ShockRow[];
}

/** Which voltage of a system enters the tables. */
export interface SystemRow {
  readonly phaseToPhaseVolts: number;
  /** Ascending. */
  readonly circuitVolts: readonly number[];
  /** High-leg delta: every circuit is entered with the phase-to-phase voltage. */
  readonly alwaysPhaseToPhase: boolean;
}

export interface SystemTable {
  readonly systems: Readonly<Record<SystemCode, SystemRow>>;
  /** Single-phase above this voltage to ground is entered with the phase-to-phase voltage. */
  readonly singlePhaseToGroundAboveVolts: number;
}

export interface VoltageWindow {
  readonly fromVolts: number;
  readonly upToVolts: number;
}

/** What the readings of a live supply may be, for each system. */
export interface IdentificationRow {
  readonly phaseToPhase: VoltageWindow;
  /** Each phase-to-neutral reading lies in one of these; `atMost` counts those in that window. */
  readonly phaseToNeutral: readonly {
    readonly window: VoltageWindow;
    readonly atMost: number | null;
  }[];
  /** The quotient of the means, phase-to-phase over phase-to-neutral; null when it says nothing. */
  readonly quotient: number | null;
  /** Where not null, the exact count of phase-to-phase readings, if there are any. */
  readonly phaseToPhaseCount: number | null;
}

export interface IdentificationTable {
  readonly citation: CitationId;
  readonly quotientTolerance: number;
  readonly systems: Readonly<Record<SystemCode, IdentificationRow>>;
}

export interface LikelihoodRow {
  readonly likely: Readonly<Record<EquipmentCondition, boolean>>;
  readonly citation: CitationId;
}

export type PpeCategory = 1 | 2 | 3 | 4;
export type PpeRowNumber = 1 | 2 | 3 | 4 | 5 | 6;

export interface PpeCategoryRow {
  readonly faultKiloamperes: number;
  readonly clearingSeconds: number;
  readonly workingDistanceInches: number;
  readonly category: PpeCategory;
  readonly arcFlashBoundary: Distance;
  readonly citation: CitationId;
}

/** Rows that all hold at once: the narrowest limits and the strictest figures of them count. */
export interface PpeRowChoice {
  /** The top of the voltage band; the choices with the lowest top that is high enough apply. */
  readonly upToVolts: number;
  readonly rows: readonly [PpeRowNumber, ...PpeRowNumber[]];
}

export interface PpeCategoryTable {
  readonly rows: Readonly<Record<PpeRowNumber, PpeCategoryRow>>;
  /** The choices that may apply to a kind of equipment, from the mildest on. */
  readonly choices: Readonly<Record<ArcFlashEquipment, readonly PpeRowChoice[]>>;
  readonly minimumArcRatingCalPerCm2: Readonly<Record<PpeCategory, number>>;
  readonly minimumArcRatingCitation: CitationId;
}

export interface IncidentEnergyBands {
  readonly citation: CitationId;
  /** Below this no arc rating is required; the arc flash boundary lies where it is reached. */
  readonly fromCalPerCm2: number;
  /** The top of the lower band, which it belongs to. */
  readonly lowerBandUpToCalPerCm2: number;
}

export interface GloveTable {
  readonly useCitation: CitationId;
  readonly testCitation: CitationId;
  /** Alternating current, by class. */
  readonly maxUseVolts: Readonly<Record<GloveClass, number>>;
  readonly testEveryMonths: number;
  readonly issueWithinMonthsOfTest: number;
}

export interface MeterTable {
  readonly citation: CitationId;
  readonly admitted: Readonly<Record<MeterLocation, readonly MeterCategory[]>>;
}

/** Ohms hand to hand at a touch voltage, for the 5th, 50th and 95th percentile. */
export interface BodyImpedanceRow {
  readonly volts: number;
  readonly p5: number;
  readonly p50: number;
  readonly p95: number;
}

export interface BodyImpedanceTable {
  readonly citation: CitationId;
  readonly rows: readonly [BodyImpedanceRow, ...BodyImpedanceRow[]];
}

export interface StepladderTable {
  readonly citation: CitationId;
  readonly sizesFeet: readonly number[];
  readonly standingBelowTopFeet: number;
  readonly reachFeet: number;
  readonly aboveCeilingFeet: number;
}

/**
 * All that a new edition of the standards may change, as data. A worksheet
 * keeps the edition that it was assessed under.
 */
export interface Edition {
  readonly id: string;
  readonly citations: Readonly<Record<EditionCitationId, Citation>>;
  readonly shockAc: ShockTable;
  readonly shockDc: ShockTable;
  readonly systems: SystemTable;
  readonly identification: IdentificationTable;
  readonly likelihood: Readonly<Record<ArcFlashTask, LikelihoodRow>>;
  readonly ppeCategories: PpeCategoryTable;
  readonly incidentEnergyBands: IncidentEnergyBands;
  /** A label is to be reviewed this often. */
  readonly labelReviewMonths: number;
  readonly gloves: GloveTable;
  readonly meters: MeterTable;
  readonly bodyImpedance: BodyImpedanceTable;
  readonly stepladders: StepladderTable;
}
