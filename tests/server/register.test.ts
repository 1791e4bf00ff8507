import { afterEach, beforeAll, describe, expect, it } from 'vitest';
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
});
