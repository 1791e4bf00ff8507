import { Router } from 'express';
import type { NextFunction, Request, Response } from 'express';
import { v4 } from 'uuid';
import {
  changePasswordSchema,
  changePinSchema,
  sessionPatchSchema,
  signInSchema,
} from '@/shared/user';
import { clock } from '../clock';
import type { CurrentUser } from '../currentUser';
import { currentUser, requireUser } from '../middleware/requireUser';
import { User } from '../models/User';
import { parse } from '../parse';
import { passport } from '../passport';
import { presentSessionUser } from '../presenters/user';
import { wrongCredentials } from '../problem';
import { changePassword, changePin } from '../services/changeSecrets';
import { loadCurrentUser } from '../services/loadCurrentUser';
import { endSessions } from '../services/ownSessions';
import { COOKIE_NAME } from '../session';

export const sessionRouter = Router();

/** For libraries that answer through a callback. */
function settled(call: (done: (error?: unknown) => void) => void): Promise<void> {
  return new Promise((resolve, reject) => {
    call((error) => {
      if (error === undefined || error === null) return resolve();
      reject(error instanceof Error ? error : new Error('The session store failed.'));
    });
  });
}

/** The person behind the credentials of the body, or `null`. */
function authenticate(req: Request, res: Response, next: NextFunction) {
  return new Promise<CurrentUser | null>((resolve, reject) => {
    const handler = passport.authenticate(
      'local',
      { session: false },
      (error: Error | null, user?: CurrentUser | false) =>
        error === null
          ? resolve(user === undefined || user === false ? null : user)
          : reject(error),
    ) as (req: Request, res: Response, next: NextFunction) => void;
    handler(req, res, next);
  });
}

sessionRouter.post('/', async (req, res, next) => {
  req.body = parse(signInSchema, req.body);
  const user = await authenticate(req, res, next);
  if (user === null) throw wrongCredentials();
  await startSession(req, user);
  res.status(201).json({ user: presentSessionUser(user) });
});

sessionRouter.use(requireUser);

sessionRouter.get('/', (req, res) => {
  res.json({ user: presentSessionUser(currentUser(req)) });
});

sessionRouter.patch('/', async (req, res) => {
  const { id } = currentUser(req);
  const changes = parse(sessionPatchSchema, req.body);
  await User.update({ ...changes, updatedAt: clock.now() }, { where: { id } });
  const loaded = await loadCurrentUser(id);
  res.json({ user: presentSessionUser(loaded?.user ?? currentUser(req)) });
});

sessionRouter.delete('/', async (req, res) => {
  await settled((done) => req.session.destroy(done));
  res.clearCookie(COOKIE_NAME, { path: '/' }).status(204).end();
});

sessionRouter.post('/password', async (req, res) => {
  const actor = currentUser(req);
  const epoch = await changePassword(actor, parse(changePasswordSchema, req.body));
  // All sessions have ended; the asking one begins anew under a new id.
  await startSession(req, actor, epoch);
  res.json({ user: presentSessionUser(actor) });
});

sessionRouter.post('/pin', async (req, res) => {
  const actor = currentUser(req);
  await changePin(actor, parse(changePinSchema, req.body));
  await endSessions(actor.id, { except: req.session.publicId });
  res.json({ user: presentSessionUser({ ...actor, hasPin: true }) });
});

/** A new session id at every sign-in, so that one planted before it is worth nothing. */
async function startSession(req: Request, user: CurrentUser, epoch?: number): Promise<void> {
  const { signedInAt } = req.session;
  await settled((done) => req.logIn(user, done));
  const known = epoch ?? (await loadCurrentUser(user.id))?.sessionEpoch;
  Object.assign(req.session, {
    publicId: v4(),
    // A change of the password does not lengthen the seven days.
    signedInAt: (epoch === undefined ? undefined : signedInAt) ?? clock.now().toISOString(),
    epoch: known,
    userAgent: (req.headers['user-agent'] ?? '').slice(0, 300),
  });
  await settled((done) => req.session.save(done));
}
