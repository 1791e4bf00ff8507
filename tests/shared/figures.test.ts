import { describe, expect, it } from 'vitest';
import { worksheetContentSchema } from '@/shared/worksheet';

const ceilingOf = (ceilingHeightFeet: number) =>
  worksheetContentSchema.safeParse({ surroundings: { ceilingHeightFeet } });

describe('a figure of a worksheet', () => {
  it.each([0, 9, 1_000_000])('may be %d', (feet) => {
    expect(ceilingOf(feet).success).toBe(true);
  });

  // Drawn to scale, such a room would have no end: the page of whoever opens it would hang.
  it.each([1_000_001, 2 ** 53, 1e300, Number.MAX_VALUE, -1, Infinity, NaN])(
    'is not %d, and the field is named',
    (feet) => {
      const { error } = ceilingOf(feet);
      expect(error?.issues[0]?.path).toEqual(['surroundings', 'ceilingHeightFeet']);
    },
  );
});
