import { QueryTypes } from 'sequelize';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import type { WorksheetRecord } from '@/shared/record';
import { sequelize } from '@/server/db';
import { boss, startBoss } from '@/server/jobs';
import { Event } from '@/server/models/Event';
import { SignatureRow } from '@/server/models/SignatureRow';
import { verifyRecord } from '@/server/services/verifyRecord';
import { messageIdOf } from '@/server/services/queueMail';
import { Worksheet } from '@/server/models/Worksheet';
import { WorksheetRevision } from '@/server/models/WorksheetRevision';
import {
  NOW,
  buildCompany,
  contentFor,
  create,
  signatureBody,
  toBriefing,
} from '../../support/record';
import type { Company, Person } from '../../support/record';
import { buildUser, receivedMails, signIn } from '../../support/server';
import { cookieOf, send, startServerProcess } from '../../support/serverProcess';
import type { Answer, ServerProcess } from '../../support/serverProcess';

/** 200 requests in flight at once: saves of one lead, signatures of forty helpers and of ten leads. */
const SAVES = 100;
const HELPERS = 40;
const LEADS = 10;
const KILL_AFTER_ANSWERS = 60;

interface Request {
  path: string;
  method: 'PUT' | 'POST';
  who: Person;
  body: { id?: string; content?: object; meaning?: string };
  headers?: Record<string, string>;
  record: WorksheetRecord;
}

let company: Company;
let server: ServerProcess;
const requests: Request[] = [];
const answers = new Map<Request, Answer>();
const cookies = new Map<Person, string>();

async function inBatches<T, R>(list: readonly T[], work: (item: T) => Promise<R>): Promise<R[]> {
  const results: R[] = [];
  for (let from = 0; from < list.length; from += 8) {
    results.push(...(await Promise.all(list.slice(from, from + 8).map(work))));
  }
  return results;
}

async function newPerson(role: 'lead' | 'helper'): Promise<Person> {
  const user = await buildUser({ role, sites: [company.site] });
  return { user, agent: await signIn(company.app, user) };
}

const range = (count: number) => Array.from({ length: count }, (_, index) => index);

function saveOf(record: WorksheetRecord, index: number): Request {
  return {
    path: `/api/worksheets/${record.id}`,
    method: 'PUT',
    who: company.lead,
    headers: { 'If-Match': `"${record.version}"` },
    body: { content: { ...record.content, notes: `Saved as number ${index}.` } },
    record,
  };
}

function signatureOf(
  record: WorksheetRecord,
  meaning: 'prepared' | 'acknowledged',
  who: Person,
): Request {
  const path = `/api/worksheets/${record.id}/signatures`;
  return { path, method: 'POST', who, body: signatureBody(record, meaning, who), record };
}

beforeAll(async () => {
  company = await buildCompany();
  // One to tell, so that the mails are few.
  await company.supervisor2.user.update({ retiredAt: new Date(NOW) });
  await inBatches(range(SAVES), async (index) => {
    requests.push(saveOf(await create(company, { notes: 'Not saved since.' }), index));
  });
  await inBatches(range(HELPERS), async () => {
    const helper = await newPerson('helper');
    const theirs = contentFor({ ...company, helper });
    for (const record of [await toBriefing(company, theirs), await toBriefing(company, theirs)]) {
      requests.push(signatureOf(record, 'acknowledged', helper));
    }
  });
  await inBatches(range(LEADS), async () => {
    const lead = await newPerson('lead');
    const theirs = { ...company, lead };
    const drafts = [await create(theirs), await create(theirs)];
    for (const record of drafts) requests.push(signatureOf(record, 'prepared', lead));
  });
  server = await startServerProcess({ TEST_NOW: NOW });
  await inBatches([...new Set(requests.map(({ who }) => who))], async (who) => {
    cookies.set(who, await cookieOf(server.base, who.user));
  });
});
afterAll(() => server.stop());

async function post(request: Request): Promise<void> {
  const { path, method, who, body, headers = {} } = request;
  const cookie = cookies.get(who) ?? '';
  const options = { method, cookie, body, headers, milliseconds: 200_000 };
  answers.set(request, await send(`${server.base}${path}`, options));
}

/** Mixed as they would come, the same way in every run. */
function shuffled<T>(list: readonly T[]): T[] {
  let seed = 20261201;
  const keyed = list.map((item) => {
    seed = (seed * 1103515245 + 12345) % 2147483648;
    return { item, key: seed };
  });
  return keyed.sort((one, other) => one.key - other.key).map(({ item }) => item);
}

const acknowledged = () =>
  [...answers].filter(([, { status }]) => status === 200 || status === 201);

async function isKept({ method, body, record }: Request): Promise<boolean> {
  if (method === 'POST') {
    const row = await SignatureRow.findByPk(body.id ?? '');
    return row?.worksheetId === record.id && row.contentHash === record.contentHash;
  }
  const revision = await WorksheetRevision.findOne({ where: { worksheetId: record.id } });
  return (
    JSON.stringify(revision?.content.notes) ===
    JSON.stringify((body.content as { notes: string }).notes)
  );
}

interface QueuedMail {
  messageId: string;
  state: string;
}

function queuedMails(): Promise<QueuedMail[]> {
  return sequelize.query<QueuedMail>(
    `SELECT data ->> 'messageId' AS "messageId", state::text FROM pgboss.job WHERE name = 'mail'
      UNION ALL
     SELECT data ->> 'messageId', state::text FROM pgboss.archive WHERE name = 'mail'`,
    { type: QueryTypes.SELECT },
  );
}

/** Every mail that the trail says somebody is owed, by its Message-ID. */
async function owedMails(): Promise<string[]> {
  const events = await Event.findAll({ where: { type: ['prepared', 'acknowledged'] } });
  const supervisors = [company.supervisor.user.id];
  const owed = await inBatches(events, async ({ seq, subjectId, payload }) => {
    const news =
      payload['state'] === 'briefing' ? 'awaits-acknowledgement' : 'awaits-countersignature';
    const worksheet = await Worksheet.findByPk(subjectId, { rejectOnEmpty: true });
    const crew = worksheet.crewIds.filter((id) => id !== worksheet.leadId);
    const recipients = news === 'awaits-acknowledgement' ? crew : supervisors;
    return recipients.map((id) => messageIdOf(`event ${seq} ${news}`, id));
  });
  return owed.flat().sort();
}

// On a loaded machine the process takes its time to start and to answer.
const PATIENT = { timeout: 300_000 };

describe('a server killed in the middle of 200 saves and signatures', PATIENT, () => {
  it('has answered some of them, and is gone', async () => {
    expect(requests).toHaveLength(200);
    const sent = shuffled(requests).map((request) => post(request).catch(() => undefined));
    await expect
      .poll(() => answers.size, { interval: 1, timeout: 120_000 })
      .toBeGreaterThanOrEqual(KILL_AFTER_ANSWERS);
    await server.kill();
    await Promise.all(sent);
    expect(
      [...answers.values()]
        .map(({ status }) => status)
        .sort()
        .at(-1),
    ).toBeLessThan(300);
    expect(acknowledged().length).toBeLessThan(requests.length);
    const kinds = new Set(acknowledged().map(([{ method }]) => method));
    expect([...kinds].sort()).toEqual(['POST', 'PUT']);
  });

  it('has lost nothing that it had confirmed', async () => {
    const kept = await inBatches(acknowledged(), ([request]) => isKept(request));
    expect(kept.every(Boolean)).toBe(true);
  });

  it('left nothing half done', async () => {
    // Waits for what PostgreSQL still had in hand of the broken connections.
    await sequelize.query('SELECT 1');
    expect((await verifyRecord()).faults).toEqual([]);
    // A save is whole as well: the version counts it if and only if the content is there.
    for (const { method, record, body } of requests) {
      if (method === 'POST') continue;
      const [worksheet, revision] = await Promise.all([
        Worksheet.findByPk(record.id, { rejectOnEmpty: true }),
        WorksheetRevision.findOne({ where: { worksheetId: record.id }, rejectOnEmpty: true }),
      ]);
      const isSaved = revision.content.notes === (body.content as { notes: string }).notes;
      expect(worksheet.version).toBe(isSaved ? record.version + 1 : record.version);
    }
  });

  it('owes exactly the mails of what came to be', async () => {
    const ids = (await queuedMails()).map(({ messageId }) => messageId).sort();
    expect(ids).toEqual(await owedMails());
  });

  it('starts again, takes what was not confirmed once more, and keeps each once', async () => {
    server = await startServerProcess({ TEST_NOW: NOW });
    const confirmed = new Set(acknowledged().map(([request]) => request));
    // The sessions of before still count: nobody signs in again.
    await Promise.all(requests.filter((request) => !confirmed.has(request)).map(post));
    expect(acknowledged()).toHaveLength(requests.length);
    const kept = await inBatches(requests, isKept);
    expect(kept.every(Boolean)).toBe(true);
    const ids = requests.flatMap(({ body: { id } }) => id ?? []);
    expect(await SignatureRow.count({ where: { id: ids } })).toBe(ids.length);
    expect(await Event.count({ where: { type: ['prepared', 'acknowledged'] } })).toBe(
      ids.length + 2 * HELPERS,
    );
    expect((await verifyRecord()).faults).toEqual([]);
  });

  it('sends every mail in the end, also those that were on their way', async () => {
    // A job in the hand of a dead process is given out again after two minutes, and a minute later: here they pass at once.
    await sequelize.query(
      `UPDATE pgboss.job SET started_on = started_on - interval '3 minutes'
        WHERE name = 'mail' AND state = 'active'`,
    );
    await startBoss();
    await boss.maintain();
    await sequelize.query(
      `UPDATE pgboss.job SET start_after = now() WHERE name = 'mail' AND state = 'retry'`,
    );
    const owed = await owedMails();
    await expect
      .poll(() => new Set(receivedMails().map(({ messageId }) => messageId)).size, {
        timeout: 120_000,
      })
      .toBe(new Set(owed).size);
  });
});
