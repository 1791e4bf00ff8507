import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import {
  ARC_FLASH_EQUIPMENT,
  ARC_FLASH_TASKS,
  assessArcFlash,
  barricadeDistance,
  circuitVoltsOf,
  EQUIPMENT_CONDITIONS,
  EXPOSURES,
  GLOVE_CLASSES,
  lookupShockBoundaries,
  phaseToPhaseVoltsOf,
  selectGloveClass,
  shockTableVolts,
  SYSTEMS,
} from '@/hazard';
import type { Distance, Restricted, ShockBoundaries } from '@/hazard';

/** Not specified < avoid contact < a distance, longer is stricter. */
function restrictedStrictness(restricted: Restricted): number {
  if (restricted === null) return 0;
  return restricted === 'avoid contact' ? 1 : 1 + restricted.inches;
}
const distanceStrictness = (distance: Distance | null) => distance?.inches ?? 0;

function shockStrictness(boundaries: ShockBoundaries): number[] {
  if (!boundaries.inTable) return [Infinity, Infinity, Infinity];
  return [
    distanceStrictness(boundaries.limitedMovable),
    distanceStrictness(boundaries.limitedFixed),
    restrictedStrictness(boundaries.restricted),
  ];
}

/** Category 1 < 2 < 4 < study needed. */
function arcStrictness(args: Parameters<typeof assessArcFlash>[0]): number[] {
  const { method, ppeCategory, requiredArcRatingCalPerCm2, arcFlashBoundary } =
    assessArcFlash(args);
  if (method === 'study needed') return [Infinity, Infinity, Infinity];
  return [ppeCategory ?? 0, requiredArcRatingCalPerCm2 ?? 0, distanceStrictness(arcFlashBoundary)];
}

function expectNoLess(strict: readonly number[], mild: readonly number[]) {
  strict.forEach((value, index) => expect(value).toBeGreaterThanOrEqual(mild[index] ?? Infinity));
}

const number = (max: number) => fc.double({ min: 0, max, noNaN: true });
const pair = <T>(of: fc.Arbitrary<T>) => fc.tuple(of, of);
const sorted = ([one, other]: [number, number]): [number, number] =>
  one <= other ? [one, other] : [other, one];
const nominal = fc.constantFrom(
  ...new Set(SYSTEMS.flatMap((system) => [...circuitVoltsOf(system), phaseToPhaseVoltsOf(system)])),
);
const live = fc.record({
  task: fc.constantFrom(...ARC_FLASH_TASKS),
  condition: fc.constantFrom(...EQUIPMENT_CONDITIONS),
  equipment: fc.constantFrom(...ARC_FLASH_EQUIPMENT),
  volts: nominal,
  workingDistanceInches: number(48),
  availableFaultKiloamperes: number(100),
  clearingSeconds: number(1),
});

describe('a worse figure never makes the answer less strict', () => {
  it('of the shock table, by nominal voltage', () => {
    fc.assert(
      fc.property(pair(nominal), (volts) => {
        const [low, high] = sorted(volts);
        const ac = (value: number) => lookupShockBoundaries({ current: 'ac', volts: value });
        expectNoLess(shockStrictness(ac(high)), shockStrictness(ac(low)));
      }),
    );
  });

  it.each(['ac', 'dc'] as const)('of the shock table, by any voltage, %s', (current) => {
    fc.assert(
      fc.property(pair(number(20_000)), (volts) => {
        const [low, high] = sorted(volts);
        const look = (value: number) => lookupShockBoundaries({ current, volts: value });
        expectNoLess(shockStrictness(look(high)), shockStrictness(look(low)));
      }),
    );
  });

  it('of the arc flash table, by fault current', () => {
    fc.assert(
      fc.property(live, pair(number(100)), (given, kiloamperes) => {
        const [low, high] = sorted(kiloamperes);
        const strictness = (availableFaultKiloamperes: number) =>
          arcStrictness({ ...given, availableFaultKiloamperes });
        expectNoLess(strictness(high), strictness(low));
      }),
    );
  });

  it('of the arc flash table, by clearing time', () => {
    fc.assert(
      fc.property(live, pair(number(1)), (given, seconds) => {
        const [low, high] = sorted(seconds);
        const strictness = (clearingSeconds: number) =>
          arcStrictness({ ...given, clearingSeconds });
        expectNoLess(strictness(high), strictness(low));
      }),
    );
  });

  it('of the arc flash table, by nominal voltage', () => {
    fc.assert(
      fc.property(live, pair(nominal), (given, volts) => {
        const [low, high] = sorted(volts);
        const strictness = (value: number) => arcStrictness({ ...given, volts: value });
        expectNoLess(strictness(high), strictness(low));
      }),
    );
  });

  it('of the arc flash table, by a shorter working distance', () => {
    fc.assert(
      fc.property(live, pair(number(48)), (given, inches) => {
        const [short, long] = sorted(inches);
        const strictness = (workingDistanceInches: number) =>
          arcStrictness({ ...given, workingDistanceInches });
        expectNoLess(strictness(short), strictness(long));
      }),
    );
  });

  it('of the arc flash table, by forgetting a limit', () => {
    fc.assert(
      fc.property(live, (given) => {
        const known = arcStrictness(given);
        expectNoLess(arcStrictness({ ...given, availableFaultKiloamperes: undefined }), known);
        expectNoLess(arcStrictness({ ...given, clearingSeconds: undefined }), known);
      }),
    );
  });

  it('of the gloves, by voltage', () => {
    fc.assert(
      fc.property(pair(number(36_000)), (volts) => {
        const [low, high] = sorted(volts);
        const rank = (value: number) => GLOVE_CLASSES.indexOf(selectGloveClass(value).gloveClass);
        expect(rank(high)).toBeGreaterThanOrEqual(rank(low));
        expect(selectGloveClass(high).maxUseVolts).toBeGreaterThanOrEqual(high);
      }),
    );
  });

  it('of the barricade, by voltage, by arc flash boundary and by movable conductors', () => {
    fc.assert(
      fc.property(pair(number(15_000)), pair(number(300)), (volts, inches) => {
        const [lowVolts, highVolts] = sorted(volts);
        const [near, far] = sorted(inches);
        const stand = (value: number, boundary: number, movable: boolean) =>
          barricadeDistance({
            boundaries: lookupShockBoundaries({ current: 'ac', volts: value }),
            arcFlashBoundary: { inches: boundary, metres: boundary * 0.0254 },
            movable,
          }).inches;
        const base = stand(lowVolts, near, false);
        expect(stand(highVolts, near, false)).toBeGreaterThanOrEqual(base);
        expect(stand(lowVolts, far, false)).toBeGreaterThanOrEqual(base);
        expect(stand(lowVolts, near, true)).toBeGreaterThanOrEqual(base);
      }),
    );
  });

  it('of the voltage that enters the table, by exposing the whole equipment', () => {
    fc.assert(
      fc.property(fc.constantFrom(...SYSTEMS), nominal, (system, circuitVolts) => {
        const volts = EXPOSURES.map(
          (exposure) => shockTableVolts({ system, circuitVolts, exposure }).volts,
        );
        expect(volts[1]).toBeGreaterThanOrEqual(volts[0] ?? Infinity);
        expect(Math.min(...volts)).toBeGreaterThanOrEqual(circuitVolts);
      }),
    );
  });
});
