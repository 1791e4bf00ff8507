import { describeSaid } from '../../support/describeSaid';
import type { SaidRow } from '../../support/describeSaid';
import { UNSWITCHED_HOT } from '../../support/ruleEdits';
import type { Edits } from '../../support/ruleTable';
import { gone } from '../../support/ruleTable';
import { zeroReadings } from '../../support/soundWorksheet';

const LIVE_PARTS = 'proof/otherLiveParts';
const PANEL: Edits = {
  'job/task': 'work in panelboard',
  'arcFlash/equipment': 'panelboard',
  [LIVE_PARTS]: 'none',
};
const CATEGORY = 'absenceTest/category';
const RATED = 'absenceTest/ratedVolts';
const LEADS = 'absenceTest/leadsInspected';

const held = { index: 0, kind: 'normal', from: 'LA-1 ckt 7', held: 'exclusive control' };
const locks: SaidRow[] = [
  [
    'sources.not-locked',
    'in the hands of one person, at a device that is not answered',
    'O',
    { 'sources/0/held': 'exclusive control', 'sources/0/openedAt': gone },
    [['open /sources/0/openedAt', { ...held, field: 'sources.openedAt' }]],
  ],
  [
    'sources.not-locked',
    'in the hands of one person, at a breaker',
    'O',
    { 'sources/0/held': 'exclusive control' },
    [['stop /sources/0/held', held]],
  ],
  [
    'sources.not-locked',
    'no word of how',
    'O',
    { 'sources/0/held': gone },
    [
      [
        'open /sources/0/held',
        { index: 0, kind: 'normal', from: 'LA-1 ckt 7', field: 'sources.held' },
      ],
    ],
  ],
];

const proofs: SaidRow[] = [
  [
    'absence.voltage-present',
    'a reading that does not say where',
    'O work',
    {
      'proof/readings/6': {
        from: 'B',
        to: 'G',
        volts: 120,
        current: 'ac',
        at: '2026-12-01T08:50:00-06:00',
      },
    },
    [['stop /proof/readings/6', { index: 6, volts: 120, current: 'ac', from: 'B', to: 'G' }]],
  ],
  [
    'closeout.locks-left',
    'no word of the locks',
    'O close',
    { 'closeOut/locksRemoved': gone },
    [['open /closeOut/locksRemoved', { field: 'closeOut.locksRemoved' }]],
  ],
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
    'no meter is used where the work is not a test',
    'W',
    { 'job/task': 'trace circuit', [LEADS]: gone },
    [],
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
      'sources/3': { ...UNSWITCHED_HOT, points: gone },
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
      'sources/3': UNSWITCHED_HOT,
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
    'absence.source-not-tested',
    'by the letter of the phase at its own point',
    'O work',
    {
      'sources/3': { ...UNSWITCHED_HOT, points: ['A2'] },
      'proof/openedSources': ['s1', 's2', 's3', 'h1'],
      'proof/readings': [
        ...zeroReadings(['A1'], ['B', 'N', 'G']),
        ...zeroReadings(['A2'], ['A', 'N', 'G']),
      ],
    },
    [
      [
        'open /proof/readings',
        { index: 3, kind: 'unswitched hot', from: 'LA-1 ckt 9', point: 'A2', to: 'G, A' },
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

describeSaid('a lock', locks);
describeSaid('the proof', proofs);
