import { clock } from '../clock';
import type { CurrentUser } from '../currentUser';
import { RubberGoods } from '../models/RubberGoods';
import { Site } from '../models/Site';
import { createRubberGoods, updateRubberGoods } from '../services/saveRubberGoods';
import { createUser, updateUser } from '../services/saveUser';
import { dateOf, dayFrom } from './days';
import { DEMO_SITES } from './register';
import { DEMO_LABORATORY, DEMO_RUBBER_GOODS } from './rubberGoods';
import type { DemoRubberGoods } from './rubberGoods';
import { DEMO_INVITED, DEMO_PEOPLE, demoUser } from './seed';

interface Act {
  at: Date;
  run(): Promise<unknown>;
}

function testsUntil({ tests }: DemoRubberGoods, now: Date, at: Date) {
  return tests
    .filter((test) => dayFrom(now, test) <= at)
    .map((test) => ({
      testedOn: dateOf(dayFrom(now, test)),
      passed: test.passed,
      laboratory: DEMO_LABORATORY,
    }));
}

/** What safety wrote about one item: bought after its first test, every later test, its end. */
function actsOf(item: DemoRubberGoods, siteId: string, safety: CurrentUser, now: Date): Act[] {
  const { kind, gloveClass, serial, size, issued, tests, retired } = item;
  const update = async (changes: Parameters<typeof updateRubberGoods>[2]) => {
    const { id } = await RubberGoods.findOne({ where: { serial }, rejectOnEmpty: true });
    return updateRubberGoods(safety, id, changes);
  };
  const days = tests.map((test) => dayFrom(now, test));
  const [first = now, ...later] = days;
  const issuedOn = issued === null ? null : dateOf(dayFrom(now, issued));
  const create = () =>
    createRubberGoods(safety, {
      ...{ siteId, kind, gloveClass, serial, size, issuedOn },
      tests: testsUntil(item, now, first),
    });
  return [
    { at: first, run: create },
    ...later.map((at) => ({ at, run: () => update({ tests: testsUntil(item, now, at) }) })),
    ...(retired === undefined
      ? []
      : [
          {
            at: dayFrom(now, retired),
            run: () => update({ retired: true, retiredBecause: retired.because }),
          },
        ]),
  ];
}

async function invitation(safety: CurrentUser, now: Date): Promise<Act> {
  const { name, email, role, sites, invitedDaysAgo } = DEMO_INVITED;
  const names = sites.map((place) => DEMO_SITES[place]?.name ?? '');
  const siteIds = (await Site.findAll({ where: { name: names } })).map(({ id }) => id);
  return {
    at: dayFrom(now, { months: 0, days: -invitedDaysAgo }),
    run: () => createUser(safety, { name, email, role, siteIds }),
  };
}

function retirements(safety: CurrentUser, now: Date): Act[] {
  return DEMO_PEOPLE.flatMap(({ email, retiredMonths }) =>
    retiredMonths === undefined
      ? []
      : [
          {
            at: dayFrom(now, { months: retiredMonths }),
            run: async () => updateUser(safety, (await demoUser(email)).id, { retired: true }),
          },
        ],
  );
}

/**
 * The register as it grew: what it says on a day of the past is what was known
 * then. `advance` does everything that was written up to an instant.
 */
export async function demoTimeline(safety: CurrentUser, now: Date) {
  const sites = await Site.findAll();
  const idOf = (place: number) => sites.find(({ name }) => name === DEMO_SITES[place]?.name)?.id;
  const acts = [
    ...DEMO_RUBBER_GOODS.flatMap((item) => actsOf(item, idOf(item.site) ?? '', safety, now)),
    ...retirements(safety, now),
    await invitation(safety, now),
  ].sort((one, other) => one.at.getTime() - other.at.getTime());
  return {
    async advance(until: Date): Promise<void> {
      for (let [next] = acts; next !== undefined && next.at <= until; [next] = acts) {
        acts.shift();
        clock.set(next.at);
        await next.run();
      }
    },
  };
}
