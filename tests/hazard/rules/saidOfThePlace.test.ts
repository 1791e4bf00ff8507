import { describeSaid } from '../../support/describeSaid';
import type { SaidRow } from '../../support/describeSaid';
import type { Edits } from '../../support/ruleTable';
import { gone } from '../../support/ruleTable';

const SIZE = 'surroundings/ladder/sizeFeet';
const LEVEL = 'surroundings/ladder/standingLevelFeet';
const CEILING = 'surroundings/ceilingHeightFeet';
const TO_APPROACH: Edits = { 'surroundings/peopleMayApproach': true };
const INCHES = 'surroundings/barricadeInches';
const STARTS = 'job/startsAt';
const ENDS = 'job/endsAt';
const noStart: SaidRow[4][number] = ['open /job/startsAt', { field: 'job.startsAt' }];
const noEnd: SaidRow[4][number] = ['open /job/endsAt', { field: 'job.endsAt' }];

const ladders: SaidRow[] = [
  [
    'supply.high-leg',
    'a high-leg delta (NEC 110.15)',
    'O',
    { 'supply/system': '240/120 high-leg' },
    [['caution /supply/system', { system: '240/120 high-leg' }]],
  ],
  [
    'supply.high-leg',
    'a phase that reads as one',
    'O',
    { 'supply/readings/phaseToNeutral': [120, 208, 121] },
    [['caution /supply/readings/phaseToNeutral', { volts: 208 }]],
  ],
  [
    'shock.grounded-surface',
    'live work from a lift that is grounded',
    'W',
    { 'surroundings/access': 'lift', 'surroundings/lift': { fallProtection: true } },
    [['stop /surroundings/access', { kind: 'lift' }]],
  ],
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

const windows: SaidRow[] = ['window.too-long', 'window.reversed'].flatMap((code): SaidRow[] => [
  [code, 'no start', 'O', { [STARTS]: gone }, [noStart]],
  [code, 'no end', 'O', { [ENDS]: gone }, [noEnd]],
  [code, 'neither', 'O', { [STARTS]: gone, [ENDS]: gone }, [noStart, noEnd]],
]);
windows.push(
  ['window.over', 'no end', 'O', { [ENDS]: gone }, [noEnd]],
  [
    'window.over',
    'over',
    'O',
    { [ENDS]: '2026-12-01T08:59:00-06:00' },
    [['stop /job/endsAt', { endsAt: '2026-12-01T08:59:00-06:00' }]],
  ],
  [
    'window.reversed',
    'the end before the start',
    'O',
    { [STARTS]: '2026-12-01T12:30:00-06:00' },
    [
      [
        'stop /job/endsAt',
        { startsAt: '2026-12-01T12:30:00-06:00', endsAt: '2026-12-01T12:00:00-06:00' },
      ],
    ],
  ],
  // Own policy: one day's work, 12 h.
  [
    'window.too-long',
    'a minute too long',
    'O',
    { [ENDS]: '2026-12-01T20:01:00-06:00' },
    [['stop /job/endsAt', { minutes: 721, limit: 720 }]],
  ],
);

describeSaid('the place', ladders);
describeSaid('the window', windows);
