import type { Messages } from '@/shared/messages';
import { ApiProblem } from '../api/ApiProblem';

/** The sentence for a failed request: by its type, never by its text. */
export function describeFault(error: unknown, { ui, problems }: Messages): string {
  if (!(error instanceof ApiProblem)) return ui.problem.network;
  if (error.problem === 'malformed-request') return ui.problem.update;
  if (error.problem === 'unexpected') return ui.problem.unexpected;
  const { title, todo } = problems[error.problem];
  return `${title} ${todo}`;
}

/** The number to read out when something went wrong on the server. */
export function referenceOf(error: unknown): string | undefined {
  if (!(error instanceof ApiProblem) || error.status < 500) return undefined;
  return error.document.instance?.replace(/^urn:uuid:/, '');
}
