import { execFile, spawn } from 'node:child_process';
import { existsSync, readdirSync } from 'node:fs';
import { createServer } from 'node:net';
import path from 'node:path';
import { promisify } from 'node:util';

const run = promisify(execFile);
const DEBIAN = '/usr/lib/postgresql';

/** PostgreSQL refuses to run as root; Debian's package makes this user for it. */
export const SYSTEM_USER = 'postgres';
export const isRoot = process.getuid?.() === 0;

/** Where the server's programs lie: Debian keeps them by version, others in the PATH. */
export function postgresFolder(): string {
  const versions = existsSync(DEBIAN) ? readdirSync(DEBIAN).map(Number).filter(Boolean) : [];
  const newest = versions.sort((one, other) => other - one)[0];
  const folders = [
    ...(newest === undefined ? [] : [path.join(DEBIAN, String(newest), 'bin')]),
    ...(process.env['PATH'] ?? '').split(':'),
  ];
  const found = folders.find((folder) => existsSync(path.join(folder, 'initdb')));
  if (found === undefined) {
    throw new Error('PostgreSQL is not installed. Install it: apt-get install postgresql');
  }
  return found;
}

/** The command line of a PostgreSQL program, as a user that may run it. */
export function asDatabaseUser(program: string, args: string[]): [string, string[]] {
  const file = program.includes('/') ? program : path.join(postgresFolder(), program);
  return isRoot ? ['runuser', ['-u', SYSTEM_USER, '--', file, ...args]] : [file, args];
}

export async function runTool(
  program: string,
  args: string[],
  env: Record<string, string> = {},
): Promise<string> {
  const [file, argv] = asDatabaseUser(program, args);
  // The folder that the command was called from may be closed to the database's user.
  const { stdout } = await run(file, argv, { cwd: '/', env: { ...process.env, ...env } });
  return stdout;
}

/** True where the database's user can go into the folder. */
export async function databaseUserReaches(folder: string): Promise<boolean> {
  if (!isRoot) return true;
  return runTool('/usr/bin/test', ['-x', folder]).then(
    () => true,
    () => false,
  );
}

/** A port that nobody listens on right now. */
export function freePort(): Promise<number> {
  return new Promise((resolve, reject) => {
    const probe = createServer();
    probe.once('error', reject);
    probe.listen(0, '127.0.0.1', () => {
      const address = probe.address();
      probe.close(() => resolve(typeof address === 'object' && address ? address.port : 0));
    });
  });
}

/** True where something listens on the port of that host. */
export function portIsTaken(port: number, host: string): Promise<boolean> {
  return new Promise((resolve) => {
    const probe = createServer();
    probe.once('error', () => resolve(true));
    probe.listen(port, host, () => probe.close(() => resolve(false)));
  });
}

/** Runs a program of PostgreSQL as the calling user, with its output to the terminal. */
export function stream(
  program: string,
  args: string[],
  env: Record<string, string>,
): Promise<void> {
  return new Promise((resolve, reject) => {
    const child = spawn(path.join(postgresFolder(), program), args, {
      stdio: 'inherit',
      env: { ...process.env, ...env },
    });
    child.once('error', reject);
    child.once('exit', (code) =>
      code === 0 ? resolve() : reject(new Error(`${program} ended with ${code}`)),
    );
  });
}
