import type { Edition } from '../editions/types';
import { SYSTEMS } from '../enumerations';
import type { ArcFlashEquipment, SystemCode } from '../enumerations';
import {
  circuitVoltsOf,
  phaseToPhaseVoltsOf,
  shockTableVolts,
  SHOCK_VOLTS_REASONS,
} from '../shock';
import type { JobTaskFacts } from '../tasks';
import type { Answers } from './answers';
import { isAmong } from './isAmong';
import { exposesMoreThanOneCircuit } from './sources';
import type { Source } from './sources';

/** Why the shock table is entered with its voltage; the words are in `shared/messages`. */
export const BOUNDARY_VOLTS_REASONS = [
  ...SHOCK_VOLTS_REASONS,
  'several systems',
  'below 50 V',
] as const;
export type BoundaryVoltsReason = (typeof BOUNDARY_VOLTS_REASONS)[number];

const WHOLE_EQUIPMENT: readonly ArcFlashEquipment[] = [
  'panelboard',
  'motor control center',
  'switchboard',
  'transformer',
];

export interface Voltage {
  /** The highest of all systems present; undefined while the supply's system is not answered. */
  readonly phaseToPhaseVolts: number | undefined;
  /** The highest of the systems that are answered, and no less than the lowest that there is. */
  readonly atLeastVolts: number;
  /** `circuitVolts` is a voltage of the system. */
  readonly isOfSystem: boolean;
  /** The circuit runs between a phase and the neutral; also while that is not known. */
  readonly isPhaseToNeutral: boolean;
  /** More than one circuit is exposed, or may be, at the point of the absence test. */
  readonly isWholeEquipmentTested: boolean;
  /** What enters the shock table; undefined while the system is not answered. */
  readonly shock: { readonly volts: number; readonly because: BoundaryVoltsReason } | undefined;
  /** The highest that can be touched. */
  readonly touchVolts: number | undefined;
  /** What gloves are chosen for: never phase-to-ground. */
  readonly gloveVolts: number | undefined;
}

interface Question {
  answers: Answers;
  task: JobTaskFacts;
  sources: readonly Source[];
  isBelowFiftyVolts: boolean;
}

interface Circuit {
  circuitVolts: number | undefined;
  /** The phase-to-phase voltages of the systems that other sources bring. */
  others: readonly number[];
  isWhole: boolean;
  isSeveral: boolean;
}

/** What enters the shock table, and the highest voltage, of a supply whose system is answered. */
function supplied(
  system: SystemCode,
  { circuitVolts, others, isWhole, isSeveral }: Circuit,
  edition: Edition,
): { phaseToPhaseVolts: number; shock: NonNullable<Voltage['shock']> } {
  const ownVolts = phaseToPhaseVoltsOf(system, edition);
  const exposure = isWhole ? 'whole equipment' : 'one circuit';
  const question = { system, circuitVolts: circuitVolts ?? ownVolts, exposure } as const;
  const own = shockTableVolts(question, edition);
  const phaseToPhaseVolts = Math.max(ownVolts, ...others);
  // Beside a second system, whatever of the two is higher can be reached.
  const shock =
    isSeveral && phaseToPhaseVolts > own.volts
      ? { volts: phaseToPhaseVolts, because: 'several systems' as const }
      : own;
  return { phaseToPhaseVolts, shock };
}

/** Which voltages count, for the tables, the instrument, the gloves and a touch. */
export function voltageOf(question: Question, edition: Edition): Voltage {
  const { answers, task, sources, isBelowFiftyVolts } = question;
  const { system, circuitVolts, exposure, workVolts } = answers.supply;
  const others = sources.flatMap((source) =>
    source.system ? [phaseToPhaseVoltsOf(source.system, edition)] : [],
  );
  const isOfSystem = system !== undefined && isAmong(circuitVolts, circuitVoltsOf(system, edition));
  const isWholeEquipmentTested =
    exposure !== 'one circuit' ||
    task.alwaysWholeEquipment ||
    !isOfSystem ||
    isAmong(answers.arcFlash.equipment, WHOLE_EQUIPMENT);
  const isWhole = isWholeEquipmentTested || sources.some(exposesMoreThanOneCircuit);
  const isSeveral = sources.some((source) => source.system && source.system !== system);

  const known = system && supplied(system, { circuitVolts, others, isWhole, isSeveral }, edition);
  const lowest = Math.min(...SYSTEMS.map((one) => phaseToPhaseVoltsOf(one, edition)));
  const reachedVolts = known && Math.max(known.phaseToPhaseVolts, circuitVolts ?? 0);
  const touchVolts = isWhole || isSeveral ? reachedVolts : circuitVolts;
  return {
    phaseToPhaseVolts: known?.phaseToPhaseVolts,
    atLeastVolts: Math.max(known?.phaseToPhaseVolts ?? lowest, ...others),
    isOfSystem,
    isPhaseToNeutral: !isOfSystem || circuitVolts !== phaseToPhaseVoltsOf(system, edition),
    isWholeEquipmentTested,
    shock:
      known && isBelowFiftyVolts && workVolts !== undefined
        ? { volts: workVolts, because: 'below 50 V' }
        : known?.shock,
    touchVolts: isBelowFiftyVolts ? workVolts : touchVolts,
    gloveVolts: known ? Math.max(known.shock.volts, circuitVolts ?? 0) : circuitVolts,
  };
}
