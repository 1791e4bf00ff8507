import { fork } from 'node:child_process';
import { once } from 'node:events';
import path from 'node:path';
import { PASSWORD } from './server';

const CHILD = path.join(import.meta.dirname, 'serverChild.ts');

export interface ServerProcess {
  base: string;
  pid: number;
  /** SIGKILL: no handler runs, nothing is finished. */
  kill: () => Promise<void>;
  /** SIGTERM: requests in flight finish. */
  stop: () => Promise<void>;
  /** Whether it still runs: a crash would end it. */
  isRunning: () => boolean;
}

/** A server in a process of its own, on the database that the environment names, with the worker that sends mail. */
export async function startServerProcess(env: Record<string, string> = {}): Promise<ServerProcess> {
  const child = fork(CHILD, {
    execArgv: ['--import', 'tsx'],
    env: { ...process.env, NODE_ENV: 'development', PORT: '0', ...env },
    stdio: ['ignore', 'inherit', 'inherit', 'ipc'],
  });
  const ended = once(child, 'exit');
  const started = await Promise.race([once(child, 'message'), ended]);
  const [message] = started as [{ port: number } | number];
  if (typeof message !== 'object') throw new Error('The server did not start.');
  const end = async (signal: 'SIGKILL' | 'SIGTERM') => {
    if (child.exitCode === null && child.signalCode === null) child.kill(signal);
    await ended;
  };
  return {
    base: `http://127.0.0.1:${message.port}`,
    pid: child.pid ?? 0,
    kill: () => end('SIGKILL'),
    stop: () => end('SIGTERM'),
    isRunning: () => child.exitCode === null && child.signalCode === null,
  };
}

export interface Answer {
  status: number;
  type: string;
  /** The parsed body of a JSON answer; `null` of any other. */
  body: unknown;
  headers: Headers;
}

interface Sent {
  method?: string;
  cookie?: string;
  body?: unknown;
  headers?: Record<string, string>;
  /** A client that waits no longer than this. */
  milliseconds?: number;
}

/** One request over a real connection. It throws where there is no answer. */
export async function send(
  address: string,
  { method = 'GET', cookie, body, headers = {}, milliseconds = 30_000 }: Sent = {},
): Promise<Answer> {
  const answer = await fetch(address, {
    method,
    headers: {
      ...(body === undefined ? {} : { 'Content-Type': 'application/json' }),
      ...(cookie === undefined ? {} : { Cookie: cookie }),
      ...headers,
    },
    body: body === undefined ? null : JSON.stringify(body),
    signal: AbortSignal.timeout(milliseconds),
  });
  const text = await answer.text();
  const type = answer.headers.get('content-type') ?? '';
  const isJson = /^application\/(problem\+)?json/.test(type);
  return {
    status: answer.status,
    type,
    body: isJson ? (JSON.parse(text) as unknown) : null,
    headers: answer.headers,
  };
}

/** Signs in over a real connection and answers the cookie of the session. */
export async function cookieOf(
  base: string,
  person: { email: string },
  password = PASSWORD,
): Promise<string> {
  const { status, headers } = await send(`${base}/api/session`, {
    method: 'POST',
    body: { email: person.email, password },
  });
  const cookie = headers.get('set-cookie')?.split(';')[0];
  if (status !== 201 || cookie === undefined) throw new Error(`Sign-in answered ${status}`);
  return cookie;
}
