import { z } from 'zod';
import * as E from '@/hazard/enumerations';
import { date, dateTime, id, text } from './text';

/** Beyond anything on a worksheet in its unit. A drawing to scale of 1e300 feet would never end. */
const MOST = 1_000_000;
/** A count, distance or rating: not negative, and of this world. */
const figure = z.number().nonnegative().max(MOST);
const volts = z.number().min(-MOST).max(MOST);
const flag = z.boolean();
const longText = text(2000);
/** An id inside one worksheet (a source, a crew member): chosen by the form. */
const localId = text(64);

const gloveSet = z.strictObject({
  gloveClass: z.enum(E.GLOVE_CLASSES).optional(),
  lastTestedOn: date.optional(),
  issuedOn: date.optional(),
  airTested: flag.optional(),
  leatherProtectors: flag.optional(),
});

const job = z.strictObject({
  siteId: id.optional(),
  area: text().optional(),
  equipment: text().optional(),
  task: z.enum(E.JOB_TASKS).optional(),
  description: longText.optional(),
  workOrder: text().optional(),
  startsAt: dateTime.optional(),
  endsAt: dateTime.optional(),
  occupied: flag.optional(),
  pointsOfWork: z.int().min(1).max(40).optional(),
  special: z.array(z.enum(E.SPECIAL_CONDITIONS)).max(10).optional(),
  crossesShift: flag.optional(),
  handover: longText.optional(),
  lamps: z.enum(E.LAMPS).optional(),
  construction: flag.optional(),
});

const supply = z.strictObject({
  system: z.enum(E.SYSTEMS).optional(),
  circuitVolts: figure.optional(),
  exposure: z.enum(E.EXPOSURES).optional(),
  movableConductors: flag.optional(),
  panel: text().optional(),
  circuit: text().optional(),
  watts: figure.optional(),
  readings: z
    .strictObject({
      phaseToPhase: z.array(figure).max(12).optional(),
      phaseToNeutral: z.array(figure).max(12).optional(),
    })
    .optional(),
  conductorColors: z.array(z.enum(E.CONDUCTOR_COLORS)).max(12).optional(),
  workVolts: figure.optional(),
  higherVoltsExposed: flag.optional(),
  neutralPresent: flag.optional(),
  neutralShared: z.enum(E.NEUTRAL_SHARED).optional(),
  switching: z.array(z.enum(E.SWITCHINGS)).max(5).optional(),
  tripped: z.enum(E.TRIPPED).optional(),
  damage: flag.optional(),
  atService: flag.optional(),
});

const source = z.strictObject({
  id: localId.optional(),
  kind: z.enum(E.SOURCE_KINDS).optional(),
  from: text().optional(),
  system: z.enum(E.SYSTEMS).optional(),
  points: z.array(text()).max(40).optional(),
  openedAt: z.enum(E.OPENED_AT).optional(),
  allPhasesOpened: flag.optional(),
  upstreamOfTransfer: flag.optional(),
  sameConductorsAs: localId.optional(),
  held: z.enum(E.HELD).optional(),
  extraMeasure: z.enum(E.EXTRA_MEASURES).optional(),
  lockNumber: text().optional(),
  lockedBy: z.array(localId).max(40).optional(),
  byCrewId: localId.optional(),
});

const decision = z.strictObject({
  mode: z.enum(E.MODES).optional(),
  reason: z.enum(E.REASONS).optional(),
  explanation: longText.optional(),
  hazard: z.enum(E.ADDITIONAL_HAZARDS).optional(),
  infeasibleBecause: z.enum(E.INFEASIBLE_BECAUSE).optional(),
  temporaryLight: z.enum(E.TEMPORARY_LIGHT).optional(),
  outageRefusedBy: text().optional(),
  permit: z
    .strictObject({
      number: text().optional(),
      approvedBy: text().optional(),
      validUntil: dateTime.optional(),
    })
    .optional(),
});

const absenceTest = z.strictObject({
  instrument: z.enum(E.INSTRUMENTS).optional(),
  category: z.enum(E.METER_CATEGORIES).optional(),
  ratedVolts: figure.optional(),
  leadsInspected: flag.optional(),
  byCrewId: localId.optional(),
});

const label = z.strictObject({
  ofThisEquipment: flag.optional(),
  systemVolts: figure.optional(),
  reviewedOn: date.optional(),
  incidentEnergyCalPerCm2: figure.optional(),
  workingDistanceInches: figure.optional(),
  minimumArcRatingCalPerCm2: figure.optional(),
  ppeCategory: z.int().min(1).max(4).optional(),
  arcFlashBoundaryInches: figure.optional(),
});

const arcFlash = z.strictObject({
  task: z.enum(E.ARC_FLASH_TASKS).optional(),
  equipment: z.enum(E.ARC_FLASH_EQUIPMENT).optional(),
  normal: z
    .strictObject({
      installed: flag.optional(),
      maintained: flag.optional(),
      ratedForFault: flag.optional(),
      usedAsListed: flag.optional(),
      doorsClosed: flag.optional(),
      coversOn: flag.optional(),
      noSignOfFailure: flag.optional(),
    })
    .optional(),
  workingDistanceInches: figure.optional(),
  label: label.optional(),
  noLabel: flag.optional(),
  limitsNotKnown: flag.optional(),
  availableFaultKiloamperes: figure.optional(),
  clearingSeconds: figure.optional(),
  transformer: z
    .strictObject({
      kilovoltAmperes: figure.optional(),
      secondaryVolts: figure.optional(),
      impedancePercent: figure.optional(),
      phases: z.union([z.literal(1), z.literal(3)]).optional(),
    })
    .optional(),
  clothingRatingCalPerCm2: figure.optional(),
});

const protectiveEquipment = z.strictObject({
  rubberGoodsId: id.optional(),
  gloves: gloveSet.optional(),
  ready: z.array(text()).max(60).optional(),
});

const groundedSurface = z.strictObject({
  kind: z.enum(E.GROUNDED_SURFACE_KINDS).optional(),
  inReach: flag.optional(),
  covered: flag.optional(),
  keptClear: flag.optional(),
});

const surroundings = z.strictObject({
  groundedSurfaces: z.array(groundedSurface).max(40).optional(),
  access: z.enum(E.ACCESS).optional(),
  ladder: z
    .strictObject({
      material: z.enum(E.LADDER_MATERIALS).optional(),
      sizeFeet: figure.optional(),
      standingLevelFeet: figure.optional(),
      placed: flag.optional(),
    })
    .optional(),
  lift: z
    .strictObject({
      fallProtection: flag.optional(),
      operatorTrained: flag.optional(),
      insulating: flag.optional(),
    })
    .optional(),
  ceilingHeightFeet: figure.optional(),
  ceiling: z.enum(E.CEILINGS).optional(),
  lightAdequate: flag.optional(),
  wet: flag.optional(),
  wetMeasures: text().optional(),
  conductiveArticlesRemoved: flag.optional(),
  peopleMayApproach: flag.optional(),
  barricadeInches: figure.optional(),
  attendant: flag.optional(),
  outdoors: flag.optional(),
  overheadLines: z.enum(E.OVERHEAD_LINES).optional(),
});

const crewMember = z.strictObject({
  id: localId.optional(),
  userId: id.optional(),
  name: text().optional(),
  lead: flag.optional(),
  qualified: flag.optional(),
  qualifiedThrough: date.optional(),
  closest: z.enum(E.CLOSEST).optional(),
  arcRated: flag.optional(),
  rescueTrained: flag.optional(),
  worksOnCircuit: flag.optional(),
  gloves: gloveSet.optional(),
});

const briefing = z.strictObject({
  topics: z.array(z.enum(E.BRIEFING_TOPICS)).max(20).optional(),
  emergency: z
    .strictObject({
      contact: text().optional(),
      rescue: text().optional(),
      firstAid: text().optional(),
      aedAt: text().optional(),
    })
    .optional(),
});

/**
 * The content of a worksheet: what is signed. A draft is saved at any
 * keystroke, so every field may be missing; a cleared field is left out and
 * `null` is refused. What must be answered is for `assess` to say.
 */
export const worksheetContentSchema = z.strictObject({
  job: job.optional(),
  supply: supply.optional(),
  egressSupply: z.array(z.enum(E.EGRESS_SUPPLIES)).max(5).optional(),
  egressReaches: z.enum(E.EGRESS_REACHES).optional(),
  egress: z.strictObject({ toldTo: text().optional(), interim: text().optional() }).optional(),
  sources: z.array(source).max(40).optional(),
  decision: decision.optional(),
  absenceTest: absenceTest.optional(),
  arcFlash: arcFlash.optional(),
  protectiveEquipment: protectiveEquipment.optional(),
  surroundings: surroundings.optional(),
  crew: z.array(crewMember).max(40).optional(),
  briefing: briefing.optional(),
  notes: longText.optional(),
});
export type WorksheetContent = z.infer<typeof worksheetContentSchema>;

/** The record that proves a circuit dead; append-only, beside the revision. */
export const proofSchema = z.strictObject({
  openedSources: z.array(localId).max(40).optional(),
  controlsOperated: flag.optional(),
  provedBefore: flag.optional(),
  provedAfter: flag.optional(),
  otherLiveParts: z.enum(E.OTHER_LIVE_PARTS).optional(),
  neutralAmperes: figure.optional(),
  storedEnergy: z.enum(E.STORED_ENERGY).optional(),
  readings: z
    .array(
      z.strictObject({
        point: text().optional(),
        from: z.enum(E.CONDUCTORS).optional(),
        to: z.enum(E.CONDUCTORS).optional(),
        volts: volts.optional(),
        current: z.enum(E.CURRENTS).optional(),
        lowImpedance: flag.optional(),
        sourceId: localId.optional(),
        at: dateTime.optional(),
      }),
    )
    .max(120)
    .optional(),
});
export type Proof = z.infer<typeof proofSchema>;

/** How the job ended; a record of its own beside the revision. */
export const closeOutSchema = z.strictObject({
  toolsClear: flag.optional(),
  peopleWarned: flag.optional(),
  peopleClear: flag.optional(),
  restored: flag.optional(),
  coversOn: flag.optional(),
  locksRemoved: flag.optional(),
  faultRepaired: flag.optional(),
  egressTestedSeconds: figure.optional(),
  egressLit: flag.optional(),
  notes: longText.optional(),
});
export type CloseOut = z.infer<typeof closeOutSchema>;
