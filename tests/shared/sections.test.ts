import { describe, expect, it } from 'vitest';
import {
  fieldNameOf,
  placeOf,
  sectionNumber,
  sectionOf,
  SECTIONS,
  type SectionId,
} from '@/shared/sections';

describe('the sections of a worksheet', () => {
  it('are twelve, counted from 1', () => {
    expect(SECTIONS.map(sectionNumber)).toEqual([1, 2, 3, 4, 5, 6, 7, 8, 9, 10, 11, 12]);
    expect(sectionNumber('job')).toBe(1);
    expect(sectionNumber('decision')).toBe(4);
    expect(sectionNumber('arcFlash')).toBe(7);
    expect(sectionNumber('closeOut')).toBe(12);
  });
});

describe('where a finding is shown', () => {
  it.each([
    ['/job/startsAt', 'job', '1'],
    ['/notes', 'job', '1'],
    ['/supply/readings/phaseToPhase', 'supply', '2'],
    ['/egressSupply', 'sources', '3'],
    ['/egressReaches', 'sources', '3'],
    ['/egress/toldTo', 'sources', '3'],
    ['/sources', 'sources', '3'],
    ['/sources/0/openedAt', 'sources', '3.1'],
    ['/sources/2', 'sources', '3.3'],
    ['/sources/11/held', 'sources', '3.12'],
    ['/decision/mode', 'decision', '4'],
    ['/absenceTest/ratedVolts', 'absenceTest', '5'],
    ['/proof/readings/3/volts', 'absenceTest', '5'],
    ['/arcFlash/label', 'arcFlash', '7'],
    ['/protectiveEquipment/ready', 'protectiveEquipment', '8'],
    ['/surroundings/groundedSurfaces/1/covered', 'surroundings', '9'],
    ['/crew/1/name', 'crew', '10'],
    ['/briefing/topics', 'crew', '10'],
    ['/closeOut/toolsClear', 'closeOut', '12'],
  ] satisfies [string, SectionId, string][])('%s: %s, said as %s', (path, section, place) => {
    const finding = { code: 'x.y', path };
    expect(sectionOf(finding)).toBe(section);
    expect(placeOf(finding)).toBe(place);
  });

  it('is with the protective equipment for gloves, whoever of the crew lacks them', () => {
    const finding = { code: 'shock.gloves-missing', path: '/crew/1/gloves' };
    expect(sectionOf(finding)).toBe('protectiveEquipment');
    expect(placeOf(finding)).toBe('8');
    expect(sectionOf({ code: 'shock.boundary', path: '/crew/1/closest' })).toBe('crew');
  });

  it.each(['', '/', '/ofALaterVersion/0'])(
    'is the first section where the finding leads nowhere: %j',
    (path) => {
      expect(sectionOf({ code: 'x.y', path })).toBe('job');
      expect(placeOf({ code: 'x.y', path })).toBe('1');
    },
  );

  it('is the field of the same name in the form', () => {
    expect(fieldNameOf('/sources/2/openedAt')).toBe('sources.2.openedAt');
    expect(fieldNameOf('/notes')).toBe('notes');
    expect(fieldNameOf('')).toBe('');
  });
});
