import { describeSaid } from '../../support/describeSaid';
import type { SaidRow } from '../../support/describeSaid';
import { SECOND_QUALIFIED } from '../../support/ruleEdits';
import type { Edits } from '../../support/ruleTable';
import { gone } from '../../support/ruleTable';

const SIZE = 'surroundings/ladder/sizeFeet';
const LEVEL = 'surroundings/ladder/standingLevelFeet';
const CEILING = 'surroundings/ceilingHeightFeet';
const PERMIT = 'decision/permit';
const INFEASIBLE: Edits = { 'decision/reason': 'infeasible' };
const BECAUSE = 'decision/infeasibleBecause';
const LIVE_PARTS = 'proof/otherLiveParts';
const PANEL: Edits = {
  'job/task': 'work in panelboard',
  'arcFlash/equipment': 'panelboard',
  [LIVE_PARTS]: 'none',
};
const CATEGORY = 'absenceTest/category';
const RATED = 'absenceTest/ratedVolts';
const LEADS = 'absenceTest/leadsInspected';
const TO_APPROACH: Edits = { 'surroundings/peopleMayApproach': true };
const INCHES = 'surroundings/barricadeInches';
const HOT = {
  id: 'h1',
  kind: 'unswitched hot',
  from: 'LA-1 ckt 9',
  openedAt: 'breaker',
  held: 'lock and tag',
  lockNumber: '13',
  lockedBy: ['c1'],
  byCrewId: 'c1',
};

const ladders: SaidRow[] = [
  // Work at 10 ft, 1 ft above the ceiling: 4 ft of a 6 ft ladder and a reach of 6 ft (common practice).
  [
    'surroundings.ladder-short',
    'a ladder too small',
    'O',
    { [SIZE]: 3, [LEVEL]: 1 },
    [
      [
        'stop /surroundings/ladder/sizeFeet',
        { ceilingHeightFeet: 9, sizeFeet: 3, smallestFeet: 6 },
      ],
    ],
  ],
  [
    'surroundings.ladder-short',
    'neither size nor ceiling',
    'O',
    { [SIZE]: gone, [CEILING]: gone },
    [
      ['open /surroundings/ladder/sizeFeet', { field: 'surroundings.ladder.sizeFeet' }],
      ['open /surroundings/ceilingHeightFeet', { field: 'surroundings.ceilingHeightFeet' }],
    ],
  ],
  [
    'surroundings.ladder-short',
    'no stepladder is tall enough',
    'O',
    { [CEILING]: 40 },
    [['stop /surroundings/ladder/sizeFeet', { ceilingHeightFeet: 40 }]],
  ],
  [
    'surroundings.ladder-short',
    'an extension ladder has no size here, and is placed as well',
    'O',
    {
      'surroundings/access': 'extension ladder',
      [SIZE]: 3,
      'surroundings/ladder/placed': false,
    },
    [['stop /surroundings/ladder/placed', {}]],
  ],
  [
    'surroundings.ladder-top',
    'too high on it (29 CFR 1926.1053(b)(13); 2 ft below the top, common practice)',
    'O',
    { [SIZE]: 6, [LEVEL]: 4.5 },
    [['stop /surroundings/ladder/standingLevelFeet', { standingLevelFeet: 4.5, limit: 4 }]],
  ],
  [
    'surroundings.ladder-top',
    'a ladder shorter than what lies below its top',
    'O',
    { [SIZE]: 1, [LEVEL]: 1 },
    [['stop /surroundings/ladder/standingLevelFeet', { standingLevelFeet: 1, limit: 0 }]],
  ],
  [
    'surroundings.ladder-top',
    'neither size nor level',
    'O',
    { [SIZE]: gone, [LEVEL]: gone },
    [
      ['open /surroundings/ladder/sizeFeet', { field: 'surroundings.ladder.sizeFeet' }],
      [
        'open /surroundings/ladder/standingLevelFeet',
        { field: 'surroundings.ladder.standingLevelFeet' },
      ],
    ],
  ],
  [
    'surroundings.ladder-top',
    'no size',
    'O',
    { [SIZE]: gone },
    [['open /surroundings/ladder/sizeFeet', { field: 'surroundings.ladder.sizeFeet' }]],
  ],
  [
    'surroundings.barricade',
    'no word of it, the distance known',
    'O',
    TO_APPROACH,
    [
      [
        'open /surroundings/barricadeInches',
        { requiredInches: 42, field: 'surroundings.barricadeInches' },
      ],
    ],
  ],
  [
    'surroundings.barricade',
    'a distance, and none that is known',
    'O',
    { ...TO_APPROACH, [INCHES]: 60, 'supply/system': gone },
    [['open /surroundings/barricadeInches', { inches: 60 }]],
  ],
];

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

const decisions: SaidRow[] = [
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

const proofs: SaidRow[] = [
  [
    'absence.not-proved',
    'not before, and no word of after',
    'O work',
    { 'proof/provedBefore': false, 'proof/provedAfter': gone },
    [
      ['open /proof/provedBefore', {}],
      ['open /proof/provedAfter', { field: 'proof.provedAfter' }],
    ],
  ],
  [
    'absence.leads-not-inspected',
    'not yet',
    'O',
    { [LEADS]: false },
    [['open /absenceTest/leadsInspected', {}]],
  ],
  [
    'absence.leads-not-inspected',
    'no word of it',
    'O',
    { [LEADS]: gone },
    [['open /absenceTest/leadsInspected', { field: 'absenceTest.leadsInspected' }]],
  ],
  // IEC 61010: CAT III for fixed wiring, CAT IV at the service.
  [
    'absence.meter-category',
    'too low a category',
    'O',
    { [CATEGORY]: 'II' },
    [['stop /absenceTest/category', { category: 'II', location: 'fixed wiring' }]],
  ],
  [
    'absence.meter-category',
    'too low a category for the service',
    'O',
    { 'supply/atService': true },
    [['stop /absenceTest/category', { category: 'III', location: 'service' }]],
  ],
  [
    'absence.meter-category',
    'too low a rating',
    'O',
    { [RATED]: 150 },
    [['stop /absenceTest/ratedVolts', { ratedVolts: 150, volts: 208 }]],
  ],
  [
    'sources.live-neighbor',
    'none, in a panel whose own main is opened',
    'O work',
    PANEL,
    [['open /proof/otherLiveParts', { lugs: 'live', field: 'proof.otherLiveParts' }]],
  ],
  ['sources.live-neighbor', 'none, in a luminaire', 'O work', { [LIVE_PARTS]: 'none' }, []],
  [
    'sources.live-neighbor',
    'none, in a panel that is opened elsewhere',
    'O work',
    { ...PANEL, 'sources/0/openedAt': 'disconnect' },
    [],
  ],
  [
    'sources.live-neighbor',
    'none, on a luminaire job at a panel',
    'O work',
    { ...PANEL, 'job/task': 'replace luminaire' },
    [],
  ],
  [
    'sources.live-neighbor',
    'none, in other equipment',
    'O work',
    { ...PANEL, 'arcFlash/equipment': 'switchboard' },
    [],
  ],
  [
    'sources.neutral-not-checked',
    'a neutral that carries current (common practice)',
    'O work',
    { 'proof/neutralAmperes': 0.11 },
    [['stop /proof/neutralAmperes', { amperes: 0.11, limit: 0.1 }]],
  ],
  [
    'absence.source-not-tested',
    'one whose points nobody named, where none was read',
    'O work',
    {
      'sources/3': HOT,
      'proof/openedSources': ['s1', 's2', 's3', 'h1'],
      'proof/readings': [],
    },
    [
      [
        'open /proof/readings',
        { index: 3, kind: 'unswitched hot', from: 'LA-1 ckt 9', point: '', to: 'G, A' },
      ],
    ],
  ],
  [
    'absence.source-not-tested',
    'the conductors that it is still to be read to',
    'O work',
    {
      'sources/3': { ...HOT, points: ['A1'] },
      'proof/openedSources': ['s1', 's2', 's3', 'h1'],
    },
    [
      [
        'open /proof/readings',
        { index: 3, kind: 'unswitched hot', from: 'LA-1 ckt 9', point: 'A1', to: 'G, B' },
      ],
    ],
  ],
  [
    'closeout.locks-left',
    'no word of the supply',
    'O close',
    { 'closeOut/restored': gone },
    [['open /closeOut/restored', { field: 'closeOut.restored' }]],
  ],
  [
    'closeout.locks-left',
    'restored, locks left',
    'O close',
    { 'closeOut/locksRemoved': false },
    [['open /closeOut/locksRemoved', {}]],
  ],
  [
    'closeout.locks-left',
    'not restored',
    'O close',
    { 'closeOut/restored': false },
    [['caution /closeOut/restored', {}]],
  ],
];

describeSaid('the place', ladders);
describeSaid('the people', people);
describeSaid('the decision', decisions);
describeSaid('the proof', proofs);
