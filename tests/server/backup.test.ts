import { execFile } from 'node:child_process';
import { mkdtemp, rm, stat } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import path from 'node:path';
import { promisify } from 'node:util';
import sharp from 'sharp';
import { afterAll, beforeAll, expect, inject, it } from 'vitest';
import { backUp, restore } from '@/server/commands/archive';
import { urlOf } from '@/server/commands/cluster';
import { clock } from '@/server/clock';
import { env } from '@/server/env';
import { startS3Fake } from '@/server/fakes/s3';
import { sealEvents } from '@/server/services/sealEvents';
import { deleteObject, getObject, putObject } from '@/server/storage';
import { createTestDatabase, startTestCluster, withClient } from '../support/database';
import { buildCompany, create, read, sign } from '../support/record';
import { buildSite, buildUser } from '../support/server';

const ownerUrl = env.DATABASE_OWNER_URL ?? '';
/** Runs a command of ours as a person would, on another database. */
async function runTsx(command: string, args: string[], other: Record<string, string>) {
  const tsx = ['--import', 'tsx', command, ...args];
  const { stdout } = await promisify(execFile)(process.execPath, tsx, {
    env: { ...process.env, ...other },
  });
  return stdout;
}

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

it('brings a whole record into an empty cluster, where it is found unaltered', async () => {
  const company = await buildCompany();
  const draft = await create(company);
  const picture = await sharp({
    create: { width: 64, height: 48, channels: 3, background: '#806040' },
  })
    .png()
    .toBuffer();
  const photo = await company.lead.agent
    .post(`/api/worksheets/${draft.id}/attachments`)
    .field('section', 'sources')
    .field('caption', 'The lock on LA-1.')
    .attach('file', picture, 'lock.png');
  expect(photo.status).toBe(201);
  const briefing = await sign(await read(company.lead, draft.id), 'prepared', company.lead);
  await sign(briefing, 'acknowledged', company.helper);
  clock.advance(3_600_000);
  const seal = await sealEvents();
  const file = path.join(folder, 'record.tar');
  await backUp(ownerUrl, file);

  const { cluster, stop } = await startTestCluster();
  const files = await startS3Fake(path.join(folder, 'other-files'));
  try {
    // Another machine: its roles and its database are new, and it has none of the files.
    const owner = urlOf(cluster, 'owner');
    const other = { DATABASE_URL: urlOf(cluster, 'runtime'), DATABASE_OWNER_URL: owner };
    await runTsx('server/commands/dbRestore.ts', [file], { ...other, S3_ENDPOINT: files.url });
    const checks = { ...other, S3_ENDPOINT: files.url };
    const said = await runTsx('server/commands/verify.ts', ['--seal', seal?.hash ?? ''], checks);
    expect(said).toContain(`Nothing was altered up to seal ${seal?.hash}.`);
    expect(said).toMatch(/worksheets 1, revisions 1, signatures 2, .*photos 1/);
    // The check is one that would have told: without the photo's file it does.
    await rm(path.join(folder, 'other-files', env.S3_BUCKET, 'photos'), { recursive: true });
    await expect(runTsx('server/commands/verify.ts', [], checks)).rejects.toThrow(
      /attachments .*: its file is missing/,
    );
  } finally {
    await files.stop();
    await stop();
  }
});

it('does not overwrite records unless told so', async () => {
  await buildUser();
  const file = path.join(folder, 'again.tar');
  await backUp(ownerUrl, file);
  await expect(restore(ownerUrl, file)).rejects.toThrow(/not empty/);
  await restore(target.ownerUrl, file, { replace: true });
});
