import { describe, expect, it } from 'vitest';
import type { Conductor, VoltageReading } from '@/hazard';
import { HELD_BY_LEAD, READ_AT } from '../../../support/ruleEdits';
import { sampled } from '../../../support/propertyRuns';
import type { Edits } from '../../../support/ruleTable';
import { assessBase, found, gone, unsettled } from '../../../support/ruleTable';
import { zeroReadings } from '../../../support/soundWorksheet';

const SAID_NO: Edits = { 'supply/neutralPresent': false };
const WHOLE: Edits = { 'supply/exposure': 'whole equipment' };
const PANEL = (equipment: string): Edits => ({
  'arcFlash/equipment': equipment,
  'supply/atService': false,
});

describe('the conductors of the test (convention 8)', () => {
  type Row = [title: string, system: string, volts: number, edits: Edits, set: Conductor[]];
  const ROWS: Row[] = [
    ['one circuit', '208Y/120', 120, {}, ['A', 'N', 'G']],
    ['one circuit, another letter', '208Y/120', 120, {}, ['C', 'N', 'G']],
    ['one circuit', '480Y/277', 277, {}, ['B', 'N', 'G']],
    ['one circuit', '120/240', 120, {}, ['B', 'N', 'G']],
    ['one circuit', '240/120 high-leg', 120, {}, ['A', 'N', 'G']],
    ['phase to phase', '208Y/120', 208, {}, ['A', 'C', 'N', 'G']],
    ['phase to phase, no neutral', '208Y/120', 208, SAID_NO, ['A', 'C', 'G']],
    ['phase to phase', '480Y/277', 480, {}, ['A', 'B', 'N', 'G']],
    ['phase to phase, no neutral', '480Y/277', 480, SAID_NO, ['A', 'B', 'G']],
    ['phase to phase', '120/240', 240, {}, ['A', 'B', 'N', 'G']],
    ['phase to phase, no neutral', '120/240', 240, SAID_NO, ['A', 'B', 'G']],
    ['phase to phase', '240/120 high-leg', 240, {}, ['B', 'C', 'N', 'G']],
    ['phase to phase, no neutral', '480 delta', 480, SAID_NO, ['A', 'B', 'G']],
    ['whole equipment', '208Y/120', 120, WHOLE, ['A', 'B', 'C', 'N', 'G']],
    ['whole equipment', '480Y/277', 277, WHOLE, ['A', 'B', 'C', 'N', 'G']],
    ['whole equipment', '120/240', 120, WHOLE, ['A', 'B', 'N', 'G']],
    ['whole equipment', '240/120 high-leg', 120, WHOLE, ['A', 'B', 'C', 'N', 'G']],
    ['whole equipment', '480 delta', 480, WHOLE, ['A', 'B', 'C', 'G']],
    [
      'whole equipment, though without neutral',
      '208Y/120',
      208,
      { ...WHOLE, ...SAID_NO },
      ['A', 'B', 'C', 'N', 'G'],
    ],
    [
      'exposure not answered',
      '208Y/120',
      120,
      { 'supply/exposure': gone },
      ['A', 'B', 'C', 'N', 'G'],
    ],
    ...['panelboard', 'motor control center', 'switchboard', 'transformer'].map(
      (equipment): Row => [
        equipment,
        '208Y/120',
        120,
        { ...PANEL(equipment), 'arcFlash/workingDistanceInches': 24 },
        ['A', 'B', 'C', 'N', 'G'],
      ],
    ),
    [
      'work in panelboard',
      '208Y/120',
      120,
      { 'job/task': 'work in panelboard' },
      ['A', 'B', 'C', 'N', 'G'],
    ],
    [
      'replace breaker',
      '208Y/120',
      120,
      { 'job/task': 'replace breaker' },
      ['A', 'B', 'C', 'N', 'G'],
    ],
    ['a disconnect is no whole equipment', '208Y/120', 120, PANEL('disconnect'), ['A', 'N', 'G']],
  ];
  it.each(ROWS)('%s, %s %s V', (_title, system, volts, edits, set) => {
    const given: Edits = {
      'supply/system': system,
      'supply/circuitVolts': volts,
      'supply/readings': gone,
      'supply/conductorColors': gone,
      'arcFlash/clothingRatingCalPerCm2': 40,
      ...edits,
    };
    const complete = zeroReadings(['A1', 'A2'], set);
    expect(unsettled(assessBase('O work', { ...given, 'proof/readings': complete }))).toEqual([]);
    sampled([...complete.keys()]).forEach((index) => {
      const short = complete.filter((_other, other) => other !== index);
      expect(unsettled(assessBase('O work', { ...given, 'proof/readings': short }))).toEqual([
        'open absence.pairs-missing /proof/readings',
      ]);
    });
  });

  it('a shared neutral raises the voltage of the table, not the set', () => {
    const shared = {
      id: 'n1',
      kind: 'shared neutral',
      from: 'LA-1 ckt 9',
      sameConductorsAs: 's1',
      allPhasesOpened: true,
      ...HELD_BY_LEAD,
    };
    const result = assessBase('O work', { 'sources/3': shared, 'proof/openedSources/3': 'n1' });
    expect(unsettled(result)).toEqual([]);
    expect(result.boundaries).toMatchObject({ volts: 208, row: 'above 150 V to 750 V' });
  });

  it('a pair of two phase letters is one circuit only if the letter is one', () => {
    const mixed: VoltageReading[] = [
      ...zeroReadings(['A1', 'A2'], ['B', 'N', 'G']).filter(
        ({ from, to, point }) => !(point === 'A1' && from === 'B' && to === 'G'),
      ),
      { point: 'A1', from: 'C', to: 'G', volts: 0, current: 'ac', at: READ_AT },
    ];
    expect(unsettled(assessBase('O work', { 'proof/readings': mixed }))).toEqual([
      'open absence.pairs-missing /proof/readings',
    ]);
  });

  it('pairs are unordered', () => {
    const turned = zeroReadings(['A1', 'A2'], ['B', 'N', 'G']).map((entry) => ({
      ...entry,
      from: entry.to,
      to: entry.from,
    }));
    expect(unsettled(assessBase('O work', { 'proof/readings': turned }))).toEqual([]);
  });

  it('current absent is ac', () => {
    const plain = zeroReadings(['A1', 'A2'], ['B', 'N', 'G']).map(
      ({ current: _current, ...entry }) => entry,
    );
    expect(unsettled(assessBase('O work', { 'proof/readings': plain }))).toEqual([]);
  });

  it.each<[string, (entry: VoltageReading) => object]>([
    ['with a sourceId', (entry) => ({ ...entry, sourceId: 's1' })],
    ['of direct current', (entry) => ({ ...entry, current: 'dc' })],
    ['without a point', ({ point: _point, ...entry }) => entry],
    ['without from', ({ from: _from, ...entry }) => entry],
    ['without to', ({ to: _to, ...entry }) => entry],
    ['without volts', ({ volts: _volts, ...entry }) => entry],
    ['with volts that are no number', (entry) => ({ ...entry, volts: NaN })],
    ['to itself', (entry) => ({ ...entry, to: entry.from })],
    ['before the window', (entry) => ({ ...entry, at: '2026-12-01T07:59:59-06:00' })],
    ['after on', (entry) => ({ ...entry, at: '2026-12-01T09:00:01-06:00' })],
    ['after on, as an instant', (entry) => ({ ...entry, at: '2026-12-01T09:00:00-07:00' })],
  ])('a reading %s fills no pair (convention 9)', (_title, spoil) => {
    const [first, ...others] = zeroReadings(['A1', 'A2'], ['B', 'N', 'G']);
    if (!first) throw new Error('no reading');
    const result = assessBase('O work', { 'proof/readings': [spoil(first), ...others] });
    expect(found(result, 'absence.pairs-missing')).toEqual(['open /proof/readings']);
  });

  it.each(['2026-12-01T08:00:00-06:00', '2026-12-01T09:00:00-06:00', '2026-12-01T15:00:00Z'])(
    'a reading at the edge of the window fills its pair: %s',
    (at) => {
      expect(
        unsettled(
          assessBase('O work', {
            'proof/readings': zeroReadings(['A1', 'A2'], ['B', 'N', 'G'], at),
          }),
        ),
      ).toEqual([]);
    },
  );
});

describe('sameConductorsAs counts only for another listed source with none itself (convention 8)', () => {
  it.each([
    ['itself', 's2'],
    ['no source', 's9'],
    ['a source that names another', 's3'],
  ])('%s: as if absent', (_title, target) => {
    const edits: Edits = { 'sources/1/sameConductorsAs': target };
    expect(assessBase('O', edits)).toEqual(assessBase('O', { 'sources/1/sameConductorsAs': gone }));
    const plan = assessBase('O', edits);
    expect(unsettled(plan)).toEqual(['open sources.unanswered /sources/1/system']);
    expect(plan.boundaries).toMatchObject({ volts: 208 });
    // One finding for each of the two points that it reaches.
    const work = assessBase('O work', { ...edits, 'sources/1/system': '208Y/120' });
    expect(found(work, 'absence.source-not-tested')).toHaveLength(2);
  });

  it('two that name each other: neither counts', () => {
    const result = assessBase('O work', {
      'sources/1/sameConductorsAs': 's3',
      'sources/2/sameConductorsAs': 's2',
      'sources/1/system': '208Y/120',
    });
    expect(found(result, 'absence.source-not-tested')).toHaveLength(4);
  });

  it("the circuit's own conductors are those of the first normal source without it", () => {
    const second = {
      id: 's4',
      kind: 'normal',
      from: 'LA-2 ckt 1',
      upstreamOfTransfer: false,
      ...HELD_BY_LEAD,
    };
    const result = assessBase('O work', { 'sources/3': second, 'proof/openedSources/3': 's4' });
    expect(found(result, 'absence.source-not-tested')).toHaveLength(2);
    expect(unsettled(result)).toHaveLength(2);
  });

  it('a source of its own is read to ground and to each phase letter of the set', () => {
    const hot = {
      id: 'h1',
      kind: 'unswitched hot',
      from: 'LA-1 ckt 9',
      points: ['A1'],
      ...HELD_BY_LEAD,
    };
    const own = (to: string) => ({
      point: 'A1',
      to,
      sourceId: 'h1',
      volts: 0,
      current: 'ac',
      at: READ_AT,
    });
    const whole: Edits = {
      'supply/exposure': 'whole equipment',
      'sources/3': hot,
      'proof/openedSources/3': 'h1',
    };
    const set = zeroReadings(['A1', 'A2'], ['A', 'B', 'C', 'N', 'G']);
    const complete = ['G', 'A', 'B', 'C'].map(own);
    expect(
      unsettled(assessBase('O work', { ...whole, 'proof/readings': [...set, ...complete] })),
    ).toEqual([]);
    for (let index = 0; index < complete.length; index += 1) {
      const short = complete.filter((_entry, other) => other !== index);
      const entries = unsettled(
        assessBase('O work', { ...whole, 'proof/readings': [...set, ...short] }),
      );
      expect(entries).toHaveLength(1);
      expect(entries[0]).toMatch(/^open absence\.source-not-tested /);
    }
  });
});
