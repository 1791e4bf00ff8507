import type { DemoJob } from './contents';
import { locked } from './contents';

/** How far a demo worksheet has come. */
export type DemoStage =
  | 'draft'
  | 'briefing'
  | 'countersign'
  | 'in-force'
  | 'proved'
  | 'returned'
  | 'stopped'
  /** Stopped by its own proof, which found 50 V or more. */
  | 'still-live'
  | 'expired'
  | 'void'
  /** Left as a draft until the nightly job voided it. */
  | 'stale'
  | 'closed';

/** What came between before the job was done: mended in the next revision. */
export interface DemoSetback {
  how: 'returned' | 'stopped' | 'expired' | 'still live';
  reason?: string;
}

/** Drawn for the demo: where each belongs is in `photos.ts`. */
export type DemoPhoto = 'label' | 'schedule' | 'cover' | 'finished';

export interface DemoScenario {
  /** The work order: also what a later start knows the worksheet by. */
  workOrder: string;
  /** The part of the e-mail address before the at sign. */
  lead: string;
  helpers: string[];
  supervisor: string;
  site: string;
  /** 0: planned around now, and moved there again at every start. */
  daysAgo: number;
  until: DemoStage;
  demo: DemoJob;
  /** Saved first; the plan above then mends what it stops at. */
  first?: DemoJob;
  question?: { by: string; text: string; answer?: string };
  setbacks?: DemoSetback[];
  photos?: DemoPhoto[];
  /** Why it was returned, stopped or voided; by the supervisor, the first helper or the lead. */
  reason?: string;
}

const batterySource = locked({
  id: 's2',
  kind: 'battery unit',
  from: 'Battery unit inside luminaire C6',
  openedAt: 'battery connector',
  held: 'exclusive control',
});
const normal = (from: string) => locked({ id: 's1', kind: 'normal', from });
const toldTheDesk = {
  toldTo: 'Building control room, 10 minutes before',
  interim: 'Corridor closed at both doors, two battery lanterns standing',
};

const driversWithBattery: DemoJob = {
  job: {
    area: 'Level 2 corridor',
    equipment: 'LED panels C1 to C6, linear',
    task: 'replace driver or ballast',
    description: 'Replace the drivers of C3 and C6. C6 has its own emergency battery.',
  },
  supply: { panel: 'LP-2', circuit: '14' },
  egressSupply: ['battery units'],
  egressReaches: 'this equipment',
  egress: toldTheDesk,
  sources: [normal('LP-2 circuit 14'), batterySource],
};
const batteryLeftConnected: DemoJob = {
  ...driversWithBattery,
  sources: [normal('LP-2 circuit 14'), { ...batterySource, openedAt: 'breaker', held: 'lock' }],
};

const clinicLamps: DemoJob = {
  job: {
    area: 'Waiting room',
    equipment: 'Wall lights W1 to W8',
    task: 'replace lamp',
    description: 'Replace eight lamps, sockets looked at for heat marks.',
  },
  supply: {
    system: '208Y/120',
    circuitVolts: 120,
    panel: 'L-1',
    circuit: '5',
    watts: 320,
    readings: { phaseToPhase: [208, 207, 209], phaseToNeutral: [120, 121, 120] },
    conductorColors: ['black', 'white'],
  },
};

/** The latest worksheets, oldest first: every state that a worksheet can be met in. */
export const DEMO_SCENARIOS: DemoScenario[] = [
  {
    workOrder: 'AC-3107',
    lead: 'lead',
    helpers: ['ignacio'],
    supervisor: 'beatrix',
    site: 'Ashgrove Commons',
    daysAgo: 9,
    until: 'closed',
    first: {
      ...batteryLeftConnected,
      job: { ...driversWithBattery.job, area: 'Level 1 corridor' },
    },
    photos: ['label', 'schedule', 'cover', 'finished'],
    demo: { ...driversWithBattery, job: { ...driversWithBattery.job, area: 'Level 1 corridor' } },
    question: {
      by: 'ignacio',
      text: '¿Puedo sostener la escalera?',
      answer: 'No: it stands inside the barricade until it is proved dead.',
    },
  },
  {
    workOrder: 'CC-0912',
    lead: 'winona',
    helpers: ['ignacio'],
    supervisor: 'supervisor',
    site: 'Copperleaf Clinic',
    daysAgo: 6,
    until: 'closed',
    demo: clinicLamps,
  },
  {
    workOrder: 'BD-2240',
    lead: 'casimir',
    helpers: ['helper'],
    supervisor: 'beatrix',
    site: 'Brackenfield Distribution Hall',
    daysAgo: 3,
    until: 'stopped',
    reason: 'not as described',
    demo: {
      job: {
        area: 'Dock 2',
        equipment: 'High bays H4 to H9',
        task: 'replace luminaire',
        description: 'Replace six high bays from the lift.',
      },
      supply: { panel: 'HB-1', circuit: '3', watts: 900 },
      surroundings: {
        access: 'lift',
        lift: { fallProtection: true, operatorTrained: true, insulating: false },
        groundedSurfaces: [
          { kind: 'structural steel', inReach: true, covered: false, keptClear: true },
        ],
      },
    },
  },
  {
    workOrder: 'AC-3121',
    lead: 'lead',
    helpers: ['helper'],
    supervisor: 'supervisor',
    site: 'Ashgrove Commons',
    daysAgo: 1,
    until: 'returned',
    reason: 'The traveler at stair C is not listed.',
    demo: {
      job: {
        area: 'Stair C, level 1',
        equipment: 'Stair lights SC-1 to SC-4',
        task: 'replace driver or ballast',
        description: 'Replace the ballast of SC-2.',
      },
      supply: { panel: 'LP-3', circuit: '4', watts: 260 },
    },
  },
  {
    workOrder: 'AC-3125',
    lead: 'casimir',
    helpers: ['ignacio'],
    supervisor: 'supervisor',
    site: 'Ashgrove Commons',
    daysAgo: 1,
    until: 'expired',
    demo: {
      job: {
        area: 'Lobby',
        equipment: 'Downlights D1 to D12',
        task: 'replace lamp',
        description: 'Replace twelve retrofit lamps.',
      },
      supply: { panel: 'LP-2', circuit: '8', watts: 480 },
    },
  },
  {
    workOrder: 'AC-3130',
    lead: 'lead',
    helpers: ['helper'],
    supervisor: 'supervisor',
    site: 'Ashgrove Commons',
    daysAgo: 0,
    until: 'in-force',
    photos: ['schedule'],
    demo: {
      job: {
        area: 'Level 3 open office',
        equipment: 'Troffers T8 to T11',
        task: 'replace driver or ballast',
        description: 'Replace two drivers that flicker.',
      },
      supply: { panel: 'LP-3', circuit: '6', watts: 360, switching: ['two or more places'] },
      sources: [
        normal('LP-3 circuit 6'),
        locked({
          id: 's2',
          kind: 'traveler',
          from: 'Three-way switches at both doors',
          sameConductorsAs: 's1',
        }),
      ],
    },
  },
  {
    workOrder: 'AC-3131',
    lead: 'casimir',
    helpers: ['ignacio'],
    supervisor: 'beatrix',
    site: 'Ashgrove Commons',
    daysAgo: 0,
    until: 'proved',
    photos: ['label', 'cover'],
    demo: {
      job: {
        area: 'Parking level P1',
        equipment: 'Vapor-tight luminaires P1-05 and P1-06',
        task: 'replace luminaire',
        description: 'Replace two luminaires hit by a van.',
      },
      supply: { panel: 'LP-2', circuit: '10', watts: 160 },
    },
  },
  {
    workOrder: 'BD-2251',
    lead: 'winona',
    helpers: ['helper'],
    supervisor: 'supervisor',
    site: 'Brackenfield Distribution Hall',
    daysAgo: 0,
    until: 'in-force',
    demo: {
      job: {
        area: 'Aisle 14',
        equipment: 'High bay H21',
        task: 'test or troubleshoot',
        description: 'Find out why H21 stays dark: read the voltage at the junction box.',
        pointsOfWork: 1,
      },
      supply: { panel: 'HB-1', circuit: '5', watts: 200 },
      decision: {
        mode: 'energized',
        reason: 'testing',
        explanation: 'Whether voltage arrives can only be read while the circuit is live.',
      },
      arcFlash: { task: 'voltage test' },
      helperTrainedInRescue: true,
    },
  },
  {
    workOrder: 'AC-3132',
    lead: 'lead',
    helpers: ['helper', 'ignacio'],
    supervisor: 'supervisor',
    site: 'Ashgrove Commons',
    daysAgo: 0,
    until: 'countersign',
    question: { by: 'helper', text: '¿Quién vigila la puerta mientras estamos arriba?' },
    demo: {
      job: {
        area: 'Library, reading room',
        equipment: 'Pendants R1 to R6',
        task: 'replace luminaire',
        description: 'Replace two pendants with cracked shades.',
      },
      supply: { panel: 'LP-2', circuit: '12', watts: 300 },
    },
  },
  {
    workOrder: 'BD-2252',
    lead: 'casimir',
    helpers: ['helper'],
    supervisor: 'supervisor',
    site: 'Brackenfield Distribution Hall',
    daysAgo: 0,
    until: 'countersign',
    first: {
      ...batteryLeftConnected,
      job: {
        area: 'Shift office',
        equipment: 'LED panels S1 and S2',
        task: 'replace battery unit',
        description: 'Replace the battery unit of S2, which fails its monthly test.',
      },
      supply: { panel: 'HB-1', circuit: '2', watts: 90 },
    },
    demo: {
      ...driversWithBattery,
      job: {
        area: 'Shift office',
        equipment: 'LED panels S1 and S2',
        task: 'replace battery unit',
        description: 'Replace the battery unit of S2, which fails its monthly test.',
      },
      supply: { panel: 'HB-1', circuit: '2', watts: 90 },
      sources: [
        normal('HB-1 circuit 2'),
        { ...batterySource, from: 'Battery unit inside luminaire S2' },
      ],
    },
  },
  {
    workOrder: 'AC-3133',
    lead: 'lead',
    helpers: ['helper'],
    supervisor: 'supervisor',
    site: 'Ashgrove Commons',
    daysAgo: 0,
    until: 'briefing',
    demo: {
      job: {
        area: 'Meeting rooms 2.10 to 2.14',
        equipment: 'Recessed lights M1 to M10',
        task: 'replace lamp',
        description: 'Replace ten lamps, tombstones looked at.',
        lamps: 'double-ended',
      },
      supply: { panel: 'LP-2', circuit: '16', watts: 380 },
    },
  },
  {
    workOrder: 'AC-3134',
    lead: 'lead',
    helpers: ['helper'],
    supervisor: 'supervisor',
    site: 'Ashgrove Commons',
    daysAgo: 0,
    until: 'draft',
    demo: batteryLeftConnected,
  },
];
