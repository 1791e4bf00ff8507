import { createHash } from 'node:crypto';
import connectPgSimple from 'connect-pg-simple';
import type { RequestHandler } from 'express';
import session from 'express-session';
import { pool } from './db';
import { env, publicUrl } from './env';
import { isLoopback } from './loopback';
import { logger } from './log';

const HOUR = 3_600_000;
export const IDLE_MILLISECONDS = 12 * HOUR;
export const ABSOLUTE_MILLISECONDS = 7 * 24 * HOUR;

declare module 'express-session' {
  interface SessionData {
    /** What the person sees of it in their list; the session's real id is a secret. */
    publicId: string;
    signedInAt: string;
    epoch: number;
    userAgent: string;
  }
}

const onLoopback = isLoopback(new URL(publicUrl()).hostname);

/**
 * Cookies know no port, and several checkouts run on one machine: the name
 * carries a mark of the secret, so that one never overwrites another's, while
 * two processes with the same secret share theirs.
 */
const mark = createHash('sha256').update(env.SESSION_SECRET).digest('hex').slice(0, 8);
export const COOKIE_NAME = onLoopback ? `wideberth-${mark}` : '__Host-wideberth';

function sessionStore(): session.Store {
  const PgStore = connectPgSimple(session);
  const store = new PgStore({
    pool,
    tableName: 'session',
    ttl: IDLE_MILLISECONDS / 1000,
    pruneSessionInterval: env.NODE_ENV === 'test' ? false : 15 * 60,
    errorLog: (message: unknown) => logger.warn({ message: String(message) }, 'session store'),
  });
  const touch = store.touch.bind(store);
  // The visit is noted while the answer goes out. When that fails the answer is still right, and must not be cut off.
  store.touch = (sessionId, visited, done) => {
    touch(sessionId, visited, (error?: unknown) => {
      if (error instanceof Error) logger.warn({ message: error.message }, 'a visit was not noted');
      done?.();
    });
  };
  return store;
}

/** Sessions in PostgreSQL: any process answers for any of them. */
export function sessionMiddleware(): RequestHandler {
  return session({
    name: COOKIE_NAME,
    secret: env.SESSION_SECRET,
    store: sessionStore(),
    resave: false,
    saveUninitialized: false,
    rolling: true,
    // The proxy that ends TLS says so; without its word a Secure cookie would never be set.
    proxy: !onLoopback,
    cookie: {
      httpOnly: true,
      sameSite: 'lax',
      secure: !onLoopback,
      path: '/',
      maxAge: IDLE_MILLISECONDS,
    },
  });
}
