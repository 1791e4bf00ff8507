import { createHash } from 'node:crypto';
import canonicalize from 'canonicalize';
import { assess } from '@/hazard';
import type { Proof, WorksheetContent } from '@/hazard';
import type { PdfInput } from '@/server/pdf/input';
import type { Signature, WorksheetRecord } from '@/shared/record';
import { withEverythingAtHand, zeroReadings } from './soundWorksheet';

const ON = '2026-12-01T09:00:00-06:00';
const AT = (clock: string) => `2026-12-01T${clock}:00-06:00`;
const LEAD = '0190b5a4-0000-7000-8000-0000000000b1';
const HELPER = '0190b5a4-0000-7000-8000-0000000000b2';
const SUPERVISOR = '0190b5a4-0000-7000-8000-0000000000b3';

/** Drivers replaced in a 480Y/277 corridor with battery units: all invented. */
export function corridorContent(): WorksheetContent {
  const content: WorksheetContent = {
    job: {
      siteId: '0190b5a4-0000-7000-8000-0000000000a1',
      area: 'Building 4, level 2 corridor',
      equipment: 'Luminaires F1 to F4',
      task: 'replace driver or ballast',
      description: 'Replace four drivers that flicker, test each luminaire, put the tiles back.',
      workOrder: 'K-2207',
      startsAt: AT('08:00'),
      endsAt: AT('12:00'),
      occupied: true,
      pointsOfWork: 4,
      special: ['none of these'],
      crossesShift: false,
    },
    supply: {
      system: '480Y/277',
      circuitVolts: 277,
      exposure: 'one circuit',
      movableConductors: false,
      panel: 'HL-3',
      circuit: '9',
      watts: 2200,
      readings: { phaseToPhase: [482, 480, 481], phaseToNeutral: [277, 278, 277] },
      conductorColors: ['brown', 'gray'],
      neutralShared: 'no',
      switching: ['two or more places'],
      tripped: 'no',
      damage: false,
    },
    egressSupply: ['battery units'],
    egressReaches: 'this equipment',
    egress: { toldTo: 'Desk of the building', interim: 'A walking watch until it is restored' },
    sources: [
      {
        id: 's1',
        kind: 'normal',
        from: 'HL-3, circuit 9, one pole',
        openedAt: 'breaker',
        held: 'lock and tag',
        lockNumber: '0731',
        lockedBy: ['c1', 'c2'],
        byCrewId: 'c1',
      },
      {
        id: 's2',
        kind: 'traveler',
        from: 'Three-way switch at the west stair',
        sameConductorsAs: 's1',
        openedAt: 'breaker',
        held: 'lock and tag',
        lockNumber: '0731',
        lockedBy: ['c1', 'c2'],
        byCrewId: 'c1',
      },
      {
        id: 's3',
        kind: 'battery unit',
        from: 'Luminaire F2',
        points: ['F2'],
        openedAt: 'battery connector',
        held: 'lock and tag',
        lockNumber: '0732',
        lockedBy: ['c1', 'c2'],
        byCrewId: 'c1',
      },
      {
        id: 's4',
        kind: 'battery unit',
        from: 'Luminaire F4',
        points: ['F4'],
        openedAt: 'battery connector',
        held: 'lock and tag',
        lockNumber: '0733',
        lockedBy: ['c1', 'c2'],
        byCrewId: 'c1',
      },
    ],
    decision: { mode: 'off' },
    absenceTest: {
      instrument: 'contact',
      category: 'III',
      ratedVolts: 1000,
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
      availableFaultKiloamperes: 12,
      clearingSeconds: 0.025,
      clothingRatingCalPerCm2: 12,
    },
    protectiveEquipment: {
      gloves: {
        gloveClass: '00',
        lastTestedOn: '2026-09-01',
        issuedOn: '2026-08-01',
        airTested: true,
        leatherProtectors: true,
      },
      ready: [],
    },
    surroundings: {
      groundedSurfaces: [
        { kind: 'ceiling grid', inReach: true, covered: false, keptClear: true },
        { kind: 'duct', inReach: true, covered: false, keptClear: true },
      ],
      access: 'stepladder',
      ladder: { material: 'fiberglass', sizeFeet: 6, standingLevelFeet: 4, placed: true },
      ceilingHeightFeet: 9,
      ceiling: 'no suspect material',
      lightAdequate: true,
      wet: false,
      conductiveArticlesRemoved: true,
      peopleMayApproach: true,
      barricadeInches: 72,
      attendant: false,
      outdoors: false,
    },
    crew: [
      {
        id: 'c1',
        userId: LEAD,
        name: 'Nadia Okafor',
        lead: true,
        qualified: true,
        qualifiedThrough: '2028-03-31',
        closest: 'restricted',
        arcRated: true,
        rescueTrained: true,
        worksOnCircuit: true,
      },
      {
        id: 'c2',
        userId: HELPER,
        name: 'Tomás Beltrán',
        lead: false,
        qualified: false,
        closest: 'outside all boundaries',
        arcRated: false,
        rescueTrained: true,
        worksOnCircuit: true,
      },
    ],
    briefing: {
      topics: [
        'job and tasks',
        'electrical hazards',
        'shock boundaries and protection',
        'arc flash boundary and protection',
        'work procedures',
        'special precautions',
        'energy source controls',
        'protective equipment',
        'who may come how close',
        'emergency plan',
        'stopping and refusing',
      ],
      emergency: {
        contact: '911, then the desk on 4400',
        rescue: 'Open HL-3 main, hook at the ladder',
        firstAid: 'Tomás Beltrán',
        aedAt: 'Lobby, beside the stair',
      },
    },
    notes: 'The tiles above F3 are stained. No water was found.',
  };
  return withEverythingAtHand(content, { on: ON });
}

export function corridorProof(): Proof {
  const ac = zeroReadings(['F1', 'F2', 'F3', 'F4'], ['A', 'N', 'G'], AT('08:52'));
  const own = (point: string, sourceId: string) => [
    { point, to: 'G' as const, volts: 0.1, sourceId, at: AT('08:55') },
    { point, to: 'A' as const, volts: 0, sourceId, at: AT('08:55') },
    {
      point,
      from: 'N' as const,
      to: 'G' as const,
      volts: -0.2,
      current: 'dc' as const,
      sourceId,
      at: AT('08:56'),
    },
  ];
  return {
    openedSources: ['s1', 's2', 's3', 's4'],
    controlsOperated: true,
    provedBefore: true,
    provedAfter: true,
    otherLiveParts: 'none',
    storedEnergy: 'discharged',
    neutralAmperes: 0,
    readings: [...ac, ...own('F2', 's3'), ...own('F4', 's4')],
  };
}

const strokes: Signature['strokes'] = [
  Array.from({ length: 40 }, (_, step): [number, number] => [
    10 + step * 5,
    60 + Math.sin(step / 2) * 30,
  ]),
  [
    [40, 90],
    [190, 70],
  ],
];

interface Person {
  id: string;
  name: string;
  role: Signature['signer']['role'];
}
const lead: Person = { id: LEAD, name: 'Nadia Okafor', role: 'lead' };
const helper: Person = { id: HELPER, name: 'Tomás Beltrán', role: 'helper' };
const supervisor: Person = { id: SUPERVISOR, name: 'Iris Lindqvist', role: 'supervisor' };

function signature(
  meaning: Signature['meaning'],
  signer: Person,
  clock: string,
  contentHash: string,
  enteredBy: Person = signer,
): Signature {
  return {
    id: `0190b5a4-0000-7000-8000-00000000${clock.replace(':', '')}`,
    meaning,
    signer,
    enteredById: enteredBy.id,
    enteredByName: enteredBy.name,
    revision: 2,
    contentHash,
    signedAt: AT(clock),
    receivedAt: AT(clock),
    method: 'pin',
    strokes,
  };
}

/** The canonical form and its hash, worked out here and not by the code under test. */
export function canonicalOf(content: WorksheetContent): { json: string; hash: string } {
  const json = canonicalize({ worksheetId: 'w', revision: 2, content, attachments: [] }) ?? '';
  return { json, hash: createHash('sha256').update(json).digest('hex') };
}

/** A record in force and proved dead, revision 2, with everything that a record can hold. */
export function buildPdfInput(
  change: {
    content?: WorksheetContent;
    proof?: Proof | null;
    worksheet?: Partial<WorksheetRecord>;
    input?: Partial<PdfInput>;
  } = {},
): PdfInput {
  const content = change.content ?? corridorContent();
  const proof = change.proof === undefined ? corridorProof() : change.proof;
  const assessment = assess(content, { on: ON });
  const work = proof && assess(content, { on: ON, stage: 'work', proof });
  const { json, hash } = canonicalOf(content);
  return {
    worksheet: {
      id: '0190b5a4-0000-7000-8000-0000000000f1',
      number: 'WB-2026-000731',
      state: 'in-force',
      proved: work?.verdict === 'ready',
      revision: 2,
      version: 9,
      content,
      contentHash: hash,
      assessment,
      workAssessment: work,
      signatures: [
        signature('prepared', lead, '08:20', hash),
        signature('acknowledged', helper, '08:26', hash, lead),
        signature('countersigned', supervisor, '08:40', hash),
      ],
      proofs:
        proof && work
          ? [
              {
                id: '0190b5a4-0000-7000-8000-0000000000f2',
                at: AT('08:58'),
                proof,
                assessment: work,
                byId: LEAD,
                byName: lead.name,
                revision: 2,
              },
            ]
          : [],
      closeOut: null,
      questions: [
        {
          id: '0190b5a4-0000-7000-8000-0000000000f3',
          text: 'Does the stair light hang on the same circuit?',
          askedBy: helper,
          askedAt: AT('08:22'),
          revision: 2,
          answer: 'No, on circuit 11. It stays lit.',
          answeredBy: lead,
          answeredAt: AT('08:24'),
        },
      ],
      attachments: [],
      leadId: LEAD,
      leadName: lead.name,
      siteName: 'Harrow Mill',
      timeZone: 'America/Chicago',
      reason: null,
      clearedStops: [{ code: 'sources.battery-connected', path: '/sources/2/openedAt' }],
      createdAt: AT('07:30'),
      updatedAt: AT('08:58'),
      ...change.worksheet,
    },
    latestRevision: 2,
    site: { name: 'Harrow Mill', address: '12 Weir Road' },
    revisions: [
      {
        revision: 1,
        contentHash: '1'.repeat(64),
        createdAt: AT('07:30'),
        createdByName: lead.name,
        state: 'returned',
      },
      {
        revision: 2,
        contentHash: hash,
        createdAt: AT('08:10'),
        createdByName: lead.name,
        state: '',
      },
    ],
    events: [
      { type: 'created', at: AT('07:30'), actorName: lead.name, enteredByName: null },
      { type: 'returned', at: AT('08:05'), actorName: supervisor.name, enteredByName: null },
      { type: 'acknowledged', at: AT('08:26'), actorName: helper.name, enteredByName: lead.name },
      { type: 'proof-recorded', at: AT('08:58'), actorName: lead.name, enteredByName: null },
    ],
    attachments: [],
    verifyUrl: `https://wideberth.example/verify/${hash}`,
    canonicalJson: json,
    edition: 'NFPA 70E-2024',
    ...change.input,
  };
}
