import { describe, expect, it } from 'vitest';
import { z } from 'zod';
import {
  closeSchema,
  createWorksheetSchema,
  hashSchema,
  listSchema,
  signSchema,
  strokesSchema,
  worksheetSchema,
} from '@/shared/record';
import { buildRecord } from '../support/worksheetRecord';

type Point = [number, number];
const points = (count: number): Point[] => Array.from({ length: count }, (_, n) => [n % 300, 40]);
const accepts = (schema: z.ZodType, value: unknown) => schema.safeParse(value).success;

describe('a drawn signature', () => {
  it('has two points at least, in one stroke or in several', () => {
    expect(accepts(strokesSchema, [points(2)])).toBe(true);
    expect(accepts(strokesSchema, [points(1), points(1)])).toBe(true);
    expect(accepts(strokesSchema, [points(1)])).toBe(false);
    expect(accepts(strokesSchema, [[], []])).toBe(false);
    expect(accepts(strokesSchema, [])).toBe(false);
  });

  it('has 5000 points at most, counted over all strokes', () => {
    expect(accepts(strokesSchema, [points(5000)])).toBe(true);
    expect(accepts(strokesSchema, [points(2500), points(2500)])).toBe(true);
    expect(accepts(strokesSchema, [points(5001)])).toBe(false);
    expect(accepts(strokesSchema, [points(2500), points(2501)])).toBe(false);
  });

  it('has 100 strokes at most', () => {
    const strokes = (count: number) => Array.from({ length: count }, () => points(2));
    expect(accepts(strokesSchema, strokes(100))).toBe(true);
    expect(accepts(strokesSchema, strokes(101))).toBe(false);
  });

  it('says that the number of points is wrong', () => {
    const { error } = strokesSchema.safeParse([points(1)]);
    expect(error?.issues).toMatchObject([{ message: '2 to 5000 points', path: [] }]);
    expect(error?.issues[0]).toHaveProperty('params', { code: 'points' });
  });

  it('stays on the pad', () => {
    expect(
      accepts(strokesSchema, [
        [
          [0, 0],
          [4096, 4096],
        ],
      ]),
    ).toBe(true);
    for (const outside of [[-1, 0], [0, -1], [4097, 0], [0, 4097], [1], [1, 2, 3]]) {
      expect(accepts(strokesSchema, [[[1, 1], outside]])).toBe(false);
    }
  });
});

describe('signing', () => {
  const common = {
    meaning: 'acknowledged',
    signerId: '0190b5a4-0000-7000-8000-0000000000b2',
    strokes: [points(3)],
    contentHash: 'ab'.repeat(32),
  };
  const ofADevice = {
    deviceId: '0190b5a4-0000-7000-8000-0000000000d1',
    signedAt: '2026-12-01T08:10:00-06:00',
    signature: 'A'.repeat(86),
  };

  it('takes a PIN or a device, never neither and never both', () => {
    expect(accepts(signSchema, { ...common, pin: '204816' })).toBe(true);
    expect(accepts(signSchema, { ...common, ...ofADevice })).toBe(true);
    expect(accepts(signSchema, common)).toBe(false);
    expect(accepts(signSchema, { ...common, ...ofADevice, pin: '204816' })).toBe(false);
    expect(accepts(signSchema, { ...common, pin: '20481' })).toBe(false);
    expect(accepts(signSchema, { ...common, ...ofADevice, signature: 'A'.repeat(85) })).toBe(false);
    expect(accepts(signSchema, { ...common, ...ofADevice, signedAt: '2026-12-01T08:10' })).toBe(
      false,
    );
  });

  it('names what is signed by its SHA-256 in lower case', () => {
    expect(accepts(hashSchema, '0123456789abcdef'.repeat(4))).toBe(true);
    for (const hash of ['AB'.repeat(32), 'ab'.repeat(31), 'ab'.repeat(33), 'zz'.repeat(32)]) {
      expect(accepts(hashSchema, hash)).toBe(false);
    }
  });
});

describe('what a client sends', () => {
  it('is refused with a field that nobody knows, or with a null for an answer left out', () => {
    expect(accepts(createWorksheetSchema, { content: {} })).toBe(true);
    expect(accepts(createWorksheetSchema, { content: {}, state: 'in-force' })).toBe(false);
    expect(accepts(createWorksheetSchema, { content: { notes: null } })).toBe(false);
    expect(accepts(closeSchema, { closeOut: { toolsClear: true } })).toBe(false);
    expect(accepts(closeSchema, { closeOut: { toolsClear: true }, pin: '204816' })).toBe(true);
  });

  it('may choose an id in capitals, which is kept in small letters', () => {
    const id = '0190B5A4-0000-7000-8000-0000000000E1';
    expect(createWorksheetSchema.parse({ id, content: {} }).id).toBe(
      '0190b5a4-0000-7000-8000-0000000000e1',
    );
  });
});

describe('what a server answers', () => {
  it('is read as it stands, and a field of a later version is passed over', () => {
    const record = buildRecord();
    expect(worksheetSchema.parse({ ...record, ofALaterVersion: 1 })).toEqual(record);
  });

  it.each(['ready', 7, null, undefined])(
    'is refused without an assessment: %j is none',
    (assessment) => {
      expect(accepts(worksheetSchema, { ...buildRecord(), assessment })).toBe(false);
    },
  );

  it('may lack the assessment of the work only as long as there is none', () => {
    const { assessment } = buildRecord();
    const withWork = (workAssessment: unknown) => ({ ...buildRecord(), workAssessment });
    expect(accepts(worksheetSchema, withWork(null))).toBe(true);
    expect(accepts(worksheetSchema, withWork(assessment))).toBe(true);
    expect(accepts(worksheetSchema, withWork('ready'))).toBe(false);
  });

  it('is a page of a list, and says where the next one begins or that there is none', () => {
    const page = listSchema(z.object({ id: z.string() }));
    const items = [{ id: 'a' }, { id: 'b' }];
    expect(page.parse({ items, nextCursor: null })).toEqual({ items, nextCursor: null });
    expect(page.parse({ items, nextCursor: 'b' }).nextCursor).toBe('b');
    expect(accepts(page, { items })).toBe(false);
    expect(accepts(page, { items: [{ id: 1 }], nextCursor: null })).toBe(false);
  });
});
