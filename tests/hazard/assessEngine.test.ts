import { describe, expect, it } from 'vitest';
import { assess, BRIEFING_TOPICS, JOB_TASKS, jobTaskFacts, pathOf, requiredPairs } from '@/hazard';
import type { JobTask, Path, WorksheetContent } from '@/hazard';
import type { Base, Edits } from '../support/ruleTable';
import { assessBase, edited, found, gone, unsettled } from '../support/ruleTable';
import { soundWorksheet } from '../support/soundWorksheet';

const contentOf = (base: Base, edits: Edits = {}) => edited(base, edits).content;

describe('pathOf', () => {
  it.each<[Base, Edits, Path]>([
    ['O', {}, 'off'],
    ['T', {}, 'testing'],
    ['W', {}, 'energized'],
    ['W', { 'decision/mode': gone }, 'off'],
    ['T', { 'job/task': gone }, 'energized'],
    ['T', { 'decision/reason': 'below 50 V' }, 'energized'],
    ['T', { 'decision/reason': 'infeasible' }, 'energized'],
    [
      'T',
      {
        'decision/reason': 'infeasible',
        'decision/infeasibleBecause': 'can only be tested energized',
      },
      'testing',
    ],
    [
      'T',
      {
        'decision/reason': 'below 50 V',
        'decision/infeasibleBecause': 'can only be tested energized',
      },
      'energized',
    ],
  ])('%s with %j: %s', (base, edits, path) => {
    expect(pathOf(contentOf(base, edits))).toBe(path);
  });

  it.each([undefined, null, 'x', [], {}])('of %j: off', (content) => {
    expect(pathOf(content)).toBe('off');
  });
});

describe('the exception of parts below 50 V (29 CFR 1910.303(g)(2), 1910.333(a)(1))', () => {
  const LOW = { 'supply/workVolts': 24, 'supply/higherVoltsExposed': false };
  it.each<[string, Base, Edits, number]>([
    ['energized for that reason', 'W', { ...LOW, 'decision/reason': 'below 50 V' }, 24],
    ['energized for another reason', 'W', { ...LOW, 'decision/reason': 'infeasible' }, 120],
    ['off, the reason left from before', 'O', { ...LOW, 'decision/reason': 'below 50 V' }, 120],
    [
      'something higher is exposed',
      'W',
      { ...LOW, 'decision/reason': 'below 50 V', 'supply/higherVoltsExposed': true },
      120,
    ],
    ['at 50 V', 'W', { ...LOW, 'decision/reason': 'below 50 V', 'supply/workVolts': 50 }, 120],
  ])('%s', (_, base, edits, volts) => {
    expect(assessBase(base, edits).boundaries?.volts).toBe(volts);
  });
});

describe('jobTaskFacts, the task table', () => {
  const table: Record<JobTask, [kind: string, reasons: string, floor: string | null]> = {
    'replace luminaire': ['repair', 'hazard', 'energized work'],
    'replace driver or ballast': ['repair', 'hazard', 'energized work'],
    'replace lamp': ['repair', 'hazard', 'energized work'],
    'replace battery unit': ['repair', 'hazard', 'energized work'],
    'add or extend circuit': ['repair', 'none', 'energized work'],
    'work in panelboard': ['repair', 'hazard', 'remove cover exposing parts'],
    'replace breaker': ['repair', 'hazard', 'remove or install breaker'],
    'work on lighting control': ['repair', 'hazard', 'energized work'],
    'trace circuit': ['testing', 'testing', null],
    'test or troubleshoot': ['testing', 'testing', 'voltage test'],
    inspect: ['testing', 'testing', null],
    thermography: ['testing', 'testing', null],
  };
  const reasons: Record<string, string[]> = {
    none: [],
    hazard: ['additional hazard', 'infeasible', 'below 50 V'],
    testing: ['testing', 'infeasible', 'below 50 V'],
  };

  it.each(JOB_TASKS)('%s', (task) => {
    const [kind, admitted, arcFlashFloor] = table[task];
    const facts = jobTaskFacts(task);
    expect(facts).toMatchObject({ kind, arcFlashFloor });
    expect(facts.admittedReasons).toEqual(reasons[admitted]);
  });

  it('names what each task opens and what it leaves charged', () => {
    const those = (test: (task: JobTask) => boolean) => JOB_TASKS.filter(test);
    expect(those((task) => jobTaskFacts(task).alwaysWholeEquipment)).toEqual([
      'work in panelboard',
      'replace breaker',
    ]);
    expect(those((task) => jobTaskFacts(task).opensCeilingOrLuminaire)).toEqual([
      'replace luminaire',
      'replace driver or ballast',
      'replace lamp',
      'replace battery unit',
      'add or extend circuit',
      'work on lighting control',
    ]);
    expect(those((task) => jobTaskFacts(task).holdsStoredEnergy)).toEqual([
      'replace luminaire',
      'replace driver or ballast',
      'replace battery unit',
    ]);
    expect(those((task) => jobTaskFacts(task).needsDirectCurrent)).toEqual([
      'replace battery unit',
    ]);
  });

  it.each(['', 'toString', 'paint'])('refuses %j', (task) => {
    expect(() => jobTaskFacts(task as JobTask)).toThrow(RangeError);
  });
});

describe('requiredPairs', () => {
  const names = (content: WorksheetContent) =>
    requiredPairs(content).sets.map(({ pairs }) => pairs.map((pair) => pair.join('')).join(' '));

  it('of one phase-to-neutral circuit: whichever phase, neutral and ground', () => {
    expect(names(contentOf('O'))).toEqual(['AN AG NG', 'BN BG NG', 'CN CG NG']);
  });

  it('of a phase-to-phase circuit: two phases and ground, and the neutral unless there is none', () => {
    const edits = { 'supply/circuitVolts': 208 };
    expect(names(contentOf('O', edits))[0]).toBe('AB AN AG BN BG NG');
    expect(names(contentOf('O', { ...edits, 'supply/neutralPresent': false }))).toEqual([
      'AB AG BG',
      'AC AG CG',
      'BC BG CG',
    ]);
  });

  it('of whole equipment: every conductor', () => {
    const whole = (system: string) => names(contentOf('O', { 'supply/system': system }))[0];
    const circuit = { 'supply/exposure': 'whole equipment' };
    expect(names(contentOf('O', circuit))).toEqual(['AB AC AN AG BC BN BG CN CG NG']);
    expect(whole('480 delta')).toBe('AB AC AG BC BG CG');
    expect(names({ supply: { system: '120/240' } })).toEqual(['AB AN AG BN BG NG']);
    expect(names({})).toEqual(['AB AC AN AG BC BN BG CN CG NG']);
  });

  it('lists the sources that are read by themselves, and those that are read with direct current', () => {
    const battery = { id: 'b1', kind: 'battery unit', from: 'Over door 1', points: ['A2'] };
    const { ownConductors, directCurrent, pointsOfWork } = requiredPairs(
      contentOf('O', { 'sources/3': battery, 'sources/4': {} }),
    );
    const described = { index: 3, id: 'b1', kind: 'battery unit', from: 'Over door 1' };
    expect(pointsOfWork).toBe(2);
    expect(directCurrent).toEqual([{ ...described, points: ['A2'] }]);
    expect(ownConductors).toEqual([
      { ...described, points: ['A2'] },
      { index: 4, id: null, kind: null, from: null, points: null },
    ]);
    expect(requiredPairs({})).toMatchObject({ pointsOfWork: null, ownConductors: [] });
  });
});

describe('the time of the assessment', () => {
  const { content, on } = soundWorksheet();

  it.each([
    '2026-12-01T09:00:00.123456-06:00',
    '2026-12-01T15:00Z',
    '2026-12-01T20:45:00+05:45',
    '0099-12-01T00:00:00Z',
  ])('reads %s', (time) => {
    expect(() => assess(content, { on: time })).not.toThrow();
  });

  it.each([
    '2026-12-01T24:00:00Z',
    '2026-12-01T09:60:00Z',
    '2026-12-01T09:00:60Z',
    '2026-12-01T09:00:00+24:00',
    '2026-12-01T09:00:00+06:60',
    '2026-13-01T09:00:00Z',
    '2026-12-01T09:00:00-06:00 ',
    7 as unknown as string,
  ])('refuses %s', (time) => {
    expect(() => assess(content, { on: time })).toThrow(/^on /);
  });

  it('is an instant, in whichever offset it is written', () => {
    const ends = (endsAt: string) =>
      found(assessBase('O', { 'job/endsAt': endsAt }), 'window.over');
    expect(on).toBe('2026-12-01T09:00:00-06:00');
    expect(ends('2026-12-01T15:00:00Z')).toEqual([]);
    expect(ends('2026-12-01T14:59:59.999Z')).toEqual(['stop /job/endsAt']);
    expect(ends('2026-12-01T20:30:00+05:30')).toEqual([]);
  });
});

describe('what is read of a proof', () => {
  it('a reading without a time, before the work or after the assessment fills no pair', () => {
    for (const at of [gone, '2026-12-01T07:59:59-06:00', '2026-12-01T09:00:01-06:00']) {
      expect(unsettled(assessBase('O work', { 'proof/readings/0/at': at }))).toEqual([
        'open absence.pairs-missing /proof/readings',
      ]);
    }
  });

  it('a point that a source names and nobody read is a point of work', () => {
    const result = assessBase('O work', { 'sources/0/points': ['A1', ' A2 ', 'A3'] });
    const missing = result.findings.filter(({ code }) => code === 'absence.pairs-missing');
    expect(missing.map(({ params }) => params)).toEqual([{ point: 'A3', pairs: 'A-N, A-G, N-G' }]);
  });

  it('direct current on conductors that are shared is read on either name, or on none', () => {
    const inverter = {
      ...contentOf('O').sources?.[1],
      id: 'i1',
      kind: 'central inverter',
    };
    const edits = {
      'sources/1': inverter,
      egressSupply: ['central inverter'],
      'proof/openedSources': ['s1', 'i1', 's3'],
    };
    const read = (sourceId: string | undefined) =>
      ['A1', 'A2'].map((point) => ({
        point,
        volts: 0,
        current: 'dc',
        sourceId,
        at: '2026-12-01T08:55:00-06:00',
      }));
    const after = (sourceId: string | undefined) => {
      const [first, second] = read(sourceId);
      return found(
        assessBase('O work', { ...edits, 'proof/readings/6': first, 'proof/readings/7': second }),
        'absence.dc-not-tested',
      );
    };
    expect(found(assessBase('O work', edits), 'absence.dc-not-tested')).toHaveLength(2);
    expect(after(undefined)).toEqual([]);
    expect(after('i1')).toEqual([]);
    expect(after('s1')).toEqual([]);
    expect(after('s3')).toHaveLength(2);
  });

  it('without any reading the battery is still to be read', () => {
    const battery = { ...contentOf('O').sources?.[0], id: 'b1', kind: 'battery unit' };
    const result = assessBase('O work', { 'sources/3': battery, 'proof/readings': [] });
    expect(found(result, 'absence.dc-not-tested')).toEqual(['open /proof/readings']);
  });
});

describe('an arc flash', () => {
  const CONTROL: Edits = {
    'job/task': 'work on lighting control',
    'arcFlash/task': 'control circuit up to 125 V',
    'supply/workVolts': 24,
    'supply/higherVoltsExposed': false,
  };

  it('is not likely at a lighting control below 50 V with nothing higher exposed', () => {
    expect(assessBase('W', CONTROL).arcFlash).toMatchObject({ likely: false, findings: [] });
    const exposed = assessBase('W', { ...CONTROL, 'supply/higherVoltsExposed': true });
    expect(exposed.arcFlash.likely).toBe(true);
    expect(found(exposed, 'arc.task-does-not-fit')).toEqual(['open /arcFlash/task']);
  });

  it('is likely while neither the job nor the sheet names a task', () => {
    const result = assessBase('T', { 'job/task': 'trace circuit', 'arcFlash/task': gone });
    expect(result.arcFlash.likely).toBe(true);
    const outside = assessBase('T', {
      'job/task': 'trace circuit',
      'arcFlash/task': gone,
      'crew/0/closest': 'outside limited',
    });
    expect(outside.arcFlash.likely).toBe(true);
    expect(found(outside, 'arcFlash.unanswered')).toEqual(['open /arcFlash/task']);
  });

  it('that is not likely puts nobody inside a boundary', () => {
    const result = assessBase('T', {
      'job/task': 'inspect',
      'arcFlash/task': 'thermography or inspection outside restricted',
      'crew/0/closest': 'outside limited',
      'crew/1/closest': 'outside limited',
    });
    expect(unsettled(result)).toEqual([]);
    expect(result.equipment.map(({ id }) => id)).not.toContain('safety-glasses');
  });

  it('whose boundary is not known may reach someone outside the limited boundary', () => {
    const result = assessBase('T', {
      'job/task': 'inspect',
      'arcFlash/task': 'operate device',
      'arcFlash/normal/maintained': false,
      'arcFlash/clearingSeconds': gone,
      'crew/0/closest': 'outside limited',
    });
    expect(result.arcFlash).toMatchObject({ likely: true, arcFlashBoundary: null });
    expect(result.equipment.map(({ id }) => id)).toContain('safety-glasses');
  });

  it('a transformer begun beside a fault current is to be completed', () => {
    const result = assessBase('O', {
      'arcFlash/transformer': { kilovoltAmperes: 75, secondaryVolts: 208, impedancePercent: 0 },
    });
    expect(found(result, 'arc.study-needed')).toEqual([
      'open /arcFlash/transformer/impedancePercent',
      'open /arcFlash/transformer/phases',
    ]);
  });

  it('a transformer whose figures are past any number gives no estimate', () => {
    const result = assessBase('O', {
      'arcFlash/transformer': {
        kilovoltAmperes: 1e308,
        secondaryVolts: 1,
        impedancePercent: 1,
        phases: 1,
      },
    });
    expect(found(result, 'arc.study-needed')).toEqual([
      'open /arcFlash/transformer/kilovoltAmperes',
    ]);
  });
});

describe('job.construction', () => {
  it.each<[Base, unknown, string[]]>([
    ['O', true, ['caution /job/construction']],
    ['T', true, ['caution /job/construction']],
    ['W work', true, ['caution /job/construction']],
    ['O', false, []],
    ['O', gone, []],
    ['O', 'yes', []],
    ['O close', true, []],
  ])('%s, %s: %j', (base, construction, expected) => {
    const result = assessBase(base, { 'job/construction': construction });
    expect(found(result, 'job.construction')).toEqual(expected);
    expect(result.verdict).toBe('ready');
  });
});

describe('an escort whose qualification is not settled', () => {
  it('leaves the escort open', () => {
    const escorted = { 'crew/1/closest': 'limited with escort' };
    const third = { id: 'c3', name: 'Third', closest: 'outside limited', arcRated: true };
    const result = assessBase('T', { ...escorted, 'crew/2': third });
    expect(found(result, 'shock.escort-is-working')).toEqual(['open /crew/1/closest']);
    const off = assessBase('O', { ...escorted, 'crew/2': third });
    expect(found(off, 'shock.escort-is-working')).toEqual(['caution /crew/1/closest']);
    const alone = assessBase('T', {
      ...escorted,
      'crew/0/qualifiedThrough': gone,
      'crew/1/arcRated': true,
    });
    expect(found(alone, 'shock.unqualified-inside')).toEqual([
      'open /crew/0/closest',
      'open /crew/1/closest',
    ]);
  });
});

describe('the words of a finding are filled', () => {
  it('with the name of the field that is not answered', () => {
    const { findings } = assess({}, { on: soundWorksheet().on });
    const panel = findings.find(({ path }) => path === '/supply/panel');
    expect(panel).toMatchObject({ code: 'supply.unanswered', params: { field: 'supply.panel' } });
    const topics = findings.filter(({ code }) => code === 'crew.briefing-open');
    expect(topics.map(({ params }) => params.topic)).toEqual(
      BRIEFING_TOPICS.filter((topic) => topic !== 'permit'),
    );
  });

  it('with the source, the person and the figures', () => {
    const result = assessBase('O work', {
      'sources/1/openedAt': 'none',
      'crew/0/qualifiedThrough': '2020-01-01',
      'proof/readings/0/volts': -118,
    });
    const params = (code: string) => result.findings.find((one) => one.code === code)?.params;
    expect(params('sources.not-opened')).toMatchObject({ index: 1, kind: 'generator' });
    expect(params('crew.training-lapsed')).toMatchObject({ index: 0, name: 'Lead' });
    expect(params('absence.voltage-present')).toMatchObject({
      index: 0,
      volts: -118,
      point: 'A1',
      from: 'B',
      to: 'N',
    });
  });
});
