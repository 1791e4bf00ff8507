import type { Assessment, Distance } from '@/hazard/types';
import { distance, metres as metresText } from '../format';
import type { Units } from '../user';
import type { ZoneRole } from './hatch';

/** The words on a strip and a drawing; the geometry measures them, so it is given them. */
export interface ZoneWords {
  restricted: string;
  limited: string;
  arcFlash: string;
  barricade: string;
  avoidContact: string;
  /** In the arc flash lane where a study has to say how far it reaches. */
  arcFlashNotKnown: string;
  distancesNotKnown: string;
  distancesNotSpecified: string;
  outsideTable: string;
}

export interface Zone {
  role: ZoneRole;
  /** How far it reaches from the exposed part; 0 for "avoid contact". */
  feet: number;
  /** The published figure, or "avoid contact". */
  figure: string;
  name: string;
}

export interface ZoneSet {
  /** Nearest first. Empty while the distances are not known. */
  zones: Zone[];
  barricade: { feet: number; figure: string; name: string } | null;
  /** What is said instead of zones. */
  message: string | null;
  /** What is said instead of the arc flash zone. */
  arcFlashNote: string | null;
}

export interface ZoneInput {
  assessment: Pick<Assessment, 'boundaries' | 'arcFlash' | 'barricade'>;
  units: Units;
  words: ZoneWords;
}

const METRES_PER_FOOT = 0.3048;

/** Where a boundary is drawn: at its figure in the units shown, so that it meets the ruler. */
function feetOf(pair: Distance, units: Units): number {
  return units === 'metric' ? pair.metres / METRES_PER_FOOT : pair.inches / 12;
}

type KnownBoundaries = Extract<NonNullable<Assessment['boundaries']>, { inTable: true }>;

function shockZones(boundaries: KnownBoundaries, { units, words }: ZoneInput): Zone[] {
  const zones: Zone[] = [];
  const { restricted } = boundaries;
  if (restricted === 'avoid contact') {
    zones.push({
      role: 'restricted',
      feet: 0,
      figure: words.avoidContact,
      name: words.restricted,
    });
  } else if (restricted) {
    const feet = feetOf(restricted, units);
    zones.push({
      role: 'restricted',
      feet,
      figure: distance(restricted, units),
      name: words.restricted,
    });
  }
  const limited = boundaries.movable ? boundaries.limitedMovable : boundaries.limitedFixed;
  if (limited) {
    const feet = feetOf(limited, units);
    zones.push({ role: 'limited', feet, figure: distance(limited, units), name: words.limited });
  }
  return zones;
}

/** The boundaries of the shock table, or what is said where there is no distance to give. */
export function boundariesOrMessage({
  assessment,
  words,
}: Pick<ZoneInput, 'assessment' | 'words'>): KnownBoundaries | string {
  const { boundaries } = assessment;
  if (!boundaries) return words.distancesNotKnown;
  if (!boundaries.inTable) return words.outsideTable;
  const specified = boundaries.limitedFixed ?? boundaries.limitedMovable ?? boundaries.restricted;
  return specified === null && !assessment.arcFlash.arcFlashBoundary
    ? words.distancesNotSpecified
    : boundaries;
}

/**
 * The zones of an assessment, nearest first. While the voltage is not known
 * there is none, and a message says so: a ruler without zones must never look
 * like a place without a hazard.
 */
export function zonesOf(input: ZoneInput): ZoneSet {
  const { assessment, units, words } = input;
  const boundaries = boundariesOrMessage(input);
  if (typeof boundaries === 'string') {
    return { zones: [], barricade: null, message: boundaries, arcFlashNote: null };
  }

  const zones = shockZones(boundaries, input);
  const { arcFlashBoundary, method } = assessment.arcFlash;
  if (arcFlashBoundary) {
    zones.push({
      role: 'arcFlash',
      feet: feetOf(arcFlashBoundary, units),
      figure: distance(arcFlashBoundary, units),
      name: words.arcFlash,
    });
  }
  // The sort is stable: at the same distance shock stays before arc flash.
  zones.sort((one, other) => one.feet - other.feet);
  const { barricade } = assessment;
  return {
    zones,
    barricade:
      barricade && barricade.inches > 0
        ? {
            feet: feetOf(barricade, units),
            figure: distance(barricade, units),
            name: words.barricade,
          }
        : null,
    message: null,
    arcFlashNote: !arcFlashBoundary && method !== 'not likely' ? words.arcFlashNotKnown : null,
  };
}

/** How far the farthest zone or the barricade reaches. */
export function farthestFeet({ zones, barricade }: ZoneSet): number {
  return Math.max(0, barricade?.feet ?? 0, ...zones.map((zone) => zone.feet));
}

/** `0`, `0.5`, `1` on a metric ruler. */
export function metreNumeral(value: number): string {
  return metresText(value).replace(/(\.0)?\u00a0m$/, '');
}
