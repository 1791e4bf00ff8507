import { vi } from 'vitest';

/** Answers by the beginning of the path under `/api`; anything else is a 404. The first that fits wins. */
export function stubServer(answers: Readonly<Record<string, unknown>>) {
  const server = vi.fn<typeof fetch>((input) => {
    const path = (input instanceof Request ? input.url : input.toString()).replace(/^.*\/api/, '');
    const key = Object.keys(answers).find((start) => path.startsWith(start));
    const found = key !== undefined;
    return Promise.resolve(
      new Response(
        JSON.stringify(
          found ? answers[key] : { type: '/problems/not-found', title: 'Not found.', status: 404 },
        ),
        { status: found ? 200 : 404, headers: { 'Content-Type': 'application/json' } },
      ),
    );
  });
  vi.stubGlobal('fetch', server);
  return server;
}
