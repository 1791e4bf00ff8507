import { execFile } from 'node:child_process';
import path from 'node:path';
import { promisify } from 'node:util';
import { afterAll, beforeAll, expect, inject, it } from 'vitest';
import { postgresFolder } from '@/server/commands/postgresTools';
import { migrateDown, migrateUp } from '@/server/migrate';
import { createTestDatabase, withClient } from '../support/database';

const run = promisify(execFile);
let database: Awaited<ReturnType<typeof createTestDatabase>>;
let urls: { ownerUrl: string; runtimeUrl: string };

beforeAll(async () => {
  database = await createTestDatabase(inject('cluster'), { empty: true });
  const { ownerUrl, runtimeUrl } = database;
  urls = { ownerUrl, runtimeUrl };
});
afterAll(() => database.drop());

async function schema(): Promise<string> {
  const { stdout } = await run(
    path.join(postgresFolder(), 'pg_dump'),
    ['--schema-only', '-T', 'schema_migrations', '--dbname', database.ownerUrl],
    { maxBuffer: 50_000_000 },
  );
  // Newer versions of pg_dump guard each dump with a random word.
  return stdout.replaceAll(/^\\(un)?restrict .*$/gm, '');
}

it('goes up, down to nothing, and up to the same schema', async () => {
  const names = await migrateUp(urls);
  expect(names.length).toBeGreaterThan(3);
  const first = await schema();
  expect(await migrateDown(urls)).toEqual([...names].reverse());
  const { rows } = await withClient(database.ownerUrl, (client) =>
    client.query<{ relname: string }>(
      `SELECT relname FROM pg_class c JOIN pg_namespace n ON n.oid = c.relnamespace
        WHERE nspname IN ('public', 'pgboss') AND relkind IN ('r', 'S', 'v')`,
    ),
  );
  expect(rows.map(({ relname }) => relname)).toEqual(['schema_migrations']);
  await migrateUp(urls);
  expect(await schema()).toBe(first);
});

it('runs once when two processes migrate at once', async () => {
  await migrateDown(urls);
  const [one, other] = await Promise.all([migrateUp(urls), migrateUp(urls)]);
  expect([one.length, other.length].sort((a, b) => a - b)[0]).toBe(0);
  expect(await migrateUp(urls)).toEqual([]);
});

it('leaves the runtime role nothing of its own', async () => {
  const attempts = [
    'CREATE TABLE mine (id integer)',
    'DROP TABLE users',
    'ALTER TABLE users ADD COLUMN mine text',
    'TRUNCATE events',
    'ALTER TABLE events DISABLE TRIGGER ALL',
  ];
  await withClient(database.runtimeUrl, async (client) => {
    for (const attempt of attempts) {
      await expect(client.query(attempt), attempt).rejects.toMatchObject({ code: '42501' });
    }
  });
});
