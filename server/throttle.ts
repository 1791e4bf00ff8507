import { RateLimiterPostgres, RateLimiterRes } from 'rate-limiter-flexible';
import { pool } from './db';
import { tooManyRequests } from './problem';

const MINUTE = 60;

/** Counted in PostgreSQL, so that two processes count together and a restart forgets nothing. */
export function limiter(keyPrefix: string, points: number, duration: number): RateLimiterPostgres {
  return new RateLimiterPostgres({
    storeClient: pool,
    tableName: 'rate_limits',
    tableCreated: true,
    clearExpiredByTimeout: false,
    keyPrefix,
    points,
    duration,
  });
}

/** Ten failures for one account from one address, 100 for one address, 50 for one account, in 15 minutes. */
export const signInLimiters = {
  pair: limiter('sign-in-pair', 10, 15 * MINUTE),
  address: limiter('sign-in-address', 100, 15 * MINUTE),
  account: limiter('sign-in-account', 50, 15 * MINUTE),
};
export const PIN_TRIES = 5;
export const PIN_BLOCK_SECONDS = 15 * MINUTE;
export const pinLimiter = limiter('pin', PIN_TRIES, PIN_BLOCK_SECONDS);
export const verifyLimiter = limiter('verify', 30, MINUTE);
export const resetLimiter = limiter('reset', 30, MINUTE);

/** Takes one try; 429 with the time to wait when none is left. Counting comes before any hash is computed. */
export async function consume(by: RateLimiterPostgres, key: string): Promise<RateLimiterRes> {
  try {
    return await by.consume(key.slice(0, 200));
  } catch (fault) {
    if (fault instanceof RateLimiterRes) throw tooManyRequests(fault.msBeforeNext / 1000);
    throw fault;
  }
}
