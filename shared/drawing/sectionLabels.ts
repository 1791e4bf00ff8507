import { overlaps, textBox, type Box, type Role, type TextPrimitive } from './primitives';
import type { Weight } from './textWidth';

export interface Spot {
  x: number;
  /** The baseline of the first line. */
  y: number;
  anchor: TextPrimitive['anchor'];
}

const LINE_HEIGHT = 1.35;
const HALO = 4;

/**
 * Places labels one after the other. A label takes the first of its spots
 * where it lies inside and touches nothing that was placed before; one for
 * which there is no room is left out, never drawn over another.
 */
export class LabelPlacer {
  readonly placed: TextPrimitive[] = [];
  private readonly taken: Box[];

  constructor(
    private readonly bounds: Box,
    obstacles: readonly Box[],
  ) {
    this.taken = [...obstacles];
  }

  /** Keeps later labels out of a box. */
  keepClear(box: Box): void {
    this.taken.push(box);
  }

  /** The texts as placed, or null when no spot was free. */
  place(
    lines: readonly string[],
    { size, weight, role = 'ink' }: { size: number; weight: Weight; role?: Role },
    spots: readonly Spot[],
  ): TextPrimitive[] | null {
    for (const spot of spots) {
      const texts = lines.map((text, index): TextPrimitive => {
        const y = spot.y + index * size * LINE_HEIGHT;
        const { x, anchor } = spot;
        return { kind: 'text', x, y, text, size, weight, anchor, role, halo: HALO };
      });
      const boxes = texts.map(textBox);
      if (boxes.every((box) => this.isFree(box))) {
        this.placed.push(...texts);
        this.taken.push(...boxes.map(withMargin));
        return texts;
      }
    }
    return null;
  }

  private isFree(box: Box): boolean {
    const { left, top, right, bottom } = this.bounds;
    const isInside =
      box.left >= left && box.right <= right && box.top >= top && box.bottom <= bottom;
    return isInside && !this.taken.some((other) => overlaps(box, other));
  }
}

function withMargin({ left, top, right, bottom }: Box): Box {
  return { left: left - 4, top: top - 1, right: right + 4, bottom: bottom + 1 };
}
