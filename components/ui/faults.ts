import type { Messages } from '@/shared/messages';
import { ApiProblem } from '../api/ApiProblem';

/** The sentences for a failed request: by its type, never by its text. */
export function describeFault(error: unknown, { problems }: Messages): string {
  const words =
    error instanceof ApiProblem
      ? problems[error.problem]
      : error instanceof TypeError
        ? problems.offline
        : problems.unexpected;
  return `${words.title} ${words.remedy}`;
}

/** The number to read out when something went wrong on the server. */
export function referenceOf(error: unknown): string | undefined {
  if (!(error instanceof ApiProblem) || error.status < 500) return undefined;
  return error.document.instance?.replace(/^urn:uuid:/, '');
}
