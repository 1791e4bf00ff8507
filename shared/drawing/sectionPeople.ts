import { polyline, px, type Box, type Point, type Primitive } from './primitives';

/** A person of 5 ft 9 in, from the sole upward, in feet. */
const BODY = {
  height: 5.75,
  ankle: 0.14,
  knee: 1.6,
  hip: 3,
  shoulder: 4.5,
  neck: 4.7,
  head: 5.3,
  headRadius: 0.34,
  upperArm: 1.1,
  forearm: 1.15,
} as const;
const THICK = { torso: 0.72, leg: 0.38, arm: 0.3 } as const;
/** How far the ground shows around a figure, in px, so that hatching does not run into it. */
const HALO = 4;

export const SHOULDER_FEET = BODY.shoulder;
export const ARM_FEET = BODY.upperArm + BODY.forearm;

export interface Figure {
  /** Between the feet, on what is stood on, in px. */
  x: number;
  y: number;
  scale: number;
  /** Which way the figure looks: -1 to the left, 1 to the right. */
  facing: -1 | 1;
  /** What the hands go to; hanging arms where there is nothing. */
  reach?: Point;
}

/** The elbow between shoulder and hand, bent downward; the hand stops where the arm ends. */
function arm(shoulder: Point, target: Point, scale: number): Point[] {
  const upper = BODY.upperArm * scale;
  const fore = BODY.forearm * scale;
  const dx = target[0] - shoulder[0];
  const dy = target[1] - shoulder[1];
  const distance = Math.max(Math.hypot(dx, dy), 0.01);
  if (distance >= upper + fore) {
    const at = (length: number): Point => [
      shoulder[0] + (dx / distance) * length,
      shoulder[1] + (dy / distance) * length,
    ];
    return [shoulder, at(upper), at(upper + fore)];
  }
  // Two circles about shoulder and hand meet at the elbow; of the two places the lower is taken.
  const along = (distance * distance + upper * upper - fore * fore) / (2 * distance);
  const aside = Math.sqrt(Math.max(0, upper * upper - along * along));
  const base: Point = [
    shoulder[0] + (dx / distance) * along,
    shoulder[1] + (dy / distance) * along,
  ];
  const one: Point = [base[0] - (dy / distance) * aside, base[1] + (dx / distance) * aside];
  const other: Point = [base[0] + (dy / distance) * aside, base[1] - (dx / distance) * aside];
  return [shoulder, one[1] > other[1] ? one : other, target];
}

/** A person in silhouette with a helmet. */
export function person(figure: Figure): Primitive[] {
  const { x, y, scale, facing, reach } = figure;
  const at = (ahead: number, up: number): Point => [x + ahead * facing * scale, y - up * scale];

  const limbs: { points: Point[]; thick: number }[] = [
    { points: [at(0.02, BODY.neck), at(-0.06, BODY.hip)], thick: THICK.torso },
    {
      points: [at(-0.06, BODY.hip), at(0.08, BODY.knee), at(0.02, BODY.ankle), at(0.24, 0.12)],
      thick: THICK.leg,
    },
    {
      points: [at(-0.06, BODY.hip), at(-0.14, BODY.knee), at(-0.12, BODY.ankle), at(0.1, 0.12)],
      thick: THICK.leg,
    },
  ];
  const shoulder = at(0.02, BODY.shoulder);
  if (reach) {
    const second: Point = [reach[0] - facing * 0.28 * scale, reach[1] + 0.18 * scale];
    limbs.push({ points: arm(shoulder, reach, scale), thick: THICK.arm });
    limbs.push({ points: arm(shoulder, second, scale), thick: THICK.arm });
  } else {
    limbs.push({ points: [shoulder, at(0.22, 3.55), at(0.4, 2.75)], thick: THICK.arm });
    limbs.push({ points: [shoulder, at(-0.3, 3.6), at(-0.24, 2.75)], thick: THICK.arm });
  }

  const [headX, headY] = at(0.08, BODY.head);
  const r = BODY.headRadius * scale;
  const halo: Primitive[] = limbs.map(({ points, thick }) => ({
    kind: 'path',
    d: polyline(points),
    stroke: 'ground',
    width: thick * scale + HALO,
    round: true,
  }));
  const body: Primitive[] = limbs.map(({ points, thick }) => ({
    kind: 'path',
    d: polyline(points),
    stroke: 'ink',
    width: thick * scale,
    round: true,
  }));
  return [
    ...halo,
    { kind: 'circle', cx: headX, cy: headY, r: r + HALO / 2, fill: 'ground' },
    ...body,
    { kind: 'circle', cx: headX, cy: headY, r, fill: 'ink' },
    ...helmet(headX, headY, scale, facing),
  ];
}

function helmet(x: number, y: number, scale: number, facing: -1 | 1): Primitive[] {
  const wide = 0.4 * scale;
  const brim = y - 0.1 * scale;
  const dome =
    `M${px(x - wide)} ${px(brim)}A${px(wide)} ${px(0.36 * scale)} 0 0 1 ` +
    `${px(x + wide)} ${px(brim)}z`;
  const peak = `M${px(x - facing * wide)} ${px(brim)}H${px(x + facing * 0.58 * scale)}`;
  return [
    { kind: 'path', d: dome, fill: 'ink', stroke: 'ground', width: 1.2 },
    { kind: 'path', d: peak, stroke: 'ink', width: Math.max(1.5, 0.11 * scale) },
  ];
}

/** The room that a figure takes, arms aside. */
export function personBox({ x, y, scale }: Pick<Figure, 'x' | 'y' | 'scale'>): Box {
  return {
    left: x - 0.5 * scale,
    top: y - BODY.height * scale,
    right: x + 0.5 * scale,
    bottom: y,
  };
}
