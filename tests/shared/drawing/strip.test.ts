import { describe, expect, it } from 'vitest';
import type { Drawing } from '@/shared/drawing/primitives';
import { stripGeometry } from '@/shared/drawing/strip';
import { textWidth } from '@/shared/drawing/textWidth';
import { zonesOfWorksheet } from '@/shared/drawing/worksheetDrawing';
import type { Zone, ZoneSet } from '@/shared/drawing/zones';
import type { Units } from '@/shared/user';
import {
  assessmentOf,
  at,
  expectInside,
  expectReadable,
  fixed277,
  subjectOf,
  textsOf,
} from '../../support/drawings';

const zonesUpTo = (inches: number, units: Units = 'feet'): ZoneSet =>
  zonesOfWorksheet(
    subjectOf(assessmentOf({ ...fixed277, arcFlash: at(inches, inches * 0.0254) }), { units }),
  );
const saying = (message: string): ZoneSet => ({
  zones: [],
  barricade: null,
  message,
  arcFlashNote: null,
});
const pathsOf = ({ primitives }: Drawing) =>
  primitives.flatMap((primitive) => (primitive.kind === 'path' ? [primitive.d] : []));
/** What stands below the ruler, without its unit. */
const numeralsOf = (drawing: Drawing) =>
  textsOf(drawing)
    .filter(({ y, role }) => y === 112 && role === 'note')
    .map(({ text }) => text)
    .filter((text) => /\d/.test(text));

describe('a label that names a boundary far away', () => {
  it.each([
    [1000, ['0', '10', '20', '30', '40', '50', '60', '70', '80', '90', '100', '110']],
    [20_000, ['0', '500', '1000', '1500', '2000']],
    [1_000_000, ['0', '20000', '40000', '60000', '80000', '100000']],
  ])('of %d in still stands on the strip, with numerals apart', (inches, numerals) => {
    const strip = stripGeometry({ zones: zonesUpTo(inches), units: 'feet', width: 358 });
    // The strip ends 118 px beyond the farthest boundary.
    expect(pathsOf(strip)).toContainEqual(expect.stringMatching(/^M240 \d+V/));
    expect(numeralsOf(strip)).toEqual(numerals);
    expectReadable(strip);
    expectInside(strip);
  });

  it.each([1000, 20_000, 1_000_000])('of %d in has a metric ruler that can be read', (inches) => {
    const zones = zonesUpTo(inches, 'metric');
    expectReadable(stripGeometry({ zones, units: 'metric', width: 358 }));
  });

  it('has ticks far enough apart to be told from each other', () => {
    const strip = stripGeometry({ zones: zonesUpTo(1_000_000), units: 'feet', width: 358 });
    const ticks = pathsOf(strip).find((d) => d.split('v').length > 20);
    const places = [...(ticks ?? '').matchAll(/M([\d.]+) /g)].map(([, x]) => Number(x));
    const apart = places.slice(1).map((x, index) => x - (places[index] ?? 0));
    expect(Math.min(...apart)).toBeGreaterThan(3.4);
  });
});

describe('the labels of the strip', () => {
  const zone = (role: Zone['role'], feet: number, figure: string, name: string): Zone => ({
    role,
    feet,
    figure,
    name,
  });
  const near = [
    zone('restricted', 1, '1\u00a0ft\u00a00\u00a0in', 'Restricted'),
    zone('limited', 6.4, '3\u00a0ft\u00a06\u00a0in', 'Limited'),
    zone('arcFlash', 6.5, '5\u00a0ft\u00a00\u00a0in', 'Arc flash'),
  ];
  const known: ZoneSet = { zones: near, barricade: null, message: null, arcFlashNote: null };

  it('that had to move inward while boundaries slide is joined to its boundary', () => {
    const strip = stripGeometry({ zones: known, units: 'feet', width: 358, pixelsPerFoot: 46 });
    expectReadable(strip);
    const limited = textsOf(strip).find(({ text }) => text === 'Limited');
    // From the boundary at 3 + 6.4 × 46 px up, and to the left as far as below the label.
    const tick = pathsOf(strip).find((d) => d.startsWith('M297.4 65V43H'));
    const end = Number(/H([\d.]+)V42$/.exec(tick ?? '')?.[1]);
    expect(end).toBeGreaterThan(limited?.x ?? Infinity);
    expect(end).toBeLessThan(297.4);
  });

  it('has smaller letters where the strip is narrow', () => {
    const sizes = (width: number) => {
      const strip = stripGeometry({ zones: zonesUpTo(60), units: 'feet', width });
      expectReadable(strip);
      const text = textsOf(strip).find(({ text }) => text === '5\u00a0ft\u00a00\u00a0in');
      return text?.size;
    };
    expect(sizes(358)).toBe(20);
    expect(sizes(200)).toBe(16);
    expect(sizes(170)).toBe(14);
  });

  it('says that the arc flash boundary is not known also where no barricade stands', () => {
    const note = 'Arc flash: not known';
    const zones = { ...known, zones: near.slice(0, 2), arcFlashNote: note };
    const strip = stripGeometry({ zones, units: 'feet', width: 358 });
    expect(textsOf(strip).map(({ text }) => text)).toContain(note);
    expectReadable(strip);
  });
});

describe('the message in place of distances', () => {
  const linesAt = (message: string, width: number) => {
    const strip = stripGeometry({ zones: saying(message), units: 'feet', width });
    return textsOf(strip).filter(({ role }) => role === 'ink');
  };
  const outside = 'Distances: outside the table. Ask for an engineering study';

  it('is one line in the middle where it fits', () => {
    const lines = linesAt('Distances: not specified below 50 V', 358);
    expect(lines.map(({ text, y, size }) => [text, y, size])).toEqual([
      ['Distances: not specified below 50 V', 30, 15],
    ]);
  });

  it('is two lines where one is too short', () => {
    const lines = linesAt(outside, 358);
    expect(lines.map(({ text }) => text).join(' ')).toBe(outside);
    expect(lines.map(({ y, size }) => [y, size])).toEqual([
      [17, 15],
      [36, 15],
    ]);
  });

  it('has smaller letters rather than a third line', () => {
    const lines = linesAt(outside, 170);
    expect(lines.map(({ text }) => text).join(' ')).toBe(outside);
    expect(lines).toHaveLength(2);
    expect(lines.map(({ size }) => size)).toEqual([13, 13]);
  });

  it('is whole, in the smallest letters, also where there is no room for it', () => {
    const lines = linesAt(outside, 130);
    expect(lines.map(({ text }) => text).join(' ')).toBe(outside);
    expect(lines.map(({ size }) => size)).toEqual(lines.map(() => 12));
    expect(lines.length).toBeGreaterThan(2);
  });
});

describe('a character that Barlow does not have', () => {
  it.each(['漢', '→', '😀', '\u0007'])('counts as a full em: %j', (character) => {
    expect(textWidth(character, 20, 600)).toBe(20);
    expect(textWidth(`A${character}`, 10, 700)).toBeCloseTo(textWidth('A', 10, 700) + 10);
  });
});
