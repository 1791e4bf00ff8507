import { beforeAll, beforeEach, describe, expect, it } from 'vitest';
import type { WorksheetRecord, WorksheetState } from '@/shared/record';
import { clock } from '@/server/clock';
import { Worksheet } from '@/server/models/Worksheet';
import { expireWorksheets } from '@/server/services/expireWorksheets';
import { voidStaleDrafts } from '@/server/services/voidStaleDrafts';
import {
  NOW,
  act,
  buildCompany,
  close,
  contentFor,
  create,
  energizedContentFor,
  prove,
  read,
  sign,
  signatureBody,
  toBriefing,
  toCountersign,
  toInForce,
} from '../support/record';
import type { Company, Person } from '../support/record';
import { soundWorksheet } from '../support/soundWorksheet';

let company: Company;
beforeAll(async () => {
  company = await buildCompany();
});
beforeEach(() => clock.set(NOW));

/** One worksheet in each state, made the way people make it. */
const inState: Record<WorksheetState, () => Promise<WorksheetRecord>> = {
  draft: () => create(company),
  briefing: () => toBriefing(company),
  countersign: () => toCountersign(company),
  'in-force': () => toInForce(company),
  returned: async () => {
    const record = await toCountersign(company);
    await act(company.supervisor, record, 'return', { reason: 'The traveler is not listed.' });
    return read(company.lead, record.id);
  },
  stopped: async () => {
    const record = await toInForce(company);
    await act(company.helper, record, 'stop', { reason: 'still live' });
    return read(company.lead, record.id);
  },
  expired: async () => {
    const record = await toInForce(company);
    clock.set('2026-12-01T18:00:01.000Z');
    return read(company.lead, record.id);
  },
  void: async () => {
    const record = await create(company);
    await act(company.lead, record, 'void', { reason: 'Job cancelled.' });
    return read(company.lead, record.id);
  },
  closed: async () => {
    const record = await toInForce(company);
    await close(company, record);
    return read(company.lead, record.id);
  },
};
const STATES = Object.keys(inState) as WorksheetState[];

describe('from a draft to the archive', () => {
  it('goes through every state, and each answer says how it stands', async () => {
    const draft = await create(company);
    expect(draft).toMatchObject({ state: 'draft', revision: 1, version: 1, proved: false });
    expect(draft.number).toMatch(/^2026-\d{6}$/);
    expect(draft.assessment.verdict).toBe('ready');
    expect(draft.leadId).toBe(company.lead.user.id);

    const briefing = await sign(draft, 'prepared', company.lead);
    expect(briefing.state).toBe('briefing');
    expect(briefing.contentHash).toBe(draft.contentHash);

    const countersign = await sign(briefing, 'acknowledged', company.helper);
    expect(countersign.state).toBe('countersign');

    const inForce = await sign(countersign, 'countersigned', company.supervisor);
    expect(inForce).toMatchObject({ state: 'in-force', proved: false });
    expect(inForce.workAssessment?.verdict).toBe('open');
    expect(inForce.signatures.map(({ meaning }) => meaning)).toEqual([
      'prepared',
      'acknowledged',
      'countersigned',
    ]);

    const proof = await prove(company, inForce);
    expect(proof.status).toBe(201);
    expect(proof.body.assessment.verdict).toBe('ready');
    expect(await read(company.helper, inForce.id)).toMatchObject({ proved: true });

    const closed = await close(company, inForce);
    expect(closed.status).toBe(200);
    expect(closed.body).toMatchObject({
      state: 'closed',
      closeOut: { closeOut: soundWorksheet().closeOut, byName: 'Ada Lind' },
    });
  });

  it('goes straight to the supervisor when nobody else is on the crew', async () => {
    const content = contentFor(company);
    const alone = { ...content, crew: content.crew?.slice(0, 1) ?? [] };
    const record = await sign(await create(company, alone), 'prepared', company.lead);
    expect(record.state).toBe('countersign');
  });

  it('waits for every member of a crew of 40', async () => {
    const { buildUser } = await import('../support/server');
    const content = contentFor(company);
    const [lead, helper] = content.crew ?? [];
    const more = [];
    for (let index = 2; index < 40; index += 1) {
      const user = await buildUser({ role: 'helper', sites: [company.site] });
      more.push({ ...helper, id: `c${index + 1}`, userId: user.id, name: user.name });
    }
    const crew = [lead ?? {}, helper ?? {}, ...more];
    let record = await sign(await create(company, { ...content, crew }), 'prepared', company.lead);
    for (const { userId } of crew.slice(1)) {
      expect(record.state).toBe('briefing');
      const answer = await act(company.lead, record, 'signatures', {
        ...signatureBody(record, 'acknowledged', company.lead),
        signerId: userId,
      });
      expect(answer.status).toBe(201);
      record = await read(company.lead, record.id);
    }
    expect(record.state).toBe('countersign');
    expect(record.signatures).toHaveLength(40);
  });

  it('puts energized work in force without a proof', async () => {
    const record = await toInForce(company, energizedContentFor(company));
    expect(record).toMatchObject({ state: 'in-force', workAssessment: null });
    const answer = await prove(company, record);
    expect(answer.status).toBe(409);
  });

  it('stops at a reading of 50 V or more', async () => {
    const record = await toInForce(company);
    const { proof } = soundWorksheet();
    const readings = proof.readings?.map((reading, index) =>
      index === 0 ? { ...reading, volts: 118 } : reading,
    );
    const answer = await prove(company, record, { ...proof, readings });
    expect(answer.status).toBe(201);
    const stopped = await read(company.lead, record.id);
    expect(stopped).toMatchObject({ state: 'stopped', proved: false });
    expect(stopped.reason?.text).toBe('still live');
    expect((await prove(company, record)).status).toBe(409);
  });

  it('is not proved by a later proof that leaves something open', async () => {
    const record = await toInForce(company);
    await prove(company, record);
    await prove(company, record, { ...soundWorksheet().proof, provedAfter: false });
    const after = await read(company.lead, record.id);
    expect(after).toMatchObject({ state: 'in-force', proved: false });
    expect(after.proofs).toHaveLength(2);
  });

  it('expires when the planned end passes, by the clock and when read', async () => {
    const first = await toInForce(company);
    const second = await toBriefing(company);
    clock.set('2026-12-01T18:00:00.000Z');
    expect((await read(company.lead, first.id)).state).toBe('in-force');
    clock.set('2026-12-01T18:00:01.000Z');
    expect((await read(company.lead, first.id)).state).toBe('expired');
    expect(await expireWorksheets()).toBeGreaterThanOrEqual(1);
    const answer = await company.lead.agent.get(`/api/worksheets/${second.id}/events`);
    expect(answer.body.items.at(-1)).toMatchObject({ type: 'expired', actorId: null });
  });

  it('closes one that expired, and not one that is not ready for it', async () => {
    const record = await inState.expired();
    const refused = await close(company, record, {
      ...soundWorksheet().closeOut,
      egressLit: false,
    });
    expect(refused.status).toBe(409);
    expect(refused.body.type).toBe('/problems/not-ready');
    expect(refused.body.findings[0].code).toBe('closeout.egress-untested');
    expect((await close(company, record)).body.state).toBe('closed');
  });

  it('starts a new revision whose signatures begin anew', async () => {
    const returned = await inState.returned();
    const revised = await act(company.lead, returned, 'revise');
    expect(revised.status).toBe(200);
    expect(revised.body).toMatchObject({
      state: 'draft',
      revision: 2,
      signatures: [],
      reason: null,
    });
    expect(revised.body.contentHash).not.toBe(returned.contentHash);
    const again = await sign(revised.body as WorksheetRecord, 'prepared', company.lead);
    expect(again.state).toBe('briefing');
    const revisions = await company.lead.agent.get(`/api/worksheets/${returned.id}/revisions`);
    expect(revisions.body.items).toMatchObject([
      { revision: 1, state: 'returned' },
      { revision: 2, state: 'briefing' },
    ]);
    const first = await company.lead.agent.get(`/api/worksheets/${returned.id}/revisions/1`);
    expect(first.body.signatures).toHaveLength(2);
    expect(first.body.content).toEqual(returned.content);
  });
});

describe('questions', () => {
  it('hold up the countersignature until the lead answers', async () => {
    const briefing = await toBriefing(company);
    const asked = await act(company.helper, briefing, 'questions', { text: 'Who opens LA-1?' });
    expect(asked.status).toBe(201);
    const record = await sign(briefing, 'acknowledged', company.helper);
    const refused = await act(
      company.supervisor,
      record,
      'signatures',
      signatureBody(record, 'countersigned', company.supervisor),
    );
    expect(refused.status).toBe(409);
    const path = `questions/${asked.body.id}/answer`;
    expect((await act(company.helper, record, path, { text: 'Me.' })).status).toBe(403);
    const answered = await act(company.lead, record, path, { text: 'I do, with lock 12.' });
    expect(answered.status).toBe(201);
    expect(answered.body).toMatchObject({ answer: 'I do, with lock 12.' });
    expect((await act(company.lead, record, path, { text: 'I do, with lock 12.' })).status).toBe(
      200,
    );
    expect((await act(company.lead, record, path, { text: 'Another.' })).status).toBe(409);
    expect((await sign(record, 'countersigned', company.supervisor)).state).toBe('in-force');
  });

  it('are for the crew, and say something', async () => {
    const record = await toBriefing(company);
    expect((await act(company.supervisor, record, 'questions', { text: 'x' })).status).toBe(403);
    expect((await act(company.stranger, record, 'questions', { text: 'x' })).status).toBe(404);
    const empty = await act(company.helper, record, 'questions', { text: '  ' });
    expect(empty.status).toBe(422);
    expect(empty.body.errors[0].pointer).toBe('#/text');
  });
});

/** Each act: from which states it works, and a request that is right but for the state. */
const acts: {
  name: string;
  from: WorksheetState[];
  to?: WorksheetState;
  run: (record: WorksheetRecord) => PromiseLike<{ status: number; body: { type?: string } }>;
}[] = [
  {
    name: 'save',
    from: ['draft'],
    run: (record) =>
      company.lead.agent
        .put(`/api/worksheets/${record.id}`)
        .set('If-Match', `"${record.version}"`)
        .send({ content: { ...record.content, notes: 'changed' } }),
  },
  ...(
    [
      ['prepared', ['draft'], () => company.lead],
      ['acknowledged', ['briefing'], () => company.helper],
      ['countersigned', ['countersign'], () => company.supervisor],
    ] as [Parameters<typeof signatureBody>[1], WorksheetState[], () => Person][]
  ).map(([meaning, from, who]) => ({
    name: meaning,
    from,
    run: (record: WorksheetRecord) =>
      act(who(), record, 'signatures', signatureBody(record, meaning, who())),
  })),
  { name: 'proof', from: ['in-force'], run: (record) => prove(company, record) },
  {
    name: 'return',
    from: ['briefing', 'countersign'],
    to: 'returned',
    run: (record) => act(company.supervisor, record, 'return', { reason: 'Not so.' }),
  },
  {
    name: 'stop',
    from: ['briefing', 'countersign', 'in-force'],
    to: 'stopped',
    run: (record) => act(company.helper, record, 'stop', { reason: 'I will not do this' }),
  },
  {
    name: 'revise',
    from: ['returned', 'stopped', 'expired'],
    to: 'draft',
    run: (record) => act(company.lead, record, 'revise'),
  },
  {
    name: 'close',
    from: ['in-force', 'expired'],
    to: 'closed',
    run: (record) => close(company, record),
  },
  {
    name: 'void',
    from: ['draft', 'briefing', 'countersign', 'returned', 'stopped'],
    to: 'void',
    run: (record) => act(company.lead, record, 'void', { reason: 'Job cancelled.' }),
  },
];

describe.each(acts)('$name', ({ name, from, to, run }) => {
  it.each(STATES)('from %s', async (state) => {
    const record = await inState[state]();
    expect(record.state).toBe(state);
    const offered = {
      save: 'save',
      proof: 'prove',
      prepared: 'sign:prepared',
      acknowledged: 'sign:acknowledged',
      countersigned: 'sign:countersigned',
    }[name];
    const who = ['return', 'countersigned'].includes(name) ? company.supervisor : company.lead;
    const { actions } = await read(who, record.id);
    expect(actions.includes(offered ?? name)).toBe(from.includes(state));
    const answer = await run(record);
    if (from.includes(state)) {
      expect(answer.status).toBeLessThan(300);
      if (to !== undefined) expect((await read(company.lead, record.id)).state).toBe(to);
      return;
    }
    expect(answer.status).toBe(409);
    expect(answer.body.type).toBe('/problems/wrong-state');
    expect((await read(company.lead, record.id)).state).toBe(state);
  });
});

describe('who may act', () => {
  it('asks a reason for return, stop and void', async () => {
    const record = await toCountersign(company);
    for (const [who, name] of [
      [company.supervisor, 'return'],
      [company.helper, 'stop'],
      [company.lead, 'void'],
    ] as const) {
      for (const body of [{}, { reason: ' ' }]) {
        const answer = await act(who, record, name, body);
        expect(answer.status).toBe(422);
        expect(answer.body.errors[0].pointer).toBe('#/reason');
      }
    }
  });

  it('keeps each act with those it belongs to', async () => {
    const record = await toCountersign(company);
    const reason = { reason: 'Because.' };
    expect((await act(company.lead, record, 'return', reason)).status).toBe(403);
    expect((await act(company.helper, record, 'return', reason)).status).toBe(403);
    expect((await act(company.helper, record, 'void', reason)).status).toBe(403);
    expect((await act(company.safety, record, 'stop', reason)).status).toBe(403);
    expect((await act(company.stranger, record, 'stop', reason)).status).toBe(404);
    expect((await act(company.otherSupervisor, record, 'return', reason)).status).toBe(404);
    expect((await act(company.helper, record, 'revise')).status).toBe(403);
    expect((await act(company.supervisor, record, 'close', {})).status).toBe(403);
    expect((await act(company.helper, record, 'proofs', {})).status).toBe(403);
    expect((await act(company.helper, record, 'copy', {})).status).toBe(403);
  });

  it('needs a session', async () => {
    const { default: supertest } = await import('supertest');
    const record = await create(company);
    const nobody = supertest(company.app);
    expect((await nobody.get(`/api/worksheets/${record.id}`)).status).toBe(401);
    expect((await nobody.post('/api/worksheets').send({ content: {} })).status).toBe(401);
    expect((await nobody.post(`/api/worksheets/${record.id}/stop`).send({})).status).toBe(401);
  });
});

describe('copy', () => {
  it('takes what holds for another day and nothing else', async () => {
    const record = await inState.closed();
    const answer = await act(company.lead, record, 'copy', {});
    expect(answer.status).toBe(201);
    const copy = answer.body as WorksheetRecord;
    expect(copy).toMatchObject({ state: 'draft', revision: 1, leadId: company.lead.user.id });
    expect(copy.id).not.toBe(record.id);
    const { content } = copy;
    expect(content.job).toMatchObject({ area: 'Level 1 hall', task: 'replace luminaire' });
    expect(content.job).not.toHaveProperty('startsAt');
    expect(content.job).not.toHaveProperty('endsAt');
    expect(content).not.toHaveProperty('egress');
    expect(content).not.toHaveProperty('briefing');
    expect(content.protectiveEquipment).not.toHaveProperty('ready');
    expect(content.protectiveEquipment?.gloves).not.toHaveProperty('airTested');
    for (const source of content.sources ?? []) {
      for (const key of ['lockNumber', 'lockedBy', 'byCrewId']) {
        expect(source).not.toHaveProperty(key);
      }
    }
    expect(copy.assessment.verdict).not.toBe('ready');
  });
});

describe('a draft that nobody touched for 90 days', () => {
  it('is void after them, and not before', async () => {
    const record = await create(company);
    const state = async () => (await Worksheet.findByPk(record.id))?.state;
    clock.set('2027-03-01T14:00:00.000Z');
    await voidStaleDrafts();
    expect(await state()).toBe('draft');
    clock.set('2027-03-01T16:00:00.000Z');
    await voidStaleDrafts();
    expect(await state()).toBe('void');
  });
});
