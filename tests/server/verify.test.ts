import { beforeAll, beforeEach, describe, expect, it } from 'vitest';
import pg from 'pg';
import supertest from 'supertest';
import { clock } from '@/server/clock';
import { Event } from '@/server/models/Event';
import { Seal } from '@/server/models/Seal';
import { eventHash } from '@/server/services/recordEvent';
import { sealEvents } from '@/server/services/sealEvents';
import { verifyRecord } from '@/server/services/verifyRecord';
import type { Fault } from '@/server/services/verifyRecord';
import { withClient } from '../support/database';
import {
  NOW,
  act,
  buildCompany,
  close,
  prove,
  read,
  toCountersign,
  toInForce,
} from '../support/record';
import type { Company } from '../support/record';

let company: Company;
beforeAll(async () => {
  company = await buildCompany();
  const asked = await toCountersign(company);
  const question = await act(company.helper, asked, 'questions', { text: 'Who watches?' });
  await act(company.lead, asked, `questions/${question.body.id}/answer`, { text: 'Cam does.' });
  await act(company.supervisor, asked, 'return', { reason: 'Name the second door.' });
  await act(company.lead, asked, 'revise');
  const record = await toInForce(company);
  await prove(company, record);
  await close(company, record);
});
beforeEach(() => clock.set(NOW));

const APPEND_ONLY = ['events', 'seals', 'signatures', 'proofs', 'close_outs'];
const ownerUrl = () => process.env['DATABASE_OWNER_URL'] ?? '';
const runtimeUrl = () => process.env['DATABASE_URL'] ?? '';

describe('what is signed', () => {
  beforeAll(async () => {
    clock.set('2026-12-01T15:30:00.000Z');
    await sealEvents();
  });

  const roles = [
    { role: 'runtime', url: runtimeUrl },
    { role: 'owner', url: ownerUrl },
  ];
  const columns: Record<string, string> = {
    events: 'type',
    seals: 'hash',
    signatures: 'signer_name',
    proofs: 'by_name',
    close_outs: 'by_name',
    worksheet_revisions: 'edition',
  };
  it.each(
    roles.flatMap(({ role, url }) =>
      [...APPEND_ONLY, 'worksheet_revisions'].map((table) => ({ role, url, table })),
    ),
  )('$table cannot be changed, deleted or emptied by the $role role', async ({ url, table }) => {
    await withClient(url(), async (client) => {
      const rows = await client.query(`SELECT 1 FROM ${table} LIMIT 1`);
      expect(rows.rowCount).toBe(1);
      const signed =
        table === 'worksheet_revisions'
          ? 'WHERE (worksheet_id, revision) IN (SELECT worksheet_id, revision FROM signatures)'
          : '';
      const column = columns[table];
      await expect(
        client.query(`UPDATE ${table} SET ${column} = ${column} || 'x' ${signed}`),
      ).rejects.toThrow(/never changed|permission denied/);
      await expect(client.query(`DELETE FROM ${table} ${signed}`)).rejects.toThrow(
        /never changed|permission denied/,
      );
      await expect(client.query(`TRUNCATE ${table} CASCADE`)).rejects.toThrow(
        /never changed|permission denied/,
      );
    });
  });

  it('leaves a draft revision open to change', async () => {
    await withClient(runtimeUrl(), async (client) => {
      const changed = await client.query(
        `UPDATE worksheet_revisions SET updated_at = updated_at WHERE revision = 2`,
      );
      expect(changed.rowCount).toBe(1);
    });
  });
});

/** Runs SQL as a superuser with triggers disabled, looks what `verify` finds, and takes it all back. */
async function tampered(sql: string, sealed?: string): Promise<Fault[]> {
  const admin = new URL(ownerUrl());
  const { cluster } = await import('vitest').then(({ inject }) => ({ cluster: inject('cluster') }));
  const { urlOf } = await import('@/server/commands/cluster');
  const url = urlOf(cluster, 'admin', admin.pathname.slice(1));
  const client = new pg.Client({ connectionString: url });
  await client.connect();
  const tables = [...APPEND_ONLY, 'worksheet_revisions', 'worksheets', 'questions'];
  try {
    await client.query(`SET session_replication_role = replica`);
    for (const table of tables) await client.query(`CREATE TABLE kept_${table} AS TABLE ${table}`);
    await client.query(sql);
    return (await verifyRecord(sealed)).faults;
  } finally {
    for (const table of tables) {
      const { rows } = await client.query<{ list: string }>(
        `SELECT string_agg(quote_ident(column_name), ', ') AS list FROM information_schema.columns
          WHERE table_name = $1 AND is_generated = 'NEVER' AND table_schema = 'public'`,
        [table],
      );
      const list = rows[0]?.list;
      await client.query(`DELETE FROM ${table}`);
      await client.query(`INSERT INTO ${table} (${list}) SELECT ${list} FROM kept_${table}`);
      await client.query(`DROP TABLE kept_${table}`);
    }
    await client.end();
  }
}

describe('verify', () => {
  it('finds nothing in a record that nobody touched, and counts it', async () => {
    const { faults, counts } = await verifyRecord();
    expect(faults).toEqual([]);
    expect(counts).toMatchObject({ worksheets: 2, revisions: 3, signatures: 5, proofs: 1 });
    expect(counts['events']).toBeGreaterThan(10);
  });

  const one = (table: string, where = 'true') =>
    `(SELECT ctid FROM ${table} WHERE ${where} LIMIT 1)`;
  it.each([
    [
      'events',
      `UPDATE events SET payload = '{}' WHERE ctid = ${one('events', `type = 'prepared'`)}`,
    ],
    ['events', `UPDATE events SET at = at - interval '1 day' WHERE ctid = ${one('events')}`],
    ['events', `DELETE FROM events WHERE ctid = ${one('events', `type = 'acknowledged'`)}`],
    [
      'worksheet_revisions',
      `UPDATE worksheet_revisions SET content = jsonb_set(content, '{notes}', '"x"')`,
    ],
    [
      'worksheet_revisions',
      `UPDATE worksheet_revisions SET assessment = jsonb_set(assessment, '{verdict}', '"open"') WHERE assessment IS NOT NULL`,
    ],
    [
      'signatures',
      `UPDATE signatures SET signer_name = 'Someone Else' WHERE ctid = ${one('signatures')}`,
    ],
    [
      'signatures',
      `UPDATE signatures SET signed_at = signed_at - interval '1 hour' WHERE ctid = ${one('signatures')}`,
    ],
    [
      'signatures',
      `UPDATE signatures SET strokes = '[[[1,1],[2,2]]]' WHERE ctid = ${one('signatures')}`,
    ],
    [
      'signatures',
      `DELETE FROM signatures WHERE ctid = ${one('signatures', `meaning = 'acknowledged'`)}`,
    ],
    ['proofs', `UPDATE proofs SET proof = '{}'`],
    ['proofs', `DELETE FROM proofs`],
    ['close_outs', `UPDATE close_outs SET close_out = jsonb_set(close_out, '{notes}', '"x"')`],
    ['questions', `UPDATE questions SET text = 'Anything?'`],
    ['questions', `UPDATE questions SET answer = 'No.'`],
    ['worksheets', `UPDATE worksheets SET state = 'in-force' WHERE state = 'closed'`],
    ['worksheets', `UPDATE worksheets SET ends_at = ends_at + interval '1 day'`],
    ['worksheets', `UPDATE worksheets SET proved = NOT proved`],
    ['worksheets', `DELETE FROM worksheets WHERE state = 'closed'`],
    ['seals', `UPDATE seals SET count = count - 1`],
    ['seals', `UPDATE seals SET events_hash = repeat('0', 64)`],
  ])('names a fault in %s: %s', async (table, sql) => {
    const faults = await tampered(sql);
    expect(faults.map((fault) => fault.table)).toContain(table);
    for (const { id, what } of faults) {
      expect(id).not.toBe('');
      expect(what).not.toBe('');
    }
    expect((await verifyRecord()).faults).toEqual([]);
  });

  it('sees that a worksheet was taken out with everything of it, events included', async () => {
    const closed = `(SELECT id FROM worksheets WHERE state = 'closed' LIMIT 1)`;
    const owned = ['signatures', 'proofs', 'close_outs', 'questions', 'worksheet_revisions'];
    const taken = [
      ...owned.map((table) => `DELETE FROM ${table} WHERE worksheet_id = ${closed}`),
      `DELETE FROM events WHERE subject_id = ${closed}`,
      `DELETE FROM worksheets WHERE id = ${closed}`,
    ];
    const faults = await tampered(taken.join('; '));
    expect(faults.map(({ table }) => table)).toContain('seals');
    expect(faults.map(({ what }) => what).join()).toMatch(/covers \d+ events, \d+ are there/);
  });

  it('sees a chain that was written anew from its middle, with hashes that fit each other', async () => {
    // As one would who knows how the hashes are made: the last event of a subject, changed and hashed again.
    const last = await Event.findOne({
      where: { subjectType: 'worksheet', type: 'closed' },
      rejectOnEmpty: true,
    });
    const { subjectType, subjectId, revision, type, enteredById, at, previousHash } = last;
    const actorId = company.helper.user.id;
    const hash = eventHash({
      ...{ seq: Number(last.seq), subjectType, subjectId, revision, type },
      ...{ actorId, enteredById, at, payload: last.payload, previousHash },
    });
    const forged = `UPDATE events SET actor_id = '${actorId}', hash = '${hash}' WHERE seq = ${last.seq}`;
    const faults = await tampered(forged);
    expect(faults.map(({ table }) => table)).toEqual(['seals']);
  });

  it('sees the end of the trail cut off, also together with its seal', async () => {
    const seal = await Seal.findOne({ rejectOnEmpty: true });
    const last = await Event.max('seq');
    const cut = `DELETE FROM events WHERE seq >= ${Number(last) - 1}`;
    expect((await tampered(cut)).map(({ table }) => table)).toContain('seals');
    // With its seals gone as well, only the hash in the mail to safety tells.
    const both = `${cut}; DELETE FROM seals`;
    expect((await tampered(both, seal.hash)).map(({ table }) => table)).toContain('seals');
    expect((await verifyRecord(seal.hash)).faults).toEqual([]);
    expect((await verifyRecord('0'.repeat(64))).faults).toHaveLength(1);
  });
});

describe('seals', () => {
  it('cover what is older than ten minutes, once, each with the hash of the one before', async () => {
    const first = await Seal.findOne({ order: [['id', 'DESC']], rejectOnEmpty: true });
    expect(await sealEvents()).toBeNull();
    clock.set('2026-12-01T16:00:00.000Z');
    await toInForce(company);
    clock.set('2026-12-01T16:09:59.000Z');
    expect(await sealEvents()).toBeNull();
    clock.set('2026-12-01T16:10:01.000Z');
    const second = await sealEvents();
    expect(second).toMatchObject({ previousHash: first.hash, count: 4 });
    expect((await verifyRecord()).faults).toEqual([]);
  });
});

describe('the public check of a printed hash', () => {
  it('says how the worksheet stands, and nothing personal', async () => {
    const record = await toCountersign(company);
    const nobody = supertest(company.app);
    const path = `/api/verify/${record.number}/${record.contentHash}`;
    const found = await nobody.get(path);
    expect(found.status).toBe(200);
    expect(found.body).toEqual({
      matches: true,
      state: 'countersign',
      revision: 1,
      superseded: false,
      signedAt: NOW,
    });
    await act(company.supervisor, record, 'return', { reason: 'Not so.' });
    await act(company.lead, record, 'revise');
    expect((await nobody.get(path)).body).toMatchObject({ superseded: true, state: 'draft' });
    const draft = await read(company.lead, record.id);
    for (const [number, hash] of [
      ['2026-999999', record.contentHash],
      [record.number, '0'.repeat(64)],
      [record.number, draft.contentHash],
      ['%00', 'x'],
    ]) {
      const answer = await nobody.get(`/api/verify/${number}/${hash}`);
      expect(answer.status).toBe(200);
      expect(answer.body).toEqual({ matches: false });
    }
  });

  it('is throttled by address', async () => {
    const nobody = supertest(company.app);
    const answers = [];
    for (let tries = 0; tries < 31; tries += 1) {
      answers.push(
        await nobody.get('/api/verify/2026-000001/x').set('X-Forwarded-For', '203.0.113.7'),
      );
    }
    expect(answers.slice(0, 30).every(({ status }) => status === 200)).toBe(true);
    expect(answers[30]?.status).toBe(429);
    expect(answers[30]?.headers['retry-after']).toMatch(/^\d+$/);
  });
});
