import type { z } from 'zod';
import { worksheetContentSchema, type WorksheetContent } from '@/shared/worksheet';

/**
 * The form holds what was typed, word for word: a number field may hold text
 * that is no number. The content is what can be made of it.
 */
export type Raw = Record<string, unknown>;

export interface FieldFault {
  /** Dotted path of the form, such as `supply.watts` or `crew.1.name`. */
  name: string;
  code: string;
}

export interface ReadContent {
  content: WorksheetContent;
  faults: FieldFault[];
}

function isPlainObject(value: unknown): value is Raw {
  return typeof value === 'object' && value !== null && !Array.isArray(value);
}

/**
 * Leaves out what was cleared: an empty text, `null`, an object without a
 * field. An empty list stays, it can be an answer ("looked, none").
 */
function withoutEmpty(value: unknown): unknown {
  if (Array.isArray(value)) {
    // A figure not typed yet leaves a hole in its list; an empty row is still a row.
    return value
      .filter((item) => item !== undefined && item !== null && item !== '')
      .map((item: unknown) => withoutEmpty(item) ?? {});
  }
  if (isPlainObject(value)) {
    const kept = Object.entries(value)
      .map(([key, item]) => [key, withoutEmpty(item)] as const)
      .filter(([, item]) => item !== undefined);
    return kept.length === 0 ? undefined : Object.fromEntries(kept);
  }
  return value === '' || value === null ? undefined : value;
}

function without(value: unknown, path: PropertyKey[]): unknown {
  const [head, ...rest] = path;
  if (head === undefined) return undefined;
  if (Array.isArray(value)) {
    const at = Number(head);
    const changed = value.map((item: unknown, i) => (i === at ? without(item, rest) : item));
    // A bad figure in a list of readings is dropped; a bad field of a row empties that field only.
    return rest.length === 0 ? changed.filter((_, i) => i !== at) : changed;
  }
  if (!isPlainObject(value)) return value;
  const key = String(head);
  if (rest.length > 0) return { ...value, [key]: without(value[key], rest) };
  return Object.fromEntries(Object.entries(value).filter(([name]) => name !== key));
}

function pathsOf(issue: z.core.$ZodIssue): PropertyKey[][] {
  if (issue.code === 'unrecognized_keys') return issue.keys.map((key) => [...issue.path, key]);
  return [issue.path];
}

/**
 * Reads the content out of the form's values. A value that the schema refuses
 * is left out, so that an answer that cannot be read counts as not answered,
 * and is named in `faults` for the message beside its field.
 */
export function readContent(raw: unknown): ReadContent {
  let candidate = withoutEmpty(raw) ?? {};
  const faults: FieldFault[] = [];
  for (;;) {
    const parsed = worksheetContentSchema.safeParse(candidate);
    if (parsed.success) return { content: parsed.data, faults };
    const issue = parsed.error.issues[0];
    if (issue === undefined || issue.path.length === 0) return { content: {}, faults };
    for (const path of pathsOf(issue)) {
      // A figure in a list says its own fault: its place in the list is not its place on the screen.
      if (typeof path.at(-1) !== 'number') {
        faults.push({ name: path.map(String).join('.'), code: issue.code });
      }
      candidate = withoutEmpty(without(candidate, path)) ?? {};
    }
  }
}
