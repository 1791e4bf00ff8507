import { requireBoolean, requireNumber } from './arguments';
import { nfpa70e2024 } from './editions';
import { at } from './editions/distance';
import type { Edition } from './editions/types';
import type { Distance, ShockBoundaries } from './types';

/**
 * The smallest stepladder from whose highest standing level the work can be
 * reached; `null` when none is tall enough and a platform or lift is needed.
 */
export function minimumStepladder(
  {
    ceilingHeightFeet,
    aboveCeilingFeet,
  }: { ceilingHeightFeet: number; aboveCeilingFeet?: number | undefined },
  edition: Edition = nfpa70e2024,
): { sizeFeet: number; standingLevelFeet: number } | null {
  const { sizesFeet, standingBelowTopFeet, reachFeet, ...rule } = edition.stepladders;
  const above = aboveCeilingFeet ?? rule.aboveCeilingFeet;
  const workFeet =
    requireNumber('ceilingHeightFeet', ceilingHeightFeet) +
    requireNumber('aboveCeilingFeet', above);
  const sizeFeet = sizesFeet.find((size) => size - standingBelowTopFeet + reachFeet >= workFeet);
  if (sizeFeet === undefined) return null;
  return { sizeFeet, standingLevelFeet: sizeFeet - standingBelowTopFeet };
}

interface BarricadeQuestion {
  boundaries: ShockBoundaries;
  arcFlashBoundary: Distance | null | undefined;
  movable: boolean;
}

/**
 * How far away a barricade stands: the larger of the limited boundary that
 * applies and the arc flash boundary, as that one's own published pair. On a
 * tie the limited one is given.
 */
export function barricadeDistance({
  boundaries,
  arcFlashBoundary,
  movable,
}: BarricadeQuestion): Distance {
  requireBoolean('movable', movable);
  if (!boundaries.inTable) throw new RangeError('boundaries must be in the table');
  const limited = (movable ? boundaries.limitedMovable : boundaries.limitedFixed) ?? at(0, 0);
  requireNumber('boundaries', limited.inches);
  if (arcFlashBoundary === null || arcFlashBoundary === undefined) return limited;
  requireNumber('arcFlashBoundary', arcFlashBoundary.inches);
  return arcFlashBoundary.inches > limited.inches ? arcFlashBoundary : limited;
}
