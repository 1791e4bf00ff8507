import { BATTERY_UNIT, READ_AT, UNSWITCHED_HOT, readingOf } from '../../support/ruleEdits';
import type { Edits, RuleRow } from '../../support/ruleTable';
import { describeRule, eachValue, gone, onEach } from '../../support/ruleTable';
import { zeroReadings } from '../../support/soundWorksheet';

/** A seventh reading, of a pair that is complete without it. */
const SEVENTH = 'proof/readings/6';
const OPENED = { 'proof/openedSources': ['s1', 's2', 's3', 'h1', 'b1'] };
const ofSource = (sourceId: string, point: string, to: string, others: object = {}) => ({
  point,
  to,
  sourceId,
  volts: 0,
  current: 'ac',
  at: READ_AT,
  ...others,
});

describeRule('absence.source-not-opened', '1910.333(b)(2)(ii), (iii), (iv)(A)', [
  ['O', 'not at the plan', {}, []],
  ['O work', 'each confirmed', {}, []],
  ['O work', 'one not confirmed', { 'proof/openedSources': ['s1', 's3'] }, ['stop']],
  ['O work', 'none confirmed', { 'proof/openedSources': [] }, ['stop', 'stop', 'stop']],
  ...eachValue(['O work'], 'proof/openedSources', [gone, '', 's1'], ['open /proof/openedSources']),
  ['O work', 'others are no help', { 'proof/openedSources': ['s1', 's2', 's9'] }, ['stop']],
  ['T work', 'energized', {}, []],
  ['W work', 'energized', {}, []],
]);

const INSTRUMENT = 'absenceTest/instrument';
describeRule('absence.proximity-tester', '70E 120.6(7)', [
  ...onEach(['O', 'T', 'O work'], 'contact', {}, []),
  ...eachValue(['O', 'T', 'O work'], INSTRUMENT, ['proximity'], ['stop /absenceTest/instrument']),
  ...eachValue(['O', 'T'], INSTRUMENT, [gone, '', 'tongue'], ['open /absenceTest/instrument']),
  ['T', 'to trace a circuit', { 'job/task': 'trace circuit', [INSTRUMENT]: 'proximity' }, []],
  [
    'O',
    'to trace a circuit',
    { 'job/task': 'trace circuit', [INSTRUMENT]: 'proximity' },
    ['stop /absenceTest/instrument'],
  ],
  ...eachValue(['T'], INSTRUMENT, ['proximity', gone], [], [], { 'job/task': 'inspect' }),
  ...eachValue(['T'], INSTRUMENT, ['proximity', gone], [], ['arc.task-does-not-fit'], {
    'job/task': 'thermography',
  }),
  ...eachValue(['W'], INSTRUMENT, ['proximity', gone], []),
]);

const CATEGORY = 'absenceTest/category';
const RATED = 'absenceTest/ratedVolts';
const SERVICE = 'supply/atService';
describeRule('absence.meter-category', '1910.334(c)(3); IEC 61010', [
  ...eachValue(['O', 'T'], CATEGORY, ['III', 'IV'], []),
  ...eachValue(['O', 'T'], CATEGORY, ['II'], ['stop /absenceTest*']),
  ...eachValue(['O', 'T'], CATEGORY, [gone, '', 'V', 3], ['open /absenceTest/category']),
  ...eachValue(['O', 'T'], RATED, [208, 300, 1000], []),
  ...eachValue(['O', 'T'], RATED, [207, 120, 0], ['stop /absenceTest*']),
  ...eachValue(
    ['O', 'T'],
    RATED,
    [gone, '', NaN, -600, Infinity],
    ['open /absenceTest/ratedVolts'],
  ),
  ...eachValue(['O', 'T'], CATEGORY, ['III'], ['stop'], [], { [SERVICE]: true }),
  ...eachValue(['O', 'T'], CATEGORY, ['IV'], [], [], { [SERVICE]: true }),
  ...eachValue(['O', 'T'], RATED, [479], ['stop /absenceTest*'], ['*'], {
    'sources/1/system': '480Y/277',
  }),
  ...eachValue(['O', 'T'], RATED, [480], [], ['arc.*'], { 'sources/1/system': '480Y/277' }),
  ...['panelboard', 'switchboard', 'disconnect', 'transformer'].flatMap((equipment) =>
    eachValue(['O', 'T'], SERVICE, [gone, 'yes'], ['open'], ['arc.*'], {
      'arcFlash/equipment': equipment,
    }),
  ),
  ...eachValue(['O', 'T'], SERVICE, [gone], [], [], { 'arcFlash/equipment': 'junction box' }),
  ...eachValue(['W'], CATEGORY, ['II', gone], []),
  ...eachValue(['T'], CATEGORY, ['II', gone], [], [], { 'job/task': 'inspect' }),
]);

describeRule('absence.not-proved', '70E 120.6(7)', [
  ['O', 'not at the plan', {}, []],
  ...eachValue(
    ['O work'],
    'proof/provedBefore',
    [gone, false, 'yes'],
    ['open /proof/provedBefore'],
  ),
  ...eachValue(['O work'], 'proof/provedAfter', [gone, false, 'yes'], ['open /proof/provedAfter']),
  [
    'O work',
    'neither',
    { 'proof/provedBefore': false, 'proof/provedAfter': gone },
    ['open', '?open'],
  ],
  ['O work', 'both', {}, []],
]);

const dropped = (index: number): Edits => ({ [`proof/readings/${index}`]: gone });
describeRule('absence.pairs-missing', '70E 120.6(7); FACE 86-35', [
  ['O', 'not at the plan', {}, []],
  ['O work', 'complete', {}, []],
  ...[0, 1, 2, 3, 4, 5].map((index): RuleRow => [
    'O work',
    `reading ${index} left out`,
    dropped(index),
    ['open /proof/readings'],
  ]),
  [
    'O work',
    'a pair at each point left out',
    { ...dropped(4), ...dropped(0) },
    ['open /proof/readings', 'open /proof/readings'],
  ],
  [
    'O work',
    'one point of two',
    { 'proof/readings': zeroReadings(['A1'], ['B', 'N', 'G']) },
    ['open /proof/readings'],
  ],
  ['O work', 'a third point is asked', { 'job/pointsOfWork': 3 }, ['open /proof/readings']],
  [
    'O work',
    'a third point beside those asked',
    { 'proof/readings': zeroReadings(['A1', 'A2', 'A3'], ['B', 'N', 'G']) },
    [],
  ],
  [
    'O work',
    'a third point that is not complete',
    { [SEVENTH]: readingOf(0, { point: 'A3' }) },
    ['open /proof/readings'],
  ],
  [
    'O work',
    'none read',
    { 'proof/readings': [] },
    ['open /proof/readings', '?open /proof/readings'],
  ],
  ...eachValue(
    ['O work'],
    'proof/readings',
    [gone, '', {}],
    ['open /proof/readings', '?open /proof/readings'],
    ['absence.*'],
  ),
]);

const governing = (volts: unknown, others: object = {}): Edits => ({
  [SEVENTH]: readingOf(volts, others),
});
describeRule('absence.voltage-present', '70E 120.6', [
  ['O', 'not at the plan', {}, []],
  ['O work', 'zeros', {}, []],
  ...[50, 120, 277, -50, -400].map((volts): RuleRow => [
    'O work',
    `${volts} V`,
    governing(volts),
    ['stop /proof/readings/6*'],
  ]),
  ...[49.9, -49.9, 3].map((volts): RuleRow => [
    'O work',
    `${volts} V`,
    governing(volts),
    [],
    ['absence.stray-voltage'],
  ]),
  ['O work', 'direct current', governing(60, { current: 'dc' }), ['stop /proof/readings/6*']],
  [
    'O work',
    'outside the window',
    governing(120, { at: '2026-12-01T07:59:00-06:00' }),
    ['stop /proof/readings/6*'],
  ],
  ['O work', 'without a point', governing(120, { point: gone }), ['stop /proof/readings/6*']],
  [
    'O work',
    'two pairs',
    { ...governing(120), 'proof/readings/7': readingOf(120, { point: 'A2' }) },
    ['stop', 'stop'],
  ],
]);

describeRule('absence.stray-voltage', '1910.333(b)(2)(iv)(B); 3 V common practice', [
  ['O', 'not at the plan', {}, []],
  ...[3.1, 24, 49.9, -3.1, -49.9].map((volts): RuleRow => [
    'O work',
    `${volts} V`,
    governing(volts),
    ['stop /proof/readings/6*'],
  ]),
  ...[0, 3, -3].map((volts): RuleRow => ['O work', `${volts} V`, governing(volts), []]),
  ['O work', '50 V', governing(50), [], ['absence.voltage-present']],
]);

const CONTROLS = 'proof/controlsOperated';
describeRule('absence.controls-not-operated', '1910.333(b)(2)(iv)(A); FACE 04WA080', [
  ['O', 'not at the plan', {}, []],
  ...eachValue(['O work'], CONTROLS, [true], []),
  ...eachValue(['O work'], CONTROLS, [false], ['stop /proof/controlsOperated']),
  ...eachValue(['O work'], CONTROLS, [gone, '', 'yes'], ['open /proof/controlsOperated']),
]);

const withHot = (points: unknown, ...readings: object[]): Edits => ({
  ...OPENED,
  'sources/3': { ...UNSWITCHED_HOT, points },
  ...Object.fromEntries(readings.map((entry, index) => [`proof/readings/${6 + index}`, entry])),
});
describeRule('absence.source-not-tested', '1910.333(b)(2)(iv)(B); 70E 120.6(7)', [
  ['O', 'not at the plan', withHot(['A1']), []],
  [
    'O work',
    'read to ground and to the phase',
    withHot(['A1'], ofSource('h1', 'A1', 'G'), ofSource('h1', 'A1', 'B')),
    [],
  ],
  ['O work', 'not read', withHot(['A1']), ['open']],
  ['O work', 'not to the phase', withHot(['A1'], ofSource('h1', 'A1', 'G')), ['open']],
  ['O work', 'not to ground', withHot(['A1'], ofSource('h1', 'A1', 'B')), ['open']],
  [
    'O work',
    'to another phase letter',
    withHot(['A1'], ofSource('h1', 'A1', 'G'), ofSource('h1', 'A1', 'A')),
    ['open'],
    ['absence.pairs-missing'],
  ],
  [
    'O work',
    'under another id',
    withHot(['A1'], ofSource('h9', 'A1', 'G'), ofSource('h9', 'A1', 'B')),
    ['open'],
  ],
  [
    'O work',
    'at another point',
    withHot(['A2'], ofSource('h1', 'A1', 'G'), ofSource('h1', 'A1', 'B')),
    ['open'],
  ],
  ...[gone, []].map((points): RuleRow => [
    'O work',
    `points ${JSON.stringify(points)}: all of them`,
    withHot(points, ofSource('h1', 'A1', 'G'), ofSource('h1', 'A1', 'B')),
    ['open'],
  ]),
  [
    'O work',
    'at all points',
    withHot(
      gone,
      ofSource('h1', 'A1', 'G'),
      ofSource('h1', 'A1', 'B'),
      ofSource('h1', 'A2', 'G'),
      ofSource('h1', 'A2', 'B'),
    ),
    [],
  ],
  [
    'O work',
    'direct current is no proof',
    withHot(
      ['A1'],
      ofSource('h1', 'A1', 'G', { current: 'dc' }),
      ofSource('h1', 'A1', 'B', { current: 'dc' }),
    ),
    ['open'],
  ],
  [
    'O work',
    'the same conductors',
    { ...OPENED, 'sources/3': { ...UNSWITCHED_HOT, sameConductorsAs: 's1' } },
    [],
  ],
  [
    'O work',
    "live: the source's own reading counts",
    withHot(['A1'], ofSource('h1', 'A1', 'G', { volts: 120 }), ofSource('h1', 'A1', 'B')),
    [],
    ['absence.voltage-present'],
  ],
]);

const withBattery = (...readings: object[]): Edits => ({
  ...OPENED,
  'sources/3': { ...BATTERY_UNIT, points: ['A1'] },
  'proof/readings/6': ofSource('b1', 'A1', 'G'),
  'proof/readings/7': ofSource('b1', 'A1', 'B'),
  ...Object.fromEntries(readings.map((entry, index) => [`proof/readings/${8 + index}`, entry])),
});
const DIRECT = ofSource('b1', 'A1', 'G', { current: 'dc' });
describeRule('absence.dc-not-tested', 'common practice; 1910.333(b)(2)(iv)(B)', [
  ['O', 'not at the plan', withBattery(), []],
  ['O work', 'read', withBattery(DIRECT), []],
  ['O work', 'not read', withBattery(), ['open']],
  ['O work', 'read at another point', withBattery({ ...DIRECT, point: 'A2' }), ['open']],
  ['O work', 'no battery and no inverter', {}, []],
  [
    'O work',
    'a unit that reaches all points, read at one',
    {
      ...withBattery(DIRECT),
      'sources/3/points': gone,
      'proof/readings/9': ofSource('b1', 'A2', 'G'),
      'proof/readings/10': ofSource('b1', 'A2', 'B'),
    },
    ['open'],
  ],
  [
    'O work',
    'a central inverter',
    {
      'proof/openedSources/3': 'i1',
      'sources/3': {
        ...UNSWITCHED_HOT,
        id: 'i1',
        kind: 'central inverter',
        sameConductorsAs: 's1',
      },
    },
    ['open'],
  ],
  [
    'O work',
    'a central inverter, read',
    {
      'proof/openedSources/3': 'i1',
      'sources/3': {
        ...UNSWITCHED_HOT,
        id: 'i1',
        kind: 'central inverter',
        sameConductorsAs: 's1',
      },
      'proof/readings/6': ofSource('i1', 'A1', 'G', { current: 'dc', from: 'B' }),
    },
    [],
  ],
]);

const LEADS = 'absenceTest/leadsInspected';
describeRule('absence.leads-not-inspected', '1910.334(c)(2), (3)', [
  ...eachValue(['O', 'T'], LEADS, [true], []),
  ...eachValue(['O', 'T'], LEADS, [false, gone, 'yes'], ['open /absenceTest/leadsInspected']),
  ...eachValue(['W'], LEADS, [false, gone], []),
  ...eachValue(['T'], LEADS, [false, gone], [], [], { 'job/task': 'inspect' }),
]);
