import { mkdtemp, rm, stat } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import path from 'node:path';
import { afterAll, beforeAll, expect, inject, it } from 'vitest';
import { backUp, restore } from '@/server/commands/archive';
import { env } from '@/server/env';
import { deleteObject, getObject, putObject } from '@/server/storage';
import { createTestDatabase, withClient } from '../support/database';
import { buildSite, buildUser } from '../support/server';

const ownerUrl = env.DATABASE_OWNER_URL ?? '';
let folder: string;
let target: Awaited<ReturnType<typeof createTestDatabase>>;

beforeAll(async () => {
  folder = await mkdtemp(path.join(tmpdir(), 'wideberth-backup-'));
  target = await createTestDatabase(inject('cluster'), { empty: true });
});
afterAll(async () => {
  await target.drop();
  await rm(folder, { recursive: true, force: true });
});

it('brings back rows, rights, triggers and files', async () => {
  const person = await buildUser({ sites: [await buildSite()] });
  await putObject('photos/one', Buffer.from('bytes of a photo'), 'image/jpeg');
  const file = path.join(folder, 'backup.tar');
  await backUp(ownerUrl, file);
  expect((await stat(file)).mode & 0o077).toBe(0);
  await deleteObject('photos/one');

  await restore(target.ownerUrl, file);
  expect((await getObject('photos/one'))?.toString()).toBe('bytes of a photo');
  await withClient(target.runtimeUrl, async (client) => {
    const { rows } = await client.query('SELECT email FROM users WHERE id = $1', [person.id]);
    expect(rows).toEqual([{ email: person.email }]);
    await expect(client.query('DELETE FROM events')).rejects.toMatchObject({ code: '42501' });
  });
});

it('does not overwrite records unless told so', async () => {
  await buildUser();
  const file = path.join(folder, 'again.tar');
  await backUp(ownerUrl, file);
  await expect(restore(ownerUrl, file)).rejects.toThrow(/not empty/);
  await restore(target.ownerUrl, file, { replace: true });
});
