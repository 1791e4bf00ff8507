import type * as Argon from '@node-rs/argon2';
import { QueryTypes } from 'sequelize';
import supertest from 'supertest';
import type { Response } from 'supertest';
import { beforeEach, describe, expect, it, vi } from 'vitest';
import { buildApp } from '@/server/app';
import { sequelize } from '@/server/db';
import { COOKIE_NAME } from '@/server/session';
import { buildUser, PASSWORD } from '../support/server';

/* How often a secret was compared with a hash: the work that the time of an answer shows. */
const counted = vi.hoisted(() => ({ comparisons: 0 }));
vi.mock('@node-rs/argon2', async (original) => {
  const argon = await original<typeof Argon>();
  return {
    ...argon,
    verify: (...args: Parameters<typeof argon.verify>) => {
      counted.comparisons += 1;
      return argon.verify(...args);
    },
  };
});

const app = buildApp();
const HOUR = 3_600_000;
let addresses = 0;

beforeEach(() => {
  addresses += 1;
});

/** The cookie that an answer sets, as a browser sends it back; empty where it sets none. */
function cookieOf({ headers }: Response): string {
  const set = (headers['set-cookie'] ?? []) as unknown as string[];
  return set.find((cookie) => cookie.startsWith(COOKIE_NAME))?.split(';')[0] ?? '';
}

/** Sends one request with one cookie and forgets what comes back: no jar that follows along. */
const withCookie = (cookie: string) => ({
  signIn: (email: string, password = PASSWORD) =>
    supertest(app)
      .post('/api/session')
      .set('Cookie', cookie)
      .set('X-Forwarded-For', `198.51.100.${addresses}`)
      .send({ email, password }),
  read: () => supertest(app).get('/api/session').set('Cookie', cookie),
  signOut: () => supertest(app).delete('/api/session').set('Cookie', cookie),
});

describe('a cookie from before the sign-in', () => {
  it('is given to nobody who has not signed in', async () => {
    expect(cookieOf(await supertest(app).get('/api/session'))).toBe('');
    expect(cookieOf(await supertest(app).get('/api/health'))).toBe('');
    const { email } = await buildUser();
    expect(cookieOf(await withCookie('').signIn(email, 'not this one, no'))).toBe('');
  });

  it.each([
    ['made up', `${COOKIE_NAME}=planted`],
    ['made up in the form of one', `${COOKIE_NAME}=s%3Aplanted.c2lnbmF0dXJl`],
    ['repeated', `${COOKIE_NAME}=planted; ${COOKIE_NAME}=planted`],
  ])('is not kept: %s', async (_what, planted) => {
    const { email } = await buildUser();
    const answer = await withCookie(planted).signIn(email).expect(201);
    expect(cookieOf(answer)).not.toContain('planted');
    await withCookie(planted).read().expect(401);
    await withCookie(cookieOf(answer)).read().expect(200);
  });

  it('of another person’s session is worth nothing to them once somebody signs in over it', async () => {
    const [attacker, person] = [await buildUser(), await buildUser()];
    const planted = cookieOf(await withCookie('').signIn(attacker.email));
    const taken = cookieOf(await withCookie(planted).signIn(person.email).expect(201));
    expect(taken).not.toBe(planted);
    await withCookie(planted).read().expect(401);
    const { body } = await withCookie(taken).read().expect(200);
    expect(body.user.id).toBe(person.id);
  });

  it('of a session that was signed out comes to life no more', async () => {
    const { email } = await buildUser();
    const old = cookieOf(await withCookie('').signIn(email));
    await withCookie(old).signOut().expect(204);
    await withCookie(old).read().expect(401);
    const fresh = cookieOf(await withCookie(old).signIn(email).expect(201));
    expect(fresh).not.toBe(old);
    await withCookie(old).read().expect(401);
  });

  it('of before a change of the password is dead for this browser too', async () => {
    const { email } = await buildUser();
    const old = cookieOf(await withCookie('').signIn(email));
    const changed = await supertest(app)
      .post('/api/session/password')
      .set('Cookie', old)
      .send({ current: PASSWORD, password: 'seven quiet heron ladders' })
      .expect(200);
    expect(cookieOf(changed)).not.toBe(old);
    await withCookie(old).read().expect(401);
    await withCookie(cookieOf(changed)).read().expect(200);
  });
});

describe('a session that nobody uses', () => {
  const expiry = async (userId: string) => {
    const [row] = await sequelize.query<{ expire: Date }>(
      `SELECT expire FROM session WHERE sess -> 'passport' ->> 'user' = $userId`,
      { bind: { userId }, type: QueryTypes.SELECT },
    );
    return (row?.expire.getTime() ?? 0) - Date.now();
  };
  const expireAfter = (userId: string, span: string) =>
    sequelize.query(
      `UPDATE session SET expire = now() + $span::interval
        WHERE sess -> 'passport' ->> 'user' = $userId`,
      { bind: { userId, span } },
    );

  it('ends after twelve hours, counted from the last request', async () => {
    const person = await buildUser();
    const signedIn = await withCookie('').signIn(person.email);
    const cookie = cookieOf(signedIn);
    expect(Math.abs((await expiry(person.id)) - 12 * HOUR)).toBeLessThan(HOUR / 60);
    await expireAfter(person.id, '1 hour');
    const used = await withCookie(cookie).read().expect(200);
    expect(cookieOf(used)).not.toBe('');
    expect(Math.abs((await expiry(person.id)) - 12 * HOUR)).toBeLessThan(HOUR / 60);
    await expireAfter(person.id, '-1 second');
    await withCookie(cookie).read().expect(401);
  });
});

describe('the work of a sign-in', () => {
  const work = async (email: string, password: string) => {
    counted.comparisons = 0;
    const { status } = await withCookie('').signIn(email, password);
    return [status, counted.comparisons];
  };

  it('is one hash, whether the account is known, unknown, retired or not yet joined', async () => {
    const { email } = await buildUser();
    const retired = await buildUser({ retiredAt: new Date() });
    const invited = await buildUser({ password: null });
    expect(await work(email, PASSWORD)).toEqual([201, 1]);
    for (const account of [email, 'nobody@company.example', retired.email, invited.email]) {
      expect(await work(account, 'not this one, no')).toEqual([401, 1]);
    }
  });

  it('is none once it is throttled', async () => {
    const { email } = await buildUser();
    for (let tries = 0; tries < 10; tries += 1) await work(email, 'not this one, no');
    expect(await work(email, PASSWORD)).toEqual([429, 0]);
  });
});
