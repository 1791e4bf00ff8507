import { afterAll, beforeAll, beforeEach, expect, it } from 'vitest';
import { clock } from '@/server/clock';
import { stopPdfWorkers } from '@/server/pdf/renderWorksheetPdf';
import { withExportLock } from '@/server/services/exportLock';
import { NOW, act, buildCompany, prove, read, toCountersign, toInForce } from '../support/record';
import type { Company, Person } from '../support/record';

let company: Company;
beforeAll(async () => {
  company = await buildCompany();
});
beforeEach(() => clock.set(NOW));
afterAll(stopPdfWorkers);

function pdf(person: Person, id: string, query: object = {}) {
  return person.agent.get(`/api/worksheets/${id}/pdf`).query(query).buffer(true);
}

it('prints the same bytes for everyone until something is recorded', async () => {
  const record = await toInForce(company);
  const first = await pdf(company.lead, record.id);
  expect(first.status).toBe(200);
  expect(first.headers['content-type']).toBe('application/pdf');
  const bytes = first.body as Buffer;
  expect(bytes.subarray(0, 5).toString()).toBe('%PDF-');
  clock.advance(60_000);
  const again = await pdf(company.supervisor, record.id, { language: 'en', revision: 1 });
  expect(bytes.equals(again.body as Buffer)).toBe(true);
  const spanish = await pdf(company.lead, record.id, { language: 'es' });
  expect(bytes.equals(spanish.body as Buffer)).toBe(false);
  await prove(company, record);
  const proved = await pdf(company.lead, record.id);
  expect(bytes.equals(proved.body as Buffer)).toBe(false);
}, 120_000);

it('prints an earlier revision as it was left, and nothing that is not there', async () => {
  const record = await toCountersign(company);
  await act(company.supervisor, record, 'return', { reason: 'Not so.' });
  await act(company.lead, record, 'revise');
  expect((await pdf(company.lead, record.id, { revision: 1 })).status).toBe(200);
  expect((await pdf(company.lead, record.id)).status).toBe(200);
  expect((await pdf(company.lead, record.id, { revision: 3 })).status).toBe(404);
  expect((await pdf(company.lead, record.id, { language: 'fr' })).status).toBe(422);
  expect((await pdf(company.stranger, record.id)).status).toBe(404);
}, 120_000);

it('puts one PDF a worksheet into a ZIP, for safety, one at a time', async () => {
  const record = await read(company.safety, (await toInForce(company)).id);
  const get = () =>
    company.safety.agent
      .get('/api/worksheets/export.zip')
      .query({ q: record.number })
      .buffer(true)
      .parse((res, done) => {
        const chunks: Buffer[] = [];
        res.on('data', (chunk: Buffer) => chunks.push(chunk));
        res.on('end', () => done(null, Buffer.concat(chunks)));
      });
  const answer = await get();
  expect(answer.status).toBe(200);
  const zip = answer.body as Buffer;
  expect(zip.subarray(0, 2).toString()).toBe('PK');
  expect(zip.includes(`${record.number}-r1.pdf`)).toBe(true);
  await withExportLock(company.safety.user.id, async () => {
    const busy = await get();
    expect(busy.status).toBe(429);
  });
}, 120_000);
