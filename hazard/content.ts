import type * as E from './enumerations';

/**
 * What a worksheet says, as `assess` reads it. Any field may be missing:
 * `shared/worksheet.ts` holds the strict schemas of the same shapes.
 *
 * Date-times are ISO 8601 with offset, dates are `YYYY-MM-DD`, distances are
 * in the unit of their name.
 */
export interface WorksheetContent {
  job?: JobSection;
  supply?: SupplySection;
  egressSupply?: E.EgressSupply[];
  egressReaches?: E.EgressReaches;
  egress?: { toldTo?: string; interim?: string };
  sources?: EnergySource[];
  decision?: DecisionSection;
  absenceTest?: AbsenceTestSection;
  arcFlash?: ArcFlashSection;
  protectiveEquipment?: ProtectiveEquipmentSection;
  surroundings?: SurroundingsSection;
  crew?: CrewMember[];
  briefing?: BriefingSection;
  notes?: string;
}

export interface JobSection {
  siteId?: string;
  area?: string;
  equipment?: string;
  task?: E.JobTask;
  description?: string;
  workOrder?: string;
  startsAt?: string;
  endsAt?: string;
  occupied?: boolean;
  pointsOfWork?: number;
  special?: E.SpecialCondition[];
  crossesShift?: boolean;
  handover?: string;
  lamps?: E.Lamps;
  construction?: boolean;
}

export interface SupplySection {
  system?: E.SystemCode;
  circuitVolts?: number;
  exposure?: E.Exposure;
  movableConductors?: boolean;
  panel?: string;
  circuit?: string;
  watts?: number;
  readings?: { phaseToPhase?: number[]; phaseToNeutral?: number[] };
  conductorColors?: E.ConductorColor[];
  workVolts?: number;
  higherVoltsExposed?: boolean;
  neutralPresent?: boolean;
  neutralShared?: E.NeutralShared;
  switching?: E.Switching[];
  tripped?: E.Tripped;
  damage?: boolean;
  atService?: boolean;
}

export interface EnergySource {
  id?: string;
  kind?: E.SourceKind;
  from?: string;
  system?: E.SystemCode;
  points?: string[];
  openedAt?: E.OpenedAt;
  allPhasesOpened?: boolean;
  upstreamOfTransfer?: boolean;
  sameConductorsAs?: string;
  held?: E.Held;
  extraMeasure?: E.ExtraMeasure;
  lockNumber?: string;
  lockedBy?: string[];
  byCrewId?: string;
}

export interface DecisionSection {
  mode?: E.Mode;
  reason?: E.Reason;
  explanation?: string;
  hazard?: E.AdditionalHazard;
  infeasibleBecause?: E.InfeasibleBecause;
  temporaryLight?: E.TemporaryLight;
  outageRefusedBy?: string;
  permit?: { number?: string; approvedBy?: string; validUntil?: string };
}

export interface AbsenceTestSection {
  instrument?: E.Instrument;
  category?: E.MeterCategory;
  ratedVolts?: number;
  leadsInspected?: boolean;
  byCrewId?: string;
}

/** What is printed on an equipment's arc flash label (70E 130.5(H)). */
export interface EquipmentLabel {
  ofThisEquipment?: boolean;
  systemVolts?: number;
  reviewedOn?: string;
  incidentEnergyCalPerCm2?: number;
  workingDistanceInches?: number;
  minimumArcRatingCalPerCm2?: number;
  ppeCategory?: number;
  arcFlashBoundaryInches?: number;
}

export interface TransformerNameplate {
  kilovoltAmperes?: number;
  secondaryVolts?: number;
  impedancePercent?: number;
  phases?: 1 | 3;
}

export interface ArcFlashSection {
  task?: E.ArcFlashTask;
  equipment?: E.ArcFlashEquipment;
  normal?: Partial<Record<E.NormalCondition, boolean>>;
  workingDistanceInches?: number;
  label?: EquipmentLabel;
  noLabel?: boolean;
  limitsNotKnown?: boolean;
  availableFaultKiloamperes?: number;
  clearingSeconds?: number;
  transformer?: TransformerNameplate;
  clothingRatingCalPerCm2?: number;
}

export interface GloveSet {
  gloveClass?: E.GloveClass;
  lastTestedOn?: string;
  issuedOn?: string;
  airTested?: boolean;
  leatherProtectors?: boolean;
}

export interface ProtectiveEquipmentSection {
  rubberGoodsId?: string;
  gloves?: GloveSet;
  ready?: string[];
}

export interface GroundedSurface {
  kind?: E.GroundedSurfaceKind;
  inReach?: boolean;
  covered?: boolean;
  keptClear?: boolean;
}

export interface SurroundingsSection {
  groundedSurfaces?: GroundedSurface[];
  access?: E.Access;
  ladder?: {
    material?: E.LadderMaterial;
    sizeFeet?: number;
    standingLevelFeet?: number;
    placed?: boolean;
  };
  lift?: { fallProtection?: boolean; operatorTrained?: boolean; insulating?: boolean };
  ceilingHeightFeet?: number;
  ceiling?: E.Ceiling;
  lightAdequate?: boolean;
  wet?: boolean;
  wetMeasures?: string;
  conductiveArticlesRemoved?: boolean;
  peopleMayApproach?: boolean;
  barricadeInches?: number;
  attendant?: boolean;
  outdoors?: boolean;
  overheadLines?: E.OverheadLines;
}

export interface CrewMember {
  id?: string;
  userId?: string;
  name?: string;
  lead?: boolean;
  qualified?: boolean;
  qualifiedThrough?: string;
  closest?: E.Closest;
  arcRated?: boolean;
  rescueTrained?: boolean;
  worksOnCircuit?: boolean;
  gloves?: GloveSet;
}

export interface BriefingSection {
  topics?: E.BriefingTopic[];
  emergency?: { contact?: string; rescue?: string; firstAid?: string; aedAt?: string };
}

/** One reading of the test for absence of voltage; `volts` may be negative. */
export interface VoltageReading {
  point?: string;
  from?: E.Conductor;
  to?: E.Conductor;
  volts?: number;
  current?: E.Current;
  lowImpedance?: boolean;
  sourceId?: string;
  at?: string;
}

/** What the lead records to prove the circuit dead. */
export interface Proof {
  openedSources?: string[];
  controlsOperated?: boolean;
  provedBefore?: boolean;
  provedAfter?: boolean;
  otherLiveParts?: E.OtherLiveParts;
  neutralAmperes?: number;
  storedEnergy?: E.StoredEnergy;
  readings?: VoltageReading[];
}

export interface CloseOut {
  toolsClear?: boolean;
  peopleWarned?: boolean;
  peopleClear?: boolean;
  restored?: boolean;
  coversOn?: boolean;
  locksRemoved?: boolean;
  faultRepaired?: boolean;
  egressTestedSeconds?: number;
  egressLit?: boolean;
  notes?: string;
}
