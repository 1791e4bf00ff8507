import type { Site } from '@/shared/register';

type DemoSite = Pick<
  Site,
  'name' | 'timeZone' | 'address' | 'systems' | 'panels' | 'emergency' | 'deskToTell'
>;

/** Six invented buildings of one invented company, each with the systems that its lighting hangs on. */
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
  {
    name: 'Dunmore Science Hall',
    timeZone: 'America/New_York',
    address: '7 Retort Lane, Dunmore Falls',
    systems: ['480Y/277', '208Y/120'],
    panels: [
      { name: 'LH-1', system: '480Y/277', circuits: ['1', '3', '5', '7', '9', '11'] },
      { name: 'LH-2', system: '480Y/277', circuits: ['2', '4', '6', '8'] },
      { name: 'LR-1', system: '208Y/120', circuits: ['13', '15', '17'] },
    ],
    emergency: {
      contact: '911, then campus dispatch: 555-0163',
      rescue: 'Second person with the insulated hook, stair 2 landing',
      firstAid: 'Prep room 104',
      aedAt: 'Main stair, ground floor',
    },
    deskToTell: 'Campus dispatch, 555-0163',
  },
  {
    name: 'Eastlake Cold Store',
    timeZone: 'America/Los_Angeles',
    address: '2300 Quay Road, Eastlake',
    systems: ['480Y/277', '120/240'],
    panels: [
      { name: 'CS-L1', system: '480Y/277', circuits: ['1', '2', '3', '4', '5', '6', '7', '8'] },
      { name: 'CS-EM', system: '480Y/277', circuits: ['1', '2'] },
      { name: 'OF-1', system: '120/240', circuits: ['10', '12', '14'] },
    ],
    emergency: {
      contact: '911, then the plant room: 555-0155',
      rescue: 'Plant room sends two people with the hook',
      firstAid: 'Plant room, beside the lockers',
      aedAt: 'Loading bay, by the time clock',
    },
    deskToTell: 'Plant room, 555-0155',
  },
  {
    name: 'Fernhollow Library',
    timeZone: 'America/Detroit',
    address: '61 Bindery Street, Fernhollow',
    systems: ['208Y/120'],
    panels: [
      { name: 'LB-1', system: '208Y/120', circuits: ['1', '3', '5', '7', '9', '11', '13'] },
      { name: 'LB-2', system: '208Y/120', circuits: ['2', '4', '6', '8'] },
    ],
    emergency: {
      contact: '911, then the loans desk: 555-0131',
      rescue: 'Second person with the insulated hook, basement stair',
      firstAid: 'Loans desk',
      aedAt: 'Entrance hall, left of the door',
    },
    deskToTell: 'Loans desk, 555-0131',
  },
];
