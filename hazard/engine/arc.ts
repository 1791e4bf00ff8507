import { evaluateArcFlash } from '../arcFlashEvaluation';
import { boltedFaultAmperes } from '../currents';
import type { TransformerQuestion } from '../currents';
import type { Edition } from '../editions/types';
import { EQUIPMENT_CONDITIONS } from '../enumerations';
import type { ArcFlashTask, EquipmentCondition } from '../enumerations';
import { arcFlashLikelihood } from '../likelihood';
import type { JobTaskFacts } from '../tasks';
import type { ArcFlashAssessment } from '../types';
import type { Answers, LabelAnswers } from './answers';
import { isExtraLowVoltage } from './path';
import type { Path } from './path';
import type { People } from './people';
import type { Voltage } from './voltage';

export interface ArcFacts {
  readonly likely: boolean;
  /** The answer; its findings are those that this rule set reports, at every path. */
  readonly result: ArcFlashAssessment;
  /** The chosen task is milder than what the job makes of it. */
  readonly taskDoesNotFit: boolean;
  readonly floor: ArcFlashTask | undefined;
  /** Fields of a transformer that was begun, without which it gives no estimate. */
  readonly transformerGaps: readonly string[];
}

interface Question {
  answers: Answers;
  task: JobTaskFacts;
  path: Path;
  people: People;
  voltage: Voltage;
  day: string;
  isBelowFiftyVolts: boolean;
}

/** The mildest task that the job counts as (70E Table 130.5(C)); undefined where the chosen one counts. */
function floorOf({ answers, task, path, people }: Question): ArcFlashTask | undefined {
  if (path === 'off') return 'voltage test';
  const { job, arcFlash, supply } = answers;
  if (job.task === 'work on lighting control' && isExtraLowVoltage(supply)) return undefined;
  if (task.arcFlashFloor !== null) return task.arcFlashFloor;
  if (job.task === 'trace circuit') return people.someoneEnters ? 'voltage test' : undefined;
  // Inspection and thermography: a cover that comes off exposes parts.
  return arcFlash.coversOn === true ? undefined : 'remove cover exposing parts';
}

/** What a task that was chosen for its mildness counts as, unless its conditions hold. */
function countsAs(chosen: ArcFlashTask, { answers, people }: Question): ArcFlashTask {
  const { workVolts, higherVoltsExposed } = answers.supply;
  if (chosen === 'control circuit up to 125 V') {
    const isControlCircuit =
      workVolts !== undefined && workVolts <= 125 && higherVoltsExposed === false;
    return isControlCircuit ? chosen : 'energized work';
  }
  if (chosen === 'thermography or inspection outside restricted') {
    const isOutside = answers.arcFlash.coversOn === true && !people.someoneEnters;
    return isOutside ? chosen : 'remove cover exposing parts';
  }
  return chosen;
}

/** Under some condition the floor is likely and the chosen task is not. */
function isMilder(chosen: ArcFlashTask, floor: ArcFlashTask, edition: Edition): boolean {
  const { [chosen]: one, [floor]: other } = edition.likelihood;
  return EQUIPMENT_CONDITIONS.some(
    (condition) => other.likely[condition] && !one.likely[condition],
  );
}

/** The label as printed, or undefined while nothing of it is answered. */
function labelOf(label: LabelAnswers): LabelAnswers | undefined {
  return Object.values(label).some((answer) => answer !== undefined) ? label : undefined;
}

/** The infinite bus estimate, and the fields that keep it from being made. */
function transformerOf({ arcFlash }: Answers): { kiloamperes?: number; gaps: readonly string[] } {
  const { kilovoltAmperes, secondaryVolts, impedancePercent, phases } = arcFlash.transformer;
  const fields = { kilovoltAmperes, secondaryVolts, impedancePercent, phases };
  if (Object.values(fields).every((value) => value === undefined)) return { gaps: [] };
  const gaps = Object.entries(fields).flatMap(([name, value]) => (value ? [] : [name]));
  if (gaps.length > 0) return { gaps };
  try {
    const amperes = boltedFaultAmperes(fields as TransformerQuestion);
    return { kiloamperes: amperes / 1000, gaps };
  } catch {
    // Figures past any number: no estimate can be made of them.
    return { gaps: ['kilovoltAmperes'] };
  }
}

function isLabelled({ arcFlash }: Answers): boolean {
  return labelOf(arcFlash.label) !== undefined && arcFlash.label.ofThisEquipment !== false;
}

function evaluate(
  { answers, voltage, day }: Question,
  likelihood: ReturnType<typeof arcFlashLikelihood>,
  transformerKiloamperes: number | undefined,
  edition: Edition,
): ArcFlashAssessment {
  const { label, ...arcFlash } = answers.arcFlash;
  return evaluateArcFlash(
    {
      ...arcFlash,
      likelihood,
      volts: voltage.phaseToPhaseVolts,
      label: labelOf(label),
      transformerKiloamperes,
      day,
    },
    edition,
  );
}

/** Parts below 50 V: no arc flash is likely, and no label is read. */
function belowFiftyVolts(edition: Edition): ArcFacts {
  const task = 'control circuit up to 125 V';
  const likelihood = arcFlashLikelihood({ task, condition: 'normal' }, edition);
  return {
    likely: false,
    result: evaluateArcFlash({ likelihood }, edition),
    taskDoesNotFit: false,
    floor: undefined,
    transformerGaps: [],
  };
}

/** Whether an arc flash is likely, by the worse of the chosen task and the job's floor. */
export function arcOf(question: Question, edition: Edition): ArcFacts {
  if (question.isBelowFiftyVolts) return belowFiftyVolts(edition);
  const { arcFlash, supply } = question.answers;
  const condition: EquipmentCondition =
    arcFlash.isNormal && supply.damage !== true ? 'normal' : 'abnormal';
  const chosen = arcFlash.task;
  const floor = floorOf(question);
  const counted = chosen && countsAs(chosen, question);
  // What is neither chosen nor given by the job is the worst of the table.
  const tasks = [counted, floor].filter((task) => task !== undefined);
  const likelihoods = (tasks.length > 0 ? tasks : (['energized work'] as const)).map((task) =>
    arcFlashLikelihood({ task, condition }, edition),
  );
  const likelihood = likelihoods.reduce((one, other) => (one.likely ? one : other));

  const { kiloamperes, gaps } = transformerOf(question.answers);
  const result = evaluate(question, likelihood, kiloamperes, edition);
  const isByTable = result.likely && !isLabelled(question.answers);
  return {
    likely: result.likely,
    result,
    taskDoesNotFit:
      chosen !== undefined &&
      (counted !== chosen || (floor !== undefined && isMilder(chosen, floor, edition))),
    floor,
    // Without a fault current it is that which is open.
    transformerGaps: isByTable && arcFlash.availableFaultKiloamperes !== undefined ? gaps : [],
  };
}
