import { describe, expect, it } from 'vitest';
import {
  circuitVoltsOf,
  lookupShockBoundaries,
  phaseToPhaseVoltsOf,
  shockTableVolts,
  SYSTEMS,
} from '@/hazard';
import type { Exposure, SystemCode } from '@/hazard';

const at = (inches: number, metres: number) => ({ inches, metres });
const ac = (volts: number) => lookupShockBoundaries({ current: 'ac', volts });
const dc = (volts: number) => lookupShockBoundaries({ current: 'dc', volts });
const tenFeet = at(120, 3);
const notSpecified = { limitedMovable: null, limitedFixed: null, restricted: null };

describe('shock boundaries, NFPA 70E-2024 Table 130.4(E)(a), alternating current', () => {
  // Typed again from the published values; the metric pairs are from memory.
  it.each([0, 12, 24, 49.99])('specifies nothing at %d V', (volts) => {
    expect(ac(volts)).toMatchObject({ inTable: true, row: 'below 50 V', ...notSpecified });
  });

  it.each([
    { volts: 50, row: '50 V to 150 V', limitedFixed: at(42, 1), restricted: 'avoid contact' },
    { volts: 120, row: '50 V to 150 V', limitedFixed: at(42, 1), restricted: 'avoid contact' },
    { volts: 150, row: '50 V to 150 V', limitedFixed: at(42, 1), restricted: 'avoid contact' },
    {
      volts: 150.01,
      row: 'above 150 V to 750 V',
      limitedFixed: at(42, 1),
      restricted: at(12, 0.3),
    },
    { volts: 208, row: 'above 150 V to 750 V', limitedFixed: at(42, 1), restricted: at(12, 0.3) },
    // Older editions split here; this one does not.
    { volts: 300, row: 'above 150 V to 750 V', limitedFixed: at(42, 1), restricted: at(12, 0.3) },
    { volts: 301, row: 'above 150 V to 750 V', limitedFixed: at(42, 1), restricted: at(12, 0.3) },
    { volts: 480, row: 'above 150 V to 750 V', limitedFixed: at(42, 1), restricted: at(12, 0.3) },
    { volts: 750, row: 'above 150 V to 750 V', limitedFixed: at(42, 1), restricted: at(12, 0.3) },
  ])('gives the agreeing row at $volts V', ({ volts, ...expected }) => {
    const answer = ac(volts);
    expect(answer).toMatchObject({ inTable: true, limitedMovable: tenFeet, ...expected });
    expect(answer.citation).toEqual({
      standard: 'NFPA 70E',
      edition: '2024',
      table: 'Table 130.4(E)(a) (2018: 130.4(D)(a))',
      confidence: 'agreeing',
    });
  });

  it.each([750.01, 5000, 15_000])('gives the row of one source at %d V', (volts) => {
    expect(ac(volts)).toMatchObject({
      inTable: true,
      row: 'above 750 V to 15 kV',
      limitedMovable: tenFeet,
      limitedFixed: at(60, 1.5),
      restricted: at(26, 0.7),
      citation: { confidence: 'single' },
    });
  });

  it.each([15_000.01, 34_500, 1_000_000])('extrapolates nothing at %d V', (volts) => {
    const answer = ac(volts);
    expect(answer.inTable).toBe(false);
    expect(Object.keys(answer).sort()).toEqual(['citation', 'inTable']);
  });
});

describe('shock boundaries, NFPA 70E-2024 Table 130.4(E)(b), direct current (from memory)', () => {
  it.each([
    { volts: 49.9, row: 'below 50 V', ...notSpecified },
    {
      volts: 50,
      row: '50 V to 300 V',
      limitedMovable: tenFeet,
      limitedFixed: at(42, 1),
      restricted: 'avoid contact',
    },
    {
      volts: 300,
      row: '50 V to 300 V',
      limitedMovable: tenFeet,
      limitedFixed: at(42, 1),
      restricted: 'avoid contact',
    },
    {
      volts: 300.1,
      row: 'above 300 V to 1 kV',
      limitedMovable: tenFeet,
      limitedFixed: at(42, 1),
      restricted: at(12, 0.3),
    },
    {
      volts: 1000,
      row: 'above 300 V to 1 kV',
      limitedMovable: tenFeet,
      limitedFixed: at(42, 1),
      restricted: at(12, 0.3),
    },
    {
      volts: 1000.1,
      row: 'above 1 kV to 5 kV',
      limitedMovable: tenFeet,
      limitedFixed: at(60, 1.5),
      restricted: at(17, 0.4),
    },
    {
      volts: 5000,
      row: 'above 1 kV to 5 kV',
      limitedMovable: tenFeet,
      limitedFixed: at(60, 1.5),
      restricted: at(17, 0.4),
    },
  ])('at $volts V (from memory)', ({ volts, ...expected }) => {
    expect(dc(volts)).toMatchObject({
      inTable: true,
      ...expected,
      citation: { confidence: 'memory' },
    });
  });

  it('extrapolates nothing past 5 kV', () => {
    expect(dc(5000.1)).toMatchObject({ inTable: false, citation: { confidence: 'memory' } });
  });
});

describe('arguments of lookupShockBoundaries', () => {
  it.each([NaN, Infinity, -Infinity, -1, undefined, null, '120'])('refuses %s volts', (volts) => {
    const lookup = () => lookupShockBoundaries({ current: 'ac', volts: volts as number });
    expect(lookup).toThrow(RangeError);
    expect(lookup).toThrow(/^volts/);
  });

  it.each(['AC', '', undefined, null, {}])('refuses the current %s', (current) => {
    const lookup = () => lookupShockBoundaries({ current: current as 'ac', volts: 120 });
    expect(lookup).toThrow(RangeError);
    expect(lookup).toThrow(/^current/);
  });
});

describe('the voltage that enters the shock table', () => {
  // NFPA 70E: nominal, phase-to-phase; single-phase above 250 V to ground by 1.732 (from memory).
  it.each<[SystemCode, number, Exposure | undefined, number, string]>([
    ['208Y/120', 120, 'one circuit', 120, 'one circuit'],
    ['208Y/120', 208, 'one circuit', 208, 'one circuit'],
    ['208Y/120', 120, 'whole equipment', 208, 'whole equipment'],
    ['208Y/120', 120, undefined, 208, 'whole equipment'],
    ['480Y/277', 277, 'one circuit', 480, 'single-phase above 250 V to ground'],
    ['480Y/277', 480, 'one circuit', 480, 'one circuit'],
    ['480Y/277', 277, 'whole equipment', 480, 'whole equipment'],
    ['120/240', 120, 'one circuit', 120, 'one circuit'],
    ['120/240', 240, 'one circuit', 240, 'one circuit'],
    ['120/240', 120, undefined, 240, 'whole equipment'],
    ['240/120 high-leg', 120, 'one circuit', 240, 'high-leg'],
    ['240/120 high-leg', 240, 'one circuit', 240, 'high-leg'],
    ['240/120 high-leg', 208, 'one circuit', 240, 'high-leg'],
    ['240/120 high-leg', 120, 'whole equipment', 240, 'high-leg'],
    ['480 delta', 480, 'one circuit', 480, 'one circuit'],
    ['480 delta', 480, undefined, 480, 'whole equipment'],
  ])('%s, %d V, %s: %d V', (system, circuitVolts, exposure, volts, because) => {
    expect(shockTableVolts({ system, circuitVolts, exposure })).toEqual({ volts, because });
  });

  it.each<[SystemCode, number, number]>([
    ['480Y/277', 120, 480],
    ['208Y/120', 277, 277],
    ['208Y/120', 24, 208],
  ])('takes the larger figure where %s has no %d V circuit', (system, circuitVolts, volts) => {
    expect(shockTableVolts({ system, circuitVolts, exposure: 'one circuit' })).toEqual({
      volts,
      because: 'circuit not of system',
    });
  });

  it('names the argument that it refuses', () => {
    const given = { system: '208Y/120', circuitVolts: 120, exposure: 'one circuit' } as const;
    expect(() => shockTableVolts({ ...given, system: '347/600' as SystemCode })).toThrow(/^system/);
    expect(() => shockTableVolts({ ...given, circuitVolts: NaN })).toThrow(/^circuitVolts/);
    expect(() => shockTableVolts({ ...given, exposure: 'some' as Exposure })).toThrow(/^exposure/);
  });
});

describe('the circuits of a system', () => {
  it.each<[SystemCode, number[], number]>([
    ['208Y/120', [120, 208], 208],
    ['480Y/277', [277, 480], 480],
    ['120/240', [120, 240], 240],
    ['240/120 high-leg', [120, 240], 240],
    ['480 delta', [480], 480],
  ])('of %s are %j V, %d V phase-to-phase', (system, circuits, phaseToPhase) => {
    expect(circuitVoltsOf(system)).toEqual(circuits);
    expect(phaseToPhaseVoltsOf(system)).toBe(phaseToPhase);
  });

  it('are a list that the caller may change', () => {
    for (const system of SYSTEMS) {
      circuitVoltsOf(system).push(1);
      expect(circuitVoltsOf(system)).not.toContain(1);
    }
  });

  it('are refused for a system that is not known', () => {
    expect(() => circuitVoltsOf('constructor' as SystemCode)).toThrow(RangeError);
    expect(() => circuitVoltsOf('' as SystemCode)).toThrow(/^system/);
    expect(() => phaseToPhaseVoltsOf('600' as SystemCode)).toThrow(/^system/);
  });
});
