import { describe, expect, it } from 'vitest';
import { assess, BRIEFING_TOPICS, JOB_TASKS, SYSTEMS, TASKS } from '@/hazard';
import type { Conductor, VoltageReading } from '@/hazard';
import type { Base, Edits, RuleRow } from '../../support/ruleTable';
import {
  assessBase,
  describeRule,
  edited,
  expectFound,
  found,
  gone,
  unsettled,
} from '../../support/ruleTable';
import {
  soundEnergizedWorksheet,
  soundTestingWorksheet,
  soundWorksheet,
  zeroReadings,
} from '../../support/soundWorksheet';

const AT = '2026-12-01T08:50:00-06:00';
const BELOW_FIFTY: Edits = {
  'decision/reason': 'below 50 V',
  'supply/workVolts': 24,
  'supply/higherVoltsExposed': false,
};
const FAR: Edits = {
  'job/task': 'inspect',
  'arcFlash/task': 'thermography or inspection outside restricted',
  'crew/0/closest': 'outside all boundaries',
};
const HELD = {
  openedAt: 'breaker',
  held: 'lock and tag',
  lockNumber: '12',
  lockedBy: ['c1'],
  byCrewId: 'c1',
};

describe('the sound worksheets are ready (convention 11)', () => {
  it('circuit off, at every stage', () => {
    const { on, content, proof, closeOut } = soundWorksheet();
    expect(unsettled(assess(content, { on }))).toEqual([]);
    expect(unsettled(assess(content, { on, stage: 'work', proof }))).toEqual([]);
    expect(unsettled(assess(content, { on, stage: 'close-out', proof, closeOut }))).toEqual([]);
  });

  it.each([
    ['testing', soundTestingWorksheet],
    ['energized', soundEnergizedWorksheet],
  ])('%s, at every stage', (_path, build) => {
    const { on, content, closeOut } = build();
    const plan = assess(content, { on });
    expect(unsettled(plan)).toEqual([]);
    // The energized paths have no proof stage: at work they get the rows of the plan.
    expect(assess(content, { on, stage: 'work' })).toEqual(plan);
    expect(unsettled(assess(content, { on, stage: 'close-out', closeOut }))).toEqual([]);
  });

  it.each(SYSTEMS)('circuit off on %s, whole equipment', (system) => {
    const edits: Edits = {
      'supply/system': system,
      'supply/circuitVolts': {
        '208Y/120': 208,
        '480Y/277': 480,
        '120/240': 240,
        '240/120 high-leg': 240,
        '480 delta': 480,
      }[system],
      'supply/exposure': 'whole equipment',
      'supply/readings': gone,
      'supply/conductorColors': gone,
    };
    expect(unsettled(assessBase('O', edits))).toEqual([]);
  });

  it('the plan does not need a proof, and work does', () => {
    const { on, content } = soundWorksheet();
    expect(assess(content, { on, stage: 'plan', proof: {} }).verdict).toBe('ready');
    expect(assess(content, { on, stage: 'work' }).verdict).toBe('open');
  });

  it('cautions never change the verdict', () => {
    const result = assessBase('O');
    expect(result.findings.map(({ severity }) => severity)).toEqual(['caution']);
    expect(result.verdict).toBe('ready');
  });
});

describe('not answered (convention 1)', () => {
  it('false, 0 and [] are answers', () => {
    expect(unsettled(assessBase('O', { 'surroundings/groundedSurfaces': [] }))).toEqual([]);
    expect(unsettled(assessBase('O', { 'supply/conductorColors': [], 'supply/watts': 0 }))).toEqual(
      [],
    );
  });

  it('[] of the four lists is no answer', () => {
    expect(unsettled(assessBase('O', { 'job/special': [] }))).toEqual([
      'open job.outside-scope /job/special',
    ]);
    expect(unsettled(assessBase('O', { egressSupply: [] }))).toEqual([
      'open sources.egress-unknown /egressSupply',
    ]);
    expect(
      found(assessBase('O', { 'supply/switching': [] }), 'sources.control-unlisted'),
    ).toHaveLength(1);
  });
});

describe('the four paths (convention 4)', () => {
  const isW = (result: ReturnType<typeof assessBase>) =>
    found(result, 'decision.alternative-possible').length > 0;
  const asked: Edits = { 'decision/outageRefusedBy': gone };

  it.each<[string, Edits, boolean]>([
    ['a testing task because of testing', { 'decision/reason': 'testing' }, false],
    [
      'a testing task, infeasible otherwise',
      {
        'decision/reason': 'infeasible',
        'decision/infeasibleBecause': 'can only be tested energized',
      },
      false,
    ],
    [
      'a testing task, another infeasibility',
      { 'decision/reason': 'infeasible', 'decision/infeasibleBecause': 'other' },
      true,
    ],
    ['a testing task, infeasibility not answered', { 'decision/reason': 'infeasible' }, true],
    ['a testing task, additional hazard', { 'decision/reason': 'additional hazard' }, true],
    ['a testing task, no reason', { 'decision/reason': gone }, true],
  ])('%s', (_title, edits, expected) => {
    expect(isW(assessBase('T', { ...asked, ...edits }))).toBe(expected);
  });

  it.each(JOB_TASKS)('%s because of testing', (task) => {
    const isTesting = ['trace circuit', 'test or troubleshoot', 'inspect', 'thermography'].includes(
      task,
    );
    expect(isW(assessBase('T', { ...asked, 'job/task': task }))).toBe(!isTesting);
  });

  it('a task that is not answered takes the rules of W', () => {
    expect(isW(assessBase('T', { ...asked, 'job/task': gone }))).toBe(true);
  });

  it('below 50 V the named rows, the arc flash fields and the gloves do not apply', () => {
    const result = assessBase('W', {
      ...BELOW_FIFTY,
      'crew/1': gone,
      'decision/permit': gone,
      arcFlash: gone,
      'protectiveEquipment/gloves': gone,
      'surroundings/groundedSurfaces': gone,
      'surroundings/conductiveArticlesRemoved': false,
      'surroundings/peopleMayApproach': true,
      'crew/0/closest': 'restricted',
    });
    expect(unsettled(result)).toEqual([]);
    expect(result.permit).toMatchObject({ required: false, because: 'below 50 V' });
  });

  it.each<[string, Edits, string]>([
    ['damage', { 'supply/damage': true }, 'stop equipment.damaged'],
    ['wet', { 'surroundings/wet': true }, 'stop surroundings.wet'],
    ['dark', { 'surroundings/lightAdequate': gone }, 'open surroundings.dark'],
    ['no explanation', { 'decision/explanation': gone }, 'open decision.explanation-missing'],
    ['scope', { 'job/special': ['utility side'] }, 'stop job.outside-scope'],
    [
      'ladder',
      { 'surroundings/ladder/material': 'aluminum' },
      'stop surroundings.ladder-conductive',
    ],
    ['lead', { 'crew/0/qualified': false }, 'stop crew.lead-unqualified'],
  ])('below 50 V every other row of W does: %s', (_title, edits, expected) => {
    const entries = unsettled(assessBase('W', { ...BELOW_FIFTY, ...edits }));
    expect(entries.map((entry) => entry.split(' ').slice(0, 2).join(' '))).toEqual([expected]);
  });

  it.each<[string, Edits]>([
    ['50 V', { 'supply/workVolts': 50 }],
    ['not answered', { 'supply/workVolts': gone }],
    ['higher exposed', { 'supply/higherVoltsExposed': true }],
    ['higher not answered', { 'supply/higherVoltsExposed': gone }],
  ])('the exception does not hold at %s', (_title, edits) => {
    const result = assessBase('W', {
      ...BELOW_FIFTY,
      ...edits,
      'decision/permit': gone,
      'surroundings/groundedSurfaces': [{}],
      'crew/1': gone,
    });
    const codes = result.findings.map(({ code }) => code);
    expect(codes).toEqual(
      expect.arrayContaining(['permit.missing', 'shock.grounded-surface', 'crew.alone']),
    );
  });
});

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

describe('who enters the restricted boundary (convention 7)', () => {
  const glovesAsked = (base: Base, edits: Edits) =>
    found(
      assessBase(base, { ...edits, 'protectiveEquipment/gloves': gone }),
      'shock.gloves-missing',
    ).length > 0;
  it.each<[string, Base, Edits, boolean]>([
    ['O always', 'O', { 'crew/0/closest': 'outside all boundaries' }, true],
    [
      'T test or troubleshoot: who tests',
      'T',
      { 'crew/0/closest': 'outside all boundaries' },
      true,
    ],
    ['T another task: nobody', 'T', FAR, false],
    [
      'T another task: who tests does not count',
      'T',
      { ...FAR, 'job/task': 'trace circuit', 'arcFlash/task': 'operate device' },
      false,
    ],
    ['T: who says restricted', 'T', { ...FAR, 'crew/0/closest': 'restricted' }, true],
    ['T: the helper who says restricted', 'T', { ...FAR, 'crew/1/closest': 'restricted' }, true],
    ['T: the lead while not answered', 'T', { ...FAR, 'crew/0/closest': gone }, true],
    [
      'W repair: the lead while nobody is',
      'W',
      { 'crew/0/closest': 'outside all boundaries' },
      true,
    ],
    [
      'W testing task: nobody',
      'W',
      { ...FAR, 'decision/reason': 'infeasible', 'decision/infeasibleBecause': 'other' },
      false,
    ],
    [
      'W testing task: the lead while not answered',
      'W',
      {
        ...FAR,
        'decision/reason': 'infeasible',
        'decision/infeasibleBecause': 'other',
        'crew/0/closest': gone,
      },
      true,
    ],
    ['W below 50 V: nobody', 'W', { ...BELOW_FIFTY, 'crew/0/closest': 'restricted' }, false],
  ])('%s', (_title, base, edits, expected) => {
    expect(glovesAsked(base, edits)).toBe(expected);
  });

  it('W repair: not the lead where another is restricted', () => {
    const result = assessBase('W', {
      'crew/0/closest': 'outside all boundaries',
      'crew/0/arcRated': false,
      'crew/1/closest': 'restricted',
      'crew/1/qualified': true,
      'crew/1/qualifiedThrough': '2028-01-01',
      'crew/1/arcRated': true,
    });
    expect(unsettled(result)).toEqual([]);
  });
});

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
    complete.forEach((_reading, index) => {
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
      ...HELD,
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
      { point: 'A1', from: 'C', to: 'G', volts: 0, current: 'ac', at: AT },
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
    ['of an unknown current', (entry) => ({ ...entry, current: 'both' })],
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
    const work = assessBase('O work', { ...edits, 'sources/1/system': '208Y/120' });
    expect(found(work, 'absence.source-not-tested')).toHaveLength(1);
  });

  it('two that name each other: neither counts', () => {
    const result = assessBase('O work', {
      'sources/1/sameConductorsAs': 's3',
      'sources/2/sameConductorsAs': 's2',
      'sources/1/system': '208Y/120',
    });
    expect(found(result, 'absence.source-not-tested')).toHaveLength(2);
  });

  it("the circuit's own conductors are those of the first normal source without it", () => {
    const second = {
      id: 's4',
      kind: 'normal',
      from: 'LA-2 ckt 1',
      upstreamOfTransfer: false,
      ...HELD,
    };
    const result = assessBase('O work', { 'sources/3': second, 'proof/openedSources/3': 's4' });
    expect(found(result, 'absence.source-not-tested')).toHaveLength(1);
    expect(unsettled(result)).toHaveLength(1);
  });

  it('a source of its own is read to ground and to each phase letter of the set', () => {
    const hot = { id: 'h1', kind: 'unswitched hot', from: 'LA-1 ckt 9', points: ['A1'], ...HELD };
    const own = (to: string) => ({
      point: 'A1',
      to,
      sourceId: 'h1',
      volts: 0,
      current: 'ac',
      at: AT,
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

describe('the governing reading (convention 9)', () => {
  const more = (...readings: object[]): Edits => ({
    ...Object.fromEntries(
      readings.map((entry, index) => [
        `proof/readings/${6 + index}`,
        { point: 'A1', from: 'B', to: 'G', current: 'ac', at: AT, ...entry },
      ]),
    ),
  });
  const low = { lowImpedance: true };
  type Row = [title: string, readings: object[], present: number, stray: number];
  const ROWS: Row[] = [
    ['the highest counts', [{ volts: 120 }, { volts: 0 }], 1, 0],
    ['one finding for one pair', [{ volts: 120 }, { volts: 118 }], 1, 0],
    ['a low-impedance retest settles it', [{ volts: 120 }, { volts: 0, ...low }], 0, 0],
    ['a retest of 3 V settles it', [{ volts: 80 }, { volts: 3, ...low }], 0, 0],
    ['a retest that still reads', [{ volts: 120 }, { volts: 20, ...low }], 0, 1],
    ['a retest that is not the last', [{ volts: 0, ...low }, { volts: 120 }], 1, 0],
    [
      'a retest and then another reading',
      [{ volts: 120 }, { volts: 0, ...low }, { volts: 0 }],
      1,
      0,
    ],
    ['a retest higher than before', [{ volts: 10 }, { volts: 70, ...low }], 1, 0],
    [
      'lowImpedance false settles nothing',
      [{ volts: 120 }, { volts: 0, lowImpedance: false }],
      1,
      0,
    ],
    ['the pair turned round', [{ volts: 120 }, { volts: 0, from: 'G', to: 'B', ...low }], 0, 0],
    ['a retest of another pair', [{ volts: 120 }, { volts: 0, from: 'N', ...low }], 1, 0],
    ['a retest at another point', [{ volts: 120 }, { volts: 0, point: 'A2', ...low }], 1, 0],
    ['a retest of direct current', [{ volts: 120 }, { volts: 0, current: 'dc', ...low }], 1, 0],
    ['a retest of a source', [{ volts: 120 }, { volts: 0, sourceId: 's1', ...low }], 1, 0],
    ['negative, by magnitude', [{ volts: -120 }], 1, 0],
    ['negative and smaller positive', [{ volts: -60 }, { volts: 20 }], 1, 0],
    ['stray, negative', [{ volts: -4 }], 0, 1],
    ['both kinds of current', [{ volts: 60 }, { volts: 60, current: 'dc' }], 2, 0],
    ['before the window, still counted', [{ volts: 120, at: '2026-12-01T06:00:00-06:00' }], 1, 0],
    ['after on, still counted', [{ volts: 20, at: '2026-12-01T11:00:00-06:00' }], 0, 1],
    ['without from, still counted', [{ volts: 120, from: gone }], 1, 0],
    ['without to, still counted', [{ volts: 120, to: gone }], 1, 0],
    ['without a point, still counted', [{ volts: 20, point: gone }], 0, 1],
    ['of a source that is not listed, still counted', [{ volts: 120, sourceId: 'x' }], 1, 0],
  ];
  it.each(ROWS)('%s', (_title, readings, present, stray) => {
    const result = assessBase('O work', more(...readings));
    expect(found(result, 'absence.voltage-present')).toHaveLength(present);
    expect(found(result, 'absence.stray-voltage')).toHaveLength(stray);
    expect(result.verdict).toBe(present + stray > 0 ? 'stop' : 'ready');
  });
});

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
      if (!base.includes('close') && !('supply/watts' in edits)) expect(verdict).not.toBe('ready');
    }
  });

  it.each([null, 7, 'x', [], { job: 3, crew: {}, sources: 'x', supply: [] }])(
    'never throws on the content %j',
    (content) => {
      for (const stage of ['plan', 'work', 'close-out'] as const) {
        const result = assess(content as never, {
          on: AT,
          stage,
          proof: content as never,
          closeOut: content as never,
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

/** The table's rows, top to bottom. */
const ORDER = [
  'job.outside-scope',
  'supply.voltage-not-of-system',
  'supply.readings-do-not-fit',
  'supply.high-leg',
  'supply.colors-do-not-fit',
  'supply.tripped',
  'sources.none',
  'sources.egress-unknown',
  'sources.egress-not-listed',
  'sources.switch-only',
  'sources.not-opened',
  'sources.not-locked',
  'sources.battery-connected',
  'sources.by-unqualified',
  'sources.traveler-unlisted',
  'sources.shared-neutral',
  'sources.opened-before-transfer',
  'sources.transfer-starts',
  'sources.neutral-not-checked',
  'sources.live-neighbor',
  'sources.control-unlisted',
  'sources.stored-energy',
  'sources.not-everyone-locked',
  'decision.unjustified',
  'decision.explanation-missing',
  'decision.below-fifty-not-so',
  'decision.testing-is-not-repair',
  'decision.infeasible-not-admitted',
  'decision.alternative-possible',
  'permit.missing',
  'absence.source-not-opened',
  'absence.proximity-tester',
  'absence.meter-category',
  'absence.not-proved',
  'absence.pairs-missing',
  'absence.voltage-present',
  'absence.stray-voltage',
  'absence.controls-not-operated',
  'absence.source-not-tested',
  'absence.dc-not-tested',
  'absence.leads-not-inspected',
  'shock.unqualified-inside',
  'shock.gloves-missing',
  'shock.gloves-class',
  'shock.gloves-overdue',
  'shock.gloves-not-air-tested',
  'shock.gloves-no-protectors',
  'shock.grounded-surface',
  'shock.conductive-articles',
  'shock.escort-is-working',
  'arc.study-needed',
  'arc.above-forty',
  'arc.rating-low',
  'arc.task-does-not-fit',
  'arc.bystander-inside',
  'equipment.not-at-hand',
  'equipment.damaged',
  'surroundings.ladder-conductive',
  'surroundings.ladder-top',
  'surroundings.ladder-short',
  'surroundings.dark',
  'surroundings.wet',
  'surroundings.barricade',
  'surroundings.egress-dark',
  'surroundings.lift-unsafe',
  'surroundings.overhead-line',
  'surroundings.ceiling-content',
  'crew.lead-unqualified',
  'crew.training-lapsed',
  'crew.alone',
  'crew.briefing-open',
  'crew.emergency-plan',
  'crew.rescue-untrained',
  'window.too-long',
  'window.reversed',
  'window.over',
  'window.shift-change',
  'lamp.line-voltage-lampholder',
  'closeout.not-cleared',
  'closeout.locks-left',
  'closeout.covers-off',
  'closeout.egress-untested',
  'job.unanswered',
  'supply.unanswered',
  'sources.unanswered',
  'decision.unanswered',
  'absenceTest.unanswered',
  'arcFlash.unanswered',
  'protectiveEquipment.unanswered',
  'surroundings.unanswered',
  'crew.unanswered',
  'briefing.unanswered',
];

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
    const places = assess({}, { on: AT, stage: 'work' }).findings.map(({ code }) =>
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

describe('the proof rows come only at work on the off path (the three stages)', () => {
  const PROOF_CODES = ORDER.filter((code) => code.startsWith('absence.')).filter(
    (code) =>
      ![
        'absence.proximity-tester',
        'absence.meter-category',
        'absence.leads-not-inspected',
      ].includes(code),
  );
  const spoilt: Edits = {
    proof: {
      openedSources: [],
      controlsOperated: false,
      otherLiveParts: 'not guarded',
      neutralAmperes: 9,
      storedEnergy: 'not discharged',
      readings: [{ volts: 277 }],
    },
  };
  it.each<[Base, boolean]>([
    ['O work', true],
    ['T work', false],
    ['W work', false],
    ['O close', false],
  ])('%s: %s', (base, isAsked) => {
    const codes = assessBase(base, spoilt).findings.map(({ code }) => code);
    const proof = codes.filter(
      (code) =>
        PROOF_CODES.includes(code) ||
        ['sources.live-neighbor', 'sources.neutral-not-checked', 'sources.stored-energy'].includes(
          code,
        ),
    );
    expect(proof.length > 0).toBe(isAsked);
  });

  it('at the plan a proof is not read', () => {
    const { on, content } = soundWorksheet();
    expect(assess(content, { on, proof: spoilt.proof as never }).verdict).toBe('ready');
  });

  it('mode not answered: the rows of the off path, at work too', () => {
    const { content, ...options } = edited('O work', {
      'decision/mode': gone,
      'proof/readings': [],
    });
    expectFound(found(assess(content, options), 'absence.pairs-missing'), ['open', '?open']);
  });
});

describeRule('sources.not-locked', 'convention 2: half an answer is a stop', [
  [
    'O',
    'a tag whose extra measure is missing',
    { 'sources/0/held': 'tag', 'sources/0/extraMeasure': gone },
    ['stop /sources/0/*'],
  ],
] satisfies RuleRow[]);

describe('what the edition and the lists say', () => {
  it('names the tasks in the order of the task table', () => {
    expect(TASKS).toEqual(JOB_TASKS);
  });

  it('has twelve briefing topics', () => {
    expect(BRIEFING_TOPICS).toHaveLength(12);
  });

  it('names the edition', () => {
    expect(assessBase('O').edition).toContain('2024');
  });
});
