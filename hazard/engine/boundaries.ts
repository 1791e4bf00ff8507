import { citation } from '../citations';
import { loadAmperes, touchMilliamperes } from '../currents';
import type { Edition } from '../editions/types';
import { lookupShockBoundaries } from '../shock';
import { barricadeDistance } from '../surroundings';
import type { Assessment, Distance } from '../types';
import type { Answers } from './answers';
import type { ArcFacts } from './arc';
import type { Voltage } from './voltage';

/** An answer that may be past what a figure is worked out for gives no figure. */
function unlessRefused<T>(make: () => T): T | null {
  try {
    return make();
  } catch (error) {
    if (error instanceof RangeError) return null;
    throw error;
  }
}

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
  const distance = unlessRefused(() =>
    barricadeDistance({ boundaries: table, arcFlashBoundary, movable }),
  );
  return {
    boundaries: { ...table, ...shock, movable },
    limited,
    barricade: distance && { ...distance, citation: citation('nfpa70e.barricade', edition) },
    isBarricadeOpen: distance === null || (arc.likely && arcFlashBoundary === null),
  };
}

/** The current through a body at the highest voltage that can be touched; null outside 100 to 1000 V. */
export function touchOf({ touchVolts, shock }: Voltage, edition: Edition): Assessment['touch'] {
  if (touchVolts === undefined || shock === undefined) return null;
  return unlessRefused(() => ({
    ...touchMilliamperes({ volts: touchVolts }, edition),
    volts: touchVolts,
  }));
}

/** What a clamp on the circuit is to read before it is opened: two wires, power factor 1. */
export function expectedOf({ supply }: Answers): Assessment['expected'] {
  const { watts, circuitVolts: volts } = supply;
  if (watts === undefined || volts === undefined) return { loadAmperes: null };
  return { loadAmperes: unlessRefused(() => loadAmperes({ watts, volts, phases: 1 })) };
}
