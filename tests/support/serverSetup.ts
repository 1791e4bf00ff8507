import { mkdtempSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import path from 'node:path';
import { afterAll, inject } from 'vitest';
import { createTestDatabase } from './database';

/* Runs before each server test file is imported: `server/env.ts` reads the environment once. */

const database = await createTestDatabase(inject('cluster'));
const files = mkdtempSync(path.join(tmpdir(), 'wideberth-files-'));

Object.assign(process.env, {
  NODE_ENV: 'test',
  HOST: '127.0.0.1',
  PORT: '0',
  DATABASE_URL: database.runtimeUrl,
  DATABASE_OWNER_URL: database.ownerUrl,
  SESSION_SECRET: 'only for tests, and long enough for them',
  LOG_LEVEL: process.env['LOG_LEVEL'] ?? 'silent',
  ARGON2_MEMORY_KIB: '8',
  ARGON2_PASSES: '1',
  // One proxy, so that a test can come from many addresses.
  TRUST_PROXY: '1',
});

const { startSmtpFake } = await import('@/server/fakes/smtp');
const { startS3Fake } = await import('@/server/fakes/s3');
const smtp = await startSmtpFake();
const s3 = await startS3Fake(files);
Object.assign(process.env, { SMTP_URL: smtp.url, S3_ENDPOINT: s3.url });

/** What the fake mail server got in this file. */
export const mails = smtp.mails;
(globalThis as { receivedMails?: typeof mails }).receivedMails = mails;
(globalThis as { storageFolder?: string }).storageFolder = files;

afterAll(async () => {
  const { closeDatabase } = await import('@/server/db');
  const { stopBoss } = await import('@/server/jobs');
  await stopBoss();
  await closeDatabase();
  await Promise.all([smtp.stop(), s3.stop()]);
  await database.drop();
  rmSync(files, { recursive: true, force: true });
});
