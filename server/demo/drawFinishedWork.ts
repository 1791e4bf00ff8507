import { ofWords, picture, text } from './photoFrame';

/* A corridor in perspective, from eye height: everything runs to one point. */

const CENTER = 560;
const HORIZON = 500;
/** px that a foot takes one foot in front of the phone. */
const FOCUS = 640;

const EYE_FEET = 5.4;
const CEILING_FEET = 9;
const HALF_WIDTH_FEET = 4;
const FAR_FEET = 34;
const NEAR_FEET = 2.6;

type Point = readonly [number, number];

/** Feet to the right, feet above the floor and feet ahead, as a point of the picture. */
function at(right: number, above: number, ahead: number): Point {
  const scale = FOCUS / ahead;
  return [CENTER + right * scale, HORIZON - (above - EYE_FEET) * scale];
}

const points = (list: readonly Point[]) =>
  list.map(([x, y]) => `${x.toFixed(1)},${y.toFixed(1)}`).join(' ');
const polygon = (list: readonly Point[], paint: string) =>
  `<polygon points="${points(list)}" ${paint}/>`;

/** A rectangle in the ceiling, from its near left to its far right corner. */
const inCeiling = (left: number, right: number, near: number, far: number): Point[] => [
  at(left, CEILING_FEET, near),
  at(right, CEILING_FEET, near),
  at(right, CEILING_FEET, far),
  at(left, CEILING_FEET, far),
];

const AHEAD = Array.from({ length: 17 }, (_, index) => NEAR_FEET + 0.4 + index * 2);

function room(): string {
  const plane = (above: number, paint: string) =>
    polygon(
      [
        at(-HALF_WIDTH_FEET, above, NEAR_FEET),
        at(HALF_WIDTH_FEET, above, NEAR_FEET),
        at(HALF_WIDTH_FEET, above, FAR_FEET),
        at(-HALF_WIDTH_FEET, above, FAR_FEET),
      ],
      paint,
    );
  const wall = (side: number, paint: string) =>
    polygon(
      [
        at(side, CEILING_FEET, NEAR_FEET),
        at(side, CEILING_FEET, FAR_FEET),
        at(side, 0, FAR_FEET),
        at(side, 0, NEAR_FEET),
      ],
      paint,
    );
  const [farLeft, farRight] = [
    at(-HALF_WIDTH_FEET, CEILING_FEET, FAR_FEET),
    at(HALF_WIDTH_FEET, 0, FAR_FEET),
  ];
  return `${plane(0, 'fill="#8a857a"')}${plane(CEILING_FEET, 'fill="#dcdad2"')}
    ${wall(-HALF_WIDTH_FEET, 'fill="#c9c4b6"')}${wall(HALF_WIDTH_FEET, 'fill="#bdb8aa"')}
    <rect x="${farLeft[0]}" y="${farLeft[1]}" width="${farRight[0] - farLeft[0]}" height="${farRight[1] - farLeft[1]}" fill="#b3ae9f"/>`;
}

/** Doors of both walls, and the skirting that shows where the floor begins. */
function walls(): string {
  const door = (side: number, near: number) =>
    polygon(
      [at(side, 0, near), at(side, 7, near), at(side, 7, near + 3), at(side, 0, near + 3)],
      'fill="#8f7f68" stroke="#6d6050" stroke-width="4"',
    );
  const skirting = (side: number) =>
    polygon(
      [
        at(side, 0, NEAR_FEET),
        at(side, 0.4, NEAR_FEET),
        at(side, 0.4, FAR_FEET),
        at(side, 0, FAR_FEET),
      ],
      'fill="#6f6a5e"',
    );
  const doors = [door(-HALF_WIDTH_FEET, 8), door(HALF_WIDTH_FEET, 13), door(-HALF_WIDTH_FEET, 20)];
  return `${doors.join('')}${skirting(-HALF_WIDTH_FEET)}${skirting(HALF_WIDTH_FEET)}`;
}

/** The bars that carry the tiles: two feet by two. */
function grid(): string {
  const bar = (from: Point, to: Point, width: number) =>
    `<line x1="${from[0]}" y1="${from[1]}" x2="${to[0]}" y2="${to[1]}" stroke="#a9a598" stroke-width="${width}"/>`;
  const along = [-4, -2, 0, 2, 4].map((right) =>
    bar(at(right, CEILING_FEET, NEAR_FEET), at(right, CEILING_FEET, FAR_FEET), 3),
  );
  const across = AHEAD.map((ahead) =>
    bar(at(-4, CEILING_FEET, ahead), at(4, CEILING_FEET, ahead), Math.max(1.5, 14 / ahead)),
  );
  return [...along, ...across].join('');
}

/** A panel of two feet by four, lit: its frame, its lens, and what it throws on everything near. */
function luminaire(near: number): string {
  const far = near + 4;
  const [x, y] = at(0, CEILING_FEET, near + 2);
  const glow = `<ellipse cx="${x}" cy="${y}" rx="${1900 / near}" ry="${900 / near}" fill="url(#glow)"/>`;
  const ribs = Array.from({ length: 9 }, (_, index) => near + 0.45 + index * 0.4)
    .map((ahead) => {
      const [left, right] = [at(-0.85, CEILING_FEET, ahead), at(0.85, CEILING_FEET, ahead)];
      return `<line x1="${left[0]}" y1="${left[1]}" x2="${right[0]}" y2="${right[1]}" stroke="#efe9cf" stroke-width="${10 / ahead}"/>`;
    })
    .join('');
  return `${glow}${polygon(inCeiling(-1, 1, near, far), 'fill="#f4f3ee" stroke="#9b988d" stroke-width="2"')}
    ${polygon(inCeiling(-0.87, 0.87, near + 0.13, far - 0.13), 'fill="#fffef6"')}${ribs}`;
}

/** What the floor gives back of each luminaire. */
function reflection(near: number): string {
  const [x, y] = at(0, 0, near + 2);
  return `<ellipse cx="${x}" cy="${y}" rx="${1700 / near}" ry="${420 / near}" fill="url(#glow)" opacity="0.35"/>`;
}

/** The sticker with its name on the frame of the nearest one. */
function sticker(name: string, near: number): string {
  const [x, y] = at(0.72, CEILING_FEET, near + 4);
  return `<g transform="translate(${x - 50} ${y - 3})"><rect width="76" height="30" rx="3" fill="#fdfdfa" stroke="#6f6c63" stroke-width="2"/>${text(name, { x: 38, y: 23, size: 22, bold: true, middle: true })}</g>`;
}

/** The luminaires back in their places, lit, tiles closed. */
export function finishedWork(equipment: string): string {
  const name = equipment.split(' ').at(-1) ?? '';
  const lit = [25, 17, 9, 3.6].map((near) => near + ofWords(equipment, 3) * 0.1);
  const nearest = lit.at(-1) ?? 4;
  const body = `${room()}${lit.map(reflection).join('')}${walls()}${grid()}${lit.map(luminaire).join('')}${sticker(name, nearest)}`;
  return picture({ wall: '#c9c4b6', dark: '#9d988b', turn: ofWords(equipment, 3) - 1 }, body);
}
