import type { WorksheetContent } from '@/hazard/content';

/** The invented case beside the sign-in: a driver in a grid ceiling, everything still live. */
export const exampleWorksheet: WorksheetContent = {
  job: { task: 'replace driver or ballast', lamps: 'other' },
  supply: {
    system: '480Y/277',
    circuitVolts: 277,
    exposure: 'whole equipment',
    movableConductors: false,
  },
  decision: { mode: 'off' },
  arcFlash: {
    equipment: 'luminaire',
    workingDistanceInches: 18,
    noLabel: true,
    availableFaultKiloamperes: 8,
    clearingSeconds: 0.02,
  },
  surroundings: {
    groundedSurfaces: [
      { kind: 'ceiling grid', inReach: true },
      { kind: 'duct', inReach: true },
    ],
    access: 'stepladder',
    ladder: { material: 'fiberglass', sizeFeet: 6, standingLevelFeet: 3 },
    ceilingHeightFeet: 9,
    peopleMayApproach: true,
  },
  crew: [
    { id: 'lead', lead: true, closest: 'restricted' },
    { id: 'helper', closest: 'outside all boundaries' },
  ],
};

/** Figures of the tables do not depend on the day; `assess` asks for one. */
export const EXAMPLE_DAY = '2026-10-14T09:00:00Z';
