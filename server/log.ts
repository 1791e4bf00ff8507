import pino from 'pino';
import { env } from './env';

const SECRETS = [
  'password',
  'current',
  'pin',
  'token',
  'cookie',
  'authorization',
  'strokes',
  'signature',
  'email',
];

/** JSON lines. Bodies, cookies, tokens and PINs never reach a log; should one be handed over, it is blacked out. */
export const logger = pino(
  {
    level: env.LOG_LEVEL,
    redact: {
      paths: SECRETS.flatMap((name) => [name, `*.${name}`, `*.*.${name}`]),
      censor: '[redacted]',
    },
  },
  pino.destination({ dest: env.LOG_FILE ?? 1 }),
);
