import { v7 } from 'uuid';
import type { Express } from 'express';
import type TestAgent from 'supertest/lib/agent';
import type { Meaning, WorksheetRecord } from '@/shared/record';
import type { WorksheetContent } from '@/shared/worksheet';
import { buildApp } from '@/server/app';
import { clock } from '@/server/clock';
import type { Site } from '@/server/models/Site';
import type { User } from '@/server/models/User';
import { PIN, buildSite, buildUser, signIn } from './server';
import { soundEnergizedWorksheet, soundWorksheet } from './soundWorksheet';

/** The instant for which the sound worksheets are sound. */
export const NOW = '2026-12-01T15:00:00.000Z';
export const STROKES = [
  [
    [10, 12],
    [34.5, 40],
    [60, 22],
  ],
  [
    [70, 20],
    [92, 48],
  ],
];

export interface Person {
  user: User;
  agent: TestAgent;
}

/** A company small enough for a test: one site, a lead, two helpers, two supervisors, safety, and people of another site. */
export interface Company {
  app: Express;
  site: Site;
  lead: Person;
  helper: Person;
  helper2: Person;
  supervisor: Person;
  supervisor2: Person;
  safety: Person;
  otherSite: Site;
  stranger: Person;
  otherSupervisor: Person;
}

export async function buildCompany(): Promise<Company> {
  clock.set(NOW);
  const app = buildApp();
  const site = await buildSite({ name: 'Marlow Annex' });
  const otherSite = await buildSite({ name: 'Quarry House', timeZone: 'America/Denver' });
  const person = async (role: User['role'], sites: Site[], name: string): Promise<Person> => {
    const user = await buildUser({ role, sites, name });
    return { user, agent: await signIn(app, user) };
  };
  return {
    app,
    site,
    otherSite,
    lead: await person('lead', [site], 'Ada Lind'),
    helper: await person('helper', [site], 'Beto Cruz'),
    helper2: await person('helper', [site], 'Cam Oduya'),
    supervisor: await person('supervisor', [site], 'Dana Roe'),
    supervisor2: await person('supervisor', [site], 'Emil Tran'),
    safety: await person('safety', [site], 'Fay Moss'),
    stranger: await person('lead', [otherSite], 'Gus Hale'),
    otherSupervisor: await person('supervisor', [otherSite], 'Hana Voss'),
  };
}

/** The sound content with this company's site and people in it. */
export function contentFor(
  { site, lead, helper }: Company,
  content: WorksheetContent = soundWorksheet().content,
): WorksheetContent {
  const copy = structuredClone(content);
  const userIds = [lead.user.id, helper.user.id];
  return {
    ...copy,
    job: { ...copy.job, siteId: site.id },
    crew: (copy.crew ?? []).map((member, index) => ({ ...member, userId: userIds[index] ?? v7() })),
  };
}

/** The same, with work on the energized path. */
export function energizedContentFor(company: Company): WorksheetContent {
  return contentFor(company, soundEnergizedWorksheet().content);
}

export async function read(person: Person, id: string): Promise<WorksheetRecord> {
  const answer = await person.agent.get(`/api/worksheets/${id}`);
  if (answer.status !== 200) throw new Error(`reading answered ${answer.status}`);
  return answer.body as WorksheetRecord;
}

export async function create(
  company: Company,
  content: WorksheetContent = contentFor(company),
): Promise<WorksheetRecord> {
  const answer = await company.lead.agent.post('/api/worksheets').send({ content });
  if (answer.status !== 201) {
    throw new Error(`creating answered ${answer.status} ${JSON.stringify(answer.body)}`);
  }
  return answer.body as WorksheetRecord;
}

/** The body of a signature with the PIN, for the content as it stands. */
export function signatureBody(record: WorksheetRecord, meaning: Meaning, signer: Person) {
  return {
    id: v7(),
    meaning,
    signerId: signer.user.id,
    pin: PIN,
    strokes: STROKES,
    contentHash: record.contentHash,
  };
}

export async function sign(
  record: WorksheetRecord,
  meaning: Meaning,
  signer: Person,
  on: Person = signer,
): Promise<WorksheetRecord> {
  const answer = await on.agent
    .post(`/api/worksheets/${record.id}/signatures`)
    .send(signatureBody(record, meaning, signer));
  if (answer.status !== 201) {
    throw new Error(`${meaning} answered ${answer.status} ${JSON.stringify(answer.body)}`);
  }
  return read(signer, record.id);
}

export async function toBriefing(company: Company, content?: WorksheetContent) {
  return sign(await create(company, content), 'prepared', company.lead);
}

export async function toCountersign(company: Company, content?: WorksheetContent) {
  return sign(await toBriefing(company, content), 'acknowledged', company.helper);
}

export async function toInForce(company: Company, content?: WorksheetContent) {
  return sign(await toCountersign(company, content), 'countersigned', company.supervisor);
}

export function act(person: Person, record: { id: string }, name: string, body: object = {}) {
  return person.agent.post(`/api/worksheets/${record.id}/${name}`).send(body);
}

export function prove(
  company: Company,
  record: { id: string },
  proof: object = soundWorksheet().proof,
) {
  return act(company.lead, record, 'proofs', { id: v7(), proof, pin: PIN });
}

export function close(
  company: Company,
  record: { id: string },
  closeOut: object = soundWorksheet().closeOut,
) {
  return act(company.lead, record, 'close', { closeOut, pin: PIN });
}
