import { describe, expect, it } from 'vitest';
import {
  ARC_FLASH_EQUIPMENT,
  arcFlashLikelihood,
  assessArcFlash,
  barricadeDistance,
  BRIEFING_TOPICS,
  circuitVoltsOf,
  citation,
  EDITIONS,
  gloveStatus,
  identifySystem,
  lookupShockBoundaries,
  meterIsAdequate,
  minimumStepladder,
  selectGloveClass,
  TASKS,
  touchMilliamperes,
} from '@/hazard';
import { COMMON_CITATION_IDS } from '@/hazard/citations';
import { addCalendarMonths, isCalendarDate } from '@/hazard/dates';
import { nfpa70e2024 } from '@/hazard/editions';
import type { Edition, EditionCitationId } from '@/hazard/editions/types';
import { inventedEdition } from '../support/inventedEdition';

const editions = [nfpa70e2024, inventedEdition];

describe.each(editions)('the tables of $id', (edition: Edition) => {
  it.each(['shockAc', 'shockDc'] as const)('%s is sorted and positive', (name) => {
    const { notSpecifiedBelow, rows } = edition[name];
    const tops = [notSpecifiedBelow.volts, ...rows.map(({ upToVolts }) => upToVolts)];
    expect(tops).toEqual([...new Set(tops)].sort((a, b) => a - b));
    for (const { limitedFixed, limitedMovable, restricted } of rows) {
      for (const distance of [limitedFixed, limitedMovable, restricted]) {
        if (distance === 'avoid contact') continue;
        expect(distance.inches).toBeGreaterThan(0);
        // Printed pairs are rounded apart, by no more than a tenth of a metre.
        expect(Math.abs(distance.metres - distance.inches * 0.0254)).toBeLessThan(0.1);
      }
    }
  });

  it('has positive limits for every equipment, bands ascending', () => {
    const { choices, rows } = edition.ppeCategories;
    for (const equipment of ARC_FLASH_EQUIPMENT) {
      const tops = choices[equipment].map(({ upToVolts }) => upToVolts);
      expect(tops.length).toBeGreaterThan(0);
      expect(tops).toEqual([...tops].sort((a, b) => a - b));
    }
    for (const row of Object.values(rows)) {
      expect(row.faultKiloamperes).toBeGreaterThan(0);
      expect(row.clearingSeconds).toBeGreaterThan(0);
      expect(row.workingDistanceInches).toBeGreaterThan(0);
      const { inches, metres } = row.arcFlashBoundary;
      expect(Math.abs(metres - inches * 0.0254)).toBeLessThan(0.1);
    }
  });

  it('has body impedances that rise in voltage and fall in ohms', () => {
    const { rows } = edition.bodyImpedance;
    rows.slice(1).forEach((row, index) => {
      const before = rows[index];
      expect(before?.volts).toBeLessThan(row.volts);
      for (const of of ['p5', 'p50', 'p95'] as const) {
        expect(before?.[of]).toBeGreaterThanOrEqual(row[of]);
      }
    });
  });

  it('cites every clause in full', () => {
    const ids = [
      ...COMMON_CITATION_IDS,
      ...(Object.keys(edition.citations) as EditionCitationId[]),
    ];
    for (const id of ids) {
      const { standard, edition: year, table, confidence } = citation(id, edition);
      expect([standard, year, table].every((text) => text.trim() === text && text !== '')).toBe(
        true,
      );
      expect([
        'regulation',
        'agreeing',
        'single',
        'memory',
        'common practice',
        'own policy',
      ]).toContain(confidence);
    }
  });
});

describe('an edition', () => {
  it('is found by the id that a worksheet keeps', () => {
    expect(EDITIONS['NFPA 70E-2024']).toBe(nfpa70e2024);
  });

  it('hands out copies of its citations and frozen distances', () => {
    const first = citation('nfpa70e.shockAc');
    Object.assign(first, { table: 'spoiled' });
    expect(citation('nfpa70e.shockAc').table).not.toBe('spoiled');
    const boundaries = lookupShockBoundaries({ current: 'ac', volts: 480 });
    expect(Object.isFrozen(boundaries.inTable && boundaries.limitedFixed)).toBe(true);
  });

  it('changes every answer when another is given', () => {
    const boundaries = lookupShockBoundaries({ current: 'ac', volts: 480 }, inventedEdition);
    expect(boundaries).toMatchObject({
      row: '60 V to 1 kV',
      limitedFixed: { inches: 48, metres: 1.2 },
      citation: { edition: '2099', table: 'Table 9.9' },
    });
    expect(barricadeDistance({ boundaries, arcFlashBoundary: null, movable: false }).inches).toBe(
      48,
    );
    const work = {
      task: 'energized work',
      condition: 'normal',
      equipment: 'panelboard',
      volts: 480,
      workingDistanceInches: 18,
      availableFaultKiloamperes: 24,
      clearingSeconds: 0.03,
    } as const;
    expect(assessArcFlash(work).ppeCategory).toBe(2);
    expect(assessArcFlash(work, inventedEdition).method).toBe('study needed');
    const task = 'read panel meter';
    expect(arcFlashLikelihood({ task, condition: 'abnormal' }, inventedEdition).likely).toBe(true);
    expect(selectGloveClass(480, inventedEdition).gloveClass).toBe('0');
    const gloves = {
      gloveClass: '0',
      lastTestedOn: '2026-01-31',
      on: '2026-03-01',
      volts: 480,
    } as const;
    expect(gloveStatus(gloves, inventedEdition)).toMatchObject({
      inTest: false,
      dueOn: '2026-02-28',
    });
    const meter = {
      category: 'III',
      location: 'fixed wiring',
      ratedVolts: 600,
      systemVolts: 480,
    } as const;
    expect(meterIsAdequate(meter, inventedEdition)).toBe(false);
    expect(minimumStepladder({ ceilingHeightFeet: 9 }, inventedEdition)?.sizeFeet).toBe(8);
    expect(circuitVoltsOf('208Y/120', inventedEdition)).toEqual([120, 208]);
    expect(identifySystem({ phaseToNeutral: [115] }, inventedEdition)).toContain('208Y/120');
    expect(touchMilliamperes({ volts: 60 }, inventedEdition).p5).toBe(60);
  });
});

describe('rows that all hold at once', () => {
  // Row 2 of the invented edition: 20 kA, 0.03 s, 18 in, category 2; row 6: 15 kA, 0.02 s, 24 in, 4.
  it.each(['luminaire', 'junction box'] as const)(
    'bind with the narrowest of each limit, whatever their order: %s',
    (equipment) => {
      const ask = (kiloamperes: number, seconds: number, inches: number) =>
        assessArcFlash(
          {
            task: 'energized work',
            condition: 'normal',
            equipment,
            volts: 480,
            availableFaultKiloamperes: kiloamperes,
            clearingSeconds: seconds,
            workingDistanceInches: inches,
          },
          inventedEdition,
        );
      expect(ask(15, 0.02, 24)).toMatchObject({
        ppeCategory: 4,
        arcFlashBoundary: { inches: 60, metres: 1.5 },
      });
      expect(ask(15.1, 0.02, 24).method).toBe('study needed');
      expect(ask(15, 0.021, 24).method).toBe('study needed');
      expect(ask(15, 0.02, 23.9).method).toBe('study needed');
    },
  );
});

describe('the lists of the face', () => {
  it('hold the tasks of the job in the order of their table', () => {
    expect(TASKS).toEqual([
      'replace luminaire',
      'replace driver or ballast',
      'replace lamp',
      'replace battery unit',
      'add or extend circuit',
      'work in panelboard',
      'replace breaker',
      'work on lighting control',
      'trace circuit',
      'test or troubleshoot',
      'inspect',
      'thermography',
    ]);
  });

  it('hold the topics of a job briefing', () => {
    expect(BRIEFING_TOPICS).toEqual([
      'job and tasks',
      'electrical hazards',
      'shock boundaries and protection',
      'arc flash boundary and protection',
      'work procedures',
      'special precautions',
      'energy source controls',
      'protective equipment',
      'who may come how close',
      'emergency plan',
      'stopping and refusing',
      'permit',
    ]);
  });
});

describe('calendar months', () => {
  it.each([
    ['2026-01-31', 1, '2026-02-28'],
    ['2028-01-31', 1, '2028-02-29'],
    ['2100-01-31', 1, '2100-02-28'],
    ['2000-01-31', 1, '2000-02-29'],
    ['2026-05-31', 1, '2026-06-30'],
    ['2026-12-15', 1, '2027-01-15'],
    ['2026-11-30', 13, '2027-12-30'],
    ['2024-02-29', 60, '2029-02-28'],
    ['0099-12-31', 6, '0100-06-30'],
    ['9999-07-01', 6, '9999-12-31'],
    ['9999-06-30', 6, '9999-12-30'],
  ])('%s and %d months: %s', (date, months, expected) => {
    expect(addCalendarMonths(date, months)).toBe(expected);
  });

  it('are refused for what is no date', () => {
    expect(() => addCalendarMonths('2026-02-29', 1)).toThrow(RangeError);
    expect(isCalendarDate(20_260_101)).toBe(false);
    expect(isCalendarDate(['2026-01-01'])).toBe(false);
    expect(isCalendarDate('2026-01-31')).toBe(true);
    expect(isCalendarDate('2026-01-32')).toBe(false);
    expect(isCalendarDate('2026-04-31')).toBe(false);
    expect(isCalendarDate('2024-02-29')).toBe(true);
  });
});
