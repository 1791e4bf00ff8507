import { requireNumbers } from './arguments';
import { nfpa70e2024 } from './editions';
import type { Edition, IdentificationRow, VoltageWindow } from './editions/types';
import { SYSTEMS } from './enumerations';
import type { SystemCode } from './enumerations';

/** A quotient on the very edge is inside, whatever binary fractions make of it. */
const ROUNDING = 1e-9;

const isIn = ({ fromVolts, upToVolts }: VoltageWindow, volts: number) =>
  volts >= fromVolts && volts <= upToVolts;

const meanOf = (readings: readonly number[]) =>
  readings.reduce((sum, volts) => sum + volts, 0) / readings.length;

function fitsPhaseToPhase(row: IdentificationRow, readings: readonly number[]): boolean {
  if (readings.length === 0) return true;
  const { phaseToPhaseCount } = row;
  if (phaseToPhaseCount !== null && readings.length !== phaseToPhaseCount) return false;
  return readings.every((volts) => isIn(row.phaseToPhase, volts));
}

function fitsPhaseToNeutral(row: IdentificationRow, readings: readonly number[]): boolean {
  return (
    readings.every((volts) => row.phaseToNeutral.some(({ window }) => isIn(window, volts))) &&
    row.phaseToNeutral.every(({ window, atMost }) => {
      const count = readings.filter((volts) => isIn(window, volts)).length;
      return atMost === null || count <= atMost;
    })
  );
}

/**
 * Every system that the readings of a live supply fit, in the order of the
 * systems. A kind of reading that was not taken excludes nothing; no reading
 * at all, or zeros, fit none.
 */
export function identifySystem(
  readings: {
    phaseToPhase?: readonly number[] | undefined;
    phaseToNeutral?: readonly number[] | undefined;
  },
  edition: Edition = nfpa70e2024,
): SystemCode[] {
  const phaseToPhase = requireNumbers('phaseToPhase', readings.phaseToPhase);
  const phaseToNeutral = requireNumbers('phaseToNeutral', readings.phaseToNeutral);
  if (phaseToPhase.length + phaseToNeutral.length === 0) return [];

  const { systems, quotientTolerance } = edition.identification;
  const hasBoth = phaseToPhase.length > 0 && phaseToNeutral.length > 0;
  return SYSTEMS.filter((system) => {
    const row = systems[system];
    if (!fitsPhaseToPhase(row, phaseToPhase) || !fitsPhaseToNeutral(row, phaseToNeutral)) {
      return false;
    }
    if (!hasBoth || row.quotient === null) return true;
    const quotient = meanOf(phaseToPhase) / meanOf(phaseToNeutral);
    return Math.abs(quotient / row.quotient - 1) <= quotientTolerance + ROUNDING;
  });
}
