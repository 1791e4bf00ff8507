import supertest from 'supertest';
import { afterEach, beforeAll, beforeEach, describe, expect, it } from 'vitest';
import { v4 } from 'uuid';
import { buildApp } from '@/server/app';
import { clock } from '@/server/clock';
import { Event } from '@/server/models/Event';
import type { Site } from '@/server/models/Site';
import { rubberGoodsSchema, siteSchema } from '@/shared/register';
import { buildSite, buildUser, signIn } from '../support/server';

const app = buildApp();
let site: Site;
let elsewhere: Site;
let lead: Awaited<ReturnType<typeof signIn>>;
let safety: Awaited<ReturnType<typeof signIn>>;

beforeAll(async () => {
  site = await buildSite();
  elsewhere = await buildSite();
  lead = await signIn(app, await buildUser({ sites: [site] }));
  safety = await signIn(app, await buildUser({ role: 'safety' }));
});
afterEach(() => clock.set(null));

describe('sites', () => {
  it('shows people their own, safety all with members', async () => {
    const own = await lead.get('/api/sites').expect(200);
    expect(own.body.items.map((item: unknown) => siteSchema.parse(item).id)).toEqual([site.id]);
    expect(own.body.items[0].memberIds).toBeUndefined();
    const all = await safety.get('/api/sites').expect(200);
    expect(all.body.items).toHaveLength(2);
    expect(all.body.items.find(({ id }: { id: string }) => id === site.id).memberIds).toHaveLength(
      1,
    );
    await lead.get(`/api/sites/${elsewhere.id}`).expect(404);
  });

  it('are written by safety only', async () => {
    const body = { name: 'Old Mill', timeZone: 'America/Denver' };
    await lead.post('/api/sites').send(body).expect(403);
    await lead.patch(`/api/sites/${site.id}`).send({ name: 'Mine' }).expect(403);
    await lead.patch(`/api/sites/${elsewhere.id}`).send({ name: 'Mine' }).expect(404);
    const { body: made } = await safety.post('/api/sites').send(body).expect(201);
    expect(siteSchema.parse(made)).toMatchObject({ ...body, panels: [], retired: false });
    await safety.patch(`/api/sites/${made.id}`).send({ retired: true }).expect(200);
    const events = await Event.findAll({ where: { subjectId: made.id }, order: ['seq'] });
    expect(events.map(({ type }) => type)).toEqual(['created', 'retired']);
  });

  it('name every bad field', async () => {
    const { body } = await safety
      .post('/api/sites')
      .send({ name: 'x\u0000', timeZone: 'Mars/Olympus', panels: [{ name: '' }], colour: 'red' })
      .expect(422);
    expect(body.errors.map(({ pointer }: { pointer: string }) => pointer).sort()).toEqual([
      '#/colour',
      '#/name',
      '#/panels/0/name',
      '#/timeZone',
    ]);
  });
});

describe('rubber goods', () => {
  const gloves = (fields: object = {}) => ({
    siteId: site.id,
    kind: 'gloves',
    gloveClass: '0',
    serial: `G-${v4().slice(0, 8)}`,
    tests: [{ testedOn: '2026-03-31', passed: true }],
    ...fields,
  });

  it('follow the rule of six months', async () => {
    clock.set('2026-09-30T12:00:00-05:00');
    const { body } = await safety.post('/api/rubber-goods').send(gloves()).expect(201);
    expect(rubberGoodsSchema.parse(body)).toMatchObject({
      lastTestedOn: '2026-03-31',
      dueOn: '2026-09-30',
      inTest: true,
      retired: false,
    });
    clock.set('2026-10-01T00:30:00-05:00');
    const late = await safety.get(`/api/rubber-goods/${body.id}`).expect(200);
    expect(late.body.inTest).toBe(false);
  });

  it('are not in test after a failed one, whatever came before', async () => {
    clock.set('2026-06-01T12:00:00Z');
    const tests = [
      { testedOn: '2026-05-01', passed: false },
      { testedOn: '2026-03-31', passed: true },
    ];
    const { body } = await safety.post('/api/rubber-goods').send(gloves({ tests })).expect(201);
    expect(body).toMatchObject({ lastTestedOn: '2026-03-31', inTest: false });
  });

  it('are seen at their site, and retired with a reason', async () => {
    const here = await safety.post('/api/rubber-goods').send(gloves()).expect(201);
    const there = await safety
      .post('/api/rubber-goods')
      .send(gloves({ siteId: elsewhere.id }))
      .expect(201);
    const { body } = await lead.get('/api/rubber-goods').expect(200);
    const ids = body.items.map(({ id }: { id: string }) => id);
    expect(ids).toContain(here.body.id);
    expect(ids).not.toContain(there.body.id);
    const retired = await safety
      .patch(`/api/rubber-goods/${here.body.id}`)
      .send({ retired: true, retiredBecause: 'damaged' })
      .expect(200);
    expect(retired.body).toMatchObject({ retired: true, retiredBecause: 'damaged', inTest: false });
    await lead.get(`/api/rubber-goods/${here.body.id}`).expect(404);
    await lead.post('/api/rubber-goods').send(gloves()).expect(403);
  });

  it('belong to a site of the register', async () => {
    const { body } = await safety
      .post('/api/rubber-goods')
      .send(gloves({ siteId: v4() }))
      .expect(422);
    expect(body.errors[0].pointer).toBe('#/siteId');
  });

  it('have a serial that no other item of the site has, whatever its case', async () => {
    const first = gloves();
    const { body: kept } = await safety.post('/api/rubber-goods').send(first).expect(201);
    for (const serial of [first.serial, first.serial.toLowerCase(), ` ${first.serial} `]) {
      const { body } = await safety.post('/api/rubber-goods').send(gloves({ serial })).expect(409);
      expect(body).toMatchObject({
        type: '/problems/conflict',
        errors: [{ pointer: '#/serial', code: 'taken' }],
      });
    }
    await safety
      .post('/api/rubber-goods')
      .send(gloves({ serial: first.serial, siteId: elsewhere.id }))
      .expect(201);
    const { body: other } = await safety.post('/api/rubber-goods').send(gloves()).expect(201);
    const path = `/api/rubber-goods/${other.id}`;
    const taken = await safety.patch(path).send({ serial: first.serial }).expect(409);
    expect(taken.body.errors[0].pointer).toBe('#/serial');
    const moved = await safety
      .patch(`/api/rubber-goods/${kept.id}`)
      .send({ siteId: elsewhere.id })
      .expect(409);
    expect(moved.body.errors[0].pointer).toBe('#/serial');
    await safety.patch(path).send({ size: '11' }).expect(200);
  });

  it('take one of two that are added at once with the same serial', async () => {
    const item = gloves();
    const answers = await Promise.all(
      [1, 2].map(() => safety.post('/api/rubber-goods').send(item)),
    );
    expect(answers.map(({ status }) => status).sort()).toEqual([201, 409]);
  });
});

describe('a test of rubber goods', () => {
  const add = async (fields: object = {}) => {
    const { body } = await safety
      .post('/api/rubber-goods')
      .send({
        siteId: site.id,
        kind: 'gloves',
        gloveClass: '0',
        serial: `T-${v4().slice(0, 8)}`,
        tests: [{ testedOn: '2026-03-31', passed: true }],
        ...fields,
      })
      .expect(201);
    return rubberGoodsSchema.parse(body);
  };
  const test = (fields: object = {}) => ({
    id: v4(),
    testedOn: '2026-09-20',
    passed: true,
    laboratory: 'Dry Creek Laboratory',
    ...fields,
  });
  const eventsOf = (subjectId: string) =>
    Event.findAll({ where: { subjectId, type: 'tested' }, order: ['seq'] });

  beforeEach(() => clock.set('2026-09-30T12:00:00-05:00'));

  it('is added to those before, with an event', async () => {
    const { id } = await add();
    const sent = test();
    const { body } = await safety.post(`/api/rubber-goods/${id}/tests`).send(sent).expect(201);
    const { id: testId, ...fields } = sent;
    expect(rubberGoodsSchema.parse(body)).toMatchObject({
      tests: [{ testedOn: '2026-03-31', passed: true }, fields],
      lastTestedOn: '2026-09-20',
      inTest: true,
      retired: false,
    });
    const [event] = await eventsOf(id);
    expect(event?.payload).toEqual({ testId, ...fields });
  });

  it('is one test however often it is sent', async () => {
    const { id } = await add();
    const path = `/api/rubber-goods/${id}/tests`;
    const sent = test();
    const answers = await Promise.all([1, 2, 3].map(() => safety.post(path).send(sent)));
    expect(answers.map(({ status }) => status).sort()).toEqual([200, 200, 201]);
    expect(answers[2]?.body.tests).toHaveLength(2);
    expect(await eventsOf(id)).toHaveLength(1);
    // A later change of the whole list does not forget which test it was.
    const { body } = await safety.get(`/api/rubber-goods/${id}`).expect(200);
    await safety
      .patch(`/api/rubber-goods/${id}`)
      .send({ tests: [...body.tests, { testedOn: '2026-09-25', passed: true }] })
      .expect(200);
    const again = await safety.post(path).send(sent).expect(200);
    expect(again.body.tests).toHaveLength(3);

    const other = await add();
    for (const [where, body] of [
      [path, { ...sent, passed: false }],
      [`/api/rubber-goods/${other.id}/tests`, sent],
    ] as const) {
      const taken = await safety.post(where).send(body).expect(409);
      expect(taken.body.type).toBe('/problems/id-taken');
    }
  });

  it('is not lost when several people record theirs at once', async () => {
    const { id } = await add();
    const colleague = await signIn(app, await buildUser({ role: 'safety' }));
    const days = [
      '2026-09-01',
      '2026-09-02',
      '2026-09-03',
      '2026-09-04',
      '2026-09-05',
      '2026-09-06',
    ];
    const answers = await Promise.all(
      days.map((testedOn, index) =>
        (index % 2 === 0 ? safety : colleague)
          .post(`/api/rubber-goods/${id}/tests`)
          .send(test({ testedOn })),
      ),
    );
    expect(answers.map(({ status }) => status)).toEqual(days.map(() => 201));
    const { body } = await safety.get(`/api/rubber-goods/${id}`).expect(200);
    expect(body.tests.map(({ testedOn }: { testedOn: string }) => testedOn).sort()).toEqual([
      '2026-03-31',
      ...days,
    ]);
  });

  it('that failed retires the item, and a later one brings it not back', async () => {
    const { id } = await add();
    const path = `/api/rubber-goods/${id}/tests`;
    const { body } = await safety
      .post(path)
      .send(test({ passed: false }))
      .expect(201);
    expect(body).toMatchObject({ retired: true, retiredBecause: 'failed test', inTest: false });
    await lead.get(`/api/rubber-goods/${id}`).expect(404);
    const later = await safety
      .post(path)
      .send(test({ testedOn: '2026-09-29' }))
      .expect(201);
    expect(later.body).toMatchObject({
      retired: true,
      retiredBecause: 'failed test',
      inTest: false,
    });
    expect(later.body.tests).toHaveLength(3);
  });

  it('names every bad field, and lies not in time to come at the site', async () => {
    const { id } = await add();
    const path = `/api/rubber-goods/${id}/tests`;
    const pointers = (body: { errors: { pointer: string }[] }) =>
      body.errors.map(({ pointer }) => pointer).sort();
    const bad = { testedOn: '2026-02-30', passed: 'yes', laboratory: 'x\u0000', volts: 1 };
    const { body } = await safety.post(path).send(bad).expect(422);
    expect(pointers(body)).toEqual(['#/laboratory', '#/passed', '#/testedOn', '#/volts']);
    expect(pointers((await safety.post(path).send({}).expect(422)).body)).toEqual([
      '#/passed',
      '#/testedOn',
    ]);
    // Half past eleven in Chicago is the next day in UTC already.
    clock.set('2026-09-30T23:30:00-05:00');
    const late = await safety
      .post(path)
      .send(test({ testedOn: '2026-10-01' }))
      .expect(422);
    expect(pointers(late.body)).toEqual(['#/testedOn']);
    await safety
      .post(path)
      .send(test({ testedOn: '2026-09-30' }))
      .expect(201);
  });

  it('is for safety to record', async () => {
    const here = await add();
    const there = await add({ siteId: elsewhere.id });
    const post = (agent: typeof lead, id: string) =>
      agent.post(`/api/rubber-goods/${id}/tests`).send(test());
    expect((await supertest(app).post(`/api/rubber-goods/${here.id}/tests`)).status).toBe(401);
    expect((await post(lead, here.id)).status).toBe(403);
    expect((await post(lead, there.id)).status).toBe(404);
    expect((await post(safety, v4())).status).toBe(404);
    expect(await eventsOf(here.id)).toEqual([]);
  });
});
