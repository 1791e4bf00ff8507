import { at } from '../distance';
import type { ShockTable } from '../types';

/** Shock protection approach boundaries for direct current (NFPA 70E-2024 Table 130.4(E)(b)). */
export const shockBoundariesDc: ShockTable = {
  citation: 'nfpa70e.shockDc',
  notSpecifiedBelow: { volts: 50, row: 'below 50 V' },
  rows: [
    {
      row: '50 V to 300 V',
      upToVolts: 300,
      limitedMovable: at(120, 3),
      limitedFixed: at(42, 1),
      restricted: 'avoid contact',
      citation: 'nfpa70e.shockDc',
    },
    {
      row: 'above 300 V to 1 kV',
      upToVolts: 1000,
      limitedMovable: at(120, 3),
      limitedFixed: at(42, 1),
      restricted: at(12, 0.3),
      citation: 'nfpa70e.shockDc',
    },
    {
      row: 'above 1 kV to 5 kV',
      upToVolts: 5000,
      limitedMovable: at(120, 3),
      limitedFixed: at(60, 1.5),
      restricted: at(17, 0.4),
      citation: 'nfpa70e.shockDc',
    },
  ],
};
