import { col, fn, where } from 'sequelize';
import { v7 } from 'uuid';
import type { Role } from '@/shared/user';
import { hashSecret } from '../argon';
import { clock } from '../clock';
import { transact } from '../db';
import { RubberGoods } from '../models/RubberGoods';
import { RubberGoodsTest } from '../models/RubberGoodsTest';
import { Site } from '../models/Site';
import { SiteMember } from '../models/SiteMember';
import { User } from '../models/User';
import { recordEvent } from '../services/recordEvent';
import { DEMO_RUBBER_GOODS, DEMO_SITES } from './register';

export const DEMO_PASSWORD = 'wide-berth-demo';

interface DemoPerson {
  name: string;
  email: string;
  role: Role;
  pin: string;
  /** Places in `DEMO_SITES`. */
  sites: number[];
  qualifiedMonths: number | null;
  locale?: 'es-MX';
}

/** The four accounts that the start prints, one a role, all at the first site by name. */
export const DEMO_ACCOUNTS: DemoPerson[] = [
  {
    name: 'Renata Quillfeather',
    email: 'lead@wideberth.example',
    role: 'lead',
    pin: '246810',
    sites: [0, 1, 2],
    qualifiedMonths: 19,
  },
  {
    name: 'Teo Barrancas',
    email: 'helper@wideberth.example',
    role: 'helper',
    pin: '135792',
    sites: [0, 1],
    qualifiedMonths: null,
    locale: 'es-MX',
  },
  {
    name: 'Odalys Thornbury',
    email: 'supervisor@wideberth.example',
    role: 'supervisor',
    pin: '864209',
    sites: [0, 1, 2],
    qualifiedMonths: 28,
  },
  {
    name: 'Marguerite Osei-Lund',
    email: 'safety@wideberth.example',
    role: 'safety',
    pin: '975318',
    sites: [0, 1, 2],
    qualifiedMonths: 11,
  },
];

const OTHERS: DemoPerson[] = [
  {
    name: 'Casimir Doyle-Reyes',
    email: 'casimir@wideberth.example',
    role: 'lead',
    pin: '580317',
    sites: [0, 1],
    qualifiedMonths: 24,
  },
  {
    name: 'Winona Prakash',
    email: 'winona@wideberth.example',
    role: 'lead',
    pin: '704926',
    sites: [1, 2],
    qualifiedMonths: 6,
  },
  {
    name: 'Ignacio Velasquillo',
    email: 'ignacio@wideberth.example',
    role: 'helper',
    pin: '318604',
    sites: [0, 2],
    qualifiedMonths: null,
    locale: 'es-MX',
  },
  {
    name: 'Beatrix Hallorann',
    email: 'beatrix@wideberth.example',
    role: 'supervisor',
    pin: '692751',
    sites: [0, 1],
    qualifiedMonths: 33,
  },
];

/** Everyone of the invented company. */
export const DEMO_PEOPLE: readonly DemoPerson[] = [...DEMO_ACCOUNTS, ...OTHERS];

/** True where the database holds accounts whose passwords everybody knows. */
export async function hasDemo(): Promise<boolean> {
  return (await User.count({ where: { demo: true } })) > 0;
}

/** A demo person by e-mail. */
export function demoUser(email: string): Promise<User> {
  return User.findOne({ where: where(fn('lower', col('email')), email), rejectOnEmpty: true });
}

/**
 * Fills an empty database with an invented company, once, and moves the
 * demo's open worksheets to today. A database with people of its own is left alone.
 */
export async function seedDemo(): Promise<void> {
  if ((await User.count()) === 0) await seedRegister();
  if (!(await hasDemo())) return;
  const worksheets = await loadWorksheets();
  await worksheets?.seedWorksheets();
}

interface WorksheetSeed {
  /** Makes the demo's worksheets once; later it moves those that are open to today. */
  seedWorksheets(): Promise<void>;
}

async function loadWorksheets(): Promise<WorksheetSeed | null> {
  const file = './worksheets';
  try {
    return (await import(file)) as WorksheetSeed;
  } catch (error) {
    if (error instanceof Error && 'code' in error && /MODULE_NOT_FOUND$/.test(String(error.code))) {
      return null;
    }
    throw error;
  }
}

async function seedRegister(): Promise<void> {
  const now = clock.now();
  const stamps = { createdAt: now, updatedAt: now };
  const passwordHash = await hashSecret(DEMO_PASSWORD);
  const people = await Promise.all(
    DEMO_PEOPLE.map(async (person) => ({
      ...person,
      id: v7(),
      pinHash: await hashSecret(person.pin),
    })),
  );
  const sites = DEMO_SITES.map((site) => ({ ...site, id: v7() }));
  await transact(async (transaction) => {
    for (const site of sites) await Site.create({ ...site, ...stamps }, { transaction });
    for (const { name, email, role, pinHash, id, qualifiedMonths, locale } of people) {
      const qualifiedThrough = qualifiedMonths === null ? null : dateInMonths(now, qualifiedMonths);
      await User.create(
        {
          id,
          name,
          email,
          role,
          passwordHash,
          pinHash,
          qualifiedThrough,
          demo: true,
          locale: locale ?? 'en-US',
          ...stamps,
        },
        { transaction },
      );
    }
    await SiteMember.bulkCreate(
      people.flatMap(({ id, sites: places }) =>
        places.flatMap((place) => {
          const siteId = sites[place]?.id;
          return siteId === undefined ? [] : [{ siteId, userId: id }];
        }),
      ),
      { transaction },
    );
    for (const { site, tests, issuedMonths, ...item } of DEMO_RUBBER_GOODS) {
      const siteId = sites[site]?.id;
      if (siteId === undefined) continue;
      const id = v7();
      const issuedOn = issuedMonths === null ? null : dateInMonths(now, issuedMonths);
      await RubberGoods.create({ ...item, id, siteId, issuedOn, ...stamps }, { transaction });
      await RubberGoodsTest.bulkCreate(
        tests.map(({ months, ...test }, position) => ({
          rubberGoodsId: id,
          position,
          testedOn: dateInMonths(now, months),
          ...test,
        })),
        { transaction },
      );
    }
    for (const { id } of people) {
      await recordEvent(transaction, {
        subjectType: 'user',
        subjectId: id,
        revision: null,
        type: 'created',
        actorId: null,
        payload: { demo: true },
      });
    }
  });
}

function dateInMonths(from: Date, months: number): string {
  const date = new Date(from);
  date.setUTCDate(1);
  date.setUTCMonth(date.getUTCMonth() + months);
  date.setUTCDate(Math.min(from.getUTCDate(), 28));
  return date.toISOString().slice(0, 10);
}
