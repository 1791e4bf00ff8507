import { createHash, generateKeyPairSync } from 'node:crypto';
import { readFileSync, rmSync } from 'node:fs';
import { QueryTypes } from 'sequelize';
import supertest from 'supertest';
import type TestAgent from 'supertest/lib/agent';
import { v7 } from 'uuid';
import { afterAll, beforeAll, describe, expect, it, vi } from 'vitest';
import type { WorksheetRecord } from '@/shared/record';
import { buildApp } from '@/server/app';
import { clock } from '@/server/clock';
import { sequelize } from '@/server/db';
import type { Site } from '@/server/models/Site';
import { deliverMails, linkMailedTo } from '../support/mail';
import { NOW, STROKES } from '../support/record';
import { buildSite, buildUser, receivedMails, signIn } from '../support/server';
import { soundWorksheet } from '../support/soundWorksheet';
import { tap } from '../support/tap';

// Before any import: the environment is read once.
const { folder, logFile } = await vi.hoisted(async () => {
  const { mkdtempSync } = await import('node:fs');
  const created = mkdtempSync('/tmp/wideberth-secrets-');
  const log = `${created}/log`;
  Object.assign(process.env, { LOG_LEVEL: 'debug', LOG_FILE: log });
  return { folder: created, logFile: log };
});

/* Recognisable, so that one that gets out is found wherever it lies. */
const PASSWORDS = {
  safety: 'umbrella-quartz-safety-one',
  lead: 'umbrella-quartz-lead-one',
  reset: 'umbrella-quartz-lead-two',
  changed: 'umbrella-quartz-lead-three',
  helper: 'umbrella-quartz-helper-one',
  supervisor: 'umbrella-quartz-supervisor',
  wrong: 'umbrella-quartz-wrong-one',
};
const PINS = {
  ...{ lead: '705318', changed: '816427', helper: '927536', supervisor: '530861' },
  wrong: '641972',
};

const { app, answers } = tap(buildApp());
const tokens: string[] = [];
const sessionIds = new Set<string>();
let site: Site;

async function keepSessionIds(): Promise<void> {
  const rows = await sequelize.query<{ sid: string }>('SELECT sid FROM session', {
    type: QueryTypes.SELECT,
  });
  for (const { sid } of rows) sessionIds.add(sid);
}

interface Member {
  id: string;
  email: string;
  agent: TestAgent;
}

/** Uses the link that was mailed last to this address. */
async function followLink(email: string, choice: object): Promise<void> {
  const { token } = await linkMailedTo(email);
  tokens.push(token);
  await supertest(app).post(`/api/password-resets/${token}`).send({ password: 'x' }).expect(422);
  await supertest(app).post(`/api/password-resets/${token}`).send(choice).expect(204);
  await supertest(app).post(`/api/password-resets/${token}`).send(choice).expect(404);
}

async function invite(safety: TestAgent, role: 'lead' | 'helper' | 'supervisor'): Promise<Member> {
  const email = `${role}@secrets.example`;
  const { body } = await safety
    .post('/api/users')
    .send({ name: `A ${role}`, email, role, siteIds: [site.id], qualifiedThrough: '2030-12-31' })
    .expect(201);
  await followLink(email, { password: PASSWORDS[role], pin: PINS[role] });
  return { id: body.id, email, agent: await signIn(app, email, PASSWORDS[role]) };
}

/** Every change of a password or PIN, and each way in which one is wrong. */
async function changeSecrets(lead: Member): Promise<void> {
  const wrong = { email: lead.email, password: PASSWORDS.wrong };
  await supertest(app).post('/api/session').send(wrong).expect(401);
  await supertest(app).post('/api/password-resets').send({ email: lead.email }).expect(202);
  await followLink(lead.email, { password: PASSWORDS.reset });
  lead.agent = await signIn(app, lead.email, PASSWORDS.reset);
  await keepSessionIds();
  const password = (current: string, next: unknown) =>
    lead.agent.post('/api/session/password').send({ current, password: next });
  await password(PASSWORDS.wrong, PASSWORDS.changed).expect(403);
  await password(PASSWORDS.reset, [PASSWORDS.changed]).expect(422);
  await password(PASSWORDS.reset, PASSWORDS.changed).expect(200);
  const pin = (fields: object) => lead.agent.post('/api/session/pin').send(fields);
  await pin({ password: PASSWORDS.wrong, pin: PINS.changed }).expect(403);
  await pin({ password: [PASSWORDS.changed], pin: { pin: PINS.changed } }).expect(422);
  await pin({ password: PASSWORDS.changed, pin: PINS.changed }).expect(200);
  // What a client puts where it does not belong.
  await lead.agent.get('/api/session').query({ password: PASSWORDS.changed, pin: PINS.changed });
  await lead.agent.get(`/api/users/${PASSWORDS.changed}`).expect(404);
  await lead.agent
    .post('/api/session/pin')
    .set('Content-Type', 'application/json')
    .send(`{"password":"${PASSWORDS.changed}","pin":"${PINS.changed}`)
    .expect(400);
}

async function addDevice({ agent }: Member, pin: string): Promise<void> {
  const { publicKey } = generateKeyPairSync('ec', { namedCurve: 'P-256' });
  const device = { id: v7(), publicKey: publicKey.export({ format: 'jwk' }), label: 'Phone' };
  await agent
    .post('/api/devices')
    .send({ ...device, pin: PINS.wrong })
    .expect(403);
  await agent
    .post('/api/devices')
    .send({ ...device, pin })
    .expect(201);
}

/** From a draft to the archive, with a wrong PIN before each right one. */
async function workThrough(lead: Member, helper: Member, supervisor: Member): Promise<string> {
  const { content, proof, closeOut } = soundWorksheet();
  const users = [lead.id, helper.id];
  const crew = content.crew?.map((member, index) => ({ ...member, userId: users[index] }));
  const job = { ...content.job, siteId: site.id };
  const { body } = await lead.agent
    .post('/api/worksheets')
    .send({ content: { ...content, job, crew } })
    .expect(201);
  const path = `/api/worksheets/${body.id}`;
  const twice = async (who: Member, name: string, fields: object, pin: string) => {
    await who.agent
      .post(`${path}/${name}`)
      .send({ ...fields, pin: PINS.wrong })
      .expect(403);
    await who.agent
      .post(`${path}/${name}`)
      .send({ ...fields, pin: pin.slice(1) })
      .expect(422);
    const answer = await who.agent.post(`${path}/${name}`).send({ ...fields, pin });
    expect(answer.status, answer.text).toBeLessThan(300);
  };
  const sign = async (meaning: string, signer: Member, pin: string, on = signer) => {
    const { contentHash } = (await on.agent.get(path)).body as WorksheetRecord;
    const fields = { meaning, signerId: signer.id, strokes: STROKES, contentHash };
    await twice(on, 'signatures', fields, pin);
  };
  await sign('prepared', lead, PINS.changed);
  await sign('acknowledged', helper, PINS.helper, lead);
  await sign('countersigned', supervisor, PINS.supervisor);
  await twice(lead, 'proofs', { proof }, PINS.changed);
  await twice(lead, 'close', { closeOut }, PINS.changed);
  return body.id as string;
}

/** Five wrong PINs, which end in a mail. */
async function block({ agent }: Member): Promise<void> {
  const { publicKey } = generateKeyPairSync('ec', { namedCurve: 'P-256' });
  const jwk = publicKey.export({ format: 'jwk' });
  const device = { id: v7(), publicKey: jwk, label: 'Phone', pin: PINS.wrong };
  for (let tries = 0; tries < 5; tries += 1) {
    await agent.post('/api/devices').send(device).expect(403);
  }
  await agent.post('/api/devices').send(device).expect(429);
}

async function readEverything({ agent }: Member | { agent: TestAgent }, worksheetId: string) {
  const W = `/api/worksheets/${worksheetId}`;
  for (const path of [
    ...['/api/session', '/api/sessions', '/api/devices', '/api/users', '/api/sites'],
    ...['/api/worksheets', W, `${W}/revisions`, `${W}/revisions/1`, `${W}/events`],
  ]) {
    await agent.get(path).expect(200);
  }
}

beforeAll(async () => {
  clock.set(NOW);
  site = await buildSite();
  const { email } = await buildUser({ role: 'safety', password: PASSWORDS.safety });
  const safety = await signIn(app, email, PASSWORDS.safety);
  const lead = await invite(safety, 'lead');
  const helper = await invite(safety, 'helper');
  const supervisor = await invite(safety, 'supervisor');
  await changeSecrets(lead);
  await addDevice(helper, PINS.helper);
  const worksheetId = await workThrough(lead, helper, supervisor);
  await block(helper);
  await keepSessionIds();
  for (const agent of [safety, lead.agent, helper.agent, supervisor.agent]) {
    await readEverything({ agent }, worksheetId);
  }
  await safety.get('/api/users/export.csv').expect(200);
  await safety.get('/api/worksheets/export.csv').expect(200);
  await deliverMails();
}, 120_000);
afterAll(() => {
  clock.set(null);
  rmSync(folder, { recursive: true, force: true });
});

const sha256 = (text: string) => createHash('sha256').update(text).digest('hex');

/** Every secret that this text holds, by what it is. */
function secretsIn(text: string): string[] {
  const found: string[] = [];
  const look = (what: string, secret: string) => {
    if (text.includes(secret)) found.push(what);
  };
  look('a password', 'umbrella-quartz');
  look('a hash of a password or PIN', '$argon2');
  look('the secret of the sessions', process.env['SESSION_SECRET'] ?? '');
  // Digits inside a hash are no PIN.
  for (const [name, pin] of Object.entries(PINS)) {
    if (new RegExp(`(?<![0-9a-f])${pin}(?![0-9a-f])`).test(text)) found.push(`the PIN ${name}`);
    look(`a hash of the PIN ${name}`, sha256(pin));
  }
  for (const token of tokens) {
    look('a token', token);
    look('the hash of a token', sha256(token));
  }
  for (const id of sessionIds) look('the id of a session', id);
  return found;
}

async function rowsOf(sql: string): Promise<string[]> {
  const rows = await sequelize.query<object>(sql, { type: QueryTypes.SELECT });
  return rows.map((row) => JSON.stringify(row));
}

describe('after a whole life', () => {
  it('there is something to look through', () => {
    expect(answers.length).toBeGreaterThan(90);
    expect(tokens).toHaveLength(4);
    expect(sessionIds.size).toBeGreaterThan(4);
    expect(secretsIn(`x ${PINS.lead} ${tokens[0]} ${PASSWORDS.reset}`)).toHaveLength(3);
  });

  it('no answer holds a secret, in its body or its headers', () => {
    const found = answers.flatMap(({ address, headers, body }) =>
      secretsIn(`${headers}\n${body}`).map((what) => `${address}: ${what}`),
    );
    expect(found).toEqual([]);
  });

  it.each([
    ['event', 'SELECT * FROM events'],
    ['seal', 'SELECT * FROM seals'],
    ['job', 'SELECT data, output FROM pgboss.job'],
    ['signature', 'SELECT * FROM signatures'],
    ['proof', 'SELECT * FROM proofs'],
    ['close-out', 'SELECT * FROM close_outs'],
    ['revision', 'SELECT * FROM worksheet_revisions'],
    ['worksheet', 'SELECT * FROM worksheets'],
    ['device', 'SELECT * FROM devices'],
    ['throttle', 'SELECT * FROM rate_limits'],
  ])('no %s holds one', async (_what, sql) => {
    expect((await rowsOf(sql)).flatMap(secretsIn)).toEqual([]);
  });

  it('no line of the log holds one', async () => {
    // A line is written after its answer has gone out.
    await expect
      .poll(() => readFileSync(logFile, 'utf8').split('\n').length, { timeout: 10_000 })
      .toBeGreaterThan(answers.length);
    const lines = readFileSync(logFile, 'utf8').trim().split('\n');
    expect(lines.flatMap(secretsIn)).toEqual([]);
  });

  it('no mail holds one but the token in its own link', () => {
    const mails = receivedMails().map(({ subject, text, messageId, raw }) => {
      const [link = ''] = /\/(?:reset|invitation)\/[\w-]+/.exec(text) ?? [];
      const plain = `${subject}\n${messageId}\n${text.replace(link, '')}`;
      return link === '' ? `${plain}\n${raw}` : plain;
    });
    expect(mails.length).toBeGreaterThan(8);
    expect(mails.flatMap(secretsIn)).toEqual([]);
  });
});
