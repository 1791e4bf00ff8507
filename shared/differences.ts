/** One field that two contents do not share; an absent side has no such field. */
export interface Difference {
  /** A JSON Pointer, such as `/supply/circuitVolts` or `/sources/1/openedAt`. */
  path: string;
  before?: unknown;
  after?: unknown;
}

type Fields = Record<string, unknown>;

function isFields(value: unknown): value is Fields {
  return typeof value === 'object' && value !== null && !Array.isArray(value);
}

function escaped(key: string): string {
  return key.replaceAll('~', '~0').replaceAll('/', '~1');
}

/** Rows that carry an id are told apart by it: one put in front does not change all that follow. */
function idOf(row: unknown): string | undefined {
  return isFields(row) && typeof row['id'] === 'string' && row['id'] !== '' ? row['id'] : undefined;
}

function haveIds(rows: readonly unknown[]): boolean {
  const ids = rows.map(idOf);
  return ids.every((id) => id !== undefined) && new Set(ids).size === ids.length;
}

function differencesOfRows(
  before: readonly unknown[],
  after: readonly unknown[],
  path: string,
): Difference[] {
  if (!haveIds(before) || !haveIds(after)) {
    const length = Math.max(before.length, after.length);
    return Array.from({ length }, (_, index) =>
      walk(before[index], after[index], `${path}/${index}`),
    ).flat();
  }
  const earlier = new Map(before.map((row) => [idOf(row), row]));
  const later = new Set(after.map(idOf));
  return [
    ...before.flatMap((row, index) =>
      later.has(idOf(row)) ? [] : [{ path: `${path}/${index}`, before: row }],
    ),
    ...after.flatMap((row, index) => walk(earlier.get(idOf(row)), row, `${path}/${index}`)),
  ];
}

/** A list of plain answers (topics, conditions) is one answer: it is shown whole. */
function isListOfRows(value: unknown): value is unknown[] {
  return Array.isArray(value) && value.length > 0 && value.every(isFields);
}

function isEmptyList(value: unknown): value is unknown[] {
  return Array.isArray(value) && value.length === 0;
}

function isSame(before: unknown, after: unknown): boolean {
  if (Array.isArray(before) && Array.isArray(after)) {
    return before.length === after.length && before.every((item, index) => item === after[index]);
  }
  return before === after;
}

function walk(before: unknown, after: unknown, path: string): Difference[] {
  if (isFields(before) && isFields(after)) {
    const keys = [...new Set([...Object.keys(before), ...Object.keys(after)])];
    return keys.flatMap((key) => walk(before[key], after[key], `${path}/${escaped(key)}`));
  }
  const rowsBefore = isListOfRows(before);
  if (
    (rowsBefore && (isListOfRows(after) || isEmptyList(after))) ||
    (isEmptyList(before) && isListOfRows(after))
  ) {
    return differencesOfRows(before, after, path);
  }
  if (isSame(before, after)) return [];
  return [
    {
      path,
      ...(before === undefined ? {} : { before }),
      ...(after === undefined ? {} : { after }),
    },
  ];
}

/**
 * What changed from one content to another, field by field, in the order of
 * the content. Rows are matched by their `id`; `path` of a row that is gone
 * points into `before`, every other path into `after`. Words and section names
 * are for the interface.
 */
export function differences(before: object, after: object): Difference[] {
  return walk(before, after, '');
}
