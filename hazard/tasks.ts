import type { ArcFlashTask, JobTask, Reason } from './enumerations';

/** What depends on the task of a job. */
export interface JobTaskFacts {
  readonly kind: 'repair' | 'testing';
  /** The reasons that may be given for doing it energized. */
  readonly admittedReasons: readonly Reason[];
  /** The mildest arc flash task that it counts as while energized; null where the chosen one counts. */
  readonly arcFlashFloor: ArcFlashTask | null;
  /** More than one circuit is exposed, whatever is answered. */
  readonly alwaysWholeEquipment: boolean;
  readonly opensCeilingOrLuminaire: boolean;
  /** Batteries, drivers and ballasts hold energy after every source is opened. */
  readonly holdsStoredEnergy: boolean;
  /** The instrument must read direct current as well. */
  readonly needsDirectCurrent: boolean;
}

const REPAIR_REASONS: readonly Reason[] = ['additional hazard', 'infeasible', 'below 50 V'];
const TESTING_REASONS: readonly Reason[] = ['testing', 'infeasible', 'below 50 V'];

const luminaireRepair: JobTaskFacts = {
  kind: 'repair',
  admittedReasons: REPAIR_REASONS,
  arcFlashFloor: 'energized work',
  alwaysWholeEquipment: false,
  opensCeilingOrLuminaire: true,
  holdsStoredEnergy: true,
  needsDirectCurrent: false,
};
const panelRepair: JobTaskFacts = {
  ...luminaireRepair,
  alwaysWholeEquipment: true,
  opensCeilingOrLuminaire: false,
  holdsStoredEnergy: false,
};
const testing: JobTaskFacts = {
  kind: 'testing',
  admittedReasons: TESTING_REASONS,
  arcFlashFloor: null,
  alwaysWholeEquipment: false,
  opensCeilingOrLuminaire: false,
  holdsStoredEnergy: false,
  needsDirectCurrent: false,
};

const JOB_TASK_FACTS: Readonly<Record<JobTask, JobTaskFacts>> = {
  'replace luminaire': luminaireRepair,
  'replace driver or ballast': luminaireRepair,
  // The lampholders are live parts.
  'replace lamp': { ...luminaireRepair, holdsStoredEnergy: false },
  'replace battery unit': { ...luminaireRepair, needsDirectCurrent: true },
  // New work has no live need, so no reason is admitted.
  'add or extend circuit': { ...luminaireRepair, admittedReasons: [], holdsStoredEnergy: false },
  'work in panelboard': { ...panelRepair, arcFlashFloor: 'remove cover exposing parts' },
  'replace breaker': { ...panelRepair, arcFlashFloor: 'remove or install breaker' },
  'work on lighting control': { ...luminaireRepair, holdsStoredEnergy: false },
  'trace circuit': testing,
  'test or troubleshoot': { ...testing, arcFlashFloor: 'voltage test' },
  inspect: testing,
  thermography: testing,
};

/** What depends on the task of a job: its kind, the reasons it admits, what it opens. */
export function jobTaskFacts(task: JobTask): JobTaskFacts {
  if (!Object.hasOwn(JOB_TASK_FACTS, task)) {
    throw new RangeError(`task must be a task of the job's table, not ${String(task)}`);
  }
  return JOB_TASK_FACTS[task];
}

/** A task that is not answered yet counts as the repair that asks the most of a luminaire. */
export function answeredTaskFacts(task: JobTask | undefined): JobTaskFacts {
  return task === undefined ? luminaireRepair : jobTaskFacts(task);
}
