import { Op } from 'sequelize';
import type { WhereOptions } from 'sequelize';
import type { CurrentUser } from '../currentUser';
import { beyond, cutPage, newestFirst } from '../keyset';
import type { Page } from '../keyset';
import { RubberGoods } from '../models/RubberGoods';
import { RubberGoodsTest } from '../models/RubberGoodsTest';
import { Site } from '../models/Site';
import type { RubberGoodsParts } from '../presenters/rubberGoods';
import { notFound } from '../problem';

/** Safety reads all rubber goods, others those in use at their own sites. */
function visibleTo({ role, siteIds }: CurrentUser): WhereOptions<RubberGoods> {
  return role === 'safety' ? {} : { siteId: siteIds, retiredAt: { [Op.is]: null } };
}

/** An item that this person may see; 404 otherwise. */
export async function findRubberGoods(actor: CurrentUser, id: string): Promise<RubberGoods> {
  const where = { [Op.and]: [{ id }, visibleTo(actor)] } as WhereOptions<RubberGoods>;
  const goods = await RubberGoods.findOne({ where });
  if (goods === null) throw notFound();
  return goods;
}

export async function listRubberGoods(
  actor: CurrentUser,
  { cursor, limit }: Page,
): Promise<{ rows: RubberGoods[]; nextCursor: string | null }> {
  const where = { [Op.and]: [visibleTo(actor), beyond(cursor)] } as WhereOptions<RubberGoods>;
  return cutPage(await RubberGoods.findAll({ where, order: newestFirst, limit: limit + 1 }), limit);
}

/** The tests of these items and the zone of each one's site. */
export async function partsOf(rows: RubberGoods[]): Promise<RubberGoodsParts[]> {
  const tests = await RubberGoodsTest.findAll({
    where: { rubberGoodsId: rows.map(({ id }) => id) },
    order: [['position', 'ASC']],
  });
  const sites = await Site.findAll({
    attributes: ['id', 'timeZone'],
    where: { id: [...new Set(rows.map(({ siteId }) => siteId))] },
  });
  const zones = new Map(sites.map(({ id, timeZone }) => [id, timeZone]));
  return rows.map((goods) => ({
    goods,
    tests: tests.filter(({ rubberGoodsId }) => rubberGoodsId === goods.id),
    timeZone: zones.get(goods.siteId) ?? 'UTC',
  }));
}
