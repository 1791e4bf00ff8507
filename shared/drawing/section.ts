import { barricadeStripes } from './hatch';
import { px, textBox, type Box, type Drawing, type Point, type Primitive } from './primitives';
import { standingAt, type Standing } from './sectionAccess';
import { frameOf } from './sectionFrame';
import { LabelPlacer, type Spot } from './sectionLabels';
import { person, personBox, type Figure } from './sectionPeople';
import { ceilingOf, groundedSymbol, luminaire, panel, shell } from './sectionRoom';
import { dimensionRows } from './sectionRows';
import type { Frame, SectionInput, SectionPeople } from './sectionTypes';
import { zoneCircles } from './sectionZones';
import { textWidth, wrapText } from './textWidth';

const POST_FEET = 3.3;
const BOARD_FEET = 0.9;

interface Placed {
  people: SectionPeople;
  figure: Figure;
}

/**
 * The drawing: a section at right angles to the corridor, to scale, with the
 * zones as circles about the exposed part, what is climbed on, the people as
 * close as each may come, the grounded surfaces, and dimension lines below.
 */
export function sectionGeometry(input: SectionInput): Drawing {
  const frame = frameOf(input);
  const { scale } = frame;
  const hasGrid = input.grounded.some(({ kind }) => kind === 'ceiling grid');
  const isCeiling = input.place === 'ceiling';
  const equipment = isCeiling ? luminaire(frame) : panel(frame);
  const standing = standingAt(input, frame);
  const placed = placePeople(input, frame, standing);
  const post = barricadePost(input, frame);
  const rows = dimensionRows(input, frame);

  const obstacles = [
    ...equipment.obstacles,
    ...post.obstacles,
    ...placed.map(({ figure }) => personBox(figure)),
    { left: 0, top: frame.ceiling - 0.2 * scale, right: frame.width, bottom: frame.ceiling + 1 },
  ];
  const labels = new LabelPlacer(
    { left: 1, top: frame.slab + 2, right: frame.width - 1, bottom: frame.floor - 3 },
    obstacles,
  );
  const size = input.medium === 'screen' ? 13 : 12;
  const leader = labelExposedPart(input, frame, labels, size);
  labelPeople(placed, frame, labels, size);
  const surfaces = groundedSurfaces(input, frame, labels, size);
  labelCeiling(input, frame, labels, size);
  labelAccess(input, frame, labels, size);

  return {
    width: frame.width,
    height: Math.ceil(rows.bottom),
    pixelsPerFoot: scale,
    primitives: [
      ...zoneCircles(input.zones.zones, frame),
      ...shell(frame),
      ...ceilingOf(frame, hasGrid, isCeiling),
      ...surfaces,
      ...equipment.primitives,
      ...rows.witnesses,
      ...(standing && isWorking(placed) ? standing.primitives : []),
      ...post.primitives,
      ...placed.flatMap(({ figure }) => person(figure)),
      ...leader,
      ...labels.placed,
      ...rows.rows,
    ],
  };
}

function isWorking(placed: readonly Placed[]): boolean {
  return placed.some(({ people }) => people.closest === 'restricted');
}

/** Each group at the distance it may come to: hands in, beside, between the boundaries, or outside. */
function placePeople(input: SectionInput, frame: Frame, standing: Standing | null): Placed[] {
  const { part, scale, floor, width } = frame;
  const { zones } = input;
  const feetTo = (role: string) => zones.zones.find((zone) => zone.role === role)?.feet;
  const limited = feetTo('limited') ?? 0;
  const outer = Math.max(zones.barricade?.feet ?? 0, limited, feetTo('arcFlash') ?? 0);
  const onFloor = (x: number, facing: -1 | 1): Figure => ({ x, y: floor, scale, facing });
  const placed: Placed[] = [];
  let outside = part.x + (outer + 1.25) * scale;
  for (const people of input.people) {
    let figure: Figure | null = null;
    switch (people.closest) {
      case 'restricted':
        if (standing) figure = { ...onFloor(0, -1), ...working(standing) };
        break;
      case 'limited':
      case 'limited with escort':
        figure = onFloor(part.x - Math.max(1.2, limited - 0.7) * scale, 1);
        if (figure.x < 0.62 * scale) figure.x = 0.62 * scale;
        break;
      case 'outside limited':
      case 'outside all boundaries': {
        // Where the limited boundary is the outermost, outside of it is outside of all.
        const between = people.closest === 'outside limited' && outer - limited >= 1.4;
        figure = onFloor(between ? part.x + ((limited + outer) / 2) * scale : outside, -1);
        if (!between) outside += 1.3 * scale;
      }
    }
    if (
      figure &&
      figure.x + 0.6 * scale <= width &&
      input.place === 'panel' &&
      figure.facing === 1
    ) {
      // Behind the wall of a panel there is no room: beside the one who works instead.
      figure = onFloor(part.x + Math.max(1.2, limited - 0.7) * scale, -1);
    }
    if (figure && figure.x + 0.6 * scale <= width) placed.push({ people, figure });
  }
  return placed;
}

function working({ feet, hand }: Standing): Pick<Figure, 'x' | 'y' | 'reach'> {
  const reach: Point = hand;
  return { x: feet[0], y: feet[1], reach };
}

function barricadePost(
  input: SectionInput,
  frame: Frame,
): { primitives: Primitive[]; obstacles: Box[] } {
  const { barricade } = input.zones;
  if (!barricade) return { primitives: [], obstacles: [] };
  const { part, scale, floor } = frame;
  const x = part.x + barricade.feet * scale;
  const top = floor - POST_FEET * scale;
  const half = Math.max(3.5, 0.15 * scale);
  const board = {
    left: x - half,
    top,
    right: x + half,
    bottom: top + Math.max(8, BOARD_FEET * scale),
  };
  const post = `M${px(x)} ${px(top)}V${px(floor)}`;
  const foot = `M${px(x - 0.3 * scale)} ${px(floor - 1.5)}H${px(x + 0.3 * scale)}`;
  return {
    primitives: [
      { kind: 'path', d: post, stroke: 'ink', width: Math.max(2.4, 0.14 * scale) },
      { kind: 'path', d: foot, stroke: 'ink', width: 4 },
      ...barricadeStripes(board),
    ],
    obstacles: [{ left: x - half, top, right: x + half, bottom: floor }],
  };
}

function labelExposedPart(
  input: SectionInput,
  frame: Frame,
  labels: LabelPlacer,
  size: number,
): Primitive[] {
  const { part, scale, slab, ceiling } = frame;
  const isCeiling = input.place === 'ceiling';
  const y = isCeiling ? (slab + ceiling) / 2 - 0.4 * scale + size * 0.2 : part.y - 1.5 * scale;
  const spots: Spot[] = [
    { x: part.x + 0.42 * scale, y, anchor: 'start' },
    { x: part.x + 0.42 * scale, y: slab + size + 2, anchor: 'start' },
    { x: part.x - 0.42 * scale, y: slab + size + 2, anchor: 'end' },
    { x: part.x - scale, y: ceiling + 1.2 * scale, anchor: 'end' },
    { x: part.x - 0.6 * scale, y: ceiling + 3 * scale + size, anchor: 'end' },
    ...Array.from({ length: 6 }, (_, step): Spot => {
      const y = ceiling + size + 4 + step * (size + 3);
      return { x: 4 + step * 6, y, anchor: 'start' };
    }),
  ];
  const [text] = labels.place([input.words.exposedPart], { size, weight: 700 }, spots) ?? [];
  if (!text) return [];
  const fromX = text.anchor === 'end' ? text.x + 2 : text.x - 2;
  const fromY = text.y - size * 0.35;
  const distance = Math.max(1, Math.hypot(part.x - fromX, part.y - fromY));
  const short = Math.max(4, scale * 0.16) / distance;
  const toX = part.x + (fromX - part.x) * short;
  const toY = part.y + (fromY - part.y) * short;
  const d = `M${px(fromX)} ${px(fromY)}L${px(toX)} ${px(toY)}`;
  return [{ kind: 'path', d, stroke: 'ink', width: 1.4, round: true }];
}

function labelPeople(
  placed: readonly Placed[],
  frame: Frame,
  labels: LabelPlacer,
  size: number,
): void {
  const { scale, width } = frame;
  for (const { people, figure } of placed) {
    const box = personBox(figure);
    const half = textWidth(people.label, size, 700) / 2;
    const above = Math.min(Math.max(figure.x, half + 2), width - half - 2);
    const chest = figure.y - 3.6 * scale;
    const spots: Spot[] = [
      { x: above, y: box.top - 6, anchor: 'middle' },
      { x: box.right + 3, y: chest, anchor: 'start' },
      { x: box.right + 3, y: chest + 1.6 * scale, anchor: 'start' },
      { x: box.left - 3, y: chest, anchor: 'end' },
      { x: above, y: box.top - 6 - size * 1.4, anchor: 'middle' },
      { x: box.left - 3, y: chest + 1.6 * scale, anchor: 'end' },
    ];
    // Whoever works has the exposed part overhead, so the label goes beside.
    const inOrder = figure.reach ? [...spots.slice(1), ...spots.slice(0, 1)] : spots;
    labels.place([people.label], { size, weight: 700 }, inOrder);
  }
}

/** The grounded surfaces in reach, side by side above the ceiling, each with its name. */
function groundedSurfaces(
  input: SectionInput,
  frame: Frame,
  labels: LabelPlacer,
  size: number,
): Primitive[] {
  const { part, scale, slab, ceiling, width } = frame;
  const exposed = labels.placed[0];
  const afterLabel = exposed ? textBox(exposed).right + 12 : 0;
  let x = Math.max(part.x + 1.3 * scale, afterLabel);
  const primitives: Primitive[] = [];
  const seen = new Set<string>();
  for (const { kind, label } of input.grounded) {
    if (kind === 'ceiling grid' || seen.has(kind)) continue;
    seen.add(kind);
    const symbol = groundedSymbol(kind, scale);
    const room = symbol.width + 5 + textWidth(label, size, 500);
    if (x + room > width - 2) continue;
    const top = slab + 0.15 * scale + 2;
    const box = { left: x, top, right: x + symbol.width, bottom: top + symbol.height };
    const middle = Math.min((box.top + box.bottom) / 2 + size * 0.35, ceiling - 0.3 * scale - 3);
    const y = Math.max(middle, slab + size + 1);
    const spot: Spot = { x: box.right + 5, y, anchor: 'start' };
    if (labels.place([label], { size, weight: 500 }, [spot])) {
      primitives.push(...symbol.draw(box));
      labels.keepClear(box);
    }
    x += room + 12;
  }
  return primitives;
}

function labelCeiling(input: SectionInput, frame: Frame, labels: LabelPlacer, size: number): void {
  const { ceiling, width } = frame;
  const words = input.words.ceiling;
  const y = ceiling + size + 4;
  for (const room of [Infinity, 110, 84]) {
    const lines = wrapText(words, { size, weight: 500, width: room });
    const widest = Math.max(...lines.map((line) => textWidth(line, size, 500)));
    const spots: Spot[] = [];
    for (let x = width - widest - 3; x > 2; x -= 12) {
      spots.push({ x, y, anchor: 'start' });
    }
    // Beyond the zones it reads best; further left only where it must.
    if (labels.place(lines, { size, weight: 500 }, spots.slice(0, room === 84 ? undefined : 6)))
      return;
  }
}

function labelAccess(input: SectionInput, frame: Frame, labels: LabelPlacer, size: number): void {
  const { part, scale, floor } = frame;
  const lines = input.words.access;
  if (lines.length === 0) return;
  const spots: Spot[] = [];
  for (const feetUp of [3, 2.2, 1.4, 3.8]) {
    const y = floor - feetUp * scale;
    spots.push({ x: part.x - 0.75 * scale, y, anchor: 'end' }, { x: 2, y, anchor: 'start' });
  }
  for (let x = part.x + 3 * scale; x < frame.width; x += 20) {
    spots.push({ x, y: floor - 2 * scale, anchor: 'start' });
  }
  labels.place(lines, { size, weight: 500 }, spots);
}
