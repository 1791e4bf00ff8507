import { assess, BRIEFING_TOPICS } from '@/hazard';
import type { CloseOut, Proof, VoltageReading, WorksheetContent } from '@/hazard';

/**
 * Worksheets that answer every question soundly, one for each path, for tests
 * to spoil one answer at a time. All people, places and figures are invented.
 */
export interface SoundWorksheet {
  on: string;
  content: WorksheetContent;
  proof: Proof;
  closeOut: CloseOut;
}

const on = '2026-12-01T09:00:00-06:00';

const content: WorksheetContent = {
  job: {
    siteId: '0190b5a4-0000-7000-8000-0000000000a1',
    area: 'Level 1 hall',
    equipment: 'Pendant luminaires, row A',
    task: 'replace luminaire',
    description: 'Replace two pendants.',
    workOrder: 'W-77',
    startsAt: '2026-12-01T08:00:00-06:00',
    endsAt: '2026-12-01T12:00:00-06:00',
    occupied: false,
    pointsOfWork: 2,
    special: ['none of these'],
    crossesShift: false,
    lamps: 'other',
  },
  supply: {
    system: '208Y/120',
    circuitVolts: 120,
    exposure: 'one circuit',
    movableConductors: false,
    panel: 'LA-1',
    circuit: '7',
    watts: 600,
    readings: {
      phaseToPhase: [208, 207, 209],
      phaseToNeutral: [120, 121, 120],
    },
    conductorColors: ['black', 'white'],
    neutralShared: 'no',
    switching: ['two or more places'],
    tripped: 'no',
    damage: false,
  },
  egressSupply: ['generator'],
  egressReaches: 'this equipment',
  egress: {
    toldTo: 'Building desk',
    interim: 'Hall closed, temporary lights at both doors',
  },
  sources: [
    {
      id: 's1',
      kind: 'normal',
      from: 'LA-1 ckt 7',
      openedAt: 'breaker',
      allPhasesOpened: true,
      upstreamOfTransfer: false,
      held: 'lock and tag',
      lockNumber: '12',
      lockedBy: ['c1'],
      byCrewId: 'c1',
    },
    {
      id: 's2',
      kind: 'generator',
      from: 'LA-1 ckt 7, load side of the transfer switch',
      sameConductorsAs: 's1',
      openedAt: 'breaker',
      allPhasesOpened: true,
      upstreamOfTransfer: false,
      held: 'lock and tag',
      lockNumber: '12',
      lockedBy: ['c1'],
      byCrewId: 'c1',
    },
    {
      id: 's3',
      kind: 'traveler',
      from: 'switch at door 2',
      sameConductorsAs: 's1',
      openedAt: 'breaker',
      allPhasesOpened: true,
      held: 'lock and tag',
      lockNumber: '12',
      lockedBy: ['c1'],
      byCrewId: 'c1',
    },
  ],
  decision: {
    mode: 'off',
  },
  absenceTest: {
    instrument: 'contact',
    category: 'III',
    ratedVolts: 600,
    leadsInspected: true,
    byCrewId: 'c1',
  },
  arcFlash: {
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
    availableFaultKiloamperes: 8,
    clearingSeconds: 0.02,
    clothingRatingCalPerCm2: 8,
  },
  protectiveEquipment: {
    gloves: {
      gloveClass: '00',
      lastTestedOn: '2026-09-01',
      issuedOn: '2026-08-01',
      airTested: true,
      leatherProtectors: true,
    },
    ready: [
      'rubber-insulating-gloves',
      'leather-protectors',
      'insulated-probes',
      'safety-glasses',
      'nonconductive-hard-hat',
      'nonmelting-clothing',
      'arc-rated-shirt-and-trousers',
      'hearing-protection',
      'leather-footwear',
      'arc-rated-face-shield-or-hood',
      'contact-tester',
      'known-source',
      'clamp-ammeter',
      'lock-and-tag',
      'written-lockout-procedure',
      'nonconductive-ladder',
      'work-light',
    ],
  },
  surroundings: {
    groundedSurfaces: [
      {
        kind: 'duct',
        inReach: true,
        covered: false,
        keptClear: true,
      },
    ],
    access: 'stepladder',
    ladder: {
      material: 'fiberglass',
      sizeFeet: 6,
      standingLevelFeet: 4,
      placed: true,
    },
    ceilingHeightFeet: 9,
    ceiling: 'no suspect material',
    lightAdequate: true,
    wet: false,
    conductiveArticlesRemoved: true,
    peopleMayApproach: false,
    outdoors: false,
  },
  crew: [
    {
      id: 'c1',
      userId: '0190b5a4-0000-7000-8000-0000000000b1',
      name: 'Lead',
      lead: true,
      qualified: true,
      qualifiedThrough: '2028-01-01',
      closest: 'restricted',
      arcRated: true,
      rescueTrained: true,
      worksOnCircuit: true,
    },
    {
      id: 'c2',
      userId: '0190b5a4-0000-7000-8000-0000000000b2',
      name: 'Helper',
      lead: false,
      qualified: false,
      closest: 'outside all boundaries',
      worksOnCircuit: false,
    },
  ],
  briefing: {
    topics: [],
    emergency: {
      contact: '911',
      rescue: 'Open LA-1 main',
      firstAid: 'Lead',
      aedAt: 'Reception',
    },
  },
};

/** Every unordered pair of the conductors at every point, each read at 0 V. */
export function zeroReadings(
  points: string[],
  conductors: NonNullable<VoltageReading['from']>[],
  at = '2026-12-01T08:50:00-06:00',
): VoltageReading[] {
  return points.flatMap((point) =>
    conductors.flatMap((from, index) =>
      conductors
        .slice(index + 1)
        .map((to): VoltageReading => ({ point, from, to, volts: 0, current: 'ac', at })),
    ),
  );
}

const proof: Proof = {
  openedSources: ['s1', 's2', 's3'],
  controlsOperated: true,
  provedBefore: true,
  provedAfter: true,
  otherLiveParts: 'guarded',
  storedEnergy: 'discharged',
  readings: zeroReadings(['A1', 'A2'], ['B', 'N', 'G']),
};

const closeOut: CloseOut = {
  toolsClear: true,
  peopleWarned: true,
  peopleClear: true,
  restored: true,
  coversOn: true,
  locksRemoved: true,
  egressTestedSeconds: 0,
  egressLit: true,
};

/**
 * `root` with the value at a JSON Pointer replaced. `undefined`
 * takes the key (or the list's member) out; missing parents are made.
 */
export function withPath<T>(root: T, pointer: string, value: unknown): T {
  return replaced(
    root,
    pointer.split('/').filter((key) => key !== ''),
    value,
  ) as T;
}

/** Copies along the way only: the rest is shared, and nothing here changes what it is given. */
function replaced(node: unknown, keys: string[], value: unknown): unknown {
  const [key, ...rest] = keys;
  if (key === undefined) return value;
  const copy: unknown = Array.isArray(node)
    ? [...(node as unknown[])]
    : typeof node === 'object' && node !== null
      ? { ...node }
      : {};
  const parent = copy as Record<string, unknown>;
  if (rest.length > 0) parent[key] = replaced(parent[key], rest, value);
  else if (value !== undefined) parent[key] = value;
  else if (Array.isArray(copy)) copy.splice(Number(key), 1);
  else delete parent[key];
  return copy;
}

/** The content with every required item at hand. */
export function withEverythingAtHand(
  given: WorksheetContent,
  options: Parameters<typeof assess>[1],
): WorksheetContent {
  const ready = assess(given, options).equipment.map((item) => item.id);
  return withPath(given, '/protectiveEquipment/ready', ready);
}

/** What is at hand is typed out, not asked of `assess`: a sound worksheet is made before any test runs. */
function built(edits: Record<string, unknown>): SoundWorksheet {
  let edited = withPath(structuredClone(content), '/briefing/topics', [...BRIEFING_TOPICS]);
  for (const [pointer, value] of Object.entries(edits)) edited = withPath(edited, pointer, value);
  return {
    on,
    content: edited,
    proof: structuredClone(proof),
    closeOut: structuredClone(closeOut),
  };
}

/** What both energized paths ask for at the sound worksheet's circuit. */
const AT_HAND_LIVE = [
  'rubber-insulating-gloves',
  'leather-protectors',
  'insulated-tools',
  'safety-glasses',
  'nonconductive-hard-hat',
  'nonmelting-clothing',
  'arc-rated-shirt-and-trousers',
  'hearing-protection',
  'leather-footwear',
  'arc-rated-face-shield-or-hood',
  'nonconductive-ladder',
];

/** Two pendants replaced with the circuit off: `ready` at every stage. */
export function soundWorksheet(): SoundWorksheet {
  return built({});
}

/** The same circuit tested while it is live. */
export function soundTestingWorksheet(): SoundWorksheet {
  return built({
    '/job/task': 'test or troubleshoot',
    '/job/description': 'Find out why row A stays dark.',
    '/decision': {
      mode: 'energized',
      reason: 'testing',
      explanation: 'The voltage can only be read while the circuit is live.',
    },
    '/arcFlash/task': 'voltage test',
    '/crew/1/rescueTrained': true,
    '/protectiveEquipment/ready': [...AT_HAND_LIVE, 'contact-tester', 'known-source'],
  });
}

/** A driver replaced with the circuit live, because an outage stops ventilation. */
export function soundEnergizedWorksheet(): SoundWorksheet {
  return built({
    '/job/task': 'replace driver or ballast',
    '/job/description': 'Replace one driver.',
    '/decision': {
      mode: 'energized',
      reason: 'additional hazard',
      explanation: 'The same circuit feeds the fans of the solvent store.',
      hazard: 'ventilation',
      outageRefusedBy: 'Building engineer',
      permit: {
        number: 'EP-3',
        approvedBy: 'Plant manager',
        validUntil: '2026-12-01T12:00:00-06:00',
      },
    },
    '/arcFlash/task': 'energized work',
    '/surroundings/groundedSurfaces/0/covered': true,
    '/crew/1/rescueTrained': true,
    '/protectiveEquipment/ready': [...AT_HAND_LIVE, 'insulating-covers'],
  });
}
