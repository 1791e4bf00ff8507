import { beforeEach, describe, expect, it, vi } from 'vitest';
import { sendKeptStops } from '@/components/stop/keptStops';
import { buildRecord } from '../../support/worksheetRecord';

const { kept } = vi.hoisted(() => ({ kept: new Map<string, unknown>() }));
vi.mock('@/components/drafts/keptForms', () => ({
  keptForms: {
    list: () => Promise.resolve([...kept.keys()]),
    read: (_: string, key: string) => Promise.resolve(kept.get(key)),
    keep: (_: string, key: string, form: unknown) => Promise.resolve(void kept.set(key, form)),
    forget: (_: string, key: string) => Promise.resolve(void kept.delete(key)),
  },
}));

const record = buildRecord({ revision: 2, actions: ['stop'] });
const key = `stop/${record.id}/2`;
const STOP = { id: '0190b5a4-0000-7000-8000-0000000000f7', reason: 'still live' };
let sent: { path: string; body: unknown }[];

const answer = (status: number, body: object) =>
  new Response(JSON.stringify(body), {
    status,
    headers: {
      'Content-Type': status < 400 ? 'application/json' : 'application/problem+json',
    },
  });
const problem = (status: number, name: string) =>
  answer(status, { type: `/problems/${name}`, title: name, status, instance: 'urn:uuid:1' });

/** A server that answers the reading with `read` and the stop with `stop`. */
function serve(stop: () => Response, read = () => answer(200, record)) {
  vi.stubGlobal('fetch', (path: string, init?: RequestInit) => {
    if (init?.method !== 'POST') return Promise.resolve(read());
    sent.push({ path, body: JSON.parse(init.body as string) as unknown });
    return Promise.resolve(stop());
  });
}

beforeEach(() => {
  kept.clear();
  kept.set(key, STOP);
  kept.set(`proof/${record.id}/2`, { keptAt: '', form: {} });
  sent = [];
});

describe('a stop that was pressed without signal', () => {
  it('is sent when there is signal, and then no longer kept', async () => {
    serve(() => answer(200, { ...record, state: 'stopped' }));
    await sendKeptStops('u');
    expect(sent).toEqual([{ path: `/api/worksheets/${record.id}/stop`, body: STOP }]);
    expect([...kept.keys()]).toEqual([`proof/${record.id}/2`]);
  });

  it.each([
    ['the session has ended', () => problem(401, 'not-signed-in')],
    ['the server asks to wait', () => problem(429, 'too-many-requests')],
    ['the server is down', () => problem(503, 'unavailable')],
  ])('is kept while %s', async (_, stop) => {
    serve(stop);
    await sendKeptStops('u');
    expect(sent).toHaveLength(1);
    expect(kept.has(key)).toBe(true);
  });

  it('is kept while nobody answers', async () => {
    vi.stubGlobal('fetch', () => Promise.reject(new TypeError('Failed to fetch')));
    await sendKeptStops('u');
    expect(kept.has(key)).toBe(true);
  });

  it('is not kept any longer where the server refuses it', async () => {
    serve(() => problem(409, 'wrong-state'));
    await sendKeptStops('u');
    expect(kept.has(key)).toBe(false);
  });

  it('never stops a later revision', async () => {
    serve(
      () => answer(200, record),
      () => answer(200, { ...record, revision: 3 }),
    );
    await sendKeptStops('u');
    expect(sent).toEqual([]);
    expect(kept.has(key)).toBe(false);
  });
});
