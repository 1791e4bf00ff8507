import { requireNumber, requireOneOf } from './arguments';
import { citation } from './citations';
import { nfpa70e2024 } from './editions';
import type { Edition } from './editions/types';
import { CURRENTS, EXPOSURES, SYSTEMS } from './enumerations';
import type { Current, Exposure, SystemCode } from './enumerations';
import type { ShockBoundaries } from './types';

/**
 * The shock approach boundaries of a nominal voltage, phase-to-phase. Past the
 * last row there is no figure: nothing is extrapolated. `null` means that the
 * table specifies no boundary.
 */
export function lookupShockBoundaries(
  { current, volts }: { current: Current; volts: number },
  edition: Edition = nfpa70e2024,
): ShockBoundaries {
  const table =
    requireOneOf('current', current, CURRENTS) === 'ac' ? edition.shockAc : edition.shockDc;
  requireNumber('volts', volts);

  if (volts < table.notSpecifiedBelow.volts) {
    return {
      inTable: true,
      row: table.notSpecifiedBelow.row,
      limitedMovable: null,
      limitedFixed: null,
      restricted: null,
      citation: citation(table.citation, edition),
    };
  }
  const found = table.rows.find(({ upToVolts }) => volts <= upToVolts);
  if (found === undefined) return { inTable: false, citation: citation(table.citation, edition) };
  const { row, limitedMovable, limitedFixed, restricted } = found;
  return {
    inTable: true,
    row,
    limitedMovable,
    limitedFixed,
    restricted,
    citation: citation(found.citation, edition),
  };
}

/** Why `shockTableVolts` chose its voltage; the words are in `shared/messages`. */
export const SHOCK_VOLTS_REASONS = [
  'whole equipment',
  'high-leg',
  'single-phase above 250 V to ground',
  'one circuit',
  'circuit not of system',
] as const;
export type ShockVoltsReason = (typeof SHOCK_VOLTS_REASONS)[number];

/**
 * The voltage that enters the shock table. Anything with more than one phase
 * exposed, or not known, counts phase-to-phase. A circuit voltage that the
 * system does not have is never taken at its word: the larger figure counts.
 */
export function shockTableVolts(
  {
    system,
    circuitVolts,
    exposure = 'whole equipment',
  }: { system: SystemCode; circuitVolts: number; exposure?: Exposure | undefined },
  edition: Edition = nfpa70e2024,
): { volts: number; because: ShockVoltsReason } {
  const row = edition.systems.systems[requireOneOf('system', system, SYSTEMS)];
  requireNumber('circuitVolts', circuitVolts);
  requireOneOf('exposure', exposure, EXPOSURES);

  const { phaseToPhaseVolts } = row;
  if (row.alwaysPhaseToPhase) {
    return { volts: Math.max(phaseToPhaseVolts, circuitVolts), because: 'high-leg' };
  }
  if (!row.circuitVolts.includes(circuitVolts)) {
    return { volts: Math.max(phaseToPhaseVolts, circuitVolts), because: 'circuit not of system' };
  }
  if (exposure === 'whole equipment') {
    return { volts: phaseToPhaseVolts, because: 'whole equipment' };
  }
  const isToGround = circuitVolts < phaseToPhaseVolts;
  if (isToGround && circuitVolts > edition.systems.singlePhaseToGroundAboveVolts) {
    return { volts: phaseToPhaseVolts, because: 'single-phase above 250 V to ground' };
  }
  return { volts: circuitVolts, because: 'one circuit' };
}

/** The voltages that a lighting circuit of a system may have, ascending. */
export function circuitVoltsOf(system: SystemCode, edition: Edition = nfpa70e2024): number[] {
  return [...edition.systems.systems[requireOneOf('system', system, SYSTEMS)].circuitVolts];
}

/** The phase-to-phase voltage of a system. */
export function phaseToPhaseVoltsOf(system: SystemCode, edition: Edition = nfpa70e2024): number {
  return edition.systems.systems[requireOneOf('system', system, SYSTEMS)].phaseToPhaseVolts;
}
