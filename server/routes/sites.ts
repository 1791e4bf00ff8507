import { Router } from 'express';
import { siteInputSchema, siteUpdateSchema } from '@/shared/register';
import { pageSchema } from '../keyset';
import { currentUser, requireRole, requireUser } from '../middleware/requireUser';
import type { Site } from '../models/Site';
import { parse, parseId } from '../parse';
import { presentSite } from '../presenters/site';
import { notAllowed } from '../problem';
import { findSite, listSites, membersOf } from '../services/listSites';
import { createSite, updateSite } from '../services/saveSite';

export const sitesRouter = Router();
sitesRouter.use(requireUser);

sitesRouter.get('/', async (req, res) => {
  const actor = currentUser(req);
  const { rows, nextCursor } = await listSites(actor, parse(pageSchema, req.query));
  const isSafety = actor.role === 'safety';
  const members = isSafety ? await membersOf(rows.map(({ id }) => id)) : null;
  const items = rows.map((site) =>
    members === null ? presentSite(site) : presentSite(site, members.get(site.id) ?? []),
  );
  res.json({ items, nextCursor });
});

sitesRouter.post('/', requireRole('safety'), async (req, res) => {
  const { record, created } = await createSite(currentUser(req), parse(siteInputSchema, req.body));
  res.status(created ? 201 : 200).json(await inFull(record));
});

sitesRouter.get('/:siteId', async (req, res) => {
  const actor = currentUser(req);
  const site = await findSite(actor, parseId(req.params.siteId));
  res.json(actor.role === 'safety' ? await inFull(site) : presentSite(site));
});

sitesRouter.patch('/:siteId', async (req, res) => {
  const actor = currentUser(req);
  const { id } = await findSite(actor, parseId(req.params.siteId));
  if (actor.role !== 'safety') throw notAllowed();
  res.json(await inFull(await updateSite(actor, id, parse(siteUpdateSchema, req.body))));
});

async function inFull(site: Site) {
  return presentSite(site, (await membersOf([site.id])).get(site.id) ?? []);
}
