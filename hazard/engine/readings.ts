import type { Conductor } from '../enumerations';
import type { Answers } from './answers';
import { conductorSetsOf, pairName } from './conductors';
import type { ConductorPair, ConductorSet } from './conductors';
import type { Moment } from './moment';
import type { ProofAnswers, ReadingAnswers } from './recordAnswers';
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
 * Taken during the work, and not after the assessment. A reading that was not
 * proves nothing; a voltage that it shows still counts.
 */
function isInTime({ at }: ReadingAnswers, startsAt: Moment | undefined, on: Moment): boolean {
  if (at === undefined || at.instant > on.instant) return false;
  return startsAt === undefined || at.instant >= startsAt.instant;
}

/** A reading that says at which point it was taken, in time. */
interface PlacedReading extends Reading {
  readonly point: string;
  readonly volts: number;
}

/** One that may fill a pair, or stand for a source's own conductor. */
interface CompleteReading extends PlacedReading {
  readonly to: Conductor;
  /** Of a source's own conductor, only the other end is named. */
  readonly pair: string;
}

function placedReadings(
  all: readonly Reading[],
  startsAt: Moment | undefined,
  on: Moment,
): readonly PlacedReading[] {
  return all.flatMap((reading) => {
    const { point, volts } = reading;
    if (point === undefined || volts === undefined) return [];
    return isInTime(reading, startsAt, on) ? [{ ...reading, point, volts }] : [];
  });
}

function completeReadings(placed: readonly PlacedReading[]): readonly CompleteReading[] {
  return placed.flatMap((reading) => {
    const { to, from, sourceId } = reading;
    if (to === undefined || (from === undefined && sourceId === undefined)) return [];
    return [{ ...reading, to, pair: pairName(from ?? '', to) }];
  });
}

/** What a reading is of; readings of the same thing govern one another. */
function subjectOf({ point, pair, current, sourceId }: CompleteReading): string {
  return [point, pair, current, sourceId ?? ''].join(SEPARATOR);
}

/**
 * The highest by magnitude; but a last one with low impedance settles a ghost
 * voltage, and both stay on record.
 */
function governingOf(readings: readonly CompleteReading[]): CompleteReading {
  return readings.reduce((one, other, index) => {
    if (other.lowImpedance === true && index === readings.length - 1) return other;
    return Math.abs(other.volts) > Math.abs(one.volts) ? other : one;
  });
}

const grouped = <T>(items: readonly T[], keyOf: (item: T) => string) => {
  const groups = new Map<string, T[]>();
  for (const item of items) {
    const key = keyOf(item);
    groups.set(key, [...(groups.get(key) ?? []), item]);
  }
  return groups;
};

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
  const placed = placedReadings(all, startsAt, on);
  const complete = completeReadings(placed);
  const counted = new Set(complete.map(({ index }) => index));
  const governing: Reading[] = [
    ...[...grouped(complete, subjectOf).values()].map(governingOf),
    ...all.filter(({ index }) => !counted.has(index)),
  ].sort((one, other) => one.index - other.index);

  const alternating = complete.filter(({ current }) => current === 'ac');
  const ofCircuit = alternating.filter(({ sourceId }) => sourceId === undefined);
  const ofSources = alternating.filter(({ sourceId, from }) => sourceId && from === undefined);
  const pairsAt = grouped(ofCircuit, ({ point }) => point);
  const sourcesAt = grouped(ofSources, ({ point, sourceId }) => placeOf(point, sourceId));
  const filledAt = (point: string) => new Set((pairsAt.get(point) ?? []).map(({ pair }) => pair));

  const direct = placed.filter(({ current }) => current === 'dc');
  const names = new Set([
    ...all.flatMap(({ point }) => point ?? []),
    ...sources.flatMap(({ points }) => points.values.map((point) => point.trim())),
  ]);
  const sets = conductorSetsOf(answers, voltage);
  return {
    governing,
    points: [...names].map((point) => pointOf(point, sets, filledAt(point))),
    readTo: ({ id }, point) =>
      new Set((sourcesAt.get(placeOf(point, id)) ?? []).map(({ to }) => to)),
    hasDirectCurrent: (source, point) =>
      direct.some((reading) => reading.point === point && isOfSource(reading, source)),
  };
}

/** Where a source's own conductor was read; one without an id was read nowhere. */
const placeOf = (point: string, sourceId: string | undefined) =>
  [point, sourceId ?? ''].join(SEPARATOR);

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
