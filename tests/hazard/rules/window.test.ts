import type { Edits, RuleRow } from '../../support/ruleTable';
import { ALL, describeRule, eachValue, ENERGIZED, gone, onEach } from '../../support/ruleTable';

const STARTS = 'job/startsAt';
const ENDS = 'job/endsAt';
const between = (startsAt: unknown, endsAt: unknown, others: Edits = {}): Edits => ({
  [STARTS]: startsAt,
  [ENDS]: endsAt,
  // The permit of the energized base must last as long as the window.
  'decision/permit/validUntil': '2027-06-01T00:00:00Z',
  ...others,
});

describeRule('window.too-long', 'own policy', [
  ...onEach(ALL, '12 h', between('2026-12-01T08:00:00-06:00', '2026-12-01T20:00:00-06:00'), []),
  ...onEach(
    ALL,
    '12 h and a second',
    between('2026-12-01T08:00:00-06:00', '2026-12-01T20:00:01-06:00'),
    ['stop'],
  ),
  ...onEach(
    ALL,
    'as instants, another offset',
    between('2026-12-01T08:00:00-06:00', '2026-12-01T20:00:00-05:00'),
    [],
  ),
  ...onEach(
    ALL,
    'as instants, 13 h that look like 12',
    between('2026-12-01T08:00:00-05:00', '2026-12-01T20:00:00-06:00'),
    ['stop'],
  ),
  [
    'O',
    'the night the clocks go back: 00:00 to 11:00 is 12 h',
    between('2026-11-01T00:00:00-05:00', '2026-11-01T11:00:00-06:00', {
      on: '2026-11-01T00:00:00-05:00',
    }),
    [],
  ],
  [
    'O',
    'the night the clocks go back: 00:00 to 12:00 is 13 h',
    between('2026-11-01T00:00:00-05:00', '2026-11-01T12:00:00-06:00', {
      on: '2026-11-01T00:00:00-05:00',
    }),
    ['stop'],
  ],
  [
    'O',
    'the night the clocks go on: 00:00 to 13:00 is 12 h',
    between('2027-03-14T00:00:00-06:00', '2027-03-14T13:00:00-05:00', {
      on: '2027-03-14T00:00:00-06:00',
      'protectiveEquipment/gloves/lastTestedOn': '2027-01-01',
    }),
    [],
  ],
]);

describeRule('window.reversed', 'own policy', [
  ...onEach(ALL, 'in order', {}, []),
  ...onEach(
    ALL,
    'no time at all',
    between('2026-12-01T12:00:00-06:00', '2026-12-01T12:00:00-06:00'),
    ['stop'],
  ),
  ...onEach(
    ALL,
    'the same instant, another offset',
    between('2026-12-01T12:00:00-06:00', '2026-12-01T13:00:00-05:00'),
    ['stop'],
  ),
  ...onEach(ALL, 'reversed', between('2026-12-01T13:00:00-06:00', '2026-12-01T12:00:00-06:00'), [
    'stop',
  ]),
]);

describeRule('window.over', 'own policy', [
  ...onEach(ALL, 'not yet', {}, []),
  ...onEach(
    ALL,
    'the last moment',
    between('2026-12-01T08:00:00-06:00', '2026-12-01T09:00:00-06:00'),
    [],
  ),
  ...onEach(
    ALL,
    'a second ago',
    between('2026-12-01T08:00:00-06:00', '2026-12-01T08:59:59-06:00'),
    ['stop'],
  ),
  ...onEach(ALL, 'as instants', between('2026-12-01T07:00:00-06:00', '2026-12-01T09:30:00-05:00'), [
    'stop',
  ]),
  [
    'O work',
    'at work too',
    between('2026-12-01T08:00:00-06:00', '2026-12-01T08:59:59-06:00'),
    ['stop'],
  ],
  ['O close', 'a late worksheet can be closed', { on: '2026-12-09T08:00:00-06:00' }, []],
]);

const NOT_A_TIME = [gone, '', 'noon', '2026-12-01', '2026-12-01T12:00:00', 20261201];
describeRule('window.reversed', 'a time that is not answered is open', [
  ...eachValue(
    ['O', 'T'],
    ENDS,
    NOT_A_TIME,
    ['?open /job/endsAt'],
    [
      'window.*',
      'job.unanswered',
      'shock.gloves-overdue',
      'crew.*',
      'sources.by-unqualified',
      'shock.*',
      'arc.*',
    ],
  ),
  ...eachValue(
    ['O', 'T', 'W'],
    STARTS,
    NOT_A_TIME,
    ['?open /job/startsAt'],
    ['window.*', 'job.unanswered'],
  ),
]);

const CROSSES = 'job/crossesShift';
describeRule('window.shift-change', '1910.147(f)(4); 1910.333(b)(2)(iii)(E)(2)', [
  ...eachValue(['O'], CROSSES, [false], []),
  ...eachValue(['O'], CROSSES, [gone, '', 'no'], ['open /job/crossesShift']),
  ...eachValue(['O'], 'job/handover', ['The evening lead'], [], [], { [CROSSES]: true }),
  ...eachValue(['O'], 'job/handover', [gone, '', 5], ['open /job/handover'], [], {
    [CROSSES]: true,
  }),
  ...ENERGIZED.flatMap((base): RuleRow[] => eachValue([base], CROSSES, [true, gone], [])),
]);
