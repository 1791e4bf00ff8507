import path from 'node:path';
import { createRequire } from 'node:module';
import { describe, expect, it } from 'vitest';
import type { ArcFlashMethod, Distance, Restricted } from '@/hazard/types';
import { BARLOW_WIDTHS, FIRST_CHARACTER } from '@/shared/drawing/barlowWidths';
import type { Primitive } from '@/shared/drawing/primitives';
import { sectionGeometry } from '@/shared/drawing/section';
import { stripGeometry } from '@/shared/drawing/strip';
import { textWidth } from '@/shared/drawing/textWidth';
import { distanceLines, sectionInputOf, zonesOfWorksheet } from '@/shared/drawing/worksheetDrawing';
import { messages } from '@/shared/messages';
import type { Locale, Units } from '@/shared/user';
import {
  assessmentOf,
  at,
  content,
  expectInside,
  expectReadable,
  fixed277,
  subjectOf,
  textsOf,
  type Situation,
} from '../../support/drawings';

const SYSTEMS: readonly [string, Restricted][] = [
  ['208Y/120', 'avoid contact'],
  ['208Y/120 whole', at(12, 0.3)],
  ['480Y/277', at(12, 0.3)],
];
/** Arc flash boundaries of every row, and labels from absurdly near to absurdly far. */
const ARC_FLASH: readonly [string, Distance | null, ArcFlashMethod][] = [
  ['not likely', null, 'not likely'],
  ['study needed', null, 'study needed'],
  ['category 1', at(19, 0.485), 'ppe category'],
  ['category 2', at(36, 0.9), 'ppe category'],
  ['luminaire', at(60, 1.5), 'ppe category'],
  ['motor control center', at(168, 4.3), 'ppe category'],
  ['switchboard', at(240, 6), 'ppe category'],
  ...[1, 5, 12, 13, 41.9, 42, 43.31, 119, 121, 407.25].map(
    (inches): [string, Distance, ArcFlashMethod] => [
      `label ${inches} in`,
      at(inches, inches * 0.0254),
      'incident energy',
    ],
  ),
];
const situations: Situation[] = SYSTEMS.flatMap(([system, restricted]) =>
  [false, true].flatMap((movable) =>
    ARC_FLASH.map(([arc, arcFlash, method]) => ({
      name: `${system}, ${movable ? 'movable' : 'fixed'}, ${arc}`,
      restricted,
      movable,
      arcFlash,
      method,
    })),
  ),
);

const LANGUAGES: readonly [Locale, Units][] = [
  ['en-US', 'feet'],
  ['es-MX', 'feet'],
  ['en-US', 'metric'],
  ['es-MX', 'metric'],
];

describe.each(situations)('$name', (situation) => {
  it.each(LANGUAGES)('is readable on strip and drawing, %s, %s', (locale, units) => {
    const assessment = assessmentOf(situation);
    const subject = { content, assessment, messages: messages(locale), locale, units };
    for (const width of [358, 424, 700]) {
      const zones = zonesOfWorksheet(subject);
      const strip = stripGeometry({ zones, units, width });
      expectReadable(strip);
      expectInside(strip);
      for (const { figure } of zones.zones) {
        expect(textsOf(strip).map(({ text }) => text)).toContain(figure);
      }
      const drawing = sectionGeometry(
        sectionInputOf(subject, { width, pixelsPerFoot: 35, medium: 'screen' }),
      );
      expectReadable(drawing);
      expectInside(drawing);
      for (const { figure } of zones.zones) {
        expect(textsOf(drawing).map(({ text }) => text)).toContain(figure);
      }
    }
  });
});

describe('the distance strip', () => {
  it('stands at the largest scale that leaves room for the last label', () => {
    const zones = zonesOfWorksheet(subjectOf(assessmentOf(fixed277)));
    expect(stripGeometry({ zones, units: 'feet', width: 358 }).pixelsPerFoot).toBe(46);
    expect(stripGeometry({ zones, units: 'feet', width: 700 }).pixelsPerFoot).toBe(64);
  });

  it('has a tick every inch at 46 px to the foot, of four heights', () => {
    const zones = zonesOfWorksheet(subjectOf(assessmentOf(fixed277)));
    const { primitives } = stripGeometry({ zones, units: 'feet', width: 358 });
    const ticks = primitives.find(
      (primitive): primitive is Extract<Primitive, { kind: 'path' }> =>
        primitive.kind === 'path' && primitive.d.split('M').length > 40,
    );
    const heights = ticks?.d.split('v').slice(1).map(parseFloat);
    expect(heights?.slice(0, 13)).toEqual([15, 4, 4, 7, 4, 4, 10, 4, 4, 7, 4, 4, 15]);
  });

  it('shows no zone and says why while the voltage is not known', () => {
    const assessment = { ...assessmentOf(fixed277), boundaries: null, barricade: null };
    const zones = zonesOfWorksheet(subjectOf(assessment));
    const strip = stripGeometry({ zones, units: 'feet', width: 358 });
    expect(strip.primitives.some(({ kind }) => kind === 'hatch' || kind === 'dots')).toBe(false);
    expect(textsOf(strip).map(({ text }) => text)).toContain(
      'Distances: not known until section 2 is complete',
    );
    expectReadable(strip);
    expectReadable(
      sectionGeometry(
        sectionInputOf(subjectOf(assessment), { width: 358, pixelsPerFoot: 33, medium: 'screen' }),
      ),
    );
  });

  it('says that the arc flash boundary is not known where a study is needed', () => {
    const assessment = assessmentOf({ ...fixed277, arcFlash: null, method: 'study needed' });
    const zones = zonesOfWorksheet(subjectOf(assessment));
    expect(zones.arcFlashNote).toBe('Arc flash: not known');
    expect(distanceLines(subjectOf(assessment))).toContain('Arc flash: not known.');
  });
});

describe('the drawing', () => {
  it('keeps the asked scale where everything fits and takes the next smaller one where not', () => {
    const scaleOf = (situation: Situation) =>
      sectionGeometry(
        sectionInputOf(subjectOf(assessmentOf(situation)), {
          width: 389,
          pixelsPerFoot: 36,
          medium: 'print',
        }),
      ).pixelsPerFoot;
    expect(scaleOf(fixed277)).toBe(36);
    expect(scaleOf({ ...fixed277, movable: true })).toBe(18);
  });

  it('draws each boundary at its distance to scale', () => {
    const input = sectionInputOf(subjectOf(assessmentOf(fixed277)), {
      width: 389,
      pixelsPerFoot: 36,
      medium: 'print',
    });
    const { primitives } = sectionGeometry(input);
    const dots = primitives.find((primitive) => primitive.kind === 'dots');
    if (dots?.kind !== 'dots') throw new Error('The arc flash zone is not drawn.');
    const part = { x: 121, y: 6 + 2.3 * 36 - 0.3 * 36 };
    for (const [x, y] of dots.points) {
      const feet = Math.hypot(x - part.x, y - part.y) / 36;
      expect(feet).toBeGreaterThan(3.5);
      expect(feet).toBeLessThan(5);
    }
  });

  it.each([3, 7.5, 9, 14, 22, 45])(
    'holds together under a ceiling of %d ft',
    (ceilingHeightFeet) => {
      for (const access of [
        'floor',
        'stepladder',
        'extension ladder',
        'platform',
        'lift',
      ] as const) {
        for (const task of ['replace lamp', 'replace breaker'] as const) {
          const surroundings = { ...content.surroundings, ceilingHeightFeet, access };
          const subject = {
            ...subjectOf(assessmentOf(fixed277)),
            content: { ...content, job: { task }, surroundings },
          };
          const drawing = sectionGeometry(
            sectionInputOf(subject, { width: 358, pixelsPerFoot: 33, medium: 'screen' }),
          );
          expectReadable(drawing);
          expect(JSON.stringify(drawing)).not.toMatch(/NaN|null|Infinity/);
        }
      }
    },
  );
});

describe('in words', () => {
  it('gives each boundary with both published figures', () => {
    expect(distanceLines(subjectOf(assessmentOf(fixed277)))).toEqual([
      'Restricted approach boundary: 1\u00a0ft\u00a00\u00a0in (0.3\u00a0m).',
      'Limited approach boundary, fixed: 3\u00a0ft\u00a06\u00a0in (1.0\u00a0m).',
      'Arc flash boundary: 5\u00a0ft\u00a00\u00a0in (1.5\u00a0m).',
      'Barricade, at least: 5\u00a0ft\u00a00\u00a0in (1.5\u00a0m).',
    ]);
  });
});

describe('the widths of Barlow', () => {
  interface Face {
    unitsPerEm: number;
    hasGlyphForCodePoint(code: number): boolean;
    layout(text: string, features?: Record<string, boolean>): { advanceWidth: number };
  }
  const require = createRequire(import.meta.url);
  const fontkit = require('fontkit') as { openSync(file: string): Face };

  it.each([
    [500, '500Medium'],
    [600, '600SemiBold'],
    [700, '700Bold'],
  ] as const)('are those of the face, weight %d', (weight, folder) => {
    const file = path.resolve(
      `node_modules/@expo-google-fonts/barlow/${folder}/Barlow_${folder}.ttf`,
    );
    const face = fontkit.openSync(file);
    BARLOW_WIDTHS[weight].forEach((width, index) => {
      const code = FIRST_CHARACTER + index;
      if (!face.hasGlyphForCodePoint(code)) return expect(width).toBe(0);
      const character = String.fromCodePoint(code);
      const widest = Math.max(
        face.layout(character).advanceWidth,
        face.layout(character, { tnum: true }).advanceWidth,
      );
      expect(width).toBeGreaterThanOrEqual((widest * 1000) / face.unitsPerEm);
    });
    const line = face.layout('Restricted approach', { kern: true }).advanceWidth / face.unitsPerEm;
    expect(textWidth('Restricted approach', 1, weight)).toBeGreaterThanOrEqual(line - 0.03);
  });
});
