import { execFile } from 'node:child_process';
import { mkdir, mkdtemp, readdir, readFile, rm, writeFile } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import path from 'node:path';
import { promisify } from 'node:util';
import pg from 'pg';
import { getObject, listObjects, putObject } from '../storage';
import { StartFault } from './environment';
import { stream } from './postgresTools';

const run = promisify(execFile);
const DUMP = 'database.dump';
const FILES = 'files';

/** Runs `work` with a folder that nobody else can read and that goes away after it. */
async function withFolder(work: (folder: string) => Promise<void>): Promise<void> {
  const folder = await mkdtemp(path.join(tmpdir(), 'wideberth-archive-'));
  try {
    await work(folder);
  } finally {
    await rm(folder, { recursive: true, force: true });
  }
}

/** Keeps the password off the command line, where every user of the machine could read it. */
function connection(url: string): { args: string[]; env: Record<string, string> } {
  const { username, password, hostname, port, pathname } = new URL(url);
  const database = decodeURIComponent(pathname.slice(1));
  return {
    args: [
      '-h',
      hostname,
      '-p',
      port || '5432',
      '-U',
      decodeURIComponent(username),
      '-d',
      database,
    ],
    env: { PGPASSWORD: decodeURIComponent(password) },
  };
}

/** Writes the database, as it is at one instant, and every attachment into one tar file. */
export async function backUp(ownerUrl: string, file: string): Promise<void> {
  await withFolder(async (folder) => {
    const { args, env } = connection(ownerUrl);
    await stream('pg_dump', [...args, '-Fc', '-f', path.join(folder, DUMP)], env);
    // After the dump: a file is written before the row that names it.
    for await (const key of listObjects()) {
      const bytes = await getObject(key);
      if (bytes === null) continue;
      const target = path.join(folder, FILES, key);
      await mkdir(path.dirname(target), { recursive: true });
      await writeFile(target, bytes);
    }
    await mkdir(path.join(folder, FILES), { recursive: true });
    // A person's umask must not open a copy of everything to others.
    await writeFile(file, '', { mode: 0o600 });
    await run('tar', ['-C', folder, '-cf', file, DUMP, FILES]);
  });
}

/** Brings a backup into a database that is empty, holds nothing but the demo, or may be replaced. */
export async function restore(
  ownerUrl: string,
  file: string,
  { replace = false } = {},
): Promise<void> {
  if (!replace && (await holdsRecords(ownerUrl))) {
    throw new StartFault(
      'The database is not empty. To lose what it holds: db:restore -- FILE --replace',
    );
  }
  await withFolder(async (folder) => {
    await run('tar', ['-C', folder, '-xf', file]);
    await emptyDatabase(ownerUrl);
    const { args, env } = connection(ownerUrl);
    const dump = path.join(folder, DUMP);
    await stream('pg_restore', [...args, '--no-owner', '--exit-on-error', dump], env);
    const files = path.join(folder, FILES);
    for (const entry of await readdir(files, { recursive: true, withFileTypes: true })) {
      if (!entry.isFile()) continue;
      const name = path.join(entry.parentPath, entry.name);
      const key = path.relative(files, name);
      await putObject(key, await readFile(name), 'application/octet-stream');
    }
  });
}

async function withOwner<T>(url: string, work: (client: pg.Client) => Promise<T>): Promise<T> {
  const client = new pg.Client({ connectionString: url });
  await client.connect();
  try {
    return await work(client);
  } finally {
    await client.end();
  }
}

/** Whether somebody who is no demo person has an account. */
function holdsRecords(ownerUrl: string): Promise<boolean> {
  return withOwner(ownerUrl, async (client) => {
    const { rows } = await client.query<{ known: boolean }>(
      "SELECT to_regclass('public.users') IS NOT NULL AS known",
    );
    if (rows[0]?.known !== true) return false;
    const people = await client.query('SELECT 1 FROM users WHERE NOT demo LIMIT 1');
    return people.rowCount !== 0;
  });
}

/** Everything that the owner owns in this database; the schema `public` itself stays. */
async function emptyDatabase(ownerUrl: string): Promise<void> {
  await withOwner(ownerUrl, (client) =>
    client.query("SET lock_timeout = '30s'; DROP OWNED BY CURRENT_USER CASCADE"),
  );
}
