import type { BodyImpedanceTable } from '../types';

/**
 * Total body impedance in ohms, hand to hand, dry, large areas of contact
 * (IEC 60479-1). Wet, broken or gripping skin has less.
 */
export const bodyImpedance: BodyImpedanceTable = {
  citation: 'iec60479',
  rows: [
    { volts: 100, p5: 990, p50: 1725, p95: 3125 },
    { volts: 125, p5: 900, p50: 1550, p95: 2675 },
    { volts: 150, p5: 850, p50: 1400, p95: 2350 },
    { volts: 175, p5: 825, p50: 1325, p95: 2175 },
    { volts: 200, p5: 800, p50: 1275, p95: 2050 },
    { volts: 225, p5: 775, p50: 1225, p95: 1900 },
    { volts: 400, p5: 700, p50: 950, p95: 1275 },
    { volts: 500, p5: 625, p50: 850, p95: 1150 },
    { volts: 700, p5: 575, p50: 775, p95: 1050 },
    { volts: 1000, p5: 575, p50: 775, p95: 1050 },
  ],
};
