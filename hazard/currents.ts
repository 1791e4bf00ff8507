import { requireBetween, requireNumber, requireOneOf, requirePositive } from './arguments';
import { citation } from './citations';
import { nfpa70e2024 } from './editions';
import type { Edition } from './editions/types';
import type { TouchCurrent } from './types';

const PHASES = [1, 3] as const;
const phaseFactor = (phases: 1 | 3) => (phases === 3 ? Math.sqrt(3) : 1);

function requireRepresentable(name: string, amperes: number): number {
  if (!Number.isFinite(amperes)) throw new RangeError(`${name} gives a current past any number`);
  return amperes;
}

export interface TransformerQuestion {
  kilovoltAmperes: number;
  secondaryVolts: number;
  impedancePercent: number;
  phases: 1 | 3;
}

/**
 * The bolted fault current behind a transformer on an infinite bus. An upper
 * bound, not a study: a lower current can burn longer and worse.
 */
export function boltedFaultAmperes({
  kilovoltAmperes,
  secondaryVolts,
  impedancePercent,
  phases,
}: TransformerQuestion): number {
  requireNumber('kilovoltAmperes', kilovoltAmperes);
  requirePositive('secondaryVolts', secondaryVolts);
  requirePositive('impedancePercent', impedancePercent);
  requireOneOf('phases', phases, PHASES);
  const fullLoadAmperes = (kilovoltAmperes * 1000) / (phaseFactor(phases) * secondaryVolts);
  return requireRepresentable('impedancePercent', fullLoadAmperes / (impedancePercent / 100));
}

interface LoadQuestion {
  watts: number;
  volts: number;
  phases: 1 | 3;
  powerFactor?: number | undefined;
}

/** The current of a load; the power factor counts as 1 when it is not given. */
export function loadAmperes({ watts, volts, phases, powerFactor = 1 }: LoadQuestion): number {
  requireNumber('watts', watts);
  requirePositive('volts', volts);
  requireOneOf('phases', phases, PHASES);
  requireBetween('powerFactor', requirePositive('powerFactor', powerFactor), 0, 1);
  return requireRepresentable('volts', watts / (phaseFactor(phases) * volts * powerFactor));
}

/**
 * The current through a body at a touch voltage, hand to hand, dry, at the
 * 5th, 50th and 95th percentile of body impedance: `p5` is the largest. No
 * current given here is safe.
 */
export function touchMilliamperes(
  { volts }: { volts: number },
  edition: Edition = nfpa70e2024,
): TouchCurrent {
  const { rows, citation: source } = edition.bodyImpedance;
  const tops = rows.map((row) => row.volts);
  requireBetween('volts', volts, Math.min(...tops), Math.max(...tops));

  // The rows ascend: the last one at or below the voltage, and the first at or above it.
  const below = rows.reduce((found, row) => (row.volts <= volts ? row : found));
  const above = rows.reduceRight((found, row) => (row.volts >= volts ? row : found));
  const share = (volts - below.volts) / (above.volts - below.volts || 1);
  const milliamperes = (of: 'p5' | 'p50' | 'p95') =>
    (1000 * volts) / (below[of] + share * (above[of] - below[of]));
  return {
    p5: milliamperes('p5'),
    p50: milliamperes('p50'),
    p95: milliamperes('p95'),
    citation: citation(source, edition),
  };
}
