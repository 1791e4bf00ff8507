import type { SourceKind } from '../enumerations';
import type { Answers, SourceAnswers } from './answers';
import { isAmong } from './isAmong';

export interface Source extends SourceAnswers {
  readonly index: number;
  /** The first normal source with conductors of its own: those of the circuit. */
  readonly isCircuits: boolean;
  /** Conductors that only this source feeds, other than those of the circuit. */
  readonly hasOwnConductors: boolean;
}

/** The kinds that take over when the normal supply is lost. */
const STANDBY_KINDS: readonly SourceKind[] = ['battery unit', 'generator', 'central inverter'];
/** The kinds whose own conductors may be of another phase than the circuit's. */
const OTHER_PHASE_KINDS: readonly SourceKind[] = ['generator', 'central inverter', 'backfeed'];

export const isStandby = ({ kind }: SourceAnswers) => isAmong(kind, STANDBY_KINDS);

/** A standby source behind transfer equipment, on the conductors of the normal one. */
export const isBehindTransfer = ({ kind }: SourceAnswers) =>
  kind === 'generator' || kind === 'central inverter';

/** A battery, or the output of an inverter: an AC range does not see it. */
export const hasBattery = ({ kind }: SourceAnswers) =>
  kind === 'battery unit' || kind === 'central inverter';

/** Opened at a device that isolates or not; `none` is the answer that it is not opened. */
export const isOpened = ({ openedAt }: SourceAnswers) =>
  openedAt !== undefined && openedAt !== 'none';

/** `sameConductorsAs` counts only as the id of another source that has none itself. */
function sharesConductors(source: SourceAnswers, all: readonly SourceAnswers[]): boolean {
  const { sameConductorsAs } = source;
  return (
    sameConductorsAs !== undefined &&
    all.some((other) => other.id === sameConductorsAs && other.sameConductorsAs === undefined)
  );
}

export function readSources({ sources }: Answers): readonly Source[] {
  const all = sources.values;
  const shares = all.map((source) => sharesConductors(source, all));
  const circuits = all.findIndex(({ kind }, index) => kind === 'normal' && !shares[index]);
  return all.map((source, index) => ({
    ...source,
    index,
    isCircuits: index === circuits,
    hasOwnConductors: !shares[index] && index !== circuits,
  }));
}

/** A source whose presence exposes more than the one circuit. */
export function exposesMoreThanOneCircuit({ kind, hasOwnConductors }: Source): boolean {
  if (kind === 'shared neutral') return true;
  return hasOwnConductors && isAmong(kind, OTHER_PHASE_KINDS);
}

/** What the words of a finding about a source are filled with. */
export function sourceParams({ index, kind, from }: Source): Record<string, string | number> {
  return {
    index,
    ...(kind === undefined ? {} : { kind }),
    ...(from === undefined ? {} : { from }),
  };
}
