import { col, fn, where } from 'sequelize';
import { v7 } from 'uuid';
import type { Role } from '@/shared/user';
import { hashSecret } from '../argon';
import { clock } from '../clock';
import { transact } from '../db';
import { Site } from '../models/Site';
import { SiteMember } from '../models/SiteMember';
import { User } from '../models/User';
import { recordEvent } from '../services/recordEvent';
import { dateOf, dayFrom, FOUNDED } from './days';
import { DEMO_SITES } from './register';

export const DEMO_PASSWORD = 'wide-berth-demo';

interface DemoPerson {
  name: string;
  email: string;
  role: Role;
  pin: string;
  /** Places in `DEMO_SITES`. */
  sites: number[];
  qualifiedMonths: number | null;
  /** When they left, in months from today. */
  retiredMonths?: number;
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
    sites: [0, 1, 2, 3],
    qualifiedMonths: 28,
  },
  {
    name: 'Marguerite Osei-Lund',
    email: 'safety@wideberth.example',
    role: 'safety',
    pin: '975318',
    sites: [0, 1, 2, 3, 4, 5],
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
    sites: [0, 2, 5],
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
  {
    name: 'Ilse Vandermoor',
    email: 'ilse@wideberth.example',
    role: 'lead',
    pin: '427160',
    sites: [3, 4],
    qualifiedMonths: 1,
  },
  {
    name: 'Fintan Abellard',
    email: 'fintan@wideberth.example',
    role: 'lead',
    pin: '860143',
    sites: [4, 5],
    qualifiedMonths: 14,
  },
  {
    name: 'Anselm Brightwater',
    email: 'anselm@wideberth.example',
    role: 'lead',
    pin: '539208',
    sites: [2],
    qualifiedMonths: -1,
  },
  {
    name: 'Yolotzin Cardenal',
    email: 'yolotzin@wideberth.example',
    role: 'helper',
    pin: '271835',
    sites: [1, 3, 4],
    qualifiedMonths: null,
    locale: 'es-MX',
  },
  {
    name: 'Rufus Tennyhill',
    email: 'rufus@wideberth.example',
    role: 'helper',
    pin: '906417',
    sites: [2, 5],
    qualifiedMonths: null,
    retiredMonths: -2,
  },
  {
    name: 'Perpetua Langstroth',
    email: 'perpetua@wideberth.example',
    role: 'supervisor',
    pin: '648052',
    sites: [3, 4, 5],
    qualifiedMonths: 20,
  },
];

/** Everyone of the invented company. */
export const DEMO_PEOPLE: readonly DemoPerson[] = [...DEMO_ACCOUNTS, ...OTHERS];

/** Somebody new, whose invitation is out: no password, so no published one either. */
export const DEMO_INVITED = {
  name: 'Delphine Arrowsmith',
  email: 'delphine@wideberth.example',
  role: 'helper',
  sites: [0, 3],
  invitedDaysAgo: 1,
} as const;

/** True where the database holds accounts whose passwords everybody knows. */
export async function hasDemo(): Promise<boolean> {
  return (await User.count({ where: { demo: true } })) > 0;
}

/** A demo person by e-mail. */
export function demoUser(email: string): Promise<User> {
  return User.findOne({ where: where(fn('lower', col('email')), email), rejectOnEmpty: true });
}

/** How much work the demo holds: `few` are the worksheets of the last days. */
export type DemoExtent = 'none' | 'few' | 'all';

/**
 * Fills an empty database with an invented company, once, and moves the
 * demo's open worksheets to today. A database with people of its own is left alone.
 */
export async function seedDemo({
  worksheets = 'all',
}: { worksheets?: DemoExtent } = {}): Promise<void> {
  const isEmpty = (await User.count()) === 0;
  if (isEmpty) await seedRegister();
  if (!(await hasDemo())) return;
  // Loaded late: it knows the people of this module.
  const { growDemo, moveOpenWorksheetsToToday } = await import('./worksheets');
  await (isEmpty ? growDemo(worksheets) : moveOpenWorksheetsToToday());
}

async function seedRegister(): Promise<void> {
  const now = clock.now();
  const founded = dayFrom(now, FOUNDED);
  const stamps = { createdAt: founded, updatedAt: founded };
  const passwordHash = await hashSecret(DEMO_PASSWORD);
  const people = await Promise.all(
    DEMO_PEOPLE.map(async (person) => ({
      ...person,
      id: v7(),
      pinHash: await hashSecret(person.pin),
    })),
  );
  const sites = DEMO_SITES.map((site) => ({ ...site, id: v7() }));
  clock.set(founded);
  await transact(async (transaction) => {
    for (const site of sites) await Site.create({ ...site, ...stamps }, { transaction });
    for (const { name, email, role, pinHash, id, qualifiedMonths, locale } of people) {
      const qualifiedThrough =
        qualifiedMonths === null ? null : dateOf(dayFrom(now, { months: qualifiedMonths }));
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
  }).finally(() => clock.set(null));
}
