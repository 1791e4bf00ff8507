import * as E from '../enumerations';
import { section, text, flag, figure, positive, date, moment, texts, one, many } from './answer';
import { field, fields, notEmpty, readFigures, readObjects, readWhole } from './read';
import type { Fields } from './read';

/** A job has at most this many points of work; a sheet for more is not a sheet. */
const MOST_POINTS_OF_WORK = 40;

function readJob(job: Fields) {
  return {
    siteId: text(job, 'siteId'),
    area: text(job, 'area'),
    equipment: text(job, 'equipment'),
    task: one(job, 'task', E.JOB_TASKS),
    description: text(job, 'description'),
    startsAt: moment(job, 'startsAt'),
    endsAt: moment(job, 'endsAt'),
    occupied: flag(job, 'occupied'),
    pointsOfWork: readWhole(field(job, 'pointsOfWork'), 1, MOST_POINTS_OF_WORK),
    special: notEmpty(many(job, 'special', E.SPECIAL_CONDITIONS)),
    crossesShift: flag(job, 'crossesShift'),
    handover: text(job, 'handover'),
    lamps: one(job, 'lamps', E.LAMPS),
    construction: flag(job, 'construction'),
  };
}

function readSupply(supply: Fields) {
  const readings = section(supply, 'readings');
  return {
    system: one(supply, 'system', E.SYSTEMS),
    circuitVolts: figure(supply, 'circuitVolts'),
    exposure: one(supply, 'exposure', E.EXPOSURES),
    movableConductors: flag(supply, 'movableConductors'),
    panel: text(supply, 'panel'),
    circuit: text(supply, 'circuit'),
    watts: figure(supply, 'watts'),
    readings: {
      phaseToPhase: readFigures(field(readings, 'phaseToPhase')),
      phaseToNeutral: readFigures(field(readings, 'phaseToNeutral')),
    },
    conductorColors: many(supply, 'conductorColors', E.CONDUCTOR_COLORS),
    workVolts: figure(supply, 'workVolts'),
    higherVoltsExposed: flag(supply, 'higherVoltsExposed'),
    neutralPresent: flag(supply, 'neutralPresent'),
    neutralShared: one(supply, 'neutralShared', E.NEUTRAL_SHARED),
    switching: notEmpty(many(supply, 'switching', E.SWITCHINGS)),
    tripped: one(supply, 'tripped', E.TRIPPED),
    damage: flag(supply, 'damage'),
    atService: flag(supply, 'atService'),
  };
}

function readSource(source: Fields) {
  return {
    id: text(source, 'id'),
    kind: one(source, 'kind', E.SOURCE_KINDS),
    from: text(source, 'from'),
    system: one(source, 'system', E.SYSTEMS),
    points: notEmpty(texts(source, 'points')),
    openedAt: one(source, 'openedAt', E.OPENED_AT),
    allPhasesOpened: flag(source, 'allPhasesOpened'),
    upstreamOfTransfer: flag(source, 'upstreamOfTransfer'),
    sameConductorsAs: text(source, 'sameConductorsAs'),
    held: one(source, 'held', E.HELD),
    extraMeasure: one(source, 'extraMeasure', E.EXTRA_MEASURES),
    lockNumber: text(source, 'lockNumber'),
    lockedBy: texts(source, 'lockedBy'),
    byCrewId: text(source, 'byCrewId'),
  };
}

function readDecision(decision: Fields) {
  const permit = section(decision, 'permit');
  return {
    mode: one(decision, 'mode', E.MODES),
    reason: one(decision, 'reason', E.REASONS),
    explanation: text(decision, 'explanation'),
    hazard: one(decision, 'hazard', E.ADDITIONAL_HAZARDS),
    infeasibleBecause: one(decision, 'infeasibleBecause', E.INFEASIBLE_BECAUSE),
    temporaryLight: one(decision, 'temporaryLight', E.TEMPORARY_LIGHT),
    outageRefusedBy: text(decision, 'outageRefusedBy'),
    permit: {
      number: text(permit, 'number'),
      approvedBy: text(permit, 'approvedBy'),
      validUntil: moment(permit, 'validUntil'),
    },
  };
}

function readAbsenceTest(test: Fields) {
  return {
    instrument: one(test, 'instrument', E.INSTRUMENTS),
    category: one(test, 'category', E.METER_CATEGORIES),
    ratedVolts: figure(test, 'ratedVolts'),
    leadsInspected: flag(test, 'leadsInspected'),
    byCrewId: text(test, 'byCrewId'),
  };
}

function readLabel(label: Fields) {
  return {
    ofThisEquipment: flag(label, 'ofThisEquipment'),
    systemVolts: positive(label, 'systemVolts'),
    reviewedOn: date(label, 'reviewedOn'),
    incidentEnergyCalPerCm2: positive(label, 'incidentEnergyCalPerCm2'),
    workingDistanceInches: positive(label, 'workingDistanceInches'),
    minimumArcRatingCalPerCm2: positive(label, 'minimumArcRatingCalPerCm2'),
    ppeCategory: one(label, 'ppeCategory', [1, 2, 3, 4] as const),
    arcFlashBoundaryInches: positive(label, 'arcFlashBoundaryInches'),
  };
}

function readTransformer(transformer: Fields) {
  return {
    kilovoltAmperes: figure(transformer, 'kilovoltAmperes'),
    secondaryVolts: figure(transformer, 'secondaryVolts'),
    impedancePercent: figure(transformer, 'impedancePercent'),
    phases: one(transformer, 'phases', [1, 3] as const),
  };
}

function readArcFlash(arcFlash: Fields) {
  const normal = section(arcFlash, 'normal');
  return {
    task: one(arcFlash, 'task', E.ARC_FLASH_TASKS),
    equipment: one(arcFlash, 'equipment', E.ARC_FLASH_EQUIPMENT),
    /** Every part of a normal condition is answered `true`. */
    isNormal: E.NORMAL_CONDITIONS.every((part) => field(normal, part) === true),
    coversOn: flag(normal, 'coversOn'),
    workingDistanceInches: figure(arcFlash, 'workingDistanceInches'),
    label: readLabel(section(arcFlash, 'label')),
    noLabel: flag(arcFlash, 'noLabel'),
    limitsNotKnown: flag(arcFlash, 'limitsNotKnown'),
    availableFaultKiloamperes: positive(arcFlash, 'availableFaultKiloamperes'),
    clearingSeconds: positive(arcFlash, 'clearingSeconds'),
    transformer: readTransformer(section(arcFlash, 'transformer')),
    clothingRatingCalPerCm2: figure(arcFlash, 'clothingRatingCalPerCm2'),
  };
}

function readGloves(gloves: Fields) {
  return {
    gloveClass: one(gloves, 'gloveClass', E.GLOVE_CLASSES),
    lastTestedOn: date(gloves, 'lastTestedOn'),
    issuedOn: date(gloves, 'issuedOn'),
    airTested: flag(gloves, 'airTested'),
    leatherProtectors: flag(gloves, 'leatherProtectors'),
  };
}

function readSurface(surface: Fields) {
  return {
    kind: one(surface, 'kind', E.GROUNDED_SURFACE_KINDS),
    inReach: flag(surface, 'inReach'),
    covered: flag(surface, 'covered'),
    keptClear: flag(surface, 'keptClear'),
  };
}

function readSurroundings(surroundings: Fields) {
  const ladder = section(surroundings, 'ladder');
  const lift = section(surroundings, 'lift');
  return {
    groundedSurfaces: readObjects(field(surroundings, 'groundedSurfaces'), readSurface),
    access: one(surroundings, 'access', E.ACCESS),
    ladder: {
      material: one(ladder, 'material', E.LADDER_MATERIALS),
      sizeFeet: figure(ladder, 'sizeFeet'),
      standingLevelFeet: figure(ladder, 'standingLevelFeet'),
      placed: flag(ladder, 'placed'),
    },
    lift: {
      fallProtection: flag(lift, 'fallProtection'),
      operatorTrained: flag(lift, 'operatorTrained'),
      insulating: flag(lift, 'insulating'),
    },
    ceilingHeightFeet: figure(surroundings, 'ceilingHeightFeet'),
    ceiling: one(surroundings, 'ceiling', E.CEILINGS),
    lightAdequate: flag(surroundings, 'lightAdequate'),
    wet: flag(surroundings, 'wet'),
    wetMeasures: text(surroundings, 'wetMeasures'),
    conductiveArticlesRemoved: flag(surroundings, 'conductiveArticlesRemoved'),
    peopleMayApproach: flag(surroundings, 'peopleMayApproach'),
    barricadeInches: figure(surroundings, 'barricadeInches'),
    attendant: flag(surroundings, 'attendant'),
    outdoors: flag(surroundings, 'outdoors'),
    overheadLines: one(surroundings, 'overheadLines', E.OVERHEAD_LINES),
  };
}

function readCrewMember(member: Fields) {
  return {
    id: text(member, 'id'),
    userId: text(member, 'userId'),
    name: text(member, 'name'),
    lead: flag(member, 'lead'),
    qualified: flag(member, 'qualified'),
    qualifiedThrough: date(member, 'qualifiedThrough'),
    closest: one(member, 'closest', E.CLOSEST),
    arcRated: flag(member, 'arcRated'),
    rescueTrained: flag(member, 'rescueTrained'),
    worksOnCircuit: flag(member, 'worksOnCircuit'),
    gloves: readGloves(section(member, 'gloves')),
  };
}

function readBriefing(briefing: Fields) {
  const emergency = section(briefing, 'emergency');
  return {
    topics: many(briefing, 'topics', E.BRIEFING_TOPICS),
    emergency: {
      contact: text(emergency, 'contact'),
      rescue: text(emergency, 'rescue'),
      firstAid: text(emergency, 'firstAid'),
      aedAt: text(emergency, 'aedAt'),
    },
  };
}

/** Reads the content of a worksheet, whatever it is. */
export function readAnswers(content: unknown) {
  const root = fields(content);
  const egress = section(root, 'egress');
  const protective = section(root, 'protectiveEquipment');
  return {
    job: readJob(section(root, 'job')),
    supply: readSupply(section(root, 'supply')),
    egressSupply: notEmpty(many(root, 'egressSupply', E.EGRESS_SUPPLIES)),
    egressReaches: one(root, 'egressReaches', E.EGRESS_REACHES),
    egress: { toldTo: text(egress, 'toldTo'), interim: text(egress, 'interim') },
    sources: readObjects(field(root, 'sources'), readSource),
    decision: readDecision(section(root, 'decision')),
    absenceTest: readAbsenceTest(section(root, 'absenceTest')),
    arcFlash: readArcFlash(section(root, 'arcFlash')),
    protectiveEquipment: {
      gloves: readGloves(section(protective, 'gloves')),
      ready: texts(protective, 'ready'),
    },
    surroundings: readSurroundings(section(root, 'surroundings')),
    crew: readObjects(field(root, 'crew'), readCrewMember),
    briefing: readBriefing(section(root, 'briefing')),
  };
}

export type Answers = ReturnType<typeof readAnswers>;
export type SourceAnswers = ReturnType<typeof readSource>;
export type CrewAnswers = ReturnType<typeof readCrewMember>;
export type GloveAnswers = ReturnType<typeof readGloves>;
export type LabelAnswers = ReturnType<typeof readLabel>;
