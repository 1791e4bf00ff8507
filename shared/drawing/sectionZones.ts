import { fillZone } from './hatch';
import { polyline, type Box, type Point, type Primitive } from './primitives';
import type { Frame } from './sectionTypes';
import type { Zone } from './zones';

/** "Avoid contact" has no distance; a spot of this size in feet keeps the zone in sight. */
const CONTACT_FEET = 0.22;
const STEP_DEGREES = 2;

function inside([x, y]: Point, { left, top, right, bottom }: Box): boolean {
  return x >= left && x <= right && y >= top && y <= bottom;
}

/** The runs of a circle that lie inside a box, as open paths. */
function circleInside(cx: number, cy: number, r: number, box: Box): string {
  const at = (degrees: number): Point => {
    const angle = (degrees * Math.PI) / 180;
    return [cx + r * Math.cos(angle), cy + r * Math.sin(angle)];
  };
  /** The place between two directions where the circle meets the edge of the box. */
  const edge = (within: number, without: number): Point => {
    let [inner, outer] = [within, without];
    for (let round = 0; round < 12; round += 1) {
      const middle = (inner + outer) / 2;
      if (inside(at(middle), box)) inner = middle;
      else outer = middle;
    }
    return at(inner);
  };
  const runs: Point[][] = [];
  let run: Point[] | null = null;
  for (let degrees = 0; degrees <= 360; degrees += STEP_DEGREES) {
    const isInside = inside(at(degrees), box);
    const before = degrees - STEP_DEGREES;
    if (isInside && run === null) {
      run = degrees === 0 ? [] : [edge(degrees, before)];
      runs.push(run);
    }
    if (isInside) run?.push(at(degrees));
    else if (run !== null) {
      run.push(edge(before, degrees));
      run = null;
    }
  }
  return runs
    .filter(({ length }) => length > 1)
    .map((points) => polyline(points))
    .join('');
}

/**
 * The zones as circles about the exposed part, cut by slab, floor and wall.
 * Each ring has the hatch of the nearest boundary around it; the restricted
 * zone is hatched whole, also where a label's arc flash boundary lies within.
 */
export function zoneCircles(zones: readonly Zone[], frame: Frame): Primitive[] {
  const { part, scale, bounds } = frame;
  const hatchScale = scale >= 30 ? 1 : 0.8;
  const radius = (zone: Zone) => (zone.feet === 0 ? CONTACT_FEET : zone.feet) * scale;
  const restricted = zones.find(({ role }) => role === 'restricted');
  const outward = [...zones].sort((one, other) => radius(one) - radius(other));

  const fills: Primitive[] = [];
  const outlines: Primitive[] = [];
  let filledTo = 0;
  for (const zone of restricted
    ? [restricted, ...outward.filter((z) => z !== restricted)]
    : outward) {
    const outer = radius(zone);
    if (outer > filledTo) {
      const ring = { cx: part.x, cy: part.y, inner: filledTo, outer };
      fills.push(fillZone(zone.role, { box: bounds, ring }, hatchScale));
      filledTo = outer;
    }
    const d = circleInside(part.x, part.y, outer, bounds);
    if (d) {
      const width = zone.role === 'restricted' ? 2 : 1.6;
      outlines.push({ kind: 'path', d, stroke: 'ink', width, round: true });
    }
  }
  return [...fills, ...outlines];
}
