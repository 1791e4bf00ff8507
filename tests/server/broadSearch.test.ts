import { QueryTypes } from 'sequelize';
import { beforeAll, beforeEach, expect, it } from 'vitest';
import { z } from 'zod';
import { listSchema, worksheetRowSchema } from '@/shared/record';
import { clock } from '@/server/clock';
import { sequelize } from '@/server/db';
import { NOW, buildCompany, contentFor, create } from '../support/record';
import type { Company } from '../support/record';

/** More than are looked up one by one. */
const COPIES = 1050;

let company: Company;

beforeAll(async () => {
  company = await buildCompany();
  const content = contentFor(company);
  const original = await create(company, {
    ...content,
    job: { ...content.job, area: 'Quayside arcade' },
  });
  await create(company, { ...content, job: { ...content.job, area: 'Quayside boiler room' } });
  const columns = await sequelize.query<{ name: string }>(
    `SELECT quote_ident(column_name) AS name FROM information_schema.columns
      WHERE table_name = 'worksheets' AND is_generated = 'NEVER'`,
    { type: QueryTypes.SELECT },
  );
  const names = columns.map(({ name }) => name);
  const values = names.map((name) =>
    name === 'id'
      ? 'gen_random_uuid()'
      : name === 'number'
        ? `'2019-' || lpad(copy::text, 6, '0')`
        : name === 'created_at'
          ? `created_at - copy * interval '1 minute'`
          : name,
  );
  await sequelize.query(
    `INSERT INTO worksheets (${names.join(', ')})
     SELECT ${values.join(', ')} FROM worksheets, generate_series(1, :copies) AS copy WHERE id = :id`,
    { replacements: { copies: COPIES, id: original.id } },
  );
});
beforeEach(() => clock.set(NOW));

const pageSchema = listSchema(worksheetRowSchema).extend({ nextCursor: z.string().nullable() });

async function allOf(query: object): Promise<string[]> {
  const ids: string[] = [];
  let cursor: string | null = null;
  do {
    const answer = await company.safety.agent
      .get('/api/worksheets')
      .query({ ...query, limit: 200, ...(cursor === null ? {} : { cursor }) });
    expect(answer.status).toBe(200);
    const page = pageSchema.parse(answer.body);
    ids.push(...page.items.map(({ id }) => id));
    cursor = page.nextCursor;
  } while (cursor !== null);
  return ids;
}

it('finds more than a thousand, each once, a page at a time', async () => {
  const ids = await allOf({ q: 'quays' });
  expect(ids).toHaveLength(COPIES + 2);
  expect(new Set(ids).size).toBe(ids.length);
});

it('finds the one that has a word alone, and heeds the other filters', async () => {
  expect(await allOf({ q: 'quayside boiler' })).toHaveLength(1);
  expect(await allOf({ q: 'quayside boiler', state: 'draft' })).toHaveLength(1);
  expect(await allOf({ q: 'quayside boiler', state: 'void' })).toEqual([]);
  expect(await allOf({ q: 'quayside', state: 'void' })).toEqual([]);
});
