import { execFile } from 'node:child_process';
import path from 'node:path';
import { promisify } from 'node:util';
import { afterAll, beforeAll, expect, inject, it } from 'vitest';
import { postgresFolder } from '@/server/commands/postgresTools';
import { migrateDown, migrateDownTo, migrateUp } from '@/server/migrate';
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

it('keeps old doubles of a serial as they are, and takes no new ones', async () => {
  const target = '20261201120000-make-serials-unique';
  await migrateDownTo(urls, target);
  await withClient(database.ownerUrl, async (client) => {
    const site = '0190b5a4-0000-7000-8000-0000000000a1';
    await client.query(
      `INSERT INTO sites (id, name, time_zone, created_at, updated_at)
       VALUES ('${site}', 'Orrin Street', 'America/Chicago', now(), now())`,
    );
    const add = (serial: string) =>
      client.query(
        `INSERT INTO rubber_goods (id, site_id, kind, glove_class, serial, created_at, updated_at)
         VALUES (gen_random_uuid(), '${site}', 'gloves', '0', $1, now(), now())`,
        [serial],
      );
    for (const serial of ['RG-1', 'rg-1', ' RG-1 ', 'RG-2']) await add(serial);
    await migrateUp(urls);
    const { rows } = await client.query<{ serial: string; serial_repeats: boolean }>(
      'SELECT serial, serial_repeats FROM rubber_goods',
    );
    expect(rows.map(({ serial }) => serial).sort()).toEqual([' RG-1 ', 'RG-1', 'RG-2', 'rg-1']);
    expect(rows.filter((row) => row.serial_repeats)).toHaveLength(2);
    // As the release before writes it: it knows nothing of the new column.
    for (const serial of ['RG-1', 'rg-2']) {
      await expect(add(serial)).rejects.toMatchObject({ constraint: 'rubber_goods_serial_key' });
    }
    await client.query('DELETE FROM rubber_goods; DELETE FROM sites');
  });
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
