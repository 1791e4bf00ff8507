import {
  problemName,
  type FieldError,
  type ProblemDocument,
  type ProblemName,
} from '@/shared/problem';

/** A problem document that the server answered with. Branch on `problem`, never on text. */
export class ApiProblem extends Error {
  readonly problem: ProblemName;
  readonly status: number;
  readonly document: ProblemDocument;
  /** Seconds that the server asks to wait, from `Retry-After`. */
  readonly retryAfterSeconds: number | undefined;

  constructor(document: ProblemDocument, retryAfterSeconds?: number) {
    super(document.detail ?? document.title);
    this.name = 'ApiProblem';
    this.problem = problemName(document.type);
    this.status = document.status;
    this.document = document;
    this.retryAfterSeconds = retryAfterSeconds;
  }

  get errors(): readonly FieldError[] {
    return this.document.errors ?? [];
  }

  /** The bad field at that JSON Pointer fragment, such as `#/pin`. */
  at(pointer: string): FieldError | undefined {
    return this.errors.find((error) => error.pointer === pointer);
  }
}

/** Whether a failed request failed in that way. */
export function isProblem(error: unknown, name: ProblemName): error is ApiProblem {
  return error instanceof ApiProblem && error.problem === name;
}
