import { parse as parseCsv } from 'csv-parse/sync';
import { QueryTypes } from 'sequelize';
import { beforeAll, beforeEach, expect, it } from 'vitest';
import { clock } from '@/server/clock';
import { sequelize } from '@/server/db';
import { withExportLock } from '@/server/services/exportLock';
import { NOW, buildCompany, create } from '../support/record';
import type { Company } from '../support/record';

let company: Company;
beforeAll(async () => {
  company = await buildCompany();
});
beforeEach(() => clock.set(NOW));

/** Rows like this worksheet's, numbered on from the highest that can be. */
async function multiply(worksheetId: string, count: number): Promise<void> {
  const columns = await sequelize.query<{ name: string }>(
    `SELECT column_name AS name FROM information_schema.columns
      WHERE table_name = 'worksheets' AND is_generated = 'NEVER' AND table_schema = 'public'`,
    { type: QueryTypes.SELECT },
  );
  const names = columns.map(({ name }) => name);
  const own: Record<string, string> = {
    id: 'gen_random_uuid()',
    number: `'2026-9' || lpad(n::text, 5, '0')`,
  };
  await sequelize.query(
    `INSERT INTO worksheets (${names.join(', ')})
     SELECT ${names.map((name) => own[name] ?? name).join(', ')}
       FROM worksheets, generate_series(1, $count) n WHERE id = $worksheetId`,
    { bind: { worksheetId, count } },
  );
}

it('a ZIP holds at most 500 PDFs: more is 409 before anything is sent', async () => {
  const area = 'Manifoldhall';
  const record = await create(company, { job: { siteId: company.site.id, area } });
  await multiply(record.id, 500);
  const answer = await company.safety.agent.get('/api/worksheets/export.zip').query({ q: area });
  expect([answer.status, answer.body.type]).toEqual([409, '/problems/conflict']);
  expect(answer.headers['content-disposition']).toBeUndefined();
  const csv = await company.safety.agent.get('/api/worksheets/export.csv').query({ q: area });
  expect(parseCsv(csv.text, { bom: true })).toHaveLength(502);
});

it('one export runs at a time a person, of either kind; another person’s goes on', async () => {
  const path = '/api/worksheets/export.csv';
  await withExportLock(company.safety.user.id, async () => {
    const busy = await company.safety.agent.get(path);
    expect([busy.status, busy.body.type]).toEqual([429, '/problems/too-many-requests']);
    expect(busy.headers['retry-after']).toBe('30');
  });
  await withExportLock(company.lead.user.id, async () => {
    expect((await company.safety.agent.get(path)).status).toBe(200);
  });
  expect((await company.safety.agent.get(path)).status).toBe(200);
});

// "A cell that begins with = + - @, tab or CR is prefixed with '."
it.each(['=1+1', '+1', '-1', '@SUM(A1)', '\t=1', '\r=1', '=HYPERLINK("//x","y")'])(
  'a cell that begins like %j runs in no spreadsheet',
  async (area) => {
    const { number } = await create(company, { job: { siteId: company.site.id, area } });
    const { text } = await company.safety.agent
      .get('/api/worksheets/export.csv')
      .query({ q: number });
    const [row]: Record<string, string>[] = parseCsv(text, {
      bom: true,
      columns: true,
      record_delimiter: '\r\n',
    });
    expect(row).toMatchObject({ number, area: `'${area}` });
  },
);

it('a cell that holds such a sign further on, or quotes and lines, stays as it was written', async () => {
  const area = 'Hall 3 = "east", row\n-A';
  const { number } = await create(company, { job: { siteId: company.site.id, area } });
  const { text } = await company.safety.agent
    .get('/api/worksheets/export.csv')
    .query({ q: number });
  const [row]: Record<string, string>[] = parseCsv(text, {
    bom: true,
    columns: true,
    record_delimiter: '\r\n',
  });
  expect(row).toMatchObject({ number, area });
});
