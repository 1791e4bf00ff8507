import type { Answers, ProofAnswers, ReadingAnswers } from './answers';
import { conductorSetsOf, pairName } from './conductors';
import type { ConductorPair, ConductorSet } from './conductors';
import type { Moment } from './moment';
import type { Source } from './sources';
import type { Voltage } from './voltage';

export interface Reading extends ReadingAnswers {
  readonly index: number;
}

/** What was read at one point of work, beside what must be. */
export interface PointOfWork {
  readonly point: string;
  /** Of the sets that would do, the one that lacks the least. */
  readonly set: ConductorSet;
  readonly missing: readonly ConductorPair[];
}

export interface Readings {
  /** Those that count, one for each pair, point, current and source. */
  readonly governing: readonly Reading[];
  readonly points: readonly PointOfWork[];
  /** The names of the conductors that a source's own conductor was read to at a point. */
  readTo(source: Source, point: string): ReadonlySet<string>;
  hasDirectCurrent(source: Source, point: string): boolean;
}

const SEPARATOR = '\u0000';

/**
 * A reading that says where, when and between what it was taken, during the
 * work and not after it. One that does not proves nothing; a voltage that it
 * shows still counts.
 */
function isInTime({ at }: ReadingAnswers, startsAt: Moment | undefined, on: Moment): boolean {
  if (at === undefined || at.instant > on.instant) return false;
  return startsAt === undefined || at.instant >= startsAt.instant;
}

const isPlaced = ({ point, volts }: ReadingAnswers) => point !== undefined && volts !== undefined;

/** What a reading is of; readings of the same thing govern one another. */
function subjectOf({ point, from, to, current, sourceId }: ReadingAnswers): string {
  const between = from === undefined ? `${to ?? ''}` : pairName(from, to ?? '');
  return [point, between, current, sourceId ?? ''].join(SEPARATOR);
}

/** A reading that may fill a pair or stand for a source's own conductor. */
const isComplete = ({ from, to, sourceId }: ReadingAnswers) =>
  to !== undefined && (from !== undefined || sourceId !== undefined);

/**
 * The highest by magnitude; but a last one with low impedance settles a ghost
 * voltage, and both stay on record.
 */
function governingOf(readings: readonly Reading[]): Reading | undefined {
  const last = readings[readings.length - 1];
  if (last?.lowImpedance === true) return last;
  return readings.reduce<Reading | undefined>((one, other) => {
    const isHigher = Math.abs(other.volts ?? 0) > Math.abs(one?.volts ?? 0);
    return one === undefined || isHigher ? other : one;
  }, undefined);
}

function groupBySubject(readings: readonly Reading[]): ReadonlyMap<string, Reading[]> {
  const groups = new Map<string, Reading[]>();
  for (const reading of readings) {
    const subject = subjectOf(reading);
    const group = groups.get(subject);
    if (group) group.push(reading);
    else groups.set(subject, [reading]);
  }
  return groups;
}

function missingOf(set: ConductorSet, filled: ReadonlySet<string>): readonly ConductorPair[] {
  return set.pairs.filter(([from, to]) => !filled.has(pairName(from, to)));
}

/** Of the sets that would do at a point, the first that lacks the fewest pairs. */
function pointOf(point: string, sets: readonly ConductorSet[], filled: ReadonlySet<string>) {
  return sets
    .map((set): PointOfWork => ({ point, set, missing: missingOf(set, filled) }))
    .reduce((one, other) => (other.missing.length < one.missing.length ? other : one));
}

interface Question {
  answers: Answers;
  proof: ProofAnswers;
  sources: readonly Source[];
  voltage: Voltage;
  on: Moment;
}

/** What the recorded readings prove, and what they show. */
export function readingsOf({ answers, proof, sources, voltage, on }: Question): Readings {
  const { startsAt } = answers.job;
  const all = proof.readings.values.map((reading, index): Reading => ({ ...reading, index }));
  const placed = all.filter((reading) => isPlaced(reading) && isInTime(reading, startsAt, on));
  const complete = placed.filter(isComplete);
  const governed = [...groupBySubject(complete).values()].map(governingOf);
  const alone = all.filter((reading) => !complete.includes(reading));
  const governing = [...governed, ...alone]
    .filter((reading) => reading !== undefined)
    .sort((one, other) => one.index - other.index);

  const pairsAt = new Map<string, Set<string>>();
  const sourcesAt = new Map<string, Set<string>>();
  const add = (map: Map<string, Set<string>>, key: string, value: string) => {
    const values = map.get(key);
    if (values) values.add(value);
    else map.set(key, new Set([value]));
  };
  for (const { point = '', from, to, current, sourceId } of complete) {
    if (current !== 'ac' || to === undefined) continue;
    if (sourceId === undefined && from !== undefined) add(pairsAt, point, pairName(from, to));
    if (sourceId !== undefined && from === undefined)
      add(sourcesAt, point + SEPARATOR + sourceId, to);
  }

  const direct = placed.filter(({ current }) => current === 'dc');
  const names = new Set([
    ...all.flatMap(({ point }) => point ?? []),
    ...sources.flatMap(({ points }) => points.values.map((point) => point.trim())),
  ]);
  const sets = conductorSetsOf(answers, voltage);
  const none: ReadonlySet<string> = new Set();
  return {
    governing,
    points: [...names].map((point) => pointOf(point, sets, pairsAt.get(point) ?? none)),
    readTo: ({ id }, point) => sourcesAt.get(point + SEPARATOR + (id ?? SEPARATOR)) ?? none,
    hasDirectCurrent: (source, point) =>
      direct.some((reading) => reading.point === point && isOfSource(reading, source)),
  };
}

/** A reading on the conductors of a source: its own, or those that it shares. */
function isOfSource({ sourceId }: ReadingAnswers, source: Source): boolean {
  if (sourceId !== undefined && sourceId === source.id) return true;
  return (
    !source.hasOwnConductors && (sourceId === undefined || sourceId === source.sameConductorsAs)
  );
}

/** The points that a source reaches: all points of work where it does not say. */
export function pointsReached({ points }: Source, all: readonly PointOfWork[]): readonly string[] {
  if (points.isAnswered) return points.values.map((point) => point.trim());
  return all.map(({ point }) => point);
}
