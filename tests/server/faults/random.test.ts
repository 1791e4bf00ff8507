import { createServer } from 'node:http';
import type { AddressInfo } from 'node:net';
import fc from 'fast-check';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { v7 } from 'uuid';
import type { WorksheetRecord } from '@/shared/record';
import { problemSchema } from '@/shared/problem';
import { closeOutSchema, proofSchema, worksheetContentSchema } from '@/shared/worksheet';
import { Worksheet } from '@/server/models/Worksheet';
import { API_ROUTES } from '@/server/openapi/routes';
import type { ApiRoute } from '@/server/openapi/routes';
import { documentDefinition } from '@/server/pdf/definition';
import { renderWorksheetPdf, stopPdfWorkers } from '@/server/pdf/renderWorksheetPdf';
import { pdfInput } from '@/server/services/pdfInput';
import { verifyRecord } from '@/server/services/verifyRecord';
import { anyBodyText, anyJson, mutated } from '../../support/arbitraryJson';
import { arbitraryOf } from '../../support/arbitraryOf';
import { STROKES, buildCompany, contentFor, create, toInForce } from '../../support/record';
import type { Company } from '../../support/record';
import { buildUser, PIN } from '../../support/server';
import { cookieOf } from '../../support/serverProcess';
import { soundWorksheet } from '../../support/soundWorksheet';

const REQUESTS = 10_000;
/** As many at once as a small company's phones would send. */
const AT_ONCE = 20;

type Who = 'lead' | 'helper' | 'supervisor' | 'safety';
interface Request {
  method: string;
  path: string;
  who: Who;
  /** The text of the body; none at all where it is missing. */
  text?: string;
  headers?: Record<string, string>;
}

let company: Company;
let base: string;
let stop: () => void;
let cookies: Record<Who, string>;
let drafts: WorksheetRecord[];
let running: WorksheetRecord;
let victim: string;
const versions = new Map<string, number>();
const accepted = new Set<string>();

beforeAll(async () => {
  company = await buildCompany();
  const server = createServer(company.app);
  await new Promise<void>((resolve) => server.listen(0, '127.0.0.1', () => resolve()));
  base = `http://127.0.0.1:${(server.address() as AddressInfo).port}`;
  stop = () => {
    server.close();
    server.closeAllConnections();
  };
  cookies = {
    lead: await cookieOf(base, company.lead.user),
    helper: await cookieOf(base, company.helper.user),
    supervisor: await cookieOf(base, company.supervisor.user),
    safety: await cookieOf(base, company.safety.user),
  };
  drafts = [];
  for (let count = 0; count < 30; count += 1) drafts.push(await create(company));
  for (const { id, version } of drafts) versions.set(id, version);
  running = await toInForce(company);
  victim = (await buildUser({ role: 'helper', sites: [company.site] })).id;
});
afterAll(async () => {
  stop();
  await stopPdfWorkers();
});

const json = (value: unknown): string => JSON.stringify(value) ?? '';
/** Ids that the register knows: any other is refused before it is looked at further. */
const known = () => ({
  siteId: [company.site.id],
  userId: [company.lead.user.id, company.helper.user.id, company.helper2.user.id],
});
const content = () =>
  fc.oneof(
    { weight: 8, arbitrary: arbitraryOf(worksheetContentSchema, known()) },
    { weight: 8, arbitrary: mutated(contentFor(company)) },
    { weight: 1, arbitrary: anyJson },
  );
const { proof, closeOut } = soundWorksheet();

const assessment = () =>
  fc
    .record(
      {
        content: content(),
        stage: fc.constantFrom('plan', 'work', 'close-out'),
        proof: fc.oneof(mutated(proof), arbitraryOf(proofSchema)),
        closeOut: fc.oneof(mutated(closeOut), arbitraryOf(closeOutSchema)),
      },
      { requiredKeys: ['content'] },
    )
    .map((body): Request => ({
      method: 'POST',
      path: '/assessments',
      who: 'lead',
      text: json(body),
    }));

const creation = () =>
  content().map((value): Request => ({
    method: 'POST',
    path: '/worksheets',
    who: 'lead',
    text: json({ content: value }),
  }));

const save = () =>
  fc.tuple(fc.nat(29), content()).map(([index, value]): Request => {
    const id = drafts[index]?.id ?? '';
    return {
      method: 'PUT',
      path: `/worksheets/${id}`,
      who: 'lead',
      text: json({ content: value }),
    };
  });

/** A right body of each route that takes one, to be spoiled; of the others anything will do. */
function soundBodies(): Record<string, unknown> {
  const user = company.helper.user.id;
  const { id: siteId } = company.site;
  const at = '2026-12-01T09:00:00-06:00';
  return {
    // Not the right password: a sign-in would end the session that asks.
    'POST /session': { email: company.helper2.user.email, password: 'not the password' },
    'PATCH /session': { locale: 'es-MX', units: 'metric', theme: 'dark' },
    'POST /session/password': { current: 'wrong', password: 'seven quiet heron ladders' },
    'POST /session/pin': { password: 'wrong', pin: PIN },
    'POST /password-resets': { email: 'nobody@company.example' },
    'POST /password-resets/{token}': { password: 'seven quiet heron ladders', pin: PIN },
    'POST /devices': {
      ...{ id: v7(), label: 'Phone', pin: PIN },
      publicKey: { kty: 'EC', crv: 'P-256', x: 'a'.repeat(43), y: 'b'.repeat(43) },
    },
    'POST /worksheets': { id: v7(), content: { notes: 'x' }, leadId: user },
    'PUT /worksheets/{worksheetId}': { content: { notes: 'x' } },
    'POST /worksheets/{worksheetId}/signatures': {
      ...{ id: v7(), meaning: 'prepared', signerId: company.lead.user.id, pin: PIN },
      ...{ strokes: STROKES, contentHash: '0'.repeat(64), signedAt: at },
    },
    'POST /worksheets/{worksheetId}/proofs': { id: v7(), proof, pin: PIN },
    'POST /worksheets/{worksheetId}/questions': { id: v7(), text: 'Which door?' },
    'POST /worksheets/{worksheetId}/close': { closeOut, pin: PIN },
    'POST /worksheets/{worksheetId}/copy': { id: v7() },
    'POST /users': {
      ...{ id: v7(), name: 'Ivo Lund', email: 'ivo@company.example', role: 'helper' },
      ...{ siteIds: [siteId], qualifiedThrough: '2030-01-01', locale: 'en-US', units: 'feet' },
    },
    'PATCH /users/{id}': { name: 'Ivo Lund', qualifiedThrough: '2030-01-01', siteIds: [siteId] },
    'POST /sites': { id: v7(), name: 'Pier Hall', timeZone: 'America/Chicago', address: '1 Pier' },
    'PATCH /sites/{id}': { name: 'Pier Hall', timeZone: 'America/Denver' },
    'POST /rubber-goods': {
      ...{
        id: v7(),
        siteId,
        kind: 'gloves',
        gloveClass: '0',
        serial: 'Q-1',
        issuedOn: '2026-09-15',
      },
      tests: [{ testedOn: '2026-09-01', passed: true }],
    },
    'PATCH /rubber-goods/{id}': {
      serial: 'Q-2',
      tests: [{ testedOn: '2026-09-01', passed: true }],
    },
    'POST /users/import': { csv: 'name,email,role\nIvo,ivo@company.example,helper', confirm: true },
    'POST /rubber-goods/import': { csv: 'site,kind,serial\nPier Hall,gloves,Q-3', confirm: true },
    'POST /assessments': { content: contentFor(company), stage: 'plan', proof, closeOut },
  };
}

/** These would end the sessions that the test speaks with. */
const KEPT_OUT = new Set(['DELETE /session', 'DELETE /sessions', 'DELETE /sessions/{sessionId}']);
/** Typesetting is tested on a sample of what was accepted. */
const SLOW = /\/pdf$|export\.zip$/;

const spoiledPath = (path: string) => {
  const names = [...path.matchAll(/\{(\w+)\}/g)].map(([, name = '']) => name);
  const known = (name: string) =>
    name === 'worksheetId' ? fc.constantFrom(running.id, drafts[0]?.id ?? '') : fc.constant(victim);
  return fc
    .tuple(
      ...names.map((name) =>
        fc.oneof(
          { weight: 4, arbitrary: known(name) },
          { weight: 1, arbitrary: fc.uuid() },
          {
            weight: 1,
            arbitrary: fc.constantFrom('%00', '%E0%A4%A', '1', '..', '%2e%2e%2f', '-1'),
          },
          { weight: 1, arbitrary: fc.string({ minLength: 1 }).map(encodeURIComponent) },
        ),
      ),
    )
    .map((values) =>
      names.reduce((text, name, index) => text.replace(`{${name}}`, values[index] ?? ''), path),
    );
};

const query = fc
  .array(
    fc.tuple(
      fc.constantFrom(...'q state siteId system circuitVolts mode person finding'.split(' ')),
      fc.oneof(
        fc.string({ unit: 'binary' }),
        fc.constantFrom('2026-01-01', '1e400', 'draft,void', '('),
      ),
    ),
  )
  .map((pairs) => pairs.map(([key, value]) => `${key}=${encodeURIComponent(wellFormed(value))}`))
  .chain((parts) =>
    fc
      .constantFrom(
        '',
        'cursor=%00',
        'cursor=e30',
        'limit=1e9',
        'limit=2&limit=3',
        'sort=x',
        'q[a]=1',
      )
      .chain((more) =>
        fc
          .constantFrom('', 'from=2026-13-01', 'from=0000-01-01&to=9999-12-31', 'revision=1e9', '%')
          .map((dates) => [...parts, more, dates].filter(Boolean).join('&')),
      ),
  );

function wellFormed(text: string): string {
  return text.replaceAll(/[\ud800-\udfff]/g, '\ufffd');
}

const routed = (route: ApiRoute, sound: unknown) =>
  fc
    .record({
      path: spoiledPath(route.path),
      who: fc.constantFrom<Who>('lead', 'helper', 'supervisor', 'safety'),
      text: fc.oneof(
        { weight: 5, arbitrary: mutated(sound ?? { reason: 'Because.' }).map(json) },
        { weight: 2, arbitrary: anyJson.map(json) },
        { weight: 1, arbitrary: anyBodyText },
      ),
      query,
      address: fc.ipV4(),
      type: fc.oneof(
        { weight: 12, arbitrary: fc.constant('application/json') },
        { weight: 1, arbitrary: fc.constantFrom('multipart/form-data; boundary=x', 'text/plain') },
      ),
    })
    .map((parts): Request => {
      const method = route.method.toUpperCase();
      const headers = { 'X-Forwarded-For': parts.address };
      if (method === 'GET') {
        return { method, path: `${parts.path}?${parts.query}`, who: parts.who, headers };
      }
      return {
        ...{ method, path: parts.path, who: parts.who, text: parts.text },
        headers: { ...headers, 'Content-Type': parts.type },
      };
    });

function anyRoute() {
  const bodies = soundBodies();
  const routes = API_ROUTES.filter(({ method, path }) => {
    const name = `${method.toUpperCase()} ${path}`;
    return !KEPT_OUT.has(name) && !(method === 'get' && SLOW.test(path));
  });
  return fc.oneof(
    ...routes.map((route) => ({
      weight: route.method === 'get' ? 1 : 2,
      arbitrary: routed(route, bodies[`${route.method.toUpperCase()} ${route.path}`]),
    })),
  );
}

const anyRequest = () =>
  fc.oneof(
    { weight: 60, arbitrary: assessment() },
    { weight: 6, arbitrary: creation() },
    { weight: 9, arbitrary: save() },
    { weight: 25, arbitrary: anyRoute() },
  );

function headersOf({ path, method, who, headers }: Request): Record<string, string> {
  const version = versions.get(path.replace('/worksheets/', ''));
  return {
    Cookie: cookies[who],
    'Content-Type': 'application/json',
    ...(method === 'PUT' ? { 'If-Match': `"${version ?? 1}"` } : {}),
    ...headers,
  };
}

const counts: Record<number, number> = {};

/** Sends one request and holds its answer against the contract. */
async function ask(request: Request): Promise<void> {
  const { method, path, text } = request;
  const answer = await fetch(`${base}/api${path}`, {
    method,
    headers: headersOf(request),
    body: text === undefined ? null : text,
    redirect: 'manual',
  });
  const body = await answer.text();
  counts[answer.status] = (counts[answer.status] ?? 0) + 1;
  if (answer.status >= 500) throw new Error(`${method} ${path} answered ${answer.status}: ${body}`);
  if (answer.status >= 400) {
    expect(answer.headers.get('content-type')).toMatch(/^application\/problem\+json/);
    problemSchema.parse(JSON.parse(body));
    return;
  }
  if (!/^\/worksheets(\/[0-9a-f-]{36})?$/.test(path) || method === 'GET') return;
  const { id, version } = JSON.parse(body) as WorksheetRecord;
  accepted.add(id);
  versions.set(id, version);
}

describe(`${REQUESTS.toLocaleString('en')} random requests`, () => {
  it('are each answered without a fault of the server', { timeout: 600_000 }, async () => {
    const batch = fc.array(anyRequest(), { minLength: AT_ONCE, maxLength: AT_ONCE, size: 'max' });
    await fc.assert(
      fc.asyncProperty(batch, async (requests) => {
        await Promise.all(requests.map(ask));
      }),
      { numRuns: REQUESTS / AT_ONCE, endOnFailure: process.env['SHRINK'] === undefined },
    );
    if (process.env['SHOW_COUNTS'] !== undefined) console.log(counts, accepted.size);
    // Neither all refused nor all accepted: both ways were walked.
    expect(counts[200]).toBeGreaterThan(REQUESTS / 10);
    expect(counts[422]).toBeGreaterThan(REQUESTS / 10);
    expect(accepted.size).toBeGreaterThan(100);
    // The sessions of the test lasted to the end.
    expect(counts[401] ?? 0).toBeLessThan(REQUESTS / 50);
  });

  it('left contents that are read again as they were taken', async () => {
    const ids = [...accepted].slice(-60);
    for (const id of ids) {
      const answer = await fetch(`${base}/api/worksheets/${id}`, {
        headers: { Cookie: cookies.lead },
      });
      expect(answer.status).toBe(200);
      const record = (await answer.json()) as WorksheetRecord;
      const again = await fetch(`${base}/api/worksheets/${id}`, {
        method: 'PUT',
        headers: { Cookie: cookies.lead, 'If-Match': '"0"', 'Content-Type': 'application/json' },
        body: JSON.stringify({ content: record.content }),
      });
      // The same content is a repeat, whatever version it names: what came out is what went in.
      expect([id, again.status]).toEqual([id, 200]);
    }
  });

  it('left contents that can be printed', async () => {
    const rows = await Worksheet.findAll({ where: { id: [...accepted].slice(0, 40) } });
    for (const [index, row] of rows.entries()) {
      const input = await pdfInput(row, row.revision);
      documentDefinition(input, 'en');
      documentDefinition(input, 'es');
      if (index < 3) {
        const bytes = await renderWorksheetPdf(input, index % 2 === 0 ? 'en' : 'es');
        expect(bytes.subarray(0, 5).toString()).toBe('%PDF-');
      }
    }
  });

  it('left a record in which nothing is altered', async () => {
    expect((await verifyRecord()).faults).toEqual([]);
  });
});
