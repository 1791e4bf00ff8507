import supertest from 'supertest';
import { beforeAll, describe, expect, it } from 'vitest';
import { v4 } from 'uuid';
import { buildApp } from '@/server/app';
import { Event } from '@/server/models/Event';
import type { Site } from '@/server/models/Site';
import type { User } from '@/server/models/User';
import { personSchema } from '@/shared/user';
import { deliverMails, linkMailedTo } from '../support/mail';
import { buildSite, buildUser, receivedMails, signIn } from '../support/server';

const app = buildApp();
let site: Site;
let elsewhere: Site;
let lead: User;
let stranger: User;
let safetyUser: User;
let safety: Awaited<ReturnType<typeof signIn>>;
let count = 0;

const newUser = (fields: object = {}) => ({
  name: 'Somebody New',
  email: `new${(count += 1)}@company.example`,
  role: 'lead',
  siteIds: [site.id],
  ...fields,
});

beforeAll(async () => {
  site = await buildSite();
  elsewhere = await buildSite();
  lead = await buildUser({ sites: [site] });
  stranger = await buildUser({ sites: [elsewhere] });
  safetyUser = await buildUser({ role: 'safety' });
  safety = await signIn(app, safetyUser);
});

describe('reading people', () => {
  it('shows others only active people of their own sites, without e-mail', async () => {
    const gone = await buildUser({ sites: [site], retiredAt: new Date() });
    const agent = await signIn(app, lead);
    const { body } = await agent.get('/api/users').expect(200);
    const ids = body.items.map(({ id }: { id: string }) => id);
    expect(ids).toContain(lead.id);
    expect(ids).not.toContain(stranger.id);
    expect(ids).not.toContain(gone.id);
    for (const item of body.items) {
      expect(Object.keys(item).sort()).toEqual([
        'id',
        'name',
        'qualified',
        'qualifiedThrough',
        'role',
      ]);
    }
    await agent.get(`/api/users/${stranger.id}`).expect(404);
    await agent.get(`/api/users/${lead.id}`).expect(200);
  });

  it('shows safety everybody, page by page, newest first', async () => {
    const seen: string[] = [];
    let cursor = '';
    do {
      const { body } = await safety.get(`/api/users?limit=2${cursor}`).expect(200);
      body.items.forEach((item: unknown) => seen.push(personSchema.parse(item).id));
      cursor = body.nextCursor === null ? '' : `&cursor=${body.nextCursor}`;
    } while (cursor !== '');
    expect(new Set(seen).size).toBe(seen.length);
    expect(seen).toEqual(expect.arrayContaining([lead.id, stranger.id]));
    expect(seen.indexOf(safetyUser.id)).toBeLessThan(seen.indexOf(lead.id));
  });

  it.each(['limit=0', 'limit=201', 'cursor=nonsense', 'order=up'])('refuses ?%s', async (query) => {
    await safety.get(`/api/users?${query}`).expect(422);
  });

  it('does not call a lapsed qualification qualified', async () => {
    const lapsed = await buildUser({ sites: [site], qualifiedThrough: '2020-01-31' });
    const { body } = await safety.get(`/api/users/${lapsed.id}`).expect(200);
    expect(body).toMatchObject({ qualified: false, qualifiedThrough: '2020-01-31' });
  });
});

describe('writing people', () => {
  it('is for safety', async () => {
    const agent = await signIn(app, lead);
    await agent.post('/api/users').send(newUser()).expect(403);
    await agent.patch(`/api/users/${lead.id}`).send({ name: 'Me' }).expect(403);
    await agent.patch(`/api/users/${stranger.id}`).send({ name: 'Them' }).expect(404);
    await agent.patch(`/api/users/${v4()}`).send({ name: 'Nobody' }).expect(404);
  });

  it('takes the same creation twice as one', async () => {
    const id = v4();
    const person = newUser({ id });
    const first = await safety.post('/api/users').send(person).expect(201);
    const again = await safety.post('/api/users').send(person).expect(200);
    expect(again.body).toEqual(first.body);
    const other = await signIn(app, await buildUser({ role: 'safety' }));
    const { status, body } = await other.post('/api/users').send(newUser({ id }));
    expect([status, body.type]).toEqual([409, '/problems/id-taken']);
  });

  it('takes two creations at once as one', async () => {
    const person = newUser({ id: v4() });
    const answers = await Promise.all([1, 2, 3].map(() => safety.post('/api/users').send(person)));
    expect(answers.map(({ status }) => status).sort()).toEqual([200, 200, 201]);
  });

  it('takes an e-mail once, whatever its case', async () => {
    const person = newUser();
    await safety.post('/api/users').send(person).expect(201);
    const { status, body } = await safety
      .post('/api/users')
      .send(newUser({ email: person.email.toUpperCase() }));
    expect([status, body.errors?.[0]?.pointer]).toEqual([409, '#/email']);
  });

  it('names every bad field', async () => {
    const { body } = await safety
      .post('/api/users')
      .send({
        name: ' ',
        email: 'no',
        role: 'boss',
        siteIds: ['x'],
        qualifiedThrough: '2026-02-30',
      })
      .expect(422);
    expect(body.errors.map(({ pointer }: { pointer: string }) => pointer).sort()).toEqual([
      '#/email',
      '#/name',
      '#/qualifiedThrough',
      '#/role',
      '#/siteIds/0',
    ]);
    const unknown = await safety.post('/api/users').send(newUser({ siteIds: [site.id, v4()] }));
    expect(unknown.body.errors[0].pointer).toBe('#/siteIds/1');
  });

  it('ends the sessions of a new role and of retirement', async () => {
    const person = await buildUser({ sites: [site] });
    const agent = await signIn(app, person);
    await safety.patch(`/api/users/${person.id}`).send({ name: 'New Name' }).expect(200);
    await agent.get('/api/session').expect(200);
    await safety.patch(`/api/users/${person.id}`).send({ role: 'supervisor' }).expect(200);
    await agent.get('/api/session').expect(401);
    const again = await signIn(app, person);
    const { body } = await safety
      .patch(`/api/users/${person.id}`)
      .send({ retired: true })
      .expect(200);
    expect(body.retired).toBe(true);
    await again.get('/api/session').expect(401);
  });

  it('lets nobody change their own role, and keeps one safety account', async () => {
    await safety.patch(`/api/users/${safetyUser.id}`).send({ role: 'lead' }).expect(403);
    await safety.patch(`/api/users/${safetyUser.id}`).send({ retired: true }).expect(403);
    await safety.patch(`/api/users/${safetyUser.id}`).send({ name: 'Still Here' }).expect(200);
  });

  it('keeps one safety account when two retire each other at once', async () => {
    const { body } = await safety.get('/api/users?limit=200');
    const others = body.items.filter(
      ({ id, role, retired }: { id: string; role: string; retired: boolean }) =>
        role === 'safety' && !retired && id !== safetyUser.id,
    );
    for (const { id } of others) {
      await safety.patch(`/api/users/${id}`).send({ retired: true }).expect(200);
    }
    const rival = await buildUser({ role: 'safety' });
    const rivalAgent = await signIn(app, rival);
    const answers = await Promise.all([
      safety.patch(`/api/users/${rival.id}`).send({ retired: true }),
      rivalAgent.patch(`/api/users/${safetyUser.id}`).send({ retired: true }),
    ]);
    const statuses = answers.map(({ status }) => status);
    expect(statuses).toContain(200);
    expect(statuses.filter((status) => status === 200)).toHaveLength(1);
    if (statuses[0] !== 200) safety = rivalAgent;
  });

  it('records who changed what', async () => {
    const person = await buildUser({ sites: [site] });
    await safety
      .patch(`/api/users/${person.id}`)
      .send({ siteIds: [elsewhere.id] })
      .expect(200);
    const [event] = await Event.findAll({ where: { subjectId: person.id } });
    expect(event).toMatchObject({ subjectType: 'user', type: 'changed' });
    expect(event?.payload).toEqual({ siteIds: [elsewhere.id] });
  });
});

describe('an invitation', () => {
  const invite = (agent: typeof safety, id: string) => agent.post(`/api/users/${id}/invitation`);
  const choice = { password: 'a password of my own', pin: '583920' };

  it('is mailed again until a password is chosen; only the latest link works', async () => {
    const { body } = await safety.post('/api/users').send(newUser()).expect(201);
    const first = await linkMailedTo(body.email);
    const again = await invite(safety, body.id).expect(200);
    expect(personSchema.parse(again.body)).toMatchObject({ id: body.id, hasPin: false });
    expect(again.body.invitedAt >= body.invitedAt).toBe(true);
    await supertest(app).post(`/api/password-resets/${first.token}`).send(choice).expect(404);
    const second = await linkMailedTo(body.email);
    expect(second.kind).toBe('invitation');
    expect(second.token).not.toBe(first.token);
    await supertest(app).post(`/api/password-resets/${second.token}`).send(choice).expect(204);
    await signIn(app, body.email, choice.password);
    const late = await invite(safety, body.id).expect(409);
    expect(late.body.type).toBe('/problems/conflict');
    const events = await Event.findAll({ where: { subjectId: body.id }, order: ['seq'] });
    expect(events.map(({ type }) => type)).toContain('invited-again');
  });

  it('that was still on its way when the next one was sent works no longer', async () => {
    const { body } = await safety.post('/api/users').send(newUser()).expect(201);
    await invite(safety, body.id).expect(200);
    await deliverMails();
    const mails = receivedMails().filter(({ to }) => to.includes(body.email));
    const tokens = mails.map(({ text }) => /\/invitation\/([\w-]+)/.exec(text)?.[1] ?? '');
    expect(tokens).toHaveLength(2);
    const use = (token: string) =>
      supertest(app).post(`/api/password-resets/${token}`).send(choice);
    expect((await use(tokens[0] ?? '')).status).toBe(404);
    expect((await use(tokens[1] ?? '')).status).toBe(204);
  });

  it('is for safety to send, to somebody who may still join', async () => {
    const waiting = await buildUser({ sites: [site], password: null, pin: null });
    const far = await buildUser({ sites: [elsewhere], password: null, pin: null });
    const gone = await buildUser({ password: null, pin: null, retiredAt: new Date() });
    const agent = await signIn(app, lead);
    expect((await supertest(app).post(`/api/users/${waiting.id}/invitation`)).status).toBe(401);
    expect((await invite(agent, waiting.id)).status).toBe(403);
    expect((await invite(agent, far.id)).status).toBe(404);
    expect((await invite(safety, v4())).status).toBe(404);
    expect((await invite(safety, gone.id)).status).toBe(409);
    expect((await invite(safety, lead.id)).status).toBe(409);
    expect((await invite(safety, waiting.id).send({ email: 'x@y.example' })).status).toBe(422);
    const before = receivedMails().length;
    expect((await deliverMails()).length).toBe(before);
  });
});
