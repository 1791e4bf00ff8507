import type { z } from 'zod';
import { problemSchema, type ProblemDocument } from '@/shared/problem';
import { ApiProblem } from './ApiProblem';
import { apiBase } from './apiBase';

function problemOf(status: number, body: unknown): ProblemDocument {
  const parsed = problemSchema.safeParse(body);
  if (parsed.success) return parsed.data;
  // A proxy in between answered, not our server.
  return { type: '/problems/unavailable', title: 'Unavailable', status };
}

/** Where a path of the interface stands, for links and images: `/attachments/…/thumbnail`. */
export function apiUrl(path: string): string {
  return `${apiBase}${path}`;
}

/** The answer as it came, for files; a fault throws an `ApiProblem`. */
export async function requestRaw(path: string, init: RequestInit = {}): Promise<Response> {
  const headers = new Headers(init.headers);
  headers.set('Accept', 'application/json, */*;q=0.5');
  if (typeof init.body === 'string') headers.set('Content-Type', 'application/json');
  const response = await fetch(apiUrl(path), { ...init, headers, credentials: 'include' });
  if (response.ok) return response;
  const body: unknown = await response.json().catch(() => undefined);
  const wait = Number(response.headers.get('Retry-After') ?? NaN);
  throw new ApiProblem(problemOf(response.status, body), Number.isFinite(wait) ? wait : undefined);
}

/**
 * Asks the server and parses the answer. Throws an `ApiProblem` for a problem
 * document, the network's own error where no answer came, and zod's where the
 * answer is not of the shape that this client knows. A 204 is `undefined`.
 */
export async function request<T extends z.ZodType>(
  schema: T,
  path: string,
  init: RequestInit = {},
): Promise<z.output<T>> {
  const response = await requestRaw(path, init);
  const body: unknown = response.status === 204 ? undefined : await response.json();
  return schema.parse(body);
}

/** The options of a request that sends JSON. */
export function json(
  method: 'POST' | 'PUT' | 'PATCH',
  body: unknown,
  headers?: HeadersInit,
): RequestInit {
  return { method, body: JSON.stringify(body), headers };
}
