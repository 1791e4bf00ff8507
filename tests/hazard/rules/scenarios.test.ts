import { describe, expect, it } from 'vitest';
import { CIRCUIT_277, READ_AT } from '../../support/ruleEdits';
import type { Edits } from '../../support/ruleTable';
import { assessBase, gone, unsettled } from '../../support/ruleTable';
import { zeroReadings } from '../../support/soundWorksheet';

const BROWN_277: Edits = { ...CIRCUIT_277, 'supply/conductorColors': ['brown', 'gray'] };

const codes = (entries: string[]) => entries.map((entry) => entry.split(' ').slice(0, 2).join(' '));

describe('the cases behind the rules (public fatality investigations)', () => {
  it('04WA080: a switch taped off, the luminaire fed from the emergency system', () => {
    const result = assessBase('O', {
      'sources/0/openedAt': 'wall switch',
      'sources/1': gone,
      egressSupply: ['unknown'],
    });
    expect(codes(unsettled(result))).toEqual([
      'stop sources.egress-unknown',
      'stop sources.switch-only',
    ]);
  });

  it('04WA080: the emergency source is found by the readings', () => {
    const result = assessBase('O work', {
      'proof/controlsOperated': false,
      'proof/readings/6': {
        point: 'A1',
        from: 'B',
        to: 'G',
        volts: 118,
        current: 'ac',
        at: READ_AT,
      },
    });
    expect(codes(unsettled(result))).toEqual([
      'stop absence.voltage-present',
      'stop absence.controls-not-operated',
    ]);
  });

  it('86-35: 277 V with the polarity reversed, the white wire never read to ground', () => {
    const readings = zeroReadings(['A1', 'A2'], ['B', 'N', 'G']);
    const unread = readings.filter(({ from, to }) => !(from === 'N' && to === 'G'));
    const silent = assessBase('O work', { ...BROWN_277, 'proof/readings': unread });
    expect(codes(unsettled(silent))).toEqual([
      'open absence.pairs-missing',
      'open absence.pairs-missing',
    ]);
    const read = readings.map((entry) => (entry.from === 'N' ? { ...entry, volts: 277 } : entry));
    const live = assessBase('O work', { ...BROWN_277, 'proof/readings': read });
    expect(codes(unsettled(live))).toEqual([
      'stop absence.voltage-present',
      'stop absence.voltage-present',
    ]);
  });

  it('87-55: 400 V behind a ballast', () => {
    const result = assessBase('O work', {
      'job/task': 'replace driver or ballast',
      'job/lamps': 'double-ended',
      'proof/storedEnergy': 'not discharged',
      'proof/readings/6': {
        point: 'A1',
        from: 'B',
        to: 'G',
        volts: 400,
        current: 'dc',
        at: READ_AT,
      },
    });
    expect(codes(unsettled(result))).toEqual([
      'open sources.stored-energy',
      'stop absence.voltage-present',
    ]);
    expect(result.findings.map(({ code }) => code)).toContain('lamp.line-voltage-lampholder');
  });

  it('95-NJ-080: a helper on a fiberglass ladder leaning on a grounded frame', () => {
    const result = assessBase('O', {
      'surroundings/groundedSurfaces': [
        { kind: 'structural steel', inReach: true, covered: false, keptClear: false },
      ],
      'crew/1/closest': 'limited',
    });
    expect(codes(unsettled(result))).toEqual([
      'stop shock.unqualified-inside',
      'stop shock.grounded-surface',
      'stop arc.bystander-inside',
    ]);
  });

  it('94MD022: 277 V, alone, in an emergency corridor', () => {
    const result = assessBase('W', {
      ...BROWN_277,
      'crew/1': gone,
      'decision/hazard': 'illumination',
      'decision/temporaryLight': 'possible',
    });
    expect(codes(unsettled(result))).toEqual([
      'stop decision.alternative-possible',
      'stop crew.alone',
      'open crew.rescue-untrained',
    ]);
  });

  it('92NJ007: a new luminaire on a live 277 V circuit', () => {
    const result = assessBase('W', { ...BROWN_277, 'job/task': 'add or extend circuit' });
    expect(codes(unsettled(result))).toEqual(['stop decision.unjustified']);
  });
});
