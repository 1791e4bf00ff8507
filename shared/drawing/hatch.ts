import type { Box, Point, Primitive, Role, Segment } from './primitives';

/** A zone to be filled: a box, or within it the ring between two circles. */
export interface Shape {
  box: Box;
  ring?: { cx: number; cy: number; inner: number; outer: number };
}

type Interval = readonly [from: number, to: number];

interface Line {
  x: number;
  y: number;
  /** A unit vector. */
  dx: number;
  dy: number;
}

/** Where a line is inside a box (slab method), or undefined. */
function insideBox({ x, y, dx, dy }: Line, box: Box): Interval | undefined {
  let from = -Infinity;
  let to = Infinity;
  for (const [start, step, low, high] of [
    [x, dx, box.left, box.right],
    [y, dy, box.top, box.bottom],
  ] as const) {
    const one = (low - start) / step;
    const other = (high - start) / step;
    from = Math.max(from, Math.min(one, other));
    to = Math.min(to, Math.max(one, other));
  }
  return from < to ? [from, to] : undefined;
}

function insideCircle(line: Line, cx: number, cy: number, r: number): Interval | undefined {
  const along = (cx - line.x) * line.dx + (cy - line.y) * line.dy;
  const across = (cx - line.x) * line.dy - (cy - line.y) * line.dx;
  if (Math.abs(across) >= r) return undefined;
  const half = Math.sqrt(r * r - across * across);
  return [along - half, along + half];
}

function intersect(one: Interval, other: Interval): Interval | undefined {
  const from = Math.max(one[0], other[0]);
  const to = Math.min(one[1], other[1]);
  return from < to ? [from, to] : undefined;
}

function intervalsIn(line: Line, { box, ring }: Shape): Interval[] {
  const whole = insideBox(line, box);
  if (!whole || !ring) return whole ? [whole] : [];
  const outer = insideCircle(line, ring.cx, ring.cy, ring.outer);
  const kept = outer && intersect(whole, outer);
  if (!kept) return [];
  const hole = insideCircle(line, ring.cx, ring.cy, ring.inner);
  if (!hole) return [kept];
  const before = intersect(kept, [-Infinity, hole[0]]);
  const after = intersect(kept, [hole[1], Infinity]);
  return [before, after].filter((interval) => interval !== undefined);
}

/** Shorter bits are only noise at the rim. */
const SHORTEST = 0.6;

/** Lines at 45°, rising to the right (`/`) or falling (`\`), `pitch` apart along the x axis. */
function diagonals(shape: Shape, pitch: number, rising: boolean): Segment[] {
  const { left, top, right, bottom } = shape.box;
  const segments: Segment[] = [];
  const step = Math.SQRT1_2;
  // Multiples of the pitch, so that neighbouring zones continue each other's lines.
  const first = Math.floor((rising ? left + top : left - bottom) / pitch) * pitch;
  const last = rising ? right + bottom : right - top;
  for (let offset = first; offset <= last; offset += pitch) {
    const line = rising
      ? { x: offset - bottom, y: bottom, dx: step, dy: -step }
      : { x: offset + top, y: top, dx: step, dy: step };
    for (const [from, to] of intervalsIn(line, shape)) {
      if (to - from < SHORTEST) continue;
      segments.push([
        line.x + from * line.dx,
        line.y + from * line.dy,
        line.x + to * line.dx,
        line.y + to * line.dy,
      ]);
    }
  }
  return segments;
}

/** Dots in staggered rows; only whole dots, none cut by the rim. */
function staggeredDots({ box, ring }: Shape, pitch: number, radius: number): Point[] {
  const points: Point[] = [];
  const half = pitch / 2;
  const firstRow = Math.ceil((box.top + radius) / half);
  for (let row = firstRow; row * half <= box.bottom - radius; row += 1) {
    const y = row * half;
    const shift = row % 2 === 0 ? 0 : half;
    const firstColumn = Math.ceil((box.left + radius - shift) / pitch);
    for (let column = firstColumn; ; column += 1) {
      const x = column * pitch + shift;
      if (x > box.right - radius) break;
      if (ring) {
        const distance = Math.hypot(x - ring.cx, y - ring.cy);
        if (distance > ring.outer - radius || distance < ring.inner + radius) continue;
      }
      points.push([x, y]);
    }
  }
  return points;
}

export type ZoneRole = Extract<Role, 'restricted' | 'limited' | 'arcFlash'>;

/**
 * The filling of a zone: crossed diagonals for restricted, single diagonals
 * for limited, dots for arc flash, so that they differ without colour.
 * `scale` narrows the pitch where a drawing is small.
 */
export function fillZone(role: ZoneRole, shape: Shape, scale = 1): Primitive {
  if (role === 'arcFlash') {
    const radius = 1.3 * scale;
    return { kind: 'dots', points: staggeredDots(shape, 9 * scale, radius), radius, role };
  }
  if (role === 'limited') {
    return { kind: 'hatch', segments: diagonals(shape, 8 * scale, true), width: 1.6 * scale, role };
  }
  const pitch = 6 * scale;
  const segments = [...diagonals(shape, pitch, true), ...diagonals(shape, pitch, false)];
  return { kind: 'hatch', segments, width: 1.5 * scale, role };
}

/** The striped body of a barricade: yellow ground, ink stripes, ink outline. */
export function barricadeStripes(box: Box): Primitive[] {
  const { left, top, right, bottom } = box;
  const d = `M${left} ${top}H${right}V${bottom}H${left}z`;
  // Stripes end half their width inside the outline, so that none leaves the post.
  const inner = { left: left + 1.4, top: top + 1.4, right: right - 1.4, bottom: bottom - 1.4 };
  return [
    { kind: 'path', d, fill: 'barricade' },
    {
      kind: 'hatch',
      segments: diagonals({ box: inner }, 8, true),
      width: 2.8,
      role: 'barricadeInk',
    },
    { kind: 'path', d, stroke: 'barricadeInk', width: 1.2 },
  ];
}
