import http from 'node:http';
import type { AddressInfo } from 'node:net';
import supertest from 'supertest';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { buildApp } from '@/server/app';
import { problemSchema } from '@/shared/problem';
import { buildUser, signIn } from '../support/server';

const app = buildApp();
let agent: Awaited<ReturnType<typeof signIn>>;

beforeAll(async () => {
  agent = await signIn(app, await buildUser({ role: 'safety' }));
});

describe('a malformed request', () => {
  const post = () => agent.post('/api/users');

  it.each([
    ['broken JSON', '{"name":', 'application/json', 400],
    ['a bare value', '"name"', 'application/json', 400],
    ['another kind of content', 'name=x', 'application/x-www-form-urlencoded', 415],
    ['no kind of content', 'name', 'text/plain', 415],
    ['an unknown alphabet', '{}', 'application/json; charset=ebcdic', 415],
    ['an upload where none is taken', '--x--', 'multipart/form-data; boundary=x', 415],
  ])('of %s', async (_what, body, type, status) => {
    const answer = await post().set('Content-Type', type).send(body);
    expect(answer.status).toBe(status);
    expect(answer.type).toBe('application/problem+json');
    expect(problemSchema.parse(JSON.parse(answer.text)).type).toBe('/problems/malformed-request');
  });

  it('of five megabytes is 413', async () => {
    const answer = await post().send({ name: 'x'.repeat(5_000_000) });
    expect(answer.status).toBe(413);
  });

  it('answers before anybody is asked to sign in', async () => {
    await supertest(app)
      .post('/api/users')
      .set('Content-Type', 'application/json')
      .send('{"')
      .expect(400);
  });

  it('of an address that cannot be decoded is 400', async () => {
    await agent.get('/api/users/%E0%A4%A').expect(400);
  });
});

describe('what PostgreSQL cannot hold', () => {
  it.each([
    ['U+0000', 'a\u0000b'],
    ['an unpaired surrogate', 'a\ud800b'],
  ])('%s is bad input', async (_what, name) => {
    const { status, body } = await agent
      .post('/api/users')
      .send({ name, email: 'odd@company.example', role: 'lead', siteIds: [] });
    expect([status, body.errors?.[0]?.pointer]).toEqual([422, '#/name']);
  });

  it('in a path names nothing', async () => {
    await agent.get('/api/users/%00').expect(404);
    await agent.get('/api/users/1').expect(404);
  });

  it('takes no key of the prototype', async () => {
    await agent
      .post('/api/users')
      .set('Content-Type', 'application/json')
      .send('{"__proto__":{"role":"safety"},"name":"x"}')
      .expect(422);
  });
});

describe('a foreign origin', () => {
  const out = (headers: Record<string, string>) =>
    agent.patch('/api/session').set(headers).send({ theme: 'dark' });

  it.each<Record<string, string>>([
    { Origin: 'https://elsewhere.example' },
    { Origin: 'null' },
    { Origin: 'nonsense' },
    { 'Sec-Fetch-Site': 'cross-site' },
    { 'Sec-Fetch-Site': 'same-site' },
  ])('is refused: %o', async (headers) => {
    const { status, body } = await out(headers);
    expect([status, body.type]).toEqual([403, '/problems/foreign-origin']);
  });

  it('is not this one', async () => {
    await out({ Host: 'wideberth.example', Origin: 'http://wideberth.example' }).expect(200);
    await out({ 'Sec-Fetch-Site': 'same-origin' }).expect(200);
    await out({}).expect(200);
  });

  it('may still read', async () => {
    await agent.get('/api/session').set('Origin', 'https://elsewhere.example').expect(200);
  });
});

describe('every answer', () => {
  it('under /api is not stored, says nothing of the server and carries its id', async () => {
    const { headers, body } = await supertest(app).get('/api/nothing').expect(404);
    expect(headers['cache-control']).toBe('no-store');
    expect(headers['x-powered-by']).toBeUndefined();
    expect(body.instance).toBe(`urn:uuid:${headers['x-request-id']}`);
  });

  it('carries the policy for its content', async () => {
    const { headers } = await supertest(app).get('/api/health').expect(200);
    const policy = headers['content-security-policy'];
    for (const part of [
      "default-src 'self'",
      "script-src 'self'",
      "object-src 'none'",
      "base-uri 'none'",
      "frame-ancestors 'none'",
    ]) {
      expect(policy).toContain(part);
    }
    expect(policy).not.toContain('upgrade-insecure-requests');
    expect(headers['strict-transport-security']).toBeUndefined();
    expect(headers['referrer-policy']).toBe('no-referrer');
    expect(headers['x-content-type-options']).toBe('nosniff');
  });
});

describe('over a socket', () => {
  const server = http.createServer(app);
  beforeAll(() => new Promise<void>((resolve) => server.listen(0, '127.0.0.1', () => resolve())));
  afterAll(() => new Promise<void>((resolve) => server.close(() => resolve())));

  it('an unknown method of a known route is 404', async () => {
    const { port } = server.address() as AddressInfo;
    const answer = await fetch(`http://127.0.0.1:${port}/api/users`, { method: 'PUT' });
    expect([401, 404]).toContain(answer.status);
  });
});
