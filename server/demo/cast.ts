import { hash } from '@node-rs/argon2';
import { RubberGoods } from '../models/RubberGoods';
import { Site } from '../models/Site';
import { User } from '../models/User';
import type { CurrentUser } from '../currentUser';
import { loadCurrentUser } from '../services/loadCurrentUser';
import { DEMO_SITES } from './register';
import { DEMO_GLOVES } from './rubberGoods';
import type { DemoScenario } from './scenarios';
import { DEMO_PEOPLE, demoUser } from './seed';

/** Who and what a demo worksheet is made with. */
export interface Cast {
  lead: CurrentUser;
  helpers: CurrentUser[];
  supervisor: CurrentUser;
  site: Site;
  glovesId: string | undefined;
}

/** A demo person as the services know them. */
export async function actor(name: string): Promise<CurrentUser> {
  const { id } = await demoUser(`${name}@wideberth.example`);
  const loaded = await loadCurrentUser(id);
  if (loaded === null) throw new Error(`${name} of the demo is retired.`);
  return loaded.user;
}

/** The PIN that everybody knows. */
export function pinOf({ email }: CurrentUser): string {
  return DEMO_PEOPLE.find((person) => person.email === email)?.pin ?? '';
}

/** The people, the site and the gloves of a scenario. */
export async function castOf({ lead, helpers, supervisor, site }: DemoScenario): Promise<Cast> {
  const place = await Site.findOne({ where: { name: site }, rejectOnEmpty: true });
  const serial = DEMO_GLOVES[DEMO_SITES.findIndex(({ name }) => name === site)] ?? '';
  const gloves = await RubberGoods.findOne({
    where: { serial, siteId: place.id, retiredAt: null },
  });
  return {
    lead: await actor(lead),
    helpers: await Promise.all(helpers.map(actor)),
    supervisor: await actor(supervisor),
    site: place,
    glovesId: gloves?.id,
  };
}

/**
 * Runs `work` while the demo's PINs are hashed at the least cost: hundreds of
 * signatures would otherwise be a quarter of a minute of hashing. The hashes
 * of full cost are put back, whatever happens.
 */
export async function withQuickPins(work: () => Promise<void>): Promise<void> {
  const people = await User.findAll({ where: { demo: true } });
  for (const { id, email } of people) {
    const pin = DEMO_PEOPLE.find((person) => person.email === email)?.pin ?? '';
    const pinHash = await hash(pin, { memoryCost: 8, timeCost: 1, parallelism: 1 });
    await User.update({ pinHash }, { where: { id } });
  }
  try {
    await work();
  } finally {
    for (const { id, pinHash } of people) await User.update({ pinHash }, { where: { id } });
  }
}
