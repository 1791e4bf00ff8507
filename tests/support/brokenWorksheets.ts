import { HELD_BY_LEAD } from './ruleEdits';
import { gone } from './ruleTable';
import type { Base, Edits } from './ruleTable';

/** Answers that break rules of every section at once, whatever the path. */
const BROKEN: Edits = {
  'job/special': ['solar or storage'],
  'job/lamps': 'double-ended',
  'job/construction': true,
  'job/occupied': true,
  'job/crossesShift': true,
  'job/task': 'replace driver or ballast',
  'supply/system': '480Y/277',
  'supply/tripped': 'cause not found',
  'supply/damage': true,
  'supply/switching': ['two or more places', 'automatic'],
  egress: gone,
  'arcFlash/clothingRatingCalPerCm2': 1,
  'arcFlash/normal': gone,
  'protectiveEquipment/gloves/gloveClass': gone,
  'protectiveEquipment/gloves/lastTestedOn': '2020-01-02',
  'protectiveEquipment/gloves/airTested': false,
  'protectiveEquipment/gloves/leatherProtectors': false,
  'protectiveEquipment/ready': [],
  'surroundings/groundedSurfaces/0/keptClear': false,
  'surroundings/ladder': { material: 'aluminum', sizeFeet: 4, standingLevelFeet: 4, placed: true },
  'surroundings/ceilingHeightFeet': 14,
  'surroundings/ceiling': 'suspected',
  'surroundings/lightAdequate': false,
  'surroundings/wet': true,
  'surroundings/conductiveArticlesRemoved': false,
  'surroundings/peopleMayApproach': true,
  'surroundings/outdoors': true,
  'surroundings/overheadLines': 'nearer than 10 ft',
  'crew/0/qualifiedThrough': '2024-01-31',
  'crew/0/rescueTrained': false,
  'crew/1/closest': 'restricted',
  'crew/1/worksOnCircuit': true,
  'briefing/topics': [],
  'briefing/emergency': {},
};

/**
 * Worksheets that break the rules, a few at a time: together they provoke every
 * rule of the plan. One entry is a base of `ruleTable` with edits.
 */
export const BROKEN_PLANS: readonly (readonly [name: string, base: Base, edits: Edits])[] = [
  [
    'off, with everything wrong',
    'O',
    {
      ...BROKEN,
      egressSupply: ['unknown'],
      'sources/0/openedAt': 'wall switch',
      'sources/0/held': 'none',
      'sources/0/upstreamOfTransfer': true,
      'sources/0/byCrewId': 'c2',
      'sources/1/openedAt': 'none',
      'sources/2': {
        ...HELD_BY_LEAD,
        id: 's3',
        kind: 'shared neutral',
        from: 'LA-1 ckt 9',
        allPhasesOpened: false,
      },
      'sources/3': {
        ...HELD_BY_LEAD,
        id: 's4',
        kind: 'battery unit',
        from: 'in A2',
        points: ['A2'],
      },
      'absenceTest/instrument': 'proximity',
      'absenceTest/category': 'II',
      'absenceTest/leadsInspected': false,
    },
  ],
  [
    'off, with nothing found',
    'O',
    {
      sources: [],
      egressSupply: ['battery units'],
      'job/endsAt': '2026-12-01T06:00:00-06:00',
      'protectiveEquipment/gloves': gone,
      'supply/system': '240/120 high-leg',
      'supply/conductorColors': ['brown', 'orange', 'yellow'],
      'arcFlash/noLabel': gone,
      'arcFlash/availableFaultKiloamperes': gone,
      'arcFlash/clearingSeconds': gone,
      'arcFlash/label': {
        ofThisEquipment: true,
        systemVolts: 240,
        reviewedOn: '2025-01-01',
        incidentEnergyCalPerCm2: 48,
        workingDistanceInches: 18,
        arcFlashBoundaryInches: 120,
      },
      'surroundings/access': 'lift',
      'surroundings/lift': { fallProtection: false, operatorTrained: false, insulating: true },
    },
  ],
  [
    'off, too long and with too much current',
    'O',
    {
      'job/endsAt': '2026-12-02T09:00:00-06:00',
      'arcFlash/availableFaultKiloamperes': 200,
      'job/occupied': true,
      egress: gone,
      'crew/1/closest': 'limited with escort',
    },
  ],
  [
    'off, after its end',
    'O',
    { 'job/startsAt': '2026-11-30T08:00:00-06:00', 'job/endsAt': '2026-11-30T12:00:00-06:00' },
  ],
  [
    'energized without a reason, alone',
    'W',
    {
      'decision/reason': gone,
      'decision/explanation': gone,
      'decision/permit': gone,
      'decision/outageRefusedBy': gone,
      'arcFlash/task': 'read panel meter',
      'crew/1': gone,
    },
  ],
  [
    'energized below 50 V',
    'W',
    { 'decision/reason': 'below 50 V', 'supply/workVolts': 60, 'supply/higherVoltsExposed': true },
  ],
  ['energized for testing, though it is a repair', 'W', { 'decision/reason': 'testing' }],
  [
    'energized because it is said not to be feasible',
    'W',
    { 'decision/reason': 'infeasible', 'decision/infeasibleBecause': 'other' },
  ],
  [
    'energized for lack of light',
    'W',
    { 'decision/hazard': 'illumination', 'decision/temporaryLight': 'possible' },
  ],
];
