import { describe, expect, it } from 'vitest';
import { identifySystem } from '@/hazard';
import type { SystemCode } from '@/hazard';

const identify = (phaseToPhase: number[], phaseToNeutral: number[]) =>
  identifySystem({ phaseToPhase, phaseToNeutral });

describe('identifySystem, windows of ANSI C84.1 range B (from memory)', () => {
  it.each<[number[], number[], SystemCode[]]>([
    [[208, 207, 209], [120, 121, 120], ['208Y/120']],
    [[480, 481, 479], [277, 278, 276], ['480Y/277']],
    [[240], [120, 121], ['120/240', '240/120 high-leg']],
    [[240, 239, 241], [120, 120, 208], ['240/120 high-leg']],
    [[240, 240, 240], [120, 120], ['240/120 high-leg']],
    [[480, 480, 480], [], ['480Y/277', '480 delta']],
    [[240, 240, 240], [], ['240/120 high-leg']],
    [[240], [], ['120/240', '240/120 high-leg']],
    [[208], [], ['208Y/120', '120/240', '240/120 high-leg']],
    [[208, 208, 208], [], ['208Y/120', '240/120 high-leg']],
    [[], [120], ['208Y/120', '120/240', '240/120 high-leg']],
    [[], [120, 120, 120], ['208Y/120']],
    [[], [208], ['240/120 high-leg']],
    [[], [277], ['480Y/277']],
    [[480], [120], []],
    [[347], [], []],
    [[600], [347], []],
    [[], [], []],
    [[0, 0, 0], [0, 0, 0], []],
    [[0], [], []],
    [[], [0], []],
    [[208, 0], [120], []],
  ])('%j phase-to-phase and %j to neutral fit %j', (phaseToPhase, phaseToNeutral, expected) => {
    expect(identify(phaseToPhase, phaseToNeutral)).toEqual(expected);
  });

  it.each<[SystemCode, number, number]>([
    ['208Y/120', 180, 220],
    ['480Y/277', 416, 508],
    ['120/240', 208, 254],
    ['240/120 high-leg', 208, 254],
    ['480 delta', 416, 508],
  ])('%s holds %d V and %d V phase-to-phase, and nothing outside', (system, from, upTo) => {
    expect(identify([from], [])).toContain(system);
    expect(identify([upTo], [])).toContain(system);
    expect(identify([from - 0.1], [])).not.toContain(system);
    expect(identify([upTo + 0.1], [])).not.toContain(system);
  });

  it.each<[SystemCode, number, number]>([
    ['208Y/120', 104, 127],
    ['480Y/277', 240, 293],
    ['120/240', 104, 127],
    ['240/120 high-leg', 104, 127],
    ['240/120 high-leg', 180, 220],
  ])('%s holds %d V and %d V to neutral, and nothing outside', (system, from, upTo) => {
    expect(identify([], [from])).toContain(system);
    expect(identify([], [upTo])).toContain(system);
    expect(identify([], [from - 0.1])).not.toContain(system);
    expect(identify([], [upTo + 0.1])).not.toContain(system);
  });

  // 5 % of the square root of 3: 1.6454 to 1.8187.
  it.each<[number, number, boolean]>([
    [180, 109.5, false],
    [180, 109.3, true],
    [218, 119.8, false],
    [218, 119.9, true],
  ])('the quotient of %d and %d fits a wye: %s', (phaseToPhase, phaseToNeutral, fits) => {
    expect(identify([phaseToPhase], [phaseToNeutral]).includes('208Y/120')).toBe(fits);
  });

  // 5 % of 2: 1.9 to 2.1.
  it.each<[number, number, boolean]>([
    [228, 120, true],
    [227.9, 120, false],
    [252, 120, true],
    [252.1, 120, false],
  ])('the quotient of %d and %d fits 120/240: %s', (phaseToPhase, phaseToNeutral, fits) => {
    expect(identify([phaseToPhase], [phaseToNeutral]).includes('120/240')).toBe(fits);
  });

  it('takes the quotient of the means, not of single readings', () => {
    expect(identify([200, 216], [116, 124])).toContain('208Y/120');
  });

  it('asks no quotient of a high-leg delta', () => {
    expect(identify([254], [104])).toEqual(['240/120 high-leg']);
  });

  it('allows a high-leg delta one reading of 208 V and two of 120 V', () => {
    expect(identify([240, 240, 240], [120, 208, 208])).toEqual([]);
    expect(identify([240, 240, 240], [120, 120, 120])).toEqual([]);
  });

  it('excludes nothing by a kind that was not given', () => {
    expect(identifySystem({ phaseToPhase: [480] })).toEqual(['480Y/277', '480 delta']);
    expect(identifySystem({ phaseToNeutral: [277] })).toEqual(['480Y/277']);
    expect(identifySystem({})).toEqual([]);
  });

  it.each([NaN, Infinity, -120])('refuses a reading of %d', (volts) => {
    expect(() => identify([volts], [])).toThrow(RangeError);
    expect(() => identify([volts], [])).toThrow(/^phaseToPhase/);
    expect(() => identify([], [volts])).toThrow(/^phaseToNeutral/);
  });

  it('refuses what is not a list', () => {
    expect(() => identifySystem({ phaseToPhase: 480 as unknown as number[] })).toThrow(
      /^phaseToPhase/,
    );
  });
});
