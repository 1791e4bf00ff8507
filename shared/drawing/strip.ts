import type { Units } from '../user';
import { barricadeStripes, fillZone } from './hatch';
import { px, type Drawing, type Primitive, type TextPrimitive } from './primitives';
import { ruler } from './ruler';
import { placeLabels, type PlacedLabel } from './stripLabels';
import { textWidth, wrapText } from './textWidth';
import { farthestFeet, type Zone, type ZoneSet } from './zones';

/** px to the foot, largest first; the three last serve distances past every table (a label's own). */
const SCALES = [64, 46, 34, 24, 16, 12, 8, 6, 4];
/** Room to the right of the farthest boundary for its label. */
const LAST_LABEL_ROOM = 118;
/** The exposed part; everything is measured from here. */
const ORIGIN = 3;

const LANE = { top: 48, middle: 65, bottom: 82 };
export const STRIP_HEIGHT = 114;

export interface StripInput {
  zones: ZoneSet;
  units: Units;
  width: number;
  /** Set while a boundary slides, so that the ruler stands still meanwhile. */
  pixelsPerFoot?: number;
}

/** The largest scale that leaves room for the last label. */
export function stripScale(zones: ZoneSet, width: number): number {
  const room = Math.max(40, width - ORIGIN - LAST_LABEL_ROOM);
  const feet = farthestFeet(zones);
  return SCALES.find((scale) => feet * scale <= room) ?? room / feet;
}

/**
 * The distance strip: a scaled ruler from the exposed part outward, shock
 * boundaries in the upper lane and arc flash in the lower, so that neither
 * hides the other, whichever is larger.
 */
export function stripGeometry(input: StripInput): Drawing {
  const { zones, units, width } = input;
  const pixelsPerFoot = input.pixelsPerFoot ?? stripScale(zones, width);
  const at = (feet: number): number => ORIGIN + feet * pixelsPerFoot;
  return {
    width,
    height: STRIP_HEIGHT,
    pixelsPerFoot,
    primitives: [
      ...lanes(zones.zones, at),
      ...ruler({ x: ORIGIN, y: LANE.bottom, right: width, pixelsPerFoot, units }),
      { kind: 'path', d: 'M0 42H4V98H0z', fill: 'ink' },
      ...(zones.message === null ? labels(zones, at, width) : message(zones.message, width)),
      ...barricade(zones, at),
    ],
  };
}

function lanes(zones: readonly Zone[], at: (feet: number) => number): Primitive[] {
  const primitives: Primitive[] = [];
  const feetOf = (role: Zone['role']) => zones.find((zone) => zone.role === role)?.feet;
  const restricted = feetOf('restricted');
  const limited = feetOf('limited');
  const arcFlash = feetOf('arcFlash');
  const lane = (from: number, to: number, top: number, bottom: number) => ({
    box: { left: from, top, right: to, bottom },
  });
  // "Avoid contact" has no distance; a sliver keeps the zone in sight.
  const inner = restricted === undefined ? ORIGIN : Math.max(at(restricted), ORIGIN + 4);
  if (restricted !== undefined) {
    primitives.push(fillZone('restricted', lane(ORIGIN, inner, LANE.top, LANE.middle), 0.86));
  }
  if (limited !== undefined && at(limited) > inner) {
    primitives.push(fillZone('limited', lane(inner, at(limited), LANE.top, LANE.middle), 0.86));
  }
  if (arcFlash !== undefined) {
    primitives.push(
      fillZone('arcFlash', lane(ORIGIN, at(arcFlash), LANE.middle, LANE.bottom), 0.86),
    );
  }
  const farthest = Math.max(ORIGIN, ...zones.map((zone) => at(zone.feet)));
  if (farthest > ORIGIN) {
    const d = `M${ORIGIN} ${LANE.middle}H${px(farthest)}`;
    primitives.push({ kind: 'path', d, stroke: 'ink', width: 1.2 });
  }
  return primitives;
}

function labels(set: ZoneSet, at: (feet: number) => number, width: number): Primitive[] {
  const placed = placeLabels(
    set.zones.map((zone) => ({ ...zone, x: zone.feet === 0 ? null : at(zone.feet) })),
    width,
  );
  const primitives: Primitive[] = placed.flatMap((label) => [
    ...stem(label, LANE),
    text(label, label.figure, 19, label.figureSize, 700),
    text(label, label.name, 38, label.nameSize, 600),
  ]);
  if (set.arcFlashNote !== null) {
    const note = { x: 10, y: LANE.bottom - 4, size: 14, weight: 500, halo: 4 } as const;
    const room = (set.barricade ? at(set.barricade.feet) : width) - note.x;
    if (textWidth(set.arcFlashNote, note.size, note.weight) <= room) {
      const words = { text: set.arcFlashNote, anchor: 'start', role: 'ink' } as const;
      primitives.push({ kind: 'text', ...note, ...words });
    }
  }
  return primitives;
}

function text(
  label: PlacedLabel,
  words: string,
  y: number,
  size: number,
  weight: 600 | 700,
): TextPrimitive {
  const { anchor } = label;
  const x = anchor === 'end' ? label.right : label.left;
  return { kind: 'text', x, y, text: words, size, weight, anchor, role: 'ink', halo: 0 };
}

/** The tick of a boundary, with an elbow to its label where the label could not stand at it. */
function stem(label: PlacedLabel, lane: typeof LANE): Primitive[] {
  const { x, left, right, stemTop, role } = label;
  if (x === null) return [];
  const foot = role === 'arcFlash' || stemTop < 40 ? lane.bottom : lane.middle;
  let d = `M${px(x)} ${foot}V${stemTop}`;
  const reach = left >= x ? left + 12 : right <= x ? right - 12 : null;
  if (label.elbow && reach !== null) d += `H${px(reach)}V${Math.min(stemTop, 42)}`;
  return [{ kind: 'path', d, stroke: 'ink', width: 2 }];
}

function barricade(set: ZoneSet, at: (feet: number) => number): Primitive[] {
  if (!set.barricade) return [];
  const x = Math.round(at(set.barricade.feet)) + 1;
  const box = { left: x, top: LANE.top, right: x + 9, bottom: LANE.bottom };
  return [
    ...barricadeStripes(box),
    {
      kind: 'text',
      x: x + 17,
      y: 71,
      text: set.barricade.name,
      size: 15,
      weight: 600,
      anchor: 'start',
      role: 'ink',
      halo: 0,
    },
  ];
}

/** What stands in place of the labels while the distances are not known: one or two lines. */
function message(words: string, width: number): TextPrimitive[] {
  const linesAt = (size: number) => wrapText(words, { size, weight: 600, width });
  const fits = (size: number): boolean => {
    const lines = linesAt(size);
    return lines.length <= 2 && lines.every((line) => textWidth(line, size, 600) <= width);
  };
  const size = [15, 14, 13].find(fits) ?? 12;
  const lines = linesAt(size);
  return lines.map((line, index) => ({
    kind: 'text',
    x: 0,
    y: (lines.length === 1 ? 30 : 17) + index * 19,
    text: line,
    size,
    weight: 600,
    anchor: 'start',
    role: 'ink',
    halo: 0,
  }));
}
