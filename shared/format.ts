import type { Distance } from '@/hazard/types';
import type { Locale, Units } from './user';

/**
 * Figures, dates and lists as people read them. A number and its unit stay on
 * one line: between them stands a no-break space, never an ordinary one.
 */
const NBSP = '\u00a0';

const METRES_PER_INCH = 0.0254;
/** Keeps 0.3 m, which is 11.811023622 in, from being cut to 0.299 m. */
const ROUNDING_SLACK = 1e-6;

/** Which way a figure is cut: a distance that is asked for goes up, one that somebody has goes down. */
type Cut = 'up' | 'down';

function cut(value: number, decimals: number, way: Cut): number {
  const scale = 10 ** decimals;
  const scaled = value * scale;
  return (
    (way === 'up' ? Math.ceil(scaled - ROUNDING_SLACK) : Math.floor(scaled + ROUNDING_SLACK)) /
    scale
  );
}

/** A number with its unit, which never part: `480 V`. */
export function quantity(locale: Locale, value: number, unit: string, decimals = 3): string {
  return `${number(locale, value, decimals)}${NBSP}${unit}`;
}

/** A plain number with at most `decimals` decimals: `12,500`, `1000`, `2.6`. */
export function number(locale: Locale, value: number, decimals = 3): string {
  return new Intl.NumberFormat(locale, {
    maximumFractionDigits: decimals,
    useGrouping: 'min2',
  }).format(value);
}

export function volts(locale: Locale, value: number): string {
  return quantity(locale, value, 'V', 1);
}

/** A reading keeps one decimal, as the meter shows it: `0.0 V`. */
export function reading(locale: Locale, value: number): string {
  const figure = new Intl.NumberFormat(locale, {
    minimumFractionDigits: 1,
    maximumFractionDigits: 2,
  }).format(value);
  return `${figure}${NBSP}V`;
}

export function amperes(locale: Locale, value: number): string {
  return quantity(locale, value, 'A', 2);
}

export function kiloamperes(locale: Locale, value: number): string {
  return quantity(locale, value, 'kA', 2);
}

export function milliamperes(locale: Locale, value: number): string {
  return quantity(locale, value, 'mA', 0);
}

export function watts(locale: Locale, value: number): string {
  return quantity(locale, value, 'W', 0);
}

export function seconds(locale: Locale, value: number): string {
  return quantity(locale, value, 's', 3);
}

/** Incident energy or arc rating: `8 cal/cm²`. */
export function calories(locale: Locale, value: number): string {
  return quantity(locale, value, 'cal/cm²', 2);
}

/** Feet and inches: `3 ft 6 in`. Below a foot the feet are still written, as the tables print them. */
export function feetAndInches(inches: number, way: Cut = 'up'): string {
  const rounded = cut(inches, 2, way);
  const feet = Math.floor(rounded / 12);
  const rest = Math.round((rounded - feet * 12) * 100) / 100;
  return `${feet}${NBSP}ft${NBSP}${rest}${NBSP}in`;
}

/** Metres with one decimal at least: `1.0 m`, `0.485 m`. */
export function metres(value: number, way: Cut = 'up'): string {
  const rounded = cut(value, 3, way);
  return `${Number.isInteger(rounded * 10) ? rounded.toFixed(1) : String(rounded)}${NBSP}m`;
}

/** A published distance in the units that the person chose: its own printed figure, never a conversion. */
export function distance(pair: Distance, units: Units): string {
  return units === 'metric' ? metres(pair.metres) : feetAndInches(pair.inches);
}

/** Both figures of the published pair, the chosen units first: `3 ft 6 in (1.0 m)`. */
export function distancePair(pair: Distance, units: Units): string {
  const other: Units = units === 'metric' ? 'feet' : 'metric';
  return `${distance(pair, units)} (${distance(pair, other)})`;
}

/**
 * A distance that somebody typed and that is kept in inches. Never shown longer
 * than it is; metres come back as they were typed.
 */
export function typedDistance(inches: number, units: Units): string {
  return units === 'metric'
    ? metres(inches * METRES_PER_INCH, 'down')
    : feetAndInches(inches, 'down');
}

/** The same for what is kept in feet: ladders and ceilings. */
export function typedFeet(feet: number, units: Units): string {
  return typedDistance(feet * 12, units);
}

const FEET_PATTERN =
  /^(?:(\d+(?:\.\d+)?)\s*(?:ft|feet|foot|pies?|'|′))?\s*(?:(\d+(?:\.\d+)?)\s*(?:in|inch|inches|pulg|pulgadas?|"|″)\.?)?$/i;
const METRES_PATTERN = /^(\d+(?:\.\d+)?)\s*(mm|cm|m)$/i;
const BARE_PATTERN = /^\d+(?:\.\d+)?$/;
const INCHES_PER = {
  in: 1,
  ft: 12,
  m: 1 / METRES_PER_INCH,
  cm: 0.01 / METRES_PER_INCH,
  mm: 0.001 / METRES_PER_INCH,
} as const;
type LengthUnit = keyof typeof INCHES_PER;

/**
 * What somebody typed as a distance, in inches and unrounded: `3 ft 6 in`,
 * `3'6"`, `42 in`, `1.07 m`, `90 cm`, or a bare number of `bare`. Null for anything
 * else, a decimal comma included: a distance is not guessed.
 */
export function parseDistance(typed: string, bare: 'in' | 'ft' | 'm'): number | null {
  const entry = typed.replace(/[\s\u00a0]+/g, ' ').trim();
  if (entry === '') return null;
  if (BARE_PATTERN.test(entry)) return Number(entry) * INCHES_PER[bare];
  const metric = METRES_PATTERN.exec(entry);
  if (metric) {
    const unit = String(metric[2]).toLowerCase() as LengthUnit;
    return Number(metric[1]) * INCHES_PER[unit];
  }
  const imperial = FEET_PATTERN.exec(entry);
  if (!imperial) return null;
  return Number(imperial[1] ?? 0) * 12 + Number(imperial[2] ?? 0);
}

type Parts = Partial<Record<Intl.DateTimeFormatPartTypes, string>>;

function parts(locale: Locale, at: Date, options: Intl.DateTimeFormatOptions): Parts {
  const result: Parts = {};
  for (const part of new Intl.DateTimeFormat(locale, options).formatToParts(at)) {
    result[part.type] = part.value.replace(/\.$/, '');
  }
  return result;
}

/** A calendar date, `YYYY-MM-DD`: `2 Jul 2026`. */
export function dateText(locale: Locale, date: string): string {
  return dateIn(locale, new Date(`${date}T12:00:00Z`), 'UTC');
}

function dateIn(locale: Locale, at: Date, timeZone: string): string {
  const p = parts(locale, at, { timeZone, day: 'numeric', month: 'short', year: 'numeric' });
  return `${p.day}${NBSP}${p.month}${NBSP}${p.year}`;
}

/** The day of an instant in a site's zone: `Wed 14 Oct`. */
export function dayText(locale: Locale, at: string, timeZone: string): string {
  const p = parts(locale, new Date(at), {
    timeZone,
    weekday: 'short',
    day: 'numeric',
    month: 'short',
  });
  return `${p.weekday}${NBSP}${p.day}${NBSP}${p.month}`;
}

/** The clock of an instant in a site's zone: `13:30`. */
export function timeText(at: string, timeZone: string): string {
  const p = parts('en-US', new Date(at), {
    timeZone,
    hour: '2-digit',
    minute: '2-digit',
    hourCycle: 'h23',
  });
  return `${p.hour}:${p.minute}`;
}

/** The zone's abbreviation at that instant, as its people write it: `CST`, `MDT`. */
export function zoneText(at: string, timeZone: string): string {
  const p = parts('en-US', new Date(at), { timeZone, timeZoneName: 'short' });
  return String(p.timeZoneName);
}

/** The calendar date of an instant in a zone, `YYYY-MM-DD`. */
export function calendarDate(at: string, timeZone: string): string {
  const p = parts('en-US', new Date(at), {
    timeZone,
    day: '2-digit',
    month: '2-digit',
    year: 'numeric',
  });
  return `${String(p.year).padStart(4, '0')}-${p.month}-${p.day}`;
}

/** Date, clock and zone of an instant: `14 Oct 2026, 13:30 CDT`. */
export function dateTimeText(locale: Locale, at: string, timeZone: string): string {
  // Not by way of `YYYY-MM-DD`: a mistyped year 2 or 10000 has no such form, and is shown as it is.
  const day = dateIn(locale, new Date(at), timeZone);
  return `${day}, ${timeText(at, timeZone)}${NBSP}${zoneText(at, timeZone)}`;
}

/** A window of work; the day is written twice only where it changes: `Wed 14 Oct, 09:30 to 13:30 CDT`. */
export function windowText(locale: Locale, from: string, to: string, timeZone: string): string {
  const until = locale === 'es-MX' ? 'a' : 'to';
  const sameDay = calendarDate(from, timeZone) === calendarDate(to, timeZone);
  const end = `${timeText(to, timeZone)}${NBSP}${zoneText(to, timeZone)}`;
  const lastDay = sameDay ? '' : `${dayText(locale, to, timeZone)}, `;
  const start = `${dayText(locale, from, timeZone)}, ${timeText(from, timeZone)}`;
  return `${start} ${until} ${lastDay}${end}`;
}

/** A length of time in whole minutes: `3 h 20 min`, `45 min`. Minutes not full are left out. */
export function durationText(milliseconds: number): string {
  const total = Math.max(0, Math.floor(milliseconds / 60_000));
  const hours = Math.floor(total / 60);
  const minutes = total % 60;
  const inHours = `${hours}${NBSP}h`;
  const inMinutes = `${minutes}${NBSP}min`;
  if (hours === 0) return inMinutes;
  return minutes === 0 ? inHours : `${inHours}${NBSP}${inMinutes}`;
}

/** `A, B, and C`, or `or` for a choice. */
export function list(
  locale: Locale,
  items: readonly string[],
  type: 'conjunction' | 'disjunction' = 'conjunction',
): string {
  return new Intl.ListFormat(locale, { style: 'long', type }).format(items);
}

/** The form of a word that goes with a count, without the count itself. */
export function plural(
  locale: Locale,
  count: number,
  forms: { readonly one: string; readonly other: string },
): string {
  return new Intl.PluralRules(locale).select(count) === 'one' ? forms.one : forms.other;
}
