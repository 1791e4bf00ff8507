import { isFiniteNumber } from '../arguments';

/**
 * Reads one answer of untrusted content. What is absent, empty, of the wrong
 * type, not finite, negative or outside its enumeration comes out as
 * `undefined`: not answered. `false`, 0 and an empty list are answers.
 */
export type Fields = Readonly<Record<string, unknown>>;

/**
 * A list as answered. A member that is not admitted makes the list not
 * answered, but the admitted members are kept: unfavourable ones still count.
 */
export interface List<T> {
  readonly isAnswered: boolean;
  readonly values: readonly T[];
}

const NOTHING: Fields = Object.freeze({});
const NO_LIST: List<never> = Object.freeze({ isAnswered: false, values: Object.freeze([]) });

/** The fields of an object; none for anything else. */
export function fields(value: unknown): Fields {
  return typeof value === 'object' && value !== null && !Array.isArray(value)
    ? (value as Fields)
    : NOTHING;
}

/** An own field: an inherited one was never answered. */
export function field(of: Fields, key: string): unknown {
  return Object.hasOwn(of, key) ? of[key] : undefined;
}

export function readText(value: unknown): string | undefined {
  return typeof value === 'string' && value.trim() !== '' ? value : undefined;
}

export function readFlag(value: unknown): boolean | undefined {
  return typeof value === 'boolean' ? value : undefined;
}

/** Finite and not negative. */
export function readFigure(value: unknown): number | undefined {
  return isFiniteNumber(value) && value >= 0 ? value : undefined;
}

/** Finite and above 0. */
export function readPositive(value: unknown): number | undefined {
  const figure = readFigure(value);
  return figure === 0 ? undefined : figure;
}

/** Finite, of either sign: a reading of voltage. */
export function readSigned(value: unknown): number | undefined {
  return isFiniteNumber(value) ? value : undefined;
}

/** A whole number within bounds, both included. */
export function readWhole(value: unknown, from: number, upTo: number): number | undefined {
  return Number.isInteger(value) && (value as number) >= from && (value as number) <= upTo
    ? (value as number)
    : undefined;
}

export function readOne<T extends string | number>(
  value: unknown,
  admitted: readonly T[],
): T | undefined {
  return admitted.includes(value as T) ? (value as T) : undefined;
}

function readList<T>(value: unknown, read: (member: unknown) => T | undefined): List<T> {
  if (!Array.isArray(value)) return NO_LIST;
  const values: T[] = [];
  for (const member of value) {
    const answer = read(member);
    if (answer !== undefined) values.push(answer);
  }
  return { isAnswered: values.length === value.length, values };
}

export function readMany<T extends string>(value: unknown, admitted: readonly T[]): List<T> {
  return readList(value, (member) => readOne(member, admitted));
}

export function readTexts(value: unknown): List<string> {
  return readList(value, readText);
}

export function readFigures(value: unknown): List<number> {
  return readList(value, readFigure);
}

/** A list that says nothing while it is empty. */
export function notEmpty<T>(list: List<T>): List<T> {
  return list.values.length === 0 ? NO_LIST : list;
}

/** A list of objects. A member of another type, or a gap, answers nothing. */
export function readObjects<T>(value: unknown, read: (of: Fields) => T): List<T> {
  return Array.isArray(value)
    ? { isAnswered: true, values: Array.from(value, (member) => read(fields(member))) }
    : NO_LIST;
}

/** The members of a list that speak for the worksheet: none of a list that is not answered. */
export function answeredValues<T>(list: List<T>): readonly T[] {
  return list.isAnswered ? list.values : [];
}
