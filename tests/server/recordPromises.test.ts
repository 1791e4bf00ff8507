import { generateKeyPairSync, sign as signBytes } from 'node:crypto';
import type { KeyObject } from 'node:crypto';
import { QueryTypes } from 'sequelize';
import { v7 } from 'uuid';
import { beforeAll, beforeEach, describe, expect, it } from 'vitest';
import type { WorksheetRecord } from '@/shared/record';
import { clock } from '@/server/clock';
import { sequelize } from '@/server/db';
import { Event } from '@/server/models/Event';
import { RubberGoods } from '@/server/models/RubberGoods';
import { RubberGoodsTest } from '@/server/models/RubberGoodsTest';
import { canonicalJson, hashOf } from '@/server/services/contentHash';
import { sealEvents } from '@/server/services/sealEvents';
import { verifyRecord } from '@/server/services/verifyRecord';
import { withClient } from '../support/database';
import { deliverMails } from '../support/mail';
import {
  NOW,
  STROKES,
  act,
  buildCompany,
  contentFor,
  read,
  sign,
  signatureBody,
  toBriefing,
  toCountersign,
  toInForce,
} from '../support/record';
import type { Company, Person } from '../support/record';
import { buildUser, PASSWORD, PIN, signIn } from '../support/server';

let company: Company;
beforeAll(async () => {
  company = await buildCompany();
});
beforeEach(() => clock.set(NOW));

/** A helper of the site who is on nobody's crew yet, with a session. */
async function newHelper(): Promise<Person> {
  const user = await buildUser({ role: 'helper', sites: [company.site] });
  return { user, agent: await signIn(company.app, user) };
}

async function briefingWith(helper: Person): Promise<WorksheetRecord> {
  const content = contentFor(company);
  const [lead, other] = content.crew ?? [];
  return toBriefing(company, {
    ...content,
    crew: [lead ?? {}, { ...other, userId: helper.user.id }],
  });
}

interface Phone {
  id: string;
  key: KeyObject;
}

async function addPhone({ agent }: Person, pin = PIN): Promise<Phone> {
  const { publicKey, privateKey } = generateKeyPairSync('ec', { namedCurve: 'P-256' });
  const id = v7();
  const device = { id, publicKey: publicKey.export({ format: 'jwk' }), label: 'Phone', pin };
  await agent.post('/api/devices').send(device).expect(201);
  return { id, key: privateKey };
}

/** The acknowledgement that this phone signs without signal, at that instant. */
function offline(record: WorksheetRecord, signer: Person, { id, key }: Phone, signedAt: string) {
  const meaning = 'acknowledged' as const;
  const { id: worksheetId, revision, contentHash } = record;
  const signerId = signer.user.id;
  const strokesHash = hashOf(STROKES);
  const signed = { worksheetId, revision, contentHash, meaning, signerId, signedAt, strokesHash };
  const signature = signBytes('sha256', Buffer.from(canonicalJson(signed)), {
    key,
    dsaEncoding: 'ieee-p1363',
  }).toString('base64url');
  const common = { meaning, signerId, strokes: STROKES, contentHash };
  return { id: v7(), ...common, deviceId: id, signedAt, signature };
}

describe('a device that signs without signal', () => {
  it('may run five minutes ahead, and not a second more', async () => {
    const helper = await newHelper();
    const phone = await addPhone(helper);
    for (const [signedAt, status] of [
      ['2026-12-01T15:05:01.000Z', 409],
      ['2026-12-01T15:05:00.000Z', 201],
    ] as const) {
      const record = await briefingWith(helper);
      const answer = await act(
        helper,
        record,
        'signatures',
        offline(record, helper, phone, signedAt),
      );
      expect(answer.status).toBe(status);
    }
  });

  it('signs no more once the person changed their PIN, and is listed no more', async () => {
    const helper = await newHelper();
    const phone = await addPhone(helper);
    const record = await briefingWith(helper);
    const body = offline(record, helper, phone, '2026-12-01T15:00:00.000Z');
    await helper.agent
      .post('/api/session/pin')
      .send({ password: PASSWORD, pin: '970318' })
      .expect(200);
    expect((await helper.agent.get('/api/devices')).body.items).toEqual([]);
    const refused = await act(helper, record, 'signatures', body);
    expect([refused.status, refused.body.type]).toEqual([403, '/problems/not-allowed']);
    const last = await Event.findOne({ where: { subjectId: record.id }, order: [['seq', 'DESC']] });
    expect(last).toMatchObject({ type: 'signature-refused', actorId: helper.user.id });
    expect(last?.payload).toMatchObject({ deviceId: phone.id, problem: 'not-allowed' });
    const other = await addPhone(helper, '970318');
    const again = offline(record, helper, other, '2026-12-01T15:00:00.000Z');
    expect((await act(helper, record, 'signatures', again)).status).toBe(201);
  });

  it('signs for its owner only, whoever sends it', async () => {
    const [helper, other] = [await newHelper(), await newHelper()];
    const phone = await addPhone(other);
    const record = await briefingWith(helper);
    const body = offline(record, helper, phone, '2026-12-01T15:00:00.000Z');
    expect((await act(helper, record, 'signatures', body)).status).toBe(403);
  });
});

describe('who is told', () => {
  it('the signer, by mail, when their PIN was entered on another’s device', async () => {
    const helper = await newHelper();
    const record = await briefingWith(helper);
    await sign(record, 'acknowledged', helper, company.lead);
    const mails = (await deliverMails()).filter(({ to }) => to.includes(helper.user.email));
    expect(mails.map(({ subject }) => subject)).toContain(
      `${record.number} was acknowledged in your name`,
    );
  });

  it('safety, of the hash of the night’s seal', async () => {
    clock.set('2026-12-01T15:10:01.000Z');
    const seal = await sealEvents();
    expect(seal?.hash).toMatch(/^[0-9a-f]{64}$/);
    const mail = (await deliverMails()).findLast(({ to }) =>
      to.includes(company.safety.user.email),
    );
    expect(mail?.text.replaceAll(/\s/g, '')).toContain(seal?.hash);
    expect((await verifyRecord(seal?.hash)).faults).toEqual([]);
  });
});

describe('every signature is judged by that moment', () => {
  it('the countersignature too: gloves that fell due in between stop it', async () => {
    const goods = await RubberGoods.create({
      id: v7(),
      siteId: company.site.id,
      kind: 'gloves',
      gloveClass: '00',
      serial: `C-${v7()}`,
      createdAt: clock.now(),
      updatedAt: clock.now(),
    });
    const testedOn = '2026-09-01';
    const test = await RubberGoodsTest.create({
      ...{ rubberGoodsId: goods.id, position: 0, testedOn, passed: true },
    });
    const content = contentFor(company);
    const record = await toCountersign(company, {
      ...content,
      protectiveEquipment: { ...content.protectiveEquipment, rubberGoodsId: goods.id },
    });
    const body = signatureBody(record, 'countersigned', company.supervisor);
    await test.update({ passed: false });
    const failed = await act(company.supervisor, record, 'signatures', body);
    expect([failed.status, failed.body.errors?.[0]?.pointer]).toEqual([
      409,
      '#/content/protectiveEquipment/rubberGoodsId',
    ]);
    await test.update({ passed: true });
    expect((await act(company.supervisor, record, 'signatures', body)).status).toBe(201);
  });

  it('the planned end may pass between two of them', async () => {
    const record = await toCountersign(company);
    clock.set('2026-12-01T18:00:01.000Z');
    const body = signatureBody(record, 'countersigned', company.supervisor);
    const answer = await act(company.supervisor, record, 'signatures', body);
    expect([answer.status, answer.body.type]).toEqual([409, '/problems/wrong-state']);
    expect((await read(company.lead, record.id)).state).toBe('expired');
  });
});

describe('a change, its event and its mail', () => {
  const owner = (sql: string) =>
    withClient(process.env['DATABASE_OWNER_URL'] ?? '', (client) => client.query(sql));
  const role = async () => {
    const [row] = await sequelize.query<{ name: string }>('SELECT current_user AS name', {
      type: QueryTypes.SELECT,
    });
    return row?.name ?? '';
  };

  it('are one transaction: where the mail cannot be queued, nothing has changed', async () => {
    const record = await toInForce(company);
    const before = await Event.count({ where: { subjectId: record.id } });
    const id = v7();
    const stop = () => act(company.helper, record, 'stop', { id, reason: 'still live' });
    const runtime = await role();
    await owner(`REVOKE INSERT ON pgboss.job FROM "${runtime}"`);
    try {
      expect((await stop()).status).toBe(500);
      expect((await read(company.lead, record.id)).state).toBe('in-force');
      expect(await Event.count({ where: { subjectId: record.id } })).toBe(before);
    } finally {
      await owner(`GRANT INSERT ON pgboss.job TO "${runtime}"`);
    }
    const stopped = await stop();
    expect([stopped.status, stopped.body.state]).toEqual([200, 'stopped']);
  });
});

describe('the register', () => {
  it('keeps who changed a site or rubber goods as events, in chains that verify walks', async () => {
    const { agent, user } = company.safety;
    const site = await agent
      .post('/api/sites')
      .send({ name: 'Tern Works', timeZone: 'America/Chicago' })
      .expect(201);
    await agent.patch(`/api/sites/${site.body.id}`).send({ name: 'Tern Mill' }).expect(200);
    await agent.patch(`/api/sites/${site.body.id}`).send({ retired: true }).expect(200);
    const goods = await agent
      .post('/api/rubber-goods')
      .send({
        siteId: company.site.id,
        kind: 'gloves',
        gloveClass: '0',
        serial: `R-${v7()}`,
        tests: [{ testedOn: '2026-09-01', passed: true }],
      })
      .expect(201);
    await agent
      .patch(`/api/rubber-goods/${goods.body.id}`)
      .send({ retired: true, retiredBecause: 'damaged' })
      .expect(200);
    for (const [subjectId, types] of [
      [site.body.id, ['created', 'changed', 'retired']],
      [goods.body.id, ['created', 'retired']],
    ] as const) {
      const events = await Event.findAll({ where: { subjectId }, order: [['seq', 'ASC']] });
      expect(events.map(({ type }) => type)).toEqual(types);
      expect(events.every(({ actorId }) => actorId === user.id)).toBe(true);
    }
    expect((await verifyRecord()).faults).toEqual([]);
  });
});
