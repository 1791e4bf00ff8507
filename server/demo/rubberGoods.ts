import type { GloveClass } from '@/hazard/enumerations';
import type { RubberGoodsKind, RETIRED_BECAUSE } from '@/shared/register';
import type { DemoDay } from './days';

export interface DemoRubberGoods {
  /** Place in `DEMO_SITES`. */
  site: number;
  kind: RubberGoodsKind;
  gloveClass: GloveClass;
  serial: string;
  size: string;
  issued: DemoDay | null;
  tests: (DemoDay & { passed: boolean })[];
  retired?: DemoDay & { because: (typeof RETIRED_BECAUSE)[number] };
}

export const DEMO_LABORATORY = 'Tallgrass Dielectric, Millhaven';

/** The pair that the crews of each site wear: never out of test in all of the two years. */
export const DEMO_GLOVES = [
  'AC-0-117',
  'BD-0-203',
  'CC-00-066',
  'DS-0-310',
  'EC-0-402',
  'FL-00-501',
] as const;

const passed = (months: number, days = 0) => ({ months, days, passed: true });
const failed = (months: number, days = 0) => ({ months, days, passed: false });
const ALWAYS_IN_TEST = [passed(-25), passed(-20), passed(-15), passed(-10), passed(-6), passed(-1)];

type Item = [site: number, kind: RubberGoodsKind, gloveClass: GloveClass, serial: string];

function goods(
  [site, kind, gloveClass, serial]: Item,
  size: string,
  rest: Pick<DemoRubberGoods, 'issued' | 'tests' | 'retired'>,
): DemoRubberGoods {
  return { site, kind, gloveClass, serial, size, ...rest };
}

const crewPair = (site: number, gloveClass: GloveClass, size: string): DemoRubberGoods =>
  goods([site, 'gloves', gloveClass, DEMO_GLOVES[site] ?? ''], size, {
    issued: { months: -25 },
    tests: ALWAYS_IN_TEST,
  });

/** Each state that the register shows: in test, due within 30 days, overdue, failed, retired. */
export const DEMO_RUBBER_GOODS: DemoRubberGoods[] = [
  crewPair(0, '0', '9'),
  goods([0, 'gloves', '0', 'AC-0-121'], '10', { issued: { months: -1 }, tests: [passed(-3)] }),
  goods([0, 'gloves', '00', 'AC-00-042'], '8', {
    issued: { months: -14 },
    tests: [passed(-14), passed(-7)],
  }),
  goods([0, 'sleeves', '0', 'AC-S-009'], 'L', {
    issued: { months: -5 },
    tests: [passed(-5, -10)],
  }),
  goods([0, 'blanket', '1', 'AC-B-031'], '36 in', { issued: { months: -2 }, tests: [passed(-2)] }),
  goods([0, 'line hose', '1', 'AC-H-007'], '4 ft', { issued: null, tests: [passed(-9)] }),
  crewPair(1, '0', '10'),
  goods([1, 'blanket', '1', 'BD-B-014'], '36 in', { issued: { months: -4 }, tests: [passed(-4)] }),
  goods([1, 'gloves', '0', 'BD-0-188'], '9', {
    issued: { months: -19 },
    tests: [passed(-20), passed(-14), failed(-8)],
    retired: { months: -8, days: 2, because: 'failed test' },
  }),
  goods([1, 'gloves', '0', 'BD-0-209'], '11', {
    issued: { months: -7 },
    tests: [passed(-12), passed(-6, 12)],
  }),
  crewPair(2, '00', '9'),
  goods([2, 'gloves', '00', 'CC-00-058'], '10', {
    issued: { months: -9 },
    tests: [passed(-9), failed(-3)],
  }),
  goods([2, 'gloves', '00', 'CC-00-071'], '8', { issued: null, tests: [passed(-2)] }),
  crewPair(3, '0', '9'),
  goods([3, 'gloves', '0', 'DS-0-318'], '10', {
    issued: { months: -6 },
    tests: [passed(-6, -8)],
  }),
  goods([3, 'sleeves', '0', 'DS-S-022'], 'M', { issued: { months: -3 }, tests: [passed(-3)] }),
  goods([3, 'cover', '1', 'DS-C-003'], '12 in', { issued: { months: -11 }, tests: [passed(-11)] }),
  crewPair(4, '0', '11'),
  goods([4, 'gloves', '0', 'EC-0-395'], '10', {
    issued: { months: -16 },
    tests: [passed(-17), passed(-11)],
    retired: { months: -5, because: 'worn out' },
  }),
  goods([4, 'gloves', '0', 'EC-0-411'], '9', {
    issued: { months: -5 },
    tests: [passed(-6, 22)],
  }),
  goods([4, 'blanket', '1', 'EC-B-018'], '36 in', {
    issued: { months: -10 },
    tests: [passed(-10), failed(-4)],
    retired: { months: -4, days: 3, because: 'failed test' },
  }),
  crewPair(5, '00', '9'),
  goods([5, 'gloves', '00', 'FL-00-489'], '8', {
    issued: { months: -12 },
    tests: [passed(-13), passed(-7, 4)],
  }),
  goods([5, 'gloves', '00', 'FL-00-507'], '10', { issued: null, tests: [passed(-1)] }),
];
