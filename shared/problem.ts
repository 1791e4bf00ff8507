import { z } from 'zod';

/**
 * RFC 9457 problem documents. The client branches on `type`, never on text;
 * `title` is fixed for each type.
 */
/* `malformed-request` also answers with 413, 415 and 428 (no If-Match). */
export const PROBLEMS = {
  'invalid-input': { status: 422, title: 'Some fields are not right.' },
  'not-ready': { status: 409, title: 'The worksheet is not ready for this.' },
  'not-signed-in': { status: 401, title: 'Sign in first.' },
  'wrong-credentials': { status: 401, title: 'The e-mail or the password is wrong.' },
  'not-allowed': { status: 403, title: 'This is not yours to do.' },
  'foreign-origin': { status: 403, title: 'The request came from another site.' },
  'wrong-password': { status: 403, title: 'The password is wrong.' },
  'wrong-pin': { status: 403, title: 'The PIN is wrong.' },
  'not-found': { status: 404, title: 'Not found.' },
  'stale-version': { status: 412, title: 'Somebody saved another version first.' },
  'wrong-state': { status: 409, title: 'The worksheet is in a state that does not allow this.' },
  'hash-mismatch': { status: 409, title: 'What was signed is not the current content.' },
  'id-taken': { status: 409, title: 'This id is taken.' },
  conflict: { status: 409, title: 'This conflicts with another record.' },
  'too-many-requests': { status: 429, title: 'Too many tries.' },
  'malformed-request': { status: 400, title: 'The request is malformed.' },
  'took-too-long': { status: 503, title: 'This took too long.' },
  unavailable: { status: 503, title: 'The database cannot be reached.' },
  unexpected: { status: 500, title: 'Something went wrong.' },
} as const;
export type ProblemName = keyof typeof PROBLEMS;

/** One bad field: `pointer` is a JSON Pointer fragment such as `#/content/supply/watts`. */
export const fieldErrorSchema = z.object({
  pointer: z.string(),
  code: z.string(),
  message: z.string(),
});
export type FieldError = z.infer<typeof fieldErrorSchema>;

export const problemSchema = z.looseObject({
  type: z.string(),
  title: z.string(),
  status: z.number(),
  detail: z.string().optional(),
  instance: z.string().optional(),
  errors: z.array(fieldErrorSchema).optional(),
});
export type ProblemDocument = z.infer<typeof problemSchema>;

/** The name behind `/problems/…`, or `unexpected` for a type this client does not know. */
export function problemName(type: string): ProblemName {
  const name = type.replace(/^.*\/problems\//, '');
  return Object.hasOwn(PROBLEMS, name) ? (name as ProblemName) : 'unexpected';
}
