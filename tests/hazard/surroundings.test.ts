import { describe, expect, it } from 'vitest';
import { barricadeDistance, lookupShockBoundaries, minimumStepladder } from '@/hazard';

describe('the smallest stepladder, a rule of thumb (common practice)', () => {
  // Highest standing level is the size less 2 ft; 6 ft of reach above it.
  it.each([
    [0, 0, { sizeFeet: 4, standingLevelFeet: 2 }],
    [8, 0, { sizeFeet: 4, standingLevelFeet: 2 }],
    [8, undefined, { sizeFeet: 6, standingLevelFeet: 4 }],
    [9, undefined, { sizeFeet: 6, standingLevelFeet: 4 }],
    [9.1, undefined, { sizeFeet: 8, standingLevelFeet: 6 }],
    [11, undefined, { sizeFeet: 8, standingLevelFeet: 6 }],
    [13, undefined, { sizeFeet: 10, standingLevelFeet: 8 }],
    [15, undefined, { sizeFeet: 12, standingLevelFeet: 10 }],
    [17, undefined, { sizeFeet: 14, standingLevelFeet: 12 }],
    [19, undefined, { sizeFeet: 16, standingLevelFeet: 14 }],
    [19.1, undefined, null],
    [20, 0, { sizeFeet: 16, standingLevelFeet: 14 }],
    [12, 3, { sizeFeet: 12, standingLevelFeet: 10 }],
    [1e9, undefined, null],
  ])('ceiling at %d ft, %s ft above it', (ceilingHeightFeet, aboveCeilingFeet, expected) => {
    expect(minimumStepladder({ ceilingHeightFeet, aboveCeilingFeet })).toEqual(expected);
  });

  it.each([NaN, Infinity, -1])('refuses %d ft', (feet) => {
    expect(() => minimumStepladder({ ceilingHeightFeet: feet })).toThrow(/^ceilingHeightFeet/);
    expect(() => minimumStepladder({ ceilingHeightFeet: 9, aboveCeilingFeet: feet })).toThrow(
      /^aboveCeilingFeet/,
    );
  });
});

describe('where a barricade stands', () => {
  const boundaries = (volts: number) => lookupShockBoundaries({ current: 'ac', volts });
  const twentyFeet = { inches: 240, metres: 6 };
  const nineteenInches = { inches: 19, metres: 0.485 };

  it.each([
    { volts: 480, arcFlashBoundary: null, movable: false, expected: { inches: 42, metres: 1 } },
    { volts: 480, arcFlashBoundary: null, movable: true, expected: { inches: 120, metres: 3 } },
    {
      volts: 480,
      arcFlashBoundary: nineteenInches,
      movable: false,
      expected: { inches: 42, metres: 1 },
    },
    {
      volts: 480,
      arcFlashBoundary: { inches: 60, metres: 1.5 },
      movable: false,
      expected: { inches: 60, metres: 1.5 },
    },
    { volts: 480, arcFlashBoundary: twentyFeet, movable: true, expected: twentyFeet },
    // On a tie the limited pair, whose metres are printed otherwise.
    {
      volts: 480,
      arcFlashBoundary: { inches: 42, metres: 42 * 0.0254 },
      movable: false,
      expected: { inches: 42, metres: 1 },
    },
    { volts: 24, arcFlashBoundary: null, movable: true, expected: { inches: 0, metres: 0 } },
    { volts: 24, arcFlashBoundary: nineteenInches, movable: false, expected: nineteenInches },
  ])('at $volts V, $arcFlashBoundary, movable $movable', ({ volts, expected, ...rest }) => {
    expect(barricadeDistance({ boundaries: boundaries(volts), ...rest })).toEqual(expected);
  });

  it('takes a missing arc flash boundary for none', () => {
    expect(
      barricadeDistance({
        boundaries: boundaries(208),
        arcFlashBoundary: undefined,
        movable: false,
      }),
    ).toEqual({ inches: 42, metres: 1 });
  });

  it('names the argument that it refuses', () => {
    const sound = { boundaries: boundaries(480), arcFlashBoundary: null, movable: false };
    const outside = () => barricadeDistance({ ...sound, boundaries: boundaries(20_000) });
    expect(outside).toThrow(RangeError);
    expect(outside).toThrow(/^boundaries/);
    expect(() => barricadeDistance({ ...sound, movable: undefined as unknown as boolean })).toThrow(
      /^movable/,
    );
    expect(() =>
      barricadeDistance({ ...sound, arcFlashBoundary: { inches: NaN, metres: 1 } }),
    ).toThrow(/^arcFlashBoundary/);
    const broken = { ...boundaries(480), limitedFixed: { inches: -1, metres: 1 } };
    expect(() => barricadeDistance({ ...sound, boundaries: broken })).toThrow(/^boundaries/);
  });
});
