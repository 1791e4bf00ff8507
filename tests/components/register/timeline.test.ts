import { describe, expect, it } from 'vitest';
import { barParts, timeline } from '@/components/register/timeline';

const today = '2026-10-14';
const line = timeline(today, 300, 'en-US');

describe('the ruler of months', () => {
  it('runs from seven months before to seven after, with a name at each quarter', () => {
    expect(line.ticks).toHaveLength(15);
    expect(line.ticks.map(({ label }) => label).filter(Boolean)).toEqual([
      'Apr',
      'Jul',
      'Oct',
      'Jan',
      'Apr',
    ]);
    expect(line.at('2026-03-01')).toBe(0);
    expect(line.at('2020-01-01')).toBe(0);
    expect(line.at('2031-01-01')).toBe(300);
  });
});

describe('a bar', () => {
  it('is solid to today and hollow from there', () => {
    const { elapsed, rest } = barParts(line, { from: '2026-07-02', until: '2027-01-02', today });
    expect(elapsed?.[0]).toBeCloseTo(line.at('2026-07-02'));
    expect((elapsed?.[0] ?? 0) + (elapsed?.[1] ?? 0)).toBeCloseTo(line.today);
    expect(rest?.[0]).toBeCloseTo(line.today);
    expect((rest?.[0] ?? 0) + (rest?.[1] ?? 0)).toBeCloseTo(line.at('2027-01-02'));
  });

  it('shows one day overdue at least 7 wide, ending at today', () => {
    const { overdue, rest } = barParts(line, { from: '2026-04-13', until: '2026-10-13', today });
    expect(overdue?.[1]).toBe(7);
    expect((overdue?.[0] ?? 0) + 7).toBeCloseTo(line.today);
    expect(rest).toBeUndefined();
  });

  it('is not overdue on its last day', () => {
    expect(barParts(line, { from: '2026-04-14', until: today, today }).overdue).toBeUndefined();
  });

  it('is dashed while it has not begun', () => {
    const parts = barParts(line, { from: '2026-05-08', until: '2026-11-08', today, waits: true });
    expect(parts.waiting).toBeDefined();
    expect(parts.elapsed).toBeUndefined();
  });

  it('has no end where that lies past the ruler, and no beginning where none is known', () => {
    const parts = barParts(line, { until: '2029-01-01', today });
    expect(parts).toMatchObject({ runsOn: true, rest: [line.today, 300 - line.today] });
    expect(parts.elapsed).toBeUndefined();
  });
});
