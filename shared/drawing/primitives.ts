import { textWidth, type Weight } from './textWidth';

/**
 * What a stroke or a surface means. The screen and the PDF each map a role to
 * a colour of their theme; the geometry knows no colour.
 */
export type Role =
  | 'ink'
  | 'note'
  | 'ground'
  | 'surface'
  | 'restricted'
  | 'limited'
  | 'arcFlash'
  | 'barricade'
  | 'barricadeInk'
  | 'exposed';

/** The colour token of each role (the same names in the app's themes and in print). */
export const ROLE_TOKENS = {
  ink: 'ink',
  note: 'ink2',
  ground: 'paper',
  surface: 'field',
  restricted: 'zRed',
  limited: 'zOrange',
  arcFlash: 'zOrange',
  barricade: 'yellow',
  barricadeInk: 'onYellow',
  exposed: 'red',
} as const satisfies Record<Role, string>;
export type RoleToken = (typeof ROLE_TOKENS)[Role];

/** x1, y1, x2, y2 in px. */
export type Segment = readonly [number, number, number, number];
export type Point = readonly [number, number];

export interface Box {
  left: number;
  top: number;
  right: number;
  bottom: number;
}

export interface TextPrimitive {
  kind: 'text';
  x: number;
  /** The baseline. */
  y: number;
  text: string;
  size: number;
  weight: Weight;
  anchor: 'start' | 'middle' | 'end';
  role: Role;
  /** Width of the ground-coloured outline drawn below the letters; 0 for none. */
  halo: number;
}

/** Everything that a drawing is made of, in px from its top left, in drawing order. */
export type Primitive =
  /** Zone filling: lines that are already cut to the shape of their zone. */
  | { kind: 'hatch'; segments: Segment[]; width: number; role: Role }
  | { kind: 'dots'; points: Point[]; radius: number; role: Role }
  | {
      kind: 'path';
      d: string;
      fill?: Role;
      stroke?: Role;
      width?: number;
      dash?: readonly number[];
      /** Round ends and joins instead of square ones. */
      round?: boolean;
    }
  | {
      kind: 'circle';
      cx: number;
      cy: number;
      r: number;
      fill?: Role;
      stroke?: Role;
      width?: number;
    }
  | TextPrimitive;

export interface Drawing {
  width: number;
  height: number;
  pixelsPerFoot: number;
  primitives: Primitive[];
}

/** A number as it stands in a path: at most two decimals, so that output is short and repeats. */
export function px(value: number): string {
  return String(Math.round(value * 100) / 100);
}

/** A path through points, open unless `closed`. */
export function polyline(points: readonly Point[], closed = false): string {
  const steps = points.map(([x, y], index) => `${index === 0 ? 'M' : 'L'}${px(x)} ${px(y)}`);
  return steps.join('') + (closed ? 'z' : '');
}

export function rectanglePath({ left, top, right, bottom }: Box): string {
  return `M${px(left)} ${px(top)}H${px(right)}V${px(bottom)}H${px(left)}z`;
}

/** One path for all lines of a hatch. */
export function hatchPath(segments: readonly Segment[]): string {
  return segments.map(([x1, y1, x2, y2]) => `M${px(x1)} ${px(y1)}L${px(x2)} ${px(y2)}`).join('');
}

/**
 * One path for all dots: drawn with round ends and a stroke of twice the
 * radius. The step of a hundredth of a px is there because some renderers
 * leave out a line of no length.
 */
export function dotsPath(points: readonly Point[]): string {
  return points.map(([x, y]) => `M${px(x)} ${px(y)}h.01`).join('');
}

/** The room that a text takes, from the top of its capitals to its descenders. */
export function textBox({ text, size, weight, anchor, x, y }: TextPrimitive): Box {
  const width = textWidth(text, size, weight);
  const left = anchor === 'start' ? x : anchor === 'end' ? x - width : x - width / 2;
  return { left, top: y - size * 0.76, right: left + width, bottom: y + size * 0.22 };
}

export function overlaps(one: Box, other: Box): boolean {
  return (
    one.left < other.right &&
    other.left < one.right &&
    one.top < other.bottom &&
    other.top < one.bottom
  );
}
