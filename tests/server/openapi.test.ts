import supertest from 'supertest';
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
