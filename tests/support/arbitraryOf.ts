import fc from 'fast-check';
import type { z } from 'zod';

const TEXTS = [
  '',
  ' ',
  'x'.repeat(64),
  'Ω ñ 漢字 😀',
  '\u202eabc',
  '<b>&amp;</b>',
  '=1+1',
  '__proto__',
  '{{x}}',
  'a\r\nb\tc',
  '\ufeff',
];
const DATES = ['2026-12-01', '2024-02-29', '0000-01-01', '0001-01-01', '9999-12-31', '2026-03-08'];
const DATE_TIMES = [
  ...['2026-12-01T09:00:00-06:00', '2026-12-01T21:00:00-06:00', '2026-12-01T15:00:00Z'],
  ...['2026-03-08T02:30:00-06:00', '2026-11-01T01:30:00-05:00', '0001-01-01T00:00:00+23:59'],
  ...['9999-12-31T23:59:59-23:59', '0000-01-01T00:00:00Z', '2026-12-01T09:00:00.123456789+14:00'],
];
const NUMBERS = [
  0, -0, 0.1, 1, 2, 4, 12, 42, 49.9, 50, 120, 277, 480, 600, 1000, 15_000, 15_001, 1e6,
];
const ODD_NUMBERS = [5e-324, 1e-9, 99_999.5, 1e6];

interface Definition {
  type: string;
  shape?: Record<string, z.ZodType>;
  innerType?: z.ZodType;
  element?: z.ZodType;
  options?: z.ZodType[];
  entries?: Record<string, string>;
  values?: unknown[];
  in?: z.ZodType;
  format?: string;
}

/** Ids by the name of their field. A field of ids that is not among them stays empty. */
type Known = Record<string, readonly string[]>;

/**
 * Values that fit a schema of ours, with the odd ones that it admits: what is
 * taken has to be computed with, stored, read and printed.
 */
export function arbitraryOf(schema: z.ZodType, known: Known = {}): fc.Arbitrary<unknown> {
  return fitting(schema, known, '').filter((value) => schema.safeParse(value).success);
}

function fitting(schema: z.ZodType, known: Known, name: string): fc.Arbitrary<unknown> {
  const def = schema._zod.def as unknown as Definition;
  switch (def.type) {
    case 'object':
      return fittingObject(def.shape ?? {}, known);
    case 'optional':
      return fitting(def.innerType as z.ZodType, known, name);
    case 'pipe':
      return fitting(def.in as z.ZodType, known, name);
    case 'array':
      return fc.array(fitting(def.element as z.ZodType, known, name), { maxLength: 4 });
    case 'union':
      return fc.oneof(...(def.options ?? []).map((option) => fitting(option, known, name)));
    case 'enum':
      return fc.constantFrom(...Object.values(def.entries ?? {}));
    case 'literal':
      return fc.constantFrom(...(def.values ?? []));
    case 'boolean':
      return fc.boolean();
    case 'number':
      return fittingNumber(schema);
    case 'string':
      return fittingText(def.format, known[name]);
    default:
      throw new Error(`No values are known for ${def.type}.`);
  }
}

/** Each field is there more often than not: what is missing ends most computations early. */
function fittingObject(shape: Record<string, z.ZodType>, known: Known): fc.Arbitrary<unknown> {
  const entries = Object.entries(shape)
    .filter(([name, field]) => !isId(field) || known[name] !== undefined)
    .map(([name, field]) => {
      const value = fitting(field, known, name);
      return [name, fc.option(value, { freq: 4, nil: undefined })] as const;
    });
  return fc
    .record(Object.fromEntries(entries))
    .map((value) =>
      Object.fromEntries(Object.entries(value).filter(([, field]) => field !== undefined)),
    );
}

function isId(field: z.ZodType): boolean {
  const def = field._zod.def as unknown as Definition;
  const inner = def.innerType ?? def.in;
  return inner === undefined ? def.format === 'uuid' : isId(inner);
}

function fittingNumber(schema: z.ZodType): fc.Arbitrary<number> {
  const fits = (value: number) => schema.safeParse(value).success;
  const usual = NUMBERS.filter(fits);
  const odd = ODD_NUMBERS.filter(fits);
  return fc.oneof(
    { weight: 8, arbitrary: fc.constantFrom(...usual) },
    ...(odd.length === 0 ? [] : [{ weight: 1, arbitrary: fc.constantFrom(...odd) }]),
  );
}

function fittingText(
  format: string | undefined,
  known: readonly string[] | undefined,
): fc.Arbitrary<string> {
  if (known !== undefined) return fc.constantFrom(...known);
  if (format === 'date') return fc.constantFrom(...DATES);
  if (format === 'datetime') return fc.constantFrom(...DATE_TIMES);
  return fc.oneof(fc.constantFrom(...TEXTS), fc.constantFrom('c1', 'c2', 's1', 's2'));
}
