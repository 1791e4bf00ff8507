import { beforeAll, beforeEach, describe, expect, it } from 'vitest';
import { parse as parseCsv } from 'csv-parse/sync';
import type { WorksheetRecord, WorksheetRow } from '@/shared/record';
import { insightsSchema } from '@/shared/insights';
import { listSchema, worksheetRowSchema } from '@/shared/record';
import { clock } from '@/server/clock';
import {
  act,
  buildCompany,
  contentFor,
  create,
  energizedContentFor,
  prove,
  read,
  toBriefing,
  toInForce,
} from '../support/record';
import type { Company, Person } from '../support/record';
import { soundWorksheet } from '../support/soundWorksheet';

let company: Company;
let corridor: WorksheetRecord;
let stair: WorksheetRecord;
let energized: WorksheetRecord;
let stopped: WorksheetRecord;
let elsewhere: WorksheetRecord;

/** A minute later each, so that the order by creation is the order of making. */
function tick(): void {
  clock.advance(60_000);
}

beforeAll(async () => {
  company = await buildCompany();
  const content = contentFor(company);
  corridor = await create(company, {
    ...content,
    job: { ...content.job, area: 'Pasillo Señalización', equipment: 'LP-2/14 drivers' },
    notes: '=1+2, a \'quote\' and a "mark"',
  });
  tick();
  stair = await toBriefing(company, {
    ...content,
    job: { ...content.job, area: 'Stair C', equipment: '-stair lights' },
    supply: { ...content.supply, panel: 'LP-3', circuit: '7' },
  });
  tick();
  energized = await toInForce(company, energizedContentFor(company));
  tick();
  stopped = await toInForce(company);
  const { proof } = soundWorksheet();
  const readings = (proof.readings ?? []).map((reading) => ({ ...reading, volts: 120 }));
  await prove(company, stopped, { ...proof, readings });
  tick();
  const made = await company.stranger.agent.post('/api/worksheets').send({
    content: { job: { siteId: company.otherSite.id, area: 'Boiler room' } },
  });
  elsewhere = made.body as WorksheetRecord;
});
beforeEach(() => clock.set('2026-12-01T15:10:00.000Z'));

async function list(person: Person, query: object = {}): Promise<WorksheetRow[]> {
  const answer = await person.agent.get('/api/worksheets').query(query);
  expect(answer.status).toBe(200);
  return listSchema(worksheetRowSchema).parse(answer.body).items;
}
const ids = async (person: Person, query: object = {}) =>
  (await list(person, query)).map(({ id }) => id);

describe('who sees what', () => {
  it('a lead and a helper their own, a supervisor their sites’, safety all', async () => {
    const all = [elsewhere.id, stopped.id, energized.id, stair.id, corridor.id];
    const ours = all.slice(1);
    expect(await ids(company.safety)).toEqual(all);
    expect(await ids(company.supervisor)).toEqual(ours);
    expect(await ids(company.lead)).toEqual(ours);
    expect(await ids(company.helper)).toEqual(ours);
    expect(await ids(company.helper2)).toEqual([]);
    expect(await ids(company.stranger)).toEqual([elsewhere.id]);
    expect(await ids(company.otherSupervisor)).toEqual([elsewhere.id]);
    for (const [who, seen] of [
      [company.helper2, []],
      [company.stranger, [elsewhere.id]],
      [company.supervisor, ours],
    ] as const) {
      for (const id of all) {
        const paths = ['', '/events', '/revisions', '/revisions/1'];
        for (const path of paths) {
          const { status } = await who.agent.get(`/api/worksheets/${id}${path}`);
          expect(status).toBe((seen as readonly string[]).includes(id) ? 200 : 404);
        }
      }
    }
  });

  it('still those who were on the crew of a signed revision', async () => {
    const record = await toBriefing(company);
    await act(company.supervisor, record, 'return', { reason: 'Another helper, not this one.' });
    const revised = await act(company.lead, record, 'revise');
    const { content, version } = revised.body as WorksheetRecord;
    const crew = content.crew?.map((member, index) =>
      index === 1 ? { ...member, userId: company.helper2.user.id } : member,
    );
    await company.lead.agent
      .put(`/api/worksheets/${record.id}`)
      .set('If-Match', `"${version}"`)
      .send({ content: { ...content, crew } });
    expect(await ids(company.helper)).toContain(record.id);
    expect(await ids(company.helper2)).toContain(record.id);
    await act(company.lead, record, 'void', { reason: 'Only for this test.' });
  });
});

describe('search', () => {
  it.each([
    ['2026-00000', 5],
    ['000001', 1],
    ['LP-2/14', 1],
    // The 2 is also the start of 2026.
    ['lp-2', 2],
    ['lp-3/7', 1],
    ['senalizacion', 1],
    ['PASILLO', 1],
    ['stai', 1],
    ['marlow ada', 4],
    ['beto', 4],
    ['replace lumin', 4],
    ['quote mark', 1],
    ['nothing like this', 0],
    ["'); DROP TABLE x; --", 0],
    ['&|!:*()', 0],
  ])('finds %s', async (q, count) => {
    const rows = (await list(company.safety, { q })).filter(({ state }) => state !== 'void');
    expect(rows).toHaveLength(count);
  });
});

describe('filters', () => {
  it('by state, site, system, voltage, mode, person, finding and day', async () => {
    const { site, lead, otherSite } = company;
    expect(await ids(company.safety, { state: 'briefing' })).toEqual([stair.id]);
    expect(await ids(company.safety, { state: 'briefing,in-force' })).toEqual([
      energized.id,
      stair.id,
    ]);
    expect(await ids(company.safety, { siteId: otherSite.id })).toEqual([elsewhere.id]);
    expect(await ids(company.safety, { siteId: site.id, mode: 'energized' })).toEqual([
      energized.id,
    ]);
    expect(await ids(company.safety, { system: '480Y/277' })).toEqual([]);
    expect(await ids(company.safety, { circuitVolts: '120', state: 'draft' })).toEqual([
      corridor.id,
    ]);
    expect(await ids(company.safety, { person: lead.user.id, state: 'stopped' })).toEqual([
      stopped.id,
    ]);
    expect(await ids(company.safety, { finding: 'absence.voltage-present' })).toEqual([stopped.id]);
    expect(await ids(company.safety, { from: '2026-12-02' })).toEqual([]);
    const all = await ids(company.safety);
    expect(await ids(company.safety, { from: '0001-01-01', to: '9999-12-31' })).toEqual(all);
    expect(await ids(company.safety, { to: '0001-01-01' })).toEqual([]);
    expect(
      await ids(company.safety, { from: '2026-12-01', to: '2026-12-01', state: 'stopped' }),
    ).toEqual([stopped.id]);
  });

  it('names each bad one', async () => {
    const answer = await company.safety.agent
      .get('/api/worksheets')
      .query({ limit: 201, state: 'open', from: 'yesterday', cursor: 'x', siteId: '1', sort: 'x' });
    expect(answer.status).toBe(422);
    expect(answer.body.errors.map(({ pointer }: { pointer: string }) => pointer).sort()).toEqual([
      '#/from',
      '#/limit',
      '#/siteId/0',
      '#/sort',
      '#/state/0',
    ]);
    const cursor = await company.safety.agent.get('/api/worksheets').query({ cursor: 'x' });
    expect(cursor.status).toBe(422);
    const nul = await company.safety.agent.get('/api/worksheets').query({ q: 'a\u0000b' });
    expect(nul.status).toBe(422);
  });
});

describe('the pair that was worn', () => {
  it('finds the worksheets whose plan named it in any revision, as far as the person sees them', async () => {
    const worn = async (serial: string) => {
      const { body } = await company.safety.agent.post('/api/rubber-goods').send({
        siteId: company.site.id,
        kind: 'gloves',
        gloveClass: '00',
        serial,
        tests: [{ testedOn: '2026-11-20', passed: true }],
      });
      return (body as { id: string }).id;
    };
    const pair = await worn('LST-1');
    const other = await worn('LST-2');
    const { id } = corridor;
    const planned = await read(company.lead, id);
    const saveWith = async (rubberGoodsId: string | undefined) => {
      const { version, content } = await read(company.lead, id);
      const { protectiveEquipment } = content;
      const answer = await company.lead.agent
        .put(`/api/worksheets/${id}`)
        .set('If-Match', `"${version}"`)
        .send({
          content: { ...content, protectiveEquipment: { ...protectiveEquipment, rubberGoodsId } },
        });
      expect(answer.status).toBe(200);
    };
    await saveWith(pair);
    expect(await ids(company.safety, { rubberGoods: pair })).toEqual([id]);
    expect(await ids(company.lead, { rubberGoods: pair.toUpperCase() })).toEqual([id]);
    expect(await ids(company.safety, { rubberGoods: other })).toEqual([]);
    expect(await ids(company.stranger, { rubberGoods: pair })).toEqual([]);
    await saveWith(planned.content.protectiveEquipment?.rubberGoodsId);
    expect(await ids(company.safety, { rubberGoods: pair })).toEqual([]);
    const bad = await company.safety.agent.get('/api/worksheets').query({ rubberGoods: 'x' });
    expect([bad.status, bad.body.errors[0].pointer]).toEqual([422, '#/rubberGoods']);
  });
});

describe('pages', () => {
  it.each(['-createdAt', 'createdAt', '-updatedAt', 'number', '-number', 'startsAt', '-endsAt'])(
    'go through every row once, sorted by %s',
    async (sort) => {
      const whole = await ids(company.safety, { sort, limit: 200 });
      const paged: string[] = [];
      let cursor: string | null = null;
      do {
        const answer = await company.safety.agent
          .get('/api/worksheets')
          .query({ sort, limit: 2, ...(cursor === null ? {} : { cursor }) });
        paged.push(...answer.body.items.map(({ id }: { id: string }) => id));
        cursor = answer.body.nextCursor as string | null;
      } while (cursor !== null);
      expect(paged).toEqual(whole);
      expect(new Set(paged).size).toBe(whole.length);
    },
  );

  it('show who is awaited and what is asked', async () => {
    await act(company.helper, stair, 'questions', { text: 'Which lock?' });
    const [row] = await list(company.lead, { state: 'briefing' });
    expect(row).toMatchObject({
      awaiting: [company.helper.user.id],
      openQuestions: [{ text: 'Which lock?', byName: 'Beto Cruz' }],
      leadName: 'Ada Lind',
      siteName: 'Marlow Annex',
      timeZone: 'America/Chicago',
    });
  });
});

describe('exports', () => {
  it('are for safety', async () => {
    for (const who of [company.lead, company.helper, company.supervisor]) {
      expect((await who.agent.get('/api/worksheets/export.csv')).status).toBe(403);
      expect((await who.agent.get('/api/worksheets/export.zip')).status).toBe(403);
    }
  });

  it('write a CSV that a spreadsheet takes for text', async () => {
    const answer = await company.safety.agent
      .get('/api/worksheets/export.csv')
      .query({ q: 'marlow' });
    expect(answer.status).toBe(200);
    expect(answer.headers['content-type']).toBe('text/csv; charset=utf-8');
    expect(answer.text.charCodeAt(0)).toBe(0xfeff);
    const rows: Record<string, string>[] = parseCsv(answer.text, {
      bom: true,
      columns: true,
      record_delimiter: '\r\n',
    });
    expect(rows[0]).toMatchObject({ site: 'Marlow Annex', task: 'replace luminaire' });
    expect(rows.map(({ equipment }) => equipment)).toContain("'-stair lights");
    expect(
      (await company.safety.agent.get('/api/worksheets/export.csv').query({ limit: 5 })).status,
    ).toBe(422);
  });
});

describe('insights', () => {
  it('count worksheets by what comes back, for supervisors and safety', async () => {
    expect((await company.lead.agent.get('/api/insights')).status).toBe(403);
    const answer = await company.safety.agent.get('/api/insights');
    expect(answer.status).toBe(200);
    const counts = insightsSchema.parse(answer.body);
    expect(counts).toMatchObject({ worksheets: 6, voltageAtProof: 1, notClosedInTime: 0 });
    expect(counts.byMonth).toEqual([{ month: '2026-12', worksheets: 6, energized: 1 }]);
    expect(counts.stopsByReason).toEqual([{ reason: 'still live', stops: 1 }]);
    expect(counts.byFinding.find(({ code }) => code === 'absence.voltage-present')).toMatchObject({
      severity: 'stop',
      worksheets: 1,
    });
    expect(counts.bySite).toEqual([
      { siteId: company.site.id, siteName: 'Marlow Annex', worksheets: 5, withStop: 1 },
      { siteId: company.otherSite.id, siteName: 'Quarry House', worksheets: 1, withStop: 0 },
    ]);
    expect(JSON.stringify(counts)).not.toContain('Ada');
    const theirs = await company.otherSupervisor.agent.get('/api/insights');
    expect(theirs.body.worksheets).toBe(1);
    const none = await company.safety.agent.get('/api/insights').query({ from: '2027-01-01' });
    expect(none.body).toMatchObject({ worksheets: 0, byMonth: [], byFinding: [] });
  });
});
