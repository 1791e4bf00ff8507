import type { NextFunction, Request, Response } from 'express';
import { Passport } from 'passport';
import { Strategy } from 'passport-local';
import { clock } from './clock';
import type { CurrentUser } from './currentUser';
import { checkCredentials } from './services/checkCredentials';
import { loadCurrentUser } from './services/loadCurrentUser';
import { ABSOLUTE_MILLISECONDS } from './session';

export const passport = new Passport();

passport.use(
  new Strategy(
    { usernameField: 'email', passReqToCallback: true },
    (req, email, password, done) => {
      checkCredentials({ email, password, address: req.ip ?? '' }).then(
        (user) => done(null, user ?? false),
        (error: unknown) => done(error),
      );
    },
  ),
);

passport.serializeUser((user, done) => done(null, user.id));
passport.deserializeUser((userId: string, done) => {
  loadCurrentUser(userId).then(
    (found) => {
      if (found === null) return done(null, false);
      const loaded: Loaded = { ...found.user, sessionEpoch: found.sessionEpoch };
      done(null, loaded);
    },
    (error: unknown) => done(error),
  );
});

type Loaded = CurrentUser & { sessionEpoch?: number };

/** A session also ends seven days after its sign-in, and when the person's epoch was raised. */
export function endStaleSession(req: Request, _res: Response, next: NextFunction): void {
  if (req.user === undefined) return next();
  const { sessionEpoch, ...user } = req.user as Loaded;
  const { signedInAt, epoch } = req.session;
  const age = clock.now().getTime() - new Date(signedInAt ?? 0).getTime();
  if (epoch === sessionEpoch && age < ABSOLUTE_MILLISECONDS) {
    req.user = user;
    return next();
  }
  delete req.user;
  req.session.destroy((error: unknown) => next(error));
}
