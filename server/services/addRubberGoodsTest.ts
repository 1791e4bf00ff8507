import type { Transaction } from 'sequelize';
import { v7 } from 'uuid';
import type { z } from 'zod';
import type { rubberGoodsTestInputSchema } from '@/shared/register';
import { clock } from '../clock';
import type { CurrentUser } from '../currentUser';
import { transact } from '../db';
import { Event } from '../models/Event';
import { RubberGoods } from '../models/RubberGoods';
import { RubberGoodsTest } from '../models/RubberGoodsTest';
import { Site } from '../models/Site';
import { todayIn } from '../presenters/user';
import { idTaken, invalidField } from '../problem';
import { recordEvent } from './recordEvent';

type NewTest = z.infer<typeof rubberGoodsTestInputSchema>;
export type TestFields = Pick<RubberGoodsTest, 'testedOn' | 'passed' | 'laboratory'>;

export const isSameTest = (one: TestFields, other: TestFields) =>
  one.testedOn === other.testedOn &&
  one.passed === other.passed &&
  one.laboratory === other.laboratory;

/**
 * Appends one test to an item. The item's row is held meanwhile, so that of two
 * people who record tests at once neither loses theirs. A test that failed
 * retires the item in the same moment: nobody can choose it in between.
 */
export function addRubberGoodsTest(
  actor: CurrentUser,
  goodsId: string,
  { id = v7(), ...fields }: NewTest,
): Promise<{ goods: RubberGoods; created: boolean }> {
  const test: TestFields = { ...fields, laboratory: fields.laboratory ?? null };
  return transact(async (transaction) => {
    const lock = transaction.LOCK.UPDATE;
    const goods = await RubberGoods.findByPk(goodsId, { transaction, lock, rejectOnEmpty: true });
    if (await isRepeat(actor, { goodsId, id, test }, transaction)) return { goods, created: false };
    await refuseFuture(goods, test.testedOn, transaction);
    const last = await RubberGoodsTest.max<number | null, RubberGoodsTest>('position', {
      where: { rubberGoodsId: goodsId },
      transaction,
    });
    const position = (last ?? -1) + 1;
    await RubberGoodsTest.create(
      { rubberGoodsId: goodsId, position, id, ...test },
      { transaction },
    );
    const now = clock.now();
    const retires = !test.passed && goods.retiredAt === null;
    await goods.update(
      {
        updatedAt: now,
        ...(retires ? { retiredAt: now, retiredBecause: 'failed test' as const } : {}),
      },
      { transaction },
    );
    await recordEvent(transaction, {
      subjectType: 'rubber-goods',
      subjectId: goodsId,
      type: 'tested',
      actorId: actor.id,
      payload: { testId: id, ...test, ...(retires ? { retired: true } : {}) },
    });
    return { goods, created: true };
  });
}

interface Attempt {
  goodsId: string;
  id: string;
  test: TestFields;
}

/** Whether this very test is here already by this person; any other test of that id is somebody else's. */
async function isRepeat(
  actor: CurrentUser,
  { goodsId, id, test }: Attempt,
  transaction: Transaction,
): Promise<boolean> {
  const known = await RubberGoodsTest.findOne({ where: { id }, transaction });
  if (known === null) return false;
  const own = await Event.count({
    where: { subjectId: goodsId, type: 'tested', actorId: actor.id, payload: { testId: id } },
    transaction,
  });
  if (known.rubberGoodsId !== goodsId || !isSameTest(known, test) || own === 0) throw idTaken();
  return true;
}

async function refuseFuture(
  { siteId }: RubberGoods,
  testedOn: string,
  transaction: Transaction,
): Promise<void> {
  const { timeZone } = await Site.findByPk(siteId, { transaction, rejectOnEmpty: true });
  if (testedOn <= todayIn(timeZone)) return;
  throw invalidField('#/testedOn', 'after-today', 'This day is still to come.');
}
