import { Router } from 'express';
import { assessSchema } from '@/shared/record';
import { clock } from '../clock';
import { currentUser } from '../currentUser';
import { requireUser } from '../middleware/requireUser';
import { parse } from '../parse';
import { assessAt } from '../services/assessAt';
import { placeOf } from '../services/placeOf';

export const assessmentsRouter = Router();

/** The server's own assessment of a content, nothing stored. */
assessmentsRouter.post('/', requireUser, async (req, res) => {
  const { content, stage, proof, closeOut } = parse(assessSchema, req.body);
  const leadId = currentUser(req).id;
  const { timeZone } = await placeOf({ siteId: content.job?.siteId ?? null, leadId });
  res.json(assessAt({ content, at: clock.now(), timeZone, stage, proof, closeOut }));
});
