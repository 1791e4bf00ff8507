import { citation } from '../citations';
import { loadAmperes, touchMilliamperes } from '../currents';
import type { Edition } from '../editions/types';
import { lookupShockBoundaries } from '../shock';
import { barricadeDistance } from '../surroundings';
import type { Assessment, Distance } from '../types';
import type { Answers } from './answers';
import type { ArcFacts } from './arc';
import type { Voltage } from './voltage';

export interface Distances {
  readonly boundaries: Assessment['boundaries'];
  /** The limited boundary that applies; null where none is specified or known. */
  readonly limited: Distance | null;
  readonly barricade: Assessment['barricade'];
  /** The barricade distance is not known yet: the arc flash boundary may lie farther out. */
  readonly isBarricadeOpen: boolean;
}

interface Question {
  answers: Answers;
  voltage: Voltage;
  arc: ArcFacts;
}

/** The approach boundaries and where a barricade stands. */
export function distancesOf({ answers, voltage, arc }: Question, edition: Edition): Distances {
  const { shock } = voltage;
  if (shock === undefined) {
    return { boundaries: null, limited: null, barricade: null, isBarricadeOpen: true };
  }
  const movable = answers.supply.movableConductors !== false;
  const table = lookupShockBoundaries({ current: 'ac', volts: shock.volts }, edition);
  const { arcFlashBoundary } = arc.result;
  const limited = table.inTable ? (movable ? table.limitedMovable : table.limitedFixed) : null;
  // Past the table's last row no distance is known, and none is made up.
  const distance = table.inTable
    ? barricadeDistance({ boundaries: table, arcFlashBoundary, movable })
    : null;
  return {
    boundaries: { ...table, ...shock, movable },
    limited,
    barricade: distance && { ...distance, citation: citation('nfpa70e.barricade', edition) },
    isBarricadeOpen: distance === null || (arc.likely && arcFlashBoundary === null),
  };
}

/** The current through a body at the highest voltage that can be touched; null where the table has none. */
export function touchOf({ touchVolts, shock }: Voltage, edition: Edition): Assessment['touch'] {
  const { rows } = edition.bodyImpedance;
  const isInTable =
    touchVolts !== undefined &&
    rows.some(({ volts }) => volts <= touchVolts) &&
    rows.some(({ volts }) => volts >= touchVolts);
  if (!isInTable || shock === undefined) return null;
  return { ...touchMilliamperes({ volts: touchVolts }, edition), volts: touchVolts };
}

/** What a clamp on the circuit is to read before it is opened: two wires, power factor 1. */
export function expectedOf({ supply }: Answers): Assessment['expected'] {
  const { watts, circuitVolts: volts } = supply;
  const isKnown = watts !== undefined && volts !== undefined && Number.isFinite(watts / volts);
  return { loadAmperes: isKnown ? loadAmperes({ watts, volts, phases: 1 }) : null };
}
