import { v7 } from 'uuid';
import { beforeAll, describe, expect, it } from 'vitest';
import type { WorksheetRecord } from '@/shared/record';
import { Event } from '@/server/models/Event';
import { SignatureRow } from '@/server/models/SignatureRow';
import { WorksheetRevision } from '@/server/models/WorksheetRevision';
import { renderWorksheetPdf, stopPdfWorkers } from '@/server/pdf/renderWorksheetPdf';
import { pdfInput } from '@/server/services/pdfInput';
import { verifyRecord } from '@/server/services/verifyRecord';
import { Worksheet } from '@/server/models/Worksheet';
import {
  act,
  buildCompany,
  contentFor,
  create,
  read,
  sign,
  signatureBody,
  toBriefing,
  toCountersign,
} from '../../support/record';
import type { Company, Person } from '../../support/record';
import { textOfPdf } from '../../support/pdfText';
import { buildUser, signIn } from '../../support/server';

let company: Company;
beforeAll(async () => {
  company = await buildCompany();
});

const signs = (who: Person, record: WorksheetRecord, body: object) =>
  act(who, record, 'signatures', body);
const saves = (record: WorksheetRecord, notes: string) =>
  company.lead.agent
    .put(`/api/worksheets/${record.id}`)
    .set('If-Match', `"${record.version}"`)
    .send({ content: { ...record.content, notes } });

const pause = (milliseconds: number) =>
  new Promise<void>((resolve) => setTimeout(resolve, milliseconds));

/** Every signature is over the content that its revision holds. */
async function signaturesFit(record: WorksheetRecord): Promise<void> {
  const where = { worksheetId: record.id };
  const [signatures, revisions] = await Promise.all([
    SignatureRow.findAll({ where }),
    WorksheetRevision.findAll({ where }),
  ]);
  for (const { revision, contentHash } of signatures) {
    expect(revisions.find((row) => row.revision === revision)?.contentHash).toBe(contentHash);
  }
}

describe('two supervisors countersign at the same instant', () => {
  it('and one of them is told why it is no longer awaited', async () => {
    for (let round = 0; round < 5; round += 1) {
      const record = await toCountersign(company);
      const both = [company.supervisor, company.supervisor2];
      const answers = await Promise.all(
        both.map((who) => signs(who, record, signatureBody(record, 'countersigned', who))),
      );
      const won = answers.find(({ status }) => status === 201);
      const lost = answers.find(({ status }) => status === 409);
      expect(won?.body.meaning).toBe('countersigned');
      expect(lost?.body).toMatchObject({ type: '/problems/wrong-state', state: 'in-force' });
      expect((await read(company.lead, record.id)).state).toBe('in-force');
      const where = { subjectId: record.id, type: 'countersigned' };
      expect(await Event.count({ where })).toBe(1);
    }
  });
});

describe('the lead saves while somebody signs', () => {
  const ROUNDS = 20;

  it('their own draft: either the save or the signature is refused', async () => {
    const outcomes = new Set<string>();
    for (let round = 0; round < ROUNDS; round += 1) {
      const record = await create(company);
      const body = signatureBody(record, 'prepared', company.lead);
      // The save comes a little later from round to round: now it is first, now the signature.
      const [signed, saved] = await Promise.all([
        signs(company.lead, record, body),
        pause(round * 4).then(() => saves(record, `Round ${round}.`)),
      ]);
      outcomes.add(`${signed.status} ${saved.status}`);
      if (signed.status === 201) {
        expect(saved.status).toBe(409);
        expect(saved.body.type).toBe('/problems/wrong-state');
      } else {
        expect(saved.status).toBe(200);
        expect([signed.status, signed.body.type]).toEqual([409, '/problems/hash-mismatch']);
      }
      await signaturesFit(record);
    }
    // Both orders came up, or the test would show one of them only.
    expect([...outcomes].sort()).toEqual(['201 409', '409 200']);
    expect((await verifyRecord()).faults).toEqual([]);
  });

  it('a worksheet in briefing: the save is refused and the helper signs what they read', async () => {
    for (let round = 0; round < ROUNDS / 2; round += 1) {
      const record = await toBriefing(company);
      const body = signatureBody(record, 'acknowledged', company.helper);
      const [signed, saved] = await Promise.all([
        signs(company.helper, record, body),
        saves(record, `Round ${round}.`),
      ]);
      expect([signed.status, saved.status]).toEqual([201, 409]);
      await signaturesFit(record);
    }
    expect((await verifyRecord()).faults).toEqual([]);
  });

  it('a worksheet that is returned and revised meanwhile: the helper never signs the new revision', async () => {
    for (let round = 0; round < ROUNDS / 2; round += 1) {
      const record = await toBriefing(company);
      const change = async () => {
        await act(company.supervisor, record, 'return', { reason: 'Name the second door.' });
        const revised = await act(company.lead, record, 'revise');
        return saves(revised.body as WorksheetRecord, `Round ${round}.`);
      };
      const body = signatureBody(record, 'acknowledged', company.helper);
      const [signed] = await Promise.all([signs(company.helper, record, body), change()]);
      expect([201, 409]).toContain(signed.status);
      expect(await SignatureRow.count({ where: { worksheetId: record.id, revision: 2 } })).toBe(0);
      await signaturesFit(record);
    }
    expect((await verifyRecord()).faults).toEqual([]);
  });
});

describe('the same signature posted again', () => {
  it('gets the same answer, at once or later, and is one row, one event and one step', async () => {
    const record = await toBriefing(company);
    const body = signatureBody(record, 'acknowledged', company.helper);
    const first = await Promise.all([1, 2, 3, 4].map(() => signs(company.helper, record, body)));
    expect(first.map(({ status }) => status).sort()).toEqual([200, 200, 200, 201]);
    await sign(await read(company.supervisor, record.id), 'countersigned', company.supervisor);
    const later = await signs(company.helper, record, body);
    expect(later.status).toBe(200);
    for (const answer of [...first, later]) expect(answer.body).toEqual(first[0]?.body);
    const where = { worksheetId: record.id, meaning: 'acknowledged' as const };
    expect(await SignatureRow.count({ where })).toBe(1);
    expect(await Event.count({ where: { subjectId: record.id, type: 'acknowledged' } })).toBe(1);
  });

  it('under another id is refused: nobody signs a revision twice', async () => {
    const record = await toBriefing(company);
    const bodies = [1, 2, 3].map(() => signatureBody(record, 'acknowledged', company.helper));
    const answers = await Promise.all(bodies.map((body) => signs(company.helper, record, body)));
    expect(answers.map(({ status }) => status).sort()).toEqual([201, 409, 409]);
  });
});

describe('a crew of 40', () => {
  it('acknowledges one by one on 39 phones, is countersigned, printed and verified', async () => {
    const content = contentFor(company);
    const [lead, helper] = content.crew ?? [];
    const people: Person[] = [];
    for (let index = 1; index < 40; index += 1) {
      const name = `Crew Member ${String(index).padStart(2, '0')}`;
      const user = await buildUser({ role: 'helper', sites: [company.site], name });
      people.push({ user, agent: await signIn(company.app, user) });
    }
    const members = people.map(({ user }, index) => ({
      ...{ ...helper, id: `c${index + 2}`, userId: user.id, name: user.name },
    }));
    const draft = await create(company, { ...content, crew: [lead ?? {}, ...members] });
    const saved = await saves(draft, 'All forty of us.');
    expect(saved.status).toBe(200);
    const record = await sign(saved.body as WorksheetRecord, 'prepared', company.lead);
    for (let from = 0; from < people.length; from += 13) {
      expect((await read(company.lead, record.id)).state).toBe('briefing');
      const some = people.slice(from, from + 13);
      const answers = await Promise.all(
        some.map((person) => signs(person, record, signatureBody(record, 'acknowledged', person))),
      );
      expect(answers.map(({ status }) => status)).toEqual(some.map(() => 201));
    }
    const asked = await read(company.supervisor, record.id);
    expect(asked.state).toBe('countersign');
    const inForce = await sign(asked, 'countersigned', company.supervisor);
    expect(inForce.signatures).toHaveLength(41);
    const extra = { ...record.content, crew: [...(record.content.crew ?? []), { id: v7() }] };
    const tooMany = await company.lead.agent.post('/api/worksheets').send({ content: extra });
    expect([tooMany.status, tooMany.body.errors[0].pointer]).toEqual([422, '#/content/crew']);

    const row = await Worksheet.findByPk(record.id, { rejectOnEmpty: true });
    const text = await textOfPdf(await renderWorksheetPdf(await pdfInput(row, 1), 'en'));
    for (const { user } of people) expect(text).toContain(user.name);
    await stopPdfWorkers();
    expect((await verifyRecord()).faults).toEqual([]);
  });
});
