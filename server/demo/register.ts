import type { GloveClass } from '@/hazard/enumerations';
import type { RubberGoodsKind, Site } from '@/shared/register';

type DemoSite = Pick<
  Site,
  'name' | 'timeZone' | 'address' | 'systems' | 'panels' | 'emergency' | 'deskToTell'
>;

/** Three invented buildings of one invented company, each with the systems that its lighting hangs on. */
export const DEMO_SITES: DemoSite[] = [
  {
    name: 'Ashgrove Commons',
    timeZone: 'America/Chicago',
    address: '410 Ashgrove Parkway, Millhaven',
    systems: ['480Y/277', '208Y/120'],
    panels: [
      { name: 'LP-2', system: '480Y/277', circuits: ['8', '10', '12', '14', '16'] },
      { name: 'LP-3', system: '480Y/277', circuits: ['2', '4', '6'] },
      { name: 'ELS-1', system: '480Y/277', circuits: ['1', '3', '5', '7'] },
      { name: 'RP-1', system: '208Y/120', circuits: ['21', '23', '25'] },
    ],
    emergency: {
      contact: '911, then the control room: 555-0142',
      rescue: 'Second person with the insulated hook, east corridor cabinet',
      firstAid: 'Control room, ground floor',
      aedAt: 'East lobby, beside the lifts',
    },
    deskToTell: 'Building control room, 555-0142',
  },
  {
    name: 'Brackenfield Distribution Hall',
    timeZone: 'America/Denver',
    address: '88 Siding Road, Brackenfield',
    systems: ['480Y/277', '240/120 high-leg'],
    panels: [
      { name: 'HB-1', system: '480Y/277', circuits: ['1', '2', '3', '4', '5', '6'] },
      { name: 'EM-A', system: '480Y/277', circuits: ['2', '4'] },
      { name: 'DP-W', system: '240/120 high-leg', circuits: ['7', '9', '11'] },
    ],
    emergency: {
      contact: '911, then the gate: 555-0178',
      rescue: 'Gate sends the lift crew; hook at dock 4',
      firstAid: 'Shift office, mezzanine',
      aedAt: 'Dock 4, on the column',
    },
    deskToTell: 'Shift office, 555-0177',
  },
  {
    name: 'Copperleaf Clinic',
    timeZone: 'America/Phoenix',
    address: '12 Copperleaf Street, Dry Ford',
    systems: ['208Y/120', '120/240'],
    panels: [
      { name: 'L-1', system: '208Y/120', circuits: ['1', '3', '5', '7', '9'] },
      { name: 'LS-1', system: '208Y/120', circuits: ['2', '4'] },
      { name: 'Annex', system: '120/240', circuits: ['6', '8'] },
    ],
    emergency: {
      contact: '911, then the front desk: 555-0119',
      rescue: 'Second person with the insulated hook, riser room',
      firstAid: 'Treatment room 2',
      aedAt: 'Front desk',
    },
    deskToTell: 'Front desk, 555-0119',
  },
];

interface DemoRubberGoods {
  site: number;
  kind: RubberGoodsKind;
  gloveClass: GloveClass;
  serial: string;
  size: string;
  issuedMonths: number | null;
  /** When, in months from today. */
  tests: { months: number; passed: boolean; laboratory: string }[];
}

const laboratory = 'Tallgrass Dielectric, Millhaven';
const passed = (months: number) => ({ months, passed: true, laboratory });

/** In test, due soon, run out and failed: each state that the register shows. */
export const DEMO_RUBBER_GOODS: DemoRubberGoods[] = [
  {
    site: 0,
    kind: 'gloves',
    gloveClass: '0',
    serial: 'AC-0-117',
    size: '9',
    issuedMonths: -8,
    tests: [passed(-8), passed(-2)],
  },
  {
    site: 0,
    kind: 'gloves',
    gloveClass: '0',
    serial: 'AC-0-121',
    size: '10',
    issuedMonths: -1,
    tests: [passed(-3)],
  },
  {
    site: 0,
    kind: 'gloves',
    gloveClass: '00',
    serial: 'AC-00-042',
    size: '8',
    issuedMonths: -14,
    tests: [passed(-14), passed(-7)],
  },
  {
    site: 0,
    kind: 'sleeves',
    gloveClass: '0',
    serial: 'AC-S-009',
    size: 'L',
    issuedMonths: -5,
    tests: [passed(-5)],
  },
  {
    site: 1,
    kind: 'gloves',
    gloveClass: '0',
    serial: 'BD-0-203',
    size: '10',
    issuedMonths: -6,
    tests: [passed(-6), passed(-1)],
  },
  {
    site: 1,
    kind: 'blanket',
    gloveClass: '1',
    serial: 'BD-B-014',
    size: '36 in',
    issuedMonths: -4,
    tests: [passed(-4)],
  },
  {
    site: 2,
    kind: 'gloves',
    gloveClass: '00',
    serial: 'CC-00-066',
    size: '9',
    issuedMonths: -4,
    tests: [passed(-4)],
  },
  {
    site: 2,
    kind: 'gloves',
    gloveClass: '00',
    serial: 'CC-00-058',
    size: '10',
    ...{
      issuedMonths: -9,
      tests: [passed(-9), { months: -3, passed: false, laboratory }],
    },
  },
];
