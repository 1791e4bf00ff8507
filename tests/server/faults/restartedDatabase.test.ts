import { afterAll, beforeAll, describe, expect, it, vi } from 'vitest';
import { v7 } from 'uuid';
import type { WorksheetRecord } from '@/shared/record';
import { problemSchema } from '@/shared/problem';
import { startPostgres, stopCluster } from '@/server/commands/cluster';
import { SignatureRow } from '@/server/models/SignatureRow';
import { verifyRecord } from '@/server/services/verifyRecord';
import { NOW, buildCompany, create, read, signatureBody, toBriefing } from '../../support/record';
import type { Company, Person } from '../../support/record';
import { buildSite, receivedMails } from '../../support/server';
import { cookieOf, send, startServerProcess } from '../../support/serverProcess';
import type { Answer, ServerProcess } from '../../support/serverProcess';

// A PostgreSQL of this file's own, before any import reads the environment: it is taken down and brought up again.
const { cluster, stop } = await vi.hoisted(async () => {
  const { startTestCluster } = await import('../../support/database');
  const { urlOf } = await import('@/server/commands/cluster');
  const { migrateUp } = await import('@/server/migrate');
  const own = await startTestCluster({ durable: true });
  const ownerUrl = urlOf(own.cluster, 'owner');
  const runtimeUrl = urlOf(own.cluster, 'runtime');
  await migrateUp({ ownerUrl, runtimeUrl });
  Object.assign(process.env, { DATABASE_URL: runtimeUrl, DATABASE_OWNER_URL: ownerUrl });
  return own;
});

/** Nobody waits longer than this for an answer, whatever the database does. */
const LONGEST_MILLISECONDS = 8000;
const DOWN_MILLISECONDS = 1500;
const pause = (milliseconds: number) => new Promise((resolve) => setTimeout(resolve, milliseconds));

let company: Company;
let server: ServerProcess;
let cookies: Record<'lead' | 'helper', string>;

beforeAll(async () => {
  company = await buildCompany();
  server = await startServerProcess({ TEST_NOW: NOW });
  cookies = {
    lead: await cookieOf(server.base, company.lead.user),
    helper: await cookieOf(server.base, company.helper.user),
  };
});
afterAll(async () => {
  await server?.stop();
  await stop();
});

interface Timed extends Answer {
  /** When the request was sent, in milliseconds of `performance.now()`. */
  began: number;
  milliseconds: number;
}

/** People at work until they are told to stop: each sends the next request when the last was answered. */
function startLoad(people: ((ask: typeof send) => Promise<unknown>)[]) {
  const answers: Timed[] = [];
  let isOver = false;
  const timed: typeof send = async (path, options) => {
    const began = performance.now();
    const answer = await send(`${server.base}${path}`, options);
    answers.push({ ...answer, began, milliseconds: performance.now() - began });
    return answer;
  };
  const running = people.map(async (work) => {
    while (!isOver) await work(timed);
  });
  return {
    answers,
    async end() {
      isOver = true;
      await Promise.all(running);
    },
  };
}

/** Saves one draft again and again; remembers the last content that was confirmed. */
function savesFor(record: WorksheetRecord) {
  const saved = { version: record.version, notes: '' };
  let count = 0;
  const work = async (ask: typeof send) => {
    const notes = `Save ${(count += 1)}.`;
    const answer = await ask(`/api/worksheets/${record.id}`, {
      method: 'PUT',
      cookie: cookies.lead,
      headers: { 'If-Match': `"${saved.version}"` },
      body: { content: { notes } },
    });
    if (answer.status === 200) {
      saved.notes = notes;
      saved.version = (answer.body as WorksheetRecord).version;
    } else if (answer.status === 412) {
      // The answer to an earlier save was lost with the database; the save was not.
      saved.version = (answer.body as { worksheet: WorksheetRecord }).worksheet.version;
    }
  };
  return { record, saved, work };
}

/** Signs one worksheet after the other, each with one id until it is confirmed. */
function signaturesFor(records: WorksheetRecord[], signer: Person) {
  const confirmed: string[] = [];
  const open = records.map((record) => ({
    path: `/api/worksheets/${record.id}/signatures`,
    body: signatureBody(record, 'acknowledged', signer),
  }));
  const work = async (ask: typeof send) => {
    const [next] = open;
    if (next === undefined) return void (await pause(20));
    const options = { method: 'POST', cookie: cookies.helper, body: next.body };
    const answer = await ask(next.path, options);
    if (answer.status === 200 || answer.status === 201) {
      open.shift();
      confirmed.push(next.body.id);
    }
    await pause(30);
  };
  return { open, confirmed, work };
}

const reader = (path: string, cookie: () => string) => async (ask: typeof send) => {
  await ask(path, { cookie: cookie() });
};
const signIn = async (ask: typeof send) => {
  const { email } = company.supervisor.user;
  const body = { email, password: 'not the password' };
  await ask('/api/session', {
    method: 'POST',
    headers: { 'X-Forwarded-For': '203.0.113.9' },
    body,
  });
  await pause(200);
};

// `immediate`: as if its machine had failed; `fast`: as an upgrade does it.
describe.each(['immediate', 'fast'] as const)('PostgreSQL stopped with -m %s', (mode) => {
  const savers: ReturnType<typeof savesFor>[] = [];
  let signing: ReturnType<typeof signaturesFor>;
  let answers: Timed[] = [];
  let during: Timed[] = [];

  beforeAll(async () => {
    const drafts = [1, 2, 3].map(() => create(company, { notes: 'Begun.' }));
    savers.push(...(await Promise.all(drafts)).map(savesFor));
    const briefings: WorksheetRecord[] = [];
    for (let count = 0; count < 40; count += 1) briefings.push(await toBriefing(company));
    signing = signaturesFor(briefings, company.helper);
    const load = startLoad([
      ...savers.map(({ work }) => work),
      signing.work,
      signIn,
      reader('/api/worksheets', () => cookies.lead),
      reader('/api/session', () => cookies.helper),
      reader('/api/health', () => ''),
    ]);
    answers = load.answers;
    await pause(500);
    await stopCluster(cluster.folder, mode);
    const down = performance.now();
    await pause(DOWN_MILLISECONDS);
    // An answer given before may arrive later: what was asked of a stopped database counts.
    during = answers.filter(({ began }) => began >= down);
    await startPostgres(cluster.folder, cluster.port);
    await vi.waitFor(() => expect(signing.open).toEqual([]), { timeout: 60_000, interval: 100 });
    await load.end();
  });

  it('answers meanwhile that it is to be tried again, in good time and without a word of the cause', () => {
    expect(during.length).toBeGreaterThan(20);
    expect(new Set(during.map(({ status }) => status))).toEqual(new Set([503]));
    expect(Math.max(...answers.map(({ milliseconds }) => milliseconds))).toBeLessThan(
      LONGEST_MILLISECONDS,
    );
    const statuses = [...new Set(answers.map(({ status }) => status))].sort();
    // 401: the wrong password; 412: a save whose answer was lost.
    expect(statuses.filter((status) => ![200, 201, 401, 412, 429].includes(status))).toEqual([503]);
    for (const { status, type, body, headers } of answers) {
      if (status !== 503 || type.startsWith('application/json')) continue;
      expect(type).toMatch(/^application\/problem\+json/);
      expect(problemSchema.parse(body).type).toBe('/problems/unavailable');
      expect(headers.get('retry-after')).toMatch(/^\d+$/);
      expect(JSON.stringify(body)).not.toMatch(/postgres|sequelize|terminat|127\.0\.0\.1|at /i);
    }
  });

  it('goes on in the same process, with the sessions of before', async () => {
    expect(server.isRunning()).toBe(true);
    const health = await send(`${server.base}/api/health`);
    expect(health.body).toEqual({ status: 'ok', database: 'up' });
    for (const cookie of Object.values(cookies)) {
      expect((await send(`${server.base}/api/session`, { cookie })).status).toBe(200);
    }
  });

  it('holds every save and signature that it confirmed, and each once', async () => {
    for (const { record, saved } of savers) {
      const { content, version } = await read(company.lead, record.id);
      // What was in flight when the load ended is confirmed as well.
      expect([content.notes, version]).toEqual([saved.notes, saved.version]);
    }
    expect(signing.confirmed).toHaveLength(40);
    expect(await SignatureRow.count({ where: { id: signing.confirmed } })).toBe(40);
    expect((await verifyRecord()).faults).toEqual([]);
  });

  it('takes up the mails again', async () => {
    const site = await buildSite();
    const safety = await cookieOf(server.base, company.safety.user);
    const email = `new-${mode}@company.example`;
    const body = { id: v7(), name: 'Ivo Lund', email, role: 'helper', siteIds: [site.id] };
    const invited = await send(`${server.base}/api/users`, {
      method: 'POST',
      cookie: safety,
      body,
    });
    expect(invited.status).toBe(201);
    const isTold = () => receivedMails().some(({ to }) => to.includes(email));
    await expect.poll(isTold, { timeout: 30_000 }).toBe(true);
  });
});
