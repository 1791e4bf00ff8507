import type { Access, Closest, GroundedSurfaceKind } from '@/hazard/enumerations';
import type { Units } from '../user';
import type { Box, Primitive } from './primitives';
import type { ZoneSet } from './zones';

/** A group of people who come equally close, drawn as one figure. */
export interface SectionPeople {
  closest: Closest;
  label: string;
}

export interface SectionInput {
  zones: ZoneSet;
  units: Units;
  width: number;
  /** The scale to use where everything fits at it: 33 on a phone, 35 on wide, 36 in print. */
  pixelsPerFoot: number;
  /** Where the exposed part is: in a luminaire at the ceiling, or in a panel on a wall. */
  place: 'ceiling' | 'panel';
  /** Null while not known; the drawing then takes nine feet and `words.ceiling` says so. */
  ceilingHeightFeet: number | null;
  access: Access | null;
  ladderSizeFeet: number | null;
  standingLevelFeet: number | null;
  /** The grounded surfaces in reach. */
  grounded: readonly { kind: GroundedSurfaceKind; label: string }[];
  people: readonly SectionPeople[];
  words: {
    exposedPart: string;
    ceiling: string;
    /** What is climbed on: "Fiberglass, 6 ft", "standing at 3 ft". */
    access: readonly string[];
  };
  /** Letters are one px larger on a screen than in print. */
  medium: 'screen' | 'print';
}

/** Everything that the parts of a drawing are placed by, in px. */
export interface Frame {
  width: number;
  /** px to the foot. */
  scale: number;
  slab: number;
  /** The underside of the ceiling. */
  ceiling: number;
  floor: number;
  /** The exposed part. */
  part: { x: number; y: number };
  /** What is drawn lies within; a panel's wall is its left edge. */
  bounds: Box;
}

/** A part of the drawing with the room that labels must keep out of. */
export interface Part {
  primitives: Primitive[];
  obstacles: Box[];
}
