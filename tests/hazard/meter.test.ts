import { describe, expect, it } from 'vitest';
import { meterIsAdequate } from '@/hazard';
import type { MeterCategory, MeterLocation } from '@/hazard';

describe('measurement categories, IEC 61010-2-030', () => {
  it.each<[MeterLocation, MeterCategory, boolean]>([
    ['cord-connected', 'II', true],
    ['cord-connected', 'III', true],
    ['cord-connected', 'IV', true],
    ['fixed wiring', 'II', false],
    ['fixed wiring', 'III', true],
    ['fixed wiring', 'IV', true],
    ['service', 'II', false],
    ['service', 'III', false],
    ['service', 'IV', true],
  ])('%s with category %s: %s', (location, category, adequate) => {
    const meter = { category, location, systemVolts: 480 };
    expect(meterIsAdequate({ ...meter, ratedVolts: 480 })).toBe(adequate);
    expect(meterIsAdequate({ ...meter, ratedVolts: 479.9 })).toBe(false);
    expect(meterIsAdequate({ ...meter, ratedVolts: 1000 })).toBe(adequate);
  });

  it('names the argument that it refuses', () => {
    const meter = {
      category: 'III',
      location: 'fixed wiring',
      ratedVolts: 600,
      systemVolts: 480,
    } as const;
    expect(() => meterIsAdequate({ ...meter, category: 'I' as 'II' })).toThrow(/^category/);
    expect(() => meterIsAdequate({ ...meter, location: 'roof' as 'service' })).toThrow(/^location/);
    expect(() => meterIsAdequate({ ...meter, ratedVolts: NaN })).toThrow(/^ratedVolts/);
    expect(() => meterIsAdequate({ ...meter, systemVolts: -1 })).toThrow(/^systemVolts/);
    expect(() => meterIsAdequate({ ...meter, systemVolts: Infinity })).toThrow(RangeError);
  });
});
