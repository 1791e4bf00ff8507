import { Router } from 'express';
import {
  rubberGoodsInputSchema,
  rubberGoodsTestInputSchema,
  rubberGoodsUpdateSchema,
} from '@/shared/register';
import { pageSchema } from '../keyset';
import { currentUser, requireRole, requireUser } from '../middleware/requireUser';
import type { RubberGoods } from '../models/RubberGoods';
import { parse, parseId } from '../parse';
import { presentRubberGoods } from '../presenters/rubberGoods';
import { notAllowed } from '../problem';
import { addRubberGoodsTest } from '../services/addRubberGoodsTest';
import { findRubberGoods, listRubberGoods, partsOf } from '../services/listRubberGoods';
import { createRubberGoods, updateRubberGoods } from '../services/saveRubberGoods';

export const rubberGoodsRouter = Router();
rubberGoodsRouter.use(requireUser);

rubberGoodsRouter.get('/', async (req, res) => {
  const page = parse(pageSchema, req.query);
  const { rows, nextCursor } = await listRubberGoods(currentUser(req), page);
  res.json({ items: (await partsOf(rows)).map(presentRubberGoods), nextCursor });
});

rubberGoodsRouter.post('/', requireRole('safety'), async (req, res) => {
  const body = parse(rubberGoodsInputSchema, req.body);
  const { record, created } = await createRubberGoods(currentUser(req), body);
  res.status(created ? 201 : 200).json(await inFull(record));
});

rubberGoodsRouter.get('/:goodsId', async (req, res) => {
  const goods = await findRubberGoods(currentUser(req), parseId(req.params.goodsId));
  res.json(await inFull(goods));
});

rubberGoodsRouter.patch('/:goodsId', async (req, res) => {
  const actor = currentUser(req);
  const { id } = await findRubberGoods(actor, parseId(req.params.goodsId));
  if (actor.role !== 'safety') throw notAllowed();
  const changes = parse(rubberGoodsUpdateSchema, req.body);
  res.json(await inFull(await updateRubberGoods(actor, id, changes)));
});

rubberGoodsRouter.post('/:goodsId/tests', async (req, res) => {
  const actor = currentUser(req);
  const { id } = await findRubberGoods(actor, parseId(req.params.goodsId));
  if (actor.role !== 'safety') throw notAllowed();
  const test = parse(rubberGoodsTestInputSchema, req.body);
  const { goods, created } = await addRubberGoodsTest(actor, id, test);
  res.status(created ? 201 : 200).json(await inFull(goods));
});

async function inFull(goods: RubberGoods) {
  return (await partsOf([goods])).map(presentRubberGoods)[0];
}
