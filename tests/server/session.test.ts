import supertest from 'supertest';
import { expect, it } from 'vitest';
import { buildApp } from '@/server/app';
import { buildSite, buildUser, signIn } from '../support/server';

const app = buildApp();

it('signs a person in and out', async () => {
  const site = await buildSite();
  const person = await buildUser({ sites: [site] });
  const agent = await signIn(app, person);
  const { body } = await agent.get('/api/session').expect(200);
  expect(body.user).toMatchObject({ id: person.id, siteIds: [site.id], hasPin: true });
  await agent.delete('/api/session').expect(204);
  await agent.get('/api/session').expect(401);
});

it('says when the password is wrong', async () => {
  const person = await buildUser();
  const answer = await supertest(app)
    .post('/api/session')
    .send({ email: person.email, password: 'another password' });
  expect(answer.status).toBe(401);
  expect(answer.body.type).toBe('/problems/wrong-credentials');
});
