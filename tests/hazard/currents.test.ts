import fc from 'fast-check';
import { all, bignumber, create } from 'mathjs';
import { describe, expect, it } from 'vitest';
import { boltedFaultAmperes, loadAmperes, touchMilliamperes } from '@/hazard';

/** An independent calculator, with decimal arithmetic of 64 digits. */
const math = create(all ?? {}, { number: 'BigNumber', precision: 64 });
const calculate = (expression: string, scope: Record<string, number>) =>
  Number(
    math.evaluate(
      expression,
      Object.fromEntries(Object.entries(scope).map(([name, value]) => [name, bignumber(value)])),
    ),
  );
const isClose = (value: number, expected: number) =>
  Math.abs(value - expected) <= 1e-9 * Math.abs(expected);
const positive = (max: number) => fc.double({ min: 0.01, max, noNaN: true });

describe('the bolted fault current of a transformer on an infinite bus', () => {
  it('agrees with the published example of 3000 kVA, printed as 62 760 A', () => {
    const amperes = boltedFaultAmperes({
      kilovoltAmperes: 3000,
      secondaryVolts: 480,
      impedancePercent: 5.75,
      phases: 3,
    });
    expect(Math.abs(amperes - 62_756)).toBeLessThan(1);
    expect(Math.round(amperes / 10) * 10).toBe(62_760);
  });

  it('agrees with the published example of 100 kVA, 440 V, 5 %, printed as 2624.1 A', () => {
    const amperes = boltedFaultAmperes({
      kilovoltAmperes: 100,
      secondaryVolts: 440,
      impedancePercent: 5,
      phases: 3,
    });
    expect(amperes).toBeCloseTo(2624.3, 1);
  });

  it('leaves the square root of 3 out of a single-phase transformer', () => {
    const amperes = boltedFaultAmperes({
      kilovoltAmperes: 25,
      secondaryVolts: 240,
      impedancePercent: 2,
      phases: 1,
    });
    expect(amperes).toBeCloseTo(5208.333, 3);
  });

  it('agrees with an independent calculator', () => {
    fc.assert(
      fc.property(
        positive(10_000),
        positive(600),
        positive(20),
        fc.constantFrom(1 as const, 3 as const),
        (kilovoltAmperes, secondaryVolts, impedancePercent, phases) => {
          const given = { kilovoltAmperes, secondaryVolts, impedancePercent, phases };
          const expected = calculate(
            'kilovoltAmperes * 1000 / (sqrt(phases) * secondaryVolts * impedancePercent / 100)',
            given,
          );
          return isClose(boltedFaultAmperes(given), expected);
        },
      ),
    );
  });

  it.each(['kilovoltAmperes', 'secondaryVolts', 'impedancePercent', 'phases'] as const)(
    'refuses bad figures for %s by name',
    (name) => {
      const sound = {
        kilovoltAmperes: 75,
        secondaryVolts: 208,
        impedancePercent: 3,
        phases: 3,
      } as const;
      for (const bad of [NaN, Infinity, -1]) {
        const ask = () => boltedFaultAmperes({ ...sound, [name]: bad });
        expect(ask).toThrow(RangeError);
        expect(ask).toThrow(new RegExp(`^${name}`));
      }
    },
  );

  it('refuses zero only where it divides', () => {
    const sound = {
      kilovoltAmperes: 75,
      secondaryVolts: 208,
      impedancePercent: 3,
      phases: 3,
    } as const;
    expect(boltedFaultAmperes({ ...sound, kilovoltAmperes: 0 })).toBe(0);
    expect(() => boltedFaultAmperes({ ...sound, secondaryVolts: 0 })).toThrow(/^secondaryVolts/);
    expect(() => boltedFaultAmperes({ ...sound, impedancePercent: 0 })).toThrow(
      /^impedancePercent/,
    );
    expect(() => boltedFaultAmperes({ ...sound, phases: 2 as 3 })).toThrow(/^phases/);
    expect(() => boltedFaultAmperes({ ...sound, impedancePercent: Number.MIN_VALUE })).toThrow(
      RangeError,
    );
  });
});

describe('the current of a load', () => {
  it.each([
    { watts: 600, volts: 120, phases: 1, powerFactor: undefined, amperes: 5 },
    { watts: 277, volts: 277, phases: 1, powerFactor: 0.5, amperes: 2 },
    { watts: 0, volts: 120, phases: 1, powerFactor: 1, amperes: 0 },
    // 4800 / (1.732 x 480)
    { watts: 4800, volts: 480, phases: 3, powerFactor: 1, amperes: 5.7735 },
  ] as const)('$watts W at $volts V', ({ amperes, ...load }) => {
    expect(loadAmperes(load)).toBeCloseTo(amperes, 4);
  });

  it('agrees with an independent calculator', () => {
    fc.assert(
      fc.property(
        positive(100_000),
        positive(600),
        fc.double({ min: 0.05, max: 1, noNaN: true }),
        fc.constantFrom(1 as const, 3 as const),
        (watts, volts, powerFactor, phases) => {
          const given = { watts, volts, powerFactor, phases };
          const expected = calculate('watts / (sqrt(phases) * volts * powerFactor)', given);
          return isClose(loadAmperes(given), expected);
        },
      ),
    );
  });

  it('names the argument that it refuses', () => {
    const sound = { watts: 600, volts: 120, phases: 1, powerFactor: 0.9 } as const;
    expect(() => loadAmperes({ ...sound, watts: -1 })).toThrow(/^watts/);
    expect(() => loadAmperes({ ...sound, volts: 0 })).toThrow(/^volts/);
    expect(() => loadAmperes({ ...sound, phases: 0 as 1 })).toThrow(/^phases/);
    expect(() => loadAmperes({ ...sound, powerFactor: 0 })).toThrow(/^powerFactor/);
    expect(() => loadAmperes({ ...sound, powerFactor: 1.01 })).toThrow(/^powerFactor/);
    expect(() => loadAmperes({ ...sound, powerFactor: NaN })).toThrow(RangeError);
    expect(() => loadAmperes({ ...sound, volts: Number.MIN_VALUE })).toThrow(/^volts/);
  });
});

describe('the current through a body, IEC 60479-1 (from memory)', () => {
  it.each([
    [100, 990, 1725, 3125],
    [125, 900, 1550, 2675],
    [150, 850, 1400, 2350],
    [175, 825, 1325, 2175],
    [200, 800, 1275, 2050],
    [225, 775, 1225, 1900],
    [400, 700, 950, 1275],
    [500, 625, 850, 1150],
    [700, 575, 775, 1050],
    [850, 575, 775, 1050],
    [1000, 575, 775, 1050],
  ])('at %d V: %d, %d and %d ohms (from memory)', (volts, p5, p50, p95) => {
    const current = touchMilliamperes({ volts });
    expect(current.p5).toBeCloseTo((1000 * volts) / p5, 9);
    expect(current.p50).toBeCloseTo((1000 * volts) / p50, 9);
    expect(current.p95).toBeCloseTo((1000 * volts) / p95, 9);
    expect(current.citation).toMatchObject({ standard: 'IEC 60479-1', confidence: 'memory' });
  });

  // Worked by hand, the impedance on the line between two rows.
  it.each([
    [120, 130.7, 75.7, 43.4],
    [277, 368.0, 242.3, 161.6],
    [480, 750.0, 551.7, 408.5],
  ])('at %d V, between two rows: %d, %d and %d mA', (volts, p5, p50, p95) => {
    const current = touchMilliamperes({ volts });
    expect(current.p5).toBeCloseTo(p5, 1);
    expect(current.p50).toBeCloseTo(p50, 1);
    expect(current.p95).toBeCloseTo(p95, 1);
  });

  it('never falls as the voltage rises, and is largest at the 5th percentile', () => {
    const volts = fc.double({ min: 100, max: 1000, noNaN: true });
    fc.assert(
      fc.property(volts, volts, (one, other) => {
        const low = touchMilliamperes({ volts: Math.min(one, other) });
        const high = touchMilliamperes({ volts: Math.max(one, other) });
        expect(high.p5).toBeGreaterThanOrEqual(low.p5);
        expect(high.p50).toBeGreaterThanOrEqual(low.p50);
        expect(high.p95).toBeGreaterThanOrEqual(low.p95);
        expect(low.p5).toBeGreaterThan(low.p50);
        expect(low.p50).toBeGreaterThan(low.p95);
      }),
    );
  });

  it.each([99.9, 1000.1, 0, -100, NaN, Infinity])('refuses %d V', (volts) => {
    expect(() => touchMilliamperes({ volts })).toThrow(RangeError);
    expect(() => touchMilliamperes({ volts })).toThrow(/^volts/);
  });
});
