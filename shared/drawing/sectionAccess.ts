import { polyline, px, type Point, type Primitive } from './primitives';
import { ARM_FEET, SHOULDER_FEET } from './sectionPeople';
import type { Frame, SectionInput } from './sectionTypes';

/** The hand stops this far from the exposed part, in feet: the rest is the tool. */
const TOOL_FEET = 0.7;
/** A stepladder's feet stand out this much for each foot of its height. */
const SPREAD = 0.28;
const RUNG_FEET = 1;
/** Someone on a platform, a lift or an extension ladder is drawn with the shoulders this far below the part. */
const COMFORTABLE_FEET = 1.2;

/** What is stood on, and where the feet and hands of the person who works are. */
export interface Standing {
  primitives: Primitive[];
  feet: Point;
  hand: Point;
}

interface Support {
  /** How high the feet are above the floor, in feet. */
  level: number;
  draw: (frame: Frame, feet: Point) => Primitive[];
}

/** What carries the person who works; null while it is not known. */
function supportOf(input: SectionInput, partFeet: number): Support | null {
  const { access, ladderSizeFeet, standingLevelFeet } = input;
  const comfortable = Math.max(0, partFeet - SHOULDER_FEET - COMFORTABLE_FEET);
  switch (access) {
    case 'floor':
      return { level: 0, draw: () => [] };
    case 'stepladder': {
      if (ladderSizeFeet === null || ladderSizeFeet <= 0) return null;
      const level = standingLevelFeet ?? Math.max(0, ladderSizeFeet - 2);
      return {
        level: Math.min(level, ladderSizeFeet),
        draw: (frame, feet) => stepladder(frame, feet, ladderSizeFeet),
      };
    }
    case 'extension ladder':
      return { level: standingLevelFeet ?? comfortable, draw: extensionLadder };
    case 'platform':
    case 'lift':
      return {
        level: comfortable,
        draw: (frame, feet) => platform(frame, feet, access === 'lift'),
      };
    case null:
      return null;
  }
}

/** The person who works at the exposed part and what carries them; null while it is not known. */
export function standingAt(input: SectionInput, frame: Frame): Standing | null {
  const { part, floor, scale } = frame;
  const partFeet = (floor - part.y) / scale;
  const support = supportOf(input, partFeet);
  if (support === null || support.level > partFeet) return null;
  const { level } = support;
  // As far aside as the arm reaches at this height, but not so far that nobody would work so.
  const up = partFeet - level - SHOULDER_FEET;
  const arm = ARM_FEET + TOOL_FEET - 0.25;
  const aside = Math.min(2.2, Math.max(1.1, Math.sqrt(Math.max(0, arm * arm - up * up))));
  const feet: Point = [part.x + aside * scale, floor - level * scale];
  const shoulder: Point = [feet[0], feet[1] - SHOULDER_FEET * scale];
  const distance = Math.hypot(shoulder[0] - part.x, shoulder[1] - part.y);
  const tool = Math.min(TOOL_FEET * scale, distance / 2);
  const hand: Point = [
    part.x + ((shoulder[0] - part.x) / distance) * tool,
    part.y + ((shoulder[1] - part.y) / distance) * tool,
  ];
  return { primitives: support.draw(frame, feet), feet, hand };
}

/** A stepladder from the side; the feet stand on its steps, at the right. */
function stepladder({ floor, scale }: Frame, feet: Point, sizeFeet: number): Primitive[] {
  const level = (floor - feet[1]) / scale;
  const apexX = feet[0] - (0.12 + (sizeFeet - level) * SPREAD) * scale;
  const top = floor - sizeFeet * scale;
  const legX = (height: number) => apexX + (0.12 + (sizeFeet - height) * SPREAD) * scale;
  const rearFoot = Math.max(2, apexX - sizeFeet * 0.3 * scale);
  const front = polyline([
    [legX(0), floor],
    [legX(sizeFeet), top],
  ]);
  const rear = polyline([
    [rearFoot, floor],
    [apexX - 0.1 * scale, top],
  ]);
  let rungs = '';
  for (let height = RUNG_FEET; height < sizeFeet; height += RUNG_FEET) {
    rungs += `M${px(legX(height) - 0.36 * scale)} ${px(floor - height * scale)}H${px(legX(height))}`;
  }
  const braceAt = sizeFeet * 0.4;
  const rearAt = apexX - 0.1 * scale + ((rearFoot - apexX) * (sizeFeet - braceAt)) / sizeFeet;
  const brace = `M${px(legX(braceAt))} ${px(floor - braceAt * scale)}H${px(rearAt)}`;
  const cap = `M${px(apexX - 0.2 * scale)} ${px(top)}H${px(apexX + 0.22 * scale)}`;
  return [
    { kind: 'path', d: front, stroke: 'ground', width: 7, round: true },
    { kind: 'path', d: rear, stroke: 'ink', width: 2.2, round: true },
    { kind: 'path', d: front, stroke: 'ink', width: 3, round: true },
    { kind: 'path', d: cap, stroke: 'ink', width: 4, round: true },
    { kind: 'path', d: rungs, stroke: 'ink', width: 2.6, round: true },
    { kind: 'path', d: brace, stroke: 'ink', width: 1.2, round: true },
  ];
}

/** An extension ladder leans with one foot out for four up. */
function extensionLadder({ floor, scale, slab }: Frame, feet: Point): Primitive[] {
  const xAt = (y: number) => feet[0] + (y - feet[1]) / 4 - 0.1 * scale;
  const top = Math.max(slab + 0.5 * scale, feet[1] - 4.2 * scale);
  const rail = polyline([
    [xAt(floor), floor],
    [xAt(top), top],
  ]);
  let rungs = '';
  for (let y = floor - RUNG_FEET * scale; y > top; y -= RUNG_FEET * scale) {
    rungs += `M${px(xAt(y))} ${px(y)}h${px(0.36 * scale)}`;
  }
  return [
    { kind: 'path', d: rail, stroke: 'ground', width: 7, round: true },
    { kind: 'path', d: rail, stroke: 'ink', width: 3, round: true },
    { kind: 'path', d: rungs, stroke: 'ink', width: 2.6, round: true },
  ];
}

/** A platform on legs, or a lift: a guarded platform on crossed arms. */
function platform({ floor, scale }: Frame, feet: Point, isLift: boolean): Primitive[] {
  const left = feet[0] - 1.1 * scale;
  const right = feet[0] + 1.1 * scale;
  const [, deck] = feet;
  const legs = isLift
    ? `M${px(left)} ${px(floor)}L${px(right)} ${px(deck)}M${px(right)} ${px(floor)}L${px(left)} ${px(deck)}`
    : `M${px(left)} ${px(floor)}V${px(deck)}M${px(right)} ${px(floor)}V${px(deck)}`;
  const rail = deck - 3.5 * scale;
  const guard = isLift
    ? `M${px(left)} ${px(deck)}V${px(rail)}M${px(right)} ${px(deck)}V${px(rail)}H${px(right - 0.5 * scale)}`
    : '';
  return [
    { kind: 'path', d: `M${px(left)} ${px(deck)}H${px(right)}`, stroke: 'ink', width: 4 },
    { kind: 'path', d: legs, stroke: 'ink', width: 2.2 },
    ...(guard ? [{ kind: 'path', d: guard, stroke: 'ink', width: 1.4 } as const] : []),
  ];
}
