import type { Content, TableCell } from 'pdfmake/interfaces';
import type { PdfContext } from './context';
import { fieldValue } from './fieldValue';
import { cite, label, medium, rows } from './style';

interface Row {
  label: string;
  value: string;
}

/** The value at a dotted path. */
function valueAt(record: unknown, steps: readonly string[]): unknown {
  let value: unknown = record;
  for (const step of steps) {
    if (typeof value !== 'object' || value === null) return undefined;
    value = (value as Record<string, unknown>)[step];
  }
  return value;
}

interface FieldsOf {
  /** The first steps of the paths: `job`, `sources`. */
  prefix: string;
  /** What is printed elsewhere, or is only an id. */
  except?: readonly string[];
  /** The object that holds the fields below the prefix. */
  record: unknown;
}

/**
 * Every field of a section in the order of the form: the answered ones with
 * their answers, and by name those that nobody answered. A field added to the
 * content is printed without a change here.
 */
export function fieldsOf(
  { prefix, except = [], record }: FieldsOf,
  context: PdfContext,
): { answered: Row[]; missing: string[] } {
  const labels: Readonly<Record<string, string>> = context.m.fields;
  const answered: Row[] = [];
  const missing: string[] = [];
  for (const [path, words] of Object.entries(labels)) {
    if (!path.startsWith(`${prefix}.`) || except.some((each) => isWithin(path, each))) continue;
    const value = valueAt(record, path.slice(prefix.length + 1).split('.'));
    if (typeof value === 'object' && value !== null && !Array.isArray(value)) continue;
    const written = fieldValue(path, value, context);
    if (written === null) missing.push(words);
    else answered.push({ label: words, value: written });
  }
  return { answered, missing };
}

function isWithin(path: string, parent: string): boolean {
  return path === parent || path.startsWith(`${parent}.`);
}

/** One field by its whole path. */
export function field(path: string, value: unknown, context: PdfContext): Row | null {
  const labels: Readonly<Record<string, string>> = context.m.fields;
  const written = fieldValue(path, value, context);
  return written === null ? null : { label: labels[path] ?? path, value: written };
}

const SHORT = { label: 60, value: 40 };

/** Short fields stand two in a row, long ones have the row to themselves. */
export function fieldTable(fields: readonly Row[]): Content[] {
  const body: TableCell[][] = [];
  let waiting: Row | null = null;
  const cells = (row: Row): [TableCell, TableCell] => [label(row.label), medium(row.value)];
  const alone = (row: Row) => {
    body.push([label(row.label), { ...medium(row.value), colSpan: 3 }, {}, {}]);
  };
  for (const row of fields) {
    const isShort = row.label.length <= SHORT.label && row.value.length <= SHORT.value;
    if (isShort && waiting) {
      body.push([...cells(waiting), ...cells(row)]);
      waiting = null;
    } else if (isShort) {
      waiting = row;
    } else {
      if (waiting) alone(waiting);
      waiting = null;
      alone(row);
    }
  }
  if (waiting) alone(waiting);
  if (body.length === 0) return [];
  return [{ table: { widths: [118, '*', 118, '*'], body, dontBreakRows: true }, layout: rows }];
}

/** The fields of a section and, below them, what is not answered. */
export function sectionFields(source: FieldsOf, context: PdfContext): Content[] {
  const { answered, missing } = fieldsOf(source, context);
  const words = context.m.pdf.fields;
  const content = fieldTable(answered);
  if (answered.length === 0) content.push(label(words.nothing));
  if (missing.length > 0 && answered.length > 0) content.push(notAnswered(missing, context));
  return content;
}

export function notAnswered(missing: readonly string[], context: PdfContext): Content {
  const names = missing.map((name) => name.replace(/\?$/, '')).join(' · ');
  return cite(`${context.m.pdf.fields.notAnswered}: ${names}`, { margin: [0, 3, 0, 0] });
}
