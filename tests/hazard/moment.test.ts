import { describe, expect, it } from 'vitest';
import { laterDate, minutesBetween, readMoment } from '@/hazard/engine/moment';

const at = (text: string) => {
  const moment = readMoment(text);
  if (moment === undefined) throw new Error(`${text} was not read`);
  return moment;
};

// The engine's own reading of ISO 8601, beside the one of the JavaScript engine (ECMA-262, 21.4.1.32).
describe('the instant of a date-time', () => {
  it.each([
    '2026-12-01T08:00:00-06:00',
    '2026-12-01T08:00:59+05:45',
    '2026-03-08T23:59:07-03:30',
    '2024-02-29T00:00:00Z',
    '2024-03-01T12:30:15.250Z',
    '2024-03-01T12:30:15.999+00:30',
    '1999-12-31T23:30-11:00',
    '1970-01-01T00:00:00Z',
    '2026-12-01T08:00:00+23:59',
    '2026-12-01T08:00:00-23:59',
  ])('%s', (text) => {
    expect(at(text)).toEqual({ text, instant: Date.parse(text), date: text.slice(0, 10) });
  });

  it('keeps the years 0 to 99 as they are written', () => {
    expect(at('0050-06-15T00:00:00Z').instant).toBe(Date.parse('0050-06-15T00:00:00Z'));
  });

  it.each([
    ['an hour 24', '2026-12-01T24:00:00Z'],
    ['a minute 60', '2026-12-01T08:60:00Z'],
    ['a second 60', '2026-12-01T08:00:60Z'],
    ['an offset of 24 hours', '2026-12-01T08:00:00+24:00'],
    ['an offset with 60 minutes', '2026-12-01T08:00:00+05:60'],
    ['a day that there is not', '2026-02-29T08:00:00Z'],
    ['no offset', '2026-12-01T08:00:00'],
    ['a date alone', '2026-12-01'],
    ['words around it', 'at 2026-12-01T08:00:00Z'],
    ['words after it', '2026-12-01T08:00:00Z or so'],
    ['a list that reads like one', ['2026-12-01T08:00:00Z']],
    ['a number', 1_764_576_000_000],
    ['nothing', undefined],
  ])('is not read from %s', (_, text) => {
    expect(readMoment(text)).toBeUndefined();
  });
});

describe('between two moments', () => {
  it('counts minutes of instants, whatever the clocks show', () => {
    const from = at('2026-10-31T22:00:00-05:00');
    expect(minutesBetween(from, at('2026-11-01T06:30:00-06:00'))).toBe(570);
    expect(minutesBetween(at('2026-12-01T08:00:30Z'), at('2026-12-01T08:01:00Z'))).toBe(0.5);
  });

  it('takes the later of two dates', () => {
    expect(laterDate('2026-02-01', '2025-12-31')).toBe('2026-02-01');
    expect(laterDate('2025-12-31', '2026-02-01')).toBe('2026-02-01');
  });
});
