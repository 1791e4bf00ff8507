import { Router } from 'express';
import type { Request, RequestHandler } from 'express';
import { v4 } from 'uuid';
import { signInSchema } from '@/shared/user';
import { clock } from '../clock';
import type { CurrentUser } from '../currentUser';
import { currentUser, requireUser } from '../middleware/requireUser';
import { User } from '../models/User';
import { parse } from '../parse';
import { passport } from '../passport';
import { wrongCredentials } from '../problem';
import { COOKIE_NAME } from '../session';

export const sessionRouter = Router();

/** Passport answers through a callback; the route wants the person or `null`. */
const authenticate = (
  req: Request,
  ...rest: Parameters<RequestHandler> extends [unknown, ...infer R] ? R : never
) =>
  new Promise<CurrentUser | null>((resolve, reject) => {
    const handler = passport.authenticate(
      'local',
      { session: false },
      (error: unknown, user?: CurrentUser | false) =>
        error ? reject(error as Error) : resolve(user || null),
    ) as RequestHandler;
    void handler(req, ...rest);
  });

sessionRouter.post('/', async (req, res, next) => {
  req.body = parse(signInSchema, req.body);
  const user = await authenticate(req, res, next);
  if (user === null) throw wrongCredentials();
  await startSession(req, user);
  res.status(201).json({ user });
});

sessionRouter.get('/', requireUser, (req, res) => {
  res.json({ user: currentUser(req) });
});

sessionRouter.delete('/', requireUser, async (req, res) => {
  await new Promise<void>((resolve, reject) =>
    req.session.destroy((error: unknown) => (error ? reject(error as Error) : resolve())),
  );
  res.clearCookie(COOKIE_NAME, { path: '/' }).status(204).end();
});

/** A new session id at every sign-in, so that one planted before it is worth nothing. */
async function startSession(req: Request, user: CurrentUser): Promise<void> {
  const row = await User.findByPk(user.id, { rejectOnEmpty: true, attributes: ['sessionEpoch'] });
  await new Promise<void>((resolve, reject) =>
    req.logIn(user, (error: unknown) => (error ? reject(error as Error) : resolve())),
  );
  Object.assign(req.session, {
    publicId: v4(),
    signedInAt: clock.now().toISOString(),
    epoch: row.sessionEpoch,
    userAgent: (req.headers['user-agent'] ?? '').slice(0, 300),
  });
  await new Promise<void>((resolve, reject) =>
    req.session.save((error: unknown) => (error ? reject(error as Error) : resolve())),
  );
}
