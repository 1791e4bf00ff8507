import supertest from 'supertest';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { buildApp } from '@/server/app';
import { clock } from '@/server/clock';
import { API_ROUTES } from '@/server/openapi/routes';
import type { ApiRoute } from '@/server/openapi/routes';
import { buildAskers } from '../support/authorizationPeople';
import type { Asker, Target } from '../support/authorizationPeople';
import { AUTHORIZATION, expectedOutcome } from '../support/authorizationTable';
import { NOW } from '../support/record';

const app = buildApp();
let askers: Asker[];

beforeAll(async () => {
  clock.set(NOW);
  askers = await buildAskers(app);
}, 120_000);
afterAll(() => clock.set(null));

const keyOf = ({ method, path }: ApiRoute) => `${method} ${path}`;
const changes = ({ method }: ApiRoute) => method !== 'get';

/** The address of a route for a target; `{id}` is of the part of the register that the path names. */
function address(path: string, target: Target): string {
  const ofRegister = { users: target.personId, sites: target.siteId };
  const values: Record<string, string> = {
    ...target,
    id: ofRegister[path.split('/')[1] as keyof typeof ofRegister] ?? target.goodsId,
    revision: '1',
    number: '2026-000001',
    hash: '0'.repeat(64),
  };
  return `/api${path.replaceAll(/\{(\w+)\}/g, (_, name: string) => values[name] ?? '')}`;
}

let addresses = 0;

/** Each person comes from an address of their own: what is throttled by address is not what is tested here. */
function request({ agent, target }: Asker, { method, path }: ApiRoute) {
  addresses += 1;
  return agent[method](address(path, target)).set(
    'X-Forwarded-For',
    `2001:db8::${addresses.toString(16)}`,
  );
}

interface Answer {
  status: number;
  body: { type?: string };
}

function outcomeOf({ status }: Answer): number | 'allowed' {
  return status >= 500 || [401, 403, 404].includes(status) ? status : 'allowed';
}

// What ends sessions comes last.
const ENDS_SESSIONS = ['delete /sessions', 'delete /session'];
const routes = [...API_ROUTES].sort(
  (one, other) => ENDS_SESSIONS.indexOf(keyOf(one)) - ENDS_SESSIONS.indexOf(keyOf(other)),
);

it('has a row for every route, and no other', () => {
  expect(Object.keys(AUTHORIZATION).sort()).toEqual(API_ROUTES.map(keyOf).sort());
});

describe('bad input from somebody whom the route is not for', () => {
  // Session 401, sight 404 and role 403 are judged before anything of the request is read.
  it.each(routes)('$method $path', async (route) => {
    const key = keyOf(route);
    const refused = askers.filter((asker) => expectedOutcome(key, asker) !== 'allowed');
    const answers = await Promise.all(
      refused.map(async (asker) => {
        const sent = request(asker, route).query({ unheardOf: '1' });
        const answer = await (changes(route) ? sent.send({ unheardOf: 1 }) : sent);
        return [asker.name, outcomeOf(answer)];
      }),
    );
    expect(answers).toEqual(refused.map((asker) => [asker.name, expectedOutcome(key, asker)]));
  });
});

describe('a route that changes something', () => {
  const foreign = [
    { Origin: 'https://elsewhere.example' },
    { Origin: 'null' },
    { 'Sec-Fetch-Site': 'cross-site' },
    { 'Sec-Fetch-Site': 'same-site' },
  ];

  // First the form of the body, then the origin, then the session.
  it.each(routes.filter(changes))(
    'refuses another site, signed in or not: $method $path',
    async (route) => {
      const [lead] = askers as [Asker];
      const nobody = () => supertest(app)[route.method](address(route.path, lead.target));
      const broken = await nobody()
        .set({ Origin: 'https://elsewhere.example', 'Content-Type': 'application/json' })
        .send('{"');
      expect([broken.status, broken.body.type]).toEqual([400, '/problems/malformed-request']);
      for (const headers of foreign) {
        for (const sender of [nobody(), request(lead, route)]) {
          const { status, body } = await sender.set(headers);
          expect([status, body.type]).toEqual([403, '/problems/foreign-origin']);
        }
      }
    },
  );
});

describe('everybody who asks', () => {
  it.each(routes)('$method $path', async (route) => {
    const key = keyOf(route);
    const answers = await Promise.all(
      askers.map(async (asker) => {
        const { query, body, headers } = AUTHORIZATION[key]?.send(asker) ?? {};
        const sent = request(asker, route).query(query ?? {});
        if (headers !== undefined) void sent.set(headers);
        const answer = await (changes(route) ? sent.send(body ?? {}) : sent);
        return [asker.name, outcomeOf(answer)];
      }),
    );
    expect(answers).toEqual(askers.map((asker) => [asker.name, expectedOutcome(key, asker)]));
  });
});
