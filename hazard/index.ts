import { JOB_TASKS } from './enumerations';
import type { JobTask } from './enumerations';

export * from './enumerations';
export type * from './content';
export type * from './types';

export { arcFlashLikelihood } from './likelihood';
export { assessArcFlash } from './arcFlash';
export { ARC_STUDY_LIMITS } from './arcFlashFindings';
export { citation } from './citations';
export { clearingSecondsOfCycles } from './clearing';
export type { CitationId } from './citations';
export { boltedFaultAmperes, loadAmperes, touchMilliamperes } from './currents';
export { EDITIONS } from './editions';
export type { Edition } from './editions/types';
export { gloveStatus, selectGloveClass } from './gloves';
export { identifySystem } from './identifySystem';
export { meterIsAdequate } from './meter';
export {
  SHOCK_VOLTS_REASONS,
  circuitVoltsOf,
  lookupShockBoundaries,
  phaseToPhaseVoltsOf,
  shockTableVolts,
} from './shock';
export { barricadeDistance, minimumStepladder } from './surroundings';

/** The tasks of a job, in the order of the task table. */
export const TASKS: readonly JobTask[] = JOB_TASKS;

export { assess, RULE_CODES } from './assess';
export type { AssessOptions } from './assess';
export { requiredPairs } from './engine/conductors';
export type {
  ConductorPair,
  ConductorSet,
  RequiredPairs,
  RequiredSource,
} from './engine/conductors';
export { REQUIRED_ITEM_IDS } from './engine/items';
export type { RequiredItemId } from './engine/items';
export { pathOf } from './engine/path';
export type { Path } from './engine/path';
export { PERMIT_EXEMPTIONS, PERMIT_REASONS } from './engine/permit';
export type { PermitExemption, PermitReason } from './engine/permit';
export { BOUNDARY_VOLTS_REASONS } from './engine/voltage';
export type { BoundaryVoltsReason } from './engine/voltage';
export { jobTaskFacts } from './tasks';
export type { JobTaskFacts } from './tasks';
