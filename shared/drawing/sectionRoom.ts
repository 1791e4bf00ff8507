import type { GroundedSurfaceKind } from '@/hazard/enumerations';
import { polyline, px, rectanglePath, type Box, type Primitive } from './primitives';
import { TILE_FEET } from './sectionFrame';
import type { Frame, Part } from './sectionTypes';

const TILE_PITCH_FEET = 2;

/** Slab above and floor below. */
export function shell({ width, slab, floor }: Frame): Primitive[] {
  const d = `M0 ${px(slab)}H${px(width)}M0 ${px(floor)}H${px(width)}`;
  return [{ kind: 'path', d, stroke: 'ink', width: 3 }];
}

/**
 * A suspended ceiling in section: tiles between runners, each runner hung from
 * the slab. Without a grounded grid it is one line without runners.
 */
export function ceilingOf(frame: Frame, hasGrid: boolean, opensAtPart: boolean): Primitive[] {
  const { width, slab, ceiling, scale, part } = frame;
  const top = ceiling - TILE_FEET * scale;
  const tile = (left: number, right: number): Primitive => ({
    kind: 'path',
    d: rectanglePath({ left, top, right, bottom: ceiling }),
    fill: 'surface',
    stroke: 'ink',
    width: 1,
  });
  const halfOpening = (TILE_PITCH_FEET / 2) * scale;
  const opening: readonly [number, number] = opensAtPart
    ? [part.x - halfOpening, part.x + halfOpening]
    : [0, 0];
  if (!hasGrid) {
    return opensAtPart ? [tile(1, opening[0]), tile(opening[1], width - 1)] : [tile(1, width - 1)];
  }
  const primitives: Primitive[] = [];
  let hangers = '';
  let runners = '';
  const pitch = TILE_PITCH_FEET * scale;
  const first = part.x - halfOpening - Math.floor((part.x - halfOpening) / pitch) * pitch;
  for (let x = first - pitch; x < width; x += pitch) {
    const left = Math.max(1, x + 0.05 * scale);
    const right = Math.min(width - 1, x + pitch - 0.05 * scale);
    const isOpening = opensAtPart && Math.abs(x - opening[0]) < 1;
    if (right - left > 3 && !isOpening) primitives.push(tile(left, right));
    if (x < 3) continue;
    hangers += `M${px(x)} ${px(slab)}V${px(top)}`;
    runners += `M${px(x)} ${px(top - 0.1 * scale)}V${px(ceiling + 1)}`;
  }
  primitives.push(
    { kind: 'path', d: hangers, stroke: 'ink', width: 0.8, dash: [1, 3] },
    { kind: 'path', d: runners, stroke: 'ink', width: Math.max(1.4, scale * 0.06) },
  );
  return primitives;
}

/** Luminaire with its driver in the opening, the whip from its box at the slab, and the exposed part. */
export function luminaire({ part, scale, slab, ceiling }: Frame): Part {
  const x = (feet: number) => part.x + feet * scale;
  const top = part.y - 0.12 * scale;
  const box = { left: x(-2.7), top: slab, right: x(-2.3), bottom: slab + 0.4 * scale };
  const whip =
    `M${px(x(-0.5))} ${px(top)}C${px(x(-0.7))} ${px(top - 1.2 * scale)} ` +
    `${px(x(-2.2))} ${px(top - 0.5 * scale)} ${px(x(-2.5))} ${px(box.bottom)}`;
  const body = polyline(
    [
      [x(-0.94), ceiling],
      [x(-0.8), top],
      [x(0.8), top],
      [x(0.94), ceiling],
    ],
    true,
  );
  const driver: Box = {
    left: x(-0.36),
    top: top + 0.04 * scale,
    right: x(0.36),
    bottom: top + 0.24 * scale,
  };
  return {
    primitives: [
      { kind: 'path', d: whip, stroke: 'ink', width: 1.8, round: true },
      { kind: 'path', d: rectanglePath(box), fill: 'ground', stroke: 'ink', width: 1.6 },
      { kind: 'path', d: body, fill: 'surface', stroke: 'ink', width: 2 },
      { kind: 'path', d: rectanglePath(driver), fill: 'ground', stroke: 'ink', width: 1.4 },
      exposedPart({ part, scale }),
    ],
    obstacles: [{ left: x(-0.94), top, right: x(0.94), bottom: ceiling }, box],
  };
}

/** A panel on a wall with its cover off. */
export function panel({ part, scale, bounds, ceiling, floor }: Frame): Part {
  const box: Box = {
    left: bounds.left,
    top: part.y - 1.3 * scale,
    right: part.x - 0.06 * scale,
    bottom: part.y + 1.3 * scale,
  };
  const rail = part.x - 0.18 * scale;
  let breakers = `M${px(rail)} ${px(box.top + 0.2 * scale)}V${px(box.bottom - 0.2 * scale)}`;
  for (let step = -4; step <= 4; step += 1) {
    breakers += `M${px(rail - 0.12 * scale)} ${px(part.y + step * 0.24 * scale)}h${px(0.12 * scale)}`;
  }
  const wall = `M${px(bounds.left)} ${px(ceiling)}V${px(floor)}`;
  return {
    primitives: [
      { kind: 'path', d: wall, stroke: 'ink', width: 3 },
      { kind: 'path', d: rectanglePath(box), fill: 'surface', stroke: 'ink', width: 2 },
      { kind: 'path', d: breakers, stroke: 'ink', width: 1.2 },
      exposedPart({ part, scale }),
    ],
    obstacles: [box],
  };
}

function exposedPart({ part, scale }: Pick<Frame, 'part' | 'scale'>): Primitive {
  const r = Math.max(2.4, scale * 0.11);
  return {
    kind: 'circle',
    cx: part.x,
    cy: part.y,
    r,
    fill: 'exposed',
    stroke: 'ground',
    width: 1.5,
  };
}

interface Symbol {
  widthFeet: number;
  heightFeet: number;
  draw: (box: Box) => Primitive[];
}

const outlined = (d: string): Primitive => ({
  kind: 'path',
  d,
  fill: 'ground',
  stroke: 'ink',
  width: 1.6,
});
const thin = (d: string): Primitive => ({ kind: 'path', d, stroke: 'ink', width: 0.8 });

function crossed(box: Box): Primitive[] {
  const { left, top, right, bottom } = box;
  return [
    outlined(rectanglePath(box)),
    thin(
      polyline([
        [left, top],
        [right, bottom],
      ]) +
        polyline([
          [left, bottom],
          [right, top],
        ]),
    ),
  ];
}

function round({ left, top, right, bottom }: Box): Primitive[] {
  const centre = { cx: (left + right) / 2, cy: (top + bottom) / 2 };
  return [
    { kind: 'circle', ...centre, r: (right - left) / 2, fill: 'ground', stroke: 'ink', width: 1.6 },
  ];
}

function channel({ left, top, right, bottom }: Box): Primitive[] {
  const d = `M${px(left)} ${px(top)}V${px(bottom)}H${px(right)}V${px(top)}`;
  return [{ kind: 'path', d, stroke: 'ink', width: 2.4 }];
}

function beam({ left, top, right, bottom }: Box): Primitive[] {
  const middle = (left + right) / 2;
  const d =
    `M${px(left)} ${px(top)}H${px(right)}M${px(middle)} ${px(top)}V${px(bottom)}` +
    `M${px(left)} ${px(bottom)}H${px(right)}`;
  return [{ kind: 'path', d, stroke: 'ink', width: 2.6 }];
}

/** What each grounded surface looks like in section; a grid is the ceiling itself. */
const SYMBOLS: Readonly<Record<Exclude<GroundedSurfaceKind, 'ceiling grid'>, Symbol>> = {
  duct: { widthFeet: 1.6, heightFeet: 0.9, draw: crossed },
  strut: { widthFeet: 0.4, heightFeet: 0.3, draw: channel },
  conduit: { widthFeet: 0.3, heightFeet: 0.3, draw: round },
  pipe: { widthFeet: 0.55, heightFeet: 0.55, draw: round },
  'structural steel': { widthFeet: 0.7, heightFeet: 0.9, draw: beam },
  enclosure: { widthFeet: 0.8, heightFeet: 0.8, draw: (box) => [outlined(rectanglePath(box))] },
  other: { widthFeet: 0.6, heightFeet: 0.6, draw: (box) => [outlined(rectanglePath(box))] },
};

/** The size in px of the symbol of a grounded surface, and what draws it in a box of that size. */
export function groundedSymbol(
  kind: Exclude<GroundedSurfaceKind, 'ceiling grid'>,
  scale: number,
): { width: number; height: number; draw: Symbol['draw'] } {
  const { widthFeet, heightFeet, draw } = SYMBOLS[kind];
  const least = 7;
  return {
    width: Math.max(least, widthFeet * scale),
    height: Math.max(least, heightFeet * scale),
    draw,
  };
}
