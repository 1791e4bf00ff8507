import { describeSaid } from '../../support/describeSaid';
import type { SaidRow } from '../../support/describeSaid';
import { SECOND_QUALIFIED } from '../../support/ruleEdits';
import type { Edits } from '../../support/ruleTable';
import { gone } from '../../support/ruleTable';

const PERMIT = 'decision/permit';
const INFEASIBLE: Edits = { 'decision/reason': 'infeasible' };
const BECAUSE = 'decision/infeasibleBecause';

const people: SaidRow[] = [
  [
    'crew.lead-unqualified',
    'nobody leads',
    'O',
    { 'crew/0/lead': false },
    [['open /crew', { leads: 0 }]],
  ],
  [
    'crew.lead-unqualified',
    'two lead',
    'O',
    { 'crew/1/lead': true },
    [['open /crew', { leads: 2 }]],
  ],
  [
    'crew.lead-unqualified',
    'three lead',
    'O',
    { 'crew/1/lead': true, 'crew/2': { id: 'c3', lead: true } },
    [['open /crew', { leads: 3 }]],
  ],
  [
    'crew.rescue-untrained',
    'two inside, one of them trained',
    'T',
    { ...SECOND_QUALIFIED, 'crew/1/closest': 'restricted', 'crew/1/rescueTrained': false },
    [],
  ],
  [
    'crew.rescue-untrained',
    'the only one inside is the only one trained',
    'T',
    { 'crew/1/rescueTrained': false },
    [['open /crew', {}]],
  ],
  [
    'sources.by-unqualified',
    'by name',
    'T',
    { 'absenceTest/byCrewId': 'c2' },
    [['stop /absenceTest/byCrewId', { name: 'Helper' }]],
  ],
  [
    'sources.by-unqualified',
    'nobody of the crew has no name',
    'T',
    { 'absenceTest/byCrewId': 'c9' },
    [['stop /absenceTest/byCrewId', {}]],
  ],
  [
    'sources.by-unqualified',
    'a source that nobody is named for',
    'O',
    { 'sources/0/byCrewId': gone },
    [
      [
        'open /sources/0/byCrewId',
        { index: 0, kind: 'normal', from: 'LA-1 ckt 7', field: 'sources.byCrewId' },
      ],
    ],
  ],
  [
    'permit.missing',
    'approved by one of the crew, whatever the case',
    'W',
    { [`${PERMIT}/approvedBy`]: ' LEAD ' },
    [['stop /decision/permit/approvedBy', { name: ' LEAD ' }]],
  ],
  [
    'permit.missing',
    'over before the work is',
    'W',
    { [`${PERMIT}/validUntil`]: '2026-12-01T11:59:00-06:00' },
    [
      [
        'stop /decision/permit/validUntil',
        { validUntil: '2026-12-01T11:59:00-06:00', endsAt: '2026-12-01T12:00:00-06:00' },
      ],
    ],
  ],
  [
    'permit.missing',
    'not asked for where none is required',
    'W',
    {
      'job/task': 'inspect',
      ...INFEASIBLE,
      [BECAUSE]: 'continuous industrial process',
      'arcFlash/task': 'thermography or inspection outside restricted',
      'crew/0/closest': 'outside all boundaries',
      [PERMIT]: gone,
    },
    [],
  ],
];

const THIRD = { id: 'c3', name: 'Third', lead: false, closest: 'outside all boundaries' };
const ESCORTED: Edits = { 'crew/1/closest': 'limited with escort' };
const CLOSEST = 'crew/1/closest';
const escorted = { index: 1, name: 'Helper', closest: 'limited with escort' };
const escorts: SaidRow[] = [
  [
    'shock.unqualified-inside',
    'one of the others is qualified',
    'O',
    { ...ESCORTED, 'crew/2': { ...THIRD, qualified: false } },
    [],
  ],
  [
    'shock.unqualified-inside',
    'of one of the others that is not known',
    'T',
    { ...ESCORTED, 'crew/0/qualified': gone, 'crew/2': { ...THIRD, qualified: false } },
    [
      ['open /crew/0/closest', { index: 0, name: 'Lead', closest: 'restricted' }],
      ['open /crew/1/closest', escorted],
    ],
  ],
  [
    'shock.unqualified-inside',
    'nobody is',
    'T',
    { ...ESCORTED, 'crew/0/qualified': false },
    [
      ['stop /crew/0/closest', { index: 0, name: 'Lead', closest: 'restricted' }],
      ['stop /crew/1/closest', escorted],
    ],
  ],
  [
    'shock.unqualified-inside',
    'nobody is known to be, whoever is escorted',
    'T',
    { ...ESCORTED, 'crew/0/qualified': false, 'crew/1/qualified': gone },
    [
      ['stop /crew/0/closest', { index: 0, name: 'Lead', closest: 'restricted' }],
      ['open /crew/1/closest', escorted],
    ],
  ],
  [
    'shock.unqualified-inside',
    'a place that is not answered',
    'O',
    { [CLOSEST]: gone },
    [['open /crew/1/closest', { index: 1, name: 'Helper', field: 'crew.closest' }]],
  ],
  ['shock.unqualified-inside', 'outside', 'O', { [CLOSEST]: 'outside limited' }, []],
];

const decisions: SaidRow[] = [
  [
    'decision.below-fifty-not-so',
    '50 V (29 CFR 1910.333(a)(1))',
    'W',
    {
      'decision/reason': 'below 50 V',
      'supply/workVolts': 50,
      'supply/higherVoltsExposed': false,
    },
    [['stop /supply/workVolts', { volts: 50 }]],
  ],
  [
    'sources.egress-unknown',
    'none, beside a supply',
    'O',
    { egressSupply: ['none after checking', 'generator'] },
    [['open /egressSupply', { supply: 'none after checking' }]],
  ],
  [
    'sources.egress-unknown',
    'nobody knows',
    'O',
    { egressSupply: ['unknown'] },
    [['stop /egressSupply', { supply: 'unknown' }]],
  ],
  [
    'sources.control-unlisted',
    'an automatic control that is not listed',
    'O',
    { 'supply/switching': ['automatic'] },
    [['open /sources', { kind: 'control' }]],
  ],
  [
    'decision.testing-is-not-repair',
    'a repair under the name of testing',
    'W',
    { 'decision/reason': 'testing' },
    [['stop /decision/reason', { task: 'replace driver or ballast' }]],
  ],
  [
    'decision.infeasible-not-admitted',
    'a test, while the task is not answered',
    'W',
    { ...INFEASIBLE, [BECAUSE]: 'can only be tested energized', 'job/task': gone },
    [['open /job/task', { because: 'can only be tested energized', field: 'job.task' }]],
  ],
  [
    'decision.infeasible-not-admitted',
    'a test, and the task is a repair',
    'W',
    { ...INFEASIBLE, [BECAUSE]: 'can only be tested energized' },
    [['stop /decision/infeasibleBecause', { because: 'can only be tested energized' }]],
  ],
  [
    'decision.infeasible-not-admitted',
    'another ground, while the task is not answered',
    'W',
    { ...INFEASIBLE, [BECAUSE]: 'other', 'job/task': gone },
    [['stop /decision/infeasibleBecause', { because: 'other' }]],
  ],
];

describeSaid('the people', people);
describeSaid('an escort', escorts);
describeSaid('the decision', decisions);
