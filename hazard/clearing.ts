import { requirePositive } from './arguments';

/** Cycles of 60 Hz and the seconds that the category table prints for them (70E Table 130.7(C)(15)(a)). */
const PRINTED_SECONDS: ReadonlyMap<number, number> = new Map([
  [2, 0.03],
  [20, 0.33],
  [30, 0.5],
]);

/**
 * A clearing time given in cycles, in seconds: by the printed pairs where the
 * table has one, else n / 60. Throws `RangeError` for what is not above zero.
 */
export function clearingSecondsOfCycles(cycles: number): number {
  requirePositive('cycles', cycles);
  return PRINTED_SECONDS.get(cycles) ?? cycles / 60;
}
