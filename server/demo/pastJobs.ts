import type { DemoJob } from './contents';
import { locked } from './contents';

/** Where and on what: all that differs between two jobs of one kind. */
export interface DemoPlace {
  area: string;
  equipment: string;
  panel: string;
  circuit: string;
  volts: 277 | 120;
  watts: number;
  description: string;
}

function supply({ panel, circuit, volts, watts }: DemoPlace): DemoJob['supply'] {
  const where = { panel, circuit, watts };
  if (volts === 277) return where;
  return {
    ...where,
    system: '208Y/120',
    circuitVolts: 120,
    readings: { phaseToPhase: [208, 207, 209], phaseToNeutral: [120, 121, 120] },
    conductorColors: ['black', 'white'],
  };
}

type Task = NonNullable<DemoJob['job']>['task'];

function job(place: DemoPlace, task: Task): DemoJob {
  const { area, equipment, description } = place;
  return { job: { area, equipment, description, task }, supply: supply(place) };
}

const normal = ({ panel, circuit }: DemoPlace) =>
  locked({ id: 's1', kind: 'normal', from: `${panel} circuit ${circuit}` });
const COVERED: NonNullable<DemoJob['surroundings']> = {
  groundedSurfaces: [{ kind: 'ceiling grid', inReach: true, covered: true }],
};

function testing(place: DemoPlace, task: Task, arcFlash: DemoJob['arcFlash']): DemoJob {
  return {
    ...job(place, task),
    decision: {
      mode: 'energized',
      reason: 'testing',
      explanation: 'What is looked for shows only while the circuit is live.',
    },
    ...(arcFlash === undefined ? {} : { arcFlash }),
    helperTrainedInRescue: true,
    surroundings: COVERED,
  };
}

function looking(place: DemoPlace, task: Task): DemoJob {
  const arcFlash = { task: 'thermography or inspection outside restricted' as const };
  return { ...testing(place, task, arcFlash), leadClosest: 'limited' };
}

/** Every kind of job of the demo's two years, on every path. */
export const JOB_KINDS = {
  lamp: (place) => job(place, 'replace lamp'),
  driver: (place) => job(place, 'replace driver or ballast'),
  luminaire: (place) => job(place, 'replace luminaire'),
  extend: (place) => job(place, 'add or extend circuit'),
  lift: (place) => ({
    ...job(place, 'replace luminaire'),
    surroundings: {
      access: 'lift',
      lift: { fallProtection: true, operatorTrained: true, insulating: false },
      groundedSurfaces: [
        { kind: 'structural steel', inReach: true, covered: false, keptClear: true },
      ],
    },
  }),
  battery: (place) => ({
    ...job(place, 'replace battery unit'),
    egressSupply: ['battery units'],
    egressReaches: 'this equipment',
    egress: {
      toldTo: 'The desk of the building, a quarter of an hour before',
      interim: 'Room closed, two battery lanterns standing',
    },
    sources: [
      normal(place),
      locked({
        id: 's2',
        kind: 'battery unit',
        from: 'Battery unit inside the luminaire',
        openedAt: 'battery connector',
        held: 'exclusive control',
      }),
    ],
  }),
  traveler: (place) => ({
    ...job(place, 'replace driver or ballast'),
    supply: { ...supply(place), switching: ['two or more places'] },
    sources: [
      normal(place),
      locked({
        id: 's2',
        kind: 'traveler',
        from: 'Three-way switches at both doors',
        sameConductorsAs: 's1',
      }),
    ],
  }),
  test: (place) => testing(place, 'test or troubleshoot', { task: 'voltage test' }),
  trace: (place) => testing(place, 'trace circuit', { task: 'voltage test' }),
  inspect: (place) => looking(place, 'inspect'),
  thermography: (place) => looking(place, 'thermography'),
  ventilation: (place) => ({
    ...job(place, 'replace driver or ballast'),
    decision: {
      mode: 'energized',
      reason: 'additional hazard',
      hazard: 'ventilation',
      explanation: 'The same circuit feeds the fans of the solvent store.',
      outageRefusedBy: 'Building engineer, by telephone',
    },
    permitBy: 'Head of facilities',
    arcFlash: { task: 'energized work' },
    helperTrainedInRescue: true,
    surroundings: COVERED,
  }),
  belowFifty: (place) => ({
    ...job(place, 'work on lighting control'),
    supply: { ...supply(place), workVolts: 24, higherVoltsExposed: false },
    decision: {
      mode: 'energized',
      reason: 'below 50 V',
      explanation: 'Only the 24 V control pair in its own box is opened.',
    },
    arcFlash: { task: 'control circuit up to 125 V' },
    helperTrainedInRescue: true,
    surroundings: COVERED,
  }),
} satisfies Record<string, (place: DemoPlace) => DemoJob>;
export type JobKind = keyof typeof JOB_KINDS;

/** What a first version of a plan got wrong: each holds a stop that the lead then mends. */
export const FIRST_FAULTS = {
  'wall switch': (job) => ({
    ...job,
    sources: [{ id: 's1', kind: 'normal', from: 'Panel', openedAt: 'wall switch', held: 'tag' }],
  }),
  'battery forgotten': (job) => ({
    ...job,
    sources: (job.sources ?? []).map((source) =>
      source.kind === 'battery unit' ? { ...source, openedAt: 'breaker', held: 'lock' } : source,
    ),
  }),
  wet: (job) => ({ ...job, surroundings: { ...job.surroundings, wet: true } }),
  'aluminum ladder': (job) => ({
    ...job,
    surroundings: {
      ...job.surroundings,
      ladder: { material: 'aluminum', sizeFeet: 8, standingLevelFeet: 5, placed: true },
    },
  }),
  'proximity only': (job) => ({ ...job, absenceTest: { instrument: 'proximity' } }),
  'live to save time': (job) => ({
    ...job,
    decision: { mode: 'energized', explanation: 'The tenants want light until six.' },
  }),
  'rings on': (job) => ({
    ...job,
    surroundings: { ...job.surroundings, conductiveArticlesRemoved: false },
  }),
} satisfies Record<string, (job: DemoJob) => DemoJob>;
export type FirstFault = keyof typeof FIRST_FAULTS;
