import type { Conductor, SourceKind, SystemCode } from '../enumerations';
import { answeredTaskFacts } from '../tasks';
import { nfpa70e2024 } from '../editions';
import type { Edition } from '../editions/types';
import { readAnswers } from './answers';
import type { Answers } from './answers';
import { hasBattery, readSources } from './sources';
import type { Source } from './sources';
import { voltageOf } from './voltage';
import type { Voltage } from './voltage';

export type ConductorPair = readonly [Conductor, Conductor];

/** One way in which the conductors at a point may be lettered, and all that must be read there. */
export interface ConductorSet {
  readonly phases: readonly Conductor[];
  readonly pairs: readonly ConductorPair[];
}

const THREE_PHASES: readonly Conductor[] = ['A', 'B', 'C'];
const TWO_PHASES: readonly Conductor[] = ['A', 'B'];

/** The same two conductors have one name, whichever was read first. */
export const pairName = (one: string, other: string) =>
  one < other ? `${one}-${other}` : `${other}-${one}`;

function setOf(phases: readonly Conductor[], hasNeutral: boolean): ConductorSet {
  const conductors: Conductor[] = [...phases, ...(hasNeutral ? (['N'] as const) : []), 'G'];
  const pairs = conductors.flatMap((from, index) =>
    conductors.slice(index + 1).map((to): ConductorPair => [from, to]),
  );
  return { phases, pairs };
}

const lettersOf = (system: SystemCode | undefined) =>
  system === '120/240' ? TWO_PHASES : THREE_PHASES;

/**
 * The sets of which one must be read at a point of work: of one circuit
 * whichever phases it has, of whole equipment every phase. While the circuit
 * is not known it is whole equipment.
 */
export function conductorSetsOf(
  { supply }: Answers,
  { isWholeEquipmentTested, isPhaseToNeutral }: Voltage,
): readonly ConductorSet[] {
  const letters = lettersOf(supply.system);
  if (isWholeEquipmentTested) return [setOf(letters, supply.system !== '480 delta')];
  if (isPhaseToNeutral) return letters.map((phase) => setOf([phase], true));
  const hasNeutral = supply.neutralPresent !== false;
  return letters.flatMap((one, index) =>
    letters.slice(index + 1).map((other) => setOf([one, other], hasNeutral)),
  );
}

export interface RequiredPairs {
  /** Null while it is not answered. */
  readonly pointsOfWork: number | null;
  /** One of these is read in full at each point of work. */
  readonly sets: readonly ConductorSet[];
  /**
   * Sources with conductors of their own: each is read, with its `sourceId`
   * and no `from`, to `G` and to each phase of the set at that point.
   */
  readonly ownConductors: readonly RequiredSource[];
  /** Sources whose battery or output is read with direct current. */
  readonly directCurrent: readonly RequiredSource[];
}

export interface RequiredSource {
  readonly index: number;
  readonly id: string | null;
  readonly kind: SourceKind | null;
  readonly from: string | null;
  /** Null: every point of work. */
  readonly points: readonly string[] | null;
}

function describeSource({ index, id, kind, from, points }: Source): RequiredSource {
  return {
    index,
    id: id ?? null,
    kind: kind ?? null,
    from: from ?? null,
    points: points.isAnswered ? points.values : null,
  };
}

/** What the test for absence of voltage of a worksheet must read at each point of work. */
export function requiredPairs(content: unknown, edition: Edition = nfpa70e2024): RequiredPairs {
  const answers = readAnswers(content);
  const sources = readSources(answers);
  const task = answeredTaskFacts(answers.job.task);
  const voltage = voltageOf({ answers, sources, task, isBelowFiftyVolts: false }, edition);
  return {
    pointsOfWork: answers.job.pointsOfWork ?? null,
    sets: conductorSetsOf(answers, voltage),
    ownConductors: sources.filter(({ hasOwnConductors }) => hasOwnConductors).map(describeSource),
    directCurrent: sources.filter(hasBattery).map(describeSource),
  };
}
