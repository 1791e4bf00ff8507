import { describe, expect, it } from 'vitest';
import type { SurroundingsSection, WorksheetContent } from '@/hazard/content';
import type { GroundedSurfaceKind } from '@/hazard/enumerations';
import type { Drawing, Primitive } from '@/shared/drawing/primitives';
import { sectionGeometry } from '@/shared/drawing/section';
import { standingAt } from '@/shared/drawing/sectionAccess';
import { frameOf } from '@/shared/drawing/sectionFrame';
import { person } from '@/shared/drawing/sectionPeople';
import { sectionInputOf } from '@/shared/drawing/worksheetDrawing';
import {
  assessmentOf,
  at,
  content,
  expectReadable,
  fixed277,
  subjectOf,
  textsOf,
} from '../../support/drawings';

type Path = Extract<Primitive, { kind: 'path' }>;
const PHONE = { width: 358, pixelsPerFoot: 33, medium: 'screen' } as const;
const PRINT = { width: 389, pixelsPerFoot: 36, medium: 'print' } as const;

const inputOf = (
  changed: WorksheetContent,
  situation = fixed277,
  size: typeof PHONE | typeof PRINT = PHONE,
) =>
  sectionInputOf(subjectOf(assessmentOf(situation), { content: { ...content, ...changed } }), size);
const around = (changed: SurroundingsSection) =>
  inputOf({ surroundings: { ...content.surroundings, ...changed } });
const pathsOf = ({ primitives }: Drawing) =>
  primitives.filter((primitive): primitive is Path => primitive.kind === 'path');
const wordsOf = (drawing: Drawing) =>
  textsOf(drawing).map(({ text }) => text.replaceAll('\u00a0', ' '));
const hasHangers = (drawing: Drawing) =>
  pathsOf(drawing).some(({ dash }) => dash?.[0] === 1 && dash[1] === 3);
/** A person's head is the only circle filled with ink. */
const headsOf = ({ primitives }: Drawing) =>
  primitives.filter((primitive) => primitive.kind === 'circle' && primitive.fill === 'ink').length;

describe('the ceiling', () => {
  it('is drawn at nine feet while its height is not known, and that is said', () => {
    const { ceilingHeightFeet, ...surroundings } = content.surroundings ?? {};
    expect(ceilingHeightFeet).toBe(9);
    const drawing = sectionGeometry(inputOf({ surroundings }));
    // Slab at 6 px, then 2.3 ft above the ceiling and 9 ft below it, 33 px to the foot.
    expect(pathsOf(drawing).map(({ d }) => d)).toContain('M0 6H358M0 378.9H358');
    expect(wordsOf(drawing).join(' ')).toContain('Ceiling height not known, drawn at 9 ft');
  });

  it('hangs from the slab only where it is a grid', () => {
    const groundedSurfaces = [{ kind: 'duct' as const }];
    expect(hasHangers(sectionGeometry(around({})))).toBe(true);
    expect(hasHangers(sectionGeometry(around({ groundedSurfaces })))).toBe(false);
  });

  it('is open two feet wide at a luminaire, and whole above a panel', () => {
    const surroundings = { ...content.surroundings, groundedSurfaces: [] };
    // 3.3 px thick; the opening reaches 33 px to either side of the exposed part.
    const tilesOf = (task: 'replace lamp' | 'replace breaker') => {
      const input = inputOf({ surroundings, job: { task } });
      const tiles = pathsOf(sectionGeometry(input)).filter(
        ({ d, fill }) => fill === 'surface' && d.includes(' 78.6H'),
      );
      return { x: frameOf(input).part.x, tiles: tiles.map(({ d }) => d) };
    };
    const { x, tiles } = tilesOf('replace lamp');
    expect(tiles).toEqual([`M1 78.6H${x - 33}V81.9H1z`, `M${x + 33} 78.6H357V81.9H${x + 33}z`]);
    expect(tilesOf('replace breaker').tiles).toEqual(['M1 78.6H357V81.9H1z']);
  });
});

describe('whoever works', () => {
  const feetUp = (surroundings: SurroundingsSection) => {
    const input = around(surroundings);
    const frame = frameOf(input);
    const standing = standingAt(input, frame);
    return standing && (frame.floor - standing.feet[1]) / frame.scale;
  };

  it.each<[string, SurroundingsSection, number]>([
    ['on the floor', { access: 'floor' }, 0],
    ['on the step that is answered', { access: 'stepladder' }, 3],
    ['two feet below the top of the ladder', { access: 'stepladder', ladder: { sizeFeet: 6 } }, 4],
    ['on the floor beside a stool', { access: 'stepladder', ladder: { sizeFeet: 1 } }, 0],
    [
      'never above the top of the ladder',
      { access: 'stepladder', ladder: { sizeFeet: 4, standingLevelFeet: 5 } },
      4,
    ],
    // The exposed part is at 9.3 ft, the shoulders are 4.5 ft up and 1.2 ft below the part.
    ['at a height to work at', { access: 'extension ladder', ladder: {} }, 3.6],
    ['on the rung that is answered', { access: 'extension ladder' }, 3],
    ['at a height to work at', { access: 'platform' }, 3.6],
    ['at a height to work at', { access: 'lift' }, 3.6],
  ])('stands %s: %j', (_, surroundings, feet) => {
    expect(feetUp(surroundings)).toBeCloseTo(feet);
  });

  it.each<SurroundingsSection>([
    { access: undefined },
    { access: 'stepladder', ladder: {} },
    { access: 'stepladder', ladder: { sizeFeet: 0 } },
    { access: 'extension ladder', ladder: { standingLevelFeet: 10 } },
  ])('is left out while it is not known where they stand: %j', (surroundings) => {
    const crew = [{ lead: true, closest: 'restricted' as const }];
    const drawn = (changed: SurroundingsSection) =>
      headsOf(
        sectionGeometry(inputOf({ crew, surroundings: { ...content.surroundings, ...changed } })),
      );
    expect(drawn({})).toBe(1);
    expect(drawn(surroundings)).toBe(0);
  });

  it.each([-1, 1] as const)('has the elbow below the hand and shoulder, facing %d', (facing) => {
    // The shoulder is 4.5 ft up, the hand at the same height 1.5 ft ahead.
    const primitives = person({
      x: 100,
      y: 200,
      scale: 10,
      facing,
      reach: [100 + facing * 15, 155],
    });
    const arm = primitives.find(
      (primitive): primitive is Path =>
        primitive.kind === 'path' && primitive.d.endsWith(`L${100 + facing * 15} 155`),
    );
    const [, elbowY] = /L[\d.]+ ([\d.]+)L/.exec(arm?.d ?? '') ?? [];
    expect(Number(elbowY)).toBeGreaterThan(160);
  });
});

describe('the scale', () => {
  const movable = { ...fixed277, movable: true };

  it('is larger where nobody outside has to be drawn', () => {
    const crew = [{ lead: true, closest: 'restricted' as const }];
    expect(sectionGeometry(inputOf({}, movable, PRINT)).pixelsPerFoot).toBe(18);
    expect(sectionGeometry(inputOf({ crew }, movable, PRINT)).pixelsPerFoot).toBe(24);
  });

  it('is one px to the foot where nothing fits', () => {
    const drawing = sectionGeometry(around({ ceilingHeightFeet: 1000 }));
    expect(drawing.pixelsPerFoot).toBe(1);
    expectReadable(drawing);
  });
});

describe('a label that names a boundary farther than the drawing reaches', () => {
  it.each([4000, 10_000, 1_000_000])('of %d in has its figure on the drawing', (inches) => {
    const arcFlash = at(inches, inches * 0.0254);
    const drawing = sectionGeometry(inputOf({}, { ...fixed277, arcFlash }));
    expect(drawing.pixelsPerFoot).toBe(1);
    expectReadable(drawing);
    expect(wordsOf(drawing)).toContainEqual(expect.stringMatching(/^\d{3,} ft \d/));
  });

  it('has no circle, for none of it would be seen', () => {
    const circles = (inches: number) => {
      const arcFlash = at(inches, inches * 0.0254);
      const drawing = sectionGeometry(inputOf({}, { ...fixed277, arcFlash }));
      return pathsOf(drawing).filter(({ width, round }) => width === 1.6 && round).length;
    };
    // Limited and arc flash; the restricted one has a wider line.
    expect(circles(60)).toBe(2);
    expect(circles(1_000_000)).toBe(1);
  });
});

describe('a grounded surface in reach', () => {
  const drawn = (...kinds: GroundedSurfaceKind[]) => {
    const input = around({ groundedSurfaces: kinds.map((kind) => ({ kind })) });
    return sectionGeometry({ ...input, width: 700 });
  };

  // 33 px to the foot: a pipe is 0.55 ft across, a conduit 0.3 ft.
  it.each([
    ['pipe', 9.075, 'Pipe'],
    ['conduit', 4.95, 'Conduit'],
  ] as const)('is round and named: %s', (kind, radius, name) => {
    const drawing = drawn(kind);
    expect(wordsOf(drawing)).toContain(name);
    const circles = drawing.primitives.flatMap((one) =>
      one.kind === 'circle' && one.fill === 'ground' && one.stroke === 'ink' ? [one.r] : [],
    );
    expect(circles).toEqual([expect.closeTo(radius)]);
  });

  it.each([
    ['strut', 'Strut'],
    ['structural steel', 'Structural steel'],
    ['enclosure', 'Metal enclosure'],
    ['other', 'Other grounded metal'],
  ] as const)('has a shape of its own and is named: %s', (kind, name) => {
    const bare = pathsOf(drawn()).length;
    const drawing = drawn(kind);
    expect(wordsOf(drawing)).toContain(name);
    expect(pathsOf(drawing)).toHaveLength(bare + 1);
  });
});

describe('what is not there', () => {
  it('is not drawn: a barricade', () => {
    const assessment = { ...assessmentOf(fixed277), barricade: null };
    const drawing = sectionGeometry(sectionInputOf(subjectOf(assessment), PHONE));
    expect(wordsOf(drawing)).not.toContain('Barricade');
    expect(wordsOf(sectionGeometry(around({})))).toContain('Barricade');
    expect(drawing.primitives.some((one) => 'fill' in one && one.fill === 'barricade')).toBe(false);
  });

  it('is not drawn: a name for which there is no room, while the next one has some', () => {
    const surroundings = { ceilingHeightFeet: 2, groundedSurfaces: [{ kind: 'duct' as const }] };
    const input = inputOf({ crew: [], surroundings }, { ...fixed277, arcFlash: at(240, 6) });
    const drawing = sectionGeometry({ ...input, pixelsPerFoot: 9 });
    expect(wordsOf(drawing)).not.toContain('Exposed part');
    expect(wordsOf(drawing)).toContain('Duct');
    expectReadable(drawing);
  });
});
