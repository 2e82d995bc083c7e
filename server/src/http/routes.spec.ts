import { afterAll, beforeAll, describe, expect, it } from '@jest/globals';
import { ROLES } from '../accounts/account.ts';
import { fill, paramsOf, routesOf, type Route } from '../../test/route-table.ts';
import { stranger, type Reply } from '../../test/sign-in.ts';
import { createTestApp, type TestApp } from '../../test/test-app.ts';
import {
  callerWith,
  combinations,
  fingerprint,
  makeThings,
  type Things,
} from '../../test/walked-app.ts';

/** Routes that write their answer themselves: plain liveness, files, and a sheet with its own 304. */
const SELF_ANSWERED = new Set([
  'GET /livez',
  'GET /readyz',
  'GET /api/certificates/:id/file',
  'GET /api/lessons/:number',
]);

let test: TestApp;
let routes: Route[];
let things: Things;
beforeAll(async () => {
  test = await createTestApp();
  routes = routesOf(test.app);
  things = await makeThings(test);
});
afterAll(() => test.close());

const firstValue = (name: string) => things.values[name]?.[0] ?? 'x';
const ask = (caller: { call: ReturnType<typeof stranger>['call'] }, route: Route): Promise<Reply> =>
  caller.call(
    route.method,
    fill(route, firstValue),
    route.method === 'GET' || route.method === 'DELETE' ? undefined : {},
  );

describe('every route', () => {
  it('is found here', () => {
    expect(routes.length).toBeGreaterThan(50);
    expect(new Set(routes.map(({ name }) => name)).size).toBe(routes.length);
  });

  it('has a policy', () => {
    expect(routes.filter(({ policy }) => policy === undefined).map(({ name }) => name)).toEqual([]);
  });

  it('has a response schema, unless it answers with nothing or with a file', () => {
    const without = routes.filter(
      (route) =>
        route.status !== 204 &&
        !SELF_ANSWERED.has(route.name) &&
        (route.responseSchema === undefined || route.answersItself),
    );
    expect(without.map(({ name }) => name)).toEqual([]);
  });

  it('answers nobody who is not signed in, unless it is for anyone', async () => {
    const closed = routes.filter(({ policy }) => policy !== 'anyone');
    expect(closed.length).toBeGreaterThan(30);
    for (const route of closed) {
      const { status, body } = await ask(stranger(test.app), route);
      expect({ route: route.name, status, type: body.type }).toEqual({
        route: route.name,
        status: 401,
        type: '/problems/not-signed-in',
      });
    }
  });

  it.each(ROLES)('for other roles answers a %s with 403', async (role) => {
    const caller = await callerWith(test, role);
    const closed = routes.filter(
      ({ policy }) => Array.isArray(policy) && !(policy as readonly string[]).includes(role),
    );
    for (const route of closed) {
      const { status, body } = await ask(caller, route);
      expect({ route: route.name, status, type: body.type }).toEqual({
        route: route.name,
        status: 403,
        type: '/problems/not-allowed',
      });
    }
  });

  it('for administrators alone asks for the second factor', async () => {
    const caller = await callerWith(test, 'administrator');
    await test.query('UPDATE sessions SET second_factor_at = NULL WHERE id = $1 RETURNING id', [
      caller.sessionId,
    ]);
    const steps = /second-factor/;
    const theirs = routes.filter(
      ({ policy, name }) => String(policy) === 'administrator' && !steps.test(name),
    );
    expect(theirs.length).toBeGreaterThan(5);
    for (const route of theirs) {
      const { body } = await ask(caller, route);
      expect({ route: route.name, type: body.type }).toEqual({
        route: route.name,
        type: '/problems/second-factor-needed',
      });
    }
  });
});

describe("another person's things", () => {
  it.each(['trainee', 'trainer'] as const)(
    'look absent to a %s of no class of theirs',
    async (role) => {
      const caller = await callerWith(test, role);
      const owned = routes.filter(
        (route) => paramsOf(route).includes('id') && route.policy !== 'anyone',
      );
      expect(owned.length).toBeGreaterThan(10);
      for (const route of owned) {
        for (const values of combinations(paramsOf(route), things.values)) {
          const path = fill(route, (name) => values[name] ?? '');
          const body = route.method === 'POST' || route.method === 'PUT' ? {} : undefined;
          const reply = await caller.call(route.method, path, body);
          // A body that is not in order is refused before anything is looked up.
          const refusals = route.bodySchema ? [403, 404, 422] : [403, 404];
          expect({ path, method: route.method, refused: refusals.includes(reply.status) }).toEqual({
            path,
            method: route.method,
            refused: true,
          });
          expect(JSON.stringify(reply.body)).not.toContain(things.owner.email);
        }
      }
    },
  );
});

describe('reading', () => {
  it('changes nothing, whatever is read and whoever reads', async () => {
    const callers = [
      stranger(test.app),
      things.caller,
      await callerWith(test, 'trainer'),
      await callerWith(test, 'administrator', 'certification-manager'),
    ];
    const reads = routes.filter(({ method, path }) => method === 'GET' && path !== '/readyz');
    const walk = async () => {
      const statuses: number[] = [];
      for (const route of reads) {
        for (const values of combinations(paramsOf(route), things.values)) {
          const path = fill(route, (name) => values[name] ?? '');
          for (const caller of callers) statuses.push((await caller.call('GET', path)).status);
        }
      }
      return statuses;
    };
    const before = await fingerprint(test);
    const statuses = await walk();
    const after = await fingerprint(test);
    expect(after).toEqual(before);
    expect(statuses.filter((status) => status === 200).length).toBeGreaterThan(20);
    expect(statuses.filter((status) => status >= 500)).toEqual([]);
  });
});
