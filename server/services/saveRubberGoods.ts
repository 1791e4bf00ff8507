import type { Transaction } from 'sequelize';
import { v7 } from 'uuid';
import type { z } from 'zod';
import type { rubberGoodsInputSchema, rubberGoodsUpdateSchema } from '@/shared/register';
import { clock } from '../clock';
import type { CurrentUser } from '../currentUser';
import { transact } from '../db';
import { RubberGoods } from '../models/RubberGoods';
import { RubberGoodsTest } from '../models/RubberGoodsTest';
import { Site } from '../models/Site';
import { invalidField, notFound } from '../problem';
import { isSameTest } from './addRubberGoodsTest';
import type { TestFields } from './addRubberGoodsTest';
import { createOnce } from './createOnce';
import { recordEvent } from './recordEvent';

type NewRubberGoods = z.infer<typeof rubberGoodsInputSchema>;
type RubberGoodsChanges = z.infer<typeof rubberGoodsUpdateSchema>;

export function createRubberGoods(
  actor: CurrentUser,
  { id = v7(), ...fields }: NewRubberGoods,
): Promise<{ record: RubberGoods; created: boolean }> {
  return createOnce({
    actor,
    id,
    find: (known) => RubberGoods.findByPk(known),
    create: (transaction) => insertRubberGoods(transaction, actor, { id, ...fields }),
  });
}

/** The item, its tests and the event, as a part of a transaction. */
export async function insertRubberGoods(
  transaction: Transaction,
  actor: CurrentUser,
  { id, tests, issuedOn = null, ...fields }: NewRubberGoods & { id: string },
): Promise<RubberGoods> {
  await checkSite(fields.siteId, transaction);
  const now = clock.now();
  const goods = await RubberGoods.create(
    { id, ...fields, issuedOn, createdAt: now, updatedAt: now },
    { transaction },
  );
  await setTests(id, tests, transaction);
  await recordEvent(transaction, {
    subjectType: 'rubber-goods',
    subjectId: id,
    type: 'created',
    actorId: actor.id,
    payload: { ...fields, issuedOn, tests },
  });
  return goods;
}

export function updateRubberGoods(
  actor: CurrentUser,
  goodsId: string,
  { tests, retired, retiredBecause, ...fields }: RubberGoodsChanges,
): Promise<RubberGoods> {
  return transact(async (transaction) => {
    const goods = await RubberGoods.findByPk(goodsId, {
      transaction,
      lock: transaction.LOCK.UPDATE,
    });
    if (goods === null) throw notFound();
    if (fields.siteId !== undefined) await checkSite(fields.siteId, transaction);
    const now = clock.now();
    // A double from before counts as corrected, and is judged as any other, once its serial or place is written anew.
    const isRewritten = fields.serial !== undefined || fields.siteId !== undefined;
    const isRetired = retired ?? goods.retiredAt !== null;
    await goods.update(
      {
        ...fields,
        ...(isRewritten ? { serialRepeats: false } : {}),
        retiredAt: isRetired ? (goods.retiredAt ?? now) : null,
        retiredBecause: isRetired ? (retiredBecause ?? goods.retiredBecause) : null,
        updatedAt: now,
      },
      { transaction },
    );
    if (tests !== undefined) await setTests(goodsId, tests, transaction);
    await recordEvent(transaction, {
      subjectType: 'rubber-goods',
      subjectId: goodsId,
      type: retired === true ? 'retired' : 'changed',
      actorId: actor.id,
      payload: { ...fields, tests, retired, retiredBecause },
    });
    return goods;
  });
}

async function checkSite(siteId: string, transaction: Transaction): Promise<void> {
  if ((await Site.count({ where: { id: siteId }, transaction })) > 0) return;
  throw invalidField('#/siteId', 'not-in-register', 'No such site.');
}

/** The list replaces the one before; the events keep what it was. A test that stays keeps its id. */
async function setTests(
  rubberGoodsId: string,
  tests: NewRubberGoods['tests'],
  transaction: Transaction,
): Promise<void> {
  const where = { rubberGoodsId };
  const before = await RubberGoodsTest.findAll({ where, order: ['position'], transaction });
  const idOf = (test: TestFields) => {
    const place = before.findIndex((row) => isSameTest(row, test));
    return place < 0 ? v7() : (before.splice(place, 1)[0]?.id ?? v7());
  };
  const rows = tests.map(({ laboratory = null, ...test }, position) => ({
    ...{ rubberGoodsId, position, ...test, laboratory },
    id: idOf({ ...test, laboratory }),
  }));
  await RubberGoodsTest.destroy({ where, transaction });
  await RubberGoodsTest.bulkCreate(rows, { transaction });
}
