import { v7 } from 'uuid';
import { beforeAll, beforeEach, describe, expect, it } from 'vitest';
import { clock } from '@/server/clock';
import { Event } from '@/server/models/Event';
import { verifyRecord } from '@/server/services/verifyRecord';
import {
  NOW,
  act,
  buildCompany,
  create,
  toBriefing,
  toCountersign,
  toInForce,
} from '../support/record';
import type { Company, Person } from '../support/record';
import { PIN } from '../support/server';
import { soundWorksheet } from '../support/soundWorksheet';

let company: Company;
beforeAll(async () => {
  company = await buildCompany();
});
beforeEach(() => clock.set(NOW));

interface Act {
  name: string;
  event: string;
  to: string;
  who: () => Person;
  from: () => Promise<{ id: string }>;
  body: object;
}

const acts: Act[] = [
  {
    name: 'return',
    event: 'returned',
    to: 'returned',
    who: () => company.supervisor,
    from: () => toCountersign(company),
    body: { reason: 'Not so.' },
  },
  {
    name: 'stop',
    event: 'stopped',
    to: 'stopped',
    who: () => company.helper,
    from: () => toInForce(company),
    body: { reason: 'still live' },
  },
  {
    name: 'void',
    event: 'voided',
    to: 'void',
    who: () => company.lead,
    from: () => create(company),
    body: { reason: 'Job cancelled.' },
  },
  {
    name: 'revise',
    event: 'revised',
    to: 'draft',
    who: () => company.lead,
    from: async () => {
      const record = await toBriefing(company);
      await act(company.supervisor, record, 'return', { reason: 'Not so.' });
      return record;
    },
    body: {},
  },
  {
    name: 'close',
    event: 'closed',
    to: 'closed',
    who: () => company.lead,
    from: () => toInForce(company),
    body: { closeOut: soundWorksheet().closeOut, pin: PIN },
  },
];

/** An answer can be lost on the way: the same act again must not read like a refusal. */
describe.each(acts)('$name', ({ name, event, to, who, from, body }) => {
  const events = (subjectId: string) => Event.count({ where: { subjectId, type: event } });

  it('is one act however often its id is posted, one after the other or at once', async () => {
    const record = await from();
    const post = (fields: object) => act(who(), record, name, { ...body, ...fields });
    const id = v7();
    const first = await post({ id });
    expect([first.status, first.body.state]).toEqual([200, to]);
    const again = await Promise.all([post({ id }), post({ id: id.toUpperCase() })]);
    for (const answer of again) {
      expect([answer.status, answer.body]).toEqual([200, first.body]);
      expect(answer.headers['etag']).toBe(first.headers['etag']);
    }
    expect(await events(record.id)).toBe(1);
  });

  it('is decided by the key when two come at once', async () => {
    const record = await from();
    const id = v7();
    const answers = await Promise.all(
      [1, 2, 3].map(() => act(who(), record, name, { ...body, id })),
    );
    expect(answers.map(({ status }) => status)).toEqual([200, 200, 200]);
    expect(await events(record.id)).toBe(1);
  });

  it('without an id, or with another one, is a second act', async () => {
    const record = await from();
    expect((await act(who(), record, name, body)).status).toBe(200);
    for (const fields of [{}, { id: v7() }]) {
      const second = await act(who(), record, name, { ...body, ...fields });
      expect([second.status, second.body.type]).toEqual([409, '/problems/wrong-state']);
    }
    expect(await events(record.id)).toBe(1);
  });

  it('takes a UUID only, and names the field', async () => {
    const record = await from();
    const { status, body: answer } = await act(who(), record, name, { ...body, id: '7' });
    expect([status, answer.errors?.[0]?.pointer]).toEqual([422, '#/id']);
    expect(await events(record.id)).toBe(0);
  });
});

describe('an id that stands for another act', () => {
  it('is taken, whoever’s and wherever it was, and tells nothing', async () => {
    const id = v7();
    const record = await toInForce(company);
    await act(company.helper, record, 'stop', { id, reason: 'A word of their own.' }).expect(200);
    const other = await toInForce(company);
    for (const answer of [
      // Another person, another act, another worksheet.
      await act(company.lead, record, 'stop', { id, reason: 'x' }),
      await act(company.lead, record, 'revise', { id }),
      await act(company.helper, other, 'stop', { id, reason: 'x' }),
    ]) {
      expect([answer.status, answer.body.type]).toEqual([409, '/problems/id-taken']);
      expect(JSON.stringify(answer.body)).not.toContain('A word');
    }
  });

  it('is not used up by an act that was refused', async () => {
    const id = v7();
    const record = await create(company);
    const stop = () => act(company.lead, record, 'stop', { id, reason: 'still live' });
    expect((await stop()).status).toBe(409);
    const briefing = await toBriefing(company);
    const answer = await act(company.lead, briefing, 'stop', { id, reason: 'still live' });
    expect(answer.status).toBe(200);
  });
});

it('leaves nothing altered behind all of this', async () => {
  expect((await verifyRecord()).faults).toEqual([]);
});
