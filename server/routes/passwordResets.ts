import { Router } from 'express';
import { requestResetSchema, useResetSchema } from '@/shared/user';
import { parse } from '../parse';
import { findReset, finishReset, requestReset } from '../services/passwordReset';
import { consume, resetLimiter } from '../throttle';

export const passwordResetsRouter = Router();

passwordResetsRouter.use(async (req, _res, next) => {
  await consume(resetLimiter, req.ip ?? '');
  next();
});

/** Always the same answer: it tells nobody which addresses have an account. */
passwordResetsRouter.post('/', async (req, res) => {
  const { email } = parse(requestResetSchema, req.body);
  await requestReset(email);
  res.status(202).json({});
});

passwordResetsRouter.post('/:token', async (req, res) => {
  const reset = await findReset(req.params.token);
  await finishReset(reset, parse(useResetSchema, req.body));
  res.status(204).end();
});
