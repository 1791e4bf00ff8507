import { describe, expect, it } from 'vitest';
import { assess } from '@/hazard';
import { READ_AT } from '../../../support/ruleEdits';
import type { Edits } from '../../../support/ruleTable';
import { assessBase, gone } from '../../../support/ruleTable';

const WHOLE: Edits = { 'supply/exposure': 'whole equipment' };

describe('which voltage enters the table (convention 12, hazard.md)', () => {
  const supply = (system: string, circuitVolts: unknown, others: Edits = {}): Edits => ({
    'supply/system': system,
    'supply/circuitVolts': circuitVolts,
    'supply/readings': gone,
    'supply/conductorColors': gone,
    ...others,
  });
  const generator = (system: unknown): Edits => ({
    'sources/1/sameConductorsAs': gone,
    'sources/1/system': system,
  });
  it.each<[string, Edits, number]>([
    ['120 V, one circuit', supply('208Y/120', 120), 120],
    ['208 V, one circuit', supply('208Y/120', 208), 208],
    ['277 V, one circuit', supply('480Y/277', 277), 480],
    ['480 V', supply('480Y/277', 480), 480],
    ['120 V of 120/240', supply('120/240', 120), 120],
    ['240 V of 120/240', supply('120/240', 240), 240],
    ['120 V of high-leg: always 240', supply('240/120 high-leg', 120), 240],
    ['delta', supply('480 delta', 480), 480],
    ['120 V, whole equipment', supply('208Y/120', 120, WHOLE), 208],
    ['120 V, exposure not answered', supply('208Y/120', 120, { 'supply/exposure': gone }), 208],
    ['work in panelboard', { 'job/task': 'work in panelboard' }, 208],
    ['replace breaker', { 'job/task': 'replace breaker' }, 208],
    ...['panelboard', 'motor control center', 'switchboard', 'transformer'].map(
      (equipment): [string, Edits, number] => [equipment, { 'arcFlash/equipment': equipment }, 208],
    ),
    ...['luminaire', 'junction box', 'disconnect', 'other'].map(
      (equipment): [string, Edits, number] => [equipment, { 'arcFlash/equipment': equipment }, 120],
    ),
    ['a generator of its own', generator('208Y/120'), 208],
    ['a generator of a higher system', generator('480Y/277'), 480],
    ['a higher system beside sameConductorsAs', { 'sources/1/system': '480Y/277' }, 480],
    ['a backfeed of its own', { ...generator('120/240'), 'sources/1/kind': 'backfeed' }, 240],
    [
      'a central inverter of its own',
      { ...generator('208Y/120'), 'sources/1/kind': 'central inverter' },
      208,
    ],
    ['a voltage that is not of the system: the larger figure', supply('208Y/120', 277), 277],
    ['a low voltage that is not of the system: whole equipment', supply('480Y/277', 120), 480],
  ])('%s', (_title, edits, volts) => {
    for (const base of ['O', 'T', 'W'] as const) {
      if (base === 'T' && 'job/task' in edits) continue;
      expect(assessBase(base, edits).boundaries).toMatchObject({ volts });
    }
  });

  it.each([
    [1000, 1000],
    [1001, undefined],
  ])('touch at %s V ends where the body impedances do (IEC 60479-1)', (volts, expected) => {
    expect(assessBase('O', supply('208Y/120', volts)).touch?.volts).toBe(expected);
  });

  it('touch takes the highest voltage that can be touched', () => {
    expect(assessBase('O').touch).toMatchObject({ volts: 120 });
    expect(assessBase('O', WHOLE).touch).toMatchObject({ volts: 208 });
    expect(assessBase('O', supply('480Y/277', 277)).touch).toMatchObject({ volts: 277 });
    expect(assessBase('O', supply('480Y/277', 277, WHOLE)).touch).toMatchObject({ volts: 480 });
  });

  it.each<Edits>([
    { 'supply/circuitVolts': 36_001 },
    { 'supply/circuitVolts': 1e308 },
    { 'supply/circuitVolts': 0 },
    {
      'supply/system': '480 delta',
      'supply/circuitVolts': 1e9,
      'protectiveEquipment/gloves/gloveClass': '4',
    },
    {
      'arcFlash/transformer': {
        kilovoltAmperes: 75,
        secondaryVolts: 208,
        impedancePercent: 0,
        phases: 3,
      },
    },
    {
      'arcFlash/transformer': {
        kilovoltAmperes: 0,
        secondaryVolts: 0,
        impedancePercent: 0,
        phases: 2,
      },
    },
    { 'arcFlash/label': { systemVolts: 1e9, ppeCategory: 9, arcFlashBoundaryInches: 1e300 } },
    { 'job/pointsOfWork': 1e9 },
    { 'surroundings/ceilingHeightFeet': 1e9 },
    { 'supply/watts': -5, 'supply/readings': { phaseToPhase: [NaN], phaseToNeutral: [-1] } },
    { crew: [null, 3, 'x', {}], sources: [null, 3, 'x', {}], 'proof/readings': [null, 3, {}] },
    { 'job/endsAt': '9999-99-99T99:99:99Z', 'job/startsAt': '0000-00-00T00:00:00Z' },
  ])('never throws: %j', (edits) => {
    for (const base of ['O', 'T', 'W', 'O work', 'O close'] as const) {
      const { verdict } = assessBase(base, edits);
      // The points of work are asked only with the circuit off; the load and the readings are optional.
      const isAsked =
        !('supply/watts' in edits) && (base.startsWith('O') || !('job/pointsOfWork' in edits));
      if (!base.includes('close') && isAsked) expect(verdict).not.toBe('ready');
    }
  });

  it.each([null, 7, 'x', [], { job: 3, crew: {}, sources: 'x', supply: [] }])(
    'never throws on the content %j',
    (content) => {
      for (const stage of ['plan', 'work', 'close-out'] as const) {
        const result = assess(content, {
          on: READ_AT,
          stage,
          proof: content,
          closeOut: content,
        });
        expect(result.verdict).toBe('open');
      }
    },
  );

  it.each(['', 'today', '2026-12-01', '2026-12-01T09:00:00', '2026-13-01T09:00:00Z'])(
    'on %j is a RangeError',
    (on) => {
      expect(() => assess({}, { on })).toThrow(RangeError);
    },
  );
});
