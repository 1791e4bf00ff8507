import { at } from '../distance';
import type { ShockTable } from '../types';

/**
 * Shock protection approach boundaries for alternating current, entered with
 * the nominal phase-to-phase voltage (NFPA 70E-2024 Table 130.4(E)(a)).
 *
 * Inches and metres are both as printed: the standard rounds them apart, so
 * neither is ever worked out from the other. The last row is of an earlier
 * edition; no rule uses it.
 */
export const shockBoundariesAc: ShockTable = {
  citation: 'nfpa70e.shockAc',
  notSpecifiedBelow: { volts: 50, row: 'below 50 V' },
  rows: [
    {
      row: '50 V to 150 V',
      upToVolts: 150,
      limitedMovable: at(120, 3),
      limitedFixed: at(42, 1),
      restricted: 'avoid contact',
      citation: 'nfpa70e.shockAc',
    },
    {
      row: 'above 150 V to 750 V',
      upToVolts: 750,
      limitedMovable: at(120, 3),
      limitedFixed: at(42, 1),
      restricted: at(12, 0.3),
      citation: 'nfpa70e.shockAc',
    },
    {
      row: 'above 750 V to 15 kV',
      upToVolts: 15_000,
      limitedMovable: at(120, 3),
      limitedFixed: at(60, 1.5),
      restricted: at(26, 0.7),
      citation: 'nfpa70e.shockAcAbove750',
    },
  ],
};
