/**
 * Every closed list of answers, as data in English.
 *
 * The words that people read are in `shared/messages`, keyed by these values,
 * so that a value never changes when a wording does.
 */

export const SYSTEMS = [
  '208Y/120',
  '480Y/277',
  '120/240',
  '240/120 high-leg',
  '480 delta',
] as const;
export type SystemCode = (typeof SYSTEMS)[number];

export const JOB_TASKS = [
  'replace luminaire',
  'replace driver or ballast',
  'replace lamp',
  'replace battery unit',
  'add or extend circuit',
  'work in panelboard',
  'replace breaker',
  'work on lighting control',
  'trace circuit',
  'test or troubleshoot',
  'inspect',
  'thermography',
] as const;
export type JobTask = (typeof JOB_TASKS)[number];

export const SPECIAL_CONDITIONS = [
  'none of these',
  'above 480 V',
  'inverter or battery string',
  'solar or storage',
  'utility side',
  'classified location',
  'manhole or vault',
] as const;
export type SpecialCondition = (typeof SPECIAL_CONDITIONS)[number];

export const LAMPS = ['double-ended', 'other'] as const;
export type Lamps = (typeof LAMPS)[number];

export const EXPOSURES = ['one circuit', 'whole equipment'] as const;
export type Exposure = (typeof EXPOSURES)[number];

export const SWITCHINGS = [
  'one place',
  'two or more places',
  'automatic',
  'none',
  'not known',
] as const;
export type Switching = (typeof SWITCHINGS)[number];

export const NEUTRAL_SHARED = ['no', 'yes', 'not known'] as const;
export type NeutralShared = (typeof NEUTRAL_SHARED)[number];

export const TRIPPED = ['no', 'cause found and repaired', 'cause not found'] as const;
export type Tripped = (typeof TRIPPED)[number];

export const CONDUCTOR_COLORS = [
  'black',
  'red',
  'blue',
  'white',
  'brown',
  'orange',
  'yellow',
  'gray',
  'green',
  'bare',
  'other',
] as const;
export type ConductorColor = (typeof CONDUCTOR_COLORS)[number];

export const EGRESS_SUPPLIES = [
  'battery units',
  'generator',
  'central inverter',
  'none after checking',
  'unknown',
] as const;
export type EgressSupply = (typeof EGRESS_SUPPLIES)[number];

export const EGRESS_REACHES = ['this equipment', 'other equipment only, checked'] as const;
export type EgressReaches = (typeof EGRESS_REACHES)[number];

export const SOURCE_KINDS = [
  'normal',
  'unswitched hot',
  'generator',
  'battery unit',
  'central inverter',
  'traveler',
  'shared neutral',
  'control',
  'backfeed',
] as const;
export type SourceKind = (typeof SOURCE_KINDS)[number];

export const OPENED_AT = [
  'breaker',
  'feeder breaker',
  'disconnect',
  'luminaire disconnect',
  'battery connector',
  'fuse',
  'plug',
  'wall switch',
  'control device',
  'none',
] as const;
export type OpenedAt = (typeof OPENED_AT)[number];

export const HELD = ['lock and tag', 'lock', 'tag', 'exclusive control', 'none'] as const;
export type Held = (typeof HELD)[number];

export const EXTRA_MEASURES = [
  'isolating element removed',
  'controlling switch blocked',
  'extra disconnect opened',
] as const;
export type ExtraMeasure = (typeof EXTRA_MEASURES)[number];

export const MODES = ['off', 'energized'] as const;
export type Mode = (typeof MODES)[number];

export const REASONS = ['additional hazard', 'infeasible', 'below 50 V', 'testing'] as const;
export type Reason = (typeof REASONS)[number];

export const ADDITIONAL_HAZARDS = ['life support', 'alarm', 'ventilation', 'illumination'] as const;
export type AdditionalHazard = (typeof ADDITIONAL_HAZARDS)[number];

export const INFEASIBLE_BECAUSE = [
  'can only be tested energized',
  'continuous industrial process',
  'other',
] as const;
export type InfeasibleBecause = (typeof INFEASIBLE_BECAUSE)[number];

export const TEMPORARY_LIGHT = ['possible', 'not possible'] as const;
export type TemporaryLight = (typeof TEMPORARY_LIGHT)[number];

export const INSTRUMENTS = ['contact', 'proximity'] as const;
export type Instrument = (typeof INSTRUMENTS)[number];

export const METER_CATEGORIES = ['II', 'III', 'IV'] as const;
export type MeterCategory = (typeof METER_CATEGORIES)[number];

export const METER_LOCATIONS = ['cord-connected', 'fixed wiring', 'service'] as const;
export type MeterLocation = (typeof METER_LOCATIONS)[number];

/** The tasks of the likelihood table (70E Table 130.5(C)), in its order. */
export const ARC_FLASH_TASKS = [
  'operate device',
  'open dead-front door',
  'cover without exposed parts',
  'remove or install breaker',
  'voltage test',
  'remove cover exposing parts',
  'energized work on equipment fed from panelboard',
  'energized work',
  'temporary grounds',
  'control circuit up to 125 V',
  'thermography or inspection outside restricted',
  'read panel meter',
] as const;
export type ArcFlashTask = (typeof ARC_FLASH_TASKS)[number];

export const EQUIPMENT_CONDITIONS = ['normal', 'abnormal'] as const;
export type EquipmentCondition = (typeof EQUIPMENT_CONDITIONS)[number];

export const ARC_FLASH_EQUIPMENT = [
  'panelboard',
  'motor control center',
  'switchboard',
  'luminaire',
  'junction box',
  'disconnect',
  'transformer',
  'other',
] as const;
export type ArcFlashEquipment = (typeof ARC_FLASH_EQUIPMENT)[number];

/** The seven parts of a normal operating condition (70E-2024 110.2(B) Exception 1). */
export const NORMAL_CONDITIONS = [
  'installed',
  'maintained',
  'ratedForFault',
  'usedAsListed',
  'doorsClosed',
  'coversOn',
  'noSignOfFailure',
] as const;
export type NormalCondition = (typeof NORMAL_CONDITIONS)[number];

export const GLOVE_CLASSES = ['00', '0', '1', '2', '3', '4'] as const;
export type GloveClass = (typeof GLOVE_CLASSES)[number];

export const GROUNDED_SURFACE_KINDS = [
  'ceiling grid',
  'duct',
  'strut',
  'conduit',
  'pipe',
  'structural steel',
  'enclosure',
  'other',
] as const;
export type GroundedSurfaceKind = (typeof GROUNDED_SURFACE_KINDS)[number];

export const ACCESS = ['floor', 'stepladder', 'extension ladder', 'platform', 'lift'] as const;
export type Access = (typeof ACCESS)[number];

export const LADDER_MATERIALS = ['fiberglass', 'wood', 'aluminum', 'other conductive'] as const;
export type LadderMaterial = (typeof LADDER_MATERIALS)[number];

export const CEILINGS = ['no suspect material', 'suspected'] as const;
export type Ceiling = (typeof CEILINGS)[number];

export const OVERHEAD_LINES = ['none within 10 ft', 'nearer than 10 ft'] as const;
export type OverheadLines = (typeof OVERHEAD_LINES)[number];

/** From far to near: the nearest a person comes while parts are live or not yet proved dead. */
export const CLOSEST = [
  'outside all boundaries',
  'outside limited',
  'limited',
  'limited with escort',
  'restricted',
] as const;
export type Closest = (typeof CLOSEST)[number];

export const OTHER_LIVE_PARTS = ['none', 'guarded', 'not guarded'] as const;
export type OtherLiveParts = (typeof OTHER_LIVE_PARTS)[number];

export const STORED_ENERGY = ['none after checking', 'discharged', 'not discharged'] as const;
export type StoredEnergy = (typeof STORED_ENERGY)[number];

export const CONDUCTORS = ['A', 'B', 'C', 'N', 'G'] as const;
export type Conductor = (typeof CONDUCTORS)[number];

export const CURRENTS = ['ac', 'dc'] as const;
export type Current = (typeof CURRENTS)[number];

/** The topics that a job briefing must cover (70E-2024 110.3(I); 2021: 110.5(I)). */
export const BRIEFING_TOPICS = [
  'job and tasks',
  'electrical hazards',
  'shock boundaries and protection',
  'arc flash boundary and protection',
  'work procedures',
  'special precautions',
  'energy source controls',
  'protective equipment',
  'who may come how close',
  'emergency plan',
  'stopping and refusing',
  'permit',
] as const;
export type BriefingTopic = (typeof BRIEFING_TOPICS)[number];
