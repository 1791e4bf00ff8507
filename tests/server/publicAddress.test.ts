import supertest from 'supertest';
import { describe, expect, it, vi } from 'vitest';
import { buildApp } from '@/server/app';
import { deliverMails } from '../support/mail';
import { buildUser, PASSWORD } from '../support/server';

// Before any import: the environment is read once.
vi.hoisted(() => {
  Object.assign(process.env, {
    NODE_ENV: 'production',
    PUBLIC_URL: 'https://worksheets.example',
    TRUST_PROXY: '',
  });
});

const app = buildApp();
const signIn = (email: string) =>
  supertest(app)
    .post('/api/session')
    .set('X-Forwarded-Proto', 'https')
    .send({ email, password: PASSWORD });

describe('behind the address that people use', () => {
  it('the cookie is Secure, of this host alone, and read by no script', async () => {
    const { email } = await buildUser();
    const answer = await signIn(email).expect(201);
    const [cookie] = answer.headers['set-cookie'] as unknown as string[];
    expect(cookie).toMatch(/^__Host-wideberth=/);
    for (const part of [/; Secure/, /; HttpOnly/, /; SameSite=Lax/, /; Path=\//]) {
      expect(cookie).toMatch(part);
    }
    expect(cookie).not.toMatch(/Domain/);
  });

  it('browsers are told to come back by TLS only', async () => {
    const { headers } = await supertest(app).get('/api/health').expect(200);
    expect(headers['strict-transport-security']).toMatch(/^max-age=\d{8}/);
    expect(headers['content-security-policy']).toContain('upgrade-insecure-requests');
  });

  it.each([
    ['https://worksheets.example', 401],
    ['https://worksheets.example:8443', 403],
    ['http://worksheets.example', 403],
    ['https://other.example', 403],
    ['https://worksheets.example.other.example', 403],
  ])('a change from %s is answered with %i, whatever Host says', async (origin, status) => {
    for (const host of ['worksheets.example', 'other.example', new URL(origin).host]) {
      const answer = await supertest(app)
        .post('/api/session')
        .set({ Origin: origin, Host: host })
        .send({ email: 'nobody@company.example', password: PASSWORD });
      expect(answer.status).toBe(status);
    }
  });

  it('links in mail lead there, never to the Host of a request', async () => {
    const { email } = await buildUser();
    await supertest(app)
      .post('/api/password-resets')
      .set({ Host: 'other.example', 'X-Forwarded-Host': 'other.example' })
      .send({ email })
      .expect(202);
    const mail = (await deliverMails()).findLast(({ to }) => to.includes(email));
    expect(mail?.text).toContain('https://worksheets.example/reset/');
    expect(mail?.raw).not.toContain('other.example');
  });
});

describe('without a proxy that is trusted', () => {
  it('nobody chooses the address that they are counted by', async () => {
    const answers: number[] = [];
    for (let tries = 0; tries < 31; tries += 1) {
      const { status } = await supertest(app)
        .get('/api/verify/2026-000001/x')
        .set('X-Forwarded-For', `203.0.113.${tries}`);
      answers.push(status);
    }
    expect(answers).toEqual([...Array<number>(30).fill(200), 429]);
  });
});
