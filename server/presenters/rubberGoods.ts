import { addMonths, format, parseISO } from 'date-fns';
import { gloveStatus } from '@/hazard';
import type { RubberGoods as RubberGoodsRecord } from '@/shared/register';
import type { RubberGoods } from '../models/RubberGoods';
import type { RubberGoodsTest } from '../models/RubberGoodsTest';
import { todayIn } from './user';

export interface RubberGoodsParts {
  goods: RubberGoods;
  tests: RubberGoodsTest[];
  timeZone: string;
}

/** Months between two tests, 29 CFR 1910.137 Table I-5. Line hose and covers have no interval there: the shortest of the table counts. */
const TEST_EVERY_MONTHS = { sleeves: 12, blanket: 12, 'line hose': 6, cover: 6 } as const;

interface Status {
  lastTestedOn: string;
  dueOn: string;
  inTest: boolean;
}

/** Whether an item may be used today. Never with a latest test that failed, and gloves by the rule of `hazard`. */
function statusOf({ goods, tests, timeZone }: RubberGoodsParts): Status {
  const on = todayIn(timeZone);
  const latestFirst = [...tests].sort(
    (one, other) => other.testedOn.localeCompare(one.testedOn) || other.position - one.position,
  );
  const lastTestedOn = latestFirst.find(({ passed }) => passed)?.testedOn;
  if (lastTestedOn === undefined) return { lastTestedOn: '', dueOn: '', inTest: false };
  const passedLast = latestFirst[0]?.passed === true;
  const { dueOn, inTest } = intervalOf(goods, lastTestedOn, on);
  return { lastTestedOn, dueOn, inTest: passedLast && inTest && goods.retiredAt === null };
}

function intervalOf({ kind, gloveClass, issuedOn }: RubberGoods, lastTestedOn: string, on: string) {
  if (kind === 'gloves') {
    const issued = issuedOn === null ? {} : { issuedOn };
    return gloveStatus({ gloveClass, lastTestedOn, ...issued, on, volts: 0 });
  }
  const due = format(addMonths(parseISO(lastTestedOn), TEST_EVERY_MONTHS[kind]), 'yyyy-MM-dd');
  return { dueOn: due, inTest: lastTestedOn <= on && on <= due };
}

export function presentRubberGoods(parts: RubberGoodsParts): RubberGoodsRecord {
  const { goods, tests } = parts;
  const { id, siteId, kind, gloveClass, serial, size, issuedOn, retiredAt, retiredBecause } = goods;
  return {
    id,
    siteId,
    kind,
    gloveClass,
    serial,
    size,
    issuedOn,
    tests: tests.map(({ testedOn, passed, laboratory }) => ({
      testedOn,
      passed,
      ...(laboratory === null ? {} : { laboratory }),
    })),
    ...statusOf(parts),
    retired: retiredAt !== null,
    retiredBecause,
  };
}
