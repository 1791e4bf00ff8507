import { BATTERY_UNIT, UNSWITCHED_HOT, readingOf } from '../../support/ruleEdits';
import type { Edits, RuleRow } from '../../support/ruleTable';
import { describeRule, gone } from '../../support/ruleTable';
import { soundWorksheet, zeroReadings } from '../../support/soundWorksheet';

/** Beside the six of the sound worksheet, all at 0 V. */
const added = (...readings: object[]): Edits =>
  Object.fromEntries(readings.map((entry, index) => [`proof/readings/${6 + index}`, entry]));
const live = (title: string, readings: object[], indexes: number[], also?: string[]): RuleRow => [
  'O work',
  title,
  added(...readings),
  indexes.map((index) => `stop /proof/readings/${index}`),
  also,
];

describeRule('absence.voltage-present', 'what was read stays on record, however incomplete', [
  live('the same pair twice: the first of the highest', [readingOf(120), readingOf(120)], [6]),
  live('the same pair twice: the higher', [readingOf(120), readingOf(-121)], [7]),
  live('a reading without a voltage hides none', [readingOf(gone), readingOf(120)], [7]),
  live(
    'two that do not say where',
    [readingOf(120, { point: gone }), readingOf(60, { point: gone })],
    [6, 7],
  ),
  live(
    'two that do not say to what',
    [readingOf(120, { to: gone }), readingOf(60, { to: gone })],
    [6, 7],
  ),
  live(
    'two that do not say from what',
    [readingOf(120, { from: gone }), readingOf(60, { from: gone })],
    [6, 7],
  ),
  live('in the order of the record', [readingOf(60, { point: gone }), readingOf(120)], [6, 7]),
]);

const spaced = zeroReadings([' A1', 'A2 '], ['B', 'N', 'G']);
describeRule('absence.pairs-missing', 'a point has one name, spaces or not', [
  ['O work', 'spaces around the names', { 'proof/readings': spaced }, []],
]);

const own = (to: string, others: object = {}) => ({
  ...readingOf(0, { from: gone, sourceId: 'h1', to }),
  ...others,
});
const withHot = (source: object, ...readings: object[]): Edits => ({
  'sources/3': { ...UNSWITCHED_HOT, ...source },
  'proof/openedSources': ['s1', 's2', 's3', 'h1'],
  ...added(...readings),
});
describeRule('absence.source-not-tested', "a source's own conductor is one end", [
  ['O work', 'spaces around its point', withHot({ points: [' A1 '] }, own('G'), own('B')), []],
  [
    'O work',
    'a pair of the circuit under its id',
    withHot({}, own('G', { from: 'N' }), own('B', { from: 'N' })),
    ['open'],
  ],
  ['O work', 'a source without an id is read nowhere', withHot({ id: gone }), ['open'], ['*']],
]);

describeRule('absence.dc-not-tested', 'common practice; 1910.333(b)(2)(iv)(B)', [
  [
    'O work',
    'a battery without an id is read nowhere',
    {
      'sources/3': { ...BATTERY_UNIT, id: gone, points: ['A1'] },
      ...added(readingOf(0, { current: 'dc' })),
    },
    ['open'],
    ['*'],
  ],
]);

const { crew } = soundWorksheet().content;
const AGAIN = { id: 'c1', name: 'Another', closest: 'outside all boundaries' };
const testedBy = (id: unknown, others: Edits = {}): Edits => ({
  'absenceTest/byCrewId': id,
  ...others,
});
const BY = '/absenceTest/byCrewId';
describeRule('sources.by-unqualified', '29 CFR 1910.334(c)(1), 1910.333(b)(2)(iv)(B)', [
  ['T', 'of the crew, qualified', testedBy('c1'), []],
  ['T', 'of the crew, not qualified', testedBy('c2'), [`stop ${BY}`], ['*']],
  ['T', 'nobody of the crew', testedBy('c9'), [`stop ${BY}`], ['*']],
  [
    'T',
    'a crew whose member lacks an id',
    testedBy('c9', { 'crew/1/id': gone }),
    [`open ${BY}`],
    ['*'],
  ],
  ['T', 'a crew that is not answered', testedBy('c9', { crew: gone }), [`open ${BY}`], ['*']],
  [
    'T',
    'two of one id, one not qualified',
    testedBy('c1', { crew: [...(crew ?? []), { ...AGAIN, qualified: false }] }),
    [`stop ${BY}`],
    ['*'],
  ],
  [
    'T',
    'two of one id, one who has not said',
    testedBy('c1', { crew: [...(crew ?? []), AGAIN] }),
    [`open ${BY}`],
    ['*'],
  ],
]);
