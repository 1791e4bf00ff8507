import { describe, expect, it } from 'vitest';
import * as format from '@/shared/format';

/** A no-break space, shown as `_` so that a test says where it stands. */
const seen = (text: string) => text.replaceAll('\u00a0', '_');

describe('distances', () => {
  const pair = { inches: 42, metres: 1 };

  it('prints the published pair, never a conversion', () => {
    expect(seen(format.distance(pair, 'feet'))).toBe('3_ft_6_in');
    expect(seen(format.distance(pair, 'metric'))).toBe('1.0_m');
    expect(seen(format.distancePair(pair, 'feet'))).toBe('3_ft_6_in (1.0_m)');
    expect(seen(format.distancePair(pair, 'metric'))).toBe('1.0_m (3_ft_6_in)');
    expect(seen(format.distance({ inches: 19, metres: 0.485 }, 'metric'))).toBe('0.485_m');
    expect(seen(format.distance({ inches: 12, metres: 0.3 }, 'feet'))).toBe('1_ft_0_in');
  });

  it('rounds a distance that is asked for up', () => {
    expect(seen(format.feetAndInches(11.9999))).toBe('1_ft_0_in');
    expect(seen(format.feetAndInches(40.001))).toBe('3_ft_4.01_in');
    expect(seen(format.metres(1.2192))).toBe('1.22_m');
    expect(seen(format.metres(1.2191))).toBe('1.22_m');
    expect(seen(format.metres(1.2181))).toBe('1.219_m');
  });

  it('never shows a typed distance longer than it is, and metres as typed', () => {
    expect(seen(format.typedDistance(18, 'feet'))).toBe('1_ft_6_in');
    expect(seen(format.typedDistance(17.999, 'feet'))).toBe('1_ft_5.99_in');
    expect(seen(format.typedDistance(18, 'metric'))).toBe('0.457_m');
    for (const metres of [0.3, 0.45, 0.485, 0.9, 1, 1.07, 3.05]) {
      const inches = format.parseDistance(`${metres} m`, 'in') ?? NaN;
      expect(seen(format.typedDistance(inches, 'metric'))).toBe(
        `${Number.isInteger(metres * 10) ? metres.toFixed(1) : metres}_m`,
      );
    }
    expect(seen(format.typedFeet(6, 'feet'))).toBe('6_ft_0_in');
    expect(seen(format.typedFeet(9.5, 'feet'))).toBe('9_ft_6_in');
  });

  it.each([
    ['3 ft 6 in', 42],
    [`3'6"`, 42],
    ['3′ 6″', 42],
    ['3\u00a0ft\u00a06\u00a0in', 42],
    ['3 pies 6 pulgadas', 42],
    ['42 in', 42],
    ['4 ft', 48],
    ['1.5 ft', 18],
    ['18.5', 18.5],
    [' 18 ', 18],
    ['254 mm', 10],
    ['25.4 cm', 10],
    ['0.254 M', 10],
  ])('reads %s as inches', (typed, inches) => {
    expect(format.parseDistance(typed, 'in')).toBeCloseTo(inches, 9);
  });

  it('reads a bare number in the unit asked for', () => {
    expect(format.parseDistance('9', 'ft')).toBe(108);
    expect(format.parseDistance('1', 'm')).toBeCloseTo(39.3700787, 6);
  });

  it.each(['', '  ', 'ft', 'abc', '1,5 m', '-3', '3 ft 6', '1e3', '3 ft 6 in 2', 'Infinity'])(
    'does not guess what %j means',
    (typed) => {
      expect(format.parseDistance(typed, 'in')).toBeNull();
    },
  );
});

describe('figures', () => {
  it('keeps number and unit together', () => {
    expect(seen(format.volts('en-US', 480))).toBe('480_V');
    expect(seen(format.reading('en-US', 0))).toBe('0.0_V');
    expect(seen(format.reading('es-MX', -3.25))).toBe('-3.25_V');
    expect(seen(format.amperes('en-US', 2.633))).toBe('2.63_A');
    expect(seen(format.kiloamperes('en-US', 62.756))).toBe('62.76_kA');
    expect(seen(format.milliamperes('en-US', 161.6))).toBe('162_mA');
    expect(seen(format.watts('en-US', 728))).toBe('728_W');
    expect(seen(format.seconds('en-US', 0.03))).toBe('0.03_s');
    expect(seen(format.calories('en-US', 8))).toBe('8_cal/cm²');
    expect(seen(format.quantity('en-US', 1000, 'V'))).toBe('1000_V');
    expect(format.number('es-MX', 62756)).toBe('62,756');
  });

  it('picks the form of a word by its count', () => {
    const forms = { one: 'stop', other: 'stops' };
    expect(format.plural('en-US', 1, forms)).toBe('stop');
    expect(format.plural('en-US', 0, forms)).toBe('stops');
    expect(format.plural('es-MX', 2, forms)).toBe('stops');
  });

  it('joins lists as each language does', () => {
    expect(format.list('en-US', ['A', 'B', 'C'])).toBe('A, B, and C');
    expect(format.list('es-MX', ['A', 'B', 'C'])).toBe('A, B y C');
    expect(format.list('en-US', ['A', 'B'], 'disjunction')).toBe('A or B');
  });
});

describe('times', () => {
  const chicago = 'America/Chicago';

  it('prints dates with the month in words', () => {
    expect(seen(format.dateText('en-US', '2026-07-02'))).toBe('2_Jul_2026');
    expect(seen(format.dateText('es-MX', '2026-07-02'))).toBe('2_jul_2026');
    expect(seen(format.dayText('en-US', '2026-10-14T09:30:00-05:00', chicago))).toBe('Wed_14_Oct');
    expect(seen(format.dayText('es-MX', '2026-10-14T09:30:00-05:00', chicago))).toBe('mié_14_oct');
  });

  it('prints the clock of the site, whatever offset the instant is written with', () => {
    expect(format.timeText('2026-10-14T18:30:00Z', chicago)).toBe('13:30');
    expect(format.timeText('2026-10-14T05:00:00Z', chicago)).toBe('00:00');
    expect(format.calendarDate('2026-10-14T03:00:00Z', chicago)).toBe('2026-10-13');
    expect(format.zoneText('2026-12-01T12:00:00Z', chicago)).toBe('CST');
    expect(format.zoneText('2026-07-01T12:00:00Z', chicago)).toBe('CDT');
    expect(format.zoneText('2026-07-01T12:00:00Z', 'America/Phoenix')).toBe('MST');
    expect(seen(format.dateTimeText('en-US', '2026-10-14T18:30:00Z', chicago))).toBe(
      '14_Oct_2026, 13:30_CDT',
    );
  });

  it('writes the day of a window twice only where it changes', () => {
    const from = '2026-10-14T14:30:00Z';
    expect(seen(format.windowText('en-US', from, '2026-10-14T18:30:00Z', chicago))).toBe(
      'Wed_14_Oct, 09:30 to 13:30_CDT',
    );
    expect(seen(format.windowText('es-MX', from, '2026-10-15T06:00:00Z', chicago))).toBe(
      'mié_14_oct, 09:30 a jue_15_oct, 01:00_CDT',
    );
  });

  it('counts full minutes only', () => {
    const minute = 60_000;
    expect(seen(format.durationText(200 * minute))).toBe('3_h_20_min');
    expect(seen(format.durationText(180 * minute))).toBe('3_h');
    expect(seen(format.durationText(45 * minute + 59_000))).toBe('45_min');
    expect(seen(format.durationText(-minute))).toBe('0_min');
  });
});
