import { describe, expect, it } from 'vitest';
import type { Edits } from '../../../support/ruleTable';
import { assessBase, found, gone } from '../../../support/ruleTable';

describe("the worksheet's day (convention 5)", () => {
  const due = (day: string): Edits => ({
    'protectiveEquipment/gloves/lastTestedOn': day,
    'protectiveEquipment/gloves/issuedOn': gone,
  });
  // Tested on 2026-06-01, so due on 2026-12-01.
  const row = (title: string, edits: Edits, isLate: boolean): [string, Edits, boolean] => [
    title,
    edits,
    isLate,
  ];
  it.each([
    row(
      'ends the same day',
      { 'job/endsAt': '2026-12-01T23:59:00-06:00', 'job/startsAt': '2026-12-01T13:00:00-06:00' },
      false,
    ),
    row(
      'ends after midnight',
      { 'job/startsAt': '2026-12-01T20:00:00-06:00', 'job/endsAt': '2026-12-02T00:01:00-06:00' },
      true,
    ),
    row(
      'the date as written, though the day in UTC is the next',
      { 'job/startsAt': '2026-12-01T12:00:00-06:00', 'job/endsAt': '2026-12-01T22:00:00-06:00' },
      false,
    ),
    row(
      'the date as written in UTC',
      { 'job/startsAt': '2026-12-01T18:00:00Z', 'job/endsAt': '2026-12-02T01:00:00Z' },
      true,
    ),
    row(
      'on is the later date',
      {
        on: '2026-12-02T00:30:00-06:00',
        'job/startsAt': '2026-12-01T14:00:00-06:00',
        'job/endsAt': '2026-12-01T23:00:00-06:00',
      },
      true,
    ),
    row(
      'on as written with its own offset',
      {
        on: '2026-12-02T02:00:00Z',
        'job/startsAt': '2026-12-01T19:00:00-06:00',
        'job/endsAt': '2026-12-01T23:00:00-06:00',
      },
      true,
    ),
    row(
      'on far to the east',
      {
        on: '2026-12-01T23:30:00+14:00',
        'job/startsAt': '2026-12-01T08:00:00-06:00',
        'job/endsAt': '2026-12-01T12:00:00-06:00',
      },
      false,
    ),
  ])('%s: late %s', (_title, edits, isLate) => {
    const gloves = assessBase('O', { ...edits, ...due('2026-06-01') });
    expect(found(gloves, 'shock.gloves-overdue').length > 0).toBe(isLate);
    const training = assessBase('O', { ...edits, 'crew/0/qualifiedThrough': '2026-12-01' });
    expect(found(training, 'crew.training-lapsed').length > 0).toBe(isLate);
    const label = assessBase('O', {
      ...edits,
      'arcFlash/label': {
        ofThisEquipment: true,
        systemVolts: 208,
        reviewedOn: '2021-12-01',
        ppeCategory: 1,
        arcFlashBoundaryInches: 19,
      },
    });
    expect(found(label, 'arc.study-needed').map((entry) => entry.split(' ')[0])).toEqual(
      isLate ? ['caution'] : [],
    );
  });

  it('a test after the date of on is not in test, though the work ends later', () => {
    const overnight: Edits = {
      'job/startsAt': '2026-12-01T20:00:00-06:00',
      'job/endsAt': '2026-12-02T06:00:00-06:00',
    };
    const after = assessBase('O', { ...overnight, ...due('2026-12-02') });
    expect(found(after, 'shock.gloves-overdue').map((entry) => entry.split(' ')[0])).toEqual([
      'stop',
    ]);
    const issued = assessBase('O', {
      ...overnight,
      ...due('2026-11-01'),
      'protectiveEquipment/gloves/issuedOn': '2026-12-02',
    });
    expect(found(issued, 'shock.gloves-overdue').map((entry) => entry.split(' ')[0])).toEqual([
      'stop',
    ]);
    expect(
      found(assessBase('O', { ...overnight, ...due('2026-12-01') }), 'shock.gloves-overdue'),
    ).toEqual([]);
  });
});
