import * as format from '../format';
import type { Locale, Units } from '../user';

/**
 * Fills a sentence: `{name}` with a value, `{name:unit}` with a figure and its
 * unit, `{name:list}` with the word of a closed list. A part in square brackets
 * is left out when a value in it is not known, so that a sentence never shows a hole.
 */
export interface Value {
  readonly text: string;
  /** A name keeps its capital inside a sentence; a word of ours does not. */
  readonly isName: boolean;
}

/** What a placeholder stands for, or null when it is not known. */
export type Resolve = (name: string, unit: string | undefined) => Value | null;
/** What to write where the value is not known and the part is not optional. */
export type Fallback = (name: string) => string;

const PLACEHOLDER = /\{(\w+)(?::(\w+))?\}/g;
const OPTIONAL = /\[([^[\]]*)\]/g;

export function fill(template: string, resolve: Resolve, fallback: Fallback): string {
  const without = template.replace(OPTIONAL, (_, part: string) =>
    [...part.matchAll(PLACEHOLDER)].every(([, name, unit]) => resolve(String(name), unit) !== null)
      ? part
      : '',
  );
  const filled = without.replace(
    PLACEHOLDER,
    (_, name: string, unit: string | undefined, offset: number) => {
      const value = resolve(name, unit) ?? { text: fallback(name), isName: false };
      const beginsSentence = /(?:^|[.?] )[“¿]?$/.test(without.slice(0, offset));
      return value.isName || beginsSentence ? value.text : lowerFirst(value.text);
    },
  );
  return upperFirst(filled);
}

/** `Battery unit` becomes `battery unit`; `CAT III` and `480Y/277` stay. */
export function lowerFirst(text: string): string {
  return /^\p{Lu}[\p{Lu}\d]/u.test(text) ? text : text.charAt(0).toLowerCase() + text.slice(1);
}

function upperFirst(text: string): string {
  return text.charAt(0).toUpperCase() + text.slice(1);
}

type Figure = (locale: Locale, value: number, units: Units) => string;
const FEET_TO_INCHES = 12;
const MILLISECONDS_PER_MINUTE = 60_000;

/** What somebody typed; in metres also as feet, to be held against a limit printed in feet. */
function inBoth(inches: number, units: Units): string {
  const inFeet = format.typedDistance(inches, 'feet');
  return units === 'metric' ? `${format.typedDistance(inches, units)} (${inFeet})` : inFeet;
}

const FIGURES: Readonly<Record<string, Figure>> = {
  V: format.volts,
  A: format.amperes,
  kA: format.kiloamperes,
  s: format.seconds,
  cal: format.calories,
  reading: format.reading,
  minutes: (_, value) => format.durationText(value * MILLISECONDS_PER_MINUTE),
  inches: (_, value, units) => inBoth(value, units),
  feet: (_, value, units) => inBoth(value * FEET_TO_INCHES, units),
  /* A printed limit: its metres are another printed figure, so they are not worked out here. */
  least: (_, value) => format.feetAndInches(value),
};

/** A figure with the unit that its sentence names; a plain number without one. */
export function figure(
  locale: Locale,
  value: number,
  unit: string | undefined,
  units: Units,
): string {
  const write = unit === undefined ? undefined : FIGURES[unit];
  return write ? write(locale, value, units) : format.number(locale, value);
}

/** A number and its unit never part at the end of a line. */
export function noBreak(text: string): string {
  return text.replace(
    /(\d) (?=(?:ft|in|s|h|V|A|kA|mA|kV|kVA|m|W|min|cal\/cm²)(?![\p{L}\d]))/gu,
    '$1\u00a0',
  );
}
