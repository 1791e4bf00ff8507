import supertest from 'supertest';
import type { Router } from 'express';
import { beforeAll, expect, it } from 'vitest';
import { buildApp } from '@/server/app';
import { API_ROUTES } from '@/server/openapi/routes';

const app = buildApp();
let document: { openapi: string; paths: Record<string, Record<string, unknown>> };

beforeAll(async () => {
  const { body } = await supertest(app).get('/api/openapi.json').expect(200);
  document = body;
});

it('describes every route, open to anybody', () => {
  expect(document.openapi).toBe('3.1.0');
  for (const { method, path } of API_ROUTES) {
    expect(document.paths[`/api${path}`], path).toHaveProperty(method);
  }
  expect(JSON.stringify(document.paths['/api/worksheets/{worksheetId}'])).toContain('If-Match');
});

it.each(API_ROUTES.filter(({ open }) => open === undefined))(
  '$method $path asks to sign in',
  async ({ method, path }) => {
    const id = '01890000-0000-7000-8000-000000000000';
    const answer = await supertest(app)[method](`/api${path.replaceAll(/\{\w+\}/g, id)}`);
    expect([answer.status, answer.body.type]).toEqual([401, '/problems/not-signed-in']);
  },
);

/** What the routers of Express list of themselves. */
interface Listed {
  path: string;
  methods?: string[];
  router?: Listing;
}
interface Listing {
  listRoutes(): Listed[];
}

function answered(router: Listing, mount = ''): string[] {
  return router.listRoutes().flatMap(({ path, methods, router: inner }) => {
    const full = `${mount}${path === '/' ? '' : path}`;
    if (inner !== undefined) return answered(inner, full);
    return (methods ?? []).map((method) => `${method.toLowerCase()} ${full}`);
  });
}

it('names every route that Express answers under /api', () => {
  const nameless = (route: string) => route.replaceAll(/\{\w+\}|:\w+/g, '{}');
  const found = answered(app.router as unknown as Router & Listing)
    .filter((route) => /^(?!head)\w+ \/api\//.test(route))
    .map(nameless);
  const named = API_ROUTES.map(({ method, path }) => nameless(`${method} /api${path}`));
  expect(found.sort()).toEqual(named.sort());
});
