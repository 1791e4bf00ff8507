import { BaseError, ConnectionError, DatabaseError, UniqueConstraintError } from 'sequelize';
import type { Finding } from '@/hazard/types';
import { PROBLEMS } from '@/shared/problem';
import type { FieldError, ProblemDocument, ProblemName } from '@/shared/problem';

interface ProblemOptions {
  status?: number;
  detail?: string;
  errors?: FieldError[];
  /** Further members of the document, such as `worksheet` or `findings`. */
  members?: Record<string, unknown>;
  headers?: Record<string, string>;
}

/** An answer that was foreseen: sent to the client, never reported as a fault of the server. */
export class Problem extends Error {
  override readonly name = 'Problem';
  readonly status: number;
  readonly options: ProblemOptions;

  constructor(
    readonly problem: ProblemName,
    options: ProblemOptions = {},
  ) {
    super(options.detail ?? PROBLEMS[problem].title);
    this.status = options.status ?? PROBLEMS[problem].status;
    this.options = options;
  }
}

export const invalidInput = (errors: FieldError[]) => new Problem('invalid-input', { errors });
export const invalidField = (pointer: string, code: string, message: string) =>
  invalidInput([{ pointer, code, message }]);
export const notSignedIn = () => new Problem('not-signed-in');
export const wrongCredentials = () => new Problem('wrong-credentials');
export const notAllowed = (detail?: string) =>
  new Problem('not-allowed', detail === undefined ? {} : { detail });
export const foreignOrigin = () => new Problem('foreign-origin');
export const wrongPassword = (pointer = '#/current') =>
  new Problem('wrong-password', {
    errors: [{ pointer, code: 'wrong', message: 'The password is wrong.' }],
  });
export const wrongPin = (pointer = '#/pin') =>
  new Problem('wrong-pin', { errors: [{ pointer, code: 'wrong', message: 'The PIN is wrong.' }] });
export const notFound = (detail?: string) =>
  new Problem('not-found', detail === undefined ? {} : { detail });
/** The client gets the record as it stands, to show both copies. */
export const staleVersion = (worksheet: unknown) =>
  new Problem('stale-version', { members: { worksheet } });
export const wrongState = (state: string, detail?: string) =>
  new Problem('wrong-state', { members: { state }, ...(detail === undefined ? {} : { detail }) });
export const hashMismatch = (contentHash?: string) =>
  new Problem('hash-mismatch', contentHash === undefined ? {} : { members: { contentHash } });
export const notReady = (findings: readonly Finding[], detail?: string) =>
  new Problem('not-ready', { members: { findings }, ...(detail === undefined ? {} : { detail }) });
export const idTaken = () => new Problem('id-taken');
export const conflict = (detail: string, errors?: FieldError[]) =>
  new Problem('conflict', { detail, ...(errors === undefined ? {} : { errors }) });
export const tooManyRequests = (seconds: number) =>
  new Problem('too-many-requests', {
    headers: { 'Retry-After': String(Math.max(1, Math.ceil(seconds))) },
  });
export const malformedRequest = (status: 400 | 413 | 415 | 428, detail: string) =>
  new Problem('malformed-request', { status, detail });
export const preconditionRequired = () =>
  malformedRequest(428, 'Name the version in If-Match, such as "3".');
export const tookTooLong = () => new Problem('took-too-long', { headers: { 'Retry-After': '30' } });
export const unavailable = () => new Problem('unavailable', { headers: { 'Retry-After': '5' } });

/** The document that goes over the wire; `instance` is the id of the request in the log. */
export function toProblemDocument(problem: Problem, requestId: string): ProblemDocument {
  const { detail, errors, members } = problem.options;
  return {
    ...members,
    type: `/problems/${problem.problem}`,
    title: PROBLEMS[problem.problem].title,
    status: problem.status,
    ...(detail === undefined ? {} : { detail }),
    instance: `urn:uuid:${requestId}`,
    ...(errors === undefined ? {} : { errors }),
  };
}

/**
 * The one place where a fault of a library becomes a problem. `null` means
 * that nobody foresaw it: it is a fault of the server.
 */
export function toProblem(error: unknown): Problem | null {
  if (error instanceof Problem) return error;
  if (typeof error !== 'object' || error === null) return null;
  return databaseProblem(error) ?? requestProblem(error);
}

/** Body parser, multer and the router put a status of 4xx on what the client sent wrong. */
function requestProblem(error: object): Problem | null {
  if ('name' in error && error.name === 'MulterError') return uploadProblem(error);
  const status = 'status' in error ? error.status : undefined;
  if (typeof status !== 'number' || status < 400 || status > 499) return null;
  if (status === 413) return malformedRequest(413, 'The request is too large.');
  if (status === 415)
    return malformedRequest(415, 'The server does not read this kind of content.');
  return malformedRequest(400, 'The request cannot be read.');
}

function uploadProblem(error: object): Problem {
  const code = 'code' in error ? error.code : undefined;
  if (code === 'LIMIT_FILE_SIZE') return malformedRequest(413, 'The file is too large.');
  return malformedRequest(400, 'The upload cannot be read.');
}

function databaseProblem(error: object): Problem | null {
  if (error instanceof ConnectionError) return unavailable();
  if (error instanceof UniqueConstraintError) return uniqueProblem(constraintOf(error));
  const cause = error instanceof DatabaseError ? error.parent : error;
  if (error instanceof BaseError && cause === error) return null;
  return stateProblem(cause);
}

/** What `pg` says, without a code, of a connection that ended or never came to be. */
const LOST_CONNECTION =
  /^(timeout exceeded|Connection terminated|Client has encountered a connection error|Client was closed)/;

function stateProblem(cause: object): Problem | null {
  const code = 'code' in cause && typeof cause.code === 'string' ? cause.code : '';
  if (/^(ECONNREFUSED|ECONNRESET|ENOENT|ETIMEDOUT|EPIPE)$/.test(code) && 'syscall' in cause) {
    return code === 'ENOENT' ? null : unavailable();
  }
  if (cause instanceof Error && LOST_CONNECTION.test(cause.message)) {
    return unavailable();
  }
  if (!/^[0-9A-Z]{5}$/.test(code)) return null;
  // Class 08 connection, 53 resources, 57P shutdown, 55P03 lock timeout, 40 deadlock: try again later.
  if (/^(08|53|57P|55P03|40)/.test(code)) return unavailable();
  if (code === '23505') return uniqueProblem(constraintOf(cause));
  if (code === '23503') return conflict('Something that this names does not exist or is in use.');
  // Class 22 is data that PostgreSQL cannot hold, 23514 and 23502 are checks: bad input, not a fault.
  if (/^(22|23)/.test(code)) return invalidField('#', 'refused', 'The database refused a value.');
  return null;
}

function constraintOf(error: object): string {
  const cause = 'parent' in error && typeof error.parent === 'object' ? error.parent : error;
  if (cause === null || !('constraint' in cause)) return '';
  return typeof cause.constraint === 'string' ? cause.constraint : '';
}

/** The key decides whose id it is; the other unique columns are named to the client. */
function uniqueProblem(constraint: string): Problem {
  if (constraint.endsWith('_pkey') || constraint === 'rubber_goods_tests_id_key') return idTaken();
  if (constraint === 'users_email_key') {
    const message = 'Another account has this e-mail address.';
    return conflict(message, [{ pointer: '#/email', code: 'taken', message }]);
  }
  if (constraint === 'rubber_goods_serial_key') {
    const message = 'Another item at this site has this serial number.';
    return conflict(message, [{ pointer: '#/serial', code: 'taken', message }]);
  }
  return conflict('This conflicts with another record.');
}
