import type { SystemTable } from '../types';

/**
 * The lighting supplies that this tool knows, and which voltage of each enters
 * the shock table. On a high-leg delta the third phase reads 208 V to neutral;
 * it is never a lighting circuit, and every circuit counts as 240 V.
 */
export const systems: SystemTable = {
  singlePhaseToGroundAboveVolts: 250,
  systems: {
    '208Y/120': { phaseToPhaseVolts: 208, circuitVolts: [120, 208], alwaysPhaseToPhase: false },
    '480Y/277': { phaseToPhaseVolts: 480, circuitVolts: [277, 480], alwaysPhaseToPhase: false },
    '120/240': { phaseToPhaseVolts: 240, circuitVolts: [120, 240], alwaysPhaseToPhase: false },
    '240/120 high-leg': {
      phaseToPhaseVolts: 240,
      circuitVolts: [120, 240],
      alwaysPhaseToPhase: true,
    },
    '480 delta': { phaseToPhaseVolts: 480, circuitVolts: [480], alwaysPhaseToPhase: false },
  },
};
