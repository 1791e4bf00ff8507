import { textWidth } from './textWidth';
import type { Zone } from './zones';

export interface StripLabel extends Zone {
  /** Where its boundary stands; null where there is none to stand ("avoid contact"). */
  x: number | null;
}

export interface PlacedLabel extends StripLabel {
  left: number;
  right: number;
  anchor: 'start' | 'end';
  figureSize: number;
  nameSize: number;
  /** How high the tick of its boundary rises: to the top beside its label, else to below it. */
  stemTop: number;
  elbow: boolean;
}

const GAP = 10;
/** From a boundary to the label that starts at it. */
const FROM_TICK = 8;
/** A figure is set large; words in its place, and what does not fit, step down to these. */
const SIZES = [
  { figure: 20, words: 18, name: 15 },
  { figure: 18, words: 16, name: 14 },
  { figure: 16, words: 14, name: 13 },
  { figure: 14, words: 13, name: 12 },
  { figure: 12, words: 11, name: 11 },
] as const;

type Sizes = (typeof SIZES)[number];
type Spot = { label: StripLabel; width: number; left: number; atTick: 'start' | 'end' | 'none' };

function figureSize(label: StripLabel, sizes: Sizes): number {
  return label.x === null ? sizes.words : sizes.figure;
}

function widthOf(label: StripLabel, sizes: Sizes): number {
  const figure = textWidth(label.figure, figureSize(label, sizes), 700);
  return Math.max(figure, textWidth(label.name, sizes.name, 600));
}

/** From the left: the first at 0, inner ones ending or starting at their tick, the last starting there. */
function spotsFromLeft(labels: readonly StripLabel[], sizes: Sizes): Spot[] {
  const spots: Spot[] = [];
  let free = 0;
  labels.forEach((label, index) => {
    const width = widthOf(label, sizes);
    const { x } = label;
    const isLast = index === labels.length - 1;
    let left = free;
    let atTick: Spot['atTick'] = 'none';
    if (x !== null && (index > 0 || isLast)) {
      if (!isLast && x + 1 - width >= free) {
        left = x + 1 - width;
        atTick = 'end';
      } else if (x + FROM_TICK >= free) {
        left = x + FROM_TICK;
        atTick = 'start';
      }
    }
    spots.push({ label, width, left, atTick });
    free = left + width + GAP;
  });
  return spots;
}

/** Pushes labels back from the right edge; false when there is no room for all of them. */
function pushFromRight(spots: Spot[], right: number): boolean {
  let limit = right;
  for (const spot of [...spots].reverse()) {
    if (spot.left + spot.width > limit) {
      spot.left = limit - spot.width;
      spot.atTick = 'none';
    }
    limit = spot.left - GAP;
  }
  return limit >= -GAP;
}

function finish(spots: readonly Spot[], sizes: Sizes): PlacedLabel[] {
  // Elbows that go the same way keep apart: the farther boundary runs lower.
  let level = 43;
  return spots.map(({ label, width, left, atTick }, index) => {
    const { x } = label;
    const crossed = spots.some(
      (other) => x !== null && other.left < x + 2 && other.left + other.width > x - 2,
    );
    const elbow = x !== null && atTick === 'none' && index > 0 && (left >= x || left + width <= x);
    const stemTop = atTick === 'start' && !crossed ? 4 : level;
    if (elbow) level = 46;
    return {
      ...label,
      left,
      right: left + width,
      anchor: atTick === 'end' ? 'end' : 'start',
      figureSize: figureSize(label, sizes),
      nameSize: sizes.name,
      stemTop,
      elbow,
    };
  });
}

/**
 * Where the labels of a strip stand. They never overlap and never leave the
 * strip: what does not fit at its tick moves aside and gets an elbow, and when
 * all of that is not enough the letters get smaller.
 */
export function placeLabels(labels: readonly StripLabel[], width: number): PlacedLabel[] {
  let spots: Spot[] = [];
  let sizes: Sizes = SIZES[0];
  for (sizes of SIZES) {
    spots = spotsFromLeft(labels, sizes);
    if (pushFromRight(spots, width)) break;
  }
  return finish(spots, sizes);
}
