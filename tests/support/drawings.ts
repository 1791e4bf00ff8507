import { expect } from 'vitest';
import type { WorksheetContent } from '@/hazard/content';
import type { ArcFlashMethod, Assessment, Distance, Restricted } from '@/hazard/types';
import { overlaps, textBox, type Drawing, type TextPrimitive } from '@/shared/drawing/primitives';
import type { DrawingSubject } from '@/shared/drawing/worksheetDrawing';
import { messages } from '@/shared/messages';

export const at = (inches: number, metres: number): Distance => ({ inches, metres });

export const citation = { standard: '', edition: '', table: '', confidence: 'memory' } as const;

export interface Situation {
  name: string;
  restricted: Restricted;
  movable: boolean;
  arcFlash: Distance | null;
  method: ArcFlashMethod;
}

export const fixed277: Situation = {
  name: '',
  restricted: at(12, 0.3),
  movable: false,
  arcFlash: at(60, 1.5),
  method: 'ppe category',
};

/** What is assessed where the boundaries are these; the limited one is 3 ft 6 in, or 10 ft from what moves. */
export function assessmentOf({ restricted, movable, arcFlash, method }: Situation) {
  const limited = movable ? at(120, 3) : at(42, 1);
  const barricade = arcFlash && arcFlash.inches > limited.inches ? arcFlash : limited;
  return {
    boundaries: {
      inTable: true,
      row: '',
      volts: 480,
      because: '',
      movable,
      limitedMovable: at(120, 3),
      limitedFixed: at(42, 1),
      restricted,
      citation,
    },
    arcFlash: {
      likely: method !== 'not likely',
      method,
      ppeCategory: null,
      requiredArcRatingCalPerCm2: null,
      arcFlashBoundary: arcFlash,
      findings: [],
      citations: [],
    },
    barricade: { ...barricade, citation },
  } satisfies Pick<Assessment, 'boundaries' | 'arcFlash' | 'barricade'>;
}

export const content: WorksheetContent = {
  job: { task: 'replace driver or ballast' },
  supply: { circuitVolts: 277 },
  decision: { mode: 'off' },
  absenceTest: { byCrewId: 'a' },
  surroundings: {
    ceilingHeightFeet: 9,
    access: 'stepladder',
    ladder: { material: 'fiberglass', sizeFeet: 6, standingLevelFeet: 3 },
    groundedSurfaces: [
      { kind: 'ceiling grid', inReach: true },
      { kind: 'duct', inReach: true },
      { kind: 'structural steel' },
    ],
  },
  crew: [
    { id: 'a', lead: true, closest: 'restricted' },
    { id: 'b', closest: 'outside all boundaries' },
    { id: 'c', closest: 'limited with escort' },
    { id: 'd', closest: 'outside limited' },
  ],
};

export function subjectOf(
  assessment: DrawingSubject['assessment'],
  changes: Partial<DrawingSubject> = {},
): DrawingSubject {
  const words = messages('en-US');
  return { content, assessment, messages: words, locale: 'en-US', units: 'feet', ...changes };
}

export const textsOf = (drawing: Drawing): TextPrimitive[] =>
  drawing.primitives.filter((primitive) => primitive.kind === 'text');

export function expectReadable(drawing: Drawing): void {
  const boxes = textsOf(drawing).map((text) => ({ text: text.text, ...textBox(text) }));
  const leaving = boxes.filter(
    ({ left, top, right, bottom }) =>
      left < -0.01 || top < 0 || right > drawing.width + 0.01 || bottom > drawing.height + 3.2,
  );
  expect(leaving).toEqual([]);
  const covered = boxes.flatMap((box, index) =>
    boxes
      .slice(index + 1)
      .filter((other) => overlaps(box, other))
      .map((other) => `"${box.text}" over "${other.text}"`),
  );
  expect(covered).toEqual([]);
}

export function expectInside(drawing: Drawing): void {
  const inside = (x: number, y: number) =>
    x >= -0.5 && x <= drawing.width + 0.5 && y >= -0.5 && y <= drawing.height + 0.5;
  const outside = drawing.primitives.filter((primitive) => {
    if (primitive.kind === 'hatch') {
      return !primitive.segments.every(([x1, y1, x2, y2]) => inside(x1, y1) && inside(x2, y2));
    }
    return primitive.kind === 'dots' && !primitive.points.every(([x, y]) => inside(x, y));
  });
  expect(outside).toEqual([]);
}
