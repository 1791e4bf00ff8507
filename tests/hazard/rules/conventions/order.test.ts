import { describe, expect, it } from 'vitest';
import { assess } from '@/hazard';
import { READ_AT } from '../../../support/ruleEdits';
import { ORDER } from '../../../support/ruleOrder';
import type { Base, Edits } from '../../../support/ruleTable';
import { assessBase, gone } from '../../../support/ruleTable';

const BROKEN: Edits = {
  'job/special': ['utility side'],
  'job/area': gone,
  'supply/circuitVolts': 277,
  'supply/tripped': gone,
  'supply/damage': true,
  'supply/readings': { phaseToNeutral: [200] },
  'supply/conductorColors': ['brown'],
  'sources/0/openedAt': 'wall switch',
  'sources/1/openedAt': 'none',
  'sources/2/held': 'none',
  'sources/1/byCrewId': 'c2',
  'crew/1/closest': 'limited',
  'crew/1/worksOnCircuit': true,
  'crew/0/qualifiedThrough': '2026-01-01',
  'briefing/topics': [],
  'briefing/emergency': gone,
  'surroundings/groundedSurfaces': [{}],
  'surroundings/ladder/material': 'aluminum',
  'surroundings/wet': true,
  'surroundings/lightAdequate': gone,
  'arcFlash/clearingSeconds': 1,
  'protectiveEquipment/ready': [],
};

describe('order and form of the findings (convention 10)', () => {
  it.each<Base>(['O', 'T', 'W', 'O work', 'W work', 'O close'])(
    '%s: in the order of the table, then of the index',
    (base) => {
      const { findings } = assessBase(base, {
        ...BROKEN,
        'proof/readings': [],
        'closeOut/toolsClear': false,
        'closeOut/coversOn': false,
      });
      const places = findings.map(({ code }) => ORDER.indexOf(code));
      expect(places).not.toContain(-1);
      expect(places).toEqual([...places].sort((a, b) => a - b));
      expect(findings.length).toBeGreaterThan(1);
    },
  );

  it('an empty worksheet keeps the order too', () => {
    const places = assess({}, { on: READ_AT, stage: 'work' }).findings.map(({ code }) =>
      ORDER.indexOf(code),
    );
    expect(places).not.toContain(-1);
    expect(places).toEqual([...places].sort((a, b) => a - b));
  });

  it('the same input gives the same output', () => {
    for (const base of ['O', 'T', 'W', 'O work'] as const) {
      expect(assessBase(base, BROKEN)).toEqual(assessBase(base, BROKEN));
    }
  });

  it('every path is a pointer into the content, the proof or the close-out', () => {
    const sections = [
      'job',
      'supply',
      'egressSupply',
      'egressReaches',
      'egress',
      'sources',
      'decision',
      'absenceTest',
      'arcFlash',
      'protectiveEquipment',
      'surroundings',
      'crew',
      'briefing',
      'notes',
      'proof',
      'closeOut',
    ];
    for (const base of ['O', 'T', 'W', 'O work', 'O close'] as const) {
      for (const edits of [
        BROKEN,
        { job: gone, supply: gone, sources: gone, crew: gone, proof: gone, closeOut: gone },
      ]) {
        for (const { path } of assessBase(base, edits).findings)
          expect(sections).toContain(path.split('/')[1]);
      }
    }
  });

  it('no finding comes twice', () => {
    for (const base of ['O', 'T', 'W', 'O work'] as const) {
      const lines = assessBase(base, BROKEN).findings.map(
        ({ code, path, params }) => `${code} ${path} ${JSON.stringify(params)}`,
      );
      expect(lines.filter((line, index) => lines.indexOf(line) !== index)).toEqual([]);
    }
  });

  it('the verdict is stop with any stop, else open with any open, else ready', () => {
    expect(
      assessBase('O', { 'surroundings/wet': true, 'surroundings/lightAdequate': gone }).verdict,
    ).toBe('stop');
    expect(assessBase('O', { 'surroundings/lightAdequate': gone }).verdict).toBe('open');
    expect(assessBase('O').verdict).toBe('ready');
  });
});
