import { Router } from 'express';
import { consume, verifyLimiter } from '../throttle';
import { verifyPublicly } from '../services/verifyPublicly';

export const verifyRouter = Router();

/** Open to anyone; never 404, so that it does not tell which numbers exist. */
verifyRouter.get('/:number/:hash', async (req, res) => {
  await consume(verifyLimiter, req.ip ?? '');
  const { number, hash } = req.params;
  res.json(await verifyPublicly(number, hash));
});
