import { Router } from 'express';
import { createUserSchema, inviteAgainSchema, updateUserSchema } from '@/shared/user';
import { currentUser, requireRole, requireUser } from '../middleware/requireUser';
import { pageSchema } from '../keyset';
import type { User } from '../models/User';
import { parse, parseId } from '../parse';
import { presentPerson, presentPersonInFull } from '../presenters/user';
import { notAllowed } from '../problem';
import { inviteAgain } from '../services/inviteAgain';
import { findPerson, listPeople, placesOf } from '../services/listPeople';
import { createUser, updateUser } from '../services/saveUser';

export const usersRouter = Router();
usersRouter.use(requireUser);

const NOWHERE = { siteIds: [], timeZone: 'UTC' };

usersRouter.get('/', async (req, res) => {
  const actor = currentUser(req);
  const { rows, nextCursor } = await listPeople(actor, parse(pageSchema, req.query));
  const places = await placesOf(rows.map(({ id }) => id));
  const present = actor.role === 'safety' ? presentPersonInFull : presentPerson;
  res.json({ items: rows.map((row) => present(row, places.get(row.id) ?? NOWHERE)), nextCursor });
});

usersRouter.post('/', requireRole('safety'), async (req, res) => {
  const { record, created } = await createUser(currentUser(req), parse(createUserSchema, req.body));
  res.status(created ? 201 : 200).json(await inFull(record));
});

usersRouter.get('/:userId', async (req, res) => {
  const actor = currentUser(req);
  const user = await findPerson(actor, parseId(req.params.userId));
  const places = (await placesOf([user.id])).get(user.id) ?? NOWHERE;
  res.json((actor.role === 'safety' ? presentPersonInFull : presentPerson)(user, places));
});

usersRouter.patch('/:userId', async (req, res) => {
  const actor = currentUser(req);
  const { id } = await findPerson(actor, parseId(req.params.userId));
  if (actor.role !== 'safety') throw notAllowed();
  res.json(await inFull(await updateUser(actor, id, parse(updateUserSchema, req.body))));
});

usersRouter.post('/:userId/invitation', async (req, res) => {
  const actor = currentUser(req);
  const { id } = await findPerson(actor, parseId(req.params.userId));
  if (actor.role !== 'safety') throw notAllowed();
  parse(inviteAgainSchema, req.body ?? {});
  res.json(await inFull(await inviteAgain(actor, id)));
});

async function inFull(user: User) {
  const places = await placesOf([user.id]);
  return presentPersonInFull(user, places.get(user.id) ?? NOWHERE);
}
