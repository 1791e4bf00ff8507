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

function shockOf(
  { system, circuitVolts }: { system: SystemCode; circuitVolts: number | undefined },
  isWhole: boolean,
  edition: Edition,
): { volts: number; because: BoundaryVoltsReason } {
  const isKnown = circuitVolts !== undefined;
  return shockTableVolts(
    {
      system,
      circuitVolts: isKnown ? circuitVolts : phaseToPhaseVoltsOf(system, edition),
      exposure: isWhole ? 'whole equipment' : 'one circuit',
    },
    edition,
  );
}

/** Which voltages count, for the tables, the instrument, the gloves and a touch. */
export function voltageOf(question: Question, edition: Edition): Voltage {
  const { answers, task, sources, isBelowFiftyVolts } = question;
  const { system, circuitVolts, exposure, workVolts } = answers.supply;
  const ownVolts = system && phaseToPhaseVoltsOf(system, edition);
  const others = sources.flatMap((source) =>
    source.system ? [phaseToPhaseVoltsOf(source.system, edition)] : [],
  );
  const phaseToPhaseVolts = ownVolts && Math.max(ownVolts, ...others);
  const lowest = Math.min(...SYSTEMS.map((one) => phaseToPhaseVoltsOf(one, edition)));

  const isOfSystem =
    system !== undefined &&
    circuitVolts !== undefined &&
    circuitVoltsOf(system, edition).includes(circuitVolts);
  const equipment = answers.arcFlash.equipment;
  const isWholeEquipmentTested =
    exposure !== 'one circuit' ||
    task.alwaysWholeEquipment ||
    !isOfSystem ||
    (equipment !== undefined && WHOLE_EQUIPMENT.includes(equipment));
  const isWhole = isWholeEquipmentTested || sources.some(exposesMoreThanOneCircuit);

  const shock =
    system === undefined || phaseToPhaseVolts === undefined
      ? undefined
      : shockOf({ system, circuitVolts }, isWhole, edition);
  // Beside a second system, whatever of the two is higher can be reached.
  const isSeveral = sources.some((source) => source.system && source.system !== system);
  const highest =
    shock && phaseToPhaseVolts && isSeveral && phaseToPhaseVolts > shock.volts
      ? { volts: phaseToPhaseVolts, because: 'several systems' as const }
      : shock;
  return {
    phaseToPhaseVolts,
    atLeastVolts: Math.max(phaseToPhaseVolts ?? lowest, ...others),
    isOfSystem,
    isPhaseToNeutral: !isOfSystem || circuitVolts !== ownVolts,
    isWholeEquipmentTested,
    shock:
      highest && isBelowFiftyVolts && workVolts !== undefined
        ? { volts: workVolts, because: 'below 50 V' }
        : highest,
    touchVolts:
      isBelowFiftyVolts || isWhole || isSeveral
        ? isBelowFiftyVolts
          ? workVolts
          : phaseToPhaseVolts && Math.max(phaseToPhaseVolts, circuitVolts ?? 0)
        : circuitVolts,
    gloveVolts: highest ? Math.max(highest.volts, circuitVolts ?? 0) : circuitVolts,
  };
}
