import fc from 'fast-check';

/** What a JSON text can say that a program may stumble over. */
const oddText = fc.oneof(
  fc.string({ unit: 'binary', maxLength: 40 }),
  fc.constantFrom(
    ...['', ' ', '\u0000', 'a\u0000b', '\ud800', 'a\udc00b', '\u202e', '\ufeff', 'ß'.repeat(300)],
    ...[
      '__proto__',
      'constructor',
      'toString',
      'x'.repeat(5000),
      '%00',
      '../..',
      "';--",
      '{{7*7}}',
    ],
    ...[
      '0',
      '-1',
      'NaN',
      'null',
      'true',
      '=1+1',
      '<svg onload=x>',
      '0190b5a4-0000-7000-8000-000000000001',
    ],
    ...['0000-01-01', '9999-12-31', '2026-02-29', '2027-02-29', '-271821-04-20', '+275760-09-13'],
    ...['0000-01-01T00:00:00Z', '0000-01-01T00:00:00+23:59', '9999-12-31T23:59:59-23:59'],
    ...['0001-01-01T00:00:00.000000001Z', '2026-12-01T24:00:00Z', '2026-12-01T09:00:00-06:00'],
  ),
);
const oddNumber = fc.oneof(
  fc.double({ noNaN: true }),
  fc.integer(),
  fc.constantFrom(
    0,
    -0,
    5e-324,
    1e-7,
    0.1 + 0.2,
    2 ** 31,
    2 ** 53,
    1e21,
    1e300,
    1.7976931348623157e308,
  ),
  fc.constantFrom(1, 12, 50, 120, 277, 480, 600, 15_000, 15_001, -1),
);
/** Own keys of these names, as only a JSON text can make them. */
const oddObject = fc.constantFrom<unknown>(
  JSON.parse('{"__proto__":{"qualified":true}}'),
  JSON.parse('{"constructor":{"prototype":{"x":1}},"":0}'),
  JSON.parse('{"toJSON":1,"then":1,"length":1e9}'),
  nested(200),
);

function nested(depth: number): unknown {
  let value: unknown = [];
  for (let level = 0; level < depth; level += 1) value = level % 2 === 0 ? { a: value } : [value];
  return value;
}

/** Any JSON value, and those that are asked for too seldom by chance. */
export const anyJson: fc.Arbitrary<unknown> = fc.oneof(
  { weight: 3, arbitrary: fc.jsonValue({ maxDepth: 4, stringUnit: 'binary' }) },
  { weight: 2, arbitrary: oddText },
  { weight: 2, arbitrary: oddNumber },
  { weight: 1, arbitrary: fc.boolean() },
  { weight: 1, arbitrary: oddObject },
);

type Step = string | number;

/** Every place in a JSON value, the value itself included. */
function placesOf(value: unknown, path: Step[] = []): Step[][] {
  if (typeof value !== 'object' || value === null) return [path];
  const keys: Step[] = Array.isArray(value) ? [...value.keys()] : Object.keys(value);
  const inner = keys.flatMap((key) =>
    placesOf((value as Record<Step, unknown>)[key], [...path, key]),
  );
  return [path, ...inner];
}

function textsIn(value: unknown): string[] {
  if (typeof value === 'string') return [value];
  if (typeof value !== 'object' || value === null) return [];
  return Object.values(value).flatMap(textsIn);
}

interface Edit {
  /** Which place, counted round and round. */
  at: number;
  kind: 'replace' | 'same kind' | 'remove' | 'repeat' | 'wrap' | 'add';
  value: unknown;
  text: string;
  number: number;
  pick: number;
}

/** A value of the same JSON type, so that what follows is likely to be accepted. */
function ofSameKind(old: unknown, { text, number, pick }: Edit, texts: string[]): unknown {
  if (typeof old === 'boolean') return !old;
  if (typeof old === 'number') return pick % 3 === 0 ? number : Math.abs(number);
  if (typeof old === 'string') return pick % 2 === 0 ? text : texts[pick % texts.length];
  if (Array.isArray(old))
    return pick % 2 === 0 ? [] : [...(old as unknown[]), ...(old as unknown[])];
  return pick % 2 === 0 ? {} : old;
}

function edited(old: unknown, edit: Edit, texts: string[]): unknown {
  switch (edit.kind) {
    case 'same kind':
      return ofSameKind(old, edit, texts);
    case 'wrap':
      return edit.pick % 2 === 0 ? [old] : { '0': old };
    case 'repeat':
      return Array.isArray(old) ? Array.from({ length: 45 }, () => old[0] as unknown) : [old, old];
    case 'add':
      return typeof old === 'object' && old !== null && !Array.isArray(old)
        ? (JSON.parse(
            `{${JSON.stringify(edit.text)}:1,${JSON.stringify(old).slice(1, -1) || '"x":1'}}`,
          ) as unknown)
        : edit.value;
    default:
      return edit.value;
  }
}

function apply(root: unknown, edit: Edit, texts: string[]): unknown {
  const places = placesOf(root);
  const path = places[edit.at % places.length] ?? [];
  const last = path.at(-1);
  if (last === undefined) return structuredClone(edited(root, edit, texts));
  let parent = root as Record<Step, unknown>;
  for (const step of path.slice(0, -1)) parent = parent[step] as Record<Step, unknown>;
  if (edit.kind === 'remove') {
    if (Array.isArray(parent)) parent.splice(Number(last), 1);
    else delete parent[last];
    return root;
  }
  // A copy: the same value may be put in twice, and must not come to hold itself.
  const value = structuredClone(edited(parent[last], edit, texts));
  Object.defineProperty(parent, last, {
    value,
    writable: true,
    enumerable: true,
    configurable: true,
  });
  return root;
}

const edit: fc.Arbitrary<Edit> = fc.record({
  at: fc.nat(100_000),
  kind: fc.oneof(
    { weight: 5, arbitrary: fc.constant('same kind' as const) },
    { weight: 2, arbitrary: fc.constant('remove' as const) },
    { weight: 2, arbitrary: fc.constant('replace' as const) },
    { weight: 1, arbitrary: fc.constantFrom('repeat', 'wrap', 'add') },
  ),
  value: anyJson,
  text: oddText,
  number: oddNumber,
  pick: fc.nat(1000),
});

/** A sound value with one to four places spoiled. */
export function mutated(sound: unknown): fc.Arbitrary<unknown> {
  const texts = textsIn(sound);
  return fc
    .array(edit, { minLength: 1, maxLength: 4 })
    .map((edits) => edits.reduce((value, one) => apply(value, one, texts), structuredClone(sound)));
}

/** Texts that are no JSON, or more of it than anybody means. */
export const anyBodyText = fc.oneof(
  fc.string({ unit: 'binary', maxLength: 60 }),
  fc.json().map((text) => text.slice(0, Math.ceil(text.length / 2))),
  fc.constantFrom(
    '['.repeat(200_000),
    '{"a":'.repeat(50_000),
    '"\\ud800"',
    '1e999',
    '{"content":1e999}',
    '',
  ),
  fc.constantFrom(`{"content":${'['.repeat(100_000)}${']'.repeat(100_000)}}`),
);
