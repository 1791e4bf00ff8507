import { barricadeStripes, fillZone, type ZoneRole } from './hatch';
import { px, rectanglePath, type Primitive, type TextPrimitive } from './primitives';
import { rowNameSize } from './sectionFrame';
import type { Frame, SectionInput } from './sectionTypes';
import { textWidth, wrapText } from './textWidth';

/** From row to row; print has less room than a screen. */
const ROW = { screen: 27, print: 24 } as const;
const FIRST_ROW = 22;
const SWATCH = 18;
const FIGURE_SIZE = 16;

interface Row {
  role: ZoneRole | 'barricade';
  name: string;
  figure: string;
  /** 0 where there is no distance to draw. */
  feet: number;
}

const ROW_ORDER: readonly Row['role'][] = ['restricted', 'limited', 'arcFlash', 'barricade'];

function rowsOf({ zones }: SectionInput): Row[] {
  const rows: Row[] = [...zones.zones];
  if (zones.barricade) rows.push({ role: 'barricade', ...zones.barricade });
  return rows.sort((one, other) => ROW_ORDER.indexOf(one.role) - ROW_ORDER.indexOf(other.role));
}

function swatch(role: Row['role'], left: number, top: number): Primitive[] {
  const box = { left, top, right: left + SWATCH, bottom: top + SWATCH };
  const frame: Primitive = { kind: 'path', d: rectanglePath(box), stroke: 'ink', width: 1.2 };
  if (role !== 'barricade') return [fillZone(role, { box }), frame];
  const ground: Primitive = { kind: 'path', d: rectanglePath(box), fill: 'surface' };
  const post = { left: left + 5.5, top: top + 0.6, right: left + 12.5, bottom: top + 17.4 };
  return [ground, ...barricadeStripes(post), frame];
}

/** The figure beside the end of its line, or on what is seen of the line where there is no room beside it. */
function figureText(row: Row, frame: Frame, y: number): TextPrimitive {
  const common = {
    kind: 'text',
    y: y + 6,
    text: row.figure,
    size: FIGURE_SIZE,
    weight: 700,
    role: 'ink',
    halo: 5,
  } as const;
  const end = frame.part.x + row.feet * frame.scale;
  const beside = end + 11;
  if (beside + textWidth(row.figure, FIGURE_SIZE, 700) <= frame.width) {
    return { ...common, x: beside, anchor: 'start' };
  }
  return { ...common, x: (frame.part.x + Math.min(end, frame.width)) / 2, anchor: 'middle' };
}

function dimension(row: Row, frame: Frame, y: number): Primitive[] {
  if (row.feet === 0) return [];
  const from = frame.part.x;
  const to = from + row.feet * frame.scale;
  const slash = (x: number) => `M${px(x - 4)} ${px(y + 4)}l8 -8`;
  const d = `M${px(from)} ${px(y)}H${px(to)}${slash(from)}${slash(to)}`;
  return [{ kind: 'path', d, stroke: 'ink', width: 1.6 }];
}

/** The dimension lines below the floor, each with name, swatch and figure, and their witness lines. */
export function dimensionRows(
  input: SectionInput,
  frame: Frame,
): { witnesses: Primitive[]; rows: Primitive[]; bottom: number } {
  if (input.zones.message !== null) return messageRows(input.zones.message, frame);
  const rows = rowsOf(input);
  const { part, scale, floor } = frame;
  const row = ROW[input.medium];
  const yOf = (index: number) => floor + FIRST_ROW + index * row;
  const lastY = yOf(Math.max(0, rows.length - 1));
  const witnesses: Primitive[] = [
    {
      kind: 'path',
      d: `M${px(part.x)} ${px(frame.part.y)}V${px(lastY + 5)}`,
      stroke: 'ink',
      width: 1,
      dash: [6, 3, 1, 3],
    },
  ];
  const primitives: Primitive[] = [];
  rows.forEach((row, index) => {
    const y = yOf(index);
    const x = part.x + row.feet * scale;
    if (row.feet > 0) {
      const d = `M${px(x)} ${px(part.y)}V${px(y + 5)}`;
      witnesses.push({ kind: 'path', d, stroke: 'ink', width: 1, dash: [2, 4] });
    }
    primitives.push(
      nameText(row.name, part.x - 37, y + 5, rowNameSize(input.medium)),
      ...swatch(row.role, part.x - 29, y - 9),
      ...dimension(row, frame, y),
      figureText(row, frame, y),
    );
  });
  const note = input.zones.arcFlashNote;
  if (note === null) return { witnesses, rows: primitives, bottom: lastY + 14 };
  const y = lastY + row;
  primitives.push(...swatch('arcFlash', part.x - 29, y - 9), noteText(note, frame, y));
  return { witnesses, rows: primitives, bottom: y + 14 };
}

function nameText(text: string, x: number, y: number, size: number): TextPrimitive {
  return { kind: 'text', x, y, text, size, weight: 600, anchor: 'end', role: 'ink', halo: 0 };
}

function noteText(text: string, frame: Frame, y: number): TextPrimitive {
  const x = frame.part.x;
  return {
    kind: 'text',
    x,
    y: y + 5,
    text,
    size: 14,
    weight: 600,
    anchor: 'start',
    role: 'ink',
    halo: 4,
  };
}

function messageRows(message: string, frame: Frame) {
  const lines = wrapText(message, { size: 15, weight: 600, width: frame.width - 4 });
  const rows = lines.map((text, index): TextPrimitive => ({
    kind: 'text',
    x: 0,
    y: frame.floor + 26 + index * 20,
    text,
    size: 15,
    weight: 600,
    anchor: 'start',
    role: 'ink',
    halo: 0,
  }));
  return { witnesses: [], rows, bottom: frame.floor + 26 + (lines.length - 1) * 20 + 10 };
}
