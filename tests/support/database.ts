import { spawn } from 'node:child_process';
import { randomUUID } from 'node:crypto';
import { mkdtempSync } from 'node:fs';
import { chmod } from 'node:fs/promises';
import path from 'node:path';
import pg from 'pg';
import {
  createCluster,
  newSecrets,
  OWNER_ROLE,
  prepareDatabase,
  serverOptions,
  urlOf,
  DATABASE,
} from '@/server/commands/cluster';
import type { Cluster } from '@/server/commands/cluster';
import { asDatabaseUser, freePort } from '@/server/commands/postgresTools';

/**
 * A PostgreSQL of the tests' own, thrown away with its data. It runs under a
 * shell that waits on a pipe from this process: when this process ends, however
 * it ends, the pipe closes and the shell takes the server and its folder away.
 * A test may stop and start PostgreSQL on a `durable` one: what was committed stays.
 */
export async function startTestCluster({ durable = false } = {}): Promise<{
  cluster: Cluster;
  stop: () => Promise<void>;
}> {
  // /tmp, not $TMPDIR: the database's user must be able to enter it.
  const parent = mkdtempSync('/tmp/wideberth-test-');
  await chmod(parent, 0o755);
  const folder = path.join(parent, 'postgres');
  const secrets = newSecrets();
  await createCluster(folder, secrets);
  const port = await freePort();
  // The machine itself never fails in a test; a durable cluster outlives its own processes only.
  const unsafe = ['fsync=off', 'full_page_writes=off'];
  if (!durable) unsafe.push('synchronous_commit=off');
  const [file, args] = asDatabaseUser('postgres', [
    ...['-D', folder, ...serverOptions(port)],
    ...unsafe.flatMap((setting) => ['-c', setting]),
    ...['-c', 'max_connections=300', '-c', 'logging_collector=off'],
  ]);
  // SIGQUIT ends PostgreSQL at once: nothing of this data is kept.
  const script = `"$@" >"${parent}/server.log" 2>&1 & server=$!
    cat >/dev/null; running="$(head -n 1 "${folder}/postmaster.pid")"
    kill -QUIT "$running"; wait $server
    while kill -0 "$running" 2>/dev/null; do sleep 0.1; done; rm -rf "${parent}"`;
  const keeper = spawn('sh', ['-c', script, 'sh', file, ...args], {
    stdio: ['pipe', 'ignore', 'inherit'],
    cwd: '/',
    // A signal to the terminal's group must not reach the server before the tests are done with it.
    detached: true,
  });
  const cluster = { folder, port, secrets };
  await untilReady(urlOf(cluster, 'admin', 'postgres'));
  await prepareDatabase(cluster);
  return {
    cluster,
    stop: () =>
      new Promise((resolve) => {
        keeper.once('exit', () => resolve());
        keeper.stdin.end();
      }),
  };
}

async function untilReady(url: string): Promise<void> {
  for (let tries = 0; tries < 300; tries += 1) {
    try {
      return await withClient(url, () => Promise.resolve());
    } catch {
      await new Promise((resolve) => setTimeout(resolve, 100));
    }
  }
  throw new Error('The test database did not start.');
}

/** Runs `work` with one connection. */
export async function withClient<T>(
  url: string,
  work: (client: pg.Client) => Promise<T>,
): Promise<T> {
  const client = new pg.Client({ connectionString: url });
  await client.connect();
  try {
    return await work(client);
  } finally {
    await client.end();
  }
}

/** A new database of a cluster: a copy of the migrated template, or an empty one. */
export async function createTestDatabase(
  cluster: Cluster,
  { empty = false }: { empty?: boolean } = {},
): Promise<{ ownerUrl: string; runtimeUrl: string; drop: () => Promise<void> }> {
  const name = `test_${randomUUID().replaceAll('-', '')}`;
  const admin = urlOf(cluster, 'admin', 'postgres');
  const template = empty ? 'template1' : DATABASE;
  await withClient(admin, (client) =>
    client.query(`CREATE DATABASE ${name} TEMPLATE ${template} OWNER ${OWNER_ROLE}`),
  );
  return {
    ownerUrl: urlOf(cluster, 'owner', name),
    runtimeUrl: urlOf(cluster, 'runtime', name),
    drop: () =>
      withClient(admin, async (client) => {
        await client.query(`DROP DATABASE IF EXISTS ${name} WITH (FORCE)`);
      }),
  };
}
