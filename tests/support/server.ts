import { readdirSync } from 'node:fs';
import supertest from 'supertest';
import { v7 } from 'uuid';
import type { Express } from 'express';
import type { Role } from '@/shared/user';
import { hashSecret } from '@/server/argon';
import { clock } from '@/server/clock';
import type { ReceivedMail } from '@/server/fakes/smtp';
import { Site } from '@/server/models/Site';
import { SiteMember } from '@/server/models/SiteMember';
import { User } from '@/server/models/User';

export const PASSWORD = 'a long test password';
export const PIN = '246810';

/** What the fake mail server got in this test file. */
export function receivedMails(): ReceivedMail[] {
  return (globalThis as { receivedMails?: ReceivedMail[] }).receivedMails ?? [];
}

/** Every file that the fake storage keeps in this test file, half-written ones too. */
export function storedFiles(): string[] {
  const { storageFolder = '' } = globalThis as { storageFolder?: string };
  const entries = readdirSync(storageFolder, { recursive: true, withFileTypes: true });
  return entries
    .filter((entry) => entry.isFile())
    .map(({ name }) => name)
    .sort();
}

let count = 0;

/** A site in the register. */
export function buildSite(fields: Partial<Site['_creationAttributes']> = {}): Promise<Site> {
  count += 1;
  const now = clock.now();
  return Site.create({
    id: v7(),
    name: `Site ${count}`,
    timeZone: 'America/Chicago',
    createdAt: now,
    updatedAt: now,
    ...fields,
  });
}

interface UserFields extends Partial<User['_creationAttributes']> {
  role?: Role;
  sites?: Site[];
  /** `null`: the person has not chosen one yet. */
  password?: string | null;
  pin?: string | null;
}

/** A person in the register, with a password and a PIN unless told otherwise. */
export async function buildUser({
  sites = [],
  password = PASSWORD,
  pin = PIN,
  ...fields
}: UserFields = {}): Promise<User> {
  count += 1;
  const now = clock.now();
  const user = await User.create({
    id: v7(),
    name: `Person ${count}`,
    email: `person${count}@company.example`,
    role: 'lead',
    qualifiedThrough: fields.role === 'helper' ? null : '2030-12-31',
    passwordHash: password === null ? null : await hashSecret(password),
    pinHash: pin === null ? null : await hashSecret(pin),
    createdAt: now,
    updatedAt: now,
    ...fields,
  });
  await SiteMember.bulkCreate(sites.map((site) => ({ siteId: site.id, userId: user.id })));
  return user;
}

/** A browser with that person's session. */
export async function signIn(
  app: Express,
  person: string | User,
  password = PASSWORD,
): Promise<ReturnType<typeof supertest.agent>> {
  const email = typeof person === 'string' ? person : person.email;
  const agent = supertest.agent(app);
  const answer = await agent.post('/api/session').send({ email, password });
  if (answer.status !== 201) throw new Error(`Sign-in answered ${answer.status}`);
  return agent;
}
