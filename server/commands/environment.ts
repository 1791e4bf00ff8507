import { randomBytes } from 'node:crypto';
import { existsSync, mkdirSync, readFileSync, writeFileSync } from 'node:fs';
import path from 'node:path';
import { DATA } from '../paths';
import { ensureCluster, runningCluster, urlOf } from './cluster';
import type { Cluster } from './cluster';

/** A fault that a person can mend: printed as one line, without a stack. */
export class StartFault extends Error {}

const isProduction = () => process.env['NODE_ENV'] === 'production';

/** In production nothing is made up: the start stops at what is missing. */
export function requireProductionSettings(): void {
  if (!isProduction()) return;
  for (const name of ['SESSION_SECRET', 'PUBLIC_URL', 'DATABASE_URL', 'SMTP_URL'] as const) {
    if (!process.env[name]) throw new StartFault(`NODE_ENV=production needs ${name}.`);
  }
}

/** Outside production the secret of the session cookies is random, and only its owner can read it. */
export function provideSessionSecret(): void {
  if (process.env['SESSION_SECRET']) return;
  mkdirSync(DATA, { recursive: true });
  const file = path.join(DATA, 'session-secret');
  if (!existsSync(file)) writeFileSync(file, randomBytes(32).toString('hex'), { mode: 0o600 });
  process.env['SESSION_SECRET'] = readFileSync(file, 'utf8').trim();
}

/** Sets the two connection strings; answers the cluster that was brought up for it, if one was. */
export async function provideDatabase(): Promise<Cluster | null> {
  if (process.env['DATABASE_URL']) return null;
  const { cluster, started } = await ensureCluster();
  pointAt(cluster);
  return started ? cluster : null;
}

function pointAt(cluster: Cluster): void {
  process.env['DATABASE_URL'] = urlOf(cluster, 'runtime');
  process.env['DATABASE_OWNER_URL'] = urlOf(cluster, 'owner');
}

/**
 * For commands beside the server: the database that the environment names,
 * else this checkout's cluster, started for the time of the command.
 */
export async function withDatabase(work: () => Promise<void>): Promise<void> {
  provideSessionSecret();
  const started = await provideDatabase();
  try {
    await work();
  } finally {
    if (started !== null) {
      const { stopCluster } = await import('./cluster');
      await stopCluster(started.folder);
    }
  }
}

/** The owner's connection string of the database in use, or of the running cluster. */
export async function ownerUrl(): Promise<string | null> {
  const given = process.env['DATABASE_OWNER_URL'];
  if (given) return given;
  const cluster = await runningCluster();
  return cluster === null ? null : urlOf(cluster, 'owner');
}

/** Runs a command: a fault that a person can mend is one line, any other keeps its stack. */
export function command(work: () => Promise<void>): void {
  work().catch((error: unknown) => {
    console.error(error instanceof StartFault ? error.message : error);
    process.exitCode = 1;
  });
}
