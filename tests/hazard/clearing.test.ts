import { describe, expect, it } from 'vitest';
import { clearingSecondsOfCycles } from '@/hazard';

describe('clearing time in cycles of 60 Hz', () => {
  // NFPA 70E Table 130.7(C)(15)(a) prints 2, 20 and 30 cycles beside these seconds.
  it.each([
    [2, 0.03],
    [20, 0.33],
    [30, 0.5],
    [1, 1 / 60],
    [3, 0.05],
    [60, 1],
    [2.5, 2.5 / 60],
  ])('%d cycles are %d s', (cycles, seconds) => {
    expect(clearingSecondsOfCycles(cycles)).toBe(seconds);
  });

  it.each([0, -2, NaN, Infinity])('refuses %d cycles', (cycles) => {
    expect(() => clearingSecondsOfCycles(cycles)).toThrow(RangeError);
    expect(() => clearingSecondsOfCycles(cycles)).toThrow(/^cycles/);
  });
});
