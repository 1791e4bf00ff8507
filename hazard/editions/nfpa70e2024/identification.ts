import type { IdentificationTable, VoltageWindow } from '../types';

/** Service voltages of ANSI C84.1 range B, widened to what a meter may read; bounds included. */
const window120: VoltageWindow = { fromVolts: 104, upToVolts: 127 };
const window208: VoltageWindow = { fromVolts: 180, upToVolts: 220 };
const window240: VoltageWindow = { fromVolts: 208, upToVolts: 254 };
const window277: VoltageWindow = { fromVolts: 240, upToVolts: 293 };
const window480: VoltageWindow = { fromVolts: 416, upToVolts: 508 };

/** Which readings of a live supply fit which system. */
export const identification: IdentificationTable = {
  citation: 'ansiC84',
  quotientTolerance: 0.05,
  systems: {
    '208Y/120': {
      phaseToPhase: window208,
      phaseToNeutral: [{ window: window120, atMost: null }],
      quotient: Math.sqrt(3),
      phaseToPhaseCount: null,
    },
    '480Y/277': {
      phaseToPhase: window480,
      phaseToNeutral: [{ window: window277, atMost: null }],
      quotient: Math.sqrt(3),
      phaseToPhaseCount: null,
    },
    '120/240': {
      phaseToPhase: window240,
      phaseToNeutral: [{ window: window120, atMost: 2 }],
      quotient: 2,
      phaseToPhaseCount: 1,
    },
    '240/120 high-leg': {
      phaseToPhase: window240,
      phaseToNeutral: [
        { window: window120, atMost: 2 },
        { window: window208, atMost: 1 },
      ],
      quotient: null,
      phaseToPhaseCount: null,
    },
    '480 delta': {
      phaseToPhase: window480,
      phaseToNeutral: [],
      quotient: null,
      phaseToPhaseCount: null,
    },
  },
};
