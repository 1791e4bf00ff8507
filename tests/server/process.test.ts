import { connect } from 'node:net';
import { mkdirSync, readFileSync, rmSync, writeFileSync } from 'node:fs';
import path from 'node:path';
import { afterAll, beforeAll, describe, expect, it, vi } from 'vitest';
import { transact } from '@/server/db';
import { logger } from '@/server/log';
import { startServer } from '@/server/main';
import type { RunningServer } from '@/server/main';
import { queueMail } from '@/server/services/queueMail';
import { deliverMails } from '../support/mail';
import { buildUser, PASSWORD, PIN } from '../support/server';

const HASHED = 'entry-0123456789abcdef0123456789abcdef.js';

// Before any import: the environment is read once.
const { folder, logFile } = await vi.hoisted(async () => {
  const { mkdtempSync } = await import('node:fs');
  const created = mkdtempSync('/tmp/wideberth-process-');
  const log = `${created}/log`;
  Object.assign(process.env, { LOG_LEVEL: 'info', LOG_FILE: log, WEB_FOLDER: `${created}/web` });
  return { folder: created, logFile: log };
});

let server: RunningServer;
let base: string;

beforeAll(async () => {
  const web = path.join(folder, 'web');
  mkdirSync(web);
  writeFileSync(path.join(web, 'index.html'), '<!doctype html><title>App</title>');
  writeFileSync(path.join(web, HASHED), 'plain');
  writeFileSync(path.join(web, `${HASHED}.br`), 'brotli');
  server = await startServer();
  base = `http://127.0.0.1:${server.port}`;
});
afterAll(() => rmSync(folder, { recursive: true, force: true }));

describe('the web app', () => {
  it('answers every address of a route with its page, asked about again each time', async () => {
    for (const address of ['/', '/worksheets/abc', '/reset/token']) {
      const answer = await fetch(`${base}${address}`);
      expect([answer.status, await answer.text()]).toEqual([200, expect.stringMatching(/App/)]);
      expect(answer.headers.get('cache-control')).toBe('no-cache');
    }
  });

  it('keeps a file named by its content, compressed where the browser takes it', async () => {
    const plain = await fetch(`${base}/${HASHED}`, { headers: { 'Accept-Encoding': 'identity' } });
    expect(await plain.text()).toBe('plain');
    expect(plain.headers.get('cache-control')).toBe('public, max-age=31536000, immutable');
    const packed = await fetch(`${base}/${HASHED}`, {
      method: 'HEAD',
      headers: { 'Accept-Encoding': 'br' },
    });
    expect(packed.headers.get('content-encoding')).toBe('br');
    expect(packed.headers.get('content-type')).toMatch(/javascript/);
    expect(packed.headers.get('vary')).toMatch(/Accept-Encoding/);
  });

  it('does not answer a missing file with the page', async () => {
    expect((await fetch(`${base}/missing.js`)).status).toBe(404);
    expect((await fetch(`${base}/..%2f..%2fpackage.json`)).status).not.toBe(200);
  });
});

describe('the log', () => {
  it('has a line a request and no secret', async () => {
    const person = await buildUser();
    const token = 'a-token-that-nobody-should-see';
    const send = (address: string, body: object) =>
      fetch(`${base}/api${address}`, {
        method: 'POST',
        headers: { 'Content-Type': 'application/json' },
        body: JSON.stringify(body),
      });
    const signedIn = await send('/session', { email: person.email, password: PASSWORD });
    const cookie = signedIn.headers.get('set-cookie')?.split(';')[0] ?? '';
    await fetch(`${base}/api/session`, { headers: { Cookie: cookie } });
    await send(`/password-resets/${token}`, { password: 'seven quiet heron ladders', pin: PIN });
    logger.info({ body: { pin: PIN, password: PASSWORD }, headers: { cookie } }, 'by mistake');
    // A line is written after the answer has gone out.
    await expect
      .poll(() => readFileSync(logFile, 'utf8'), { timeout: 10_000 })
      .toContain('password-resets');
    const log = readFileSync(logFile, 'utf8');
    for (const secret of [PASSWORD, PIN, token, person.email, cookie, 'heron']) {
      expect(log).not.toContain(secret);
    }
    const lines = log
      .trim()
      .split('\n')
      .map((line) => JSON.parse(line) as Record<string, unknown>);
    const line = lines.find(({ route, method }) => route === '/api/session/' && method === 'GET');
    expect(line).toMatchObject({ status: 200, userId: person.id });
    expect(line?.['requestId']).toMatch(/^[0-9a-f-]{36}$/);
    expect(typeof line?.['ms']).toBe('number');
    expect(lines.some(({ route }) => route === '/api/password-resets/:token')).toBe(true);
  });
});

describe('the mail conversation', () => {
  it('goes from the queue to the mail server, with a Message-ID that a repeat keeps', async () => {
    const person = await buildUser({ name: 'Zoë Ångström', locale: 'es-MX' });
    const mail = {
      recipient: person,
      about: 'event 42',
      words: () => ({ subject: 'Señal de prueba ✓', body: 'Línea con acento: ñ = n\n.\nfin' }),
      path: '/worksheets/abc',
    };
    await transact(async (transaction) => {
      await queueMail(transaction, mail);
      await queueMail(transaction, mail);
    });
    await expect(
      transact(async (transaction) => {
        await queueMail(transaction, { ...mail, about: 'event 43' });
        throw new Error('rolled back');
      }),
    ).rejects.toThrow('rolled back');
    const toPerson = async () =>
      (await deliverMails()).filter(({ to }) => to.includes(person.email));
    await expect.poll(async () => (await toPerson()).length, { timeout: 20_000 }).toBe(2);
    const [first, second] = await toPerson();
    expect(first?.subject).toBe('Señal de prueba ✓');
    expect(first?.text.replaceAll('\r\n', '\n')).toContain('Línea con acento: ñ = n\n.\nfin');
    expect(first?.text).toContain(`${base}/worksheets/abc`);
    expect(first?.text).toContain('Zoë Ångström:');
    expect(first?.messageId).toMatch(/^<[0-9a-f]{40}@127\.0\.0\.1>$/);
    expect(second?.messageId).toBe(first?.messageId);
  });
});

describe('the end', () => {
  it('lets a request in flight finish and takes no other', async () => {
    const body = JSON.stringify({ email: 'nobody@company.example', password: 'whatever' });
    const socket = connect(server.port, '127.0.0.1');
    const answer = new Promise<string>((resolve) => {
      let text = '';
      socket.on('data', (chunk) => (text += chunk.toString()));
      socket.on('close', () => resolve(text));
    });
    socket.write(
      `POST /api/session HTTP/1.1\r\nHost: x\r\nContent-Type: application/json\r\n` +
        `Content-Length: ${body.length}\r\n\r\n${body.slice(0, 10)}`,
    );
    await new Promise((resolve) => setTimeout(resolve, 200));
    const stopped = server.stop();
    await expect(fetch(`${base}/api/health`)).rejects.toThrow();
    socket.write(body.slice(10));
    expect(await answer).toMatch(/^HTTP\/1\.1 401 /);
    await stopped;
  });
});
