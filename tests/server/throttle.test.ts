import supertest from 'supertest';
import { expect, it } from 'vitest';
import { buildApp } from '@/server/app';
import { checkPin } from '@/server/services/checkPin';
import type { Problem } from '@/server/problem';
import { deliverMails } from '../support/mail';
import { buildUser, PASSWORD, PIN } from '../support/server';

const app = buildApp();

function tryFrom(address: string, email: string, password = 'not this one, no') {
  return supertest(app)
    .post('/api/session')
    .set('X-Forwarded-For', address)
    .send({ email, password });
}

it('stops an account at one address after ten failures, even with the right password', async () => {
  const person = await buildUser();
  for (let tries = 0; tries < 10; tries += 1) {
    expect((await tryFrom('203.0.113.1', person.email)).status).toBe(401);
  }
  const blocked = await tryFrom('203.0.113.1', person.email, PASSWORD);
  expect(blocked.status).toBe(429);
  expect(blocked.body.type).toBe('/problems/too-many-requests');
  expect(Number(blocked.headers['retry-after'])).toBeGreaterThan(800);
  expect((await tryFrom('203.0.113.2', person.email, PASSWORD)).status).toBe(201);
});

it('counts failures only', async () => {
  const person = await buildUser();
  for (let tries = 0; tries < 12; tries += 1) {
    expect((await tryFrom('203.0.113.9', person.email, PASSWORD)).status).toBe(201);
  }
});

it('stops one address after a hundred failures over many accounts', async () => {
  const person = await buildUser();
  const answers: number[] = [];
  for (let tries = 0; tries < 101; tries += 1) {
    const { status } = await tryFrom('203.0.113.3', `nobody${tries}@company.example`);
    answers.push(status);
  }
  expect(answers.slice(0, 100).every((status) => status === 401)).toBe(true);
  expect(answers[100]).toBe(429);
  expect((await tryFrom('203.0.113.3', person.email, PASSWORD)).status).toBe(429);
});

it('stops one account after fifty failures from many addresses', async () => {
  const person = await buildUser();
  for (let tries = 0; tries < 50; tries += 1) {
    expect((await tryFrom(`198.51.100.${tries}`, person.email)).status).toBe(401);
  }
  expect((await tryFrom('198.51.100.200', person.email, PASSWORD)).status).toBe(429);
});

it('counts tries that come all at once', async () => {
  const person = await buildUser();
  const answers = await Promise.all(
    Array.from({ length: 25 }, () => tryFrom('203.0.113.4', person.email)),
  );
  expect(answers.filter(({ status }) => status === 401)).toHaveLength(10);
  expect(answers.filter(({ status }) => status === 429)).toHaveLength(15);
});

it('blocks a PIN after five wrong ones, whoever typed them, and mails the signer', async () => {
  const signer = await buildUser();
  const outcome = (pin: string) =>
    checkPin(signer.id, pin).then(
      () => 'right',
      (problem: Problem) => problem.problem,
    );
  for (let tries = 0; tries < 5; tries += 1) expect(await outcome('135791')).toBe('wrong-pin');
  expect(await outcome(PIN)).toBe('too-many-requests');
  const mails = await deliverMails();
  const mail = mails.find(({ to }) => to.includes(signer.email));
  expect(mail?.subject).toMatch(/five times/);
  expect(mail?.text).not.toMatch(/135791|246810/);
});

it('forgets wrong PINs after a right one', async () => {
  const signer = await buildUser();
  for (let round = 0; round < 3; round += 1) {
    for (let tries = 0; tries < 4; tries += 1) {
      await expect(checkPin(signer.id, '135791')).rejects.toMatchObject({ problem: 'wrong-pin' });
    }
    await checkPin(signer.id, PIN);
  }
});

it('allows thirty resets a minute from one address', async () => {
  const ask = () =>
    supertest(app)
      .post('/api/password-resets')
      .set('X-Forwarded-For', '203.0.113.7')
      .send({ email: 'nobody@company.example' });
  for (let tries = 0; tries < 30; tries += 1) expect((await ask()).status).toBe(202);
  const { status, headers } = await ask();
  expect(status).toBe(429);
  expect(Number(headers['retry-after'])).toBeLessThanOrEqual(60);
});
