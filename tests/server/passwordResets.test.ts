import supertest from 'supertest';
import { afterEach, describe, expect, it } from 'vitest';
import { buildApp } from '@/server/app';
import { clock } from '@/server/clock';
import { PasswordReset } from '@/server/models/PasswordReset';
import { User } from '@/server/models/User';
import { deliverMails, linkMailedTo } from '../support/mail';
import { buildSite, buildUser, PIN, signIn } from '../support/server';

const app = buildApp();
const NEW_PASSWORD = 'seven quiet heron ladders';
const ask = (email: string) => supertest(app).post('/api/password-resets').send({ email });
const use = (token: string, body: object) =>
  supertest(app).post(`/api/password-resets/${token}`).send(body);

afterEach(() => clock.set(null));

describe('a reset', () => {
  it('changes the password once, ends every session and leaves the PIN', async () => {
    const person = await buildUser();
    const agent = await signIn(app, person);
    await ask(person.email.toUpperCase()).expect(202);
    const { kind, token } = await linkMailedTo(person.email);
    expect(kind).toBe('reset');
    await use(token, { password: NEW_PASSWORD, pin: '246813' }).expect(422);
    await use(token, { password: NEW_PASSWORD }).expect(204);
    await agent.get('/api/session').expect(401);
    await signIn(app, person, NEW_PASSWORD);
    await use(token, { password: 'another heron on a ladder' }).expect(404);
    const { pinHash } = await User.findByPk(person.id, { rejectOnEmpty: true });
    expect(pinHash).toBe(person.pinHash);
    const mails = await deliverMails();
    expect(mails.findLast(({ to }) => to.includes(person.email))?.subject).toMatch(/changed/);
  });

  it('answers the same for an unknown address, and sends nothing', async () => {
    const before = (await deliverMails()).length;
    const { status, body } = await ask('nobody@company.example');
    expect([status, body]).toEqual([202, {}]);
    expect(await deliverMails()).toHaveLength(before);
  });

  it('runs out after an hour', async () => {
    const person = await buildUser();
    await ask(person.email).expect(202);
    const { token } = await linkMailedTo(person.email);
    clock.advance(3_600_001);
    await use(token, { password: NEW_PASSWORD }).expect(404);
  });

  it('that is not there is not found, whatever the body says', async () => {
    const person = await buildUser();
    await ask(person.email).expect(202);
    const { token } = await linkMailedTo(person.email);
    await use(token, { password: NEW_PASSWORD }).expect(204);
    for (const gone of [token, 'no-such-token']) {
      for (const body of [{}, { password: 'password1234' }, { password: NEW_PASSWORD, pin: 7 }]) {
        const answer = await use(gone, body);
        expect([answer.status, answer.body.type]).toEqual([404, '/problems/not-found']);
      }
    }
  });

  it('keeps only a hash of the token', async () => {
    const person = await buildUser();
    await ask(person.email).expect(202);
    const { token } = await linkMailedTo(person.email);
    const rows = await PasswordReset.findAll({ where: { userId: person.id } });
    expect(rows).toHaveLength(1);
    expect(JSON.stringify(rows)).not.toContain(token);
  });

  it('is used by one of two at once', async () => {
    const person = await buildUser();
    await ask(person.email).expect(202);
    const { token } = await linkMailedTo(person.email);
    const answers = await Promise.all([
      use(token, { password: NEW_PASSWORD }),
      use(token, { password: 'another heron on a ladder' }),
    ]);
    expect(answers.map(({ status }) => status).sort()).toEqual([204, 404]);
  });

  it('refuses a common password and keeps the link', async () => {
    const person = await buildUser();
    await ask(person.email).expect(202);
    const { token } = await linkMailedTo(person.email);
    await use(token, { password: 'password1234' }).expect(422);
    await use(token, { password: NEW_PASSWORD }).expect(204);
  });
});

describe('an invitation', () => {
  it('asks for a password and a PIN, in the language of the person', async () => {
    const site = await buildSite();
    const safety = await signIn(app, await buildUser({ role: 'safety' }));
    const email = 'Nueva.Persona@company.example';
    const { body } = await safety
      .post('/api/users')
      .send({ name: 'Nueva Persona', email, role: 'helper', siteIds: [site.id], locale: 'es-MX' })
      .expect(201);
    expect(body.hasPin).toBe(false);
    const { kind, token } = await linkMailedTo(email);
    expect(kind).toBe('invitation');
    const mail = (await deliverMails()).findLast(({ to }) => to.includes(email));
    expect(mail?.subject).toBe('Su cuenta en Wideberth');
    const answer = await use(token, { password: NEW_PASSWORD }).expect(422);
    expect(answer.body.errors[0].pointer).toBe('#/pin');
    await use(token, { password: NEW_PASSWORD, pin: PIN }).expect(204);
    const agent = await signIn(app, email, NEW_PASSWORD);
    const session = await agent.get('/api/session').expect(200);
    expect(session.body.user).toMatchObject({ hasPin: true, locale: 'es-MX', siteIds: [site.id] });
  });
});
