import { Router } from 'express';
import { insightsQuerySchema } from '@/shared/insights';
import { currentUser } from '../currentUser';
import { requireRole, requireUser } from '../middleware/requireUser';
import { parse } from '../parse';
import { readInsights } from '../services/readInsights';

export const insightsRouter = Router();

insightsRouter.get('/', requireUser, requireRole('supervisor', 'safety'), async (req, res) => {
  const query = parse(insightsQuerySchema, req.query);
  res.json(await readInsights(currentUser(req), query));
});
