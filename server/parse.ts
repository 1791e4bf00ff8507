import type { core } from 'zod';
import { z } from 'zod';
import type { FieldError } from '@/shared/problem';
import { invalidInput, notFound } from './problem';

type Issue = core.$ZodIssue;
type Path = readonly PropertyKey[];

/** Reads `value` with a schema; bad input is one problem that names every bad field. */
export function parse<T extends z.ZodType>(schema: T, value: unknown, prefix = ''): z.infer<T> {
  const result = schema.safeParse(value);
  if (result.success) return result.data;
  throw invalidInput(result.error.issues.flatMap((issue) => fieldErrors(issue, [], prefix)));
}

const uuid = z.uuid();

/** An id from the path. What is no UUID names nothing: 404, as for any other unknown record. */
export function parseId(value: unknown): string {
  const result = uuid.safeParse(value);
  if (!result.success) throw notFound();
  return result.data.toLowerCase();
}

/** JSON Pointer (RFC 6901) as a URI fragment. */
export function pointerTo(path: Path, prefix = ''): string {
  const steps = path.map((step) => String(step).replaceAll('~', '~0').replaceAll('/', '~1'));
  return `#${prefix}${steps.map((step) => `/${step}`).join('')}`;
}

function fieldErrors(issue: Issue, parent: Path, prefix: string): FieldError[] {
  const path = [...parent, ...issue.path];
  if (issue.code === 'unrecognized_keys') {
    return issue.keys.map((key) => ({
      pointer: pointerTo([...path, key], prefix),
      code: 'unrecognized',
      message: 'This field is not known.',
    }));
  }
  if (issue.code === 'invalid_union') {
    const branch = closestBranch(issue.errors);
    if (branch.length > 0) return branch.flatMap((inner) => fieldErrors(inner, path, prefix));
  }
  return [{ pointer: pointerTo(path, prefix), code: codeOf(issue), message: issue.message }];
}

/** Of a union's branches the one with the fewest faults is what the client meant. */
function closestBranch(branches: readonly Issue[][]): Issue[] {
  const count = (issues: Issue[]) =>
    issues.reduce((sum, issue) => sum + ('keys' in issue ? issue.keys.length : 1), 0);
  return [...branches].sort((one, other) => count(one) - count(other))[0] ?? [];
}

function codeOf(issue: Issue): string {
  if (issue.code === 'custom' && typeof issue.params?.['code'] === 'string') {
    return issue.params['code'];
  }
  if (issue.code === 'invalid_type' && issue.input === undefined) return 'required';
  return issue.code;
}
