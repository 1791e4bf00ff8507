import { describe, expect, it } from 'vitest';
import { assess, REQUIRED_ITEM_IDS } from '@/hazard';
import type { Assessment, CloseOut, Proof, Stage, WorksheetContent } from '@/hazard';
import { missingParams } from './findingParams';
import {
  soundEnergizedWorksheet,
  soundTestingWorksheet,
  soundWorksheet,
  withPath,
} from './soundWorksheet';

/**
 * A sound worksheet to spoil: circuit off (O), live testing (T), any other
 * live work (W), at the plan; with `work`, once proofs are recorded; with
 * `close`, when it is closed.
 */
export type Base =
  'O' | 'T' | 'W' | 'O work' | 'T work' | 'W work' | 'O close' | 'T close' | 'W close';

/** JSON Pointer without its first slash → the new answer; `undefined` takes it out. */
export type Edits = Record<string, unknown>;

/**
 * Expected findings of one code are written `severity`, or `severity /path`.
 * A path that ends in `*` is a prefix. A leading `?` marks a finding that the
 * rules neither ask for nor forbid.
 */
export type RuleRow = [
  base: Base,
  title: string,
  edits: Edits,
  expected: string[],
  /** Codes (a `*` at the end: any that begin so) that may be stop or open beside the one under test. */
  also?: string[],
];

const CONFIDENCES = ['regulation', 'agreeing', 'single', 'memory', 'common practice', 'own policy'];

const BUILDERS = {
  O: soundWorksheet,
  T: soundTestingWorksheet,
  W: soundEnergizedWorksheet,
};
const STAGES = { work: 'work', close: 'close-out' } as const;

interface Whole {
  content: WorksheetContent;
  on: string;
  stage: Stage;
  proof: Proof | undefined;
  closeOut: CloseOut | undefined;
}

/** The base with the edits made. */
export function withEdits(base: Base, edits: Edits = {}): Whole {
  const [path = 'O', late] = base.split(' ') as ['O' | 'T' | 'W', ('work' | 'close')?];
  const sound = BUILDERS[path]();
  const stage: Stage = late ? STAGES[late] : 'plan';
  let root: Record<string, unknown> = {
    ...sound.content,
    on: sound.on,
    proof: stage === 'plan' || path !== 'O' ? undefined : sound.proof,
    closeOut: stage === 'close-out' ? sound.closeOut : undefined,
  };
  for (const [pointer, value] of Object.entries(edits)) root = withPath(root, pointer, value);
  const { on, proof, closeOut, ...content } = root;
  return { content, on, stage, proof, closeOut } as Whole;
}

/** The base with the edits made; whatever may be required is at hand unless an edit says what is. */
export function edited(base: Base, edits: Edits = {}): Whole {
  const whole = withEdits(base, edits);
  const saysWhatIsAtHand = Object.keys(edits).some((pointer) =>
    /^protectiveEquipment(\/ready.*)?$/.test(pointer),
  );
  return saysWhatIsAtHand
    ? whole
    : {
        ...whole,
        content: withPath(whole.content, '/protectiveEquipment/ready', [...REQUIRED_ITEM_IDS]),
      };
}

function frozen<T>(value: T): T {
  if (typeof value !== 'object' || value === null) return value;
  Object.values(value).forEach(frozen);
  return Object.freeze(value);
}

/** Assesses, and checks what holds of every assessment whatever was answered. */
export function assessed({ content, ...options }: Whole): Assessment {
  const result = assess(frozen(content), frozen(options));
  const severities = result.findings.map((finding) => finding.severity);
  expect(result.verdict).toBe(
    severities.includes('stop') ? 'stop' : severities.includes('open') ? 'open' : 'ready',
  );
  const unsourced = result.findings.filter(
    ({ path, citation }) =>
      !/^\/[a-zA-Z]/.test(path) ||
      !CONFIDENCES.includes(citation?.confidence) ||
      citation.standard === '',
  );
  expect(unsourced).toHaveLength(0);
  expect(result.findings.flatMap(missingParams)).toEqual([]);
  return result;
}

/** Assesses a base with the edits made. */
export function assessBase(base: Base, edits: Edits = {}): Assessment {
  return assessed(edited(base, edits));
}

/** The findings of one code as `severity /path`, in their order. */
export function found(result: Assessment, code: string): string[] {
  return result.findings
    .filter((finding) => finding.code === code)
    .map((finding) => `${finding.severity} ${finding.path}`);
}

/** `severity code /path` of everything that is stop or open. */
export function unsettled(result: Assessment): string[] {
  return result.findings
    .filter((finding) => finding.severity !== 'caution')
    .map((finding) => `${finding.severity} ${finding.code} ${finding.path}`);
}

function fits(actual: string | undefined, pattern: string): boolean {
  if (actual === undefined) return false;
  if (!pattern.includes(' ')) return actual.startsWith(`${pattern} `);
  return pattern.endsWith('*') ? actual.startsWith(pattern.slice(0, -1)) : actual === pattern;
}

/** Fails with both lists shown unless the findings are those expected, in order. */
export function expectFound(actual: string[], expected: string[]): void {
  const rest = [...actual];
  let isSame = true;
  for (const entry of expected) {
    const isOptional = entry.startsWith('?');
    if (fits(rest[0], isOptional ? entry.slice(1) : entry)) rest.shift();
    else if (!isOptional) isSame = false;
  }
  if (!isSame || rest.length > 0) expect(actual).toEqual(expected);
}

function isAllowed(code: string, allowed: string[]): boolean {
  return allowed.some((entry) =>
    entry.endsWith('*') ? code.startsWith(entry.slice(0, -1)) : entry === code,
  );
}

/** One test for each row, named by the rule's code and what it rests on. */
export function describeRule(code: string, basis: string, rows: RuleRow[]): void {
  describe(`${code} (${basis})`, () => {
    it.each(rows)('%s: %s', (base, _title, edits, expected, also = []) => {
      const result = assessBase(base, edits);
      expectFound(found(result, code), expected);
      const others = result.findings
        .filter((finding) => finding.severity !== 'caution' && finding.code !== code)
        .filter((finding) => !isAllowed(finding.code, also))
        .map((finding) => `${finding.severity} ${finding.code} ${finding.path}`);
      expect(others).toEqual([]);
    });
  });
}

/** The same row for several bases. */
export function onEach(
  bases: Base[],
  title: string,
  edits: Edits,
  expected: string[],
  also?: string[],
): RuleRow[] {
  return bases.map((base): RuleRow => [base, title, edits, expected, also]);
}

/** A row for each value of one field. */
export function eachValue(
  bases: Base[],
  pointer: string,
  values: unknown[],
  expected: string[],
  also?: string[],
  others: Edits = {},
): RuleRow[] {
  return values.flatMap((value) =>
    bases.map((base): RuleRow => [
      base,
      `${pointer} = ${JSON.stringify(value) ?? 'missing'}`,
      { ...others, [pointer]: value },
      expected,
      also,
    ]),
  );
}

export const ALL: Base[] = ['O', 'T', 'W'];
export const ENERGIZED: Base[] = ['T', 'W'];
export const gone = undefined;
