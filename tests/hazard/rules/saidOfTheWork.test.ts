import { describeSaid } from '../../support/describeSaid';
import type { SaidRow } from '../../support/describeSaid';
import { BATTERY_UNIT, FAR, SECOND_QUALIFIED } from '../../support/ruleEdits';
import type { Edits } from '../../support/ruleTable';
import { gone } from '../../support/ruleTable';
import { soundWorksheet } from '../../support/soundWorksheet';

const BY_BATTERY: Edits = { 'sources/3': BATTERY_UNIT, egressSupply: ['battery units'] };
const TWO_WORK: Edits = {
  'crew/1/worksOnCircuit': true,
  'sources/1/lockedBy': ['c1', 'c2'],
  'sources/2/lockedBy': ['c1', 'c2'],
};
const FIRST = { index: 0, kind: 'normal', from: 'LA-1 ckt 7' };
const SECOND = {
  index: 1,
  kind: 'generator',
  from: 'LA-1 ckt 7, load side of the transfer switch',
};
const SURFACES = 'surroundings/groundedSurfaces';
const AIR = 'protectiveEquipment/gloves/airTested';
const LEAD = { index: 0, name: 'Lead' };
const HELPER = { index: 1, name: 'Helper' };
const { crew = [] } = soundWorksheet().content;

const rows: SaidRow[] = [
  [
    'arc.task-does-not-fit',
    'a task milder than the job',
    'W',
    { 'arcFlash/task': 'read panel meter' },
    [['open /arcFlash/task', { task: 'read panel meter', floor: 'energized work' }]],
  ],
  [
    'arc.task-does-not-fit',
    'a task whose own conditions do not hold',
    'T',
    { ...FAR, 'arcFlash/task': 'control circuit up to 125 V' },
    [['open /arcFlash/task', { task: 'control circuit up to 125 V' }]],
  ],
  [
    'arc.study-needed',
    'a limit of the table that is not answered',
    'O',
    { 'arcFlash/clearingSeconds': gone },
    [
      [
        'open /arcFlash/clearingSeconds',
        { limit: 'not-answered', field: 'arcFlash.clearingSeconds' },
      ],
    ],
  ],
  [
    'arc.study-needed',
    'a limit of the table that is exceeded',
    'O',
    { 'arcFlash/clearingSeconds': 0.5 },
    [
      [
        'stop /arcFlash/clearingSeconds',
        { limit: 'clearing-time-exceeded', value: 0.5, allowed: 0.03 },
      ],
    ],
  ],
  ...(['kilovoltAmperes', 'secondaryVolts', 'impedancePercent', 'phases'] as const).map(
    (missing): SaidRow => [
      'arc.study-needed',
      `a nameplate without its ${missing}`,
      'O',
      {
        'arcFlash/transformer': {
          kilovoltAmperes: 75,
          secondaryVolts: 208,
          impedancePercent: 4,
          phases: 3,
          [missing]: gone,
        },
      },
      [
        [
          `open /arcFlash/transformer/${missing}`,
          { limit: 'not-answered', field: `arcFlash.transformer.${missing}` },
        ],
      ],
    ],
  ),
  [
    'arc.bystander-inside',
    'a place that is not answered',
    'O',
    { 'crew/1/closest': gone },
    [['open /crew/1/closest', { ...HELPER, field: 'crew.closest' }]],
  ],
  [
    'closeout.egress-untested',
    'battery units only: they are tested',
    'O close',
    { ...BY_BATTERY, 'closeOut/egressLit': gone, 'closeOut/egressTestedSeconds': 30 },
    [],
  ],
  [
    'closeout.egress-untested',
    'a test too short (NFPA 101 7.9.3: 30 s)',
    'O close',
    { ...BY_BATTERY, 'closeOut/egressTestedSeconds': 29 },
    [['open /closeOut/egressTestedSeconds', { seconds: 29, limit: 30 }]],
  ],
  [
    'closeout.egress-untested',
    'no word of the test',
    'O close',
    { ...BY_BATTERY, 'closeOut/egressTestedSeconds': gone },
    [['open /closeOut/egressTestedSeconds', { field: 'closeOut.egressTestedSeconds' }]],
  ],
  [
    'closeout.egress-untested',
    'no word of what is lit',
    'O close',
    { 'closeOut/egressLit': gone },
    [['open /closeOut/egressLit', { field: 'closeOut.egressLit' }]],
  ],
  [
    'closeout.egress-untested',
    'not lit',
    'O close',
    { 'closeOut/egressLit': false },
    [['open /closeOut/egressLit', {}]],
  ],
  [
    'decision.unjustified',
    'no reason',
    'W',
    { 'decision/reason': gone },
    [['stop /decision/reason', { task: 'replace driver or ballast' }]],
  ],
  [
    'decision.unjustified',
    'no reason and no task',
    'W',
    { 'decision/reason': gone, 'job/task': gone },
    [['stop /decision/reason', {}]],
  ],
  [
    'decision.unjustified',
    'a reason and no task',
    'W',
    { 'job/task': gone },
    [['open /job/task', { reason: 'additional hazard', field: 'job.task' }]],
  ],
  [
    'decision.unjustified',
    'a reason that the task does not admit',
    'W',
    { 'job/task': 'add or extend circuit' },
    [['stop /decision/reason', { task: 'add or extend circuit', reason: 'additional hazard' }]],
  ],
  [
    'shock.escort-is-working',
    'another qualified person whose place is not answered',
    'T',
    {
      ...SECOND_QUALIFIED,
      'crew/1/closest': gone,
      'crew/2': {
        id: 'c3',
        name: 'Visitor',
        lead: false,
        qualified: false,
        closest: 'limited with escort',
      },
    },
    [['open /crew/2/closest', { index: 2, name: 'Visitor' }]],
  ],
  [
    'absence.pairs-missing',
    'points that were not read',
    'O work',
    { 'job/pointsOfWork': 4 },
    [
      ['open /proof/readings', { point: '', number: 3 }],
      ['open /proof/readings', { point: '', number: 4 }],
    ],
  ],
  [
    'absence.pairs-missing',
    'nothing read, and no number of points',
    'O work',
    { 'job/pointsOfWork': gone, 'proof/readings': [] },
    [
      ['open /job/pointsOfWork', { field: 'job.pointsOfWork' }],
      ['open /proof/readings', { point: '', number: 1 }],
    ],
  ],
  [
    'absence.pairs-missing',
    'pairs of one point',
    'O work',
    { 'proof/readings/5': gone, 'proof/readings/4': gone },
    [['open /proof/readings', { point: 'A2', pairs: 'B-G, N-G' }]],
  ],
  [
    'absence.source-not-opened',
    'a source that cannot be confirmed',
    'O work',
    { 'sources/1/id': gone },
    [['open /proof/openedSources', { ...SECOND, field: 'proof.openedSources' }]],
  ],
  [
    'absence.source-not-opened',
    'a source that was not',
    'O work',
    { 'proof/openedSources': ['s1', 's3'] },
    [['stop /proof/openedSources', SECOND]],
  ],
  [
    'sources.traveler-unlisted',
    'switched from two places, and no traveler listed',
    'O',
    { 'sources/2': gone },
    [['open /sources', { kind: 'traveler' }]],
  ],
  [
    'sources.not-everyone-locked',
    'by name',
    'O',
    TWO_WORK,
    [['open /sources/0/lockedBy', { ...FIRST, names: 'Helper' }]],
  ],
  [
    'sources.not-everyone-locked',
    'by id where no name was given, and two of them',
    'O',
    { ...TWO_WORK, 'crew/1/name': gone, 'sources/0/lockedBy': [] },
    [['open /sources/0/lockedBy', { ...FIRST, names: 'Lead, c2' }]],
  ],
  [
    'sources.not-everyone-locked',
    'somebody without name and id',
    'O',
    {
      crew: [
        crew[0],
        { worksOnCircuit: true, qualified: false, closest: 'outside all boundaries' },
      ],
      'sources/1/held': 'exclusive control',
      'sources/2/held': 'exclusive control',
    },
    [['open /sources/0/lockedBy', { ...FIRST, names: '' }]],
  ],
  [
    'shock.gloves-not-air-tested',
    'no word of it',
    'O',
    { [AIR]: gone },
    [
      [
        'open /protectiveEquipment/gloves/airTested',
        { ...LEAD, field: 'protectiveEquipment.gloves.airTested' },
      ],
    ],
  ],
  [
    'shock.gloves-not-air-tested',
    'not yet',
    'O',
    { [AIR]: false },
    [['open /protectiveEquipment/gloves/airTested', LEAD]],
  ],
  [
    'shock.gloves-overdue',
    'issued today',
    'O',
    { 'protectiveEquipment/gloves/issuedOn': '2026-12-01' },
    [],
  ],
  [
    'shock.gloves-overdue',
    'issued tomorrow',
    'O',
    {
      'protectiveEquipment/gloves/issuedOn': '2026-12-02',
      'job/endsAt': '2026-12-02T06:00:00-06:00',
    },
    [
      [
        'stop /protectiveEquipment/gloves/lastTestedOn',
        // Table I-5, note 1: six months after the issue.
        { ...LEAD, day: '2026-12-02', dueOn: '2027-06-02' },
      ],
    ],
  ],
  [
    'shock.grounded-surface',
    'a surface of a kind, and one of none',
    'W',
    { [SURFACES]: [{ kind: 'duct', inReach: true }, { inReach: true }] },
    [
      [`stop /${SURFACES}/0`, { index: 0, kind: 'duct' }],
      [`stop /${SURFACES}/1`, { index: 1 }],
    ],
  ],
];

describeSaid('the work', rows);
