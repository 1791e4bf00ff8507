import type { EnergySource, Proof, VoltageReading, WorksheetContent } from '@/hazard';

/** As many of each as the schema admits, so that the measurement is of the largest worksheet. */
const SOURCES = 40;
const READINGS = 120;
const CREW = 40;

const numbers = (count: number) => Array.from({ length: count }, (_, index) => index + 1);

const sources: EnergySource[] = numbers(SOURCES).map((number) => ({
  id: `s${number}`,
  kind: number === 1 ? 'normal' : 'traveler',
  from: `Panel LA-${number}, circuit ${number}`,
  ...(number > 1 && { sameConductorsAs: 's1' }),
  openedAt: 'breaker',
  allPhasesOpened: true,
  upstreamOfTransfer: false,
  held: 'lock and tag',
  lockNumber: String(100 + number),
  lockedBy: numbers(CREW).map((member) => `c${member}`),
  byCrewId: 'c1',
}));

const ENDS = [
  ['A', 'N'],
  ['A', 'G'],
  ['N', 'G'],
] as const;
const readings: VoltageReading[] = numbers(READINGS).map((number) => {
  const [from, to] = ENDS[number % ENDS.length] ?? ENDS[0];
  return {
    point: `P${Math.ceil(number / ENDS.length)}`,
    from,
    to,
    volts: 0,
    current: 'ac',
    at: '2026-12-01T08:50:00-06:00',
  };
});

/** A worksheet with every section filled and every list at its longest. Invented. */
export const benchContent: WorksheetContent = {
  job: {
    siteId: '0190b5a4-0000-7000-8000-00000000beef',
    area: 'Level 2, open office',
    equipment: 'Recessed luminaires, rows A to F',
    task: 'replace luminaire',
    description: 'Replace the recessed luminaires of the open office, row by row. '.repeat(20),
    startsAt: '2026-12-01T08:00:00-06:00',
    endsAt: '2026-12-01T16:00:00-06:00',
    occupied: true,
    pointsOfWork: 40,
    special: ['none of these'],
    crossesShift: false,
    lamps: 'double-ended',
  },
  supply: {
    system: '480Y/277',
    circuitVolts: 277,
    exposure: 'one circuit',
    movableConductors: true,
    panel: 'HL-2',
    circuit: '14',
    watts: 3200,
    readings: { phaseToPhase: [480, 481, 479], phaseToNeutral: [277, 278, 276] },
    conductorColors: ['brown', 'gray'],
    neutralShared: 'no',
    switching: ['two or more places'],
    tripped: 'no',
    damage: false,
  },
  egressSupply: ['none after checking'],
  sources,
  decision: { mode: 'off' },
  absenceTest: {
    instrument: 'contact',
    category: 'III',
    ratedVolts: 1000,
    leadsInspected: true,
    byCrewId: 'c1',
  },
  arcFlash: {
    equipment: 'junction box',
    workingDistanceInches: 18,
    noLabel: true,
    availableFaultKiloamperes: 14,
    clearingSeconds: 0.03,
    transformer: { kilovoltAmperes: 75, secondaryVolts: 480, impedancePercent: 3, phases: 3 },
    clothingRatingCalPerCm2: 12,
  },
  protectiveEquipment: {
    gloves: {
      gloveClass: '0',
      lastTestedOn: '2026-09-01',
      airTested: true,
      leatherProtectors: true,
    },
    ready: ['rubber-insulating-gloves', 'leather-protectors', 'lock-and-tag'],
  },
  surroundings: {
    groundedSurfaces: [{ kind: 'ceiling grid', inReach: true, covered: true }],
    access: 'stepladder',
    ladder: { material: 'fiberglass', sizeFeet: 8, standingLevelFeet: 5, placed: true },
    ceilingHeightFeet: 10,
    ceiling: 'no suspect material',
    lightAdequate: true,
    wet: false,
    conductiveArticlesRemoved: true,
    peopleMayApproach: true,
    barricadeInches: 120,
    attendant: false,
    outdoors: false,
  },
  crew: numbers(CREW).map((number) => ({
    id: `c${number}`,
    name: `Person ${number}`,
    lead: number === 1,
    qualified: number < 20,
    qualifiedThrough: '2028-01-01',
    closest: number === 1 ? 'restricted' : 'outside all boundaries',
    arcRated: true,
    rescueTrained: true,
    worksOnCircuit: true,
  })),
  briefing: {
    topics: ['job and tasks', 'electrical hazards'],
    emergency: { contact: '911', rescue: 'Open HL-2 main', firstAid: 'Person 2', aedAt: 'Lobby' },
  },
  notes: 'Rows are done in the order of the plan. '.repeat(20),
};

export const benchProof: Proof = {
  openedSources: sources.flatMap(({ id }) => (id === undefined ? [] : [id])),
  controlsOperated: true,
  provedBefore: true,
  provedAfter: true,
  otherLiveParts: 'none',
  neutralAmperes: 0,
  storedEnergy: 'none after checking',
  readings,
};
