import supertest from 'supertest';
import { afterEach, describe, expect, it } from 'vitest';
import { buildApp } from '@/server/app';
import { clock } from '@/server/clock';
import { User } from '@/server/models/User';
import { deliverMails } from '../support/mail';
import { buildSite, buildUser, PASSWORD, signIn } from '../support/server';

const app = buildApp();
const NEW_PASSWORD = 'seven quiet heron ladders';

afterEach(() => clock.set(null));

describe('sign-in', () => {
  it('opens a session that shows the person to themselves', async () => {
    const site = await buildSite();
    const person = await buildUser({ sites: [site] });
    const agent = await signIn(app, person);
    const { body } = await agent.get('/api/session').expect(200);
    expect(body.user).toEqual({
      id: person.id,
      name: person.name,
      email: person.email,
      role: 'lead',
      qualifiedThrough: '2030-12-31',
      siteIds: [site.id],
      locale: 'en-US',
      units: 'feet',
      theme: 'system',
      hasPin: true,
    });
  });

  it('takes the e-mail in any case', async () => {
    const person = await buildUser();
    await signIn(app, person.email.toUpperCase());
  });

  it.each([
    ['a wrong password', { password: 'not this one, no' }],
    ['an unknown account', { email: 'nobody@company.example' }],
    ['an e-mail that no database can hold', { email: 'a\u0000b@company.example' }],
  ])('refuses %s', async (_what, fields) => {
    const person = await buildUser();
    const answer = await supertest(app)
      .post('/api/session')
      .send({ email: person.email, password: PASSWORD, ...fields });
    expect(answer.status).toBe('email' in fields && fields.email.includes('\0') ? 422 : 401);
    expect(answer.headers['set-cookie']).toBeUndefined();
  });

  it('refuses somebody who is retired', async () => {
    const person = await buildUser({ retiredAt: new Date() });
    const { status, body } = await supertest(app)
      .post('/api/session')
      .send({ email: person.email, password: PASSWORD });
    expect([status, body.type]).toEqual([401, '/problems/wrong-credentials']);
  });

  it('names every missing field', async () => {
    const { body } = await supertest(app).post('/api/session').send({ user: 'x' }).expect(422);
    expect(body.errors.map(({ pointer }: { pointer: string }) => pointer).sort()).toEqual([
      '#/email',
      '#/password',
      '#/user',
    ]);
  });

  it('sets a cookie that scripts and other sites do not get', async () => {
    const person = await buildUser();
    const answer = await supertest(app)
      .post('/api/session')
      .send({ email: person.email, password: PASSWORD });
    const [cookie] = answer.headers['set-cookie'] as unknown as string[];
    expect(cookie).toMatch(/HttpOnly/);
    expect(cookie).toMatch(/SameSite=Lax/);
    expect(cookie).toMatch(/Path=\//);
    expect(cookie).not.toMatch(/Secure/);
  });

  it('gives a new session id, whatever the browser brought', async () => {
    const person = await buildUser();
    const agent = await signIn(app, person);
    const before = await agent.get('/api/session');
    const again = await agent
      .post('/api/session')
      .send({ email: person.email, password: PASSWORD });
    const id = (header: unknown) => String(header).split(';')[0];
    expect(id(again.headers['set-cookie'])).not.toBe(id(before.headers['set-cookie']));
  });
});

describe('a session', () => {
  it('is asked for', async () => {
    const { status, body } = await supertest(app).get('/api/session');
    expect([status, body.type]).toEqual([401, '/problems/not-signed-in']);
  });

  it('ends at sign-out', async () => {
    const agent = await signIn(app, await buildUser());
    await agent.delete('/api/session').expect(204);
    await agent.get('/api/session').expect(401);
  });

  it('ends seven days after sign-in, however busy it was', async () => {
    const agent = await signIn(app, await buildUser());
    clock.advance(7 * 24 * 3_600_000 - 60_000);
    await agent.get('/api/session').expect(200);
    clock.advance(120_000);
    await agent.get('/api/session').expect(401);
  });

  it('keeps language, units and theme', async () => {
    const agent = await signIn(app, await buildUser());
    const changes = { locale: 'es-MX', units: 'metric', theme: 'sunlight' };
    const { body } = await agent.patch('/api/session').send(changes).expect(200);
    expect(body.user).toMatchObject(changes);
    await agent.patch('/api/session').send({ theme: 'neon' }).expect(422);
    await agent.patch('/api/session').send({ role: 'safety' }).expect(422);
  });

  it('is listed and ended by its owner only', async () => {
    const person = await buildUser();
    const [phone, desk, stranger] = await Promise.all([
      signIn(app, person),
      signIn(app, person),
      signIn(app, await buildUser()),
    ]);
    const { body } = await phone.get('/api/sessions').expect(200);
    expect(body.items).toHaveLength(2);
    const other = body.items.find(({ current }: { current: boolean }) => !current);
    await stranger.delete(`/api/sessions/${other.id}`).expect(404);
    await phone.delete('/api/sessions/not-an-id').expect(404);
    await phone.delete(`/api/sessions/${other.id}`).expect(204);
    await desk.get('/api/session').expect(401);
    await phone.get('/api/session').expect(200);
  });

  it('outlives the end of all others', async () => {
    const person = await buildUser();
    const [phone, desk] = await Promise.all([signIn(app, person), signIn(app, person)]);
    await phone.delete('/api/sessions').expect(204);
    await desk.get('/api/session').expect(401);
    await phone.get('/api/session').expect(200);
  });
});

describe('a change of the password', () => {
  it('ends the other sessions, keeps this one and tells the person', async () => {
    const person = await buildUser();
    const [phone, desk] = await Promise.all([signIn(app, person), signIn(app, person)]);
    await phone
      .post('/api/session/password')
      .send({ current: PASSWORD, password: NEW_PASSWORD })
      .expect(200);
    await phone.get('/api/session').expect(200);
    await desk.get('/api/session').expect(401);
    await signIn(app, person, NEW_PASSWORD);
    const mails = await deliverMails();
    expect(mails.find(({ to }) => to.includes(person.email))?.subject).toMatch(/changed/);
  });

  it('wants the current one', async () => {
    const agent = await signIn(app, await buildUser());
    const { status, body } = await agent
      .post('/api/session/password')
      .send({ current: 'not this one, no', password: NEW_PASSWORD });
    expect([status, body.type]).toEqual([403, '/problems/wrong-password']);
    expect(body.errors[0].pointer).toBe('#/current');
  });

  it.each(['short', 'password1234', 'Passw0rd!Passw0rd', '123456789012', 'aaaaaaaaaaaaa'])(
    'refuses %s',
    async (password) => {
      const agent = await signIn(app, await buildUser());
      const { status, body } = await agent
        .post('/api/session/password')
        .send({ current: PASSWORD, password });
      expect([status, body.errors?.[0]?.pointer]).toEqual([422, '#/password']);
    },
  );
});

describe('a change of the PIN', () => {
  it('wants the password and a PIN that is no sequence', async () => {
    const agent = await signIn(app, await buildUser({ pin: null }));
    const change = (password: string, pin: string) =>
      agent.post('/api/session/pin').send({ password, pin });
    expect((await change('not this one, no', '246813')).body.type).toBe('/problems/wrong-password');
    for (const pin of ['123456', '987654', '111111', '12345', 'abcdef']) {
      expect((await change(PASSWORD, pin)).status).toBe(422);
    }
    const { body } = await change(PASSWORD, '246813').expect(200);
    expect(body.user.hasPin).toBe(true);
  });

  it('ends the other sessions', async () => {
    const person = await buildUser();
    const [phone, desk] = await Promise.all([signIn(app, person), signIn(app, person)]);
    await phone.post('/api/session/pin').send({ password: PASSWORD, pin: '246813' }).expect(200);
    await desk.get('/api/session').expect(401);
    await phone.get('/api/session').expect(200);
  });
});

it('keeps passwords and PINs as argon2id only', async () => {
  const person = await buildUser();
  const { passwordHash, pinHash } = await User.findByPk(person.id, { rejectOnEmpty: true });
  expect(passwordHash).toMatch(/^\$argon2id\$/);
  expect(pinHash).toMatch(/^\$argon2id\$/);
});
