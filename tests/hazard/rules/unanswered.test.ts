import { describe, expect, it } from 'vitest';
import { assess } from '@/hazard';
import { BELOW_FIFTY } from '../../support/ruleEdits';
import type { Base, Edits } from '../../support/ruleTable';
import { assessBase, assessed, edited, gone, unsettled, withEdits } from '../../support/ruleTable';
import { sampled } from '../../support/propertyRuns';
import { withPath } from '../../support/soundWorksheet';

const ON = '2026-12-01T09:00:00-06:00';
const ALL: Base[] = ['O', 'T', 'W'];

describe('an empty worksheet is open and holds no stop (convention 2)', () => {
  it.each([
    [{ on: ON }],
    [{ on: ON, stage: 'work' as const }],
    [{ on: ON, stage: 'work' as const, proof: {} }],
    [{ on: ON, stage: 'close-out' as const }],
    [{ on: ON, stage: 'close-out' as const, closeOut: {} }],
  ])('%o', (options) => {
    const result = assess({}, options);
    expect(result.verdict).toBe('open');
    expect(result.findings.filter(({ severity }) => severity === 'stop')).toEqual([]);
    expect(result.findings.every(({ path }) => /^\/[a-zA-Z]/.test(path))).toBe(true);
  });

  it('knows no voltage', () => {
    expect(assess({}, { on: ON })).toMatchObject({
      boundaries: null,
      barricade: null,
      touch: null,
    });
  });
});

type Required = [base: Base, pointer: string, codes: string[], edits?: Edits];
const rows = (bases: Base[], pointers: string[], codes: string[], edits?: Edits): Required[] =>
  bases.flatMap((base) => pointers.map((pointer): Required => [base, pointer, codes, edits]));

/** Required fields without a row of their own: `<section>.unanswered`, once, at the field. */
const PLAIN: Required[] = [
  ...rows(
    ALL,
    ['job/siteId', 'job/area', 'job/equipment', 'job/task', 'job/description'],
    ['job.unanswered'],
  ),
  ...rows(['O'], ['job/pointsOfWork'], ['job.unanswered']),
  ...rows(ALL, ['supply/panel', 'supply/circuit'], ['supply.unanswered']),
  ...rows(['O'], ['supply/neutralShared'], ['supply.unanswered']),
  ...rows(['T'], ['supply/switching'], ['supply.unanswered']),
  ...['panelboard', 'switchboard', 'disconnect', 'transformer'].flatMap((equipment) =>
    rows(['W'], ['supply/atService'], ['supply.unanswered'], { 'arcFlash/equipment': equipment }),
  ),
  ...rows(
    ALL,
    ['sources/0/id', 'sources/1/id', 'sources/0/kind', 'sources/1/kind', 'sources/2/from'],
    ['sources.unanswered'],
  ),
  ...['generator', 'central inverter', 'backfeed', 'control'].flatMap((kind) =>
    rows(ALL, ['sources/1/system'], ['sources.unanswered'], {
      'sources/1/kind': kind,
      'sources/1/sameConductorsAs': gone,
      egressSupply: ['none after checking'],
    }),
  ),
  ...rows(ALL, ['decision/mode'], ['decision.unanswered']),
  ...rows(ALL, ['arcFlash/equipment'], ['arcFlash.unanswered']),
  ...rows(ALL, ['surroundings/access'], ['surroundings.unanswered']),
  ...rows(
    ALL,
    ['crew/1/id', 'crew/0/name', 'crew/1/name', 'crew/1/qualified', 'crew/1/closest'],
    ['crew.unanswered'],
  ),
];

describe('a required field without a row of its own is open at its place', () => {
  it.each(PLAIN)('%s: %s', (base, pointer, codes, edits = {}) => {
    const result = assessBase(base, { ...edits, [pointer]: gone });
    const there = result.findings.filter(
      ({ path, code }) => path === `/${pointer}` && codes.includes(code),
    );
    expect(there.map(({ severity }) => severity)).toEqual(['open']);
    expect(result.verdict).not.toBe('ready');
  });

  it.each(ALL)('%s: two sources of the same id', (base) => {
    const result = assessBase(base, { 'sources/2/id': 's1' });
    expect(unsettled(result)).toContain('open sources.unanswered /sources/2/id');
  });

  it.each(ALL)('%s: two people of the same id', (base) => {
    const result = assessBase(base, { 'crew/1/id': 'c1' });
    expect(unsettled(result)).toContain('open crew.unanswered /crew/1/id');
  });

  it('the findings come after the rows, in the order of the content', () => {
    const result = assessBase('O', {
      'crew/1/name': gone,
      'surroundings/access': gone,
      'supply/panel': gone,
      'job/area': gone,
      'sources/1/from': gone,
      'crew/1/rescueTrained': gone,
      'crew/0/rescueTrained': gone,
    });
    const codes = result.findings.map(({ code }) => code);
    const first = codes.findIndex((code) => code.endsWith('.unanswered'));
    expect(codes.slice(first)).toEqual([
      'job.unanswered',
      'supply.unanswered',
      'sources.unanswered',
      'surroundings.unanswered',
      'crew.unanswered',
    ]);
  });
});

/** Required fields that a row reads: open under that row's code. */
const BY_ROW: Required[] = [
  ...rows(ALL, ['job/special'], ['job.outside-scope']),
  ...rows(
    ALL,
    ['job/startsAt', 'job/endsAt'],
    ['job.unanswered', 'window.too-long', 'window.reversed', 'window.over'],
  ),
  ...rows(['O'], ['job/crossesShift'], ['window.shift-change']),
  ...rows(ALL, ['supply/system', 'supply/circuitVolts'], ['supply.voltage-not-of-system']),
  ...rows(
    ['O', 'W'],
    ['supply/switching'],
    ['sources.traveler-unlisted', 'sources.control-unlisted'],
  ),
  ...rows(ALL, ['supply/tripped'], ['supply.tripped']),
  ...rows(ALL, ['supply/damage'], ['equipment.damaged']),
  ...rows(ALL, ['egressSupply'], ['sources.egress-unknown']),
  ...rows(ALL, ['sources'], ['sources.none']),
  ...rows(['O'], ['sources/0/openedAt'], ['sources.not-opened']),
  ...rows(['O'], ['sources/0/held', 'sources/0/lockNumber'], ['sources.not-locked']),
  ...rows(['O'], ['sources/0/byCrewId'], ['sources.by-unqualified']),
  ...rows(['O'], ['sources/0/upstreamOfTransfer'], ['sources.opened-before-transfer']),
  ...rows(['T'], ['decision/explanation'], ['decision.explanation-missing']),
  ...rows(['W'], ['decision/explanation'], ['decision.explanation-missing']),
  ...rows(
    ['W'],
    [
      'decision/permit',
      'decision/permit/number',
      'decision/permit/approvedBy',
      'decision/permit/validUntil',
    ],
    ['permit.missing'],
  ),
  ...rows(['O', 'T'], ['absenceTest/instrument'], ['absence.proximity-tester']),
  ...rows(
    ['O', 'T'],
    ['absenceTest/category', 'absenceTest/ratedVolts'],
    ['absence.meter-category'],
  ),
  ...rows(['O', 'T'], ['absenceTest/leadsInspected'], ['absence.leads-not-inspected']),
  ...rows(['O', 'T'], ['absenceTest/byCrewId'], ['sources.by-unqualified']),
  ...rows(['T', 'W'], ['arcFlash/task'], ['arcFlash.unanswered', 'arc.task-does-not-fit']),
  ...rows(
    ALL,
    [
      'arcFlash/workingDistanceInches',
      'arcFlash/noLabel',
      'arcFlash/availableFaultKiloamperes',
      'arcFlash/clearingSeconds',
    ],
    ['arc.study-needed'],
  ),
  ...rows(ALL, ['arcFlash/clothingRatingCalPerCm2'], ['arc.rating-low']),
  ...rows(ALL, ['protectiveEquipment/gloves'], ['shock.gloves-missing']),
  ...rows(ALL, ['protectiveEquipment/gloves/gloveClass'], ['shock.gloves-class']),
  ...rows(ALL, ['protectiveEquipment/gloves/lastTestedOn'], ['shock.gloves-overdue']),
  ...rows(ALL, ['protectiveEquipment/gloves/airTested'], ['shock.gloves-not-air-tested']),
  ...rows(ALL, ['protectiveEquipment/gloves/leatherProtectors'], ['shock.gloves-no-protectors']),
  ...rows(ALL, ['protectiveEquipment/ready'], ['equipment.not-at-hand']),
  ...rows(ALL, ['surroundings/groundedSurfaces'], ['shock.grounded-surface']),
  ...rows(ALL, ['surroundings/lightAdequate'], ['surroundings.dark']),
  ...rows(ALL, ['surroundings/wet'], ['surroundings.wet']),
  ...rows(ALL, ['surroundings/conductiveArticlesRemoved'], ['shock.conductive-articles']),
  ...rows(ALL, ['surroundings/outdoors'], ['surroundings.overhead-line']),
  ...rows(['O', 'W'], ['surroundings/ceiling'], ['surroundings.ceiling-content']),
  ...rows(
    ALL,
    ['surroundings/ladder', 'surroundings/ladder/material'],
    ['surroundings.ladder-conductive'],
  ),
  ...rows(ALL, ['surroundings/ladder/standingLevelFeet'], ['surroundings.ladder-top']),
  ...rows(
    ALL,
    [
      'surroundings/ladder/placed',
      'surroundings/ladder/sizeFeet',
      'surroundings/ceilingHeightFeet',
    ],
    ['surroundings.ladder-short'],
  ),
  ...rows(
    ALL,
    ['crew', 'crew/0/lead', 'crew/0/qualified', 'crew/0/qualifiedThrough'],
    ['crew.lead-unqualified'],
  ),
  ...rows(ALL, ['briefing', 'briefing/topics'], ['crew.briefing-open']),
  ...rows(ALL, ['briefing/emergency', 'briefing/emergency/contact'], ['crew.emergency-plan']),
];

describe('a required field that a row reads is open under its code, never a stop', () => {
  it.each(BY_ROW)('%s: %s', (base, pointer, codes, edits = {}) => {
    const result = assessBase(base, { ...edits, [pointer]: gone });
    const open = result.findings
      .filter(({ severity }) => severity === 'open')
      .map(({ code }) => code);
    expect(open.some((code) => codes.includes(code))).toBe(true);
    expect(
      result.findings.filter(({ severity }) => severity === 'stop').map(({ code }) => code),
    ).toEqual([]);
  });
});

describe('what is not required on a path is not asked there', () => {
  it.each<[Base, string, Edits?]>([
    ['T', 'job/pointsOfWork'],
    ['W', 'job/pointsOfWork'],
    ['T', 'job/crossesShift'],
    ['W', 'job/crossesShift'],
    ['T', 'supply/neutralShared'],
    ['W', 'supply/neutralShared'],
    ['W', 'absenceTest'],
    ['T', 'absenceTest', { 'job/task': 'inspect' }],
    ['O', 'arcFlash/task'],
    ['O', 'supply/atService'],
    ['T', 'sources/0/openedAt'],
    ['W', 'sources/0/held'],
    ['T', 'sources/0/byCrewId'],
    ['T', 'surroundings/ceiling'],
    ['O', 'surroundings/ceilingHeightFeet', { 'surroundings/access': 'floor' }],
    ['W', 'arcFlash', BELOW_FIFTY],
    ['W', 'protectiveEquipment/gloves', BELOW_FIFTY],
    ['W', 'surroundings/lift'],
    ['O', 'decision/explanation'],
  ])('%s: %s', (base, pointer, edits = {}) => {
    expect(unsettled(assessBase(base, { ...edits, [pointer]: gone }))).toEqual([]);
  });
});

describe('optional answers: absent, the worksheet is ready (convention 3)', () => {
  const OPTIONAL = [
    'job/workOrder',
    'job/lamps',
    'job/construction',
    'notes',
    'crew/0/userId',
    'supply/readings',
    'supply/conductorColors',
    'supply/watts',
    'arcFlash/transformer',
    'protectiveEquipment/rubberGoodsId',
    'protectiveEquipment/gloves/issuedOn',
  ];
  it.each(ALL.flatMap((base) => OPTIONAL.map((pointer): [Base, string] => [base, pointer])))(
    '%s: %s',
    (base, pointer) => {
      expect(assessBase(base, { [pointer]: gone }).verdict).toBe('ready');
    },
  );
});

/** What an absent answer counts as (convention 3). */
const WORSE: [string, unknown, Edits?][] = [
  ['supply/exposure', 'whole equipment'],
  [
    'supply/movableConductors',
    true,
    { 'surroundings/peopleMayApproach': true, 'surroundings/barricadeInches': 60 },
  ],
  ...[
    'installed',
    'maintained',
    'ratedForFault',
    'usedAsListed',
    'doorsClosed',
    'coversOn',
    'noSignOfFailure',
  ].map((part): [string, unknown] => [`arcFlash/normal/${part}`, false]),
  ['job/occupied', true],
  ['job/occupied', true, { egress: gone }],
  ['surroundings/peopleMayApproach', true],
  ['egressReaches', 'this equipment', { egressSupply: ['battery units'] }],
  ['crew/1/worksOnCircuit', true],
  ['crew/0/arcRated', false],
  ['supply/neutralPresent', true, { 'supply/circuitVolts': 208, 'supply/system': '208Y/120' }],
  [
    'arcFlash/label/ofThisEquipment',
    true,
    {
      'arcFlash/label': {
        systemVolts: 208,
        reviewedOn: '2025-01-01',
        incidentEnergyCalPerCm2: 41,
        workingDistanceInches: 18,
        arcFlashBoundaryInches: 30,
      },
    },
  ],
  [
    'surroundings/groundedSurfaces/0/inReach',
    true,
    {
      'surroundings/groundedSurfaces/0/keptClear': false,
      'surroundings/groundedSurfaces/0/covered': false,
    },
  ],
  ['surroundings/groundedSurfaces/0/covered', false],
  ['surroundings/groundedSurfaces/0/keptClear', false],
];

describe('absent counts as the worse case, so never open by itself (convention 3)', () => {
  const bases: Base[] = ['O', 'T', 'W', 'O work'];
  it.each(
    bases.flatMap((base) => WORSE.map((row): [Base, string, unknown, Edits?] => [base, ...row])),
  )('%s: %s is %s', (base, pointer, worse, edits = {}) => {
    const answered = assessBase(base, { ...edits, [pointer]: worse });
    for (const absent of sampled([gone, '', {}])) {
      expect(assessBase(base, { ...edits, [pointer]: absent })).toEqual(answered);
    }
  });

  it.each(bases)('%s: sameConductorsAs absent is conductors of its own', (base) => {
    const own = assessBase(base, { 'sources/2/sameConductorsAs': gone });
    expect(unsettled(own).some((entry) => entry.includes('unanswered'))).toBe(false);
  });
});

type Leaf = [base: Base, pointer: string, kind: string];

function leaves(value: unknown, pointer = ''): [string, string][] {
  if (Array.isArray(value)) {
    const objects = value.filter((member) => typeof member === 'object');
    const inner = objects.flatMap((member, index) => leaves(member, `${pointer}/${index}`));
    return [[pointer, 'list'], ...inner];
  }
  if (typeof value === 'object' && value !== null) {
    const inner = Object.entries(value).flatMap(([key, member]) =>
      leaves(member, `${pointer}/${key}`),
    );
    return pointer === '' ? inner : [[pointer, 'section'], ...inner];
  }
  return [[pointer, typeof value]];
}

const EVERY_BASE: Base[] = ['O', 'T', 'W', 'O work', 'O close'];
const EVERY_LEAF: Leaf[] = EVERY_BASE.flatMap((base) => {
  const { content, proof, closeOut } = withEdits(base);
  return leaves({ ...content, proof, closeOut })
    .filter(([pointer]) => pointer !== '/proof' || base.includes('work'))
    .map(([pointer, kind]): Leaf => [base, pointer, kind]);
});

/** All of them; where every program of thousands is asked, a part. */
const LEAVES = sampled(EVERY_LEAF);

/** Values that are no answer, by the type of the answer that they replace. */
const NO_ANSWER: Record<string, unknown[]> = {
  string: ['', 7, {}, null],
  number: [NaN, Infinity, '', 'x', null, {}],
  boolean: ['', 'yes', 1, null, {}],
  list: ['x', 7, null, {}],
  section: ['x', 7, null],
};

describe('a value of the wrong type is not answered (convention 1)', () => {
  it.each(LEAVES)('%s: %s, a %s', (base, pointer, kind) => {
    // The items at hand are part of what is spoilt, so they are not filled again.
    const whole = edited(base);
    const spoilt = (value: unknown) => {
      const { on, stage, ...root } = whole;
      const { content, proof, closeOut } = root;
      const changed = withPath({ ...content, proof, closeOut }, pointer, value);
      const { proof: newProof, closeOut: newCloseOut, ...newContent } = changed;
      return assessed({
        on,
        stage,
        content: newContent,
        proof: newProof,
        closeOut: newCloseOut,
      });
    };
    const isMember = /\/\d+$/.test(pointer);
    const missing = spoilt(isMember ? {} : undefined);
    if (isMember) {
      // A member that is no object is a foreign member of its list: never better than an empty one.
      for (const value of NO_ANSWER[kind] ?? []) expect(() => spoilt(value)).not.toThrow();
      return;
    }
    for (const value of NO_ANSWER[kind] ?? [])
      expect(spoilt(value), String(value)).toEqual(missing);
  });
});

describe('negative figures are not answers (convention 1)', () => {
  const figures = LEAVES.filter(
    ([, pointer, kind]) => kind === 'number' && !pointer.endsWith('/volts'),
  );
  it.each(figures)('%s: %s', (base, pointer) => {
    const key = pointer.slice(1);
    expect(assessBase(base, { [key]: -1 })).toEqual(assessBase(base, { [key]: gone }));
  });
});

describe('a word outside its enumeration is not an answer (convention 1)', () => {
  it.each([
    'job/task',
    'job/lamps',
    'supply/system',
    'supply/exposure',
    'supply/neutralShared',
    'supply/tripped',
    'egressReaches',
    'sources/0/kind',
    'sources/0/openedAt',
    'sources/0/held',
    'decision/mode',
    'absenceTest/instrument',
    'absenceTest/category',
    'arcFlash/task',
    'arcFlash/equipment',
    'protectiveEquipment/gloves/gloveClass',
    'surroundings/access',
    'surroundings/ladder/material',
    'surroundings/ceiling',
    'surroundings/overheadLines',
    'crew/0/closest',
    'crew/1/closest',
  ])('%s', (pointer) => {
    for (const base of ['O', 'T', 'W', 'O work'] as const) {
      for (const foreign of sampled(['moon', 'toString', '__proto__', ' '])) {
        expect(assessBase(base, { [pointer]: foreign })).toEqual(
          assessBase(base, { [pointer]: gone }),
        );
      }
    }
  });

  it.each([0, 41, 1.5, -2, '2', NaN])('pointsOfWork %s is not answered', (pointsOfWork) => {
    expect(unsettled(assessBase('O', { 'job/pointsOfWork': pointsOfWork }))).toEqual([
      'open job.unanswered /job/pointsOfWork',
    ]);
  });

  it.each([1, 40])('pointsOfWork %s is an answer', (pointsOfWork) => {
    expect(assessBase('O', { 'job/pointsOfWork': pointsOfWork }).verdict).toBe('ready');
  });
});

/** Where an answer left out may be a stop: it counts as the worse case, or its other half is there. */
const MAY_STOP =
  /^\/(crew\/0\/arcRated|decision\/reason|surroundings\/groundedSurfaces\/0(\/covered|\/keptClear)?)$/;

describe('an answer left out is never a stop (convention 2)', () => {
  it.each(LEAVES.filter(([, pointer]) => !MAY_STOP.test(pointer)))(
    '%s: %s, a %s',
    (base, pointer) => {
      const isMember = /\/\d+$/.test(pointer);
      const result = assessBase(base, { [pointer.slice(1)]: isMember ? {} : gone });
      const stops = result.findings.filter(({ severity }) => severity === 'stop');
      // Testing without a task is a worksheet of the W path: there a surface kept clear is not enough.
      const isOtherPath = base === 'T' && ['/job', '/job/task'].includes(pointer);
      expect(stops.map(({ code }) => code)).toEqual(isOtherPath ? ['shock.grounded-surface'] : []);
    },
  );
});

/** The same numbers for the same seed. */
function numbers(seed: number): (below: number) => number {
  let state = seed;
  return (below) => {
    state = (state * 1_103_515_245 + 12_345) % 2_147_483_648;
    return Math.floor((state / 2_147_483_648) * below);
  };
}

describe('no content makes assess throw, or answer twice differently', () => {
  const POOL: unknown[] = [
    undefined,
    null,
    '',
    'x',
    'none',
    'restricted',
    'energized',
    'testing',
    0,
    -1,
    1,
    50,
    480,
    1e9,
    NaN,
    Infinity,
    true,
    false,
    [],
    {},
    [null],
    [{}],
    ['x'],
  ];
  it.each(sampled(Array.from({ length: 120 }, (_value, index) => index + 1)))('seed %s', (seed) => {
    const next = numbers(seed * 7919);
    const base = EVERY_BASE[next(EVERY_BASE.length)] ?? 'O';
    const own = LEAVES.filter(([of]) => of === base);
    const edits = Object.fromEntries(
      Array.from({ length: 8 }, () => [
        own[next(own.length)]?.[1].slice(1) ?? 'notes',
        POOL[next(POOL.length)],
      ]),
    );
    expect(assessBase(base, edits)).toEqual(assessBase(base, edits));
  });
});
