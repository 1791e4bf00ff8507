import type { FirstFault, JobKind } from './pastJobs';
import { FIRST_FAULTS, JOB_KINDS } from './pastJobs';
import type { DemoScenario, DemoStage } from './scenarios';

type Place = readonly [area: string, equipment: string, panelAndCircuit: string, watts: number];

interface Past {
  /** Days before today. */
  ago: number;
  /** Work order; its first letters name the site. */
  order: string;
  lead: string;
  helpers: string[];
  kind: JobKind;
  at: Place;
  description: string;
  until?: DemoStage;
  first?: FirstFault;
  reason?: string;
  setbacks?: DemoScenario['setbacks'];
  question?: DemoScenario['question'];
  photos?: DemoScenario['photos'];
}

const SITES: Record<string, { site: string; supervisor: string }> = {
  AC: { site: 'Ashgrove Commons', supervisor: 'supervisor' },
  BD: { site: 'Brackenfield Distribution Hall', supervisor: 'beatrix' },
  CC: { site: 'Copperleaf Clinic', supervisor: 'supervisor' },
  DS: { site: 'Dunmore Science Hall', supervisor: 'perpetua' },
  EC: { site: 'Eastlake Cold Store', supervisor: 'perpetua' },
  FL: { site: 'Fernhollow Library', supervisor: 'perpetua' },
};
/** Panels of 208Y/120; every other panel of the demo's past feeds 277 V. */
const PANELS_OF_120 = ['RP-1', 'L-1', 'LS-1', 'LR-1', 'LB-1', 'LB-2'];

function scenario({ kind, at, order, first, description, ...past }: Past): DemoScenario {
  const [area, equipment, panelAndCircuit, watts] = at;
  const [panel = '', circuit = ''] = panelAndCircuit.split('/');
  const volts = PANELS_OF_120.includes(panel) ? 120 : 277;
  const demo = JOB_KINDS[kind]({ area, equipment, panel, circuit, watts, volts, description });
  const { site, supervisor } = SITES[order.slice(0, 2)] ?? { site: '', supervisor: '' };
  const { ago, until = 'closed', ...rest } = past;
  return {
    ...{ workOrder: order, site, supervisor, demo, until, daysAgo: ago },
    ...(first === undefined ? {} : { first: FIRST_FAULTS[first](demo) }),
    ...rest,
  };
}

const ALL_PHOTOS: Past['photos'] = ['label', 'schedule', 'cover', 'finished'];

const FIRST_YEAR: Past[] = [
  {
    ...{ ago: 724, order: 'AC-2204', lead: 'lead', helpers: ['helper'], kind: 'lamp' },
    at: ['Level 1 restrooms', 'Downlights R1 to R8', 'LP-2/8', 240],
    description: 'Replace eight lamps.',
    photos: ['schedule', 'finished'],
  },
  {
    ...{ ago: 711, order: 'FL-0031', lead: 'fintan', helpers: ['rufus'], kind: 'driver' },
    at: ['Reading room', 'Pendants P1 to P6', 'LB-1/3', 420],
    description: 'Replace the driver of P4.',
    first: 'wall switch',
  },
  {
    ...{ ago: 698, order: 'EC-1102', lead: 'ilse', helpers: ['yolotzin'], kind: 'lift' },
    at: ['Freezer 2, aisle 3', 'High bays F2-31 to F2-36', 'CS-L1/3', 900],
    description: 'Replace six high bays from the lift.',
    photos: ['label', 'cover'],
  },
  {
    ...{ ago: 684, order: 'DS-0410', lead: 'ilse', helpers: ['yolotzin'], kind: 'test' },
    at: ['Laboratory 212', 'Troffer T3', 'LH-1/5', 120],
    description: 'Read the voltage at the junction box of T3.',
  },
  {
    ...{ ago: 670, order: 'BD-1871', lead: 'casimir', helpers: ['helper'], kind: 'lift' },
    at: ['Aisle 2', 'High bays H2-1 to H2-4', 'HB-1/2', 800],
    description: 'Replace four high bays.',
    setbacks: [{ how: 'stopped', reason: 'equipment damaged or wet' }],
  },
  {
    ...{ ago: 655, order: 'CC-0621', lead: 'winona', helpers: ['ignacio'], kind: 'lamp' },
    at: ['Corridor B', 'Wall lights B1 to B10', 'L-1/3', 180],
    description: 'Replace ten lamps.',
    question: {
      by: 'ignacio',
      text: '¿La puerta de urgencias queda abierta?',
      answer: 'Yes, the barricade ends before it. Nobody passes under the ladder.',
    },
  },
  {
    ...{ ago: 641, order: 'AC-2261', lead: 'casimir', helpers: ['ignacio'], kind: 'battery' },
    at: ['Stair A', 'Stair light SA-3', 'LP-3/2', 60],
    description: 'Replace the battery unit of SA-3.',
    first: 'battery forgotten',
    photos: ALL_PHOTOS,
  },
  {
    ...{ ago: 626, order: 'EC-1118', lead: 'fintan', helpers: ['yolotzin'], kind: 'thermography' },
    at: ['Plant room', 'Lighting panel CS-L1', 'CS-L1/1', 400],
    description: 'Look at the terminations with the camera, covers opened by the lead.',
  },
  {
    ...{ ago: 612, order: 'FL-0040', lead: 'fintan', helpers: ['rufus'], kind: 'luminaire' },
    at: ['Stacks, level B1', 'Strip lights S1 to S4', 'LB-2/4', 160],
    description: 'Replace four strip lights.',
    until: 'void',
    reason: 'The shelving is moved first; a new plan follows.',
  },
  {
    ...{ ago: 598, order: 'DS-0433', lead: 'ilse', helpers: ['yolotzin'], kind: 'ventilation' },
    at: ['Solvent store 018', 'Luminaire X1', 'LH-2/2', 80],
    description: 'Replace the driver of X1 with the fans running.',
    photos: ['label', 'schedule'],
  },
  {
    ...{ ago: 583, order: 'AC-2310', lead: 'lead', helpers: ['helper'], kind: 'driver' },
    at: ['Level 4 open office', 'Troffers T1 to T6', 'LP-3/6', 360],
    description: 'Replace three drivers that flicker.',
    first: 'live to save time',
  },
  {
    ...{ ago: 569, order: 'BD-1922', lead: 'winona', helpers: ['helper'], kind: 'trace' },
    at: ['Mezzanine', 'Luminaires M1 to M9', 'HB-1/6', 540],
    description: 'Find which circuit feeds the row over the racks.',
  },
  {
    ...{ ago: 555, order: 'CC-0660', lead: 'anselm', helpers: ['rufus'], kind: 'traveler' },
    at: ['Treatment room 4', 'Panels 4A and 4B', 'L-1/7', 90],
    description: 'Replace the driver of 4B.',
    setbacks: [{ how: 'returned', reason: 'Say who watches the second door.' }],
  },
  {
    ...{ ago: 540, order: 'EC-1140', lead: 'ilse', helpers: ['yolotzin'], kind: 'lift' },
    at: ['Dock 1', 'High bays D1-1 to D1-3', 'CS-L1/5', 600],
    description: 'Replace three high bays.',
    until: 'expired',
  },
  {
    ...{ ago: 526, order: 'DS-0451', lead: 'ilse', helpers: ['yolotzin'], kind: 'belowFifty' },
    at: ['Lecture hall', 'Dimming control DC-1', 'LH-1/9', 300],
    description: 'Exchange the 24 V control module.',
    photos: ['cover', 'finished'],
  },
  {
    ...{ ago: 511, order: 'FL-0052', lead: 'fintan', helpers: ['ignacio'], kind: 'lamp' },
    at: ['Entrance hall', 'Globes G1 to G5', 'LB-1/1', 250],
    description: 'Replace five lamps.',
    first: 'aluminum ladder',
  },
  {
    ...{ ago: 497, order: 'AC-2377', lead: 'lead', helpers: ['ignacio'], kind: 'luminaire' },
    at: ['Atrium', 'Pendants A1 to A4', 'LP-2/12', 480],
    description: 'Replace two pendants.',
    setbacks: [{ how: 'still live' }],
    photos: ALL_PHOTOS,
  },
  {
    ...{ ago: 482, order: 'BD-1990', lead: 'casimir', helpers: ['yolotzin'], kind: 'extend' },
    at: ['Returns area', 'New high bays R1 and R2', 'HB-1/4', 400],
    description: 'Extend the circuit to two new high bays.',
    reason: 'a lock was moved',
    until: 'stopped',
  },
  {
    ...{ ago: 468, order: 'CC-0702', lead: 'winona', helpers: ['ignacio'], kind: 'inspect' },
    at: ['Riser room', 'Control cabinet LC-1', 'LS-1/2', 100],
    description: 'Look for heat marks, doors opened by the lead.',
  },
  {
    ...{ ago: 454, order: 'EC-1163', lead: 'fintan', helpers: ['yolotzin'], kind: 'driver' },
    at: ['Plant room corridor', 'Vapor-tight luminaires V1 to V6', 'CS-L1/7', 240],
    description: 'Replace two drivers.',
    first: 'wet',
    photos: ['schedule'],
  },
  {
    ...{ ago: 439, order: 'DS-0472', lead: 'ilse', helpers: ['yolotzin'], kind: 'lamp' },
    at: ['Stair 2', 'Wall lights S2-1 to S2-6', 'LR-1/13', 120],
    description: 'Replace six lamps.',
    until: 'stale',
  },
  {
    ...{
      ago: 425,
      order: 'AC-2440',
      lead: 'casimir',
      helpers: ['helper', 'ignacio'],
      kind: 'lift',
    },
    at: ['Parking level P2', 'Luminaires P2-01 to P2-08', 'LP-2/10', 320],
    description: 'Replace eight luminaires.',
    question: {
      by: 'helper',
      text: '¿Dónde estaciono el elevador?',
      answer: 'Behind column 14, outside the barricade.',
    },
  },
  {
    ...{ ago: 411, order: 'FL-0066', lead: 'fintan', helpers: ['rufus'], kind: 'test' },
    at: ['Staff room', 'Luminaire R2', 'LB-2/6', 40],
    description: 'Find out why R2 stays dark.',
  },
  {
    ...{ ago: 396, order: 'BD-2034', lead: 'winona', helpers: ['helper'], kind: 'battery' },
    at: ['Gate house', 'Exit light GH-1', 'HB-1/1', 20],
    description: 'Replace the battery unit of the exit light.',
    setbacks: [{ how: 'expired' }],
  },
];

const SECOND_YEAR: Past[] = [
  {
    ...{ ago: 374, order: 'AC-2502', lead: 'lead', helpers: ['helper'], kind: 'traveler' },
    at: ['Level 2 corridor', 'Panels C7 to C12', 'LP-2/14', 240],
    description: 'Replace the driver of C9.',
    setbacks: [{ how: 'stopped', reason: 'a way it can be live is missing' }],
    photos: ['label', 'cover', 'finished'],
  },
  {
    ...{ ago: 359, order: 'EC-1201', lead: 'ilse', helpers: ['yolotzin'], kind: 'test' },
    at: ['Freezer 1', 'High bay F1-12', 'CS-L1/2', 150],
    description: 'Read the voltage at the junction box.',
  },
  {
    ...{ ago: 345, order: 'DS-0503', lead: 'ilse', helpers: ['yolotzin'], kind: 'driver' },
    at: ['Laboratory 118', 'Troffers T1 to T4', 'LH-1/3', 200],
    description: 'Replace one driver.',
    first: 'proximity only',
    photos: ['schedule', 'finished'],
  },
  {
    ...{ ago: 331, order: 'CC-0755', lead: 'anselm', helpers: ['ignacio'], kind: 'luminaire' },
    at: ['Pharmacy', 'Panels PH-1 to PH-3', 'L-1/9', 120],
    description: 'Replace three panels.',
    until: 'stopped',
    reason: 'someone came too close',
  },
  {
    ...{ ago: 316, order: 'FL-0080', lead: 'fintan', helpers: ['rufus'], kind: 'driver' },
    at: ['Map room', 'Cove lights M1 to M5', 'LB-1/7', 150],
    description: 'Replace two drivers.',
  },
  {
    ...{ ago: 302, order: 'BD-2101', lead: 'casimir', helpers: ['helper'], kind: 'lift' },
    at: ['Aisle 9', 'High bays H9-1 to H9-6', 'HB-1/5', 1200],
    description: 'Replace six high bays.',
    photos: ALL_PHOTOS,
  },
  {
    ...{ ago: 287, order: 'AC-2581', lead: 'casimir', helpers: ['ignacio'], kind: 'inspect' },
    at: ['Electrical room 2', 'Contactor LC-2', 'LP-3/4', 300],
    description: 'Look for heat marks at the contactor.',
  },
  {
    ...{ ago: 273, order: 'EC-1230', lead: 'fintan', helpers: ['yolotzin'], kind: 'luminaire' },
    at: ['Truck court office', 'Panels O1 to O4', 'CS-L1/8', 160],
    description: 'Replace four panels.',
    until: 'expired',
  },
  {
    ...{ ago: 259, order: 'DS-0540', lead: 'ilse', helpers: ['yolotzin'], kind: 'ventilation' },
    at: ['Fume room 220', 'Luminaire F2', 'LH-2/4', 80],
    description: 'Replace the driver of F2 with the fans running.',
    setbacks: [{ how: 'returned', reason: 'The permit names the wrong room.' }],
  },
  {
    ...{ ago: 244, order: 'FL-0091', lead: 'fintan', helpers: ['ignacio'], kind: 'lamp' },
    at: ['Children’s corner', 'Downlights K1 to K6', 'LB-1/9', 90],
    description: 'Replace six lamps.',
    first: 'rings on',
    photos: ['finished'],
  },
  {
    ...{ ago: 230, order: 'AC-2640', lead: 'lead', helpers: ['helper'], kind: 'lamp' },
    at: ['Level 5 kitchen', 'Downlights K1 to K4', 'RP-1/21', 60],
    description: 'Replace four lamps.',
    setbacks: [{ how: 'stopped', reason: 'not trained for this' }],
  },
  {
    ...{ ago: 215, order: 'BD-2150', lead: 'winona', helpers: ['yolotzin'], kind: 'thermography' },
    at: ['Electrical room W', 'Lighting panel HB-1', 'HB-1/3', 900],
    description: 'Look at the terminations with the camera.',
    photos: ['label', 'schedule'],
  },
  {
    ...{ ago: 201, order: 'CC-0801', lead: 'winona', helpers: ['rufus'], kind: 'driver' },
    at: ['Front desk', 'Linear light FD-1', 'L-1/1', 70],
    description: 'Replace the driver.',
  },
  {
    ...{ ago: 187, order: 'EC-1262', lead: 'ilse', helpers: ['yolotzin'], kind: 'lift' },
    at: ['Freezer 3', 'High bays F3-01 to F3-04', 'CS-L1/6', 600],
    description: 'Replace four high bays.',
    until: 'stopped',
    reason: 'I will not do this',
  },
  {
    ...{ ago: 172, order: 'DS-0577', lead: 'ilse', helpers: ['yolotzin'], kind: 'belowFifty' },
    at: ['Greenhouse', 'Light control GC-1', 'LH-1/11', 500],
    description: 'Exchange the 24 V sensor.',
  },
  {
    ...{ ago: 158, order: 'FL-0104', lead: 'fintan', helpers: ['rufus'], kind: 'luminaire' },
    at: ['Bindery', 'Strip lights B1 to B6', 'LB-2/8', 240],
    description: 'Replace six strip lights.',
    first: 'wall switch',
    until: 'void',
    reason: 'The work goes to the contractor of the new ceiling.',
  },
  {
    ...{ ago: 143, order: 'AC-2777', lead: 'casimir', helpers: ['helper'], kind: 'luminaire' },
    at: ['Loading dock', 'Wall packs W1 to W3', 'LP-2/16', 210],
    description: 'Replace three wall packs.',
    until: 'still-live',
    photos: ['label', 'cover'],
  },
  {
    ...{ ago: 129, order: 'BD-2188', lead: 'casimir', helpers: ['helper'], kind: 'battery' },
    at: ['Break room', 'LED panel BR-2', 'HB-1/2', 40],
    description: 'Replace the battery unit of BR-2.',
    first: 'battery forgotten',
  },
  {
    ...{ ago: 114, order: 'DS-0601', lead: 'ilse', helpers: ['yolotzin'], kind: 'trace' },
    at: ['Corridor 1', 'Night lights N1 to N4', 'LH-1/7', 80],
    description: 'Find which circuit feeds the night lights.',
    photos: ['schedule'],
  },
  {
    ...{ ago: 100, order: 'CC-0840', lead: 'anselm', helpers: ['ignacio'], kind: 'lamp' },
    at: ['Laboratory', 'Bench lights L1 to L4', 'LS-1/4', 60],
    description: 'Replace four lamps.',
    until: 'stale',
  },
  {
    ...{ ago: 80, order: 'EC-1304', lead: 'fintan', helpers: ['yolotzin'], kind: 'driver' },
    at: ['Change rooms', 'Vapor-tight luminaires CR-1 to CR-4', 'CS-L1/4', 160],
    description: 'Replace one driver.',
    question: {
      by: 'yolotzin',
      text: '¿Se puede usar la escalera de aluminio del almacén?',
      answer: 'No. The fiberglass one hangs beside the plant room.',
    },
    photos: ALL_PHOTOS,
  },
  {
    ...{ ago: 58, order: 'AC-3050', lead: 'lead', helpers: ['ignacio'], kind: 'test' },
    at: ['Level 3 corridor', 'Panel C15', 'LP-2/14', 40],
    description: 'Find out why C15 flickers.',
  },
  {
    ...{ ago: 37, order: 'FL-0119', lead: 'fintan', helpers: ['ignacio'], kind: 'traveler' },
    at: ['Loans desk', 'Pendants LD-1 to LD-3', 'LB-1/13', 90],
    description: 'Replace the driver of LD-2.',
    setbacks: [{ how: 'returned', reason: 'The neutral is shared with circuit 11: look again.' }],
  },
  {
    ...{ ago: 19, order: 'BD-2231', lead: 'casimir', helpers: ['yolotzin'], kind: 'lift' },
    at: ['Aisle 12', 'High bays H12-1 to H12-4', 'HB-1/6', 800],
    description: 'Replace four high bays.',
    photos: ['label', 'finished'],
  },
];

/** Two years of work that is over, oldest first. */
export const PAST_SCENARIOS: DemoScenario[] = [...FIRST_YEAR, ...SECOND_YEAR].map(scenario);
