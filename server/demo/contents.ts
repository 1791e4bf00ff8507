import { assess, BRIEFING_TOPICS } from '@/hazard';
import type { Conductor, VoltageReading } from '@/hazard';
import type { CloseOut, Proof, WorksheetContent } from '@/shared/worksheet';

/** Who and where a demo worksheet is about. */
export interface DemoSetting {
  siteId: string;
  lead: { id: string; name: string };
  helpers: { id: string; name: string }[];
  glovesId: string | undefined;
  emergency: { contact?: string; rescue?: string; firstAid?: string; aedAt?: string };
  desk: string;
  startsAt: string;
  endsAt: string;
  /** When the plan is signed, with offset. */
  on: string;
}

type Section<K extends keyof WorksheetContent> = Partial<NonNullable<WorksheetContent[K]>>;

/** What sets one job apart from the base: everything else is the same sound plan. */
export interface DemoJob {
  job: Section<'job'>;
  supply: Section<'supply'>;
  egressSupply?: WorksheetContent['egressSupply'];
  egressReaches?: WorksheetContent['egressReaches'];
  egress?: WorksheetContent['egress'];
  sources?: WorksheetContent['sources'];
  decision?: WorksheetContent['decision'];
  arcFlash?: Section<'arcFlash'>;
  surroundings?: Section<'surroundings'>;
  absenceTest?: Section<'absenceTest'>;
  /** How near the lead comes; inside the restricted boundary where nothing is said. */
  leadClosest?: 'restricted' | 'limited';
  /** Who gives the permit that the energized path asks for. */
  permitBy?: string;
  notes?: string;
  /** The helper knows how to release and revive, which energized work asks for. */
  helperTrainedInRescue?: boolean;
}

type Source = NonNullable<WorksheetContent['sources']>[number];

/** A source opened at its breaker and locked there by the lead. */
export function locked(source: Source): Source {
  return {
    openedAt: 'breaker',
    allPhasesOpened: true,
    upstreamOfTransfer: false,
    held: 'lock and tag',
    lockNumber: '0418',
    lockedBy: ['c1'],
    byCrewId: 'c1',
    ...source,
  };
}

function crewOf(
  { lead, helpers }: DemoSetting,
  { helperTrainedInRescue, leadClosest = 'restricted' }: DemoJob,
) {
  return [
    {
      id: 'c1',
      userId: lead.id,
      name: lead.name,
      lead: true,
      closest: leadClosest,
      arcRated: true,
      rescueTrained: true,
      worksOnCircuit: true,
    },
    ...helpers.map((helper, index) => ({
      id: `c${index + 2}`,
      userId: helper.id,
      name: helper.name,
      lead: false,
      closest: 'outside all boundaries' as const,
      arcRated: false,
      ...(helperTrainedInRescue === true ? { rescueTrained: true } : {}),
      worksOnCircuit: false,
    })),
  ];
}

const ARC_FLASH: NonNullable<WorksheetContent['arcFlash']> = {
  equipment: 'luminaire',
  normal: {
    installed: true,
    maintained: true,
    ratedForFault: true,
    usedAsListed: true,
    doorsClosed: true,
    coversOn: true,
    noSignOfFailure: true,
  },
  workingDistanceInches: 18,
  noLabel: true,
  availableFaultKiloamperes: 14,
  clearingSeconds: 0.02,
  clothingRatingCalPerCm2: 8,
};

const SURROUNDINGS: NonNullable<WorksheetContent['surroundings']> = {
  groundedSurfaces: [
    { kind: 'ceiling grid', inReach: true, covered: false, keptClear: true },
    { kind: 'duct', inReach: true, covered: false, keptClear: true },
  ],
  access: 'stepladder',
  ladder: { material: 'fiberglass', sizeFeet: 8, standingLevelFeet: 5, placed: true },
  ceilingHeightFeet: 10,
  ceiling: 'no suspect material',
  lightAdequate: true,
  wet: false,
  conductiveArticlesRemoved: true,
  peopleMayApproach: false,
  outdoors: false,
};

function decisionOf({ endsAt }: DemoSetting, { decision, permitBy, job }: DemoJob) {
  if (permitBy === undefined) return decision ?? { mode: 'off' as const };
  const permit = { number: `EP-${job.workOrder ?? ''}`, approvedBy: permitBy, validUntil: endsAt };
  return { ...decision, permit };
}

/** A whole plan for one invented job, with every answer that the job's rules ask for. */
export function demoContent(setting: DemoSetting, demo: DemoJob): WorksheetContent {
  const { siteId, startsAt, endsAt, glovesId, emergency, on } = setting;
  const { panel = 'LP-2', circuit = '14' } = demo.supply;
  const content: WorksheetContent = {
    job: {
      siteId,
      startsAt,
      endsAt,
      occupied: false,
      pointsOfWork: 2,
      special: ['none of these'],
      crossesShift: false,
      lamps: 'other',
      ...demo.job,
    },
    supply: {
      system: '480Y/277',
      circuitVolts: 277,
      exposure: 'one circuit',
      movableConductors: false,
      panel,
      circuit,
      watts: 840,
      readings: { phaseToPhase: [481, 479, 482], phaseToNeutral: [277, 276, 278] },
      conductorColors: ['brown', 'gray'],
      neutralShared: 'no',
      switching: ['one place'],
      tripped: 'no',
      damage: false,
      ...demo.supply,
    },
    egressSupply: demo.egressSupply ?? ['none after checking'],
    ...(demo.egressReaches === undefined ? {} : { egressReaches: demo.egressReaches }),
    ...(demo.egress === undefined ? {} : { egress: demo.egress }),
    sources: demo.sources ?? [
      locked({ id: 's1', kind: 'normal', from: `${panel} circuit ${circuit}` }),
    ],
    decision: decisionOf(setting, demo),
    absenceTest: {
      instrument: 'contact',
      category: 'III',
      ratedVolts: 1000,
      leadsInspected: true,
      byCrewId: 'c1',
      ...demo.absenceTest,
    },
    arcFlash: { ...ARC_FLASH, ...demo.arcFlash },
    protectiveEquipment: {
      ...(glovesId === undefined ? {} : { rubberGoodsId: glovesId }),
      gloves: { airTested: true, leatherProtectors: true },
    },
    surroundings: { ...SURROUNDINGS, ...demo.surroundings },
    crew: crewOf(setting, demo),
    briefing: { topics: [...BRIEFING_TOPICS], emergency },
    ...(demo.notes === undefined ? {} : { notes: demo.notes }),
  };
  const ready = assess(content, { on }).equipment.map(({ id }) => id);
  return { ...content, protectiveEquipment: { ...content.protectiveEquipment, ready } };
}

/** Zeros between all of a point's conductors. */
function zeros(points: string[], conductors: Conductor[], at: string): VoltageReading[] {
  return points.flatMap((point) =>
    conductors.flatMap((from, index) =>
      conductors
        .slice(index + 1)
        .map((to): VoltageReading => ({ point, from, to, volts: 0.1, current: 'ac', at })),
    ),
  );
}

/** Zeros on a source with conductors of its own, alternating and direct. */
function zerosOf(sourceId: string, points: string[], at: string): VoltageReading[] {
  return points.flatMap((point) =>
    (['ac', 'dc'] as const).flatMap((current) =>
      (['G', 'A'] as const).map((to): VoltageReading => ({
        point,
        to,
        sourceId,
        volts: 0,
        current,
        at,
      })),
    ),
  );
}

/** A proof that leaves nothing open for an off-path demo plan. */
export function demoProof(content: WorksheetContent, at: string): Proof {
  const points = Array.from(
    { length: content.job?.pointsOfWork ?? 1 },
    (_, index) => `Luminaire ${index + 1}`,
  );
  const sources = content.sources ?? [];
  const separate = sources.filter(
    ({ kind, sameConductorsAs }) => kind !== 'normal' && sameConductorsAs === undefined,
  );
  return {
    openedSources: sources.flatMap(({ id }) => id ?? []),
    controlsOperated: true,
    provedBefore: true,
    provedAfter: true,
    otherLiveParts: 'guarded',
    neutralAmperes: 0,
    storedEnergy: 'discharged',
    readings: [
      ...zeros(points, ['A', 'N', 'G'], at),
      ...separate.flatMap(({ id }) => zerosOf(id ?? '', points, at)),
    ],
  };
}

/** The same test where one conductor of the first point still reads its full voltage to ground. */
export function liveProof(content: WorksheetContent, at: string): Proof {
  const proof = demoProof(content, at);
  const volts = content.supply?.circuitVolts ?? 120;
  const [point] = proof.readings ?? [];
  return {
    ...proof,
    readings: (proof.readings ?? []).map((reading) =>
      reading.point === point?.point && reading.from === 'A' && reading.to === 'G'
        ? { ...reading, volts }
        : reading,
    ),
  };
}

/** The end of a job where everything went back as it was. */
export const DEMO_CLOSE_OUT: CloseOut = {
  toolsClear: true,
  peopleWarned: true,
  peopleClear: true,
  restored: true,
  coversOn: true,
  locksRemoved: true,
  faultRepaired: true,
  egressTestedSeconds: 30,
  egressLit: true,
};
