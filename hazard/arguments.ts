/**
 * The checks of arguments. A figure that makes no sense is the caller's fault
 * and must never turn into a figure that looks sound, so each of these throws
 * a `RangeError` that begins with the argument's name.
 */

function refuse(name: string, expected: string, value: unknown): never {
  const given = typeof value === 'string' || typeof value === 'number' ? value : typeof value;
  throw new RangeError(`${name} must be ${expected}, not ${given}`);
}

/** A number, and neither NaN nor infinite. */
export const isFiniteNumber = (value: unknown): value is number => Number.isFinite(value);

/** A finite number that is not negative. */
export function requireNumber(name: string, value: unknown): number {
  if (!isFiniteNumber(value) || value < 0) {
    refuse(name, 'a finite number that is not negative', value);
  }
  return value;
}

/** A finite number above zero: one that is divided by. */
export function requirePositive(name: string, value: unknown): number {
  if (!isFiniteNumber(value) || value <= 0) {
    refuse(name, 'a finite number above 0', value);
  }
  return value;
}

/** A finite number inside a range, bounds included. */
export function requireBetween(name: string, value: unknown, from: number, upTo: number): number {
  const number = requireNumber(name, value);
  if (number < from || number > upTo) refuse(name, `from ${from} to ${upTo}`, value);
  return number;
}

/** A member of a closed list. */
export function requireOneOf<T extends string | number>(
  name: string,
  value: unknown,
  members: readonly T[],
): T {
  const found = members.find((member) => member === value);
  if (found === undefined) refuse(name, `one of ${members.join(', ')}`, value);
  return found;
}

export function requireBoolean(name: string, value: unknown): boolean {
  if (typeof value !== 'boolean') refuse(name, 'true or false', value);
  return value;
}

/** A list of readings, or nothing, which counts as an empty list. */
export function requireNumbers(name: string, value: unknown): readonly number[] {
  if (value === undefined) return [];
  if (!Array.isArray(value)) refuse(name, 'a list of numbers', value);
  return value.map((member: unknown) => requireNumber(name, member));
}
