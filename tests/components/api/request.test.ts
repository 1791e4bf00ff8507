import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest';
import { z } from 'zod';
import { ApiProblem, isProblem } from '@/components/api/ApiProblem';
import { json, request } from '@/components/api/request';

const server = vi.fn<typeof fetch>();
beforeEach(() => vi.stubGlobal('fetch', server));
afterEach(() => {
  server.mockReset();
  vi.unstubAllGlobals();
});

const numberSchema = z.object({ count: z.number() });
const answerWith = (status: number, body: string | null, headers: Record<string, string> = {}) =>
  server.mockResolvedValue(new Response(body, { status, headers }));

describe('request', () => {
  it('parses the answer and sends JSON as such', async () => {
    answerWith(200, '{"count":3}');
    await expect(
      request(numberSchema, '/things', json('POST', { a: 1 }, { 'If-Match': '"2"' })),
    ).resolves.toEqual({ count: 3 });
    const [address, init] = server.mock.calls[0] ?? [];
    expect(address).toBe('/api/things');
    const headers = new Headers(init?.headers);
    expect(headers.get('Content-Type')).toBe('application/json');
    expect(headers.get('If-Match')).toBe('"2"');
  });

  it('lets the browser name the type of a file', async () => {
    answerWith(200, '{"count":1}');
    await request(numberSchema, '/things', { method: 'POST', body: new FormData() });
    expect(new Headers(server.mock.calls[0]?.[1]?.headers).has('Content-Type')).toBe(false);
  });

  it('answers undefined for 204', async () => {
    answerWith(204, null);
    await expect(request(z.undefined(), '/things')).resolves.toBeUndefined();
  });

  it('throws the problem with its fields and its wait', async () => {
    answerWith(
      429,
      JSON.stringify({
        type: '/problems/too-many-requests',
        title: 'Too many tries.',
        status: 429,
        errors: [{ pointer: '#/pin', code: 'x', message: 'y' }],
      }),
      { 'Retry-After': '900' },
    );
    const error: unknown = await request(numberSchema, '/things').catch(
      (thrown: unknown) => thrown,
    );
    expect(isProblem(error, 'too-many-requests')).toBe(true);
    expect(error).toBeInstanceOf(ApiProblem);
    expect((error as ApiProblem).retryAfterSeconds).toBe(900);
    expect((error as ApiProblem).at('#/pin')?.code).toBe('x');
  });

  it('takes a page of a proxy for an unavailable server', async () => {
    answerWith(502, '<html>Bad gateway</html>');
    await expect(request(numberSchema, '/things')).rejects.toMatchObject({
      problem: 'unavailable',
      status: 502,
    });
  });

  it('refuses an answer of another shape instead of showing half of it', async () => {
    answerWith(200, '{"count":"three"}');
    await expect(request(numberSchema, '/things')).rejects.toBeInstanceOf(z.ZodError);
  });
});
