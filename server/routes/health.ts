import { Router } from 'express';
import { sequelize } from '../db';
import { openApiDocument } from '../openapi/document';

export const healthRouter = Router();

/** For load balancers and people on call: names the database's state. */
healthRouter.get('/health', async (_req, res) => {
  const database = await sequelize.query('SELECT 1').then(
    () => 'up' as const,
    () => 'down' as const,
  );
  const up = database === 'up';
  res.status(up ? 200 : 503).json({ status: up ? 'ok' : 'unavailable', database });
});

healthRouter.get('/openapi.json', (_req, res) => {
  res.json(openApiDocument());
});
