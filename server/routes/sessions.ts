import { Router } from 'express';
import { currentUser, requireUser } from '../middleware/requireUser';
import { parseId } from '../parse';
import { endSession, endSessions, listSessions } from '../services/ownSessions';

export const sessionsRouter = Router();
sessionsRouter.use(requireUser);

sessionsRouter.get('/', async (req, res) => {
  const items = await listSessions(currentUser(req).id, req.session.publicId ?? '');
  res.json({ items, nextCursor: null });
});

sessionsRouter.delete('/', async (req, res) => {
  await endSessions(currentUser(req).id, { except: req.session.publicId });
  res.status(204).end();
});

sessionsRouter.delete('/:sessionId', async (req, res) => {
  await endSession(currentUser(req).id, parseId(req.params.sessionId));
  res.status(204).end();
});
