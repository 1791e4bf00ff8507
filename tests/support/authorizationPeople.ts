import { generateKeyPairSync } from 'node:crypto';
import type { Express } from 'express';
import sharp from 'sharp';
import supertest from 'supertest';
import { v7 } from 'uuid';
import type { WorksheetRecord } from '@/shared/record';
import type { WorksheetContent } from '@/shared/worksheet';
import { ROLES } from '@/shared/user';
import type { Role } from '@/shared/user';
import { clock } from '@/server/clock';
import { Device } from '@/server/models/Device';
import { PasswordReset } from '@/server/models/PasswordReset';
import { RubberGoods } from '@/server/models/RubberGoods';
import type { Site } from '@/server/models/Site';
import { SiteMember } from '@/server/models/SiteMember';
import type { User } from '@/server/models/User';
import { hashToken, LINK_MILLISECONDS } from '@/server/services/sendMail';
import { act, signatureBody } from './record';
import type { Person } from './record';
import { buildSite, buildUser, signIn } from './server';
import { soundWorksheet } from './soundWorksheet';

/**
 * How somebody stands to a record: its lead, its creator (at another site by
 * now), named on its crew, named in an earlier signed revision only, at its
 * site, at another, at none.
 */
export const RELATIONS = [
  'own',
  'creator',
  'named',
  'wasNamed',
  'sameSite',
  'otherSite',
  'noSite',
] as const;
export type Relation = (typeof RELATIONS)[number];

/** The ids that fill the parameters of a path. */
export interface Target {
  worksheetId: string;
  contentHash: string;
  questionId: string;
  attachmentId: string;
  deviceId: string;
  sessionId: string;
  personId: string;
  siteId: string;
  goodsId: string;
  /** Of a link to choose a password, still open. */
  token: string;
}

export interface Asker extends Person {
  /** For messages of the test: `helper named`. */
  name: string;
  role: Role | 'nobody';
  relation: Relation;
  target: Target;
}

interface Places {
  app: Express;
  site: Site;
  otherSite: Site;
  goodsId: string;
  supervisor: Person;
}

async function join(app: Express, role: Role, sites: Site[]): Promise<Person> {
  const user = await buildUser({ role, sites });
  return { user, agent: await signIn(app, user) };
}

function contentWith(site: Site, [lead, ...others]: readonly User[]): WorksheetContent {
  const { content } = soundWorksheet();
  const [first, second] = content.crew ?? [];
  return {
    ...content,
    job: { ...content.job, siteId: site.id },
    crew: [
      { ...first, userId: lead?.id ?? '' },
      ...others.map(({ id }, index) => ({ ...second, id: `c${index + 2}`, userId: id })),
    ],
  };
}

async function post<T>(person: Person, path: string, body: object): Promise<T> {
  const answer = await person.agent.post(`/api${path}`).send(body);
  if (answer.status > 299) throw new Error(`${path}: ${answer.status} ${answer.text}`);
  return answer.body as T;
}

interface Plan {
  lead: Person;
  creator?: Person;
  /** Of the first, signed revision; those of the second follow in `after`. */
  crew?: readonly User[];
  after?: readonly User[];
}

/**
 * A draft at its second revision that is not ready: whatever a person may do
 * with it ends as bad input or a conflict and moves nothing. Its photo belongs
 * to the first revision, which is signed.
 */
async function targetOf(places: Places, plan: Plan): Promise<Target> {
  const { site, supervisor } = places;
  const { lead, creator = lead, crew = [lead.user], after = [lead.user] } = plan;
  const content = contentWith(site, crew);
  const first = await post<WorksheetRecord>(creator, '/worksheets', {
    content,
    leadId: lead.user.id,
  });
  const path = `/worksheets/${first.id}`;
  const question = await post<{ id: string }>(lead, `${path}/questions`, { text: 'Which door?' });
  const photo = await sharp({ create: { width: 8, height: 8, channels: 3, background: '#888' } })
    .jpeg()
    .toBuffer();
  const added = await lead.agent
    .post(`/api${path}/attachments`)
    .field('section', 'job')
    .attach('file', photo, 'photo.jpg');
  const { body: draft } = await lead.agent.get(`/api${path}`);
  const prepared = signatureBody(draft as WorksheetRecord, 'prepared', lead);
  await post(lead, `${path}/signatures`, prepared);
  await post(supervisor, `${path}/return`, { reason: 'Not so.' });
  const revised = await act(lead, first, 'revise');
  const { job, crew: kept } = contentWith(site, after);
  const saved = await lead.agent
    .put(`/api${path}`)
    .set('If-Match', `"${revised.body.version}"`)
    .send({ content: { job, crew: kept } });
  return {
    worksheetId: first.id,
    contentHash: saved.body.contentHash,
    questionId: question.id,
    attachmentId: added.body.id,
    ...(await ownedBy(places, lead)),
  };
}

/** What belongs to a person and to their site, beside worksheets. */
async function ownedBy({ app, site, goodsId }: Places, { user, agent }: Person) {
  const { publicKey } = generateKeyPairSync('ec', { namedCurve: 'P-256' });
  const device = await Device.create({
    id: v7(),
    userId: user.id,
    publicKey: publicKey.export({ format: 'jwk' }) as Device['publicKey'],
    label: 'Phone',
    createdAt: clock.now(),
  });
  await signIn(app, user);
  const { body } = await agent.get('/api/sessions');
  const other = (body.items as { id: string; current: boolean }[]).find(({ current }) => !current);
  return {
    deviceId: device.id,
    sessionId: other?.id ?? '',
    personId: user.id,
    siteId: site.id,
    goodsId,
    token: await openLink(user.id),
  };
}

async function openLink(userId: string): Promise<string> {
  const token = `${v7()}-of-${userId}`;
  const now = clock.now();
  await PasswordReset.create({
    tokenHash: hashToken(token),
    userId,
    kind: 'reset',
    expiresAt: new Date(now.getTime() + LINK_MILLISECONDS),
    createdAt: now,
  });
  return token;
}

async function placesFor(app: Express): Promise<Places> {
  const [site, otherSite] = [await buildSite(), await buildSite()];
  const goods = await RubberGoods.create({
    id: v7(),
    siteId: site.id,
    kind: 'gloves',
    gloveClass: '00',
    serial: 'A-1',
    createdAt: clock.now(),
    updatedAt: clock.now(),
  });
  const supervisor = await join(app, 'supervisor', [site]);
  return { app, site, otherSite, goodsId: goods.id, supervisor };
}

type Row = Omit<Asker, 'name'>;

/** Those who have a worksheet of their own: made when they could, kept in whatever role they have now. */
async function withTheirOwn(places: Places, lead: Person): Promise<Row[]> {
  const { app, site, otherSite } = places;
  const rows: Row[] = [];
  for (const role of ROLES) {
    const creator = await join(app, 'supervisor', [site]);
    const made = await targetOf(places, { lead, creator });
    await creator.user.update({ role });
    await SiteMember.update({ siteId: otherSite.id }, { where: { userId: creator.user.id } });
    rows.push({ ...creator, role, relation: 'creator', target: made });
    if (role === 'lead') continue;
    const owner = await join(app, 'lead', [site]);
    const target = await targetOf(places, { lead: owner });
    await owner.user.update({ role });
    rows.push({ ...owner, role, relation: 'own', target });
  }
  return rows;
}

/** Everybody whose requests are compared with the contract: each role in each relation, the retired, and no session. */
export async function buildAskers(app: Express): Promise<Asker[]> {
  const places = await placesFor(app);
  const { site, otherSite } = places;
  const sites = {
    ...{ named: [site], wasNamed: [site], sameSite: [site] },
    ...{ otherSite: [otherSite], noSite: [] },
  };
  const lead = await join(app, 'lead', [site]);
  const others: Omit<Row, 'target'>[] = [];
  for (const role of ROLES) {
    for (const [relation, where] of Object.entries(sites) as [Relation, Site[]][]) {
      others.push({ ...(await join(app, role, where)), role, relation });
    }
  }
  const usersAt = (relation: Relation) =>
    others.filter((row) => row.relation === relation).map(({ user }) => user);
  const after = [lead.user, ...usersAt('named')];
  const target = await targetOf(places, { lead, crew: [...after, ...usersAt('wasNamed')], after });
  const gone = await join(app, 'lead', [site]);
  await gone.user.update({ retiredAt: clock.now() });
  const noSession = { user: gone.user, agent: supertest.agent(app) };
  const rows: Row[] = [
    { ...lead, role: 'lead', relation: 'own', target },
    ...(await withTheirOwn(places, lead)),
    ...others.map((row) => ({ ...row, target })),
    { ...gone, role: 'nobody', relation: 'sameSite', target },
    { ...noSession, role: 'nobody', relation: 'noSite', target },
  ];
  return rows.map((row) => ({ ...row, name: `${row.role} ${row.relation}` }));
}
