import { generateKeyPairSync, sign as signBytes } from 'node:crypto';
import type { KeyObject } from 'node:crypto';
import { v7 } from 'uuid';
import { beforeAll, beforeEach, describe, expect, it } from 'vitest';
import type { Meaning, WorksheetRecord } from '@/shared/record';
import type { WorksheetContent } from '@/shared/worksheet';
import { clock } from '@/server/clock';
import { Device } from '@/server/models/Device';
import { RubberGoods } from '@/server/models/RubberGoods';
import { RubberGoodsTest } from '@/server/models/RubberGoodsTest';
import { SignatureRow } from '@/server/models/SignatureRow';
import { canonicalJson, contentHash, hashOf, sha256 } from '@/server/services/contentHash';
import { verifyRecord } from '@/server/services/verifyRecord';
import { buildUser, PIN } from '../support/server';
import {
  NOW,
  STROKES,
  act,
  buildCompany,
  contentFor,
  create,
  read,
  sign,
  signatureBody,
  toBriefing,
  toCountersign,
  toInForce,
  prove,
} from '../support/record';
import type { Company, Person } from '../support/record';

let company: Company;
beforeAll(async () => {
  company = await buildCompany();
});
beforeEach(() => clock.set(NOW));

function save(person: Person, record: WorksheetRecord, content: object, version = record.version) {
  return person.agent
    .put(`/api/worksheets/${record.id}`)
    .set('If-Match', `"${version}"`)
    .send({ content });
}

describe('saving', () => {
  it('names the version, and the next save needs it', async () => {
    const record = await create(company);
    const saved = await save(company.lead, record, { ...record.content, notes: 'One.' });
    expect(saved.status).toBe(200);
    expect(saved.headers['etag']).toBe('"2"');
    expect(saved.body).toMatchObject({ version: 2, content: { notes: 'One.' } });
    const stale = await save(company.lead, record, { ...record.content, notes: 'Two.' });
    expect(stale.status).toBe(412);
    expect(stale.body.type).toBe('/problems/stale-version');
    expect(stale.body.worksheet).toMatchObject({ version: 2, content: { notes: 'One.' } });
    expect(stale.headers['etag']).toBeUndefined();
  });

  it('takes the same content again whatever the version and the state', async () => {
    const record = await create(company);
    const content = { ...record.content, notes: 'Lost answer.' };
    expect((await save(company.lead, record, content)).status).toBe(200);
    const again = await save(company.lead, record, content);
    expect(again.status).toBe(200);
    expect(again.body.version).toBe(2);
    await sign(await read(company.lead, record.id), 'prepared', company.lead);
    expect((await save(company.lead, record, content, 99)).status).toBe(200);
  });

  it('asks for If-Match before it reads the body, and only its lead saves', async () => {
    const record = await create(company);
    const put = () => company.lead.agent.put(`/api/worksheets/${record.id}`);
    const missing = await put().send({ content: { job: { area: 7 } } });
    expect(missing.status).toBe(428);
    expect(missing.body.type).toBe('/problems/malformed-request');
    expect((await save(company.helper, record, {})).status).toBe(403);
    expect((await save(company.supervisor, record, {})).status).toBe(403);
    expect((await save(company.stranger, record, {})).status).toBe(404);
    const bad = await save(company.lead, record, { job: { area: 7, colour: 1 }, x: 1 });
    expect(bad.status).toBe(422);
    expect(bad.body.errors.map(({ pointer }: { pointer: string }) => pointer).sort()).toEqual([
      '#/content/job/area',
      '#/content/job/colour',
      '#/content/x',
    ]);
  });
});

describe('ids chosen by the client', () => {
  it('make one worksheet however often it is posted', async () => {
    const id = v7();
    const post = (who: Person) =>
      who.agent.post('/api/worksheets').send({ id, content: { notes: 'Same.' } });
    const answers = await Promise.all([1, 2, 3, 4].map(() => post(company.lead)));
    expect(answers.map(({ status }) => status).sort()).toEqual([200, 200, 200, 201]);
    expect(new Set(answers.map(({ body }) => body.number)).size).toBe(1);
    const taken = await post(company.stranger);
    expect(taken.status).toBe(409);
    expect(taken.body.type).toBe('/problems/id-taken');
    expect(JSON.stringify(taken.body)).not.toContain('Same.');
    const upper = await company.lead.agent
      .post('/api/worksheets')
      .send({ id: id.toUpperCase(), content: { notes: 'Same.' } });
    expect(upper.status).toBe(200);
  });

  it('make one signature, proof and question however often they are posted', async () => {
    const draft = await create(company);
    const body = signatureBody(draft, 'prepared', company.lead);
    const signatures = await Promise.all(
      [1, 2, 3].map(() => act(company.lead, draft, 'signatures', body)),
    );
    expect(signatures.map(({ status }) => status).sort()).toEqual([200, 200, 201]);
    const briefing = await read(company.lead, draft.id);
    expect(briefing.signatures).toHaveLength(1);

    const question = { id: v7(), text: 'Which door?' };
    const asked = await Promise.all(
      [1, 2, 3].map(() => act(company.helper, draft, 'questions', question)),
    );
    expect(asked.map(({ status }) => status).sort()).toEqual([200, 200, 201]);
    expect((await act(company.lead, draft, 'questions', question)).status).toBe(409);
    await act(company.lead, draft, `questions/${question.id}/answer`, { text: 'The east one.' });

    const inForce = await sign(
      await sign(briefing, 'acknowledged', company.helper),
      'countersigned',
      company.supervisor,
    );
    const { soundWorksheet } = await import('../support/soundWorksheet');
    const proof = { id: v7(), proof: soundWorksheet().proof, pin: PIN };
    const proofs = await Promise.all(
      [1, 2, 3].map(() => act(company.lead, inForce, 'proofs', proof)),
    );
    expect(proofs.map(({ status }) => status).sort()).toEqual([200, 200, 201]);
    const other = await act(company.lead, inForce, 'proofs', { ...proof, proof: {} });
    expect(other.body.type).toBe('/problems/id-taken');
    expect((await read(company.lead, draft.id)).proofs).toHaveLength(1);
  });
});

describe('the register wins over the client', () => {
  it('puts in name and qualification on every save', async () => {
    const content = contentFor(company);
    const [lead, helper] = content.crew ?? [];
    const tampered = {
      ...content,
      crew: [
        { ...lead, name: 'Nobody', qualifiedThrough: '2099-01-01' },
        { ...helper, qualified: true, qualifiedThrough: '2099-01-01', closest: 'restricted' },
      ],
    } as WorksheetContent;
    const record = await create(company, tampered);
    expect(record.content.crew).toMatchObject([
      { name: 'Ada Lind', qualified: true, qualifiedThrough: '2030-12-31' },
      { name: 'Beto Cruz', qualified: false },
    ]);
    expect(record.content.crew?.[1]).not.toHaveProperty('qualifiedThrough');
    const hash = contentHash({
      worksheetId: record.id,
      revision: 1,
      content: tampered,
      attachments: [],
    });
    const refused = await act(company.lead, record, 'signatures', {
      ...signatureBody(record, 'prepared', company.lead),
      contentHash: hash,
    });
    expect(refused.status).toBe(409);
    expect(refused.body.type).toBe('/problems/hash-mismatch');
    const stopped = await act(
      company.lead,
      record,
      'signatures',
      signatureBody(record, 'prepared', company.lead),
    );
    expect(stopped.status).toBe(409);
    expect(stopped.body.type).toBe('/problems/not-ready');
    expect(stopped.body.findings.map(({ code }: { code: string }) => code)).toContain(
      'shock.unqualified-inside',
    );
  });

  it('takes the class and dates of gloves from the register', async () => {
    const goods = await RubberGoods.create({
      id: v7(),
      siteId: company.site.id,
      kind: 'gloves',
      gloveClass: '0',
      serial: 'MA-1',
      issuedOn: '2026-09-15',
      createdAt: clock.now(),
      updatedAt: clock.now(),
    });
    await RubberGoodsTest.create({
      rubberGoodsId: goods.id,
      position: 0,
      testedOn: '2026-09-01',
      passed: true,
    });
    const content = contentFor(company);
    const record = await create(company, {
      ...content,
      protectiveEquipment: {
        ...content.protectiveEquipment,
        rubberGoodsId: goods.id,
        gloves: { gloveClass: '4', lastTestedOn: '2026-11-30', airTested: true },
      },
    });
    expect(record.content.protectiveEquipment?.gloves).toEqual({
      gloveClass: '0',
      lastTestedOn: '2026-09-01',
      issuedOn: '2026-09-15',
      airTested: true,
    });
    await goods.update({ retiredAt: clock.now() });
    const later = await save(company.lead, record, { ...record.content, notes: 'x' });
    expect(later.status).toBe(422);
    expect(later.body.errors[0].pointer).toBe('#/content/protectiveEquipment/rubberGoodsId');
  });

  it('refuses people, sites and gloves that are not the lead’s', async () => {
    const content = contentFor(company);
    const [lead, helper] = content.crew ?? [];
    const retired = await buildUser({
      role: 'helper',
      sites: [company.site],
      retiredAt: clock.now(),
    });
    const answer = await company.lead.agent.post('/api/worksheets').send({
      content: {
        job: { siteId: company.otherSite.id },
        crew: [
          lead,
          { ...helper, userId: company.stranger.user.id },
          { ...helper, id: 'c3', userId: retired.id },
          { ...helper, id: 'c4', userId: v7() },
        ],
        protectiveEquipment: { rubberGoodsId: v7() },
      },
    });
    expect(answer.status).toBe(422);
    expect(answer.body.errors.map(({ pointer }: { pointer: string }) => pointer)).toEqual([
      '#/content/crew/1/userId',
      '#/content/crew/2/userId',
      '#/content/crew/3/userId',
      '#/content/job/siteId',
      '#/content/protectiveEquipment/rubberGoodsId',
    ]);
  });

  it('does not let a crew sign that has a member without an account, or another lead', async () => {
    const content = contentFor(company);
    const [lead, helper] = content.crew ?? [];
    const { userId: _, ...stranger } = helper ?? {};
    const withStranger = await create(company, {
      ...content,
      crew: [lead ?? {}, { ...stranger, name: 'Day labour', qualified: true }],
    });
    expect(withStranger.content.crew?.[1]).toMatchObject({ qualified: false });
    const refused = await act(
      company.lead,
      withStranger,
      'signatures',
      signatureBody(withStranger, 'prepared', company.lead),
    );
    expect(refused.status).toBe(409);
    expect(refused.body.errors[0].pointer).toBe('#/content/crew/1/userId');
    const notNamed = await create(company, {
      ...content,
      crew: [
        { ...lead, lead: false },
        { ...helper, lead: true },
      ],
    });
    const body = signatureBody(notNamed, 'prepared', company.lead);
    expect((await act(company.lead, notNamed, 'signatures', body)).status).toBe(409);
  });

  it('judges again at every signature, with what the register says then', async () => {
    const helper = await buildUser({
      role: 'helper',
      sites: [company.site],
      qualifiedThrough: '2028-01-01',
    });
    const content = contentFor(company);
    const [lead, other] = content.crew ?? [];
    const crew = [
      lead ?? {},
      { ...other, userId: helper.id, closest: 'limited' as const, arcRated: true },
    ];
    const record = await sign(
      await create(company, { ...content, crew }),
      'prepared',
      company.lead,
    );
    await helper.update({ qualifiedThrough: null });
    const body = { ...signatureBody(record, 'acknowledged', company.lead), signerId: helper.id };
    const refused = await act(company.lead, record, 'signatures', body);
    expect(refused.status).toBe(409);
    expect(refused.body.type).toBe('/problems/not-ready');
  });

  it('shows the lead the changed content when the register moved after the last save', async () => {
    const helper = await buildUser({ role: 'helper', sites: [company.site], name: 'Ina Berg' });
    const content = contentFor(company);
    const [lead, other] = content.crew ?? [];
    const crew = [lead ?? {}, { ...other, userId: helper.id }];
    const record = await create(company, { ...content, crew });
    await helper.update({ name: 'Ina Bergström' });
    const refused = await act(
      company.lead,
      record,
      'signatures',
      signatureBody(record, 'prepared', company.lead),
    );
    expect(refused.body.type).toBe('/problems/hash-mismatch');
    const after = await read(company.lead, record.id);
    expect(after.content.crew?.[1]?.name).toBe('Ina Bergström');
    expect((await sign(after, 'prepared', company.lead)).state).toBe('briefing');
  });
});

describe('the content hash', () => {
  it('is the SHA-256 of the RFC 8785 form of what is signed', async () => {
    const record = await create(company);
    const form = { worksheetId: record.id, revision: 1, content: record.content, attachments: [] };
    expect(record.contentHash).toBe(hashOf(form));
    expect(sha256(canonicalJson({ b: 1, a: [1e21, 'é'] }))).toBe(sha256('{"a":[1e+21,"é"],"b":1}'));
  });

  it('must be the current one', async () => {
    const record = await create(company);
    await save(company.lead, record, { ...record.content, notes: 'Changed since.' });
    const answer = await act(
      company.lead,
      record,
      'signatures',
      signatureBody(record, 'prepared', company.lead),
    );
    expect(answer.body.type).toBe('/problems/hash-mismatch');
  });
});

describe('who signs what', () => {
  const send = (who: Person, record: WorksheetRecord, meaning: Meaning, signer: Person) =>
    act(who, record, 'signatures', signatureBody(record, meaning, signer));

  it('keeps each meaning with the right person in the right session', async () => {
    const draft = await create(company);
    expect((await send(company.helper, draft, 'prepared', company.helper)).status).toBe(403);
    expect((await send(company.helper, draft, 'prepared', company.lead)).status).toBe(403);
    expect((await send(company.lead, draft, 'prepared', company.helper2)).status).toBe(404);
    expect((await send(company.safety, draft, 'prepared', company.lead)).status).toBe(403);
    const briefing = await sign(draft, 'prepared', company.lead);
    expect((await send(company.lead, briefing, 'acknowledged', company.helper2)).status).toBe(404);
    expect((await send(company.lead, briefing, 'acknowledged', company.lead)).status).toBe(403);
    expect((await send(company.supervisor, briefing, 'acknowledged', company.helper)).status).toBe(
      403,
    );
    const countersign = await sign(briefing, 'acknowledged', company.helper);
    expect((await send(company.lead, countersign, 'countersigned', company.lead)).status).toBe(403);
    expect(
      (await send(company.helper, countersign, 'countersigned', company.supervisor)).status,
    ).toBe(403);
    expect(
      (await send(company.otherSupervisor, countersign, 'countersigned', company.otherSupervisor))
        .status,
    ).toBe(404);
    expect(
      (await send(company.lead, countersign, 'countersigned', company.otherSupervisor)).status,
    ).toBe(404);
  });

  it('keeps who entered it when a helper signs on the lead’s device', async () => {
    const briefing = await toBriefing(company);
    const answer = await send(company.lead, briefing, 'acknowledged', company.helper);
    expect(answer.status).toBe(201);
    expect(answer.body).toMatchObject({
      signer: { id: company.helper.user.id, name: 'Beto Cruz', role: 'helper' },
      enteredById: company.lead.user.id,
      method: 'pin',
    });
    const events = await company.helper.agent.get(`/api/worksheets/${briefing.id}/events`);
    expect(events.body.items.at(-1)).toMatchObject({
      type: 'acknowledged',
      actorId: company.helper.user.id,
      enteredById: company.lead.user.id,
    });
  });

  it('does not let the author of any of it countersign', async () => {
    const { user } = company.supervisor2;
    const created = await company.supervisor2.agent
      .post('/api/worksheets')
      .send({ content: contentFor(company), leadId: company.lead.user.id });
    expect(created.status).toBe(201);
    const record = await sign(
      await sign(created.body as WorksheetRecord, 'prepared', company.lead),
      'acknowledged',
      company.helper,
    );
    expect(
      (await send(company.supervisor2, record, 'countersigned', company.supervisor2)).status,
    ).toBe(403);
    expect((await read(company.supervisor2, record.id)).actions).not.toContain(
      'sign:countersigned',
    );
    expect((await sign(record, 'countersigned', company.supervisor)).state).toBe('in-force');
    expect(user.role).toBe('supervisor');
  });

  it('lets one of two supervisors countersign at the same time', async () => {
    const record = await toCountersign(company);
    const answers = await Promise.all([
      send(company.supervisor, record, 'countersigned', company.supervisor),
      send(company.supervisor2, record, 'countersigned', company.supervisor2),
    ]);
    expect(answers.map(({ status }) => status).sort()).toEqual([201, 409]);
    expect((await read(company.lead, record.id)).signatures).toHaveLength(3);
  });

  it('asks the signer’s own PIN, and never 401', async () => {
    const helper = await buildUser({ role: 'helper', sites: [company.site] });
    const content = contentFor(company);
    const [lead, other] = content.crew ?? [];
    const crew = [lead ?? {}, { ...other, userId: helper.id }];
    const record = await sign(
      await create(company, { ...content, crew }),
      'prepared',
      company.lead,
    );
    const body = { ...signatureBody(record, 'acknowledged', company.lead), signerId: helper.id };
    for (let tries = 0; tries < 5; tries += 1) {
      const wrong = await act(company.lead, record, 'signatures', { ...body, pin: '999111' });
      expect(wrong.status).toBe(403);
      expect(wrong.body).toMatchObject({
        type: '/problems/wrong-pin',
        errors: [{ pointer: '#/pin' }],
      });
    }
    const blocked = await act(company.lead, record, 'signatures', body);
    expect(blocked.status).toBe(429);
    const stored = JSON.stringify(
      (await company.lead.agent.get(`/api/worksheets/${record.id}/events`)).body,
    );
    expect(stored).not.toContain('999111');
  });

  it('keeps edition and assessment with the signature, and the stops that were cleared', async () => {
    const content = contentFor(company);
    const risky = {
      ...content,
      surroundings: { ...content.surroundings, conductiveArticlesRemoved: false },
    };
    const record = await create(company, risky);
    expect(record.assessment.verdict).toBe('stop');
    const mended = await save(company.lead, record, content);
    const countersign = await sign(
      await sign(mended.body as WorksheetRecord, 'prepared', company.lead),
      'acknowledged',
      company.helper,
    );
    const seen = await read(company.supervisor, countersign.id);
    expect(seen.clearedStops).toEqual([
      { code: 'shock.conductive-articles', path: '/surroundings/conductiveArticlesRemoved' },
    ]);
    const signature = await SignatureRow.findOne({
      where: { worksheetId: record.id, meaning: 'prepared' },
      rejectOnEmpty: true,
    });
    expect(signature.edition).toBe(seen.assessment.edition);
    expect(signature.assessmentHash).toBe(hashOf(seen.assessment));
  });

  it('refuses strokes that nobody can have drawn', async () => {
    const record = await create(company);
    for (const strokes of [
      [],
      [[[1, 1]]],
      [
        [
          [1, -1],
          [2, 2],
        ],
      ],
      [
        [
          [1, 5000],
          [2, 2],
        ],
      ],
      'x',
    ]) {
      const answer = await act(company.lead, record, 'signatures', {
        ...signatureBody(record, 'prepared', company.lead),
        strokes,
      });
      expect(answer.status).toBe(422);
    }
  });
});

describe('signing without signal', () => {
  let key: KeyObject;
  let device: Device;
  beforeAll(async () => {
    const pair = generateKeyPairSync('ec', { namedCurve: 'P-256' });
    key = pair.privateKey;
    device = await addDevice(company.helper, pair.publicKey);
  });

  function addDevice(person: Person, publicKey: KeyObject): Promise<Device> {
    return Device.create({
      id: v7(),
      userId: person.user.id,
      publicKey: publicKey.export({ format: 'jwk' }) as Device['publicKey'],
      label: 'Phone',
      createdAt: clock.now(),
    });
  }

  function offline(record: WorksheetRecord, signedAt: string, overrides: object = {}) {
    const signed = {
      worksheetId: record.id,
      revision: record.revision,
      contentHash: record.contentHash,
      meaning: 'acknowledged' as const,
      signerId: company.helper.user.id,
      signedAt,
      strokesHash: hashOf(STROKES),
      ...overrides,
    };
    const signature = signBytes('sha256', Buffer.from(canonicalJson(signed)), {
      key,
      dsaEncoding: 'ieee-p1363',
    }).toString('base64url');
    return {
      id: v7(),
      meaning: 'acknowledged',
      signerId: company.helper.user.id,
      strokes: STROKES,
      contentHash: record.contentHash,
      deviceId: device.id,
      signedAt,
      signature,
    };
  }

  it('is accepted with the time at which it was given', async () => {
    const record = await toBriefing(company);
    clock.set('2026-12-01T15:50:00.000Z');
    const body = offline(record, '2026-12-01T09:10:00.000-06:00');
    const answer = await act(company.helper, record, 'signatures', body);
    expect(answer.status).toBe(201);
    expect(answer.body).toMatchObject({
      method: 'device',
      signedAt: '2026-12-01T15:10:00.000Z',
      receivedAt: '2026-12-01T15:50:00.000Z',
    });
    expect((await act(company.helper, record, 'signatures', body)).status).toBe(200);
    expect((await read(company.helper, record.id)).state).toBe('countersign');
    expect((await verifyRecord()).faults).toEqual([]);
  });

  const refusals: [string, number, (record: WorksheetRecord) => object][] = [
    [
      'older than the signature before it',
      409,
      (record) => offline(record, '2026-12-01T14:59:59Z'),
    ],
    ['ahead of the clock', 409, (record) => offline(record, '2026-12-01T15:15:01Z')],
    ['outside the planned window', 409, (record) => offline(record, '2026-12-01T13:59:59Z')],
    [
      'of another content',
      403,
      (record) => offline(record, '2026-12-01T15:05:00Z', { contentHash: '0'.repeat(64) }),
    ],
    [
      'of another meaning',
      403,
      (record) => offline(record, '2026-12-01T15:05:00Z', { meaning: 'prepared' }),
    ],
    [
      'of other strokes',
      403,
      (record) => ({
        ...offline(record, '2026-12-01T15:05:00Z'),
        strokes: [
          [
            [1, 1],
            [2, 2],
          ],
        ],
      }),
    ],
    [
      'of an unknown device',
      403,
      (record) => ({ ...offline(record, '2026-12-01T15:05:00Z'), deviceId: v7() }),
    ],
  ];
  it.each(refusals)('is refused %s, and the trail keeps it', async (_, status, body) => {
    const record = await toBriefing(company);
    clock.set('2026-12-01T15:10:00.000Z');
    const answer = await act(company.helper, record, 'signatures', body(record));
    expect(answer.status).toBe(status);
    const events = await company.lead.agent.get(`/api/worksheets/${record.id}/events`);
    expect(events.body.items.at(-1)).toMatchObject({
      type: 'signature-refused',
      actorId: company.helper.user.id,
    });
    expect((await read(company.helper, record.id)).state).toBe('briefing');
  });

  it('is refused after 72 hours', async () => {
    const content = contentFor(company);
    const record = await create(company, content);
    const pair = generateKeyPairSync('ec', { namedCurve: 'P-256' });
    const leads = await addDevice(company.lead, pair.publicKey);
    const signedAt = '2026-12-01T15:00:00.000Z';
    const { signature: _, ...signed } = {
      ...offline(record, signedAt),
      meaning: 'prepared' as const,
      signerId: company.lead.user.id,
      deviceId: leads.id,
    };
    const text = canonicalJson({
      worksheetId: record.id,
      revision: 1,
      contentHash: record.contentHash,
      meaning: 'prepared',
      signerId: company.lead.user.id,
      signedAt,
      strokesHash: hashOf(STROKES),
    });
    const signature = signBytes('sha256', Buffer.from(text), {
      key: pair.privateKey,
      dsaEncoding: 'ieee-p1363',
    }).toString('base64url');
    clock.set('2026-12-04T15:00:01.000Z');
    const late = await act(company.lead, record, 'signatures', { ...signed, signature });
    expect(late.status).toBe(409);
    clock.set('2026-12-04T14:59:59.000Z');
    const inTime = await act(company.lead, record, 'signatures', { ...signed, signature });
    expect(inTime.status).toBe(201);
    // It was ready when it was signed; the window is over by now.
    expect((await read(company.lead, record.id)).state).toBe('expired');
  });

  it('is refused from a device that was revoked', async () => {
    const record = await toBriefing(company);
    await device.update({ revokedAt: clock.now() });
    clock.set('2026-12-01T15:10:00.000Z');
    const answer = await act(
      company.helper,
      record,
      'signatures',
      offline(record, '2026-12-01T15:05:00Z'),
    );
    expect(answer.status).toBe(403);
    await device.update({ revokedAt: null });
  });
});

describe('the change of clocks', () => {
  it('does not move the planned end: the window is a length of time', async () => {
    // In Chicago the clocks go back at 2:00 on 1 November 2026.
    clock.set('2026-11-01T04:30:00.000Z');
    const content = contentFor(company);
    const night = {
      ...content,
      job: {
        ...content.job,
        startsAt: '2026-10-31T23:30:00-05:00',
        endsAt: '2026-11-01T05:30:00-06:00',
      },
    };
    const record = await toInForce(company, night);
    clock.set('2026-11-01T11:30:00.000Z');
    expect((await read(company.lead, record.id)).state).toBe('in-force');
    clock.set('2026-11-01T11:30:01.000Z');
    expect((await read(company.lead, record.id)).state).toBe('expired');
    const tooLong = await create(company, {
      ...content,
      job: {
        ...content.job,
        startsAt: '2026-10-31T18:30:00-05:00',
        endsAt: '2026-11-01T06:30:00-06:00',
      },
    });
    const codes = tooLong.assessment.findings.map(({ code }) => code);
    expect(codes).toContain('window.too-long');
  });
});

it('leaves nothing altered behind all of this', async () => {
  await prove(company, await toInForce(company));
  expect((await verifyRecord()).faults).toEqual([]);
});
