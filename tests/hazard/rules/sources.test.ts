import { JOB_TASKS } from '@/hazard';
import { BATTERY_UNIT, HELD_BY_LEAD } from '../../support/ruleEdits';
import type { Base, Edits, RuleRow } from '../../support/ruleTable';
import { ALL, describeRule, eachValue, ENERGIZED, gone, onEach } from '../../support/ruleTable';
import { zeroReadings } from '../../support/soundWorksheet';

const INVERTER = {
  id: 'i1',
  kind: 'central inverter',
  from: 'Inverter room',
  sameConductorsAs: 's1',
  ...HELD_BY_LEAD,
};
const CONTROL = {
  id: 'k1',
  kind: 'control',
  from: 'LC-2',
  sameConductorsAs: 's1',
  ...HELD_BY_LEAD,
};
const SHARED_NEUTRAL = {
  id: 'n1',
  kind: 'shared neutral',
  from: 'LA-1 ckt 9, 11',
  sameConductorsAs: 's1',
  allPhasesOpened: true,
  ...HELD_BY_LEAD,
};
/** One source only, and nothing that asks for another. */
const ALONE: Edits = {
  'sources/2': gone,
  'sources/1': gone,
  egressSupply: ['none after checking'],
  'supply/switching': ['one place'],
};

describeRule('sources.none', '70E 120.6(1); 1910.333(b)(2)(ii)(B)', [
  ...eachValue(ALL, 'sources', [gone, [], 'x', {}], ['open /sources'], ['sources.*', 'absence.*']),
  ...onEach(ALL, 'one source', ALONE, []),
]);

describeRule('sources.egress-unknown', 'common practice; NEC 700; FACE 04WA080', [
  ...eachValue(ALL, 'egressSupply', [['none after checking'], ['generator']], []),
  ...eachValue(
    ALL,
    'egressSupply',
    [['unknown'], ['generator', 'unknown']],
    ['stop /egressSupply*'],
  ),
  ...eachValue(
    ALL,
    'egressSupply',
    [gone, [], '', 'generator', ['moon']],
    ['open /egressSupply*'],
    ['sources.egress-not-listed', 'surroundings.egress-dark'],
  ),
  ...eachValue(
    ALL,
    'egressSupply',
    [['none after checking', 'generator']],
    ['open /egressSupply*'],
  ),
  ...eachValue(
    ALL,
    'egressSupply',
    [
      ['unknown', 'moon'],
      ['none after checking', 'unknown'],
    ],
    ['?open /egressSupply*', 'stop /egressSupply*', '?open /egressSupply*'],
    ['sources.egress-not-listed', 'surroundings.egress-dark'],
  ),
  ...JOB_TASKS.map((task): RuleRow => [
    'O',
    `asked for ${task}`,
    { 'job/task': task, egressSupply: gone },
    ['open /egressSupply'],
    ['*'],
  ]),
]);

describeRule('sources.egress-not-listed', 'common practice; FACE 04WA080', [
  ...onEach(ALL, 'listed', {}, []),
  ...onEach(ALL, 'generator not listed', { 'sources/1': gone }, ['stop']),
  ...onEach(ALL, 'another kind is listed', { egressSupply: ['central inverter'] }, ['stop']),
  ...onEach(ALL, 'battery units not listed', { egressSupply: ['battery units'] }, ['stop']),
  ...onEach(
    ALL,
    'two kinds, neither listed',
    { egressSupply: ['battery units', 'central inverter'] },
    ['stop', 'stop'],
  ),
  ...onEach(
    ALL,
    'battery unit listed',
    { egressSupply: ['battery units'], 'sources/3': BATTERY_UNIT },
    [],
    ['surroundings.*'],
  ),
  ...onEach(
    ALL,
    'other equipment only',
    { egressSupply: ['battery units'], egressReaches: 'other equipment only, checked' },
    [],
  ),
  ...eachValue(ALL, 'egressReaches', [gone, '', 'nowhere'], ['stop'], [], {
    egressSupply: ['battery units'],
  }),
  ...onEach(ALL, 'none after checking', { egressSupply: ['none after checking'] }, []),
  ...onEach(ALL, 'sources not answered', { sources: gone }, ['open'], ['sources.*', 'absence.*']),
  ...onEach(ALL, 'no source in the list', { sources: [] }, ['stop'], ['sources.*', 'absence.*']),
  ...eachValue(ALL, 'sources/2/kind', [gone, 'moon'], ['open'], ['sources.*'], {
    egressSupply: ['battery units'],
  }),
  ...onEach(
    ALL,
    'a foreign member of the list does not hide it',
    { egressSupply: ['moon', 'battery units'] },
    ['stop'],
    ['sources.egress-unknown'],
  ),
]);

describeRule('sources.switch-only', 'own policy on 1910.333(b)(2)(ii)(B); FACE 04WA080', [
  ...[0, 1, 2].flatMap((index) =>
    eachValue(
      ['O', 'O work'],
      `sources/${index}/openedAt`,
      ['wall switch', 'control device'],
      [`stop /sources/${index}/openedAt`],
    ),
  ),
  ...eachValue(
    ['O'],
    'sources/0/openedAt',
    ['breaker', 'feeder breaker', 'disconnect', 'luminaire disconnect', 'fuse', 'plug'],
    [],
  ),
  ...eachValue(ENERGIZED, 'sources/0/openedAt', ['wall switch', 'control device'], []),
]);

describeRule('sources.not-opened', '1910.333(b)(2)(ii)(B)', [
  ...onEach(['O'], 'opened', {}, []),
  ...eachValue(['O'], 'sources/1/openedAt', ['none'], ['stop /sources/1/openedAt']),
  ...eachValue(
    ['O'],
    'sources/1/openedAt',
    [gone, '', 'axe', 3],
    ['open /sources/1/openedAt'],
    ['sources.*'],
  ),
  ...eachValue(ENERGIZED, 'sources/1/openedAt', ['none', gone], []),
  [
    'O',
    'a battery unit never',
    { 'sources/3': { ...BATTERY_UNIT, openedAt: 'none' } },
    [],
    ['sources.*'],
  ],
  [
    'O',
    'a battery unit never, unanswered',
    { 'sources/3': { ...BATTERY_UNIT, openedAt: gone } },
    [],
    ['sources.*'],
  ],
  [
    'O',
    'nobody is asked for a lock on it yet',
    {
      'crew/1/worksOnCircuit': true,
      'sources/0/openedAt': gone,
      'sources/0/lockedBy': [],
      'sources/1/lockedBy': ['c1', 'c2'],
      'sources/2/lockedBy': ['c1', 'c2'],
    },
    ['open /sources/0/openedAt'],
  ],
  [
    'O',
    'two of them',
    { 'sources/0/openedAt': 'none', 'sources/2/openedAt': 'none' },
    ['stop /sources/0/openedAt', 'stop /sources/2/openedAt'],
  ],
]);

const unlocked: Edits = { 'sources/0/lockNumber': gone };
describeRule('sources.not-locked', '1910.333(b)(2)(iii)', [
  ...onEach(['O'], 'lock and tag', {}, []),
  ...eachValue(['O'], 'sources/1/held', ['none'], ['stop /sources/1/held']),
  ...eachValue(['O'], 'sources/1/held', [gone, '', 'string', true], ['open /sources/1/held']),
  ...eachValue(['O'], 'sources/0/lockNumber', [gone, '', 12], ['open /sources/0/lockNumber']),
  ...eachValue(['O'], 'sources/0/lockNumber', [gone, ''], ['open /sources/0/lockNumber'], [], {
    ...ALONE,
    'sources/0/held': 'lock',
  }),
  ['O', 'a tag alone', { ...unlocked, 'sources/0/held': 'tag' }, ['stop /sources/0/*']],
  ...eachValue(
    ['O'],
    'sources/0/extraMeasure',
    ['isolating element removed', 'controlling switch blocked', 'extra disconnect opened'],
    [],
    [],
    {
      ...unlocked,
      'sources/0/held': 'tag',
    },
  ),
  ...eachValue(['O'], 'sources/0/extraMeasure', ['prayer', '', 4], ['stop /sources/0/*'], [], {
    ...unlocked,
    'sources/0/held': 'tag',
  }),
  [
    'O',
    'a lock without tag, one opened device, one shift',
    { ...ALONE, 'sources/0/held': 'lock' },
    [],
  ],
  [
    'O',
    'a lock without tag, a second opened source',
    { ...ALONE, 'sources/0/held': 'lock', 'sources/1': { ...CONTROL } },
    ['stop /sources/0/held'],
  ],
  [
    'O',
    'a lock without tag, the second is not opened',
    { ...ALONE, 'sources/0/held': 'lock', 'sources/1': { ...CONTROL, openedAt: 'none' } },
    [],
    ['sources.not-opened'],
  ],
  [
    'O',
    'a lock without tag over two shifts',
    {
      ...ALONE,
      'sources/0/held': 'lock',
      'job/crossesShift': true,
      'job/handover': 'The evening lead',
    },
    ['stop /sources/0/held'],
  ],
  [
    'O',
    'each source of three',
    { 'sources/0/held': 'lock', 'sources/1/held': 'lock', 'sources/2/held': 'lock' },
    ['stop /sources/0/held', 'stop /sources/1/held', 'stop /sources/2/held'],
  ],
  ...eachValue(['O'], 'sources/0/openedAt', ['plug'], [], [], {
    ...unlocked,
    'sources/0/held': 'exclusive control',
  }),
  ['O', 'exclusive control of a battery connector', { 'sources/3': BATTERY_UNIT }, []],
  ...eachValue(
    ['O'],
    'sources/0/openedAt',
    ['breaker', 'feeder breaker', 'disconnect', 'luminaire disconnect', 'fuse'],
    ['stop /sources/0/*'],
    [],
    { ...unlocked, 'sources/0/held': 'exclusive control' },
  ),
  ...onEach(
    ENERGIZED,
    'not on the energized paths',
    { 'sources/0/held': 'none', 'sources/1/held': gone },
    [],
  ),
]);

describeRule('sources.battery-connected', 'common practice; 1910.333(b)(2)(ii)(B)', [
  ['O', 'parted', { 'sources/3': BATTERY_UNIT }, []],
  ...['breaker', 'disconnect', 'wall switch', 'plug', 'none'].map((openedAt): RuleRow => [
    'O',
    `opened at ${openedAt}`,
    { 'sources/3': { ...BATTERY_UNIT, ...HELD_BY_LEAD, openedAt } },
    ['stop /sources/3/openedAt'],
    openedAt === 'wall switch' ? ['sources.switch-only'] : [],
  ]),
  [
    'O',
    'not answered',
    { 'sources/3': { ...BATTERY_UNIT, openedAt: gone } },
    ['open /sources/3/openedAt'],
    ['sources.not-locked', 'sources.switch-only'],
  ],
  ...onEach(ENERGIZED, 'energized', { 'sources/3': { ...BATTERY_UNIT, openedAt: 'none' } }, []),
  ['O', 'replaced, but none listed', { 'job/task': 'replace battery unit' }, ['open /sources']],
  [
    'O',
    'replaced and listed',
    { 'job/task': 'replace battery unit', 'sources/3': BATTERY_UNIT },
    [],
  ],
  [
    'O',
    'replaced, nothing listed',
    { 'job/task': 'replace battery unit', sources: gone },
    ['open /sources'],
    ['sources.*'],
  ],
]);

describeRule(
  'sources.by-unqualified',
  'testing: 1910.333(b)(2)(iv)(B), 1910.334(c)(1); opening: own policy',
  [
    ...eachValue(['O'], 'sources/1/byCrewId', ['c2', 'c9'], ['stop /sources/1/byCrewId']),
    ...eachValue(['O'], 'sources/1/byCrewId', [gone, '', 4], ['open /sources/1/byCrewId']),
    ...eachValue(ENERGIZED, 'sources/1/byCrewId', ['c2', gone], []),
    ...eachValue(
      ['O', 'T'],
      'absenceTest/byCrewId',
      ['c2'],
      ['stop /absenceTest/byCrewId'],
      ['shock.*', 'arc.*', 'crew.*'],
    ),
    ...eachValue(
      ['O', 'T'],
      'absenceTest/byCrewId',
      ['c9'],
      ['stop /absenceTest/byCrewId'],
      ['shock.*', 'arc.*', 'crew.*'],
    ),
    ...eachValue(
      ['O', 'T'],
      'absenceTest/byCrewId',
      [gone, ''],
      ['open /absenceTest/byCrewId'],
      ['shock.*', 'crew.*'],
    ),
    ...eachValue(['W'], 'absenceTest/byCrewId', ['c2', gone], []),
    ...eachValue(
      ['T'],
      'absenceTest/byCrewId',
      ['c2'],
      ['stop /absenceTest/byCrewId'],
      ['shock.*', 'arc.*', 'crew.*'],
      {
        'job/task': 'trace circuit',
      },
    ),
    ...(['inspect', 'thermography'] as const).flatMap((task) =>
      eachValue(['T'], 'absenceTest/byCrewId', ['c2', gone], [], ['shock.*', 'arc.*', 'crew.*'], {
        'job/task': task,
      }),
    ),
    [
      'O',
      'qualified is not answered',
      { 'crew/1/qualified': gone, 'sources/1/byCrewId': 'c2' },
      ['open /sources/1/byCrewId'],
      ['crew.*', 'shock.*'],
    ],
    [
      'O',
      'qualifiedThrough is not answered',
      { 'crew/1/qualified': true, 'sources/1/byCrewId': 'c2' },
      ['open /sources/1/byCrewId'],
      ['crew.*', 'shock.*'],
    ],
    [
      'O',
      'training lapsed',
      {
        'crew/1/qualified': true,
        'crew/1/qualifiedThrough': '2026-11-30',
        'sources/1/byCrewId': 'c2',
      },
      ['stop /sources/1/byCrewId'],
      ['crew.*', 'shock.*'],
    ],
    [
      'O',
      'qualified',
      {
        'crew/1/qualified': true,
        'crew/1/qualifiedThrough': '2026-12-01',
        'sources/1/byCrewId': 'c2',
      },
      [],
    ],
  ],
);

const DIMMED: Base[] = ['O', 'W'];
describeRule('sources.traveler-unlisted', 'common practice', [
  ...onEach(DIMMED, 'listed', {}, []),
  ...onEach(DIMMED, 'not listed', { 'sources/2': gone }, ['open']),
  ...onEach(
    DIMMED,
    'among others',
    { 'sources/2': gone, 'supply/switching': ['one place', 'two or more places'] },
    ['open'],
  ),
  ...onEach(
    DIMMED,
    'a foreign member does not hide it',
    { 'sources/2': gone, 'supply/switching': ['moon', 'two or more places'] },
    ['open', '?open'],
    ['sources.control-unlisted'],
  ),
  ...onEach(
    DIMMED,
    'switched in one place',
    { 'sources/2': gone, 'supply/switching': ['one place'] },
    [],
  ),
  ...eachValue(
    DIMMED,
    'supply/switching',
    [gone, [], '', ['moon']],
    ['open'],
    ['sources.control-unlisted'],
  ),
  ...eachValue(
    DIMMED,
    'supply/switching',
    [['one place', 'moon']],
    ['open'],
    ['sources.control-unlisted'],
  ),
  ...eachValue(['T'], 'supply/switching', [gone, []], [], ['supply.unanswered']),
  ...onEach(['T'], 'testing', { 'sources/2': gone }, []),
]);

describeRule('sources.control-unlisted', 'NEC 700.26; common practice', [
  ...eachValue(
    DIMMED,
    'supply/switching',
    [['automatic'], ['not known'], ['one place', 'automatic']],
    ['open'],
  ),
  ...eachValue(DIMMED, 'supply/switching', [['automatic'], ['not known']], [], [], {
    'sources/3': CONTROL,
  }),
  ...eachValue(DIMMED, 'supply/switching', [['one place'], ['none']], []),
  ...eachValue(
    DIMMED,
    'supply/switching',
    [gone, [], 'automatic'],
    ['open'],
    ['sources.traveler-unlisted'],
  ),
  ...eachValue(['T'], 'supply/switching', [['automatic'], ['not known']], []),
]);

describeRule('sources.shared-neutral', '1910.333(b)(2)(ii)(B); NEC 210.4(B)', [
  ['O', 'all phases opened', { 'sources/3': SHARED_NEUTRAL, 'supply/neutralShared': 'yes' }, []],
  [
    'O',
    'not all opened',
    { 'sources/3': { ...SHARED_NEUTRAL, allPhasesOpened: false } },
    ['stop /sources/3/allPhasesOpened'],
  ],
  [
    'O',
    'not answered',
    { 'sources/3': { ...SHARED_NEUTRAL, allPhasesOpened: gone } },
    ['open /sources/3/allPhasesOpened'],
  ],
  ['O', 'shared, none listed', { 'supply/neutralShared': 'yes' }, ['open']],
  ['O', 'not known, none listed', { 'supply/neutralShared': 'not known' }, []],
  ['O', 'of another kind it is not asked', { 'sources/0/allPhasesOpened': false }, []],
  ...onEach(
    ENERGIZED,
    'energized',
    { 'sources/3': { ...SHARED_NEUTRAL, allPhasesOpened: false }, 'supply/neutralShared': 'yes' },
    [],
  ),
]);

describeRule('sources.opened-before-transfer', 'NEC 700.12', [
  ...eachValue(
    ['O'],
    'sources/0/upstreamOfTransfer',
    [true],
    ['stop /sources/0/upstreamOfTransfer'],
  ),
  ...eachValue(
    ['O'],
    'sources/0/upstreamOfTransfer',
    [gone, '', 'yes'],
    ['open /sources/0/upstreamOfTransfer'],
  ),
  ...eachValue(
    ['O'],
    'sources/1/upstreamOfTransfer',
    [true],
    ['stop /sources/1/upstreamOfTransfer'],
  ),
  ...eachValue(['O'], 'sources/1/upstreamOfTransfer', [gone], []),
  ['O', 'no standby source', { ...ALONE, 'sources/0/upstreamOfTransfer': gone }, []],
  [
    'O',
    'no standby source, but upstream',
    { ...ALONE, 'sources/0/upstreamOfTransfer': true },
    ['stop /sources/0/upstreamOfTransfer'],
  ],
  [
    'O',
    'a central inverter',
    { ...ALONE, 'sources/1': INVERTER, 'sources/0/upstreamOfTransfer': gone },
    ['open /sources/0/upstreamOfTransfer'],
  ],
  [
    'O',
    'a battery unit',
    { ...ALONE, 'sources/1': BATTERY_UNIT, 'sources/0/upstreamOfTransfer': gone },
    [],
  ],
  ...eachValue(ENERGIZED, 'sources/0/upstreamOfTransfer', [true, gone], []),
]);

describeRule('sources.transfer-starts', 'NEC 700.12', [
  ['O', 'a generator', {}, ['caution /sources*']],
  ['O', 'none', ALONE, []],
  ['O', 'a battery unit', { ...ALONE, 'sources/1': BATTERY_UNIT }, ['caution /sources*']],
  ['O', 'a central inverter', { ...ALONE, 'sources/1': INVERTER }, ['caution /sources*']],
  ...onEach(ENERGIZED, 'energized', {}, []),
]);

const AMPERES = 'proof/neutralAmperes';
describeRule('sources.neutral-not-checked', 'NEC 300.13(B), 210.4(B)', [
  ['O', 'not at the plan', { 'supply/neutralShared': 'not known' }, []],
  ['O work', 'own neutral, not measured', {}, []],
  ...eachValue(['O work'], AMPERES, [0, 0.1], []),
  ...eachValue(['O work'], AMPERES, [0.11, 4], ['stop /proof/neutralAmperes']),
  ...['yes', 'not known', gone].flatMap((neutralShared) => [
    ...eachValue(
      ['O work'],
      AMPERES,
      [gone, -1, NaN, 'x'],
      ['open /proof/neutralAmperes'],
      ['supply.unanswered'],
      {
        'supply/neutralShared': neutralShared,
        'sources/3': SHARED_NEUTRAL,
        'proof/openedSources/3': 'n1',
      },
    ),
    ...eachValue(['O work'], AMPERES, [0.1], [], ['supply.unanswered'], {
      'supply/neutralShared': neutralShared,
      'sources/3': SHARED_NEUTRAL,
      'proof/openedSources/3': 'n1',
    }),
  ]),
  [
    'O work',
    'phase to phase',
    {
      'supply/circuitVolts': 208,
      'supply/neutralShared': gone,
      'supply/neutralPresent': false,
      'proof/readings': zeroReadings(['A1', 'A2'], ['A', 'B', 'G']),
      [AMPERES]: 5,
    },
    [],
  ],
  ['O work', 'no repair', { 'job/task': 'inspect', [AMPERES]: 5 }, []],
]);

const OTHER = 'proof/otherLiveParts';
const PANEL: Edits = {
  'job/task': 'work in panelboard',
  'arcFlash/equipment': 'panelboard',
  'supply/atService': false,
  'proof/readings': zeroReadings(['A1', 'A2'], ['A', 'B', 'C', 'N', 'G']),
};
describeRule('sources.live-neighbor', '1910.333(a)(1), (b)(1), 1910.335(a)(2)(ii)', [
  ['O', 'not at the plan', {}, []],
  ...eachValue(['O work'], OTHER, ['none', 'guarded'], []),
  ...eachValue(['O work'], OTHER, ['not guarded'], ['stop /proof/otherLiveParts']),
  ...eachValue(['O work'], OTHER, [gone, '', 'maybe'], ['open /proof/otherLiveParts']),
  ...['work in panelboard', 'replace breaker'].flatMap((task) => [
    ...eachValue(['O work'], OTHER, ['none'], ['open /proof/otherLiveParts'], [], {
      ...PANEL,
      'job/task': task,
    }),
    ...eachValue(['O work'], OTHER, ['guarded'], [], [], { ...PANEL, 'job/task': task }),
    ...eachValue(['O work'], OTHER, ['none'], [], [], {
      ...PANEL,
      'job/task': task,
      'sources/0/openedAt': 'feeder breaker',
    }),
  ]),
  [
    'O work',
    'of another kind of source it is not asked',
    { ...PANEL, [OTHER]: 'none', 'sources/0/openedAt': 'disconnect' },
    [],
  ],
]);

const STORED = 'proof/storedEnergy';
describeRule('sources.stored-energy', '1910.333(b)(2)(ii)(C); FACE 87-55', [
  ['O', 'not at the plan', {}, []],
  ...(['replace luminaire', 'replace driver or ballast'] as const).flatMap((task) => [
    ...eachValue(['O work'], STORED, ['none after checking', 'discharged'], [], [], {
      'job/task': task,
    }),
    ...eachValue(
      ['O work'],
      STORED,
      [gone, 'not discharged', '', 'maybe'],
      ['open /proof/storedEnergy'],
      [],
      { 'job/task': task },
    ),
  ]),
  [
    'O work',
    'replace battery unit',
    { 'job/task': 'replace battery unit', [STORED]: gone },
    ['open /proof/storedEnergy'],
    ['sources.battery-connected'],
  ],
  ...(
    [
      'replace lamp',
      'add or extend circuit',
      'work on lighting control',
      'inspect',
      'test or troubleshoot',
    ] as const
  ).map((task): RuleRow => ['O work', task, { 'job/task': task, [STORED]: gone }, []]),
  [
    'O work',
    'a central inverter for any task',
    {
      'job/task': 'replace lamp',
      [STORED]: gone,
      'sources/3': INVERTER,
      'proof/openedSources/3': 'i1',
    },
    ['open /proof/storedEnergy'],
    ['absence.dc-not-tested'],
  ],
]);

const BOTH = ['c1', 'c2'];
const TWO: Edits = { 'crew/1/worksOnCircuit': true };
describeRule('sources.not-everyone-locked', '1910.147(f)(3)(ii)(D) by 1910.333(b)(2) Note 2', [
  ['O', 'one works', { 'sources/0/lockedBy': [] }, []],
  ...eachValue(
    ['O'],
    'crew/1/worksOnCircuit',
    [true, gone, '', 'no'],
    ['open /sources/0*', 'open /sources/1*', 'open /sources/2*'],
  ),
  [
    'O',
    'both locked',
    { ...TWO, 'sources/0/lockedBy': BOTH, 'sources/1/lockedBy': BOTH, 'sources/2/lockedBy': BOTH },
    [],
  ],
  [
    'O',
    'one device without the second lock',
    {
      ...TWO,
      'sources/0/lockedBy': BOTH,
      'sources/1/lockedBy': ['c2'],
      'sources/2/lockedBy': BOTH,
    },
    ['open /sources/1*'],
  ],
  ...eachValue(['O'], 'sources/1/lockedBy', [gone, [], ''], ['open /sources/1*'], [], {
    ...TWO,
    'sources/0/lockedBy': BOTH,
    'sources/2/lockedBy': BOTH,
  }),
  [
    'O',
    'a device that is not opened, and a plug under exclusive control',
    {
      ...TWO,
      'sources/0/lockedBy': BOTH,
      'sources/1/openedAt': 'none',
      'sources/2/openedAt': 'plug',
      'sources/2/held': 'exclusive control',
    },
    [],
    ['sources.not-opened'],
  ],
  ...onEach(ENERGIZED, 'energized', TWO, []),
]);
