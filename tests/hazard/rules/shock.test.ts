import { BELOW_FIFTY, FAR, GLOVE_SET, SECOND_QUALIFIED } from '../../support/ruleEdits';
import type { Edits, RuleRow } from '../../support/ruleTable';
import { ALL, describeRule, eachValue, ENERGIZED, gone, onEach } from '../../support/ruleTable';

const GLOVES = 'protectiveEquipment/gloves';

describeRule('shock.unqualified-inside', '70E 130.4', [
  ...onEach(ALL, 'the helper stays outside', {}, []),
  ...eachValue(ALL, 'crew/1/closest', ['outside limited'], [], [], { 'crew/1/arcRated': true }),
  ...eachValue(
    ALL,
    'crew/1/closest',
    ['restricted', 'limited'],
    ['stop /crew/1*'],
    ['shock.*', 'arc.*', 'crew.*'],
  ),
  ...onEach(
    ALL,
    'escorted by the lead',
    { 'crew/1/closest': 'limited with escort', 'crew/1/arcRated': true },
    [],
    ['shock.escort-is-working'],
  ),
  ...onEach(
    ALL,
    'nobody qualified is there to escort',
    { 'crew/1/closest': 'limited with escort', 'crew/1/arcRated': true, 'crew/0/qualified': false },
    ['stop', 'stop'],
    ['*'],
  ),
  ...onEach(
    ALL,
    'qualified',
    { ...SECOND_QUALIFIED, 'crew/1/closest': 'limited', 'crew/1/arcRated': true },
    [],
  ),
  ...onEach(
    ALL,
    'training lapsed',
    {
      ...SECOND_QUALIFIED,
      'crew/1/qualifiedThrough': '2026-11-30',
      'crew/1/closest': 'limited',
      'crew/1/arcRated': true,
    },
    ['stop /crew/1*'],
    ['crew.training-lapsed'],
  ),
  ...onEach(
    ALL,
    'qualified is not answered',
    { 'crew/1/qualified': gone, 'crew/1/closest': 'limited', 'crew/1/arcRated': true },
    ['open /crew/1*'],
    ['crew.*'],
  ),
  ...onEach(
    ALL,
    'qualifiedThrough is not answered',
    { 'crew/1/qualified': true, 'crew/1/closest': 'limited', 'crew/1/arcRated': true },
    ['open /crew/1*'],
    ['crew.*'],
  ),
  [
    'O',
    'who tests counts as restricted',
    { 'absenceTest/byCrewId': 'c2' },
    ['stop /crew/1*'],
    ['*'],
  ],
  [
    'T',
    'who tests counts as restricted',
    { 'absenceTest/byCrewId': 'c2' },
    ['stop /crew/1*'],
    ['*'],
  ],
  ['W', 'below 50 V', { ...BELOW_FIFTY, 'crew/1/closest': 'restricted' }, []],
]);

describeRule('shock.gloves-missing', '1910.137, 1910.335(a)(1)', [
  ...onEach(ALL, 'one set for one person', {}, []),
  ...eachValue(ALL, GLOVES, [gone, 'x'], ['open'], ['shock.gloves-*']),
  ...onEach(ALL, 'the set in the crew', { [GLOVES]: gone, 'crew/0/gloves': GLOVE_SET }, []),
  ...onEach(
    ALL,
    'two inside, one set',
    { ...SECOND_QUALIFIED, 'crew/1/closest': 'restricted', 'crew/1/arcRated': true },
    ['stop'],
    ['crew.rescue-untrained'],
  ),
  ...onEach(
    ALL,
    'two inside, a set of the crew and a shared one',
    {
      ...SECOND_QUALIFIED,
      'crew/1/closest': 'restricted',
      'crew/1/arcRated': true,
      'crew/1/gloves': GLOVE_SET,
    },
    [],
    ['crew.rescue-untrained'],
  ),
  ...onEach(
    ALL,
    'two inside, only the helper has a set',
    {
      ...SECOND_QUALIFIED,
      'crew/1/closest': 'restricted',
      'crew/1/arcRated': true,
      'crew/1/gloves': GLOVE_SET,
      [GLOVES]: gone,
    },
    ['stop'],
    ['crew.rescue-untrained'],
  ),
  ['T', 'nobody inside', { ...FAR, [GLOVES]: gone }, []],
  ['W', 'below 50 V', { ...BELOW_FIFTY, [GLOVES]: gone }, []],
]);

describeRule('shock.gloves-class', '1910.137 Table I-4', [
  ...eachValue(ALL, `${GLOVES}/gloveClass`, ['00', '0', '1', '2', '3', '4'], []),
  ...eachValue(ALL, `${GLOVES}/gloveClass`, [gone, '', '5', 0], ['open']),
  ...eachValue(ALL, `${GLOVES}/gloveClass`, ['00'], ['stop'], ['*'], {
    'supply/circuitVolts': 501,
  }),
  ...eachValue(ALL, `${GLOVES}/gloveClass`, ['0'], [], ['supply.*', 'arc.*', 'absence.*'], {
    'supply/circuitVolts': 501,
  }),
  ...eachValue(ALL, `${GLOVES}/gloveClass`, ['4'], ['stop'], ['*'], {
    'supply/circuitVolts': 36_001,
  }),
  ['T', 'nobody inside', { ...FAR, [`${GLOVES}/gloveClass`]: gone }, []],
  ['W', 'below 50 V', { ...BELOW_FIFTY, [`${GLOVES}/gloveClass`]: gone }, []],
]);

const dates = (lastTestedOn: unknown, issuedOn?: unknown): Edits => ({
  [`${GLOVES}/lastTestedOn`]: lastTestedOn,
  [`${GLOVES}/issuedOn`]: issuedOn,
});
describeRule('shock.gloves-overdue', '1910.137 Table I-5', [
  ...onEach(ALL, 'due today', dates('2026-06-01'), []),
  ...onEach(ALL, 'due yesterday', dates('2026-05-31'), ['stop']),
  ...onEach(ALL, 'issued before the test', dates('2026-06-01', '2026-05-01'), []),
  ...onEach(ALL, 'issued six months ago, tested before', dates('2026-01-15', '2026-06-01'), []),
  ...onEach(ALL, 'issued more than six months ago', dates('2026-01-15', '2026-05-31'), ['stop']),
  ...onEach(ALL, 'tested twelve months ago, issued since', dates('2025-12-01', '2026-11-01'), []),
  ...onEach(ALL, 'tested more than twelve months ago', dates('2025-11-30', '2026-11-01'), ['stop']),
  ...onEach(
    ALL,
    'issued more than twelve months after the test',
    dates('2025-10-01', '2026-10-02'),
    ['stop'],
  ),
  ...onEach(ALL, 'tested today', dates('2026-12-01'), []),
  ...onEach(ALL, 'tested tomorrow', dates('2026-12-02'), ['stop']),
  ...onEach(ALL, 'issued tomorrow', dates('2026-11-01', '2026-12-02'), ['stop']),
  ...[gone, '', '2026-13-01', '2026-02-30', 20260901].map((date): RuleRow => [
    'O',
    `tested ${String(date)}`,
    dates(date, '2026-08-01'),
    ['open'],
  ]),
  ['O', 'no issue date is no gap', dates('2026-09-01', gone), []],
  ['T', 'nobody inside', { ...FAR, ...dates('2020-01-01') }, []],
  [
    'O',
    "the crew's own set",
    { [GLOVES]: gone, 'crew/0/gloves': { ...GLOVE_SET, lastTestedOn: '2025-10-01' } },
    ['stop /crew/0/gloves*'],
  ],
]);

describeRule('shock.gloves-not-air-tested', '1910.137(c)(2)(ii)', [
  ...eachValue(ALL, `${GLOVES}/airTested`, [true], []),
  ...eachValue(ALL, `${GLOVES}/airTested`, [false, gone, 'yes'], ['open']),
  ['T', 'nobody inside', { ...FAR, [`${GLOVES}/airTested`]: gone }, []],
]);

describeRule('shock.gloves-no-protectors', '1910.137(c)(2)(vii)', [
  ...eachValue(ALL, `${GLOVES}/leatherProtectors`, [true], []),
  ...eachValue(ALL, `${GLOVES}/leatherProtectors`, [false], ['stop']),
  ...eachValue(ALL, `${GLOVES}/leatherProtectors`, [gone, '', 'yes'], ['open']),
  ['T', 'nobody inside', { ...FAR, [`${GLOVES}/leatherProtectors`]: false }, []],
]);

const SURFACES = 'surroundings/groundedSurfaces';
describeRule('shock.grounded-surface', '1910.333(a)(2), 1910.335(a)(2)(ii); FACE 95-NJ-080', [
  ...onEach(ALL, 'covered', { [SURFACES]: [{ kind: 'duct', inReach: true, covered: true }] }, []),
  ...onEach(
    ['O', 'T'],
    'kept clear',
    { [SURFACES]: [{ kind: 'duct', inReach: true, keptClear: true }] },
    [],
  ),
  [
    'W',
    'kept clear is not enough',
    { [SURFACES]: [{ kind: 'duct', inReach: true, keptClear: true }] },
    ['stop /surroundings/groundedSurfaces/0*'],
  ],
  ...onEach(ALL, 'neither', { [SURFACES]: [{ kind: 'duct', inReach: true }] }, [
    'stop /surroundings/groundedSurfaces/0*',
  ]),
  ...onEach(
    ALL,
    'both said not',
    { [SURFACES]: [{ kind: 'duct', inReach: true, covered: false, keptClear: false }] },
    ['stop'],
  ),
  ...onEach(ALL, 'out of reach', { [SURFACES]: [{ kind: 'duct', inReach: false }] }, []),
  ...onEach(ALL, '{} is in reach and uncovered', { [SURFACES]: [{}] }, [
    'stop /surroundings/groundedSurfaces/0*',
  ]),
  ...onEach(ALL, 'looked, none', { [SURFACES]: [] }, []),
  ...eachValue(ALL, SURFACES, [gone, '', {}], ['open /surroundings/groundedSurfaces']),
  ...onEach(ALL, 'what is no surface counts as {}', { [SURFACES]: [{ inReach: false }, 5] }, [
    'stop /surroundings/groundedSurfaces/1*',
  ]),
  ...onEach(
    ALL,
    'the second of three',
    { [SURFACES]: [{ inReach: false }, { inReach: true }, { covered: true }] },
    ['stop /surroundings/groundedSurfaces/1*'],
  ),
  ...eachValue(
    ['W'],
    'surroundings/lift',
    [
      gone,
      { fallProtection: true, operatorTrained: true },
      { fallProtection: true, operatorTrained: true, insulating: false },
    ],
    ['stop /surroundings/access'],
    ['surroundings.lift-unsafe'],
    {
      'surroundings/access': 'lift',
      'surroundings/ladder': gone,
    },
  ),
  [
    'W',
    'an insulating lift',
    {
      'surroundings/access': 'lift',
      'surroundings/lift': { fallProtection: true, operatorTrained: true, insulating: true },
    },
    [],
  ],
  ...onEach(
    ['O', 'T'],
    'any lift',
    {
      'surroundings/access': 'lift',
      'surroundings/lift': { fallProtection: true, operatorTrained: true },
    },
    [],
  ),
  ['W', 'below 50 V', { ...BELOW_FIFTY, [SURFACES]: [{}] }, []],
]);

const ARTICLES = 'surroundings/conductiveArticlesRemoved';
describeRule('shock.conductive-articles', '1910.333(c)(8)', [
  ...eachValue(ALL, ARTICLES, [true], []),
  ...eachValue(ALL, ARTICLES, [false], ['stop /surroundings/conductiveArticlesRemoved']),
  ...eachValue(ALL, ARTICLES, [gone, '', 'yes'], ['open /surroundings/conductiveArticlesRemoved']),
  ['W', 'below 50 V', { ...BELOW_FIFTY, [ARTICLES]: false }, []],
]);

const ESCORTED: Edits = { 'crew/1/closest': 'limited with escort', 'crew/1/arcRated': true };
const THIRD = {
  id: 'c3',
  name: 'Second lead',
  lead: false,
  qualified: true,
  qualifiedThrough: '2028-01-01',
  closest: 'limited',
  arcRated: true,
  rescueTrained: true,
  worksOnCircuit: false,
};
describeRule('shock.escort-is-working', '70E 130.4; own reading', [
  ...onEach(ENERGIZED, 'the only qualified person is restricted', ESCORTED, ['stop']),
  ['O', 'the only qualified person is restricted', ESCORTED, ['caution']],
  ...onEach(ALL, 'another qualified person is not', { ...ESCORTED, 'crew/2': THIRD }, []),
  ...onEach(
    ENERGIZED,
    'both qualified are',
    { ...ESCORTED, 'crew/2': { ...THIRD, closest: 'restricted', gloves: GLOVE_SET } },
    ['stop'],
  ),
  ...onEach(ALL, 'nobody is escorted', {}, []),
  ['W', 'below 50 V', { ...BELOW_FIFTY, ...ESCORTED }, []],
]);
